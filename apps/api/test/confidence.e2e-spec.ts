import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import type { FitSheet } from '@settlewright/anthropometry';
import { ARRANGEMENTS } from '@settlewright/geometry';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity';
import { readPaper } from './factories/papers';
import { as, createMember } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

describe('the probability that verdicts ask for', () => {
  let test: TestApp;
  let place: SetPlace;
  let workshopPath: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    const production = await createProduction(test);
    // Of whom nothing is known, much depends on how sure a verdict must be.
    const castId = await createCastMember(test, production, { bodyData: 'mixed', statureMm: null });
    const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
    const bench = document.pieces.find(({ kind }) => kind === 'bench')!;
    document.seating = [{ pieceId: bench.id, place: 1, sitter: { kind: 'cast', castId } }];
    place = await createSet(test, production, { arrangement: undefined, document });
    workshopPath = `/workshops/${place.workshop.id}`;
  });
  const owner = () => as(test, place.workshop.owner);
  const ask = (confidence: number | null) => owner().patch(workshopPath).send({ confidence }).expect(200);
  const draftSheet = async () =>
    (await owner().get(`${place.setPath}/draft/fit-sheet`).expect(200)).body as FitSheet;
  const issue = () => owner().post(`${place.setPath}/revisions`).send({ baseNumber: 1 }).expect(201);
  const revisionSheet = async (letter: string) =>
    (await owner().get(`${place.setPath}/revisions/${letter}`).expect(200)).body.fitSheet as FitSheet;

  it('is read by everybody and changed by the owner, which is recorded', async () => {
    await ask(0.95);
    for (const role of ['designer', 'carpenter', 'reviewer'] as const) {
      const member = await createMember(test, place.workshop.id, role);
      await as(test, member).patch(workshopPath).send({ confidence: 0.6 }).expect(403);
      const { body } = await as(test, member).get(workshopPath).expect(200);
      expect(body).toMatchObject({ confidence: 0.95, confidenceSetAt: expect.any(String) });
    }
    await ask(0.95);
    await ask(null);
    const recorded = await test.dataSource.manager.find(AuditEntry, {
      where: { subjectId: place.workshop.id, action: 'workshop.confidence-changed' },
      order: { at: 'ASC' },
    });
    expect(recorded.map(({ userId, detail }) => [userId, detail])).toEqual([
      [place.workshop.owner.id, { from: null, to: 0.95 }],
      [place.workshop.owner.id, { from: 0.95, to: null }],
    ]);
  });

  it.each([0.5, 0.505, 1, 0, -0.9, 95, '0.9', 'high', true, [0.9], {}])('refuses %j', async (confidence) => {
    const { body } = await owner().patch(workshopPath).send({ confidence }).expect(400);
    expect(body.fields).toEqual([
      expect.objectContaining({
        path: 'confidence',
        message: expect.stringContaining('confidence accepts 0.51 to 0.99 in hundredths'),
      }),
    ]);
    expect((await owner().get(workshopPath)).body.confidence).toBeNull();
  });

  it.each([0.51, 0.57, 0.99])('takes %s', async (confidence) => {
    expect((await ask(confidence)).body.confidence).toBe(confidence);
  });

  it('leaves less unknown when less is asked, on the draft and in the list alike', async () => {
    const inList = async () => (await owner().get(`${place.path}/sets`).expect(200)).body.items[0].counts;
    const before = await inList();
    expect((await draftSheet()).confidence).toBe(0.9);
    await ask(0.6);
    const sheet = await draftSheet();
    expect(sheet.confidence).toBe(0.6);
    expect(sheet.counts.notKnown).toBeLessThan(before.notKnown);
    expect(await inList()).toEqual(sheet.counts);
    await ask(null);
    expect(await inList()).toEqual(before);
  });

  it('stays in a revision as it was when that was issued', async () => {
    await issue();
    await ask(0.6);
    await issue();
    await ask(0.8);
    const [first, second] = [await revisionSheet('A'), await revisionSheet('B')];
    expect([first.confidence, second.confidence]).toEqual([0.9, 0.6]);
    expect(second.counts.notKnown).toBeLessThan(first.counts.notKnown);
  });

  it('stands on paper and in the table, with the day', async () => {
    const draft = `${place.setPath}/draft/fit-sheet`;
    const csv = async (path: string) => (await owner().get(`${path}.csv`).expect(200)).text;
    expect(await csv(draft)).toContain(
      'A verdict is given at a probability of 0.90 or more; that is the default (shop rule).',
    );
    await ask(0.8);
    const today = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' }).format();
    expect(await csv(draft)).toContain(
      `A verdict is given at a probability of 0.80 or more, set by the workshop on ${today}; the default is 0.90 (shop rule).`,
    );
    await issue();
    await ask(0.7);
    const issued = `${place.setPath}/revisions/A/fit-sheet`;
    expect(await csv(issued)).toContain(`probability of 0.80 or more, as in force when issued on ${today};`);
    const printed = async (path: string) => readPaper(test, place.workshop.owner, `${path}.pdf`);
    expect(await printed(draft)).toContain('A verdict is given at a probability of 0.70 or more');
    expect(await printed(issued)).toContain('A verdict is given at a probability of 0.80 or more');
  });
});
