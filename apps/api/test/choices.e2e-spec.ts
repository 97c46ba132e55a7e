import {
  type BodyModel,
  builtInPopulations,
  checkSet,
  createBodyModel,
  createStudy,
  CROWD_WEAR,
  curveOf,
  type FitSheet,
  type KnownPerson,
  loadRuleBook,
  mapOf,
  mixOf,
  type Sitter,
  standIn,
} from '@settlewright/anthropometry';
import {
  castMap,
  changingPlaces,
  compareSheets,
  type Dimension,
  dimensionOf,
  gridValues,
  measureSet,
  orderedRows,
  type SetDocument,
  stickValues,
  storyStick,
} from '@settlewright/geometry';
import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import { readSeedData } from '../src/common/seed-data';
import { paperText } from './factories/papers';
import { as, createMember, type Person } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(600_000);

const PEOPLE: { name: string; known: KnownPerson }[] = [
  {
    name: 'Hetty Vance',
    known: {
      bodyData: 'women',
      stature: { mm: 1511, source: 'measured' },
      measured: { popliteal_height: 371, buttock_popliteal_length: 447 },
      shoeMm: 25,
      clothing: 'light',
    },
  },
  {
    name: 'Tobias Marr',
    known: {
      bodyData: 'men',
      stature: { mm: 1870, source: 'told' },
      weightKg: 92,
      measured: {},
      shoeMm: 25,
      clothing: 'light',
    },
  },
];
/** Millimetres in a step of what is shown to who sees no measures. */
const INCH = 25.4;
const COARSE_EACH_WAY = 3;

const ruleBook = loadRuleBook(readSeedData('fit-rules'));
const model: BodyModel = createBodyModel(readSeedData('populations/ansur2'));

let test: TestApp;
let place: SetPlace;
let owner: Person;
let carpenter: Person;
let document: SetDocument;
let castIds: string[];

beforeAll(async () => {
  test = await startTestApp();
  const production = await createProduction(test);
  castIds = [];
  for (const { name, known } of PEOPLE) {
    const measured = Object.entries(known.measured).map(([key, mm]) => [key, { mm }]);
    castIds.push(
      await createCastMember(test, production, {
        name,
        bodyData: known.bodyData,
        statureMm: known.stature?.mm,
        statureSource: known.stature?.source,
        weightKg: known.weightKg ?? null,
        measured: Object.fromEntries(measured),
      }),
    );
  }
  place = await createSet(test, production);
  ({ owner } = place.workshop);
  carpenter = await createMember(test, place.workshop.id, 'carpenter');
  const draft = (await as(test, owner).get(`${place.setPath}/draft`).expect(200)).body;
  document = draft.document;
  // Seats and table: walls and sills would double the work of each set that is tried.
  document.pieces = document.pieces.filter(({ kind }) => kind === 'bench' || kind === 'table');
  const bench = document.pieces.find(({ kind }) => kind === 'bench')!;
  document.seating = castIds.map((castId, n) => ({
    pieceId: bench.id,
    place: n + 1,
    sitter: { kind: 'cast', castId },
  }));
  const saved = await as(test, owner)
    .put(`${place.setPath}/draft`)
    .send({ baseNumber: draft.number, document })
    .expect(200);
  await as(test, owner)
    .post(`${place.setPath}/revisions`)
    .send({ baseNumber: saved.body.number, note: '' })
    .expect(201);
});
afterAll(() => test.close());

const asks = async (what: string, body: object, who: Person = owner, status = 200, { setPath } = place) =>
  (await as(test, who).post(`${setPath}/${what}`).send(body).expect(status)).body;
/** Another set of the production, as far as it is to be. */
async function setWith(name: string, changed: SetDocument): Promise<SetPlace & { number: number }> {
  const made = await createSet(test, place, { name });
  const draft = (await as(test, owner).get(`${made.setPath}/draft`).expect(200)).body;
  const sent = { baseNumber: draft.number, document: changed };
  const saved = await as(test, owner).put(`${made.setPath}/draft`).send(sent).expect(200);
  return { ...made, number: saved.body.number };
}
const plain = (value: unknown): unknown => JSON.parse(JSON.stringify(value));
const height = (): Dimension => dimensionOf(document, 'seat-height')!;

const sitters = (): Sitter[] =>
  document.seating.map(({ pieceId, place: at }, n) => ({
    id: castIds[n]!,
    name: PEOPLE[n]!.name,
    kind: 'cast',
    placeId: `${pieceId}:${at}`,
    person: PEOPLE[n]!.known,
  }));
