import {
  clashOf,
  type Dimension,
  dimensionStep,
  dimensionsOf,
  dimensionWords,
  type FreeDimension,
  type SetDocument,
} from '@settlewright/geometry';
import type { ProblemField } from '../common/problem';
import type { StartFreeDto } from './dto/start-suggestion.dto';
import type { ToldDimension } from './search-question';

const SAME = 1e-6;

/** The free dimensions as they are searched and told, or everything that is wrong with them. */
export function readFree(
  sent: readonly StartFreeDto[],
  document: SetDocument,
  lengthStepMm: number,
): { free: FreeDimension[]; told: ToldDimension[]; faults: ProblemField[] } {
  const dimensions = dimensionsOf(document);
  const ids = sent.map(({ dimensionId }) => dimensionId);
  const faults: ProblemField[] = [];
  const told = sent.flatMap((one, at): ToldDimension[] => {
    const path = `free.${at}`;
    const dimension = dimensions.find(({ id }) => id === one.dimensionId);
    if (!dimension) {
      const known = dimensions.map(({ id }) => id).slice(0, 60);
      const message = `the set has no dimension "${one.dimensionId}"; accepted: ${known.join(', ')}`;
      faults.push({ path: `${path}.dimensionId`, code: 'unknown', message });
      return [];
    }
    faults.push(...clashFaults(dimension, ids.slice(0, at), dimensions, `${path}.dimensionId`));
    faults.push(...rangeFaults(dimension, one, path));
    const { label, unit, marks, tableMarks, value } = dimension;
    const step = one.step ?? dimensionStep(unit, lengthStepMm);
    return [
      { dimensionId: dimension.id, ...rangeOf(dimension, one), step, label, unit, marks, tableMarks, value },
    ];
  });
  const free = told.map(({ dimensionId, min, max, step }) => ({ dimensionId, min, max, step }));
  return { free, told, faults };
}

/** No number may move by two dimensions. */
function clashFaults(
  dimension: Dimension,
  before: readonly string[],
  dimensions: readonly Dimension[],
  path: string,
): ProblemField[] {
  const other = before.includes(dimension.id) ? dimension : clashOf(dimension, before, dimensions);
  if (!other) return [];
  const message = `read "${dimension.id}", which moves already with “${dimensionWords(other)}”; accepted: one of the two`;
  return [{ path, code: 'moves-already', message }];
}

function rangeFaults(
  dimension: Dimension,
  { min, max, tolerance }: StartFreeDto,
  path: string,
): ProblemField[] {
  const hasRange = isGiven(min) || isGiven(max);
  const isWhole = isGiven(min) && isGiven(max);
  if (hasRange === isGiven(tolerance) || (hasRange && !isWhole)) {
    const given = Object.entries({ min, max, tolerance }).flatMap(([key, value]) =>
      isGiven(value) ? [key] : [],
    );
    const read = given.join(' and ') || 'none of them';
    return [{ path, code: 'one-range', message: `read ${read}; accepted: min and max, or tolerance` }];
  }
  if (!isWhole) return [];
  const { min: least, max: most, unit } = dimension;
  const accepted = `accepted: ${figure(least)} to ${figure(most)} ${unit}`;
  const outside = Object.entries({ min, max }).flatMap(([key, value]): ProblemField[] =>
    value < least - SAME || value > most + SAME
      ? [{ path: `${path}.${key}`, code: 'out-of-range', message: `read ${value}; ${accepted}` }]
      : [],
  );
  if (outside.length > 0 || min <= max) return outside;
  const message = `read ${max}, which is less than min; ${accepted}`;
  return [{ path: `${path}.max`, code: 'less-than-min', message }];
}

function rangeOf(
  { value, min: least, max: most }: Dimension,
  { min, max, tolerance }: StartFreeDto,
): { min: number; max: number } {
  if (!isGiven(tolerance)) return { min: min ?? least, max: max ?? most };
  return { min: Math.max(least, value - tolerance), max: Math.min(most, value + tolerance) };
}

const isGiven = (value: number | null | undefined): value is number => value !== undefined && value !== null;

const figure = (value: number): string => String(Math.round(value * 100) / 100);
