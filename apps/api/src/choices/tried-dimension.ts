import {
  type Dimension,
  dimensionOf,
  dimensionsOf,
  dimensionStep,
  gridValues,
  lengthStep,
  type LengthStyle,
  type SetDocument,
  stickValues,
} from '@settlewright/geometry';
import { Problem, type ProblemField } from '../common/problem';
import { COARSE_STEP_MM, MOST_ROOM_MM } from '../fit-checks/verdicts-only';

/** A dimension as a request names it. */
export interface AskedDimension {
  dimension: string;
  pieceId?: string | undefined;
}

const MOST_NAMED = 60;
const SAME = 1e-6;

/** The dimension that is meant, or what is wrong with its name; `path` is the field that names it. */
export function readDimension(
  document: SetDocument,
  { dimension: id, pieceId }: AskedDimension,
  path = 'dimension',
): Dimension {
  const found = pieceId === undefined ? dimensionOf(document, id) : ofPiece(document, id, pieceId);
  if (found) return found;
  const all = dimensionsOf(document).map((one) => one.id);
  const named = all.slice(0, MOST_NAMED).join(', ');
  const more = all.length > MOST_NAMED ? ` and ${all.length - MOST_NAMED} more` : '';
  const read = pieceId === undefined ? `"${id}"` : `"${id}" of the piece "${pieceId}"`;
  const accepted = all.length === 0 ? 'none: the set has no piece with a number to choose' : named + more;
  throw Problem.invalid([
    { path, code: 'unknown-dimension', message: `the set has no number ${read} now; accepted: ${accepted}` },
  ]);
}

/** The piece's own number, also where it is the only one of its kind and goes by the kind alone. */
function ofPiece(document: SetDocument, id: string, pieceId: string): Dimension | undefined {
  const own = dimensionOf(document, `${id}|${pieceId}`) ?? dimensionOf(document, id);
  return own?.pieceIds.length === 1 && own.pieceIds[0] === pieceId ? own : undefined;
}

const COARSE_EACH_WAY = Math.round(MOST_ROOM_MM / COARSE_STEP_MM);

/** Steps of angles and firmness that move a body by about as much as the step of lengths does. */
const COARSE_STEPS: Record<Dimension['unit'], number> = { mm: COARSE_STEP_MM, deg: 3, N: 50 };

/** How finely a caller may look along dimensions. */
export interface Fineness {
  step(dimension: Dimension): number;
  stickValues(dimension: Dimension): number[];
  gridValues(dimension: Dimension): number[];
  /** The value that is looked at where one is wanted. */
  nearest(dimension: Dimension, value: number): number;
}

/** As the browser does for whoever sees measures. */
export function fine(style: LengthStyle): Fineness {
  const step = ({ unit }: Dimension) => dimensionStep(unit, lengthStep(style));
  return {
    step,
    stickValues: (dimension) => stickValues(dimension, step(dimension)),
    gridValues: (dimension) => gridValues(dimension, step(dimension)),
    nearest: (_dimension, value) => value,
  };
}

/**
 * For whoever sees no measures: where a verdict turns says as much of a body as a margin, so values stand in the steps
 * of shown margins from the present value, and no further from it than margins are shown. Lengths together tell no more.
 */
export const COARSE: Fineness = {
  step: ({ unit }) => COARSE_STEPS[unit],
  stickValues: coarseValues,
  gridValues: coarseValues,
  nearest: (dimension, value) =>
    coarseValues(dimension).reduce((best, one) =>
      Math.abs(one - value) < Math.abs(best - value) ? one : best,
    ),
};

function coarseValues(dimension: Dimension): number[] {
  const { value, min, max, unit } = dimension;
  const values: number[] = [];
  for (let n = -COARSE_EACH_WAY; n <= COARSE_EACH_WAY; n += 1) {
    const one = value + n * COARSE_STEPS[unit];
    if (one >= min - SAME && one <= max + SAME) values.push(one);
  }
  return values;
}

/** The value that is tried, the present one when none is asked for. */
export function readValue(dimension: Dimension, asked: number | undefined, fineness: Fineness): number {
  if (asked === undefined) return dimension.value;
  const { min, max, unit } = dimension;
  const fault = (message: string): ProblemField[] => [{ path: 'value', code: 'out-of-range', message }];
  if (asked < min - SAME || asked > max + SAME) {
    const accepted = `${rounded(min)} to ${rounded(max)} ${unit}`;
    throw Problem.invalid(fault(`read ${asked}; accepted: ${accepted}`));
  }
  const value = fineness.nearest(dimension, asked);
  if (dimension.at(value) === undefined) {
    throw Problem.invalid(fault(`read ${asked}; a piece cannot be built so; accepted: a value tried here`));
  }
  return value;
}

const rounded = (value: number): number => Math.round(value * 100) / 100;
