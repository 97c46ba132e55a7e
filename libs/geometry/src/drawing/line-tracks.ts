import { SHORTEST_MM } from './hidden-stretches.ts';
import type { PagePoint } from './drawing.ts';
import { union, without, type Interval } from './intervals.ts';

/** A stretch of ink and what it stands for; of two that lie on each other the one of lower rank is drawn. */
export interface Ink<T> {
  rank: number;
  what: T;
}

interface Track<T> {
  /** Draws a stretch of the track. */
  between: (from: number, to: number) => T;
  inks: (Ink<unknown> & { on: Interval })[];
}

/** A straight line of the page. */
export interface PageLine {
  from: PagePoint;
  to: PagePoint;
}

/** Part of a circle of the page; angles in radians from right to down, rising; a whole turn is the circle. */
export interface PageArc {
  centre: PagePoint;
  radiusMm: number;
  fromRad: number;
  toRad: number;
}

const ANGLE_STEP = 1e-6;
const OFFSET_STEP_MM = 0.01;

/** Collects ink along lines and circles, so that nothing is drawn twice and what continues is one stretch. */
export interface LineTracks<W> {
  addLine: (from: PagePoint, to: PagePoint, ink: Ink<W>) => void;
  addArc: (arc: PageArc, ink: Ink<W>) => void;
  lines: () => (PageLine & { what: W })[];
  arcs: () => (PageArc & { what: W })[];
}

function drawn<T, W>(tracks: Iterable<Track<T>>): (T & { what: W })[] {
  const found: (T & { what: W })[] = [];
  for (const { between, inks } of tracks) {
    let taken: Interval[] = [];
    const byWhat = new Map<unknown, { rank: number; on: Interval[] }>();
    for (const { what, rank, on } of inks) {
      const group = byWhat.get(what) ?? { rank, on: [] };
      group.on.push(on);
      byWhat.set(what, group);
    }
    for (const [what, { on }] of [...byWhat].sort((a, b) => a[1].rank - b[1].rank)) {
      const whole = union(on, SHORTEST_MM);
      for (const [from, to] of without(whole, taken, SHORTEST_MM)) {
        found.push({ ...between(from, to), what: what as W });
      }
      taken = union([...taken, ...whole], SHORTEST_MM);
    }
  }
  return found;
}

/** Starts without ink. `W` must be the same object for ink that belongs together. */
export function lineTracks<W>(): LineTracks<W> {
  const straight = new Map<string, Track<PageLine>>();
  const round = new Map<string, Track<PageArc>>();

  function trackOf(dx: number, dy: number, offset: number): Track<PageLine> {
    const [a, o] = [Math.round(Math.atan2(dy, dx) / ANGLE_STEP), Math.round(offset / OFFSET_STEP_MM)];
    for (const da of [0, -1, 1]) {
      for (const d of [0, -1, 1]) {
        const known = straight.get(`${a + da} ${o + d}`);
        if (known) return known;
      }
    }
    const at = (along: number): PagePoint => [along * dx - offset * dy, along * dy + offset * dx];
    const made: Track<PageLine> = { between: (from, to) => ({ from: at(from), to: at(to) }), inks: [] };
    straight.set(`${a} ${o}`, made);
    return made;
  }

  return {
    addLine(from, to, ink) {
      const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
      if (length < SHORTEST_MM) return;
      let [dx, dy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
      if (Math.abs(dx) < 1e-9) [dx, dy] = [0, 1];
      else if (dx < 0) [dx, dy] = [-dx, -dy];
      const track = trackOf(dx, dy, from[1] * dx - from[0] * dy);
      const ends = [from[0] * dx + from[1] * dy, to[0] * dx + to[1] * dy] as const;
      track.inks.push({ ...ink, on: [Math.min(...ends), Math.max(...ends)] });
    },
    addArc({ centre, radiusMm, fromRad, toRad }, ink) {
      const key = [...centre, radiusMm].map((mm) => Math.round(mm / OFFSET_STEP_MM)).join(' ');
      // Measured along the arc, so that lengths mean the same as on a line.
      const track = round.get(key) ?? {
        between: (from, to) => ({ centre, radiusMm, fromRad: from / radiusMm, toRad: to / radiusMm }),
        inks: [],
      };
      round.set(key, track);
      track.inks.push({ ...ink, on: [fromRad * radiusMm, toRad * radiusMm] });
    },
    lines: () => drawn<PageLine, W>(straight.values()),
    arcs: () => drawn<PageArc, W>(round.values()),
  };
}
