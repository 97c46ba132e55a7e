import { CUSHION_SETTINGS, type CushionSettings } from './cushion-settings.ts';

/** Width along the seat, depth from back to front (height of a back cushion), thickness. */
export interface CushionSize {
  widthMm: number;
  depthMm: number;
  thicknessMm: number;
}

/** Where a cushion lies. */
export interface CushionPlace {
  /** Wood to wood. */
  placeMm: CushionSize;
  /** Taken off the place at each edge. */
  gapsMm: { back: number; front: number; left: number; right: number };
}

/**
 * The size that fits a place, seam to seam: never below a millimetre.
 *
 * @param place - wood to wood, and what each edge takes off it
 */
export function fittingSize({ placeMm, gapsMm }: CushionPlace): CushionSize {
  return {
    widthMm: Math.max(1, placeMm.widthMm - gapsMm.left - gapsMm.right),
    depthMm: Math.max(1, placeMm.depthMm - gapsMm.back - gapsMm.front),
    thicknessMm: placeMm.thicknessMm,
  };
}

/**
 * The two halves of a zip panel.
 *
 * @param finishedLengthMm - zip with what goes round the corners
 * @param boxingCutHeightMm - height the boxing is cut
 * @param settings - seam and zip allowance
 * @returns half the boxing height and zip allowance wide, a seam longer at both ends
 * @source upholstery trade page: boxing 4 1/4 in gives halves of 2 7/8 in
 */
export function zipPanel(
  finishedLengthMm: number,
  boxingCutHeightMm: number,
  settings: CushionSettings = CUSHION_SETTINGS,
): { count: 2; halfWidthMm: number; lengthMm: number } {
  return {
    count: 2,
    halfWidthMm: (boxingCutHeightMm + settings.zipAllowance.valueMm) / 2,
    lengthMm: finishedLengthMm + 2 * settings.seam.valueMm,
  };
}

/**
 * Straight welt strips out of a width of cloth.
 *
 * @param lengthMm - welt wanted, joins of the seams included
 * @param strip - width of cloth and of a strip, and what a diagonal join eats
 * @returns number of strips and the length of cloth they take
 * @source trade forum sum without join loss; the loss of one strip width a join is geometry
 */
export function weltStrips(
  lengthMm: number,
  strip: { clothWidthMm: number; stripWidthMm: number; joinLoss: 'none' | 'strip-width' },
): { strips: number; clothMm: number } {
  const usable = strip.clothWidthMm - (strip.joinLoss === 'strip-width' ? strip.stripWidthMm : 0);
  const strips = Math.ceil(lengthMm / usable - 1e-9);
  return { strips, clothMm: strips * strip.stripWidthMm };
}

/**
 * Continuous bias strip from a square of cloth.
 *
 * @param sideMm - side of the square
 * @param stripWidthMm - width of the strip
 * @returns its length: area over width
 */
export function biasStripLength(sideMm: number, stripWidthMm: number): number {
  return (sideMm * sideMm) / stripWidthMm;
}
