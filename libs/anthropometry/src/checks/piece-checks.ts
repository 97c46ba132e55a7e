import { backAngle, heelSpace, placeWidth, seatTilt, shoulderRoom } from './bench-checks.ts';
import {
  accessibleBenchBack,
  accessibleBenchHeight,
  accessibleBenchSize,
  accessibleKneeSpace,
  accessibleTableHeight,
} from './clause-checks.ts';
import { cornerPlace, kneesFacing } from './pair-checks.ts';
import type { PieceCheck } from './piece-check.ts';
import {
  behindSeat,
  betweenLegs,
  betweenTables,
  sillDepth,
  tableAcross,
  tableEdge,
  tableOverSeat,
} from './table-piece-checks.ts';

/** Rules asked of pieces, pairs and ways, in the order of the sheet. */
export const PIECE_CHECKS: readonly PieceCheck[] = [
  shoulderRoom,
  kneesFacing,
  cornerPlace,
  placeWidth,
  heelSpace,
  seatTilt,
  backAngle,
  sillDepth,
  tableOverSeat,
  tableEdge,
  tableAcross,
  betweenLegs,
  betweenTables,
  behindSeat,
  accessibleBenchHeight,
  accessibleBenchSize,
  accessibleBenchBack,
  accessibleTableHeight,
  accessibleKneeSpace,
];
