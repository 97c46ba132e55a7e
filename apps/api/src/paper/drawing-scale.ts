import type { LengthStyle } from '@settlewright/geometry';

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

/** The largest scale of a shop's ruler at which the thing fits the space. */
export function scaleFor(
  system: LengthStyle['system'],
  real: { widthMm: number; heightMm: number },
  space: { widthMm: number; heightMm: number },
): DrawingScale {
  const most = Math.max(real.widthMm / space.widthMm, real.heightMm / space.heightMm);
  if (system === 'millimetres') {
    const ratio = METRIC_SCALES.find((one) => one >= most) ?? Math.ceil(most);
    return { factor: 1 / ratio, words: `1 : ${ratio}` };
  }
  const named = INCH_SCALES.find(([ratio]) => ratio >= most);
  if (!named) return { factor: 1 / Math.ceil(most), words: `1 : ${Math.ceil(most)}` };
  return { factor: 1 / named[0], words: `${named[1]}, 1 : ${named[0]}` };
}
