import { outlineBox, outlineExtent, type OutlineCorner } from '../../outlines/outline.ts';
import type { CushionTufting } from '../cushion-spec.ts';
import { tuftedCloth } from '../tufting.ts';
import { CONSTRUCTION_WORDS, type CushionMake } from './cushion-make.ts';
import { rectangleOutline, type CushionPanels, type CutPanel } from './cut-panels.ts';
import type { MadeCushion } from './make-cushion.ts';

/** Name of the face that has fullness for its tufts. */
export const TUFTED_FACE = 'tufted face';

/**
 * The panels of a cushion whose face is tufted with fullness: one face of its own, cut square and larger.
 *
 * @param made - as without tufts
 * @param tufting - biscuits or diamonds; anything else changes nothing
 * @param make - its make
 * @param seamMm - seam allowance
 * @returns the panels, or in words why the make is not tufted
 */
export function withTuftedFace(
  made: CushionPanels,
  tufting: CushionTufting,
  make: CushionMake,
  seamMm: number,
): MadeCushion {
  const { field, fullness, pullMm } = tufting;
  if (!field || !fullness) return { ok: true, made };
  if (field.across === 0 || field.high === 0) {
    const fault = 'the border leaves no room for tufts';
    return { ok: false, fault: field.columnsOn ? `${fault} on board lines` : fault };
  }
  const face = made.panels.find(({ name }) => name === 'plate' || name === 'cover');
  if (!face)
    return { ok: false, fault: `a ${CONSTRUCTION_WORDS[make.construction]} is not tufted with fullness` };
  const { widthMm, depthMm } = outlineExtent(face.finished);
  const cloth = tuftedCloth({ widthMm, heightMm: depthMm }, fullness, { ...field, foamMm: pullMm });
  const seams = fullness === 'half-again' ? 2 * seamMm : 0;
  const cut = outlineExtent(face.cut);
  const size = {
    widthMm: cut.widthMm + cloth.widthMm - widthMm - seams,
    heightMm: cut.depthMm + cloth.heightMm - depthMm - seams,
  };
  const tufted: CutPanel = {
    name: TUFTED_FACE,
    count: 1,
    finished: face.finished,
    cut: roundTheMiddle(size, face.finished),
    marksMm: [],
  };
  const panels = made.panels.flatMap((panel) =>
    panel !== face ? [panel] : panel.count > 1 ? [tufted, { ...panel, count: panel.count - 1 }] : [tufted],
  );
  return { ok: true, made: { ...made, panels } };
}

/** A rectangle about the middle of an outline. */
function roundTheMiddle(
  size: { widthMm: number; heightMm: number },
  outline: readonly OutlineCorner[],
): OutlineCorner[] {
  const { x0, x1, y0, y1 } = outlineBox(outline);
  const [dx, dy] = [(x0 + x1 - size.widthMm) / 2, (y0 + y1 - size.heightMm) / 2];
  return rectangleOutline(size.widthMm, size.heightMm).map((corner) => ({
    ...corner,
    at: [corner.at[0] + dx, corner.at[1] + dy],
  }));
}