const check = (set: SetDocument): FitSheet =>
  checkSet({
    situation: measureSet(set, ruleBook),
    sitters: sitters(),
    ruleBook,
    model,
    settings: set.asked,
    sittersOnly: true,
  });

function finished<T>(steps: Generator<unknown, T, void>): T {
  for (;;) {
    const { done, value } = steps.next();
    if (done) return value;
  }
}

/** Women and men of the population, evenly. */
function drawn(count: number) {
  const civilians = builtInPopulations({
    ansur2: readSeedData('populations/ansur2'),
    civilian: readSeedData('populations/civilian-2015'),
    nations: readSeedData('populations/nations'),
    children: readSeedData('populations/children'),
  }).get('us-civilians-2015')!;
  return mixOf(civilians, civilians, 0.5).draw(count, 1);
}

describe('a story stick', () => {
  it('says what the library says, of the draft and of a revision alike', async () => {
    const dimension = height();
    const expected = finished(
      storyStick({ dimension, values: stickValues(dimension, 1), check, ruleId: 'SEAT-02' }),
    );
    const body = await asks('draft/story-stick', { dimension: 'seat-height' });
    expect(body).toMatchObject({
      detail: 'full',
      version: { draftNumber: 2 },
      shownRule: 'SEAT-02',
      step: 1,
    });
    expect(body.values).toEqual(plain(expected.values));
    expect(body.rows).toEqual(plain(orderedRows(expected.rows)));
    expect(body.rows.some(({ fits }: { fits: unknown[] }) => fits.length > 0)).toBe(true);
    expect(body.ruleIds).toEqual(expected.ruleIds);
    expect(body.allTight).toEqual(plain(expected.allTight));
    expect(body.value).toBe(dimension.value);
    expect(body.rules.find(({ id }: { id: string }) => id === 'SEAT-02').sources.length).toBeGreaterThan(0);
    const issued = await asks('revisions/A/story-stick', { dimension: 'seat-height' });
    expect(issued).toEqual({ ...body, version: { revisionLetter: 'A' } });
  });

  it('takes one piece, every rule, and says the verdicts at a tried value', async () => {
    const pieceId = document.seating[0]!.pieceId;
    const value = height().value - 60;
    const body = await asks('draft/story-stick', { dimension: 'seat-height', pieceId, value, ruleId: 'all' });
    expect(body.dimension).toMatchObject({ id: `seat-height|${pieceId}`, pieceIds: [pieceId] });
    const lowered = check(dimensionOf(document, `seat-height|${pieceId}`)!.at(value)!);
    for (const { placeId, state } of body.atValue) {
      const cells = lowered.rows.find((row) => row.placeId === placeId)!.cells;
      const said = cells.flatMap(({ ruleId, outcome }) =>
        body.ruleIds.includes(ruleId) && outcome.kind === 'verdict' ? [outcome.verdict] : [],
      );
      const worst = ['wontFit', 'notKnown', 'tight', 'fits'].find((one) => said.includes(one as 'fits'));
      expect(state).toBe(worst);
    }
    expect(body.atValue).toHaveLength(2);
  });

  it('counts the people that the browser counts', async () => {
    const dimension = height();
    const body = await asks('draft/story-stick', {
      dimension: 'seat-height',
      populationId: 'us-civilians-2015',
    });
    const { points, joint, population } = body.shares;
    const places = (value: number) => measureSet(dimension.at(value)!).places;
    const values: number[] = points.map(({ value }: { value: number }) => value);
    expect(values.length).toBeGreaterThan(30);
    const study = createStudy(drawn(10_000), {
      places: places(values[0]!),
      ruleBook,
      wear: { women: CROWD_WEAR, men: CROWD_WEAR },
    });
    const placeIds = changingPlaces(values.map(places));
    const some = [values[10]!, values[20]!];
    const share = (ruleIds?: string[]) => {
      study.tick({ placeIds, ...(ruleIds ? { ruleIds } : {}) });
      return curveOf(study, some, places).map(({ all: { fits } }) => (fits.women + fits.men) / 10_000);
    };
    const at = (list: { value: number; fits: number }[]) =>
      some.map((value) => list.find((one) => one.value === value)!.fits);
    expect(at(points)).toEqual(share(['SEAT-02']));
    expect(at(joint)).toEqual(share());
    expect(Math.max(...at(points))).toBeGreaterThan(0.1);
    expect(population).toMatchObject({ womenPercent: 50, people: 10_000, placeIds });
  });

  it('shows a carpenter verdicts in the steps of shown margins and no ends of a body', async () => {
    const dimension = height();
    const asked = { dimension: 'seat-height', ruleId: 'SEAT-02', value: dimension.value + 30 };
    const body = await asks('draft/story-stick', asked, carpenter);
    const steps = [...Array(2 * COARSE_EACH_WAY + 1).keys()].map((n) => n - COARSE_EACH_WAY);
    expect(body.detail).toBe('verdicts');
    expect(body.values).toHaveLength(steps.length);
    steps.forEach((n, i) => expect(body.values[i]).toBeCloseTo(dimension.value + n * INCH, 6));
    expect(body.value).toBeCloseTo(dimension.value + INCH, 6);
    const allowed = ['estimated', 'fits', 'name', 'placeId', 'sitterId', 'states', 'tight'];
    for (const row of body.rows) {
      expect(Object.keys(row).sort()).toEqual(allowed);
      for (const { from, to } of [...row.fits, ...row.tight]) {
        expect(body.values).toEqual(expect.arrayContaining([from, to]));
      }
      row.states.forEach((state: string, n: number) => {
        const sheet = check(dimension.at(body.values[n])!);
        const cells = sheet.rows.find(({ placeId }) => placeId === row.placeId)!.cells;
        const cell = cells.find(({ ruleId }) => ruleId === 'SEAT-02')!;
        expect(cell.outcome).toMatchObject({ verdict: state });
      });
    }
    expect(body.rows).toHaveLength(2);
  });
});

