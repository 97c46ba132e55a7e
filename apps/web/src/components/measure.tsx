import type { ReactNode } from 'react';

const VULGAR: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};
const SUPERSCRIPT = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const SUBSCRIPT = '₀₁₂₃₄₅₆₇₈₉';

const plainDigits = (text: string, digits: string) =>
  [...text].map((character) => String(digits.indexOf(character))).join('');

const FRACTION = /([½¼¾⅛⅜⅝⅞])|([⁰¹²³⁴-⁹]+)[⁄/]([₀-₉]+)/g;

interface Piece {
  text: string;
  fraction: boolean;
}

/** Splits a written length into plain text and fractions such as "7/8". */
export function splitFractions(text: string): Piece[] {
  const pieces: Piece[] = [];
  let from = 0;
  for (const found of text.matchAll(FRACTION)) {
    if (found.index > from) pieces.push({ text: text.slice(from, found.index), fraction: false });
    const [all, glyph, over, under] = found;
    const fraction =
      glyph === undefined
        ? `${plainDigits(over ?? '', SUPERSCRIPT)}/${plainDigits(under ?? '', SUBSCRIPT)}`
        : (VULGAR[glyph] ?? glyph);
    pieces.push({ text: fraction, fraction: true });
    from = found.index + all.length;
  }
  if (from < text.length) pieces.push({ text: text.slice(from), fraction: false });
  return pieces;
}

/** The same length as somebody would type it, with plain spaces: 17 1/2″. */
export function typedForm(text: string): string {
  return splitFractions(text)
    .map((piece, index, all) => {
      if (!piece.fraction) return piece.text;
      return /\d$/.test(all[index - 1]?.text ?? '') ? ` ${piece.text}` : piece.text;
    })
    .join('')
    .replace(/[\u00a0\u202f]/g, ' ');
}

interface MeasureProps {
  /** A length as `formatLength` writes it. */
  text: string;
  /** In words, for a screen reader; the text itself where none is given. */
  spoken?: string;
}

/** A length with real diagonal fractions, never parted from its unit. */
export function Measure({ text, spoken }: MeasureProps): ReactNode {
  const pieces = splitFractions(text);
  if (spoken === undefined && !pieces.some((piece) => piece.fraction)) {
    return <span className="whitespace-nowrap">{text}</span>;
  }
  return (
    <span className="whitespace-nowrap">
      <span aria-hidden="true">
        {pieces.map((piece, index) =>
          piece.fraction ? (
            <span key={index} className="frac">
              {piece.text}
            </span>
          ) : (
            piece.text
          ),
        )}
      </span>
      <span className="sr-only">{spoken ?? text}</span>
    </span>
  );
}
