import {
  offsetFault,
  offsetOutline,
  outlineExtent,
  outlinePerimeter,
  type OutlineCorner,
} from '../../outlines/outline.ts';
import { MM_PER_INCH } from '../../units/length-style.ts';
import { CUSHION_SETTINGS, type CushionSettings } from '../cushion-settings.ts';
import { shapedOutline, type CushionShape } from '../cushion-shape.ts';
import { zipPanel, type CushionSize } from '../cushion-sizes.ts';
import { CONSTRUCTION_WORDS, type CushionMake } from './cushion-make.ts';
import { rectangleOutline, rectanglePanel, type CushionPanels, type CutPanel } from './cut-panels.ts';
import { edgeStrip } from './edge-strip.ts';
import { wrappedFront } from './wrapped-front.ts';

/** A cushion to be cut, or why it cannot be. */
export type MadeCushion = { ok: true; made: CushionPanels } | { ok: false; fault: string };

interface Asked {
  finishedMm: CushionSize;
  shape?: CushionShape;
  make: CushionMake;
}

/**
 * Panels, foam, board, closure and welt of a cushion.
 *
 * @param asked - finished size seam to seam, plan and make
 * @param settings - allowances of the workshop
 * @returns what is cut, or in words why the make does not go with the plan
 * @source upholstery trade pages; each allowance says its own source
 */
export function makeCushion(asked: Asked, settings: CushionSettings = CUSHION_SETTINGS): MadeCushion {
  const { finishedMm, shape, make } = asked;
  const plan = shapedOutline(finishedMm, shape);
  if (!plan.ok) return plan;
  const { construction } = make;
  if (construction === 'waterfall' || construction === 'bullnose') {
    if (
      plan.corners.length !== 4 ||
      shape?.frontInMm ||
      shape?.drawn ||
      plan.corners.some((c) => c.radiusMm > 0)
    ) {
      return { ok: false, fault: `a ${CONSTRUCTION_WORDS[construction]} wraps a plain rectangle only` };
    }
    if (make.closureEdge !== 'back') {
      return { ok: false, fault: `a ${CONSTRUCTION_WORDS[construction]} closes at the back edge` };
    }
  }
  const made = panelsOf(plan.corners, finishedMm, make, settings);
  const fault = made.panels
    .map(({ name, finished, cut }) => [name, offsetFault(finished, cut)])
    .find(([, wrong]) => wrong);
  return fault ? { ok: false, fault: `${fault[0]}: ${fault[1]}` } : { ok: true, made };
}

function panelsOf(
  plan: OutlineCorner[],
  { widthMm, depthMm, thicknessMm }: CushionSize,
  make: CushionMake,
  settings: CushionSettings,
): CushionPanels {
  const seam = settings.seam.valueMm;
  const perimeterMm = outlinePerimeter(plan);
  const foamOver = settings.foamOversize.valueMm / 2;
  const foam = { outline: offsetOutline(plan, foamOver), thicknessMm };
  const strip = edgeStrip(plan, make.closureEdge, settings.zipWrap.valueMm);
  const closed = { ...strip.closure };
  const plates = (extra: number, count = 2, name = 'plate'): CutPanel => ({
    name,
    count,
    finished: plan,
    cut: offsetOutline(plan, seam + extra),
    marksMm: [],
  });
  const base = { foam, perimeterMm, closure: closed, crownMm: settings.crown.valueMm };
  switch (make.construction) {
    case 'boxed':
    case 'tight-boxed': {
      const cutHeightMm =
        make.construction === 'boxed' ? thicknessMm + 2 * seam : thicknessMm + settings.tightBoxing.valueMm;
      const heightMm = Math.max(0, cutHeightMm - 2 * seam);
      return {
        ...base,
        edgeHeightMm: heightMm,
        panels: [
          plates(0),
          rectanglePanel('boxing', { widthMm: strip.boxingMm, heightMm }, seam, 1, strip.marksMm),
          ...closurePanels(closed.lengthMm, heightMm, make, settings),
        ],
        welt: weltOf(2, perimeterMm, make, settings),
      };
    }
    case 'knife-edge': {
      const crown = (thicknessMm * settings.knifeCrown.valueMm) / MM_PER_INCH;
      return {
        ...base,
        edgeHeightMm: 0,
        closure: { ...closed, wrapMm: 0, lengthMm: closed.edgeMm },
        panels: [plates(crown)],
        welt: weltOf(1, perimeterMm, make, settings),
      };
    }
    case 'plywood-backed': {
      const board = offsetOutline(plan, -settings.boardSmaller.valueMm / 2);
      const over = offsetOutline(board, settings.boardFoamOver.valueMm);
      const { widthMm: overWide, depthMm: overDeep } = outlineExtent(over);
      // A pulled cover is cut square; it is relieved at notches and corners when it is stapled.
      const cover = rectanglePanel(
        'cover',
        { widthMm: overWide, heightMm: overDeep },
        thicknessMm + settings.pull.valueMm,
      );
      return {
        ...base,
        foam: { outline: over, thicknessMm },
        board: { outline: board, thicknessMm: settings.boardThickness.valueMm },
        edgeHeightMm: thicknessMm,
        closure: { edgeMm: 0, wrapMm: 0, lengthMm: 0 },
        panels: [cover],
        welt: weltOf(0, perimeterMm, make, settings),
      };
    }
    case 'waterfall':
    case 'bullnose': {
      const wrapped = wrappedFront({ widthMm, depthMm, thicknessMm }, make.construction, seam);
      return {
        ...base,
        edgeHeightMm: thicknessMm,
        closure: { edgeMm: widthMm, wrapMm: 0, lengthMm: widthMm },
        panels: [wrapped.wrap, wrapped.side, ...closurePanels(widthMm, thicknessMm, make, settings)],
        // Both side panels, all round.
        welt: weltOf(2, outlinePerimeter(wrapped.side.finished), make, settings),
      };
    }
  }
}

/** Two halves with a zip between them, or one plain strip that is sewn shut or pressed. */
function closurePanels(
  lengthMm: number,
  heightMm: number,
  { closure }: CushionMake,
  settings: CushionSettings,
): CutPanel[] {
  const seam = settings.seam.valueMm;
  if (closure !== 'zip') return [rectanglePanel('closing strip', { widthMm: lengthMm, heightMm }, seam)];
  const half = rectanglePanel('zip half', { widthMm: lengthMm, heightMm: heightMm / 2 }, seam, 2);
  const cutHalf = zipPanel(lengthMm, heightMm + 2 * seam, settings);
  return [{ ...half, cut: rectangleOutline(cutHalf.lengthMm, cutHalf.halfWidthMm) }];
}

function weltOf(
  seams: number,
  perSeamMm: number,
  { welt }: CushionMake,
  settings: CushionSettings,
): CushionPanels['welt'] {
  const sewn = welt === 'none' ? 0 : seams;
  const alongSeamsMm = sewn * perSeamMm;
  const joinsMm = sewn * settings.weltJoin.valueMm;
  return { seams: sewn, alongSeamsMm, joinsMm, lengthMm: alongSeamsMm + joinsMm };
}
