import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import { as, createMember, createWorkshop, type Person } from './factories/people';
import { createProduction, createSet } from './factories/productions';
import { SURVEY_MAPPING, surveyBody, surveyCsv } from './factories/surveys';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(60_000);

let test: TestApp;
let owner: Person;
let designer: Person;
let reviewer: Person;
let path: string;
beforeAll(async () => {
  test = await startTestApp();
  const workshop = await createWorkshop(test);
  ({ owner } = workshop);
  designer = await createMember(test, workshop.id, 'designer');
  reviewer = await createMember(test, workshop.id, 'reviewer');
  path = `/workshops/${workshop.id}/populations`;
});
afterAll(() => test.close());

const preview = async (body: object) =>
  (await as(test, owner).post(`${path}/preview`).send(body).expect(200)).body;
const add = async (given: Record<string, unknown> = {}, who = owner) =>
  (await as(test, who).post(path).send(surveyBody(given)).expect(201)).body;
const actionsOn = async (id: string): Promise<string[]> => {
  const rows: { action: string }[] = await test.dataSource.query(
    'SELECT action FROM audit_entries WHERE subject_id = $1 ORDER BY at',
    [id],
  );
  return rows.map(({ action }) => action);
};

describe('a preview', () => {
  it('finds the columns, their measures and their units by itself', async () => {
    const body = await preview({ csv: surveyCsv() });
    expect(body.mapping).toEqual(SURVEY_MAPPING);
    expect(body).toMatchObject({ rows: 80, women: 40, men: 40, leftOut: 0, faults: [], problems: [] });
    expect(body.columns[0]).toEqual({ name: 'Name', examples: ['Person 1', 'Person 2', 'Person 3'] });
    expect(body.read).toEqual(['stature', 'weight_kg', 'sitting_height', 'popliteal_height']);
    expect(body.estimated).toHaveLength(37);
  });

  it('reads semicolons, decimal commas, a byte-order mark and Windows line ends alike', async () => {
    const csv = `\ufeff${surveyCsv({ delimiter: ';', decimal: ',' }).replaceAll('\n', '\r\n')}`;
    const body = await preview({ csv });
    expect(body.mapping).toEqual({ ...SURVEY_MAPPING, decimalComma: true });
    expect(body).toMatchObject({ women: 40, men: 40, faults: [] });
  });

  it('names each faulty field with its line, what was read and what is accepted', async () => {
    const csv = surveyCsv({
      change: ([name = '', sex = '', height = '', ...others], row) => [
        name,
        row === 4 ? 'x' : sex,
        row === 2 ? '1735' : row === 3 ? '' : height,
        ...others,
      ],
    });
    const body = await preview({ csv });
    expect(body).toMatchObject({ rows: 80, women: 39, men: 38, leftOut: 3, faultCount: 3, problems: [] });
    expect(body.faults).toEqual([
      { line: 3, row: 2, field: 'Height (cm)', read: '1735', accepted: expect.stringMatching(/ to \d+ cm$/) },
      { line: 4, row: 3, field: 'Height (cm)', read: '', accepted: expect.stringMatching(/ cm$/) },
      { line: 5, row: 4, field: 'Sex', read: 'x', accepted: expect.stringMatching(/^f, w,/) },
    ]);
  });

  it('says what is missing in a mapping', async () => {
    const nobody = await preview({ csv: 'Person,Height\nA,170\n' });
    expect(nobody.problems.map(({ path: field }: { path: string }) => field)).toEqual([
      'mapping.sex',
      'mapping.measures',
    ]);
    const [height] = SURVEY_MAPPING.measures;
    const wrong = {
      sex: { column: 'Gender' },
      measures: [height, { key: 'stature', column: 'Weight', unit: 'kg' }],
      decimalComma: false,
    };
    const { problems } = await preview({ csv: surveyCsv(), mapping: wrong });
    expect(problems.map(({ path: field, code }: { path: string; code: string }) => [field, code])).toEqual([
      ['mapping.sex.column', 'unknown-column'],
      ['mapping.measures.1.unit', 'unit'],
      ['mapping.measures.1.key', 'measure-twice'],
      ['mapping.measures', 'missing'],
    ]);
    expect(problems[0].message).toMatch(/"Gender"; accepted: Name, Sex,/);
  });

  it('finds the unit of a column that a person pointed out', async () => {
    const csv = surveyCsv().replace('Height (cm)', 'How tall');
    const { sex, measures, ...rest } = SURVEY_MAPPING;
    const mapping = {
      ...rest,
      sex,
      measures: measures.map(({ key, column, unit }) =>
        key === 'stature' ? { key, column: 'How tall' } : { key, column, unit },
      ),
    };
    const body = await preview({ csv, mapping });
    expect(body.mapping.measures[0]).toEqual({ key: 'stature', column: 'How tall', unit: 'cm' });
    expect(body).toMatchObject({ women: 40, faults: [], problems: [] });
    const { body: refused } = await as(test, owner).post(path).send(surveyBody({ csv, mapping })).expect(400);
    expect(refused.fields[0].path).toBe('mapping.measures.0.unit');
  });

  it('says how many people of each sex it takes', async () => {
    const { women, problems } = await preview({ csv: surveyCsv({ each: 29 }) });
    expect(women).toBe(29);
    expect(problems.map(({ message }: { message: string }) => message)).toEqual([
      expect.stringMatching(/^29 readable rows of women; accepted: 30 or more/),
      expect.stringMatching(/^29 readable rows of men/),
    ]);
  });

  it.each([
    ['csv-empty', 'Sex,Height\n'],
    ['csv-column-twice', 'Sex,Height,Height\nF,170,171\n'],
    ['csv-too-many-rows', `Sex\n${'F\n'.repeat(10_001)}`],
    ['csv-quotes', 'Sex,Height\nF,"170\n'],
    ['csv-not-text', 'Sex\0Height\nF,170\n'],
  ])('refuses a file whole: %s', async (code, csv) => {
    const { body } = await as(test, owner).post(`${path}/preview`).send({ csv }).expect(400);
    expect(body.code).toBe(code);
  });

  it('refuses a file of more than 2 MB', async () => {
    const csv = `Sex\n${'F'.repeat(2_000_000)}`;
    const { body } = await as(test, owner).post(`${path}/preview`).send({ csv }).expect(413);
    expect(body.code).toBe('csv-too-large');
  });

  it('keeps nothing', async () => {
    expect((await as(test, owner).get(path).expect(200)).body.total).toBe(0);
  });
});

