import type { Vec3 } from '../parts/part.ts';
import { LIMB_COLUMNS, type Cage } from './cage.ts';
import type { Figure } from './figure.ts';
import {
  bicepsTuck,
  bendPoint,
  chestRad,
  direction,
  elbowFlesh,
  mirror,
  shoulderLineMm,
  type ArmStance,
  type Stance,
  type TrunkBend,
} from './stance.ts';
import {
  add,
  along,
  clamp,
  cross,
  dot,
  length,
  mix,
  mixPoints,
  scale,
  sub,
  turnAbout,
  turnAboutX,
  turnBetween,
  unit,
} from './vector.ts';

/** Ring of eight: column 0 at `outward`, 2 at `front`, 4 at minus `outward`, 6 at minus `front` times `behind`. */
function armRing(centre: Vec3, outward: Vec3, front: Vec3, behind = 1): Vec3[] {
  return Array.from({ length: LIMB_COLUMNS }, (_, column) => {
    const angle = (column * Math.PI) / 4;
    const power = (x: number): number => (Math.abs(x) < 1e-9 ? 0 : Math.sign(x) * Math.abs(x) ** (2 / 2.2));
    const s = power(Math.sin(angle));
    return along(along(centre, outward, power(Math.cos(angle))), front, s < 0 ? s * behind : s);
  });
}