describe('a story stick on paper', () => {
  const pdf = async (who: Person, what: string, body: object): Promise<string> => {
    const sent = as(test, who).post(`${place.setPath}/${what}/story-stick.pdf`).send(body);
    const answer = await sent.responseType('blob').expect(200).expect('content-type', 'application/pdf');
    return (await paperText(answer.body as Buffer)).replace(/\s+/g, ' ');
  };

  it('names the sitters, the numbers and the version, in the units that are asked for', async () => {
    const asked = { dimension: 'seat-height', value: height().value + 12.7 };
    const metric = await pdf(owner, 'draft', { ...asked, populationId: 'us-civilians-2015' });
    for (const words of [
      'Hetty Vance',
      'Tobias Marr',
      'Share who fit',
      'Draft',
      'Guidance, not certification.',
    ])
      expect(metric).toContain(words);
    expect(metric).toMatch(/now [\d.]+ mm/);
    expect(metric).toMatch(/tried [\d.]+ mm/);
    const inches = await pdf(owner, 'revisions/A', { ...asked, units: 'feet-inches', roundTo: 8 });
    expect(inches).toMatch(/now \S+″/);
    expect(inches).toContain('feet and inches');
    expect(inches).not.toContain('Sitters were looked at from');
  });

  it('tells a carpenter in which steps the sitters were looked at', async () => {
    const words = await pdf(carpenter, 'draft', { dimension: 'seat-height' });
    expect(words).toContain('Sitters were looked at from');
    expect(words).not.toContain('best guess');
  });
});

describe('a map of two dimensions', () => {
  const asked = { across: 'seat-height', up: 'seat-depth' };

  it('says what the library says, and the share of the same people', async () => {
    // Hundreds of sets are tried: of one bench, so that each is quick.
    const one = {
      ...document,
      pieces: document.pieces.filter(({ id }) => id === document.seating[0]!.pieceId),
    };
    const at = await setWith('One bench', one);
    const [across, up] = [dimensionOf(one, 'seat-height')!, dimensionOf(one, 'seat-depth')!];
    const expected = finished(
      castMap({
        across: gridValues(across, 1),
        up: gridValues(up, 1),
        documentAt: (first, second) => up.at(second, across.at(first)),
        check,
        shown: new Set([across.ruleId, up.ruleId]),
      }),
    );
    const crowd = { populationId: 'us-civilians-2015' };
    const body = await asks('draft/dimension-map', { ...asked, ...crowd }, owner, 200, at);
    expect(body.acrossValues).toEqual(expected.across);
    expect(body.upValues).toEqual(expected.up);
    expect(body.regions).toEqual(plain(expected.regions));
    expect(body.ruleIds).toEqual(expected.ruleIds);
    const study = createStudy(drawn(4000), {
      places: expected.placesAt[0]![0]!,
      ruleBook,
      wear: { women: CROWD_WEAR, men: CROWD_WEAR },
    });
    study.tick({ placeIds: changingPlaces(expected.placesAt.flat()), ruleIds: expected.ruleIds });
    const row = 9;
    const counted = mapOf(study, expected.across, [expected.up[row]!], (first) => {
      return expected.placesAt[row]![expected.across.indexOf(first)]!;
    });
    const shares = counted.all[0]!.map(({ fits }) => (fits.women + fits.men) / 4000);
    expect(body.shares.fits[row]).toEqual(shares);
    expect(Math.max(...shares)).toBeGreaterThan(0.05);
    expect(body.best[0].served).toBeGreaterThanOrEqual(body.best.at(-1).served);
  });

  it('shows a carpenter who is served in coarse steps, and no room', async () => {
    const body = await asks('revisions/A/dimension-map', asked, carpenter);
    expect(body.acrossValues).toHaveLength(2 * COARSE_EACH_WAY + 1);
    expect(body.regions.length).toBeGreaterThan(0);
    for (const region of body.regions) expect(region).not.toHaveProperty('rooms');
  });

  it('lets a carpenter not set the steps of an angle against those of a length', async () => {
    for (const given of [
      { across: 'seat-height', up: 'seat-tilt' },
      { across: 'seat-firmness', up: 'seat-height' },
    ]) {
      const { fields } = await asks('draft/dimension-map', given, carpenter, 400);
      expect(fields).toEqual([expect.objectContaining({ code: 'two-lengths' })]);
    }
  });

  it('refuses the same dimension twice', async () => {
    const { fields } = await asks('draft/dimension-map', { ...asked, up: 'seat-height' }, owner, 400);
    expect(fields).toEqual([expect.objectContaining({ path: 'up', code: 'same-dimension' })]);
  });
});

