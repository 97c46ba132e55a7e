import { waysOf, type ClothPanel, type ClothRoll, type PanelWay, type PlacedPanel } from './cloth.ts';
import { Skyline } from './skyline.ts';

const EPSILON_MM = 1e-6;

/** A panel with the ways it may lie, found once. */
export interface ReadyPanel {
  panel: ClothPanel;
  ways: PanelWay[];
}

/**
 * Panels made ready for laying.
 *
 * @param panels - to be cut
 * @param roll - they are cut from
 * @returns the same with their ways
 * @throws Error naming the first panel that is wider than the roll in every way it may lie
 */
export function readyPanels(panels: readonly ClothPanel[], roll: ClothRoll): ReadyPanel[] {
  return panels.map((panel) => {
    const ways = waysOf(panel, roll.usableWidthMm);
    if (ways.length === 0) throw new Error(`${panel.id} is wider than the cloth in every way it may lie`);
    return { panel, ways };
  });
}

interface Choice {
  at: number;
  way: PanelWay;
  spot: { xMm: number; yMm: number };
  score: number;
}

/** How well a panel fills a ledge: across it first, then level with a wall, then how much is left over. */
function scoreOf(way: PanelWay, ledgeWidthMm: number, leftWallMm: number, rightWallMm: number): number {
  // Asked for each panel at each ledge of each order that is tried: numbers alone.
  const levels = isLevel(way, leftWallMm) + isLevel(way, rightWallMm);
  if (ledgeWidthMm - way.widthMm < EPSILON_MM) return 4 + levels;
  return levels > 0 ? 2 : 1;
}

const isLevel = ({ lengthMm }: PanelWay, wallMm: number): number =>
  Math.abs(wallMm - lengthMm) < EPSILON_MM ? 1 : 0;

/**
 * Lays panels one by one on the lowest ledge: of those that fit, the first in the order that fills it best.
 *
 * @param ready - panels in the order of preference
 * @param roll - the cloth
 * @returns where each lies and the length taken up
 * @source skyline placement with scores for full widths and level walls, as in the literature on strip packing
 */
export function layInOrder(
  ready: readonly ReadyPanel[],
  roll: ClothRoll,
): { placed: PlacedPanel[]; lengthMm: number } {
  const skyline = new Skyline(roll);
  const left = ready.slice();
  const placed: PlacedPanel[] = [];
  let lengthMm = 0;
  while (left.length > 0) {
    const { index, ledge, leftWallMm, rightWallMm } = skyline.lowest();
    const atRight = rightWallMm > leftWallMm && Number.isFinite(rightWallMm);
    let best: Choice | undefined;
    const seen = new Set<string>();
    for (let at = 0; at < left.length && (best?.score ?? 0) < 6; at += 1) {
      const { panel, ways } = left[at]!;
      for (const way of ways) {
        if (way.widthMm > ledge.widthMm + EPSILON_MM) continue;
        const score = scoreOf(way, ledge.widthMm, leftWallMm, rightWallMm);
        if (best && score <= best.score) continue;
        // Of panels alike only the first is tried on a ledge.
        const likeness = `${way.widthMm}/${way.lengthMm}/${way.controlMm ? panel.id : ''}`;
        if (seen.has(likeness)) continue;
        seen.add(likeness);
        const spot = skyline.landing(ledge, way.widthMm, way.controlMm, atRight);
        if (spot) best = { at, way, spot, score };
      }
    }
    if (!best) {
      skyline.raise(index);
      continue;
    }
    const { at, way, spot } = best;
    const [taken] = left.splice(at, 1);
    const topMm = spot.yMm + way.lengthMm;
    skyline.lay(index, spot.xMm, topMm, way.widthMm);
    const { controlMm: _, ...size } = way;
    placed.push({ id: taken!.panel.id, ...spot, ...size });
    lengthMm = Math.max(lengthMm, topMm);
  }
  return { placed, lengthMm };
}
