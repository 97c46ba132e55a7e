import type { Vec3 } from '../parts/part.ts';
import { TRUNK_COLUMNS, type Cage } from './cage.ts';
import type { Figure } from './figure.ts';
import { hipJoint } from './leg-line.ts';
import { HIP_FORWARD_MM, shoulderLineMm, bendPoint, chestRad, mirror, type Stance } from './stance.ts';
import { clamp, mix, turnAboutX } from './vector.ts';

/** A level ring: heights and depths at front, side and back, and half its width. */
interface Ring {
  front: number;
  side: number;
  back: number;
  halfWidth: number;
  zFront: number;
  zBack: number;
  exponent?: number;
}

const power = (x: number, p: number): number => Math.sign(x) * Math.abs(x) ** p;

function ringPoint(ring: Ring, column: number): Vec3 {
  const angle = (column * 2 * Math.PI) / TRUNK_COLUMNS;
  const s = Math.sin(angle);
  const c = Math.cos(angle);
  const p = 2 / (ring.exponent ?? 2.2);
  const end = c >= 0 ? ring.front : ring.back;
  return [
    ring.halfWidth * power(s, p),
    ring.side + (end - ring.side) * Math.abs(c),
    (ring.zFront + ring.zBack) / 2 + ((ring.zFront - ring.zBack) / 2) * power(c, p),
  ];
}

const level = (y: number, halfWidth: number, zFront: number, zBack: number, exponent?: number): Ring => ({
  front: y,
  side: y,
  back: y,
  halfWidth,
  zFront,
  zBack,
  exponent,
});

/** Sections of an upright trunk and head, left half: `[ring][column 0..6]`; armhole points included. */
function uprightHalf(f: Figure): { rings: Vec3[][]; crown: [Vec3, Vec3, Vec3] } {
  const { TC, AH, SH, EH, HL, HBr, CD, CB, WB, BA, k, woman: w } = f;
  const h = f.HB / 2;
  const A = 30 + 0.02 * CD + f.AD;
  const C = 12 + CD;
  const Z = HIP_FORWARD_MM + 0.42 * (A - HIP_FORWARD_MM);
  const L = mix(Z, A, 0.62);
  const zS = shoulderLineMm(f);
  const y5 = mix(0.755, 0.745, w) * AH;
  const Y = (t: number): number => mix(TC, y5, t);
  const w5 = CB / 2 + mix(8, 5, w);
  const thin = clamp((23 - f.bodyMassIndex) / 5, 0, 1);
  const waistHalf = (mix(0.91, 0.87, w) * WB) / 2;
  const neck = f.radius.neck;
  const chin = SH - 1.98 * (SH - EH);
  const F = zS + 6 + 0.54 * HL;
  const B = zS + 6 - 0.46 * HL;
  const face = (t: number): number => mix(chin, EH, t);
  const skull = (t: number): number => mix(EH, SH, t);

  const hip: Vec3[] = [
    [0, 0.6 * TC, Z - 4],
    [0.5 * h, 0.93 * TC, Z],
    [0.88 * h, 0.76 * TC, mix(Z, 150, 0.35)],
    [h, 84, 138],
    [0.78 * h, 10, 98],
    [0.46 * h, -10, 66],
    [0, 4, 62],
  ];
  const buttock: Vec3[] = [
    [0, TC + 14, L + 4],
    [0.44 * h, TC + 16, L - 6],
    [0.84 * h, 0.94 * TC, mix(L, 150, 0.5)],
    [0.965 * h, 128, 130],
    [0.8 * h, 98, 40 + f.rump],
    [0.45 * h, 88, f.rump],
    [0, 94, 14 + f.rump],
  ];
  const levels: Ring[] = [
    level(Y(0.22), mix(WB / 2, h, mix(0.3, 0.36, w)), A, 25),
    level(Y(0.5), waistHalf, mix(A, C, 0.3) - mix(4, 14, thin), 39),
    level(Y(0.76), mix(waistHalf, w5, 0.62), mix(A, C, 0.72) - mix(6, 20, w), 25),
    level(y5, w5, C - 5, 15, 2.45),
    level(0.875 * AH, BA / 2 - 26, C - mix(34, 48, w) * k, 14),
    { front: AH - 30 * k, side: AH, back: AH + 6, halfWidth: BA / 2, zFront: zS + 66 * k, zBack: 33 },
    {
      front: AH - 4,
      side: AH + 30,
      back: AH + 50,
      halfWidth: 1.1 * neck,
      zFront: zS - 14 + 1.06 * neck,
      zBack: zS - 14 - 0.95 * neck,
    },
    {
      front: chin - 20,
      side: chin + 6,
      back: chin + 26,
      halfWidth: 0.93 * neck,
      zFront: zS + 0.98 * neck,
      zBack: zS - 12 - 0.86 * neck,
    },
    {
      front: chin + 5,
      side: face(0.4),
      back: face(0.6),
      halfWidth: 0.4 * HBr,
      zFront: F - 0.07 * HL,
      zBack: B + 0.1 * HL,
    },
    {
      front: face(0.52),
      side: face(0.74),
      back: face(0.92),
      halfWidth: 0.465 * HBr,
      zFront: F + 1,
      zBack: B + 0.04 * HL,
    },
    { front: EH, side: EH + 2, back: EH + 6, halfWidth: 0.49 * HBr, zFront: F - 6, zBack: B },
    { front: skull(0.3), side: skull(0.36), back: skull(0.4), halfWidth: 0.5 * HBr, zFront: F, zBack: B },
    {
      front: skull(0.76),
      side: skull(0.8),
      back: skull(0.78),
      halfWidth: 0.37 * HBr,
      zFront: F - 0.125 * HL,
      zBack: B + 0.115 * HL,
    },
  ];
  const rings = [hip, buttock, ...levels.map((ring) => [0, 1, 2, 3, 4, 5, 6].map((c) => ringPoint(ring, c)))];

  const set = (ring: number, column: number, p: Vec3): void => {
    rings[ring]![column] = p;
  };
  const bust = rings[5]![1]!;
  set(5, 1, [bust[0] + 6 * w, bust[1] - 7 * w, bust[2] + 9 * w]);
  set(5, 2, [w5 + 1, y5 + 18, zS + 40 * k]);
  set(5, 3, [w5 + 7, y5 + 6, zS]);
  set(5, 4, [w5 + 1, y5 + 18, zS - 40 * k]);
  for (const column of [1, 5]) set(6, column, [0.52 * w5, rings[6]![column]![1], rings[6]![column]![2]]);
  set(6, 2, [BA / 2 - 26, 0.875 * AH + 4, zS + 56 * k]);
  set(6, 4, [BA / 2 - 26, 0.875 * AH + 4, zS - 56 * k]);
  set(7, 2, [BA / 2 - 10, AH - 17 * k, zS + 37 * k]);
  set(7, 3, [BA / 2, AH, zS]);
  set(7, 4, [BA / 2 - 10, AH - 17 * k, zS - 37 * k]);

  const crownZ = (t: number): number => mix(F - 0.125 * HL, B + 0.115 * HL, t);
  return {
    rings,
    crown: [
      [0, SH - 8, crownZ(0.27)],
      [0, SH, crownZ(0.5)],
      [0, SH - 8, crownZ(0.75)],
    ],
  };
}

