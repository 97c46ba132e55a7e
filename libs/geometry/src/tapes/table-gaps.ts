import { atHeight, rise, type Measure } from './gap.ts';
import { kneeAside, onBody, type SeatView } from './seat-view.ts';

const tableEdge = (view: SeatView): number | undefined =>
  view.situation.table && view.situation.effectiveDepthMm - view.situation.table.overlapMm;

export const thighRoom: Measure = (view) => {
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

export const kneeRoom: Measure = (view) => {
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

export const tableHeight: Measure = (view, _cell, outcome) => {
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

export const bellyRoom: Measure = (view) => {
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

const UNDER_TABLE_MM = 60;
const FOOT_MM = 60;

export const underTable =
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
