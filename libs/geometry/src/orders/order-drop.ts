import { cushionDrop, dropSourceWords, type CushionDrop } from '@settlewright/anthropometry';
import type { CushionSpec } from '../cushions/cushion-spec.ts';
import { foamSituation } from '../pieces/foam-situation.ts';
import { formatLength } from '../units/format-length.ts';
import type { LengthStyle } from '../units/length-style.ts';

/** Sitters that an order speaks of, 110 and 220 lb. They are nobody of the cast: an upholsterer learns no weights. */
export const ORDER_SITTERS = {
  light: { weightKg: 49.9, pounds: '110\u00a0lb', kilograms: '50\u00a0kg' },
  heavy: { weightKg: 99.8, pounds: '220\u00a0lb', kilograms: '100\u00a0kg' },
} as const;

export type OrderSitter = keyof typeof ORDER_SITTERS;

/**
 * How far a seat cushion goes down under the light and the heavy sitter of an order: the same number as in the room,
 * with its layers, its wrap and what test sits say of it.
 *
 * @param spec - a cushion of an order
 * @returns millimetres with their 90 % range; `undefined` for a back cushion
 * @source `cushionDrop`
 */
export function orderDrop({
  kind,
  finishedMm: { thicknessMm },
  foam,
}: Pick<CushionSpec, 'kind' | 'finishedMm' | 'foam'>): Record<OrderSitter, CushionDrop> | undefined {
  const situation = kind === 'seat' ? foamSituation({ thicknessMm, foam }) : undefined;
  if (!situation) return undefined;
  const under = (sitter: OrderSitter) => cushionDrop(situation, ORDER_SITTERS[sitter].weightKg);
  return { light: under('light'), heavy: under('heavy') };
}

const isMetric = ({ system }: LengthStyle): boolean => system === 'millimetres';

/**
 * A drop no finer than it is known: to a quarter of an inch or five millimetres, and never as nothing.
 *
 * @param mm - of the drop
 * @param style - units in which it will be shown
 * @returns millimetres
 * @source grades of foam differ by 10 % from piece to piece, Joint Industry Foam Standards, 1994
 */
export function shownDropMm(mm: number, style: LengthStyle): number {
  const step = isMetric(style) ? 5 : 6.35;
  return Math.max(step, Math.round(mm / step) * step);
}

/**
 * What an order says of how far a seat cushion goes down.
 *
 * @param drop - of `orderDrop`
 * @param style - units in which lengths and weights are shown
 * @returns sentences, with the range, what it rests on, and whether the foam bottoms out
 */
export function orderDropWords(drop: Record<OrderSitter, CushionDrop>, style: LengthStyle): string {
  const show = (mm: number) => formatLength(shownDropMm(mm, style), { ...style, feet: false });
  const under = (sitter: OrderSitter) => {
    const { lowMm, bestMm, highMm } = drop[sitter];
    const { pounds, kilograms } = ORDER_SITTERS[sitter];
    return `${show(bestMm)} (${show(lowMm)} to ${show(highMm)}) under ${isMetric(style) ? kilograms : pounds}`;
  };
  const { bottomsOut } = drop.heavy;
  const bottom =
    bottomsOut === 'no' ? '' : ` The heavier ${bottomsOut === 'yes' ? 'would' : 'may'} bottom out.`;
  return `Sinks ${under('light')}, ${under('heavy')}, in 90 of 100 cases (${dropSourceWords(drop.heavy)}).${bottom}`;
}
