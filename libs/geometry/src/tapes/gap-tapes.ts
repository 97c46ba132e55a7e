import type { FitCell, VerdictOutcome } from '@settlewright/anthropometry';
import type { Vec3 } from '../parts/part.ts';
import { kneeAside, onBody, type SeatView } from './seat-view.ts';

/** What a gap tape measures, before it becomes a line of its cell. */
export interface Gap {
  from: Vec3;
  to: Vec3;
  name: string;
  valueMm: number;
  describes: string;
}

type Measure = (view: SeatView, cell: FitCell, outcome: VerdictOutcome) => Gap | undefined;

const atHeight = ([x, , z]: Vec3, y: number): Vec3 => [x, y, z];

/** A level or upright gap that keeps its sign: negative when body and piece would meet. */
const rise = (from: Vec3, toHeight: number, name: string, describes: string): Gap => ({
  from,
  to: atHeight(from, toHeight),
  name,
  valueMm: toHeight - from[1],
  describes,
});

const seatHeight: Measure = (view, _cell, outcome) => {
  const { frame, sitter, body } = view;
  if (body && body.pose.heelGapMm > 0.5) {
    const heel = body.pose.joints.leftHeel;
    return {
      from: atHeight(heel, 0),
      to: atHeight(heel, body.pose.heelGapMm),
      name: 'under heel',
      valueMm: body.pose.heelGapMm,
      describes: `floor to the sole of ${sitter}’s shoe, seat of ${view.situation.mark} pressed by ${sitter}`,
    };
  }
  return {
    from: atHeight(frame.frontMm, 0),
    to: atHeight(frame.frontMm, outcome.value),
    name: 'seat',
    valueMm: outcome.value,
    describes: `floor to the front edge of ${view.situation.mark}, pressed by ${sitter}`,
  };
};

const seatDepth: Measure = (view, _cell, outcome) => {
  const { body, situation, sitter } = view;
  const depth = situation.effectiveDepthMm;
  if (!body) {
    return {
      from: view.at(0, view.seatHipMm, 0),
      to: view.at(0, view.seatHipMm, depth),
      name: 'depth',
      valueMm: outcome.value,
      describes: `face of the back of ${situation.mark} to its seat front`,
    };
  }
  const aside = kneeAside(body.figure);
  const knee = body.figure.BPL + view.slideMm;
  const height = view.seatFrontMm - 20;
  return {
    from: view.at(aside, height, depth),
    to: view.at(aside, height, knee),
    name: 'behind knee',
    valueMm: knee - depth,
    describes: `seat front of ${situation.mark} to the back of ${sitter}’s knee`,
  };
};

const hipWidth: Measure = (view, _cell, outcome) => ({
  from: view.at(-outcome.value / 2, view.seatHipMm + 60, 60),
  to: view.at(outcome.value / 2, view.seatHipMm + 60, 60),
  name: 'place',
  valueMm: outcome.value,
  describes: `width of place ${view.frame.place} of ${view.situation.mark}, where ${view.sitter} sits`,
});

const tableEdge = (view: SeatView): number | undefined =>
  view.situation.table && view.situation.effectiveDepthMm - view.situation.table.overlapMm;

const thighRoom: Measure = (view) => {
  const { table } = view.situation;
  const edge = tableEdge(view);
  if (!table || edge === undefined || !view.body) return undefined;
  const { figure } = view.body;
  const forward = Math.max(edge - view.slideMm + 10, 0.45 * figure.BPL);
  const thigh = onBody(view, kneeAside(figure), figure.TC, forward);
  const line = atHeight(thigh, view.seatHipMm + figure.TC);
  return rise(
    line,
    table.undersideMm,
    'over thigh',
    `top of ${view.sitter}’s thigh to the underside of ${table.mark}`,
  );
};

const kneeRoom: Measure = (view) => {
  const { table } = view.situation;
  if (!table || !view.body) return undefined;
  const { figure, pose } = view.body;
  const knee = pose.joints.leftKnee;
  const top = knee[1] + 0.58 * (figure.KH - figure.PH);
  return rise(
    atHeight(knee, top),
    table.undersideMm,
    'over knee',
    `top of ${view.sitter}’s knee to the underside of ${table.mark}`,
  );
};

const tableHeight: Measure = (view, _cell, outcome) => {
  const { table } = view.situation;
  const edge = tableEdge(view);
  if (!table || edge === undefined) return undefined;
  const from = view.at(0, table.topMm - outcome.value, edge);
  return rise(
    from,
    table.topMm,
    'table over seat',
    `seat of ${view.situation.mark}, pressed by ${view.sitter}, to the top of ${table.mark}`,
  );
};

const bellyRoom: Measure = (view) => {
  const { table } = view.situation;
  const edge = tableEdge(view);
  if (!table || edge === undefined || !view.body) return undefined;
  const belly = view.body.figure.AD + view.slideMm;
  const height = table.topMm;
  return {
    from: view.at(0, height, belly),
    to: view.at(0, height, edge),
    name: 'belly',
    valueMm: edge - belly,
    describes: `${view.sitter}’s belly to the edge of ${table.mark}`,
  };
};

/** Signed distance to the sitter's left for a hand. */
const towards = (side: FitCell['side'], mm: number): number => (side === 'right' ? -mm : mm);

const sillOf = (view: SeatView, cell: FitCell) =>
  view.situation.sills.find(({ pieceId, side }) => cell.pieceIds.includes(pieceId) && side === cell.side) ??
  view.situation.sills.find(({ side }) => side === cell.side);

const ELBOW_FORWARD_MM = 105;

const elbowToSill: Measure = (view, cell) => {
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

const sillReach: Measure = (view, cell, outcome) => {
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

const viewOverSill: Measure = (view, cell, outcome) => {
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

const UNDER_TABLE_MM = 60;
const FOOT_MM = 60;

const underTable =
  (level: 'knee' | 'foot'): Measure =>
  (view, _cell, outcome) => {
    const { table } = view.situation;
    const edge = tableEdge(view);
    if (!table || edge === undefined) return undefined;
    const height = level === 'knee' ? table.undersideMm - UNDER_TABLE_MM : FOOT_MM;
    return {
      from: view.at(0, height, edge),
      to: view.at(0, height, edge + outcome.value),
      name: level === 'knee' ? 'for knees' : 'for feet',
      valueMm: outcome.value,
      describes: `edge of ${table.mark} to what is in the way of ${view.sitter}’s ${level === 'knee' ? 'knees' : 'feet'}`,
    };
  };

const headroom: Measure = (view) => {
  const { overhead } = view.situation;
  if (!overhead || !view.body) return undefined;
  const crown = view.body.pose.joints.crown;
  const top = view.seatHipMm + view.body.figure.SH;
  return rise(
    atHeight(crown, top),
    overhead.undersideMm,
    'over head',
    `top of ${view.sitter}’s head, sitting upright, to the underside of ${overhead.mark}`,
  );
};

const backHeight: Measure = (view, _cell, outcome) => {
  const { backTopMm, mark } = view.situation;
  if (backTopMm === undefined) return undefined;
  const from = view.at(0, backTopMm - outcome.value, 0);
  return rise(from, backTopMm, 'back', `seat of ${mark}, pressed by ${view.sitter}, to the top of its back`);
};

const elbowToWall: Measure = (view, cell, outcome) => {
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
  'HEAD-02': headroom,
  'BACK-03': backHeight,
  'SIDE-03': elbowToWall,
};
