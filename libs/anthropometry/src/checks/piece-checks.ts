import { backAngle, heelSpace, lumbarHeight, pelvisRoom, seatTilt, slidePast } from './bench-checks.ts';
import { placeWidth, shoulderRoom } from './bench-length-checks.ts';
import {
  accessibleBenchBack,
  accessibleBenchEnd,
  accessibleBenchHeight,
  accessibleBenchSize,
  accessibleKneeSpace,
  accessibleTableHeight,
} from './clause-checks.ts';
import { eyeLines } from './eye-checks.ts';
import { cornerPlace, kneesFacing } from './pair-checks.ts';
import type { PieceCheck } from './piece-check.ts';
import { accessiblePlaces, doorWidth, turningSpace, wheelchairSpaces } from './room-clauses.ts';
import {
  behindSeat,
  betweenLegs,
  betweenTables,
  sillDepth,
  tableAcross,
  tableEdge,
  tableOverSeat,
} from './table-piece-checks.ts';
import { betweenRows, routeWidth, tablesBackToBack } from './way-clauses.ts';

/** Rules asked of pieces, pairs and ways, in the order of the sheet. */
export const PIECE_CHECKS: readonly PieceCheck[] = [
  shoulderRoom,
  kneesFacing,
  cornerPlace,
  eyeLines,
  placeWidth,
  heelSpace,
  seatTilt,
  backAngle,
  lumbarHeight,
  pelvisRoom,
  sillDepth,
  tableOverSeat,
  tableEdge,
  tableAcross,
  betweenLegs,
  slidePast,
  betweenTables,
  behindSeat,
  routeWidth,
  tablesBackToBack,
  betweenRows,
  accessibleBenchHeight,
  accessibleBenchSize,
  accessibleBenchBack,
  accessibleBenchEnd,
  accessibleTableHeight,
  accessibleKneeSpace,
  accessiblePlaces,
  turningSpace,
  doorWidth,
  wheelchairSpaces,
];