/** Section points of a left arm. Ring 0 is the armhole, given hanging and leaned with the trunk. */
function armPoints(f: Figure, arm: ArmStance, bend: TrunkBend, armhole: Vec3[]) {
  const { k, radius, Ha } = f;
  const { shoulder, wrist } = arm;
  const elbow = elbowFlesh(f, arm);
  const upperMm = length(sub(elbow, shoulder));
  const forearmMm = length(sub(wrist, elbow));
  const u = direction(shoulder, elbow);
  const g = direction(elbow, wrist);
  const hangLateral: Vec3 = [1, 0, 0];
  const hangDown = turnAboutX([0, -1, 0], [0, 0, 0], chestRad(bend));
  const hangFront = turnAboutX([0, 0, 1], [0, 0, 0], chestRad(bend));
  const lateral = unit(cross(g, u), hangLateral);
  const frontOf = (axis: Vec3, side: Vec3): Vec3 => unit(cross(axis, side));
  const { axis, angleRad } = turnBetween(
    [hangDown, hangLateral, hangFront],
    [u, lateral, frontOf(u, lateral)],
  );
  const turned = (p: Vec3, share: number): Vec3 =>
    add(shoulder, turnAbout(sub(p, shoulder), axis, angleRad * share));
  const hole = armhole.map((p, c) => turned(p, 0.16 + 0.06 * Math.cos((c * Math.PI) / 4)));

  const y5 = mix(0.755, 0.745, f.woman) * f.AH;
  const w5 = f.CB / 2 + mix(8, 5, f.woman);
  const zS = shoulderLineMm(f);
  const outside = bendPoint(f, bend, [f.BD / 2, 0.865 * f.AH, zS]);
  const inside = bendPoint(f, bend, [w5 + 15, y5 - 16, zS]);
  const deltoid = armRing(
    mixPoints(outside, inside, 0.5),
    scale(sub(outside, inside), 0.5),
    scale(hangFront, 58 * k),
  ).map((p, c) => turned(p, 0.64 + 0.22 * Math.cos((c * Math.PI) / 4)));

  const r = radius.arm;
  const e = radius.elbow;
  const tuck = bicepsTuck(f);
  const bent = clamp(Math.acos(clamp(dot(u, g), -1, 1)) / (Math.PI / 2), 0, 1);
  const front = frontOf(u, lateral);
  const onUpper = (t: number): Vec3 => along(shoulder, u, t * upperMm);
  const biceps = armRing(
    along(onUpper(0.52), lateral, -tuck),
    scale(lateral, 0.96 * r),
    scale(front, 1.06 * r),
  );
  const aboveElbow = armRing(
    onUpper(mix(0.83, 0.7, bent)),
    scale(lateral, mix(r, e, 0.75)),
    scale(front, mix(r, e, 0.6)),
  );
  const crook = unit(cross(unit(add(u, g), u), lateral));
  const atElbow = armRing(elbow, scale(lateral, 0.95 * e), scale(crook, 1.12 * e), 1.05 / 1.12);

  const handSide = unit(cross(arm.handBack, arm.hand), lateral);
  const handBack = unit(cross(arm.hand, handSide));
  const onForearm = (t: number, twist: number, across: number, through: number): Vec3[] => {
    const side = unit(mixPoints(lateral, handSide, twist), lateral);
    return armRing(along(elbow, g, t * forearmMm), scale(side, across), scale(frontOf(g, side), through));
  };
  const below = onForearm(mix(0.26, 0.4, bent), 0.12, radius.forearm, radius.forearm);
  const atWrist = onForearm(1, 0.85, 1.12 * radius.wrist, 0.86 * radius.wrist);
  const onHand = (t: number, across: number, through: number, curl: number): Vec3[] =>
    armRing(
      along(along(wrist, arm.hand, t * Ha), handBack, -curl * Ha),
      scale(handSide, across * Ha),
      scale(handBack, through * Ha),
    );
  const rings = [
    hole,
    deltoid,
    biceps,
    aboveElbow,
    atElbow,
    below,
    atWrist,
    onHand(0.16, 0.182, 0.12, 0),
    onHand(0.4, 0.213, 0.094, 0.005),
    onHand(0.83, 0.158, 0.066, 0.05),
  ];
  const finger = along(along(wrist, arm.hand, Ha), handBack, -0.085 * Ha);

  const root = [rings[7]![3]!, rings[7]![4]!, rings[7]![5]!, rings[8]![5]!, rings[8]![4]!, rings[8]![3]!];
  const middle = scale(root.reduce(add), 1 / 6);
  const out = unit(sub(scale(arm.hand, Math.cos(Math.PI / 6)), scale(handSide, Math.sin(Math.PI / 6))));
  const wristwards = unit(sub(scale(out, dot(out, arm.hand)), arm.hand));
  const thumb = [
    { reach: 0.17, radius: 0.066 },
    { reach: 0.34, radius: 0.05 },
  ].map(({ reach, radius: size }) =>
    [60, 0, -60, -120, 180, 120].map((degrees) => {
      const a = (degrees * Math.PI) / 180;
      const base = along(along(middle, out, reach * Ha), handSide, -0.03 * Ha);
      return along(along(base, wristwards, Math.cos(a) * size * Ha), handBack, Math.sin(a) * size * Ha);
    }),
  );
  return { rings, finger, thumb };
}

/**
 * Writes the section points of both arms into `points`; the armholes of the trunk, already written, are
 * turned a little with them.
 *
 * @param f - the figure
 * @param stance - both arms and the lean of the trunk
 * @param cage - tells where each point goes
 * @param points - x, y, z of every cage point, millimetres, body frame
 */
export function writeArms(f: Figure, stance: Stance, cage: Cage, points: Float64Array): void {
  ([0, 1] as const).forEach((side) => {
    const flip = side === 1 ? mirror : (p: Vec3): Vec3 => p;
    const read = (id: number): Vec3 => flip([points[id * 3]!, points[id * 3 + 1]!, points[id * 3 + 2]!]);
    const write = (id: number, p: Vec3): void => points.set(flip(p), id * 3);
    const armhole = cage.arms[side][0]!.map(read);
    const { rings, finger, thumb } = armPoints(f, stance.arms[side], stance, armhole);
    rings.forEach((ring, r) => ring.forEach((p, c) => write(cage.arms[side][r]![c]!, p)));
    thumb.forEach((ring, r) => ring.forEach((p, c) => write(cage.thumbs[side][r]![c]!, p)));
    write(cage.fingers[side], finger);
  });
}
