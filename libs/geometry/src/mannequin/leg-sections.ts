import type { Vec3 } from '../parts/part.ts';
import { LIMB_COLUMNS, type Cage } from './cage.ts';
import type { Figure } from './figure.ts';
import { leanInwards, legBends } from './leg-line.ts';
import { HIP_FORWARD_MM, restAnkle, restKnee, type LegStance, type Stance } from './stance.ts';
import { add, along, clamp, mix, mixPoints, scale, sub, turnAboutX, turnAboutY } from './vector.ts';

/**
 * Points of one limb ring: `across` and `up` are half axes, column 3 lies at `across`, column 1 at `up`.
 * `inward` scales the half axis on the far side of `across`.
 */
function legRing(centre: Vec3, across: Vec3, up: Vec3, inward = 1): Vec3[] {
  return Array.from({ length: LIMB_COLUMNS }, (_, column) => {
    const angle = ((3 - column) * Math.PI) / 4;
    const power = (x: number): number => (Math.abs(x) < 1e-9 ? 0 : Math.sign(x) * Math.abs(x) ** (2 / 2.2));
    const c = power(Math.cos(angle));
    return along(along(centre, across, c < 0 ? c * inward : c), up, power(Math.sin(angle)));
  });
}

/** A ring through a front (or top) and a back (or bottom) point. */
const between = (front: Vec3, back: Vec3, halfWidth: number, inward = 1): Vec3[] =>
  legRing(mixPoints(front, back, 0.5), [halfWidth, 0, 0], scale(sub(front, back), 0.5), inward);

/** Upper sides of the thigh's three rings: how far forward, how high, and half as wide. */
interface ThighRing {
  z: number;
  top: number;
  centreX: number;
  half: number;
}

export function thighRings(f: Figure): [ThighRing, ThighRing, ThighRing] {
  const h = f.HB / 2;
  const t = f.KH - f.PH;
  const belly = 30 + 0.02 * f.CD + f.AD;
  const crease = HIP_FORWARD_MM + 0.42 * (belly - HIP_FORWARD_MM);
  const flesh = Math.max(0, f.TC - t - 45);
  const z3 = f.BPL - 46;
  const z1 = Math.min(Math.max(crease + 62, belly + 6), z3 - 88);
  const kneeX = restKnee(f)[0];
  return [
    { z: z1, top: f.TC, centreX: 0.515 * h, half: 0.455 * h },
    {
      z: mix(z1, z3, 0.52),
      top: mix(f.TC, t, 0.3),
      centreX: mix(0.515 * h, kneeX, 0.5),
      half: mix(0.455 * h, f.radius.knee, 0.36),
    },
    { z: z3, top: t + 7 + 0.2 * flesh, centreX: kneeX, half: f.radius.knee },
  ];
}

/** Height of a thigh's upper side over the seat, at `x` from the midline and `z` forward of the rearmost buttock. */
export function thighSurface(f: Figure): (x: number, z: number) => number {
  const [first, second, third] = thighRings(f);
  return (x, z) => {
    const [from, to] = z < second.z ? [first, second] : [second, third];
    const t = clamp((z - from.z) / (to.z - from.z), 0, 1);
    const top = mix(from.top, to.top, t);
    const aside = clamp(Math.abs(x - mix(from.centreX, to.centreX, t)) / mix(from.half, to.half, t), 0, 0.95);
    return (top / 2) * (1 + (1 - aside ** 2.2) ** (1 / 2.2));
  };
}

