import { foamText } from './foam-units.ts';
import { formatLength } from './format-length.ts';
import type { LengthStyle } from './length-style.ts';

/** A stretch of a phrase: words, or one quantity that its reader sees in the units of the page. */
export interface PhrasePart {
  text?: string;
  /** A length. */
  mm?: number;
  densityKgM3?: number;
  firmnessN?: number;
}

/** What is said of something, with its quantities still to be shown; empty where nothing is said. */
export type Phrase = PhrasePart[];

type Said = string | PhrasePart | Phrase;

/**
 * Puts a phrase together.
 *
 * @param texts - the words between
 * @param said - quantities, words and other phrases
 */
export function phrase(texts: TemplateStringsArray, ...said: Said[]): Phrase {
  const parts = texts.flatMap((text, i): Phrase => [{ text }, ...partsOf(said[i] ?? [])]);
  return parts.filter(({ text }) => text !== '');
}

/**
 * Puts phrases in a row.
 *
 * @param all - those that say nothing are passed over
 * @param between - what stands between two
 */
export function joined(all: readonly Said[], between: string): Phrase {
  return all
    .map((one) => partsOf(one).filter(({ text }) => text !== ''))
    .filter((parts) => parts.length > 0)
    .flatMap((parts, i) => (i === 0 ? parts : [{ text: between }, ...parts]));
}

const partsOf = (said: Said): Phrase =>
  typeof said === 'string' ? [{ text: said }] : Array.isArray(said) ? said : [said];

/**
 * One stretch of a phrase as it is read.
 *
 * @param part - of a phrase
 * @param style - units in which quantities are shown
 */
export function partText({ text = '', mm, densityKgM3, firmnessN }: PhrasePart, style: LengthStyle): string {
  if (mm !== undefined) return formatLength(mm, { ...style, feet: false });
  if (densityKgM3 !== undefined) return foamText('density', densityKgM3, style);
  if (firmnessN !== undefined) return foamText('firmness', firmnessN, style);
  return text;
}

/**
 * A phrase as it is read.
 *
 * @param parts - of the phrase
 * @param style - units in which quantities are shown
 */
export const phraseText = (parts: readonly PhrasePart[], style: LengthStyle): string =>
  parts.map((part) => partText(part, style)).join('');

/** Lengths nearer than this are the same on any paper, millimetres. */
const SEEN_MM = 0.1;

/**
 * Whether two phrases read alike.
 *
 * @param a - one
 * @param b - the other
 * @returns false also where the same words hold a length that differs by a tenth of a millimetre or more
 */
export function samePhrase(a: readonly PhrasePart[], b: readonly PhrasePart[]): boolean {
  return (
    a.length === b.length &&
    a.every((part, i) => {
      const other = b[i]!;
      return (
        part.text === other.text &&
        near(part.mm, other.mm, SEEN_MM) &&
        near(part.densityKgM3, other.densityKgM3, 0.05) &&
        near(part.firmnessN, other.firmnessN, 0.5)
      );
    })
  );
}

const near = (a: number | undefined, b: number | undefined, by: number): boolean =>
  a === undefined || b === undefined ? a === b : Math.abs(a - b) < by;
