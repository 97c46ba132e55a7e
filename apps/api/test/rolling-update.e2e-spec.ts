import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import { WorkVersion } from '../src/jobs/work-version';
import { as, type Person } from './factories/people';
import { createProduction, createSet } from './factories/productions';
import { startWorkerOf } from './factories/workers';
import { startAppOn, startTestApp, type TestApp } from './test-app';

jest.setTimeout(120_000);

/** A server of each version, on one database, as while one is replaced by the other. */
const servers = new Map<string, TestApp>();
const server = (version: string) => servers.get(version) as TestApp;
const workers: { close(): Promise<void> }[] = [];
let setPath: string;
let owner: Person;

beforeAll(async () => {
  const of = (own: string) => (builder: Parameters<NonNullable<Parameters<typeof startAppOn>[1]>>[0]) =>
    builder.overrideProvider(WorkVersion).useValue({ own });
  // Every study waits for workers.
  const old = await startTestApp({ studyAtOnceMs: 0, blockTimeoutSeconds: 30 }, '', of('old'));
  servers.set('old', old);
  servers.set('new', await startAppOn(old.settings, of('new')));
  const place = await createSet(old, await createProduction(old));
  ({ setPath } = place);
  ({ owner } = place.workshop);
});
afterAll(async () => {
  for (const worker of workers) await worker.close();
  for (const one of [...servers.values()].reverse()) await one.close();
});

const KINDS = {
  studies: { populationId: 'british', people: 200, draftNumber: 1 },
  suggestions: {
    populationId: 'british',
    free: [{ dimensionId: 'seat-tilt', tolerance: 1 }],
    draftNumber: 1,
  },
} as const;
type Kind = keyof typeof KINDS;

let asked = 0;
/** Each a question of its own, for the same one is not begun twice. */
const begin = async (version: string, kind: Kind): Promise<string> =>
  (
    await as(server(version), owner)
      .post(`${setPath}/${kind}`)
      .send({ ...KINDS[kind], womenPercent: (asked += 1) })
      .expect(({ status }) => expect([201, 202]).toContain(status))
  ).body.id as string;
const look = async (kind: Kind, id: string): Promise<{ state: string; fault?: string }> =>
  (await as(server('new'), owner).get(`${setPath}/${kind}/${id}`).expect(200)).body;

async function untilEnded(kind: Kind, id: string): Promise<{ state: string; fault?: string }> {
  for (let turn = 0; turn < 900; turn += 1) {
    const answer = await look(kind, id);
    if (!['queued', 'running'].includes(answer.state)) return answer;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error('waited in vain');
}

const jobsOf = (id: string): Promise<{ state: string; retry_count: number; started_on: Date | null }[]> =>
  server('new').dataSource.query(
    `SELECT state, retry_count, started_on FROM jobs.job WHERE data::text LIKE $1`,
    [`%${id}%`],
  );

describe.each(Object.keys(KINDS) as Kind[])('%s while servers and workers are replaced', (kind) => {
  it('wait untouched for workers of the version they were begun with', async () => {
    const later = await begin('new', kind);
    workers.push(await startWorkerOf('old', server('old')));
    // The old worker looked into its queue after the new work was there, and did what it found.
    const earlier = await begin('old', kind);
    expect(await untilEnded(kind, earlier)).toMatchObject({ state: 'done' });
    expect((await look(kind, later)).state).toBe('queued');
    expect(await jobsOf(later)).toEqual([{ state: 'created', retry_count: 0, started_on: null }]);
    workers.push(await startWorkerOf('new', server('new')));
    expect(await untilEnded(kind, later)).toMatchObject({ state: 'done' });
    for (const worker of workers.splice(0)) await worker.close();
  });

  it('fail in words when no worker of their version comes any more', async () => {
    const [left, fresh] = [await begin('old', kind), await begin('old', kind)];
    const table = kind === 'studies' ? 'studies' : 'dimension_searches';
    await server('new').dataSource.query(
      `UPDATE ${table} SET started_at = now() - interval '2 hours' WHERE id = $1`,
      [left],
    );
    workers.push(await startWorkerOf('new', server('new')));
    const ended = await untilEnded(kind, left);
    expect(ended).toMatchObject({ state: 'failed', fault: expect.stringMatching(/another version/) });
    // What was begun a moment ago may still have its workers.
    expect((await look(kind, fresh)).state).toBe('queued');
    for (const worker of workers.splice(0)) await worker.close();
  });
});
