import type { PlaceSituation } from '../src/checks/situation.ts';
import { soldiers2012 } from '../src/populations/survey-population.ts';
import { readSurvey } from '../src/populations/survey.ts';
import { lapTable, place, sill } from './example-set.ts';
import { ansur2 } from './seed.ts';

export const soldiers = soldiers2012(readSurvey(ansur2));

export const lensHeightMm = 1180;

export const wear = {
  women: { shoeMm: 45, clothing: 'light' },
  men: { shoeMm: 25, clothing: 'heavy' },
} as const;

/** Places that make every rule speak: with and without foam, sills on both hands, walls, table, back, overhead. */
export const places: PlaceSituation[] = [
  place({
    backTopMm: 800,
    wallMm: { left: 280, right: 300 },
    sills: [sill(), sill({ pieceId: 's2', mark: 'S2', side: 'right', topMm: 640, centreToEdgeMm: 260 })],
    table: lapTable({ kneeDepthMm: 370, footDepthMm: 650 }),
    overhead: { pieceId: 'o1', mark: 'O1', undersideMm: 1330 },
    overheadAhead: { pieceId: 'o2', mark: 'O2', undersideMm: 1750 },
  }),
  place({
    placeId: 'b1:2',
    place: 2,
    widthMm: 440,
    seatTopFrontMm: 440,
    seatTopHipMm: 432,
    deckHeightMm: 350,
    // Tried until nothing is left open: judged one by one, nobody is near a line for the foam's sake.
    foam: {
      thicknessMm: 90,
      ifd25N: 150,
      supportFactor: 2.2,
      tested: { factor: 1.15, error: 0, sits: 9 },
    },
    backTopMm: 790,
    wallMm: { right: 310 },
    sills: [sill({ side: 'right', topMm: 940 })],
    table: lapTable({ topMm: 660, undersideMm: 620, overlapMm: 70, kneeDepthMm: 390, footDepthMm: 610 }),
    overhead: { pieceId: 'o1', mark: 'O1', undersideMm: 1360 },
  }),
  place({ placeId: 'b1:3', place: 3, sills: [sill({ side: 'behind' })] }),
];

/** The same places with every seat so much higher. */
export const raised = (byMm: number): PlaceSituation[] =>
  places.map((at) => ({
    ...at,
    seatTopFrontMm: at.seatTopFrontMm + byMm,
    seatTopHipMm: at.seatTopHipMm + byMm,
    deckHeightMm: at.deckHeightMm + byMm,
  }));
