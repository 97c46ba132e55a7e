import { CUSHION_SETTINGS, type CushionSettings } from './cushion-settings.ts';

/** Width along the seat, depth from back to front (height of a back cushion), thickness. */
export interface CushionSize {
  widthMm: number;
  depthMm: number;
  thicknessMm: number;
}

/** Everything that follows from the finished size of a boxed cushion with a zip in one long edge. */
export interface CushionCut {
  foamMm: CushionSize;
  foamVolumeM3: number;
  foamMassKg: number;
  boardMm: { widthMm: number; depthMm: number };
  plates: { count: 2; widthMm: number; depthMm: number };
  perimeterMm: number;
  /** Closed edge plus what goes round both corners; with the boxing it makes up the perimeter. */
  zip: { edgeMm: number; wrapMm: number; lengthMm: number };
  zipPanel: { count: 2; halfWidthMm: number; lengthMm: number };
  boxing: { finishedLengthMm: number; cutLengthMm: number; cutHeightMm: number };
  welt: { seams: 2; alongSeamsMm: number; joinsMm: number; lengthMm: number };
}

/**
 * Foam, cloth, zip and welt of a boxed cushion.
 *
 * @param finished - seam to seam, millimetres, each > 0
 * @param foamDensityKgM3 - of the foam
 * @param settings - allowances
 * @returns sizes to cut; lengths millimetres
 * @source foam finished + 1/2 in, plates finished + 2 seams, zip 3 in round each back corner: upholstery
 * trade pages; both welt seams are twice the perimeter and a join each
 */
export function cutCushion(
  finished: CushionSize,
  foamDensityKgM3: number,
  settings: CushionSettings = CUSHION_SETTINGS,
): CushionCut {
  const { widthMm, depthMm, thicknessMm } = finished;
  const seam = settings.seam.valueMm;
  const over = settings.foamOversize.valueMm;
  const under = settings.boardSmaller.valueMm;
  const foamMm = { widthMm: widthMm + over, depthMm: depthMm + over, thicknessMm };
  const foamVolumeM3 = (foamMm.widthMm * foamMm.depthMm * foamMm.thicknessMm) / 1e9;
  const perimeterMm = 2 * (widthMm + depthMm);
  const wrapMm = Math.min(settings.zipWrap.valueMm, depthMm);
  const zipLength = widthMm + 2 * wrapMm;
  const boxingLength = perimeterMm - zipLength;
  const cutHeightMm = thicknessMm + 2 * seam;
  const joinsMm = 2 * settings.weltJoin.valueMm;
  return {
    foamMm,
    foamVolumeM3,
    foamMassKg: foamVolumeM3 * foamDensityKgM3,
    boardMm: { widthMm: Math.max(0, widthMm - under), depthMm: Math.max(0, depthMm - under) },
    plates: { count: 2, widthMm: widthMm + 2 * seam, depthMm: depthMm + 2 * seam },
    perimeterMm,
    zip: { edgeMm: widthMm, wrapMm, lengthMm: zipLength },
    zipPanel: zipPanel(zipLength, cutHeightMm, settings),
    boxing: { finishedLengthMm: boxingLength, cutLengthMm: boxingLength + 2 * seam, cutHeightMm },
    welt: { seams: 2, alongSeamsMm: 2 * perimeterMm, joinsMm, lengthMm: 2 * perimeterMm + joinsMm },
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
): CushionCut['zipPanel'] {
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
