import type { PartList } from '../parts/part-list.ts';
import { positionsAlong } from '../parts/spacing.ts';
import type { PieceOf } from '../room/document.ts';
import { PANEL_MM, type BenchLayout } from './bench-layout.ts';

const BEARER_PITCH_MM = 600;
const LEG_MM = 45;
const LEG_PITCH_MM = 1500;
const RAIL_HEIGHT_MM = 60;
const LIP_HEIGHT_MM = 30;
/** A lip that stands out less than this has no room for a moulding. */
const SMALLEST_LIP_MM = 15;

/**
 * Adds the deck, its lip and mouldings, and what carries it.
 *
 * @param list - the parts of the bench so far
 * @param bench - the bench
 * @param layout - its lines
 */
export function benchBaseParts(list: PartList, bench: PieceOf<'bench'>, layout: BenchLayout): void {
  deck(list, bench, layout);
  if (bench.base === 'box') boxBase(list, bench, layout);
  else openBase(list, layout);
}

function deck(list: PartList, bench: PieceOf<'bench'>, layout: BenchLayout): void {
  const { tiltRad, deckFrontYMm, deckFrontZMm, innerLeftMm, innerRightMm } = layout;
  const [sin, cos] = [Math.sin(tiltRad), Math.cos(tiltRad)];
  const slope = (deckFrontZMm - layout.rearPanelMm + Math.min(0, PANEL_MM * sin)) / cos;
  // A point of the deck: so far behind its upper front edge along the slope, so far below its face.
  const inDeck = (x: number, along: number, down: number) =>
    [x, deckFrontYMm - along * sin - down * cos, deckFrontZMm - along * cos + down * sin] as const;
  const { cushionLeftMm, cushionRightMm } = layout;
  list.box('deck', 'ply', {
    sizeMm: [cushionRightMm - cushionLeftMm, PANEL_MM, slope],
    centreMm: inDeck((cushionLeftMm + cushionRightMm) / 2, slope / 2, PANEL_MM / 2),
    pitchRad: -tiltRad,
    grain: 'x',
  });
  for (const [from, to] of [
    [innerLeftMm, cushionLeftMm],
    [cushionRightMm, innerRightMm],
  ] as const) {
    list.box('lip', 'oak', {
      sizeMm: [to - from, PANEL_MM, slope],
      centreMm: inDeck((from + to) / 2, slope / 2, PANEL_MM / 2),
      pitchRad: -tiltRad,
      grain: 'z',
    });
  }
  if (bench.lipMm < SMALLEST_LIP_MM) return;
  const thickness = Math.min(PANEL_MM, bench.lipMm * 0.6);
  list.box('lip', 'oak', {
    sizeMm: [innerRightMm - innerLeftMm, LIP_HEIGHT_MM, thickness],
    centreMm: inDeck((innerLeftMm + innerRightMm) / 2, thickness / 2, PANEL_MM + LIP_HEIGHT_MM / 2),
    pitchRad: -tiltRad,
    grain: 'x',
  });
}

function boxBase(list: PartList, bench: PieceOf<'bench'>, layout: BenchLayout): void {
  const { innerLeftMm, innerRightMm, rearPanelMm, riserFrontZMm, kickFrontZMm } = layout;
  const inner = innerRightMm - innerLeftMm;
  const middle = (innerLeftMm + innerRightMm) / 2;
  const below = (fromZ: number, toZ: number) =>
    Math.min(layout.deckUndersideAt(fromZ), layout.deckUndersideAt(toZ));
  const riserTop = below(riserFrontZMm - PANEL_MM, riserFrontZMm);
  const riserFoot = layout.hasKick ? Math.min(bench.kick.heightMm, riserTop) : 0;
  list.box('riser', 'oak', {
    sizeMm: [inner, riserTop - riserFoot, PANEL_MM],
    centreMm: [middle, (riserTop + riserFoot) / 2, riserFrontZMm - PANEL_MM / 2],
    grain: 'x',
  });
  if (layout.hasKick) {
    // A deep kick under a tilted deck meets it lower than the riser does.
    const kickTop = Math.min(riserFoot, below(kickFrontZMm - PANEL_MM, kickFrontZMm));
    list.box('kick', 'walnut', {
      sizeMm: [inner, kickTop, PANEL_MM],
      centreMm: [middle, kickTop / 2, kickFrontZMm - PANEL_MM / 2],
      grain: 'x',
    });
  }
  const rear = layout.hasBack ? rearPanelMm : PANEL_MM;
  if (!layout.hasBack) {
    const top = below(0, PANEL_MM);
    list.box('riser', 'oak', {
      sizeMm: [inner, top, PANEL_MM],
      centreMm: [middle, top / 2, PANEL_MM / 2],
      grain: 'x',
    });
  }
  const front = Math.min(kickFrontZMm, riserFrontZMm) - PANEL_MM;
  const heights = [layout.deckUndersideAt(front), layout.deckUndersideAt(rear)] as const;
  if (front - rear < 1 || Math.min(...heights) < 1) return;
  const outlineMm = [
    [rear, 0],
    [front, 0],
    [front, heights[0]],
    [rear, heights[1]],
  ] as const;
  const half = PANEL_MM / 2;
  for (const x of positionsAlong(innerLeftMm + half, innerRightMm - half, BEARER_PITCH_MM)) {
    list.crossPanel('bearer', 'ply', { xMm: x, thicknessMm: PANEL_MM, outlineMm });
  }
}

function openBase(list: PartList, layout: BenchLayout): void {
  const { innerLeftMm, innerRightMm, rearPanelMm, riserFrontZMm } = layout;
  const rows = [rearPanelMm, Math.max(riserFrontZMm - LEG_MM, rearPanelMm + LEG_MM + 1)];
  const xs = positionsAlong(innerLeftMm + LEG_MM / 2, innerRightMm - LEG_MM / 2, LEG_PITCH_MM);
  for (const z of rows) {
    const top = Math.min(layout.deckUndersideAt(z), layout.deckUndersideAt(z + LEG_MM));
    for (const x of xs) {
      list.box('leg', 'oak', {
        sizeMm: [LEG_MM, top, LEG_MM],
        centreMm: [x, top / 2, z + LEG_MM / 2],
        grain: 'y',
      });
    }
    for (let i = 1; i < xs.length; i += 1) {
      const [from, to] = [(xs[i - 1] ?? 0) + LEG_MM / 2, (xs[i] ?? 0) - LEG_MM / 2];
      list.box('rail', 'oak', {
        sizeMm: [to - from, Math.min(RAIL_HEIGHT_MM, top), PANEL_MM],
        centreMm: [(from + to) / 2, top - Math.min(RAIL_HEIGHT_MM, top) / 2, z + LEG_MM / 2],
        grain: 'x',
      });
    }
  }
}
