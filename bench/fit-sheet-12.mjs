import { createRequire } from 'node:module';
import { checkSet, createBodyModel, loadRuleBook, TAPE_MEASURE_KEYS } from '@settlewright/anthropometry';

const load = createRequire(import.meta.url);
const IN = 25.4;
const SITTERS = 12;
const WARM_UP = 100;
const RUNS = 300;

/** A dining car of six benches for two, with tables, sills and a wall beside the window places. */
function makeSet() {
  const place = (bench, number) => ({
    placeId: `b${bench}:${number}`,
    pieceId: `b${bench}`,
    mark: `B${bench}`,
    place: number,
    seatTopFrontMm: 18.75 * IN,
    seatTopHipMm: 18.5 * IN,
    deckHeightMm: 15 * IN,
    foam: { thicknessMm: 3.75 * IN, ifd25N: 222, supportFactor: 2.2 },
    effectiveDepthMm: 17.5 * IN,
    widthMm: 22 * IN,
    heelRoomMm: 2.5 * IN,
    seatTiltRad: (2 * Math.PI) / 180,
    backLeanRad: (8 * Math.PI) / 180,
    backTopMm: 48 * IN,
    wallMm: number === 1 ? { left: 11 * IN } : {},
    sills:
      number === 1
        ? [
            {
              pieceId: 's1',
              mark: 'S1',
              side: 'left',
              topMm: 27.5 * IN,
              usableDepthMm: 4 * IN,
              centreToEdgeMm: 11 * IN,
            },
          ]
        : [],
    table: {
      pieceId: `t${Math.ceil(bench / 2)}`,
      mark: `T${Math.ceil(bench / 2)}`,
      topMm: 29.5 * IN,
      undersideMm: 28.25 * IN,
      overlapMm: 3 * IN,
      kneeDepthMm: 18 * IN,
      footDepthMm: 20 * IN,
      topThicknessMm: 1.25 * IN,
    },
    overhead: { pieceId: 'o1', mark: 'O1', undersideMm: 1550 },
  });
  const benchNumbers = [1, 2, 3, 4, 5, 6];
  const places = benchNumbers.flatMap((bench) => [place(bench, 1), place(bench, 2)]);
  return {
    places,
    benches: benchNumbers.map((bench) => ({
      pieceId: `b${bench}`,
      mark: `B${bench}`,
      lengthMm: 44 * IN,
      effectiveDepthMm: 17.5 * IN,
      placeIds: [`b${bench}:1`, `b${bench}:2`],
      unpressedSeatTopMm: 18.75 * IN,
      accessible: bench === 6,
      back: {
        bottomAboveSeatMm: 0,
        topAboveSeatMm: 29 * IN,
        gapToSeatMm: 0,
        lengthMm: 44 * IN,
        fixedToWall: false,
      },
    })),
    tables: [1, 2, 3].map((table) => ({
      pieceId: `t${table}`,
      mark: `T${table}`,
      topMm: 29.5 * IN,
      accessible: false,
      betweenFacingMm: 28 * IN,
      edges: [
        {
          name: 'front',
          lengthMm: 40 * IN,
          placeIds: [`b${2 * table - 1}:1`, `b${2 * table - 1}:2`],
          clearBetweenLegsMm: 36 * IN,
        },
        {
          name: 'back',
          lengthMm: 40 * IN,
          placeIds: [`b${2 * table}:1`, `b${2 * table}:2`],
          clearBetweenLegsMm: 36 * IN,
        },
      ],
      kneeSpace: { clearHeightMm: 28 * IN, widthMm: 36 * IN, depthAt: [], toeDepthMm: 20 * IN },
    })),
    facing: [1, 3, 5].map((bench) => ({
      pieceIds: [`b${bench}`, `b${bench + 1}`],
      marks: [`B${bench}`, `B${bench + 1}`],
      gapMm: 22 * IN,
      pairs: [
        [`b${bench}:1`, `b${bench + 1}:2`],
        [`b${bench}:2`, `b${bench + 1}:1`],
      ],
    })),
    corners: [],
    ways: [{ kind: 'between-tables', pieceIds: ['t1', 't2'], marks: ['T1', 'T2'], widthMm: 16 * IN }],
  };
}

/** Twelve people: four measured, six known by height (four of them with weight), two percentile mannequins. */
function makeSitters(model, places) {
  const base = { measured: {}, shoeMm: 25, clothing: 'medium' };
  const measured = (bodyData, stature, weightKg) => {
    const body = model.predict({ ...base, bodyData, stature: { mm: stature, source: 'measured' }, weightKg });
    const taken = Object.fromEntries(TAPE_MEASURE_KEYS.map((key) => [key, body.mean(key)]));
    return { ...base, bodyData, stature: { mm: stature, source: 'measured' }, weightKg, measured: taken };
  };
  const told = (bodyData, mm, weightKg) => ({ ...base, bodyData, stature: { mm, source: 'told' }, weightKg });
  const people = [
    measured('women', 1575, 58),
    measured('men', 1905, 98),
    measured('women', 1510, 52),
    measured('men', 1675, 70),
    told('men', 1780, undefined),
    told('women', 1725, undefined),
    told('men', 1830, 90),
    told('women', 1640, 66),
    told('mixed', 1700, 72),
    told('mixed', 1690, 80),
    model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 5 }),
    model.mannequin({ bodyData: 'men', measure: 'stature', percentile: 95 }),
  ];
  return people.slice(0, SITTERS).map((person, index) => ({
    id: `sitter-${index + 1}`,
    name: `Sitter ${index + 1}`,
    kind: person.exact ? 'mannequin' : 'cast',
    placeId: places[index].placeId,
    person,
  }));
}

/** Time to check twelve sitters against every rule, the people already predicted: the median of many runs. */
export async function run() {
  const model = createBodyModel(load('@settlewright/seed-data/populations/ansur2.json'));
  const ruleBook = loadRuleBook(load('@settlewright/seed-data/fit-rules.json'));
  const situation = makeSet();
  const sitters = makeSitters(model, situation.places);
  const settings = { backPosture: 'dining', trafficBehind: 'none' };
  const input = { situation, sitters, ruleBook, model, settings };
  for (let n = 0; n < WARM_UP; n += 1) checkSet(input);
  const times = [];
  for (let n = 0; n < RUNS; n += 1) {
    const start = performance.now();
    checkSet(input);
    times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  return [{ name: 'fit-sheet-12', value: times[RUNS / 2], unit: 'ms', aim: 3, reference: null }];
}
