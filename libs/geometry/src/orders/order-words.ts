import { CHART_DIFFERS } from '../cloth/cloth-to-buy.ts';
import type { FullnessRule } from '../cushions/tufting.ts';
import { formatLength } from '../units/format-length.ts';
import type { LengthStyle } from '../units/length-style.ts';
import type { ClothOfOrder, LaidCloth } from './order-cloth.ts';
import { marksWords } from './marks-words.ts';
import type { OrderCover } from './order-cover.ts';
import type { ButtonSheet, OrderModel } from './order-model.ts';

/** How a cloth lies, in the words of the sheet. */
export const DIRECTION_WORDS: Record<OrderCover['direction'], string> = {
  'up-roll': 'up the roll',
  railroad: 'railroaded',
  either: 'either way',
};

/** Where the pile runs, in the words of the sheet. */
export const NAP_WORDS: Record<OrderCover['nap'], string> = {
  none: 'no nap',
  'to-the-front': 'nap runs to the front edge',
  'to-the-back': 'nap runs to the back edge',
  'to-the-left': 'nap runs to the sitter’s left',
  'to-the-right': 'nap runs to the sitter’s right',
};

/**
 * Where the pile runs on a cushion; a back has a top and a bottom edge.
 *
 * @param nap - of its cloth
 * @param kind - of the cushion
 */
export const napWords = (nap: OrderCover['nap'], kind: 'seat' | 'back'): string =>
  kind === 'seat' ? NAP_WORDS[nap] : NAP_WORDS[nap].replace('front', 'bottom').replace('back', 'top');

/**
 * What an order takes as given.
 *
 * @param model - of the order
 * @param style - units in which lengths are shown
 * @returns sentences
 */
export function orderAssumptions({ schedule, cloths, buttons }: OrderModel, style: LengthStyle): string[] {
  const show = (mm: number) => formatLength(mm, { ...style, feet: false });
  const tufted = (rule: FullnessRule) => {
    const marks = schedule.flatMap(({ spec, marks }) => (spec.tufting.fullness === rule ? marks : []));
    return marksWords(marks);
  };
  const [halfAgain, foamThick] = [tufted('half-again'), tufted('foam-thickness')];
  return [
    'Sizes are finished, seam to seam, flat, before the foam swells them. Foam and cover sizes follow from them.',
    'New foam on a flat, rigid deck, at room temperature.',
    ...(halfAgain ? [`Tufted faces of ${halfAgain} have 1½ of cloth for every 1 of panel.`] : []),
    ...(foamThick
      ? [`Tufted faces of ${foamThick} have as much more cloth, at each end of a tuft, as its buttons go in.`]
      : []),
    ...(buttons.some(({ seat }) => seat)
      ? ['Rows over the seat are over the seat as a sitter of 77 kg (170 lb) presses it.']
      : []),
    ...cloths.map(({ cover, cloth }) => {
      const { acrossMm, alongMm } = cover.repeatMm;
      const repeat =
        acrossMm > 0 || alongMm > 0
          ? `repeat ${show(acrossMm)} across and ${show(alongMm)} along, centered on each ${cover.controlLine}`
          : 'no repeat';
      const width = cover.com?.measuredWidthMm === undefined ? 'wide as said' : 'wide as measured';
      return `${cover.name}: ${show(cloth.widthMm)} ${width}, ${DIRECTION_WORDS[cover.direction]}, ${NAP_WORDS[cover.nap]}, ${repeat}.`;
    }),
  ];
}

/**
 * What a layout says of the length to buy: a part of the panels tells the least only.
 *
 * @param one - the cloth
 * @returns the words before the length, and what is not in it
 */
export function buyWords({ faults }: ClothOfOrder): { buy: string; missing?: string } {
  return faults.length === 0 ? { buy: 'buy' } : { buy: 'buy at least', missing: faults.join('; ') };
}

/**
 * What a sheet says of the chart beside a layout.
 *
 * @param one - the cloth
 * @param laid - its layout
 * @param style - units in which lengths are shown
 * @returns a sentence, or nothing where both agree within 15 in 100
 */
export function chartNote(one: ClothOfOrder, laid: LaidCloth, style: LengthStyle): string | undefined {
  const show = (mm: number) => formatLength(mm, style);
  if (laid.chartMm === undefined) {
    if (one.faults.length > 0) return undefined;
    const { acrossMm, alongMm } = one.cover.repeatMm;
    return acrossMm + alongMm > 0 && !one.cover.parts
      ? 'The repeat is beyond the chart of the trade.'
      : undefined;
  }
  if (!laid.differs) return undefined;
  const percent = Math.round((100 * Math.abs(laid.chartMm - laid.layout.lengthMm)) / laid.layout.lengthMm);
  const which = laid.chartMm > laid.layout.lengthMm ? 'more' : 'less';
  return (
    `The chart of the trade asks for ${show(laid.chartMm)}, ${percent} % ${which} than the layout of ` +
    `${show(laid.layout.lengthMm)}; they should be within ${100 * CHART_DIFFERS} %.`
  );
}

/**
 * From which seat the rows of a back are measured.
 *
 * @param sheet - of its buttons
 * @param style - units in which lengths are shown
 * @returns a sentence, or nothing where there is no seat below
 */
export function rowsWords({ seat }: ButtonSheet, style: LengthStyle): string | undefined {
  if (!seat) return undefined;
  const sink = formatLength(seat.sinkMm, { ...style, feet: false });
  return seat.goesDown
    ? `Over the pressed seat: the back stands on the seat and goes down with it by ${sink}.`
    : `Over the pressed seat, which goes down ${sink} from the back; the back is held where it is.`;
}
