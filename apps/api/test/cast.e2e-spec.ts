import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { as, createMember, createWorkshop } from './factories/people';
import { createCastMember, createProduction, type ProductionPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

describe('cast', () => {
  let test: TestApp;
  let place: ProductionPlace;
  let cast: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    place = await createProduction(test);
    cast = `${place.path}/cast`;
  });
  const owner = () => as(test, place.workshop.owner);

  const ottilie = {
    name: 'Ottilie Brandt',
    role: 'the conductor',
    bodyData: 'women',
    statureMm: 1575,
    statureSource: 'measured',
    weightKg: 61.5,
    measured: { popliteal_height: { mm: 394, takenBy: 'Nell Abara', takenOn: '2026-01-25' } },
    shoeMm: 40,
    clothing: 'medium',
    notes: 'Left knee stiff.\nAsk twice.',
  };

  it('keeps what is known of a person and gives the colours in turn', async () => {
    const { body } = await owner().post(cast).send(ottilie).expect(201);
    expect(body).toMatchObject({ ...ottilie, colour: 1, removed: false });
    expect(body.createdAt).toMatch(/^\d{4}-\d\d-\d\dT/);
    const colours = [];
    for (let n = 0; n < 6; n++)
      colours.push(
        (
          await owner()
            .post(cast)
            .send({ name: `S ${n}` })
        ).body.colour,
      );
    expect(colours).toEqual([2, 3, 4, 5, 6, 7]);
    const list = await owner().get(`${cast}?sort=createdAt`).expect(200);
    expect(list.body.items[0]).toEqual(body);
    expect(list.body.total).toBe(7);
  });

  it('changes what is sent; null takes a measure back', async () => {
    const id = await createCastMember(test, place, ottilie);
    const changed = await owner()
      .patch(`${cast}/${id}`)
      .send({
        statureMm: 1580,
        weightKg: null,
        name: null,
        measured: { popliteal_height: null, thigh_clearance: { mm: 150 } },
      })
      .expect(200);
    expect(changed.body).toMatchObject({
      name: 'Ottilie Brandt',
      statureMm: 1580,
      measured: { thigh_clearance: { mm: 150 } },
    });
    expect(changed.body).not.toHaveProperty('weightKg');
    expect(changed.body.measured).not.toHaveProperty('popliteal_height');
  });

  it.each([
    [{ name: '' }, 'name'],
    [{ name: 'x'.repeat(121) }, 'name'],
    [{ name: 'A\nB' }, 'name'],
    [{ name: 'A', statureMm: 999 }, 'statureMm'],
    [{ name: 'A', statureMm: 2301 }, 'statureMm'],
    [{ name: 'A', statureMm: -1 }, 'statureMm'],
    [{ name: 'A', statureMm: '1700' }, 'statureMm'],
    [{ name: 'A', statureMm: 'NaN' }, 'statureMm'],
    [{ name: 'A', weightKg: 24 }, 'weightKg'],
    [{ name: 'A', age: 12 }, 'age'],
    [{ name: 'A', age: 30.5 }, 'age'],
    [{ name: 'A', age: 'forty' }, 'age'],
    [{ name: 'A', weightKg: 1e300 }, 'weightKg'],
    [{ name: 'A', shoeMm: 151 }, 'shoeMm'],
    [{ name: 'A', shoeMm: -0.1 }, 'shoeMm'],
    [{ name: 'A', bodyData: 'giants' }, 'bodyData'],
    [{ name: 'A', clothing: 'armour' }, 'clothing'],
    [{ name: 'A', colour: 13 }, 'colour'],
    [{ name: 'A', measured: 'tall' }, 'measured'],
    [{ name: 'A', measured: { nose_length: { mm: 50 } } }, 'measured.nose_length'],
    [{ name: 'A', measured: { popliteal_height: 394 } }, 'measured.popliteal_height'],
    [{ name: 'A', measured: { popliteal_height: { mm: 39 } } }, 'measured.popliteal_height.mm'],
    [{ name: 'A', measured: { popliteal_height: { mm: null } } }, 'measured.popliteal_height.mm'],
    [{ name: 'A', measured: { popliteal_height: { mm: 394, by: 'N' } } }, 'measured.popliteal_height.by'],
    [
      { name: 'A', measured: { popliteal_height: { mm: 394, takenOn: '31 May' } } },
      'measured.popliteal_height.takenOn',
    ],
    [
      { name: 'A', measured: { popliteal_height: { mm: 394, takenOn: '2999-01-01' } } },
      'measured.popliteal_height.takenOn',
    ],
    [{ name: 'A', notes: 'x'.repeat(4001) }, 'notes'],
    [{ name: 'A', productionId: 'other' }, 'productionId'],
  ])('refuses %.80j and says what is accepted', async (body, path) => {
    const { body: problem } = await owner().post(cast).send(body).expect(400);
    const field = problem.fields.find((one: { path: string }) => one.path === path);
    expect(field?.message.length).toBeGreaterThan(10);
    expect((await owner().get(cast)).body.total).toBe(0);
  });

  it('says the range and what was read', async () => {
    const { body } = await owner().post(cast).send({ name: 'A', statureMm: 157 }).expect(400);
    expect(body.fields).toEqual([
      { path: 'statureMm', code: 'within-limit', message: 'Stature accepts 1000 to 2300 mm; read 157' },
    ]);
  });

  it.each(['carpenter', 'reviewer'] as const)(
    'shows a %s four fields of a person and no files',
    async (role) => {
      const id = await createCastMember(test, place, ottilie);
      const person = await createMember(test, place.workshop.id, role);
      const { body } = await as(test, person).get(cast).expect(200);
      expect(body.items).toEqual([{ id, name: 'Ottilie Brandt', role: 'the conductor', colour: 1 }]);
      await as(test, person).get(`${place.path}/cast.csv`).expect(403);
      await as(test, person).get(`${cast}/${id}/export`).expect(403);
      await as(test, person).post(`${cast}/import/preview`).send({ csv: 'name\nA' }).expect(403);
      await as(test, person).post(`${cast}/import`).send({ csv: 'name\nA' }).expect(403);
      await as(test, person).post(cast).send({ name: 'A' }).expect(403);
      await as(test, person).patch(`${cast}/${id}`).send({ name: 'A' }).expect(403);
      await as(test, person).delete(`${cast}/${id}`).expect(403);
    },
  );

  it('lets a designer do what an owner does', async () => {
    const designer = await createMember(test, place.workshop.id, 'designer');
    const { body } = await as(test, designer).post(cast).send(ottilie).expect(201);
    const list = await as(test, designer).get(cast).expect(200);
    expect(list.body.items[0]).toHaveProperty('weightKg', 61.5);
    await as(test, designer).delete(`${cast}/${body.id}`).expect(204);
  });

  it('does not know a person by the path of another production or workshop', async () => {
    const id = await createCastMember(test, place, ottilie);
    const sister = await createProduction(test, {}, place.workshop);
    await owner().get(`${sister.path}/cast/${id}/export`).expect(404);
    await owner().patch(`${sister.path}/cast/${id}`).send({ name: 'X' }).expect(404);
    await owner().delete(`${sister.path}/cast/${id}`).expect(404);
    const stranger = await createWorkshop(test, 'Elsewhere');
    await as(test, stranger.owner).get(cast).expect(404);
    const crossed = cast.replace(place.workshop.id, stranger.id);
    await as(test, stranger.owner).get(crossed).expect(404);
    await as(test, stranger.owner).post(crossed).send({ name: 'X' }).expect(404);
    await as(test, stranger.owner).get(`${crossed}.csv`).expect(404);
  });

  it('hands out all it holds of one person as a file', async () => {
    const id = await createCastMember(test, place, ottilie);
    const answer = await owner().get(`${cast}/${id}/export`).expect(200);
    expect(answer.headers['content-disposition']).toBe('attachment; filename="ottilie-brandt.json"');
    expect(answer.body).toMatchObject({ ...ottilie, id });
  });

  it('exports a list that a spreadsheet does not run and that can come back', async () => {
    await createCastMember(test, place, { ...ottilie, name: '=1+1', role: '@cmd', notes: '+49 30' });
    const { text, headers } = await owner().get(`${place.path}/cast.csv`).expect(200);
    expect(headers['content-type']).toBe('text/csv; charset=utf-8');
    expect(text).toContain("'=1+1,'@cmd");
    expect(text).toContain("'+49 30");
    const { body } = await owner().post(`${cast}/import`).send({ csv: text }).expect(200);
    expect(body).toEqual({ added: 1, refused: 0, refusedRows: [] });
    const [first, second] = (await owner().get(`${cast}?sort=createdAt`)).body.items;
    const { id: _a, colour: _b, createdAt: _c, ...before } = first;
    const { id: _d, colour: _e, createdAt: _f, ...after } = second;
    expect(after).toEqual(before);
  });

  it('shows what an import would do and takes the good rows', async () => {
    const csv = 'name,height_mm,agent\nWren,1727,x\nToo Short,17,x\nOttilie Brandt,1575,x\n<b>Bold</b>,,x\n';
    await createCastMember(test, place);
    const preview = await owner().post(`${cast}/import/preview`).send({ csv }).expect(200);
    expect(preview.body).toMatchObject({
      columns: [
        { header: 'name', key: 'name' },
        { header: 'height_mm', key: 'stature', unit: 'mm' },
      ],
      ignoredColumns: ['agent'],
    });
    const [wren, short, twice] = preview.body.rows;
    expect(wren).toMatchObject({ line: 2, value: { name: 'Wren', statureMm: 1727 }, problems: [] });
    expect(short.value).toBeUndefined();
    expect(short.problems).toEqual([
      {
        column: 'height_mm',
        read: '17',
        accepted: '1000 to 2300 mm',
        message: 'height_mm: read "17"; that is 17 mm; accepted: 1000 to 2300 mm',
      },
    ]);
    expect(twice.warnings).toHaveLength(1);
    expect((await owner().get(cast)).body.total).toBe(1);

    const { body } = await owner().post(`${cast}/import`).send({ csv }).expect(200);
    expect(body).toMatchObject({ added: 3, refused: 1, refusedRows: [{ line: 3 }] });
    const names = (await owner().get(`${cast}?sort=createdAt`)).body.items.map(
      ({ name }: { name: string }) => name,
    );
    expect(names.sort()).toEqual(['<b>Bold</b>', 'Ottilie Brandt', 'Ottilie Brandt', 'Wren']);
  });

  it.each([
    [{ csv: '' }, 400, 'csv-empty'],
    [{ csv: 'GIF89a\u0000\u0001' }, 400, 'csv-not-text'],
    [{ csv: 'plain words' }, 400, 'csv-no-name'],
    [{ csv: 12 }, 400, 'invalid-request'],
    [{}, 400, 'invalid-request'],
    [{ csv: `name\n${'Somebody With A Name\n'.repeat(100_000)}` }, 413, 'csv-too-large'],
    [{ csv: `name\n${'x'.repeat(10_000_000)}` }, 413, 'too-large'],
    [{ csv: `name\n${'A\n'.repeat(2001)}` }, 400, 'csv-too-many-rows'],
  ])('refuses the file %.40j', async (sent, status, code) => {
    for (const route of ['import', 'import/preview']) {
      const { body } = await owner().post(`${cast}/${route}`).send(sent).expect(status);
      expect(body.code).toBe(code);
    }
    expect((await owner().get(cast)).body.total).toBe(0);
  });

  it('takes a list of 2,000 people', async () => {
    const csv = `name,height_mm\n${Array.from({ length: 2000 }, (_, n) => `Person ${n},1700`).join('\n')}`;
    const { body } = await owner().post(`${cast}/import`).send({ csv }).expect(200);
    expect(body).toEqual({ added: 2000, refused: 0, refusedRows: [] });
  });
});
