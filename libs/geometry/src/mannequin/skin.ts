import { writeArms } from './arm-sections.ts';
import { buildCage, type Cage, type CageFace } from './cage.ts';
import type { Figure } from './figure.ts';
import { writeLegs } from './leg-sections.ts';
import type { Stance } from './stance.ts';
import {
  applyRows,
  baseLevel,
  identityRows,
  refine,
  toLimit,
  type Level,
  type SparseRows,
} from './subdivision.ts';
import { writeTrunk } from './trunk-sections.ts';

/** What a point of the skin rests against. */
export const TOUCH = { none: 0, seat: 1, sole: 2, midline: 4, otherLeg: 8 } as const;

/** What of the body gives way to an arm lying on it. */
export const SOFT = { none: 0, trunk: 1, thigh: 2 } as const;

/** A level of the skin ready for use: its limit points as mixtures of cage points. */
export interface SkinLevel {
  level: Level;
  limit: SparseRows;
  /** `TOUCH` flags of every point. */
  touch: Uint8Array;
  /** For every point: +1 for the sitter's left leg, -1 for the right, 0 elsewhere and where both meet. */
  legSide: Int8Array;
  /** What of `SOFT` every point is. */
  soft: Uint8Array;
}

/** Everything that is the same for every body. */
export interface Skin {
  cage: Cage;
  /** Limit of the cage points themselves: used to make the skin pass through the sections. */
  cageLimit: SparseRows;
  coarse: SkinLevel;
  fine: SkinLevel;
}

const touchOfFace = (face: CageFace): number => {
  if (face.part === 'trunk') return face.strip === 0 ? TOUCH.seat : TOUCH.none;
  if (face.region === 'leg' && face.strip === 0) return TOUCH.seat | TOUCH.otherLeg;
  if (face.region === 'leg' && face.strip <= 3) return TOUCH.seat | TOUCH.midline | TOUCH.otherLeg;
  if (face.region === 'leg') return TOUCH.otherLeg;
  if (face.region !== 'shoe') return TOUCH.none;
  return face.part === 'cap' || face.strip >= 8 ? TOUCH.sole | TOUCH.otherLeg : TOUCH.otherLeg;
};

const softnessOf = ({ region, part, strip }: CageFace): number => {
  if (region === 'trunk' && part === 'trunk' && strip <= 4) return SOFT.trunk;
  return region === 'leg' && strip <= 2 ? SOFT.thigh : SOFT.none;
};

function skinLevel(cage: Cage, level: Level, rows: SparseRows): SkinLevel {
  const touch = new Uint8Array(level.pointCount);
  const legsOf = new Uint8Array(level.pointCount);
  const soft = new Uint8Array(level.pointCount);
  const leftLeg = new Set(cage.legs[0].slice(1).flat().concat(cage.toes[0]));
  const rightLeg = new Set(cage.legs[1].slice(1).flat().concat(cage.toes[1]));
  level.quads.forEach((quad, q) => {
    const face = cage.faces[level.home[q]!.face]!;
    const side = face.corners.some((c) => leftLeg.has(c))
      ? 1
      : face.corners.some((c) => rightLeg.has(c))
        ? 2
        : 0;
    for (const v of quad) {
      touch[v]! |= touchOfFace(face);
      soft[v] = Math.max(soft[v]!, softnessOf(face));
      legsOf[v]! |= side;
    }
  });
  const legSide = Int8Array.from(legsOf, (legs) => (legs === 1 ? 1 : legs === 2 ? -1 : 0));
  // The armhole belongs to the arm as well: it stays where the sections put it.
  level.quads.forEach((quad, q) => {
    if (cage.faces[level.home[q]!.face]!.part === 'arm') for (const v of quad) soft[v] = SOFT.none;
  });
  return { level, limit: toLimit(level, rows, cage.pointCount), touch, legSide, soft };
}

function buildSkin(): Skin {
  const cage = buildCage();
  const n = cage.pointCount;
  const base = baseLevel(
    n,
    cage.faces.map((face) => face.corners),
  );
  const identity = identityRows(n);
  const first = refine(base, identity, n);
  const second = refine(first.level, first.rows, n);
  return {
    cage,
    cageLimit: toLimit(base, identity, n),
    coarse: skinLevel(cage, first.level, first.rows),
    fine: skinLevel(cage, second.level, second.rows),
  };
}

let shared: Skin | undefined;

/** The skin, laid out on first use. */
export function skin(): Skin {
  shared ??= buildSkin();
  return shared;
}

/** Cage of a body whose skin passes through its section points. */
export function fitCage(figure: Figure, stance: Stance): Float64Array {
  const { cage, cageLimit } = skin();
  const sections = new Float64Array(cage.pointCount * 3);
  writeTrunk(figure, stance, cage, sections);
  writeLegs(figure, stance, cage, sections);
  writeArms(figure, stance, cage, sections);
  const points = sections.slice();
  const reached = new Float64Array(points.length);
  for (const gain of [1, 0.9, 0.9]) {
    applyRows(cageLimit, points, reached);
    for (let i = 0; i < points.length; i++) points[i]! += gain * (sections[i]! - reached[i]!);
  }
  return points;
}

/** Skin points of a level for a fitted cage, before anything presses on them. */
export function skinPoints(at: SkinLevel, cagePoints: Float64Array): Float64Array {
  const out = new Float64Array(at.level.pointCount * 3);
  applyRows(at.limit, cagePoints, out);
  return out;
}
