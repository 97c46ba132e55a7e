import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { ARRANGEMENTS, deriveParts, type SetDocument } from '@settlewright/geometry';
import { as, createMember, createWorkshop, type Person } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

const facing = () => ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();

function seated(document: SetDocument, castIds: string[]): SetDocument {
  const bench = document.pieces.find(({ kind }) => kind === 'bench')!;
  const seating = castIds.map((castId, index) => ({
    pieceId: bench.id,
    place: index + 1,
    sitter: { kind: 'cast' as const, castId },
  }));
  return { ...document, seating };
}

describe('sets', () => {
  let test: TestApp;
  let place: SetPlace;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    place = await createSet(test, await createProduction(test));
  });
  const owner = () => as(test, place.workshop.owner);
  const save = (baseNumber: number, document: unknown, person: Person = place.workshop.owner) =>
    as(test, person).put(`${place.setPath}/draft`).send({ baseNumber, document });

  describe('the list', () => {
    it('begins with an arrangement, with a document or empty', async () => {
      const sets = `${place.path}/sets`;
      const { body: empty } = await owner().post(sets).send({ name: 'Empty' }).expect(201);
      expect(empty).toMatchObject({
        name: 'Empty',
        status: 'active',
        draftNumber: 1,
        pieceCount: 0,
        seatedCount: 0,
      });
      const { body: given } = await owner()
        .post(sets)
        .send({ name: 'Given', document: facing() })
        .expect(201);
      expect(given.document).toEqual(facing());
      const { body } = await owner().get(sets).expect(200);
      expect(body.items.map(({ name }: { name: string }) => name)).toEqual(['Dining car', 'Empty', 'Given']);
      expect(body.items[0].pieceCount).toBe(facing().pieces.length);
    });

    it.each([
      [{ name: 'A', arrangement: 'throne-room' }, 'arrangement'],
      [{ name: 'A', arrangement: 'empty', document: {} }, 'arrangement'],
      [{ name: 'A', document: [] }, 'document'],
      [{ name: 'A', document: 'plan' }, 'document'],
      [{ name: '' }, 'name'],
      [{ name: 'A', extra: 1 }, 'extra'],
    ])('refuses %j', async (body, path) => {
      const answer = await owner().post(`${place.path}/sets`).send(body).expect(400);
      expect(answer.body.fields[0].path).toBe(path);
    });

    it('renames, copies, puts away and brings back', async () => {
      await owner().patch(place.setPath).send({ name: 'Smoking car' }).expect(200);
      const { body: copy } = await owner().post(`${place.setPath}/duplicate`).expect(201);
      expect(copy).toMatchObject({ name: 'Smoking car (copy)', draftNumber: 1 });
      expect(copy.id).not.toBe(place.setId);
      await owner().post(`${place.setPath}/archive`).expect(200);
      const active = await owner().get(`${place.path}/sets`).expect(200);
      expect(active.body.items.map(({ id }: { id: string }) => id)).toEqual([copy.id]);
      expect((await owner().get(`${place.path}/sets?status=archived`)).body.total).toBe(1);
      const refused = await save(1, facing()).expect(409);
      expect(refused.body.code).toBe('set-archived');
      await owner().post(`${place.setPath}/restore`).expect(200);
      await save(1, facing()).expect(200);
    });

    it('counts the verdicts anew when a person was measured since', async () => {
      const id = await createCastMember(test, place, { statureMm: undefined, bodyData: 'mixed' });
      await save(1, seated(facing(), [id])).expect(200);
      const counts = async () => (await owner().get(place.setPath).expect(200)).body.counts;
      const before = await counts();
      await owner()
        .patch(`${place.path}/cast/${id}`)
        .send({ statureMm: 1500, statureSource: 'measured' })
        .expect(200);
      const after = await counts();
      expect(after).not.toEqual(before);
      const sheet = await owner().get(`${place.setPath}/draft/fit-sheet`).expect(200);
      expect(sheet.body.counts).toEqual(after);
    });
  });

  describe('the draft', () => {
    it('takes a save that begins from the newest number', async () => {
      const document = { ...facing(), knownDifferences: [{ id: 'k1', text: 'Lamp is ours' }] };
      const { body } = await save(1, document).expect(200);
      expect(body).toMatchObject({ number: 2, savedBy: { id: place.workshop.owner.id } });
      expect(body).not.toHaveProperty('document');
      const draft = await owner().get(`${place.setPath}/draft`).expect(200);
      expect(draft.body).toMatchObject({ number: 2, document });
    });

    it('answers a stale save with both sides and what they began from', async () => {
      const designer = await createMember(test, place.workshop.id, 'designer');
      const base = facing();
      const theirs = { ...base, knownDifferences: [{ id: 'k1', text: 'theirs' }] };
      await save(1, theirs, designer).expect(200);
      const { body } = await save(1, { ...base, knownDifferences: [{ id: 'k1', text: 'mine' }] }).expect(409);
      expect(body).toMatchObject({
        code: 'draft-conflict',
        current: { number: 2, document: theirs, savedBy: { id: designer.id, name: designer.name } },
        base: { number: 1, document: base },
      });
      expect((await owner().get(`${place.setPath}/draft`)).body.document).toEqual(theirs);
      await save(2, base).expect(200);
    });

    it('lets one of two simultaneous saves through', async () => {
      const answers = await Promise.all([1, 2, 3, 4].map(() => save(1, facing())));
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
    });

    it('keeps the latest drafts and says when the base is too long ago', async () => {
      for (let number = 1; number <= 51; number++) await save(number, facing()).expect(200);
      const { body: gone } = await save(1, facing()).expect(409);
      expect(gone.base).toBeNull();
      const { body: kept } = await save(3, facing()).expect(409);
      expect(kept.base.number).toBe(3);
    });

    it.each<[string, (document: SetDocument) => unknown, string]>([
      ['an unknown key', (document) => ({ ...document, colour: 'red' }), 'document'],
      [
        'a piece too long',
        (d) => ({ ...d, pieces: [{ ...d.pieces[0], lengthMm: 1e9 }] }),
        'document.pieces.0.lengthMm',
      ],
      [
        'text for a number',
        (d) => ({ ...d, pieces: [{ ...d.pieces[0], lengthMm: '2 m' }] }),
        'document.pieces.0.lengthMm',
      ],
      ['two pieces of one id', (d) => ({ ...d, pieces: [d.pieces[0], d.pieces[0]] }), 'document.pieces.1.id'],
      ['a newer layout', (d) => ({ ...d, schemaVersion: 99 }), 'document'],
      ['no layout', (d) => ({ ...d, schemaVersion: undefined }), 'document'],
      [
        'a nul',
        (d) => ({ ...d, knownDifferences: [{ id: 'k1', text: 'a\u0000b' }] }),
        'document.knownDifferences.0.text',
      ],
    ])('refuses %s and names the path', async (_, change, path) => {
      const { body } = await save(1, change(facing())).expect(400);
      expect(body.fields[0].path).toBe(path);
      expect((await owner().get(`${place.setPath}/draft`)).body.number).toBe(1);
    });

    it.each([
      [{ document: facing() }],
      [{ baseNumber: 0, document: facing() }],
      [{ baseNumber: 1.5, document: facing() }],
      [{ baseNumber: '1', document: facing() }],
      [{ baseNumber: 1 }],
    ])('refuses a save without a proper number or document', async (body) => {
      await owner().put(`${place.setPath}/draft`).send(body).expect(400);
    });

    it('refuses a document above 1 MB', async () => {
      const knownDifferences = Array.from({ length: 1200 }, (_, n) => ({
        id: `k${n}`,
        text: 'x'.repeat(1000),
      }));
      const { body } = await save(1, { ...facing(), knownDifferences }).expect(413);
      expect(body.code).toBe('document-too-large');
      await save(1, { ...facing(), pad: 'x'.repeat(4_000_000) }).expect(413);
    });

    it('refuses people of another production', async () => {
      const sister = await createProduction(test, {}, place.workshop);
      const stranger = await createCastMember(test, sister);
      const { body } = await save(1, seated(facing(), [stranger])).expect(400);
      expect(body.fields[0].path).toBe('document.seating.0.sitter.castId');
    });

    it('knows people by their id as it is written, since the document keeps it so', async () => {
      const id = await createCastMember(test, place);
      const { body } = await save(1, seated(facing(), [id.toUpperCase()])).expect(400);
      expect(body.fields[0].path).toBe('document.seating.0.sitter.castId');
      await save(1, seated(facing(), [id])).expect(200);
    });

    it('is not saved while its production is put away', async () => {
      await owner().post(`${place.path}/archive`).expect(200);
      const { body } = await save(1, facing()).expect(409);
      expect(body.code).toBe('production-archived');
      await owner().post(`${place.path}/restore`).expect(200);
      await save(1, facing()).expect(200);
    });

    it('moves the set to the front of those that changed last', async () => {
      await owner().post(`${place.path}/sets`).send({ name: 'Younger' }).expect(201);
      const newest = async () =>
        (await owner().get(`${place.path}/sets?sort=updatedAt&order=desc`).expect(200)).body.items[0];
      expect((await newest()).name).toBe('Younger');
      await save(1, facing()).expect(200);
      expect(await newest()).toMatchObject({ name: 'Dining car', draftNumber: 2 });
    });

    it.each(['carpenter', 'reviewer'] as const)('lets a %s read it and not save it', async (role) => {
      const person = await createMember(test, place.workshop.id, role);
      await as(test, person).get(`${place.setPath}/draft`).expect(200);
      await save(1, facing(), person).expect(403);
      await as(test, person).post(`${place.path}/sets`).send({ name: 'Mine' }).expect(403);
      await as(test, person).patch(place.setPath).send({ name: 'Mine' }).expect(403);
      for (const verb of ['duplicate', 'archive', 'restore']) {
        await as(test, person).post(`${place.setPath}/${verb}`).expect(403);
      }
    });
  });

  it('does not exist by the path of another production or workshop', async () => {
    const sister = await createProduction(test, {}, place.workshop);
    const stranger = await createWorkshop(test, 'Elsewhere');
    const crossed = place.setPath.replace(place.workshop.id, stranger.id);
    for (const tail of [
      '',
      '/draft',
      '/draft/fit-sheet',
      '/draft/fit-sheet.csv',
      '/draft/fit-sheet.pdf',
      '/revisions',
      '/notes',
      '/built',
    ]) {
      await owner().get(`${sister.path}/sets/${place.setId}${tail}`).expect(404);
      await as(test, stranger.owner).get(`${crossed}${tail}`).expect(404);
      await as(test, stranger.owner).get(`${place.setPath}${tail}`).expect(404);
      await as(test, null).get(`${place.setPath}${tail}`).expect(401);
    }
    await as(test, stranger.owner)
      .put(`${crossed}/draft`)
      .send({ baseNumber: 1, document: facing() })
      .expect(404);
    await as(test, stranger.owner).post(`${crossed}/revisions`).send({ baseNumber: 1 }).expect(404);
  });

  it('copies a production with its cast and sets, and seats the copied people', async () => {
    const id = await createCastMember(test, place);
    await save(1, seated(facing(), [id])).expect(200);
    const { body: copy } = await owner().post(`${place.path}/duplicate`).expect(201);
    expect(copy.name).toBe('Supper at Larch Junction (copy)');
    const base = place.path.replace(place.productionId, copy.id);
    const people = (await owner().get(`${base}/cast`).expect(200)).body.items;
    expect(people).toEqual([expect.objectContaining({ name: 'Ottilie Brandt', statureMm: 1575 })]);
    expect(people[0].id).not.toBe(id);
    const [set] = (await owner().get(`${base}/sets`).expect(200)).body.items;
    expect(set).toMatchObject({ name: 'Dining car', draftNumber: 1, seatedCount: 1 });
    expect(set.document.seating[0].sitter.castId).toBe(people[0].id);
    expect((await owner().get(`${place.path}/sets`)).body.items[0].document.seating[0].sitter.castId).toBe(
      id,
    );
  });

  describe('notes', () => {
    it('take comments and marks of everybody; their author or a designer settles them', async () => {
      const carpenter = await createMember(test, place.workshop.id, 'carpenter');
      const reviewer = await createMember(test, place.workshop.id, 'reviewer');
      const notes = `${place.setPath}/notes`;
      const { body: mark } = await as(test, carpenter)
        .post(notes)
        .send({ text: 'Riser is <i>warped</i>', kind: 'mark', pieceId: 'b1' })
        .expect(201);
      expect(mark).toMatchObject({
        text: 'Riser is <i>warped</i>',
        kind: 'mark',
        pieceId: 'b1',
        resolved: false,
        createdBy: { id: carpenter.id, name: carpenter.name },
      });
      await as(test, reviewer).patch(`${notes}/${mark.id}`).send({ resolved: true }).expect(403);
      const { body: settled } = await owner()
        .patch(`${notes}/${mark.id}`)
        .send({ resolved: true })
        .expect(200);
      expect(settled).toMatchObject({ resolved: true, resolvedBy: { id: place.workshop.owner.id } });
      const { body: open } = await as(test, carpenter)
        .patch(`${notes}/${mark.id}`)
        .send({ resolved: false })
        .expect(200);
      expect(open).not.toHaveProperty('resolvedBy');
      await as(test, reviewer).post(notes).send({ text: 'Too dark', kind: 'comment' }).expect(201);
      expect((await owner().get(`${notes}?order=desc`).expect(200)).body.items).toMatchObject([
        { text: 'Too dark' },
        { text: 'Riser is <i>warped</i>' },
      ]);
    });

    it.each([
      [{ kind: 'mark' }],
      [{ text: '', kind: 'mark' }],
      [{ text: 'A', kind: 'shout' }],
      [{ text: 'x'.repeat(4001), kind: 'mark' }],
    ])('refuse %.60j', async (body) => {
      await owner().post(`${place.setPath}/notes`).send(body).expect(400);
    });
  });

  it('keeps the ticks of the shop, and only of parts that exist', async () => {
    const carpenter = await createMember(test, place.workshop.id, 'carpenter');
    const reviewer = await createMember(test, place.workshop.id, 'reviewer');
    const built = `${place.setPath}/built`;
    const [part, other] = deriveParts(facing()).map(({ id }) => id);
    const tick = (partId: unknown, value: unknown, person: Person = carpenter) =>
      as(test, person).put(built).send({ partId, built: value });
    await tick(part, true).expect(200);
    await tick(part, true).expect(200);
    const { body } = await tick(other, true).expect(200);
    expect(body.items.map(({ partId }: { partId: string }) => partId).sort()).toEqual([part, other].sort());
    expect(body.items[0].builtBy).toEqual({ id: carpenter.id, name: carpenter.name });
    expect((await tick(other, false).expect(200)).body.items).toHaveLength(1);
    await tick('b1/throne-1', true).expect(400);
    await tick(part, 'yes').expect(400);
    await tick('', true).expect(400);
    await tick(part, true, reviewer).expect(403);
    expect((await as(test, reviewer).get(built).expect(200)).body.items).toHaveLength(1);
  });
});