describe('a population', () => {
  it('is made of the readable rows; the rows themselves are gone', async () => {
    const csv = surveyCsv({ change: (cells, row) => (row === 1 ? cells.with(2, '999') : cells) });
    const made = await add({ csv, name: 'Autumn' }, designer);
    expect(made).toMatchObject({ name: 'Autumn', women: 39, men: 40, leftOut: 1, rowsKept: false });
    expect(made.summary.stats.women.stature).toMatchObject({ n: 39, mean: expect.closeTo(1630, -2) });
    expect(made.summary.estimated).toContain('hip_breadth_sitting');
    const everything: { kept: string }[] = await test.dataSource.query(
      'SELECT (to_jsonb(populations))::text AS kept FROM populations WHERE id = $1',
      [made.id],
    );
    expect(everything[0]?.kept).toContain('Autumn');
    expect(everything[0]?.kept).not.toContain('Person 2');
    expect(await test.dataSource.query('SELECT * FROM population_rows')).toEqual([]);
    await as(test, owner).get(`${path}/${made.id}/rows.csv`).expect(404);
    expect(await actionsOn(made.id)).toEqual(['population.added']);
  });

  it('keeps the used columns of its rows when the owner says so, until they are forgotten', async () => {
    const { id } = await add({ name: 'With rows', keepRows: true });
    const rows = `${path}/${id}/rows.csv`;
    await as(test, designer).get(rows).expect(403);
    const { text } = await as(test, owner).get(rows).expect(200);
    expect(text.trim().split('\r\n')).toHaveLength(81);
    expect(text).toContain('Sex,Height (cm),Sitting height (cm),Weight,popliteal_height');
    expect(text).not.toContain('Person');
    await as(test, designer).delete(`${path}/${id}/rows`).expect(204);
    await as(test, owner).get(rows).expect(404);
    expect((await as(test, owner).get(`${path}/${id}`).expect(200)).body).toMatchObject({
      rowsKept: false,
      women: 40,
    });
    expect(await actionsOn(id)).toEqual([
      'population.added',
      'population.rows-exported',
      'population.rows-forgotten',
    ]);
  });

  it('keeps no row with a fault', async () => {
    const odd = '999';
    const csv = surveyCsv({ change: (cells, row) => (row === 1 ? cells.with(2, odd) : cells) });
    const { id } = await add({ csv, name: 'One slip', keepRows: true });
    const { text } = await as(test, owner).get(`${path}/${id}/rows.csv`).expect(200);
    const rows = text.trim().split('\r\n');
    expect(rows).toHaveLength(80);
    const heights = rows.slice(1).map((row: string) => row.split(',')[1]);
    expect(heights).toEqual(
      csv
        .split('\n')
        .slice(2)
        .map((row) => row.split(',')[2]),
    );
  });

  it('keeps no rows at the word of a designer', async () => {
    const { body } = await as(test, designer)
      .post(path)
      .send(surveyBody({ keepRows: true }))
      .expect(403);
    expect(body.code).toBe('owner-only');
  });

  it('shows its statistics to those who design, and only its outline to the others', async () => {
    const { id } = await add({ name: 'Outline' });
    const outline = (await as(test, reviewer).get(`${path}/${id}`).expect(200)).body;
    expect(outline).toMatchObject({ name: 'Outline', women: 40 });
    expect(Object.keys(outline).sort()).toEqual(
      [
        'addedAt',
        'addedBy',
        'estimated',
        'id',
        'leftOut',
        'men',
        'name',
        'read',
        'rowsKept',
        'source',
        'women',
      ].sort(),
    );
    const list = (await as(test, reviewer).get(`${path}?sort=addedAt&order=desc`).expect(200)).body;
    expect(list.items[0]).toEqual(outline);
    expect((await as(test, designer).get(`${path}/${id}`).expect(200)).body).toHaveProperty('summary');
  });

  it.each([
    ['too few people', { csv: surveyCsv({ each: 12 }) }, 'csv.women'],
    [
      'a column that is not there',
      { csv: surveyCsv().replace('Weight', 'Mass') },
      'mapping.measures.2.column',
    ],
    ['no name', { name: ' ' }, 'name'],
    ['everybody alike', { csv: surveyCsv({ change: (cells) => cells.with(3, '88') }) }, 'csv'],
  ])('is not made of %s', async (_what, given, field) => {
    const { body } = await as(test, owner).post(path).send(surveyBody(given)).expect(400);
    expect(body.fields[0].path).toBe(field);
  });

  it.each([
    ['measures.0', { ...SURVEY_MAPPING, measures: [null] }],
    ['a unit', { ...SURVEY_MAPPING, measures: [{ key: 'stature', column: 'Weight', unit: 'ell' }] }],
    ['sex', { ...SURVEY_MAPPING, sex: [] }],
    ['no sex', { ...SURVEY_MAPPING, sex: null }],
    ['no mapping', null],
  ])('is not made with a mapping that is none: %s', async (_what, mapping) => {
    const { body } = await as(test, owner).post(path).send(surveyBody({ mapping })).expect(400);
    expect(body.fields[0].path).toMatch(/^mapping/);
  });

  it('is studied like any other, told by its own words, and its studies outlive it', async () => {
    const workshop = { id: path.split('/')[2] ?? '', owner };
    const place = await createSet(test, await createProduction(test, {}, workshop));
    const { id } = await add({ name: 'Studied' });
    const asked = { populationId: id, people: 2000, draftNumber: 1 };
    const study = (await as(test, owner).post(`${place.setPath}/studies`).send(asked).expect(201)).body;
    expect(study).toMatchObject({
      state: 'done',
      womenPercent: 50,
      population: { id, name: 'Studied', kind: 'own', source: 'measured in the shop, autumn 2026' },
    });
    // Forty measured people of each sex settle a share to a few points only, however many are drawn.
    const wide = study.result.checks
      .filter(({ outcome }: { outcome: { kind: string } }) => outcome.kind === 'shares')
      .map(
        ({ outcome }: { outcome: { fits: { mixed: { low: number; high: number } } } }) => outcome.fits.mixed,
      )
      .map(({ low, high }: { low: number; high: number }) => high - low);
    expect(Math.max(...wide)).toBeGreaterThan(0.15);
    const uses = (await as(test, designer).get(`${path}/${id}/studies`).expect(200)).body;
    expect(uses.items).toEqual([
      expect.objectContaining({ setId: place.setPath.split('/').at(-1), studies: 1, unfinished: 0 }),
    ]);
    await as(test, owner).delete(`${path}/${id}`).expect(204);
    await as(test, owner).get(`${path}/${id}`).expect(404);
    await as(test, owner).get(`${path}/${id}/studies`).expect(404);
    const after = (
      await as(test, owner)
        .get(`${place.setPath}/studies/${study.id as string}`)
        .expect(200)
    ).body;
    expect(after.population.name).toBe('Studied');
  });

  it('of another workshop is not to be found, nor to be studied', async () => {
    const { id } = await add({ name: 'Ours' });
    const other = await createWorkshop(test);
    await as(test, other.owner).get(`/workshops/${other.id}/populations/${id}`).expect(404);
    await as(test, other.owner).get(`/workshops/${other.id}/populations/${id}/studies`).expect(404);
    await as(test, other.owner).delete(`/workshops/${other.id}/populations/${id}`).expect(404);
    const place = await createSet(test, await createProduction(test, {}, other));
    const asked = { populationId: id, people: 200, draftNumber: 1 };
    const { body } = await as(test, other.owner).post(`${place.setPath}/studies`).send(asked).expect(400);
    expect(body.fields[0]).toMatchObject({ path: 'populationId', code: 'unknown-population' });
  });
});
