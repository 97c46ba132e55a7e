import { lensAtEye, viewOverSill, viewPastSill } from './eye-checks.ts';
import type { PersonCheck } from './person-check.ts';
import { backHeight, hipWidth, seatDepth, seatHeight } from './seat-checks.ts';
import { elbowToSill, elbowToWall, headroom, sillReach, standingUp } from './side-checks.ts';
import { bellyRoom, kneeRoom, tableHeight, thighRoom } from './table-checks.ts';
import { footDepth, kneeDepth } from './table-depth-checks.ts';

/** Rules asked of every sitter, in the order of the sheet's columns. */
export const PERSON_CHECKS: readonly PersonCheck[] = [
  seatHeight,
  seatDepth,
  hipWidth,
  thighRoom,
  kneeRoom,
  tableHeight,
  bellyRoom,
  elbowToSill,
  sillReach,
  viewOverSill,
  viewPastSill,
  kneeDepth,
  footDepth,
  headroom,
  standingUp,
  lensAtEye,
  backHeight,
  elbowToWall,
];
