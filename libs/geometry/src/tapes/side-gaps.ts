import type { FitCell } from '@settlewright/anthropometry';
import { rise, type Measure } from './gap.ts';
import type { SeatView } from './seat-view.ts';

/** Signed distance to the sitter's left for a hand. */
const towards = (side: FitCell['side'], mm: number): number => (side === 'right' ? -mm : mm);

const sillOf = (view: SeatView, cell: FitCell) =>
  view.situation.sills.find(({ pieceId, side }) => cell.pieceIds.includes(pieceId) && side === cell.side) ??
  view.situation.sills.find(({ side }) => side === cell.side);

const ELBOW_FORWARD_MM = 105;

export const elbowToSill: Measure = (view, cell) => {
  const sill = sillOf(view, cell);
  if (!sill || !view.body) return undefined;
  const elbow = view.seatHipMm + view.body.figure.ER;
  const from = view.at(towards(cell.side, sill.centreToEdgeMm), elbow, ELBOW_FORWARD_MM + view.slideMm);
  return {
    ...rise(
      from,
      sill.topMm,
      'elbow to sill',
      `${view.sitter}’s ${cell.side ?? ''} elbow at rest to the top of ${sill.mark}`,
    ),
  };
};

export const sillReach: Measure = (view, cell, outcome) => {
  const sill = sillOf(view, cell);
  if (!sill) return undefined;
  return {
    from: view.at(0, sill.topMm, ELBOW_FORWARD_MM),
    to: view.at(towards(cell.side, sill.centreToEdgeMm), sill.topMm, ELBOW_FORWARD_MM),
    name: 'to sill',
    valueMm: outcome.value,
    describes: `centre of ${view.sitter}’s seat to the near edge of ${sill.mark}`,
  };
};

export const viewOverSill: Measure = (view, cell, outcome) => {
  const sill = sillOf(view, cell);
  if (!sill) return undefined;
  const from = view.at(towards(cell.side, sill.centreToEdgeMm), sill.topMm, ELBOW_FORWARD_MM);
  return rise(
    from,
    sill.topMm + outcome.value,
    'eye over sill',
    `top of ${sill.mark} to the height of ${view.sitter}’s eye, sitting at ease`,
  );
};

export const viewPastSill: Measure = (view, cell, outcome) => {
  const sill = sillOf(view, cell);
  if (!sill) return undefined;
  const farEdge = towards(cell.side, sill.centreToEdgeMm + sill.usableDepthMm);
  return rise(
    view.at(farEdge, sill.topMm, ELBOW_FORWARD_MM),
    sill.topMm + outcome.value,
    'eye over far edge',
    `far edge of ${sill.mark} to the height of ${view.sitter}’s eye, sitting at ease`,
  );
};

export const elbowToWall: Measure = (view, cell, outcome) => {
  const wall = cell.side && view.situation.wallMm[cell.side];
  if (wall === undefined) return undefined;
  const half = view.body ? view.body.figure.FF / 2 : 0;
  const height = view.seatHipMm + (view.body?.figure.ER ?? 240) + 20;
  return {
    from: view.at(towards(cell.side, half), height, ELBOW_FORWARD_MM),
    to: view.at(towards(cell.side, wall), height, ELBOW_FORWARD_MM),
    name: view.body ? 'elbow to wall' : 'to wall',
    valueMm: view.body ? wall - half : outcome.value,
    describes: view.body
      ? `${view.sitter}’s ${cell.side} elbow to the wall`
      : `centre of the seat to the wall at the ${cell.side} hand`,
  };
};
