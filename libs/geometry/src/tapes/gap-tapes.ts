import type { Measure } from './gap.ts';
import { backHeight, headroom, hipWidth, seatDepth, seatHeight, standingRoom } from './seat-gaps.ts';
import { elbowToSill, elbowToWall, sillReach, viewOverSill, viewPastSill } from './side-gaps.ts';
import { bellyRoom, kneeRoom, tableHeight, thighRoom, underTable } from './table-gaps.ts';

/** How the gap of each rule about one sitter is found. */
export const GAP_OF_RULE: Readonly<Record<string, Measure>> = {
  'SEAT-02': seatHeight,
  'SEAT-04': seatDepth,
  'SEAT-05': hipWidth,
  'TABLE-01': thighRoom,
  'TABLE-02': kneeRoom,
  'TABLE-03': underTable('knee'),
  'TABLE-04': underTable('foot'),
  'TABLE-05': tableHeight,
  'TABLE-06': bellyRoom,
  'SILL-01': elbowToSill,
  'SILL-04': sillReach,
  'SILL-05': viewOverSill,
  'SILL-06': viewPastSill,
  'HEAD-02': headroom,
  'HEAD-03': standingRoom,
  'BACK-03': backHeight,
  'SIDE-03': elbowToWall,
};
