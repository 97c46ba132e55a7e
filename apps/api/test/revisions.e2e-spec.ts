import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import type { FitCell, FitSheet } from '@settlewright/anthropometry';
import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import request from 'supertest';
import { as, createMember, type Person } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

const OTTILIE = {
  name: 'Ottilie Brandt',
  bodyData: 'women',
  statureMm: 1575,
  statureSource: 'measured',
  weightKg: 61.5,
  measured: { popliteal_height: { mm: 393.25 }, elbow_rest_height: { mm: 241.75 } },
};

/** Two benches that face each other: the person at the first place, mannequins at the others. */
function facingWith(castId: string): SetDocument {
  const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
  const [first, second] = document.pieces.filter(({ kind }) => kind === 'bench');
  const mannequin = { kind: 'mannequin', bodyData: 'men', measure: 'stature', percentile: 95 } as const;
  return {
    ...document,
    seating: [
      { pieceId: first!.id, place: 1, sitter: { kind: 'cast', castId } },
      { pieceId: second!.id, place: 1, sitter: mannequin },
      { pieceId: second!.id, place: 2, sitter: mannequin },
    ],
  };
}

describe('revisions and fit sheets', () => {
  let test: TestApp;
  let place: SetPlace;
  let castId: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    const production = await createProduction(test);
    castId = await createCastMember(test, production, OTTILIE);
    place = await createSet(test, production, { arrangement: undefined, document: facingWith(castId) });
  });
  const owner = () => as(test, place.workshop.owner);
  const issue = (baseNumber = 1, note = '') =>
    owner().post(`${place.setPath}/revisions`).send({ baseNumber, note });
  const ottiliesRow = (sheet: FitSheet) => sheet.rows.find(({ sitterId }) => sitterId === castId)!;

  it('freezes the draft under the next letter with its sheet', async () => {
    const { body } = await issue(1, 'First <issue>').expect(201);
    expect(body).toMatchObject({
      letter: 'A',
      number: 1,
      note: 'First <issue>',
      issuedBy: { id: place.workshop.owner.id, name: place.workshop.owner.name },
    });
    const draft = (await owner().get(`${place.setPath}/draft`)).body.document as SetDocument;
    await owner()
      .put(`${place.setPath}/draft`)
      .send({ baseNumber: 1, document: { ...draft, seating: [] } })
      .expect(200);
    expect((await issue(2).expect(201)).body.letter).toBe('B');

    const first = await owner().get(`${place.setPath}/revisions/A`).expect(200);
    expect(first.body.document).toEqual(draft);
    expect(first.body.fitSheet).toMatchObject({ detail: 'full', counts: body.counts });
    expect(first.body.fitSheet.rows).toHaveLength(3);
    const list = await owner().get(`${place.setPath}/revisions?order=desc`).expect(200);
    expect(list.body.items.map(({ letter }: { letter: string }) => letter)).toEqual(['B', 'A']);
    expect((await owner().get(place.setPath)).body.lastRevision).toMatchObject({ letter: 'B', number: 2 });
  });

  it('is not issued from a draft that moved on', async () => {
    const { document } = (await owner().get(`${place.setPath}/draft`)).body as { document: SetDocument };
    await owner().put(`${place.setPath}/draft`).send({ baseNumber: 1, document }).expect(200);
    const { body } = await issue(1).expect(409);
    expect(body).toMatchObject({ code: 'draft-moved-on', currentNumber: 2 });
    await owner().post(`${place.setPath}/revisions`).send({ baseNumber: 'x' }).expect(400);
    await owner().post(`${place.setPath}/revisions`).send({ note: 'no number' }).expect(400);
    expect((await owner().get(`${place.setPath}/revisions`)).body.total).toBe(0);
  });

  it('gives every one of several issued at once its own letter', async () => {
    const answers = await Promise.all([issue(), issue(), issue()]);
    expect(answers.map(({ body }) => body.letter).sort()).toEqual(['A', 'B', 'C']);
  });

  it.each(['B', 'a1', '%00', "A'--", 'A'.repeat(500)])('has no revision %.10s', async (letter) => {
    await issue().expect(201);
    await owner().get(`${place.setPath}/revisions/${letter}`).expect(404);
    await owner().get(`${place.setPath}/revisions/${letter}/fit-sheet.csv`).expect(404);
  });

  it('stays as it is when people are measured anew', async () => {
    await issue().expect(201);
    const before = (await owner().get(`${place.setPath}/revisions/A`)).body.fitSheet;
    await owner().patch(`${place.path}/cast/${castId}`).send({ statureMm: 1900 }).expect(200);
    expect((await owner().get(`${place.setPath}/revisions/A`)).body.fitSheet).toEqual(before);
    const draft = (await owner().get(`${place.setPath}/draft/fit-sheet`).expect(200)).body;
    expect(draft.rows).not.toEqual(before.rows);
  });

  it.each([
    "UPDATE set_revisions SET note = 'other'",
    "UPDATE set_revisions SET document = '{}'",
    "UPDATE set_revisions SET fit_sheet = '{}'",
    'DELETE FROM set_revisions',
  ])('is kept by the database from %s', async (sql) => {
    await issue().expect(201);
    await expect(test.dataSource.query(sql)).rejects.toThrow(/issued revision cannot be/);
  });

  it('lets even the erasure change nothing but the sheet and what people typed', async () => {
    await issue().expect(201);
    const erasing = (sql: string) =>
      test.dataSource.transaction(async (manager) => {
        await manager.query("SELECT set_config('settlewright.erasing', 'on', true)");
        await manager.query(`${sql} WHERE set_id = $1`, [place.setId]);
      });
    await expect(erasing("UPDATE set_revisions SET letter = 'Z'")).rejects.toThrow(/cannot be changed/);
    await expect(erasing("UPDATE set_revisions SET counts = '{}'")).rejects.toThrow(/cannot be changed/);
    await expect(erasing('DELETE FROM set_revisions')).rejects.toThrow(/cannot be deleted/);
    await erasing("UPDATE set_revisions SET fit_sheet = '{}', note = 'other'");
    const after = test.dataSource.query("UPDATE set_revisions SET fit_sheet = '[]'");
    await expect(after).rejects.toThrow(/cannot be changed/);
  });

  it('goes with its workshop', async () => {
    await issue().expect(201);
    await test.dataSource.query('DELETE FROM workshops WHERE id = $1', [place.workshop.id]);
    const [{ count }] = await test.dataSource.query('SELECT count(*) FROM set_revisions WHERE set_id = $1', [
      place.setId,
    ]);
    expect(Number(count)).toBe(0);
  });

  describe('approval', () => {
    const approve = (person: Person, body: object, letter = 'A') =>
      as(test, person).post(`${place.setPath}/revisions/${letter}/approval`).send(body);

    it('is given by a reviewer, and the latest word counts', async () => {
      const reviewer = await createMember(test, place.workshop.id, 'reviewer');
      await issue().expect(201);
      await approve(reviewer, { decision: 'changes-wanted', comment: 'Table too high' }).expect(200);
      const { body } = await approve(reviewer, { decision: 'approved', comment: '' }).expect(200);
      expect(body.approval).toMatchObject({ decision: 'approved', decidedBy: { id: reviewer.id } });
      expect(body.approvals.map(({ decision }: { decision: string }) => decision)).toEqual([
        'approved',
        'changes-wanted',
      ]);
      const [listed] = (await owner().get(`${place.setPath}/revisions`)).body.items;
      expect(listed.approval).toMatchObject({ decision: 'approved' });
    });

    it('is refused to others, for nothing and in other words', async () => {
      const reviewer = await createMember(test, place.workshop.id, 'reviewer');
      await issue().expect(201);
      for (const role of ['designer', 'carpenter'] as const) {
        await approve(await createMember(test, place.workshop.id, role), { decision: 'approved' }).expect(
          403,
        );
      }
      await approve(reviewer, { decision: 'approved' }, 'Q').expect(404);
      await approve(reviewer, { decision: 'compliant' }).expect(400);
      await approve(reviewer, { decision: 'approved', comment: 'x'.repeat(4001) }).expect(400);
    });
  });

  describe.each(['carpenter', 'reviewer'] as const)('what a %s sees', (role) => {
    let person: Person;
    beforeEach(async () => {
      person = await createMember(test, place.workshop.id, role);
      await issue().expect(201);
    });

    const SEEN = [
      'kind',
      'verdict',
      'margin',
      'marginRange',
      'estimated',
      'reason',
      'inside',
      'clause',
      'value',
      'limits',
      'parts',
    ];

    it.each(['draft/fit-sheet', 'revisions/A'])('is verdicts and coarse bodies in %s', async (route) => {
      const { body, text } = await as(test, person).get(`${place.setPath}/${route}`).expect(200);
      const sheet = (route === 'revisions/A' ? body.fitSheet : body) as FitSheet & {
        detail: string;
        bodies: { placeId: string; means: Record<string, number> }[];
      };
      expect(sheet.detail).toBe('verdicts');
      expect(Object.keys(sheet).sort()).toEqual(
        [
          'bodies',
          'confidence',
          'counts',
          'detail',
          'emptyPlaceIds',
          'piecesAndWays',
          'publicRow',
          'rows',
          'ruleVersion',
        ].sort(),
      );
      const cells: FitCell[] = [
        ...sheet.rows.flatMap((row) => row.cells),
        ...sheet.publicRow.cells,
        ...sheet.piecesAndWays,
      ];
      expect(cells.some(({ outcome }) => outcome.kind === 'verdict')).toBe(true);
      for (const { outcome } of cells) {
        expect(SEEN).toEqual(expect.arrayContaining(Object.keys(outcome)));
        if (outcome.kind === 'verdict') expect(outcome).not.toHaveProperty('value');
        expect(outcome.kind).not.toBe('information');
      }
      for (const { means } of sheet.bodies) {
        expect(means).not.toHaveProperty('weight_kg');
        expect(Object.values(means).every((mm) => mm % 20 === 0)).toBe(true);
      }
      for (const told of ['393.25', '241.75', '61.5', '1575', 'Ledger', 'settleWith', 'probability']) {
        expect(text).not.toContain(told);
      }
    });

    it('is the same in the files', async () => {
      const csv = await as(test, person).get(`${place.setPath}/revisions/A/fit-sheet.csv`).expect(200);
      const lines = csv.text
        .trim()
        .split('\r\n')
        .map((line) => line.split(','));
      const personal = lines.filter(([section, , , , , , , says]) => section === 'sitter' && says === 'fits');
      expect(personal.length).toBeGreaterThan(0);
      expect(personal.every((line) => line.length === 13)).toBe(true);
      const lengths = personal.filter((line) => line[11] === 'mm');
      expect(lengths.length).toBeGreaterThan(0);
      for (const [, , , , , , , , ...margins] of lengths) {
        expect(margins.slice(0, 3).filter((mm) => Math.round(Number(mm) * 10) % 254 !== 0)).toEqual([]);
      }
      const pdf = await as(test, person).get(`${place.setPath}/draft/fit-sheet.pdf`).expect(200);
      expect(pdf.headers['content-type']).toBe('application/pdf');
    });
  });

  it('gives owner and designer the numbers behind the verdicts', async () => {
    const designer = await createMember(test, place.workshop.id, 'designer');
    const { body } = await as(test, designer).get(`${place.setPath}/draft/fit-sheet`).expect(200);
    expect(body.detail).toBe('full');
    expect(body).not.toHaveProperty('bodies');
    const seat = ottiliesRow(body as FitSheet).cells.find(({ ruleId }) => ruleId === 'SEAT-02')!;
    expect(JSON.stringify(seat.outcome)).toContain('393.25');
    expect(Object.values(body.counts as Record<string, number>).reduce((a, b) => a + b)).toBeGreaterThan(10);
  });

  it('prints the sheet on the paper of the workshop', async () => {
    await issue().expect(201);
    const pdf = async (paper: 'a4' | 'letter') => {
      await owner().patch(`/workshops/${place.workshop.id}`).send({ paper }).expect(200);
      const answer = await request(test.app.getHttpServer())
        .get(`/api${place.setPath}/revisions/A/fit-sheet.pdf`)
        .set('Authorization', `Bearer ${place.workshop.owner.accessToken}`)
        .responseType('blob')
        .expect(200);
      return answer.body as Buffer;
    };
    const letter = await pdf('letter');
    expect(letter.subarray(0, 5).toString()).toBe('%PDF-');
    expect(letter.toString('latin1')).toMatch(/MediaBox \[0 0 792\.? ?\d* 612/);
    expect((await pdf('a4')).toString('latin1')).toMatch(/MediaBox \[0 0 841\.\d+ 595/);
  });

  it('writes a sheet that a spreadsheet does not run', async () => {
    await owner().patch(`${place.path}/cast/${castId}`).send({ name: '=SUM(A1)' }).expect(200);
    const { text, headers } = await owner().get(`${place.setPath}/draft/fit-sheet.csv`).expect(200);
    expect(headers['content-disposition']).toBe('attachment; filename="dining-car-fit-sheet-draft-1.csv"');
    expect(text).toContain("\r\nsitter,'=SUM(A1),");
  });

  describe('erasing a person', () => {
    it('leaves the verdicts and nothing of the body, in cast, draft and revision', async () => {
      await issue().expect(201);
      const before = (await owner().get(`${place.setPath}/revisions/A`)).body;
      await owner().delete(`${place.path}/cast/${castId}`).expect(204);

      const after = (await owner().get(`${place.setPath}/revisions/A`).expect(200)).body;
      expect(after.document).toEqual(before.document);
      expect(after.counts).toEqual(before.counts);
      const row = ottiliesRow(after.fitSheet as FitSheet);
      const was = ottiliesRow(before.fitSheet as FitSheet);
      expect(row).toMatchObject({ name: 'removed sitter 1', worst: was.worst, mark: was.mark });
      const verdicts = (cells: FitCell[]) =>
        cells.map(({ outcome }) => (outcome.kind === 'verdict' ? outcome.verdict : ''));
      expect(verdicts(row.cells)).toEqual(verdicts(was.cells));
      for (const { outcome } of row.cells) {
        if (outcome.kind === 'verdict')
          expect(outcome).toMatchObject({ value: null, margin: null, bodyLedger: [] });
      }

      const draft = (await owner().get(`${place.setPath}/draft/fit-sheet`)).body as FitSheet;
      expect(ottiliesRow(draft).name).toBe('removed sitter 1');
      const [listed] = (await owner().get(`${place.path}/cast`)).body.items;
      expect(listed).toMatchObject({
        id: castId,
        name: 'removed sitter 1',
        removed: true,
        measured: {},
        notes: '',
      });
      await owner().get(`${place.path}/cast/${castId}/export`).expect(404);
      await owner().patch(`${place.path}/cast/${castId}`).send({ name: 'Back' }).expect(404);
      await owner().delete(`${place.path}/cast/${castId}`).expect(404);
      expect((await owner().get(`${place.path}/cast.csv`)).text).not.toContain('removed');
      await owner().get(`${place.setPath}/revisions/A/fit-sheet.pdf`).expect(200);
      await owner().get(`${place.setPath}/revisions/A/fit-sheet.csv`).expect(200);

      const dump = JSON.stringify([
        await test.dataSource.query('SELECT * FROM cast_members WHERE production_id = $1', [
          place.productionId,
        ]),
        await test.dataSource.query('SELECT * FROM set_drafts WHERE set_id = $1', [place.setId]),
        await test.dataSource.query('SELECT * FROM set_revisions WHERE set_id = $1', [place.setId]),
        await test.dataSource.query('SELECT * FROM audit_entries WHERE workshop_id = $1', [
          place.workshop.id,
        ]),
      ]);
      expect(dump).toContain('cast.erased');
      for (const told of ['Ottilie', '393.25', '241.75']) expect(dump).not.toContain(told);
    });

    it('leaves nothing behind in a revision that is issued meanwhile', async () => {
      await Promise.all([issue(), owner().delete(`${place.path}/cast/${castId}`), issue()]);
      const kept = await test.dataSource.query('SELECT fit_sheet FROM set_revisions WHERE set_id = $1', [
        place.setId,
      ]);
      expect(kept).toHaveLength(2);
      expect(JSON.stringify(kept)).not.toMatch(/Ottilie|393\.25/);
    });

    it('cannot be undone by a change that was under way', async () => {
      await Promise.all([
        owner().patch(`${place.path}/cast/${castId}`).send({ notes: 'late' }),
        owner().delete(`${place.path}/cast/${castId}`),
        owner().patch(`${place.path}/cast/${castId}`).send({ weightKg: 61.5 }),
        owner().delete(`${place.path}/cast/${castId}`),
      ]);
      const [person] = await test.dataSource.query('SELECT * FROM cast_members WHERE id = $1', [castId]);
      expect(person).toMatchObject({
        name: 'removed sitter 1',
        weight_kg: null,
        notes: '',
        removed_number: 1,
      });
    });

    it('numbers the removed and lets them go when nobody seats them', async () => {
      const second = await createCastMember(test, place, { name: 'Hetty Vance' });
      await owner().delete(`${place.path}/cast/${second}`).expect(204);
      expect((await owner().get(`${place.path}/cast`)).body.items).toMatchObject([
        { name: 'Ottilie Brandt' },
      ]);
      await owner().delete(`${place.path}/cast/${castId}`).expect(204);
      expect((await owner().get(`${place.path}/cast`)).body.items).toMatchObject([
        { name: 'removed sitter 2' },
      ]);
    });

    it('takes nobody else’s numbers', async () => {
      const other = await createCastMember(test, place, { ...OTTILIE, name: 'Ottilie Brandtner' });
      const { document } = (await owner().get(`${place.setPath}/draft`)).body as { document: SetDocument };
      const [first] = document.seating;
      const seating = [...document.seating, { ...first!, place: 2, sitter: { kind: 'cast', castId: other } }];
      await owner()
        .put(`${place.setPath}/draft`)
        .send({ baseNumber: 1, document: { ...document, seating } })
        .expect(200);
      await issue(2).expect(201);
      const rowOf = async () => {
        const { fitSheet } = (await owner().get(`${place.setPath}/revisions/A`)).body as {
          fitSheet: FitSheet;
        };
        return fitSheet.rows.find(({ sitterId }) => sitterId === other);
      };
      const before = await rowOf();
      await owner().delete(`${place.path}/cast/${castId}`).expect(204);
      expect(await rowOf()).toEqual(before);
    });
  });
});
