import {
  civilians2015,
  createStudy,
  loadRuleBook,
  mixOf,
  type StudyShares,
} from '@settlewright/anthropometry';
import { measureSet, type SetDocument } from '@settlewright/geometry';
import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import { readSeedData } from '../src/common/seed-data';
import { STUDY_WEAR } from '../src/studies/study-question';
import { as, createMember, type Person } from './factories/people';
import { createProduction, createSet, type SetPlace } from './factories/productions';
import { BLOCK_TIMEOUT_SECONDS, WorkerProcess } from './factories/workers';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(120_000);

const WOMEN_PERCENT = 60;
/** Ten blocks, the last of them not full. */
const LONG = { people: 19_501, seed: 7 };
/** Two blocks. */
const SHORT = { people: 2001 };

let test: TestApp;
let place: SetPlace;
let owner: Person;
let draft: { number: number; document: SetDocument };
const workers: WorkerProcess[] = [];

beforeAll(async () => {
  test = await startTestApp({
    studyBlockPeople: 2000,
    studyAtOnceMs: 60,
    blockTimeoutSeconds: BLOCK_TIMEOUT_SECONDS,
  });
  place = await createSet(test, await createProduction(test));
  ({ owner } = place.workshop);
  draft = (await as(test, owner).get(`${place.setPath}/draft`).expect(200)).body;
});
afterAll(async () => {
  await Promise.all(workers.map((worker) => worker.end('SIGKILL')));
  await test.close();
});

interface StudyBody {
  id: string;
  state: string;
  progress: { blocks: number; done: number };
  result?: StudyShares;
  fault?: string;
}

const asked = (given: Record<string, unknown> = {}) => ({
  populationId: 'us-civilians-2015',
  womenPercent: WOMEN_PERCENT,
  draftNumber: draft.number,
  ...LONG,
  ...given,
});
const studies = () => `${place.setPath}/studies`;
const start = async (given: Record<string, unknown> = {}): Promise<StudyBody> =>
  (await as(test, owner).post(studies()).send(asked(given)).expect(201)).body as StudyBody;
const look = async (id: string): Promise<StudyBody> =>
  (await as(test, owner).get(`${studies()}/${id}`).expect(200)).body as StudyBody;

