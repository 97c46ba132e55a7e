import type { MapRegion } from '@settlewright/geometry';
import { shortName } from '@/lib/short-name.ts';
import { contours } from './contours.ts';

export interface MapFrame {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

type Spot = [x: number, y: number];

export interface MapName {
  placeId: string;
  name: string;
  /** Middle of the words, on the outline that they name. */
  at: Spot;
}

/** Room that is far too little: an outline closes along the edge of the map. */
const OUTSIDE = -1e9;

/** Pieces of a region's outline in cells of the grid; it closes along the edges of the map. */
export function outlineOf({ rooms }: Pick<MapRegion, 'rooms'>): ReturnType<typeof contours> {
  const across = (rooms[0]?.length ?? 0) + 2;
  const edge = Array.from({ length: across }, () => OUTSIDE);
  const ringed = [edge, ...rooms.map((row) => [OUTSIDE, ...row, OUTSIDE]), edge];
  return contours(ringed, 0).map(([[a, b], [c, d]]) => [
    [a - 1, b - 1],
    [c - 1, d - 1],
  ]);
}

const LETTER = 7.6;
const LINE = 18;

/** Width of a name in a drawing, on the safe side. */
const widthOf = (name: string): number => name.length * LETTER;

/**
 * Where each name stands: on its own region's outline, away from the other outlines and names, inside the map. Whoever
 * has a region has a name.
 *
 * @param taken - spots that are written on already
 */
export function mapNames(
  regions: readonly MapRegion[],
  placeOf: (across: number, up: number) => Spot,
  frame: MapFrame,
  taken: readonly Spot[] = [],
): MapName[] {
  const outlines = regions.map((region) =>
    outlineOf(region).map(([[a, b], [c, d]]): Spot => placeOf((a + c) / 2, (b + d) / 2)),
  );
  const written = [...taken];
  return regions.flatMap(({ placeId, name: full }, n): MapName[] => {
    const name = shortName(full);
    const half = widthOf(name) / 2 + 4;
    const others = outlines.flatMap((spots, other) => (other === n ? [] : spots));
    let best: { at: Spot; score: number } | undefined;
    for (const [x, y] of outlines[n] ?? []) {
      const at: Spot = [
        Math.min(Math.max(x, frame.left + half), frame.right - half),
        Math.min(Math.max(y, frame.top + LINE), frame.bottom - LINE / 2),
      ];
      const moved = Math.hypot(at[0] - x, at[1] - y);
      const score = 2 * roomFrom(at, half, written) + roomFrom(at, half, others) - moved;
      if (!best || score > best.score) best = { at, score };
    }
    if (!best) return [];
    written.push(best.at);
    return [{ placeId, name, at: best.at }];
  });
}

const ENOUGH = 60;

/** How far words lie from the nearest of some spots; more than enough counts as enough. */
function roomFrom([x, y]: Spot, half: number, spots: readonly Spot[]): number {
  return spots.reduce(
    (least, [a, b]) => Math.min(least, Math.hypot(Math.max(0, Math.abs(a - x) - half), 1.5 * (b - y))),
    ENOUGH,
  );
}
