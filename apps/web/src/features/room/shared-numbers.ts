import { parametersOf, setParameter, type Piece, type SetDocument } from '@settlewright/geometry';
import { numbersOf } from './components/piece-numbers.ts';
import type { NumberParameter } from './numbers.ts';

/** A number that several pieces have. */
export interface SharedNumber {
  /** With the value of the first piece, and the limits within which all of them can take it. */
  parameter: NumberParameter;
  group: 'main' | 'more';
  /** Smallest and largest value; both the same where all agree. */
  values: { least: number; most: number };
}

/** The numbers that all of some pieces of one kind have, in the order of the first one's form. */
export function sharedNumbers(pieces: readonly Piece[]): SharedNumber[] {
  const [first, ...others] = pieces;
  if (first === undefined) return [];
  const theirs = others.map(numbersOf);
  return parametersOf(first).flatMap((parameter): SharedNumber[] => {
    if (typeof parameter.value !== 'number' || parameter.key.startsWith('at.')) return [];
    const like = theirs.flatMap((numbers) => numbers.get(parameter.key) ?? []);
    if (like.length < theirs.length) return [];
    const values = [parameter.value, ...like.map(({ value }) => value)];
    return [
      {
        parameter: {
          ...parameter,
          value: parameter.value,
          min: Math.max(parameter.min, ...like.map(({ min }) => min)),
          max: Math.min(parameter.max, ...like.map(({ max }) => max)),
        },
        group: parameter.group,
        values: { least: Math.min(...values), most: Math.max(...values) },
      },
    ];
  });
}

/** Sets one number of several pieces; the reason when one of them cannot take it. */
export function setShared(
  document: SetDocument,
  pieces: readonly Piece[],
  key: string,
  value: number,
): { document: SetDocument } | { refusal: string } {
  let next = document;
  for (const { id } of pieces) {
    const changed = setParameter(next, id, key, value);
    if (!changed.ok) return { refusal: changed.error.message };
    next = changed.value;
  }
  return { document: next };
}