async function until<T>(ask: () => Promise<T>, right: (answer: T) => boolean): Promise<T> {
  for (let turn = 0; turn < 900; turn += 1) {
    const answer = await ask();
    if (right(answer)) return answer;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error(`waited in vain\n${workers.map(({ words }) => words.slice(-2000)).join('\n')}`);
}

const untilEnded = (id: string) =>
  until(
    () => look(id),
    ({ state }) => !['queued', 'running'].includes(state),
  );

const counted = new Map<string, unknown>();

/** The same question in one call of the library. */
function inOneCall({ people, seed }: { people: number; seed: number }): unknown {
  const key = `${people} ${seed}`;
  if (!counted.has(key)) {
    const civilians = civilians2015(readSeedData('populations/civilian-2015'));
    const draws = mixOf(civilians, civilians, WOMEN_PERCENT / 100).draw(people, seed);
    const { places } = measureSet(draft.document);
    const ruleBook = loadRuleBook(readSeedData('fit-rules'));
    const shares = createStudy(draws, { places, ruleBook, wear: STUDY_WEAR }).shares({ overDrop: true });
    counted.set(key, JSON.parse(JSON.stringify(shares)));
  }
  return counted.get(key);
}

async function startWorkers(count: number): Promise<void> {
  for (let n = 0; n < count; n += 1) workers.push(new WorkerProcess(test));
  const ready = () => Promise.resolve(workers.every(({ words }) => words.includes('ready to work')));
  await until(ready, (all) => all);
}

const activeJobs = async (): Promise<number> => {
  const [{ count }] = await test.dataSource.query(
    `SELECT count(*)::int AS count FROM jobs.job WHERE name LIKE 'study-blocks-%' AND state = 'active'`,
  );
  return count as number;
};
/** Somebody froze while it kept a block. */
const waitingForLocks = async (): Promise<number> => {
  const [{ count }] = await test.dataSource.query(
    'SELECT count(*)::int AS count FROM pg_locks WHERE NOT granted',
  );
  return count as number;
};
const blockRows = async (studyId: string): Promise<number> =>
  (await test.dataSource.query('SELECT 1 FROM study_blocks WHERE study_id = $1', [studyId])).length;

describe('a short study', () => {
  it('is done in the answer, as the library counts it', async () => {
    const study = await start({ people: 300, seed: 3 });
    expect(study).toMatchObject({ state: 'done', progress: { blocks: 1, done: 1 } });
    expect(study.result).toEqual(inOneCall({ people: 300, seed: 3 }));
  });

  it('counts ticked rules and places only for all at once, and may study a revision', async () => {
    const placeIds = measureSet(draft.document)
      .places.slice(0, 1)
      .map(({ placeId }) => placeId);
    await as(test, owner).post(`${place.setPath}/revisions`).send({ baseNumber: draft.number }).expect(201);
    const given = {
      people: 300,
      ruleIds: ['SEAT-04'],
      placeIds,
      draftNumber: undefined,
      revisionLetter: 'a',
    };
    const study = await start(given);
    expect(study).toMatchObject({ revisionLetter: 'A', ruleIds: ['SEAT-04'], placeIds });
    expect(study).not.toHaveProperty('draftNumber');
    expect(study.result?.checks.map(({ ruleId }) => ruleId)).toEqual(['SEAT-04']);
    expect(study.result?.places).toHaveLength(1);
  });
});

describe('what is sent as null', () => {
  it('counts as not sent', async () => {
    const nothing = { seed: null, ruleIds: null, placeIds: null, revisionLetter: null, womenPercent: null };
    const study = await start({ ...nothing, people: 300, populationId: 'german' });
    expect(study).toMatchObject({ state: 'done', seed: 1 });
    expect(study).not.toHaveProperty('womenPercent');
  });
});

describe('a question that cannot be counted', () => {
  it.each([
    [
      'a population that is none',
      { populationId: 'martians' },
      'populationId',
      /"martians"; accepted: us-sol/,
    ],
    ['too many people', { people: 1_000_001 }, 'people', /1000000; read 1000001/],
    ['a share beyond all', { womenPercent: 101 }, 'womenPercent', /100; read 101/],
    ['women among men only', { populationId: 'german' }, 'womenPercent', /read 60; .*men only; accepted: 0/],
    ['a rule that is none', { ruleIds: ['SEAT-04', 'X-9'] }, 'ruleIds.1', /"X-9"; accepted: .*SEAT-04/],
    ['no rule at all', { ruleIds: [] }, 'ruleIds', /1/],
    ['a place that is none', { placeIds: ['b9:1'] }, 'placeIds.0', /"b9:1"; accepted: /],
    ['two documents', { revisionLetter: 'A' }, 'draftNumber', /read both; accepted/],
    ['no document', { draftNumber: undefined }, 'draftNumber', /read neither; accepted/],
  ])('says field, value and what is accepted of %s', async (_what, given, path, words) => {
    const { body } = await as(test, owner).post(studies()).send(asked(given)).expect(400);
    expect(body.fields).toEqual([expect.objectContaining({ path, message: expect.stringMatching(words) })]);
  });

  it('is not asked of a draft that moved on', async () => {
    const { body } = await as(test, owner)
      .post(studies())
      .send(asked({ draftNumber: 99 }))
      .expect(409);
    expect(body).toMatchObject({ code: 'draft-moved-on', currentNumber: draft.number });
  });

  it('is not asked of a set without a place', async () => {
    const empty = await createSet(test, place, { name: 'Nothing yet', arrangement: 'empty' });
    const path = `${empty.setPath}/studies`;
    const { body } = await as(test, owner)
      .post(path)
      .send(asked({ draftNumber: 1 }))
      .expect(400);
    expect(body.fields[0]).toMatchObject({ path: 'placeIds', code: 'no-places' });
  });
});

describe('a long study', () => {
  it('waits for a worker, is cancelled, and is then left alone', async () => {
    const study = await start();
    expect(study).toMatchObject({ state: 'queued', progress: { blocks: 10, done: 0 } });
    const cancel = `${studies()}/${study.id}/cancel`;
    expect((await as(test, owner).post(cancel).expect(200)).body.state).toBe('cancelled');
    await startWorkers(1);
    const next = await start(SHORT);
    await untilEnded(next.id);
    expect(workers[0]?.counted(study.id)).toEqual([]);
    expect((await look(study.id)).progress.done).toBe(0);
    expect((await as(test, owner).post(`${studies()}/${next.id}/cancel`).expect(409)).body.code).toBe(
      'study-ended',
    );
  });

  it('gives one worker the answer of a single call', async () => {
    const { id } = await start();
    const done = await untilEnded(id);
    expect(done).toMatchObject({ state: 'done', progress: { blocks: 10, done: 10 } });
    expect(done.result).toEqual(inOneCall(LONG));
    expect([...(workers[0]?.counted(id) ?? [])].sort((a, b) => a - b)).toEqual([
      0, 1, 2, 3, 4, 5, 6, 7, 8, 9,
    ]);
    expect(await blockRows(id)).toBe(0);
  });

  it('gives three workers the same, and they share it', async () => {
    await startWorkers(2);
    let id = '';
    const shared = () => workers.filter((worker) => worker.counted(id).length > 0).length;
    // Ten blocks may be over before the third has looked for one.
    for (let n = 0; n < 40 && shared() < 3; n += 1) {
      ({ id } = await start());
      await untilEnded(id);
    }
    expect(shared()).toBe(3);
    expect((await look(id)).result).toEqual(inOneCall(LONG));
  });

  it('is cancelled in the middle', async () => {
    const { id } = await start({ people: 400_000 });
    await until(
      () => look(id),
      ({ progress }) => progress.done > 0,
    );
    expect((await as(test, owner).post(`${studies()}/${id}/cancel`).expect(200)).body.state).toBe(
      'cancelled',
    );
    await until(activeJobs, (count) => count === 0);
    const after = await look(id);
    expect(after.state).toBe('cancelled');
    expect(after.progress.done).toBeLessThan(200);
    expect(await blockRows(id)).toBe(0);
  });

  it('ends with the same answer when a worker is killed in the middle of a block', async () => {
    const [victim] = workers;
    if (!victim) throw new Error('no worker runs');
    let id = '';
    let held = 0;
    // A frozen worker holds a block when one is still active after the others have done the rest.
    while (held === 0) {
      victim.signal('SIGCONT');
      ({ id } = await start());
      // The others may be through before the victim has looked for a block: then once more.
      await until(
        async () => victim.counted(id).length > 0 || (await look(id)).state === 'done',
        (isOn) => isOn,
      );
      victim.signal('SIGSTOP');
      await until(
        async () => ({ ...(await look(id)), active: await activeJobs(), waiting: await waitingForLocks() }),
        ({ state, progress, active, waiting }) =>
          state === 'done' || (progress.done === 9 && active === 1) || waiting > 0,
      );
      held = (await look(id)).state === 'running' ? 1 : 0;
    }
    expect(await victim.end('SIGKILL')).toEqual({ code: null, signal: 'SIGKILL' });
    const done = await untilEnded(id);
    expect(done).toMatchObject({ state: 'done', progress: { blocks: 10, done: 10 } });
    expect(done.result).toEqual(inOneCall(LONG));
  });

  it('fails in words when a block cannot be counted by anybody', async () => {
    workers.forEach((worker) => worker.signal('SIGSTOP'));
    const { id } = await start();
    await test.dataSource.query(
      `UPDATE studies SET question = jsonb_set(question, '{places}', '[null]') WHERE id = $1`,
      [id],
    );
    workers.forEach((worker) => worker.signal('SIGCONT'));
    const failed = await untilEnded(id);
    expect(failed).toMatchObject({ state: 'failed', fault: expect.stringMatching(/could not be counted/) });
    expect(failed).not.toHaveProperty('result');
  });

  it('is not begun while five others are not done', async () => {
    workers.forEach((worker) => worker.signal('SIGSTOP'));
    // All at once, so that none sees the others' studies before they are kept.
    const answers = await Promise.all(
      Array.from({ length: 7 }, () => as(test, owner).post(studies()).send(asked(SHORT))),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 201, 201, 201, 201, 409, 409]);
    const refused = answers.find(({ status }) => status === 409);
    expect(refused?.body.code).toBe('too-many-studies');
    workers.forEach((worker) => worker.signal('SIGCONT'));
  });
});

