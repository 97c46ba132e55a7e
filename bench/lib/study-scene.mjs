// People, places and rules for the figures about studies.
import { createRequire } from 'node:module';
import { createStudy, loadRuleBook, readSurvey, soldiers2012 } from '@settlewright/anthropometry';

const load = createRequire(import.meta.url);
const IN = 25.4;

export const ruleBook = loadRuleBook(load('@settlewright/seed-data/fit-rules.json'));
export const wear = { shoeMm: 25, clothing: 'medium' };
export const lensHeightMm = 1180;
const soldiers = soldiers2012(readSurvey(load('@settlewright/seed-data/populations/ansur2.json')));

export const drawPeople = (count) => soldiers.draw(count, 1);

/** A bench place of which every rule has something to say; `n` makes places that differ in every dimension. */
export function makePlace(n = 0, raisedMm = 0) {
  const mark = `B${n + 1}`;
  return {
    placeId: `b${n + 1}:1`,
    pieceId: `b${n + 1}`,
    mark,
    place: 1,
    seatTopFrontMm: 17.75 * IN + 3 * n + raisedMm,
    seatTopHipMm: 17.5 * IN + 3 * n + raisedMm,
    deckHeightMm: 14 * IN + 3 * n + raisedMm,
    foam: { thicknessMm: 3.75 * IN, ifd25N: 222, supportFactor: 2.2 },
    effectiveDepthMm: 17 * IN + 2 * n,
    widthMm: 20 * IN + 4 * n,
    heelRoomMm: 2.5 * IN,
    seatTiltRad: (2 * Math.PI) / 180,
    backLeanRad: (8 * Math.PI) / 180,
    backTopMm: 32 * IN + 5 * n,
    wallMm: { left: 14 * IN + 2 * n },
    sills: [
      {
        pieceId: 's1',
        mark: 'S1',
        side: 'left',
        topMm: 25.5 * IN + 3 * n,
        usableDepthMm: 4 * IN,
        centreToEdgeMm: 10 * IN + n,
      },
    ],
    table: {
      pieceId: 't1',
      mark: 'T1',
      topMm: 27.5 * IN + 2 * n,
      undersideMm: 26 * IN + 2 * n,
      overlapMm: 3 * IN,
      kneeDepthMm: 15 * IN + 2 * n,
      footDepthMm: 24 * IN,
      topThicknessMm: 1.25 * IN,
    },
    overhead: { pieceId: 'o1', mark: 'O1', undersideMm: 1370 + 4 * n },
    overheadAhead: { pieceId: 'o2', mark: 'O2', undersideMm: 1850 + 4 * n },
  };
}

export const setupFor = (places) => ({
  places,
  ruleBook,
  wear: { women: wear, men: wear },
  lensHeightMm,
});

/** One study from nothing: what bodies need, what the place offers, all shares and who is lost. */
export const studyOnce = (people) => createStudy(people, setupFor([makePlace()])).shares();
