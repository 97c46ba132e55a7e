import type { DimensionShape, PagePoint } from './drawing.ts';

/**
 * Lanes for the numbers of neighbouring dimensions: 0 where a number fits into its own stretch, otherwise
 * the lowest lane in which it does not run into a number already placed.
 *
 * @param stretches - ends of each stretch along the line, rising
 * @param labelMm - length a number takes on the drawing
 * @returns a lane for every stretch
 */
export function labelLanes(stretches: readonly (readonly [number, number])[], labelMm: number): number[] {
  const taken: number[][] = [];
  return stretches.map(([from, to]) => {
    const middle = (from + to) / 2;
    // Stretches cut to the length of a number come out a hair shorter.
    const fits = to - from >= labelMm - 1e-6;
    for (let lane = fits ? 0 : 1; ; lane += 1) {
      const there = (taken[lane] ??= []);
      if (there.every((other) => Math.abs(other - middle) >= labelMm)) {
        there.push(middle);
        return lane;
      }
    }
  });
}

/** A line of dimensions. */
export interface ChainLine {
  /** The point of the page at a distance along the line. */
  at: (mm: number) => PagePoint;
  offsetMm: number;
  labelMm: number;
  quiet?: true;
  /** Smallest step that lengths are shown in: numbers then add up as they are read. */
  stepMm?: number | undefined;
  /** For a datum far away: where the drawn line begins instead. */
  drawnFromMm?: number;
}

/**
 * What lies between neighbouring stops. Running sizes are rounded, not the spaces: so these add up to the whole as shown.
 *
 * @param stops - distances along one line, millimetres
 * @param stepMm - smallest step that lengths are shown in; nothing is rounded without
 */
export function spacesBetween(stops: readonly number[], stepMm?: number): number[] {
  const shown = stepMm ? stops.map((stop) => Math.round(stop / stepMm) * stepMm) : stops;
  return shown.slice(1).map((stop, i) => stop - shown[i]!);
}

/**
 * A chain of dimensions from stop to stop; their values add up to the whole.
 *
 * @param stops - distances along the line, rising, at least two
 * @param line - where it runs and how long a number is
 */
export function dimensionChain(stops: readonly number[], line: ChainLine): DimensionShape[] {
  const stretches = stops.slice(1).map((to, i): [number, number] => [stops[i]!, to]);
  const lanes = labelLanes(stretches, line.labelMm);
  const spaces = spacesBetween(
    stops.map((stop) => stop - stops[0]!),
    line.stepMm,
  );
  return stretches.map(([from, to], i) => ({
    kind: 'dimension',
    from: line.at(from),
    to: line.at(to),
    offsetMm: line.offsetMm,
    valueMm: spaces[i]!,
    labelLane: lanes[i]!,
    ...(line.quiet ? { quiet: true } : {}),
  }));
}

/**
 * Dimensions that all start at one datum and lie on one line; each number stands at its own end.
 *
 * @param stops - distances from the datum, rising
 * @param line - where it runs and how long a number is
 */
export function datumChain(stops: readonly number[], line: ChainLine): DimensionShape[] {
  const lanes = labelLanes(
    stops.map((stop): [number, number] => [stop - line.labelMm / 2, stop + line.labelMm / 2]),
    line.labelMm,
  );
  return stops.map((stop, i) => ({
    kind: 'dimension',
    from: line.at(line.drawnFromMm ?? 0),
    to: line.at(stop),
    offsetMm: line.offsetMm,
    valueMm: stop,
    labelLane: lanes[i]!,
    labelAt: 'to',
    ...(line.quiet ? { quiet: true } : {}),
  }));
}