describe('a comparison', () => {
  it('says what changed, who gains and who loses, to each as the sheets do', async () => {
    const lowered = height().at(height().value - 50)!;
    const other = await setWith('Other way', lowered);
    const body = await asks('comparison', { from: { revisionLetter: 'a' }, to: { setId: other.setId } });
    const expected = compareSheets(check(document), check(lowered));
    expect(body.from).toMatchObject({ revisionLetter: 'A', setId: place.setId });
    expect(body.to).toMatchObject({ draftNumber: other.number, setName: 'Other way' });
    expect(body.changes.length).toBeGreaterThan(0);
    const turned = (list: { ruleId: string; from: string; to: string }[]) =>
      list.map(({ ruleId, from, to }) => ({ ruleId, from, to }));
    expect(expected.sitters.some(({ gains, losses }) => gains.length + losses.length > 0)).toBe(true);
    expected.sitters.forEach((sitter, n) => {
      expect(body.sitters[n]).toMatchObject({ sitterId: sitter.sitterId, kept: sitter.kept });
      expect(turned(body.sitters[n].gains)).toEqual(turned(sitter.gains));
      expect(turned(body.sitters[n].losses)).toEqual(turned(sitter.losses));
    });
    const seen = await asks('comparison', { from: {}, to: { setId: other.setId } }, carpenter);
    expect(seen.detail).toBe('verdicts');
    const changed = [...seen.sitters[0].gains, ...seen.sitters[1].gains, ...seen.sitters[0].losses];
    expect(changed.length).toBeGreaterThan(0);
    const sheet = await as(test, carpenter).get(`${place.setPath}/draft/fit-sheet`).expect(200);
    for (const { sitterId, gains, losses } of seen.sitters) {
      const row = sheet.body.rows.find((one: { sitterId: string }) => one.sitterId === sitterId);
      for (const { ruleId, marginBefore } of [...gains, ...losses]) {
        const cell = row.cells.find((one: { ruleId: string }) => one.ruleId === ruleId);
        expect(marginBefore).toBe(cell.outcome.margin);
      }
    }
  });

  it('finds nothing of another production, and refuses a version against itself', async () => {
    const elsewhere = await createSet(test, await createProduction(test, {}, place.workshop));
    await asks('comparison', { from: {}, to: { setId: elsewhere.setId } }, owner, 404);
    await asks('comparison', { from: {}, to: { revisionLetter: 'Q' } }, owner, 404);
    const { fields } = await asks('comparison', { from: {}, to: {} }, owner, 400);
    expect(fields).toEqual([expect.objectContaining({ path: 'to', code: 'same-version' })]);
  });
});

