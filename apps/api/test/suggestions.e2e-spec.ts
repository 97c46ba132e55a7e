import { createBodyModel, loadRuleBook, mixOf, type Sitter } from '@settlewright/anthropometry';
import {
  dimensionsOf,
  judgeChoices,
  type FreeDimension,
  type SetDocument,
  suggestDimensions,
  type Suggestion,
  type Tried,
} from '@settlewright/geometry';
import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import { readSeedData } from '../src/common/seed-data';
import { WorkVersion } from '../src/jobs/work-version';
import { builtInPopulation } from '../src/populations/built-in';
import type { SuggestionDto } from '../src/suggestions/dto/suggestion.dto';
import { as, createMember, type Person } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { BLOCK_TIMEOUT_SECONDS, startWorkerOf, WorkerProcess } from './factories/workers';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(240_000);

let test: TestApp;
let place: SetPlace;
let owner: Person;
let castIds: string[];
let draft: { number: number; document: SetDocument };
const STATURES = [1480, 1980];

beforeAll(async () => {
  // Parts so short that a search is cut many times.
  test = await startTestApp({ searchPartMs: 20, blockTimeoutSeconds: BLOCK_TIMEOUT_SECONDS });
  const production = await createProduction(test);
  castIds = [
    await createCastMember(test, production, { name: 'Hetty Vance', statureMm: STATURES[0] }),
    await createCastMember(test, production, {
      name: 'Tobias Marr',
      bodyData: 'men',
      statureMm: STATURES[1],
    }),
  ];
  place = await createSet(test, production);
  ({ owner } = place.workshop);
  const { body } = await as(test, owner).get(`${place.setPath}/draft`).expect(200);
  const document = body.document as SetDocument;
  document.seating = castIds.map((castId, n) => ({
    pieceId: document.pieces.filter(({ kind }) => kind === 'bench')[n]?.id ?? '',
    place: 1,
    sitter: { kind: 'cast', castId },
  }));
  const saved = await as(test, owner)
    .put(`${place.setPath}/draft`)
    .send({ baseNumber: body.number, document })
    .expect(200);
  draft = { number: saved.body.number, document };
});
afterAll(() => test.close());

const path = () => `${place.setPath}/suggestions`;
const FREE = [
  { dimensionId: 'seat-height', tolerance: 60 },
  { dimensionId: 'seat-depth', min: 400, max: 470, step: 5 },
];
const asked = (given: Record<string, unknown> = {}) => ({
  free: FREE,
  populationId: 'british',
  womenPercent: 60,
  draftNumber: draft.number,
  ...given,
});
const start = async (given: Record<string, unknown> = {}): Promise<SuggestionDto> =>
  (await as(test, owner).post(path()).send(asked(given)).expect(202)).body as SuggestionDto;
const look = async (id: string, who: Person = owner): Promise<SuggestionDto> =>
  (await as(test, who).get(`${path()}/${id}`).expect(200)).body as SuggestionDto;
const cancel = (id: string) => as(test, owner).post(`${path()}/${id}/cancel`);

