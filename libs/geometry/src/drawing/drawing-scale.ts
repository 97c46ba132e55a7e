import type { LengthStyle } from '../units/length-style.ts';

/** How small a drawing is on paper. */
export interface DrawingScale {
  /** Paper millimetres for one real one. */
  factor: number;
  /** "1½″ = 1′ 0″, 1 : 8" */
  words: string;
}

const INCH_SCALES: readonly [number, string][] = [
  [4, '3″ = 1′\u00a00″'],
  [6, '2″ = 1′\u00a00″'],
  [8, '1½″ = 1′\u00a00″'],
  [12, '1″ = 1′\u00a00″'],
  [16, '¾″ = 1′\u00a00″'],
  [24, '½″ = 1′\u00a00″'],
  [32, '⅜″ = 1′\u00a00″'],
  [48, '¼″ = 1′\u00a00″'],
  [64, '³⁄₁₆″ = 1′\u00a00″'],
  [96, '⅛″ = 1′\u00a00″'],
  [192, '¹⁄₁₆″ = 1′\u00a00″'],
  [384, '¹⁄₃₂″ = 1′\u00a00″'],
  [768, '¹⁄₆₄″ = 1′\u00a00″'],
];
const METRIC_SCALES = [4, 5, 10, 15, 20, 25, 30, 40, 50, 75, 100, 200, 250, 500, 1000];

/**
 * The scales of a shop's ruler, largest drawing first.
 *
 * @param system - feet and inches have scales of their own
 * @returns real millimetres for one of the paper: 24 is ½″ = 1′ 0″, 20 is 1 : 20
 */
export function shopScales(system: LengthStyle['system']): readonly number[] {
  return system === 'millimetres' ? METRIC_SCALES : INCH_SCALES.map(([ratio]) => ratio);
}

/**
 * A scale in words.
 *
 * @param system - of the lengths beside it
 * @param ratio - real millimetres for one of the paper
 * @returns "½″ = 1′ 0″, 1 : 24", or the ratio alone when the ruler has no such scale
 */
export function scaleWords(system: LengthStyle['system'], ratio: number): string {
  const named = system === 'millimetres' ? undefined : INCH_SCALES.find(([one]) => one === ratio);
  return named ? `${named[1]}, 1 : ${ratio}` : `1 : ${ratio}`;
}

/**
 * The largest scale of a shop's ruler at which a thing fits a space.
 *
 * @param system - of the lengths on the drawing
 * @param real - size of the thing, millimetres
 * @param space - on paper, millimetres
 * @returns a whole ratio where the ruler ends
 */
export function scaleFor(
  system: LengthStyle['system'],
  real: { widthMm: number; heightMm: number },
  space: { widthMm: number; heightMm: number },
): DrawingScale {
  const most = Math.max(real.widthMm / space.widthMm, real.heightMm / space.heightMm);
  const ratio = shopScales(system).find((one) => one >= most) ?? Math.ceil(most);
  return { factor: 1 / ratio, words: scaleWords(system, ratio) };
}