const LEAN_SHARE = [0, 0.25, 0.55, 0.8];
const SLUMP_SHARE = [0, 0, 0.15, 0.45, 0.8];
/** How much of a thigh's lift the lowest rings take, and their points from the front to the side. By eye. */
const FOLD_SHARE = [0.6, 0.9, 0.7, 0.3];
const FOLD_ACROSS = [1, 1, 1, 0.6];

/**
 * Writes the section points of trunk and head into `points`, bent as the stance says.
 *
 * @param f - the figure
 * @param stance - lean of the trunk, turn of the head and thighs
 * @param cage - tells where each point goes
 * @param points - x, y, z of every cage point, millimetres, body frame
 */
export function writeTrunk(f: Figure, stance: Stance, cage: Cage, points: Float64Array): void {
  const { rings, crown } = uprightHalf(f);
  const zS = shoulderLineMm(f);
  const giveBack = stance.headRad - chestRad(stance);
  const neckBase = bendPoint(f, stance, [0, f.AH + 20, zS - 14]);
  const skullBase = turnAboutX(
    bendPoint(f, stance, [0, f.EH - 0.35 * (f.SH - f.EH), zS]),
    neckBase,
    0.4 * giveBack,
  );
  const hip = hipJoint(f);
  /** A fold above a thigh goes some way with it; at the midline with both. */
  const folded = (p: Vec3, ring: number, column: number, n: 0 | 1): Vec3 => {
    const [own, other] = [stance.legs[n].thighRad, stance.legs[n === 0 ? 1 : 0].thighRad];
    const turned = column === 0 ? (own + other) / 2 : own;
    return turnAboutX(p, hip, turned * (FOLD_SHARE[ring] ?? 0) * (FOLD_ACROSS[column] ?? 0));
  };
  const place = (ring: number, column: number, p: Vec3): Vec3 => {
    if (ring === 0) return p;
    const leaned = bendPoint(f, stance, p, LEAN_SHARE[ring], SLUMP_SHARE[ring]);
    const share = ring < 8 ? 0 : ring === 8 ? 0.12 : ring === 9 ? 0.6 : 1;
    if (share === 0) return leaned;
    const nodded = turnAboutX(leaned, neckBase, 0.4 * giveBack * share);
    return turnAboutX(nodded, skullBase, 0.6 * giveBack * share);
  };
  const write = (id: number, p: Vec3): void => {
    if (id >= 0) points.set(p, id * 3);
  };
  rings.forEach((ring, r) => {
    ring.forEach((p, c) => {
      const q = place(r, c, p);
      write(cage.trunk[r]![c]!, folded(q, r, c, 0));
      if (c > 0 && c < 6) write(cage.trunk[r]![TRUNK_COLUMNS - c]!, mirror(folded(q, r, c, 1)));
    });
  });
  crown.forEach((p, i) => write(cage.crown[i]!, place(15, 0, p)));
  write(cage.crotch, [0, 22, 140]);
}