/** Sections of the left leg as measured: thigh along the seat, shin upright. Rings 1 to 12, then the toe. */
export function restLeg(
  f: Figure,
  { shoeMm, forefootMm }: Pick<Stance, 'shoeMm' | 'forefootMm'>,
): { rings: Vec3[][]; toe: Vec3 } {
  const { PH, BPL, BKL, MH, FL, FB, k, radius } = f;
  const t = f.KH - PH;
  const kneeX = restKnee(f)[0];
  const q = radius.knee;
  const sole = -PH;
  const tread = sole - 6 - shoeMm;
  const z0 = (BPL + BKL) / 2 - 4;
  const a = radius.ankle;
  const heel = z0 - 0.255 * FL;
  const [first, second, third] = thighRings(f);
  const thigh = ({ z, top, centreX, half }: ThighRing, inward = 1): Vec3[] =>
    between([centreX, top, z], [centreX, -8, z], half, inward);
  // On a heel the instep runs down to the ball; the ankle stays up.
  const drop = (share: number): number => (shoeMm - forefootMm) * clamp((share - 0.2) / 0.5, 0, 1);
  const foot = (share: number, height: number, half: number): Vec3[] =>
    between(
      [kneeX, sole + height * MH - drop(share), heel + share * FL],
      [kneeX, tread, heel + share * FL],
      half * FB,
    );
  return {
    rings: [
      thigh(first, 0.5 / 0.455),
      thigh(second),
      thigh(third),
      between([kneeX, t - 22, BKL - 20], [kneeX, 2, BPL + 6], 0.98 * q),
      between([kneeX, -46 * k, BKL - 6], [kneeX, -46 * k, BPL + 1], 0.91 * q),
      between([kneeX, -0.36 * PH, BKL - 20], [kneeX, -0.36 * PH, BPL - 7], 0.95 * radius.calf),
      between([kneeX, sole + 1.32 * MH, z0 + 1.06 * a], [kneeX, sole + 1.32 * MH, z0 - 1.16 * a], 0.87 * a),
      between([kneeX, sole + 1.12 * MH, z0 + 1.12 * a + 6], [kneeX, sole + 26 - shoeMm / 2, heel], 0.92 * a),
      between([kneeX, sole + 0.98 * MH, z0 + 1.5 * a + 10], [kneeX, tread - 1, heel + 0.1 * FL], 0.35 * FB),
      foot(0.55, 0.8, 0.42),
      foot(0.74, 0.54, 0.5),
      foot(0.93, 0.36, 0.37),
    ],
    toe: [kneeX, sole + 0.14 * MH - drop(1) - forefootMm / 2, heel + 1.005 * FL],
  };
}

const FOOT_SHARE = [0.3, 0.5, 0.75, 1, 1, 1];
/** Whatever belongs to the foot alone goes as this ring does. */
const FOOT_RING = 12;
/** How much of the turn of a thigh about its length its rings take, from the second to the knee. */
const TURN_SHARE = [0, 0.4, 0.8];
/** How much the first ring of a thigh takes of its lift and of its turn towards the other leg. */
export const ROOT_LIFT = 0.8;
export const ROOT_ACROSS = 0.2;

/** Carries a section point of a measured left leg, of rings 1 to 12, to where a stance has it. */
export function sectionMover(f: Figure, leg: LegStance): (ring: number, p: Vec3) => Vec3 {
  const { hip, knee, ankle, across } = legBends(f, leg);
  const kneeRest = restKnee(f);
  const ankleRest = restAnkle(f);
  const { thighRad, shinRad, footRad, toesOutRad, inwardRad, footInwardRad } = leg;
  const onFoot = (p: Vec3, share: number): Vec3 => {
    const lean = mix(inwardRad, footInwardRad, share);
    const moved = leanInwards(add(ankle, sub(p, ankleRest)), ankle, lean);
    const pitched = turnAboutX(moved, ankle, mix(shinRad, footRad, share));
    return turnAboutY(pitched, ankle, toesOutRad * share);
  };
  const bent = (ring: number, p: Vec3): Vec3 => {
    const inwards = inwardRad * (ring === 1 ? 0 : (TURN_SHARE[ring - 2] ?? 1));
    if (ring <= 3) {
      return leanInwards(turnAboutX(p, hip, thighRad * (ring === 1 ? ROOT_LIFT : 1)), knee, inwards);
    }
    if (ring <= 6) {
      const angle = ring === 4 ? (thighRad + shinRad) / 2 : shinRad;
      return turnAboutX(leanInwards(add(knee, sub(p, kneeRest)), knee, inwards), knee, angle);
    }
    return onFoot(p, FOOT_SHARE[ring - 7] ?? 1);
  };
  return (ring, p) => across(bent(ring, p), ring === 1 ? ROOT_ACROSS : 1);
}

/**
 * Writes the section points of both legs into `points`, bent as the stance says.
 *
 * @param f - the figure
 * @param stance - turns of thigh, shin and foot; height of the shoe under the heel in millimetres
 * @param cage - tells where each point goes
 * @param points - x, y, z of every cage point, millimetres, body frame
 */
export function writeLegs(f: Figure, stance: Stance, cage: Cage, points: Float64Array): void {
  const { rings, toe } = restLeg(f, stance);
  for (const side of [0, 1] as const) {
    const moved = sectionMover(f, stance.legs[side]);
    const write = (id: number, [x, y, z]: Vec3): void => points.set([side === 0 ? x : -x, y, z], id * 3);
    rings.forEach((ring, r) => {
      ring.forEach((p, c) => write(cage.legs[side][r + 1]![c]!, moved(r + 1, p)));
    });
    write(cage.toes[side], moved(FOOT_RING, toe));
  }
}
