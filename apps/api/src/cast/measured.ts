import { contradictions, TAPE_MEASURE_KEYS } from '@settlewright/anthropometry';
import type { ProblemField } from '../common/problem';
import { isStorableText } from '../common/text-field';
import { DAY_WORDS, isPastDay } from './day';
import type { TapeMeasure, TapeMeasures } from './entities/cast-member.entity';
import { acceptedWords, isTapeMeasureKey, TAKEN_BY_MAX, TAPE_LIMITS, within } from './limits';

type Read = { ok: true; value: TapeMeasures } | { ok: false; fields: ProblemField[] };

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const said = (value: unknown) => (JSON.stringify(value) ?? 'nothing').slice(0, 80);

/** Reads the map of tape measures as it was sent; a key with `null` counts as not taken. */
export function readMeasured(sent: Record<string, unknown>): Read {
  const fields: ProblemField[] = [];
  const value: TapeMeasures = {};
  for (const [key, entry] of Object.entries(sent)) {
    if (entry === null) continue;
    const path = `measured.${key}`;
    if (!isTapeMeasureKey(key)) {
      fields.push({
        path,
        code: 'unknown-measure',
        message: `${key} is not a measure that is taken with a tape; accepted are ${TAPE_MEASURE_KEYS.join(', ')}`,
      });
      continue;
    }
    if (!isObject(entry)) {
      fields.push({
        path,
        code: 'is-object',
        message: `${path} accepts {mm, takenBy?, takenOn?}; read ${said(entry)}`,
      });
      continue;
    }
    const faults = faultsOf(path, key, entry);
    if (faults.length > 0) fields.push(...faults);
    else value[key] = tapeMeasure(entry);
  }
  fields.push(...contradictionsIn(value));
  return fields.length > 0 ? { ok: false, fields } : { ok: true, value };
}

function contradictionsIn(value: TapeMeasures): ProblemField[] {
  const taken = Object.fromEntries(Object.entries(value).map(([key, { mm }]) => [key, mm]));
  return contradictions(taken).map(({ shorter, longer }) => ({
    path: `measured.${shorter}.mm`,
    code: 'contradicts',
    message:
      `${TAPE_LIMITS[shorter].label} is less than ${TAPE_LIMITS[longer].label.toLowerCase()} in every body; ` +
      `read ${taken[shorter]} and ${taken[longer]} mm`,
  }));
}

function faultsOf(
  path: string,
  key: keyof typeof TAPE_LIMITS,
  entry: Record<string, unknown>,
): ProblemField[] {
  const { mm, takenBy, takenOn, ...others } = entry;
  const limit = TAPE_LIMITS[key];
  const faults: ProblemField[] = Object.keys(others).map((other) => ({
    path: `${path}.${other}`,
    code: 'unknown-key',
    message: `${other} is not part of a measure; accepted are mm, takenBy, takenOn`,
  }));
  if (typeof mm !== 'number' || !within(limit, mm)) {
    const message = `${limit.label} accepts ${acceptedWords(limit)}; read ${said(mm)}`;
    faults.push({ path: `${path}.mm`, code: 'within-limit', message });
  }
  if (!isAbsent(takenBy) && !isName(takenBy)) {
    const message = `takenBy accepts a name of up to ${TAKEN_BY_MAX} characters; read ${said(takenBy)}`;
    faults.push({ path: `${path}.takenBy`, code: 'is-name', message });
  }
  if (!isAbsent(takenOn) && !(typeof takenOn === 'string' && isPastDay(takenOn))) {
    const message = `takenOn accepts ${DAY_WORDS}; read ${said(takenOn)}`;
    faults.push({ path: `${path}.takenOn`, code: 'is-day', message });
  }
  return faults;
}

const isAbsent = (value: unknown) => value === undefined || value === null || value === '';

const isName = (value: unknown): value is string =>
  typeof value === 'string' && value.trim().length <= TAKEN_BY_MAX && isStorableText(value);

function tapeMeasure({ mm, takenBy, takenOn }: Record<string, unknown>): TapeMeasure {
  const by = typeof takenBy === 'string' ? takenBy.trim() : '';
  return {
    mm: mm as number,
    ...(by ? { takenBy: by } : {}),
    ...(typeof takenOn === 'string' && takenOn ? { takenOn } : {}),
  };
}