describe('a stand-in', () => {
  it('is worth what the library says, from the cast or from outside', async () => {
    const [seat] = sitters();
    const setting = { ruleBook, model, settings: document.asked };
    const at = measureSet(document).places.find(({ placeId }) => placeId === seat!.placeId)!;
    const worth = (standInPerson: KnownPerson) =>
      plain(standIn({ ...setting, place: at, castMember: seat!.person, standIn: standInPerson }));
    const { placeId } = seat!;
    const ofCast = await asks('draft/stand-in', { placeId, castId: castIds[1] });
    expect(ofCast.checks).toEqual(worth(PEOPLE[1]!.known));
    expect(new Set(ofCast.checks.map(({ answer }: { answer: string }) => answer)).size).toBeGreaterThan(1);
    const person = { bodyData: 'women', statureMm: 1600, measured: { popliteal_height: { mm: 390 } } };
    const stranger = await asks('revisions/A/stand-in', { placeId, person });
    expect(stranger.checks).toEqual(
      worth({
        bodyData: 'women',
        stature: { mm: 1600, source: 'measured' },
        measured: { popliteal_height: 390 },
        shoeMm: 25,
        clothing: 'light',
      }),
    );
    await asks('draft/stand-in', { placeId, person }, carpenter, 403);
  });

  it.each([
    [{ castId: 'mine' }, 'castId', 'same-person'],
    [{}, 'castId', 'one-stand-in'],
    [{ person: {} }, 'person.statureMm', 'required'],
    [{ person: { statureMm: 90 } }, 'person.statureMm', 'within-limit'],
    [{ placeId: 'nowhere:1', person: { statureMm: 1600 } }, 'placeId', 'unknown-place'],
  ])('refuses %j', async (given, path, code) => {
    const { placeId } = sitters()[0]!;
    const castId = 'castId' in given ? { castId: castIds[0] } : {};
    const { fields } = await asks('draft/stand-in', { placeId, ...given, ...castId }, owner, 400);
    expect(fields).toEqual([expect.objectContaining({ path, code })]);
  });
});

describe('questions that cannot be answered', () => {
  it.each([
    [{ dimension: 'ceiling' }, 'dimension', /read|no number "ceiling".*accepted: seat-height/],
    [{ dimension: 'seat-height', pieceId: 'nothing' }, 'dimension', /of the piece "nothing"/],
    [{ dimension: 'seat-height', value: 9000 }, 'value', /read 9000; accepted: .* mm/],
    [{ dimension: 'seat-height', ruleId: 'TABLE-09' }, 'ruleId', /"TABLE-09"; accepted: all, SEAT-02/],
    [{ dimension: 'seat-height', populationId: 'giants' }, 'populationId', /"giants"; accepted/],
    [
      { dimension: 'seat-height', populationId: 'german', womenPercent: 40 },
      'womenPercent',
      /read 40; .* men only/,
    ],
    [{ dimension: 7 }, 'dimension', /read 7/],
  ])('name the field, what was read and what is accepted: %j', async (body, path, message) => {
    const reader = await createMember(test, place.workshop.id, 'designer');
    const { fields } = await asks('draft/story-stick', body, reader, 400);
    expect(fields[0].path).toBe(path);
    expect(fields[0].message).toMatch(message);
  });

  it('leave out what is sent as null', async () => {
    const nothing = { populationId: null, womenPercent: null, units: null, roundTo: null, draftNumber: null };
    const asked = { dimension: 'seat-firmness' };
    const nulls = { ...asked, ...nothing, pieceId: null, value: null, ruleId: null };
    expect(await asks('draft/story-stick', nulls)).toEqual(await asks('draft/story-stick', asked));
    const version = { setId: null, draftNumber: null };
    const to = { ...version, revisionLetter: 'A' };
    const { from } = await asks('comparison', { from: { ...version, revisionLetter: null }, to });
    expect(from.draftNumber).toBe(2);
    const { placeId } = sitters()[0]!;
    await asks('draft/stand-in', { placeId, castId: null, person: { statureMm: 1600 }, draftNumber: null });
  });

  it('are about another draft or revision', async () => {
    const seen = { dimension: 'seat-height', draftNumber: 1 };
    expect(await asks('draft/story-stick', seen, owner, 409)).toMatchObject({
      code: 'draft-moved-on',
      currentNumber: 2,
    });
    await asks('revisions/Z/story-stick', { dimension: 'seat-height' }, owner, 404);
  });

  it('are too many within a minute', async () => {
    const busy = await createMember(test, place.workshop.id, 'reviewer');
    await test.dataSource.query(`INSERT INTO rate_limits (key, points, expire) VALUES ($1, 30, $2)`, [
      `tried-sets:${busy.id}`,
      Date.now() + 60_000,
    ]);
    const body = await asks('draft/story-stick', { dimension: 'seat-height' }, busy, 429);
    expect(body.code).toBe('too-many-attempts');
  });
});
