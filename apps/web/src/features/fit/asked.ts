import { lengthStep, type LengthStyle, type SetDocument, type Spot } from '@settlewright/geometry';

export type Asked = SetDocument['asked'];

/** A setting with an absent value is not asked about. */
export function without<K extends keyof Asked>(asked: Asked, key: K): Asked {
  const rest = { ...asked };
  delete rest[key];
  return rest;
}

/** A press on the plan lands on a step this coarse. */
const MM_STEP = 10;
const STEPS_OF_RULE = 4;
/** How far from the room's origin a spot may lie, to either side. */
export const FURTHEST_MM = 50_000;

const held = (mm: number): number => Math.min(FURTHEST_MM, Math.max(-FURTHEST_MM, mm));

/** A spot as a press means it: on a round number of the reader's units. */
export function roundSpot({ xMm, zMm }: Spot, style: LengthStyle): Spot {
  const step = style.system === 'millimetres' ? MM_STEP : lengthStep(style) * STEPS_OF_RULE;
  const round = (mm: number) => held(Math.round(mm / step) * step);
  return { xMm: round(xMm), zMm: round(zMm) };
}

/** Most corners that a route holds. */
export const MOST_CORNERS = 40;
const ONWARDS_MM = 1000;

/** A corner a little further on, in the direction of the last stretch. */
export function onwards(route: readonly Spot[]): Spot {
  const [before, last] = [route.at(-2), route.at(-1)];
  if (!before || !last) return { xMm: 0, zMm: 0 };
  const length = Math.hypot(last.xMm - before.xMm, last.zMm - before.zMm);
  const far = length === 0 ? 0 : ONWARDS_MM / length;
  return {
    xMm: held(last.xMm + (last.xMm - before.xMm) * far),
    zMm: held(last.zMm + (last.zMm - before.zMm) * far),
  };
}