async function until<T>(ask: () => Promise<T>, right: (answer: T) => boolean, words = () => ''): Promise<T> {
  for (let turn = 0; turn < 4000; turn += 1) {
    const answer = await ask();
    if (right(answer)) return answer;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error(`waited in vain ${words()}`);
}
const isOver = ({ state }: { state: string }) => !['queued', 'running'].includes(state);
const untilEnded = (id: string) => until(() => look(id), isOver);
const rowsOf = async (table: string, column: string, id: string): Promise<number> =>
  (await test.dataSource.query(`SELECT 1 FROM ${table} WHERE ${column} = $1`, [id])).length;

/** Work by a worker in this process, while it lasts. */
async function withWorker<T>(work: () => Promise<T>): Promise<T> {
  const worker = await startWorkerOf(new WorkVersion().own, test);
  try {
    return await work();
  } finally {
    await worker.close();
  }
}

/** The same question in one call of the library. */
function inOneCall(free: FreeDimension[]): Suggestion & { counted: string[] } {
  const { document } = draft;
  const sitters = castIds.map((id, n): Sitter => {
    const { pieceId } = document.seating[n] as SetDocument['seating'][number];
    return {
      id,
      name: id,
      kind: 'cast',
      placeId: `${pieceId}:1`,
      person: {
        bodyData: n === 0 ? 'women' : 'men',
        stature: { mm: STATURES[n] as number, source: 'told' },
        measured: {},
        shoeMm: 25,
        clothing: 'light',
      },
    };
  });
  const british = builtInPopulation('british');
  if (!british) throw new Error('no population');
  const input = { document, dimensions: dimensionsOf(document), free };
  const judging = judgeChoices(input, {
    sitters,
    ruleBook: loadRuleBook(readSeedData('fit-rules')),
    model: createBodyModel(readSeedData('populations/ansur2')),
    crowd: { draws: mixOf(british, british, 0.6).draw(4000, 1), wear: { shoeMm: 25, clothing: 'light' } },
  });
  const steps = suggestDimensions({ ...input, ...judging });
  for (let step = steps.next(); ; step = steps.next()) {
    if (step.done) return { ...step.value, counted: judging.counted };
  }
}

const plain = (value: unknown): unknown => JSON.parse(JSON.stringify(value));
const freeOf = ({ free }: SuggestionDto): FreeDimension[] =>
  free.map(({ dimensionId, min, max, step }) => ({ dimensionId, min, max, step }));
const choiceOf = (free: FreeDimension[], { values, ...tried }: Tried) => ({
  ...tried,
  values: free.map(({ dimensionId }, i) => ({ dimensionId, value: values[i] })),
});

function expectLibraryAnswers(told: SuggestionDto): void {
  const free = freeOf(told);
  const end = inOneCall(free);
  expect(told.answers.map(({ sitters: _who, pieces: _what, ...answer }) => answer)).toEqual(
    plain(end.answers.map(({ kind, tried }) => ({ kind, ...choiceOf(free, tried) }))),
  );
  expect(told.present).toEqual(plain(end.present && choiceOf(free, end.present)));
  expect(told.blame).toEqual(end.blame);
  expect(told.counted).toEqual(end.counted);
  expect(told.progress).toEqual({ done: end.done, of: end.done });
}

/** Whom an answer costs and whom it helps agrees with what it misses. */
function expectEffects({ answers }: SuggestionDto): void {
  const isMet = (state: string) => ['fits', 'tight'].includes(state);
  const changes = answers.flatMap(({ misses, sitters }) =>
    sitters.flatMap(({ sitterId, gains, losses }) =>
      [...gains, ...losses].map(({ ruleId, from, to }) => ({
        turns: isMet(from) !== isMet(to),
        isMet: isMet(to),
        isMissed: misses.some((miss) => miss.sitterId === sitterId && miss.ruleId === ruleId),
      })),
    ),
  );
  expect(changes.filter(({ turns }) => turns).length).toBeGreaterThan(0);
  for (const one of changes) expect(one.isMissed).toBe(!one.isMet);
}

describe('a search for dimensions', () => {
  it('waits for a worker, and gives the answers of one call of the library however it is cut into parts', async () => {
    const begun = await start();
    expect(begun).toMatchObject({ state: 'queued', answers: [], draftNumber: draft.number });
    expect(begun.served.map(({ name }) => name)).toEqual(['Hetty Vance', 'Tobias Marr']);
    const [height, depth] = begun.free;
    expect(height).toMatchObject({ min: height!.value - 60, max: height!.value + 60, step: 1, unit: 'mm' });
    expect(depth).toMatchObject({ min: 400, max: 470, step: 5 });
    const done = await withWorker(() => untilEnded(begun.id));
    expect(done).toMatchObject({ state: 'done', servesAll: false });
    expectLibraryAnswers(done);
    expectEffects(done);
    expect(done.blame?.left).toBeLessThan(done.answers[0]?.misses.length ?? 0);
    const [row] = await test.dataSource.query(
      'SELECT part, question, digest FROM dimension_searches WHERE id = $1',
      [begun.id],
    );
    expect(row).toMatchObject({ question: null, digest: null });
    expect(row.part).toBeGreaterThan(2);
    expect(await rowsOf('search_tries', 'search_id', begun.id)).toBe(0);
  });

  it('serves only those who are to be served', async () => {
    const { id } = await start({ sitterIds: [castIds[1]], free: [FREE[0]] });
    const { answers, served } = await withWorker(() => untilEnded(id));
    expect(served).toEqual([{ sitterId: castIds[1], name: 'Tobias Marr' }]);
    const told = answers.flatMap(({ misses, sitters }) => [...misses, ...sitters]);
    expect(new Set(told.map(({ sitterId }) => sitterId))).toEqual(new Set([castIds[1]]));
  });

  it('is asked of an issued revision, of nobody but a population, and of what is sent as null', async () => {
    await as(test, owner).post(`${place.setPath}/revisions`).send({ baseNumber: draft.number }).expect(201);
    const nothing = { draftNumber: null, womenPercent: null };
    const { id } = await start({ ...nothing, revisionLetter: 'a', sitterIds: [] });
    const done = await withWorker(() => untilEnded(id));
    expect(done).toMatchObject({
      state: 'done',
      revisionLetter: 'A',
      served: [],
      servesAll: true,
      womenPercent: 50,
    });
    expect(done.answers[0]?.share).toBeGreaterThan(0);
    expect(done).not.toHaveProperty('blame');
  });

  it('goes on from what was tried when a worker is killed in the middle', async () => {
    const both = ['seat-height', 'table-height'];
    const { id } = await start({ free: both.map((dimensionId) => ({ dimensionId, tolerance: 30 })) });
    const victim = new WorkerProcess(test);
    await until(
      () => look(id),
      ({ progress, state }) => isOver({ state }) || progress.done > 0,
      () => victim.words.slice(-2000),
    );
    expect(await victim.end('SIGKILL')).toEqual({ code: null, signal: 'SIGKILL' });
    const left = await look(id);
    expect(left.state).toBe('running');
    expect(left.answers.length).toBeGreaterThan(0);
    const heir = new WorkerProcess(test);
    try {
      const done = await until(
        () => look(id),
        isOver,
        () => heir.words.slice(-2000),
      );
      expect(done.state).toBe('done');
      expectLibraryAnswers(done);
      expect(Math.min(...heir.wentOnFrom(id))).toBeGreaterThan(0);
      expect(await heir.end('SIGTERM')).toEqual({ code: null, signal: 'SIGTERM' });
    } finally {
      await heir.end('SIGKILL');
    }
  });

  it('is begun once when it is asked twice at once', async () => {
    const [one, other] = await Promise.all([start(), start()]);
    expect(other.id).toBe(one.id);
    expect((await start()).id).toBe(one.id);
    const another = await start({ womenPercent: 57 });
    expect(another).toMatchObject({ womenPercent: 57 });
    expect(another.id).not.toBe(one.id);
    const jobs = await test.dataSource.query(`SELECT 1 FROM jobs.job WHERE data::text LIKE $1`, [
      `%${one.id}%`,
    ]);
    expect(jobs).toHaveLength(1);
    for (const { id } of [one, another]) await cancel(id).expect(200);
    // Once it is over, it is a new question.
    const again = await start();
    expect(again.id).not.toBe(one.id);
    await cancel(again.id).expect(200);
  });

  it('is cancelled while it waits, and in the middle, and keeps what it found', async () => {
    const waiting = await start();
    expect((await cancel(waiting.id).expect(200)).body).toMatchObject({ state: 'cancelled', answers: [] });
    const { id } = await start({ womenPercent: 40 });
    await withWorker(async () => {
      await until(
        () => look(id),
        ({ progress }) => progress.done > 0,
      );
      const { body } = await cancel(id).expect(200);
      expect(body.state).toBe('cancelled');
      expect(body.answers.length).toBeGreaterThan(0);
      const open = async () =>
        (
          await test.dataSource.query(
            `SELECT 1 FROM jobs.job WHERE data::text LIKE $1 AND state IN ('created', 'retry', 'active')`,
            [`%${id}%`],
          )
        ).length as number;
      await until(open, (count) => count === 0);
      expect((await look(id)).progress).toEqual(body.progress);
    });
    expect(await rowsOf('search_tries', 'search_id', id)).toBe(0);
    expect((await look(waiting.id)).progress.done).toBe(0);
    await cancel(id).expect(200);
    const { body } = await as(test, owner).get(path()).expect(200);
    const done = (body.items as SuggestionDto[]).find(({ state }) => state === 'done');
    expect((await cancel(done?.id ?? '').expect(409)).body.code).toBe('search-ended');
  });

  it('fails in words when nobody can work it out', async () => {
    const { id } = await start();
    await test.dataSource.query(
      `UPDATE dimension_searches SET question = (question::jsonb || '{"document": null}')::json WHERE id = $1`,
      [id],
    );
    const failed = await withWorker(() => untilEnded(id));
    expect(failed).toMatchObject({
      state: 'failed',
      fault: expect.stringMatching(/could not be worked out/),
    });
  });

  it('is not begun while five others are not done; of those that ended, twenty are kept', async () => {
    const many = Array.from({ length: 7 }, (_, n) => asked({ womenPercent: n }));
    const answers = await Promise.all(many.map((body) => as(test, owner).post(path()).send(body)));
    expect(answers.map(({ status }) => status).sort()).toEqual([202, 202, 202, 202, 202, 409, 409]);
    expect(answers.find(({ status }) => status === 409)?.body.code).toBe('too-many-searches');
    for (const { status, body } of answers) if (status === 202) await cancel(body.id).expect(200);
    for (let n = 0; n < 21; n += 1) await cancel((await start({ womenPercent: n })).id).expect(200);
    expect(await rowsOf('dimension_searches', 'set_id', place.setId)).toBe(20);
    const { body } = await as(test, owner).get(path()).expect(200);
    expect(body.items).toHaveLength(20);
    expect(body.items[0]).toMatchObject({ state: 'cancelled', womenPercent: 20 });
    expect(body.items[0]).not.toHaveProperty('answers');
    await as(test, owner).delete(`${path()}/${body.items[0].id}`).expect(204);
    await as(test, owner).get(`${path()}/${body.items[0].id}`).expect(404);
  });
});

describe('a search that cannot be made', () => {
  const free = (change: Record<string, unknown>) => ({ free: [{ dimensionId: 'seat-height', ...change }] });
  it.each([
    [
      'a dimension that is none',
      { free: [{ dimensionId: 'ears', tolerance: 5 }] },
      'free.0.dimensionId',
      /"ears"; accepted: seat-height, /,
    ],
    ['nothing that may move', { free: [] }, 'free', /1/],
    [
      'one number moved twice',
      { free: [FREE[0], { dimensionId: 'seat-and-tables', tolerance: 5 }] },
      'free.1.dimensionId',
      /"seat-and-tables", which moves already with “Seat height/,
    ],
    [
      'one dimension twice',
      { free: [FREE[0], FREE[0]] },
      'free.1.dimensionId',
      /moves already.*accepted: one of the two/,
    ],
    ['no range', free({}), 'free.0', /read none of them; accepted: min and max, or tolerance/],
    [
      'two ranges',
      free({ min: 400, max: 450, tolerance: 3 }),
      'free.0',
      /read min and max and tolerance; accepted/,
    ],
    ['half a range', free({ min: 400 }), 'free.0', /read min; accepted/],
    [
      'a range beyond what is looked at',
      free({ min: 100, max: 450 }),
      'free.0.min',
      /read 100; accepted: [\d.]+ to [\d.]+ mm/,
    ],
    [
      'a range turned round',
      free({ min: 450, max: 440 }),
      'free.0.max',
      /read 440, which is less than min; accepted/,
    ],
    ['a step of nothing', free({ tolerance: 5, step: 0 }), 'free.0.step', /0\.1; read 0/],
    [
      'somebody who does not sit here',
      { sitterIds: ['nobody'] },
      'sitterIds.0',
      /"nobody"; accepted: [0-9a-f-]{36}/,
    ],
    [
      'nobody at all',
      { sitterIds: [], populationId: null, womenPercent: null },
      'sitterIds',
      /nobody is to be served; accepted/,
    ],
    [
      'a population that is none',
      { populationId: 'martians' },
      'populationId',
      /"martians"; accepted: us-sol/,
    ],
    ['a share beyond all', { womenPercent: 101 }, 'womenPercent', /100; read 101/],
    ['women among men only', { populationId: 'german' }, 'womenPercent', /men only; accepted: 0/],
    ['a mix of nobody', { populationId: null }, 'womenPercent', /read 60 without a population; accepted/],
    ['two documents', { revisionLetter: 'A' }, 'draftNumber', /read both; accepted/],
    ['no document', { draftNumber: undefined }, 'draftNumber', /read neither; accepted/],
  ])('says field, value and what is accepted of %s', async (_what, given, field, words) => {
    const { body } = await as(test, owner).post(path()).send(asked(given)).expect(400);
    expect(body.fields).toEqual([
      expect.objectContaining({ path: field, message: expect.stringMatching(words) }),
    ]);
  });

  it('is not asked of a draft that moved on, nor of a set without a place', async () => {
    const { body } = await as(test, owner)
      .post(path())
      .send(asked({ draftNumber: 99 }))
      .expect(409);
    expect(body).toMatchObject({ code: 'draft-moved-on', currentNumber: draft.number });
    const empty = await createSet(test, place, { name: 'Nothing yet', arrangement: 'empty' });
    const answer = await as(test, owner)
      .post(`${empty.setPath}/suggestions`)
      .send(asked({ draftNumber: 1 }));
    expect(answer.status).toBe(400);
    expect(answer.body.fields).toContainEqual(expect.objectContaining({ code: 'no-places' }));
  });
});

describe('what is kept of bodies', () => {
  it('is told in millimetres to owner and designer only, and goes with an erased person', async () => {
    const { id } = await start();
    await withWorker(() => untilEnded(id));
    const byMm = ({ answers, present }: SuggestionDto) =>
      [...answers, ...(present ? [present] : [])].flatMap(({ misses }) =>
        misses.flatMap((one) => one.byMm ?? []),
      );
    for (const role of ['designer', 'carpenter', 'reviewer'] as const) {
      const told = await look(id, await createMember(test, place.workshop.id, role));
      expect(told.answers[0]?.misses.length).toBeGreaterThan(0);
      expect([role, byMm(told).length > 0]).toEqual([role, role === 'designer']);
    }
    const open = await start({ womenPercent: 33 });
    const before = await look(id);
    await as(test, owner).delete(`${place.path}/cast/${castIds[1]}`).expect(204);
    const after = await look(id);
    expect(after.served.map(({ name }) => name)).toEqual(['Hetty Vance', 'removed sitter 1']);
    const others = (told: SuggestionDto) =>
      told.answers.flatMap(({ misses }) => misses.filter(({ sitterId }) => sitterId !== castIds[1]));
    expect(others(after)).toEqual(others(before));
    const own = (told: SuggestionDto) =>
      told.answers.flatMap(({ misses }) => misses.filter(({ sitterId }) => sitterId === castIds[1]));
    expect(own(before).flatMap((one) => one.byMm ?? []).length).toBeGreaterThan(0);
    expect(own(after)).toEqual(own(before).map(({ byMm: _gone, ...miss }) => miss));
    // What was not done held the body.
    expect(await look(open.id)).toMatchObject({ state: 'failed', fault: expect.stringMatching(/erased/) });
    const rows = JSON.stringify(await test.dataSource.query('SELECT * FROM dimension_searches'));
    expect(rows).not.toContain('Tobias');
    expect(rows).not.toContain(`"mm":${STATURES[1]}`);
    const { number } = (await as(test, owner).get(`${place.setPath}/draft`).expect(200)).body;
    const next = await start({ draftNumber: number });
    expect(next.served.map(({ name }) => name)).toEqual(['Hetty Vance']);
    await cancel(next.id).expect(200);
  });
});