describe('a worker', () => {
  it('finishes its block when it is told to stop, and leaves the rest', async () => {
    const ends = await Promise.all(workers.slice(1).map((worker) => worker.end('SIGTERM')));
    expect(ends).toEqual([1, 2].map(() => ({ code: null, signal: 'SIGTERM' })));
    expect(await activeJobs()).toBe(0);
  });
});

describe('how those who do not fit differ from the rest', () => {
  it('is told in measures to owner and designer only', async () => {
    const { id } = await start({ people: 300 });
    for (const role of ['designer', 'carpenter', 'reviewer'] as const) {
      const member = await createMember(test, place.workshop.id, role);
      const { body } = await as(test, member).get(`${studies()}/${id}`).expect(200);
      const list = (await as(test, member).get(studies()).expect(200)).text;
      const lost = body.result.checks.flatMap((check: { lost?: object }) => check.lost ?? []);
      expect(lost.length).toBeGreaterThan(0);
      const keys = ['share', 'women', 'words', ...(role === 'designer' ? ['traits'] : [])].sort();
      for (const one of lost) expect([role, Object.keys(one).sort()]).toEqual([role, keys]);
      if (role === 'designer') continue;
      for (const word of ['traits', 'lostMean', 'restMean']) {
        expect(`${JSON.stringify(body)} ${list}`).not.toContain(word);
      }
    }
    await as(test, owner).delete(`${studies()}/${id}`).expect(204);
  });
});

describe('what is kept', () => {
  it('is listed newest first, read by everybody, and removed', async () => {
    const reviewer = await createMember(test, place.workshop.id, 'reviewer');
    const { id } = await start({ people: 200 });
    const { body } = await as(test, reviewer).get(studies()).expect(200);
    expect(body.items[0]).toMatchObject({ id, outcome: { kind: 'shares' } });
    expect(body.items[0]).not.toHaveProperty('result');
    expect(body.items.length).toBeLessThanOrEqual(20);
    const read = await as(test, reviewer).get(`${studies()}/${id}`).expect(200);
    expect(read.body.result.all.kind).toBe('shares');
    await as(test, owner).delete(`${studies()}/${id}`).expect(204);
    await as(test, owner).get(`${studies()}/${id}`).expect(404);
    const actions: { action: string }[] = await test.dataSource.query(
      `SELECT action FROM audit_entries WHERE subject_id = $1 ORDER BY at`,
      [id],
    );
    expect(actions.map(({ action }) => action)).toEqual(['study.started', 'study.removed']);
  });
});
