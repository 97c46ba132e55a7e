import { CUSHION_SETTINGS, type CushionSettings } from '../cushions/cushion-settings.ts';
import { biasStripLength, weltStrips } from '../cushions/cushion-sizes.ts';
import type { CushionMake } from '../cushions/making/cushion-make.ts';
import type { CushionPanels } from '../cushions/making/cut-panels.ts';
import { TUFTED_FACE } from '../cushions/making/tufted-face.ts';
import { outlineExtent } from '../outlines/outline.ts';
import type { ClothPanel } from './cloth.ts';

/** A cloth as it is bought. */
export interface CoverCloth {
  /** Full width. */
  widthMm: number;
  /** Lost at each edge of the roll to selvedge. */
  selvedgeMm: number;
  /** How its own up lies on a cushion; either where pattern and nap do not show it. */
  lies: 'up-roll' | 'railroad' | 'either';
  repeatMm: { acrossMm: number; alongMm: number };
}

/** What a cover is cut for: the faces that are looked at, the strips round the edge, the welt. */
export const COVER_PARTS = ['faces', 'edges', 'welt'] as const;
export type CoverPart = (typeof COVER_PARTS)[number];

/** A cushion whose panels are cut from a cloth. */
export interface CoveredCushion {
  mark: string;
  make: CushionMake;
  made: CushionPanels;
  /** What of it is cut from this cloth; everything when absent. */
  parts?: readonly CoverPart[];
  /** From its middle to the line on which the pattern is centered, to the right on the plan; 0 when absent. */
  controlMm?: number;
}

/** Panels whose pattern is placed. */
const FACES: ReadonlySet<string> = new Set(['plate', TUFTED_FACE, 'cover', 'top, front and bottom']);

/** What of a cover a panel belongs to. */
export const coverPart = (panelName: string): CoverPart => (FACES.has(panelName) ? 'faces' : 'edges');

/** Width that panels may take up. */
export const usableWidthMm = ({ widthMm, selvedgeMm }: CoverCloth): number => widthMm - 2 * selvedgeMm;

/**
 * Every panel of some cushions for one cloth, ready to be laid.
 *
 * Strips longer than the roll is wide are pieced with a seam where the cloth forbids to lay them along it. Welt is cut
 * straight across the roll in one block, or on the bias from squares.
 *
 * @param cushions - those with this cover
 * @param cloth - the roll
 * @param settings - allowances of the workshop
 * @returns panels named by mark and panel
 */
export function coverPanels(
  cushions: readonly CoveredCushion[],
  cloth: CoverCloth,
  settings: CushionSettings = CUSHION_SETTINGS,
): ClothPanel[] {
  const usable = usableWidthMm(cloth);
  const panels = cushions.flatMap(({ mark, made, parts, controlMm = 0 }) =>
    made.panels.flatMap(({ name, count, cut }) => {
      const part = coverPart(name);
      if (parts && !parts.includes(part)) return [];
      const { widthMm, depthMm } = outlineExtent(cut);
      return Array.from({ length: count }, (_, n) => {
        const id = count === 1 ? `${mark} ${name}` : `${mark} ${name} ${n + 1}`;
        return part === 'faces'
          ? [face(id, { widthMm, lengthMm: depthMm }, controlMm, cloth, settings)]
          : strips(id, widthMm, depthMm, cloth, settings);
      }).flat();
    }),
  );
  const welted = cushions.filter(({ parts }) => !parts || parts.includes('welt'));
  return [...panels, ...weltPanels(welted, usable, settings)];
}

function face(
  id: string,
  { widthMm, lengthMm }: { widthMm: number; lengthMm: number },
  fromMiddleMm: number,
  { lies, repeatMm }: CoverCloth,
  settings: CushionSettings,
): ClothPanel {
  const panel: ClothPanel = { id, widthMm, lengthMm, lies };
  if (repeatMm.acrossMm <= 0 && repeatMm.alongMm <= 0) return panel;
  // The pattern is centered on the control line and starts at the front seam.
  return { ...panel, controlMm: { acrossMm: widthMm / 2 + fromMiddleMm, alongMm: settings.seam.valueMm } };
}

/** A strip in one piece, or pieced from equal ones when it has to lie across a narrower roll. */
function strips(
  id: string,
  widthMm: number,
  lengthMm: number,
  cloth: CoverCloth,
  settings: CushionSettings,
): ClothPanel[] {
  const usable = usableWidthMm(cloth);
  const { lies } = cloth;
  if (lies !== 'up-roll' || widthMm <= usable) return [{ id, widthMm, lengthMm, lies }];
  const seams = 2 * settings.seam.valueMm;
  const pieces = Math.ceil((widthMm - seams) / (usable - seams) - 1e-9);
  const each = (widthMm - seams) / pieces + seams;
  return Array.from({ length: pieces }, (_, n) => ({
    id: `${id}, piece ${n + 1}`,
    widthMm: each,
    lengthMm,
    lies,
  }));
}

function weltPanels(
  cushions: readonly CoveredCushion[],
  usable: number,
  settings: CushionSettings,
): ClothPanel[] {
  const lengthOf = (welt: CushionMake['welt']): number =>
    cushions.filter(({ make }) => make.welt === welt).reduce((sum, { made }) => sum + made.welt.lengthMm, 0);
  const strip = settings.weltStrip.valueMm;
  const straight = weltStrips(lengthOf('straight'), {
    clothWidthMm: usable,
    stripWidthMm: strip,
    joinLoss: 'strip-width',
  });
  const bias = biasSquares(lengthOf('bias'), usable, strip);
  return [
    ...(straight.strips > 0
      ? [{ id: 'welt strips', widthMm: usable, lengthMm: straight.clothMm, lies: 'up-roll' as const }]
      : []),
    ...bias.map((side, n) => ({
      id: `bias square ${n + 1}`,
      widthMm: side,
      lengthMm: side,
      lies: 'up-roll' as const,
    })),
  ];
}

/** Sides of the squares, none wider than the roll, that give so much bias strip. */
function biasSquares(lengthMm: number, usable: number, strip: number): number[] {
  if (lengthMm <= 0) return [];
  const most = biasStripLength(usable, strip);
  const whole = Math.floor(lengthMm / most);
  const rest = lengthMm - whole * most;
  return [...Array.from({ length: whole }, () => usable), ...(rest > 1e-6 ? [Math.sqrt(rest * strip)] : [])];
}
