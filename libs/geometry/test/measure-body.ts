import { furthest, LineCaster, type Soup } from './mesh-rays.ts';

/**
 * Landmarks as a survey draws them on the skin before it measures: the tailor's seams of the suit.
 */
export interface MarkedSoup extends Soup {
  seams: Uint32Array;
}

/** What the second measurer reads, millimetres, by the initials of the measures. */
export type MeasureInitials =
  | 'SH'
  | 'EH'
  | 'AH'
  | 'ER'
  | 'PH'
  | 'HB'
  | 'FF'
  | 'TC'
  | 'FL'
  | 'FB'
  | 'HL'
  | 'HBr'
  | 'BA'
  | 'KH'
  | 'BPL'
  | 'BKL'
  | 'AD'
  | 'CD'
  | 'BD';

const range = (from: number, to: number, step: number): number[] =>
  Array.from({ length: Math.max(0, Math.floor((to - from) / step) + 1) }, (_, i) => from + i * step);

/** Top of the armhole seam: the acromion, as drawn on the left shoulder. */
function acromion({ positions: p, seams }: MarkedSoup): readonly [number, number, number] {
  const nameOf = new Map<number, string>();
  const at = (v: number): string => {
    const known = nameOf.get(v);
    if (known) return known;
    const name = [0, 1, 2].map((i) => p[v * 3 + i]!.toFixed(2)).join(' ');
    nameOf.set(v, name);
    return name;
  };
  const parent = new Map<string, string>();
  const root = (a: string): string => {
    const up = parent.get(a) ?? a;
    return up === a ? a : root(up);
  };
  for (let i = 0; i < seams.length; i += 2) {
    const [a, b] = [root(at(seams[i]!)), root(at(seams[i + 1]!))];
    parent.set(a, b);
  }
  const loops = new Map<string, number[]>();
  for (const v of seams) {
    const name = root(at(v));
    loops.set(name, [...(loops.get(name) ?? []), v]);
  }
  const y = (v: number): number => p[v * 3 + 1]!;
  const highest = (ids: number[]): number => ids.reduce((best, v) => (y(v) > y(best) ? v : best));
  // Loops that keep to the left of the midline; the topmost of them runs around the armhole.
  const left = [...loops.values()].filter((ids) => ids.every((v) => p[v * 3]! > 20)).map(highest);
  const top = highest(left);
  return [p[top * 3]!, p[top * 3 + 1]!, p[top * 3 + 2]!];
}

/**
 * Measures a body on its surface with rays and slices, in the posture of the definitions: sitting upright on
 * the plane y = 0, facing +z, x to its left, thighs level, shins upright, upper arms hanging, forearms level.
 *
 * It knows the surface, the seat plane and the seams, and nothing of how the surface was made.
 *
 * @returns millimetres
 * @source definitions of ISO 7250-1:2017 (sitting height 6.2.1, eye 6.2.2, shoulder 6.2.4, elbow 6.2.5, biacromial
 *   6.2.7 and bideltoid 6.2.8 breadths, elbow-to-elbow 6.2.9, hip breadth 6.2.10, popliteal height 6.2.11, thigh
 *   clearance 6.2.12, knee height 6.2.13, abdominal depth 6.2.14, chest depth 6.2.15, foot 6.3.7 and 6.3.8, head
 *   6.3.9 and 6.3.10, buttock-popliteal 6.4.7 and buttock-knee 6.4.8 lengths), the numbers of the clauses from memory
 */
export function measureBody(soup: MarkedSoup): Record<MeasureInitials, number> {
  const up = new LineCaster(soup, 1);
  const ahead = new LineCaster(soup, 2);
  const whole = { axis: 1, from: -2000, to: 2000 } as const;

  const SH = furthest(soup, 1, 1, whole);
  const sole = furthest(soup, 1, -1, whole);
  const [acromionX, AH, acromionZ] = acromion(soup);
  const onTop = up.inside(acromionX, 0, acromionZ).at(-1)!.to;
  if (Math.abs(onTop - AH) > 1) throw new Error(`the acromion at ${AH} lies under the skin at ${onTop}`);

  // Eye: the hollow of the profile between brow and cheek.
  const profile = range(0.8 * SH, SH - 40, 0.5).map((y) => ({ y, z: ahead.inside(0, y, 0).at(-1)!.to }));
  const brow = profile.reduce((best, at) => (at.y > 0.87 * SH && at.z > best.z ? at : best), {
    y: 0,
    z: -Infinity,
  });
  const hollow = profile
    .filter(({ y }) => y < brow.y && y > brow.y - 60)
    .reduce((best, at) => (at.z < best.z ? at : best), { y: 0, z: Infinity });
  const EH = hollow.y;

  // Hips: across thighs and buttocks, under the elbows; the elbows: outside the hips, over the thighs.
  const HB = 2 * furthest(soup, 0, 1, { axis: 1, from: 0, to: 0.15 * SH });
  const elbowOut = furthest(soup, 0, 1, { axis: 1, from: 0.2 * SH, to: 0.42 * SH });
  const outerArm = range(elbowOut - 60, elbowOut - 4, 3);
  const armLine = (x: number, z: number): number => {
    const stretches = up.inside(x, 0, z).filter(({ from, to }) => from > 0.15 * SH && to > 0.3 * AH);
    return stretches.length > 0 ? stretches[0]!.from : Infinity;
  };
  const ER = Math.min(
    ...outerArm
      .flatMap((x) => range(acromionZ - 60, acromionZ + 60, 3).map((z) => armLine(x, z)))
      .filter((y) => y > 60),
  );

  const buttock = furthest(soup, 2, -1, { axis: 1, from: 5, to: 0.28 * SH });
  const BKL = furthest(soup, 2, 1, { axis: 1, from: 0.4 * sole, to: Math.min(0.55 * ER, 120) }) - buttock;
  // Knees stand at one side of the midline: half-way across the shin.
  const shin = { axis: 1, from: -45, to: -20 } as const;
  const kneeX = (furthest(soup, 0, 1, shin) + furthest(soup, 0, -1, shin, (x) => x > 0)) / 2;
  const backOfKnee = Math.min(
    ...range(kneeX - 25, kneeX + 25, 5).flatMap((x) =>
      range(-45, -15, 3).map((y) => ahead.inside(x, y, 0)[0]?.from ?? Infinity),
    ),
  );
  const BPL = backOfKnee - buttock;
  const underThigh = up.inside(kneeX, 0, backOfKnee - 20).find(({ to }) => to > 40)!.from;
  const PH = underThigh - sole;
  const legTop = (x: number, z: number): number =>
    up.inside(x, 0, z).find(({ from, to }) => from < 45 && to > 20)?.to ?? -Infinity;
  const KH =
    Math.max(
      ...range(kneeX - 40, kneeX + 40, 5).flatMap((x) =>
        range(backOfKnee + 12, buttock + BKL, 4).map((z) => legTop(x, z)),
      ),
    ) - sole;

  const chestLevels = range(0.72 * AH, 0.8 * AH, 2);
  const depthAt = (y: number, xs: number[]): number => {
    const runs = xs.flatMap((x) => ahead.inside(x, y, 0)).filter(({ from }) => from < acromionZ + 40);
    return Math.max(...runs.map(({ to }) => to)) - Math.min(...runs.map(({ from }) => from));
  };
  const near = range(-0.36 * acromionX, 0.36 * acromionX, 6);
  const CD = Math.max(...chestLevels.map((y) => depthAt(y, range(-0.62 * acromionX, 0.62 * acromionX, 6))));

  // Thighs are free of the belly in front of it; the belly is free of the thighs over them.
  const thighLines = (from: number): number =>
    Math.max(
      ...range(0.4 * kneeX, 1.5 * kneeX, 6).flatMap((x) =>
        range(from, backOfKnee - 30, 6).map((z) => legTop(x, z)),
      ),
    );
  const roughBelly = Math.max(...range(0.36 * AH, 0.55 * AH, 6).map((y) => ahead.inside(0, y, 0)[0]!.to));
  const TC = thighLines(roughBelly + 4);
  const AD = Math.max(...range(TC + 6, TC + 0.5 * (0.75 * AH - TC), 3).map((y) => depthAt(y, near)));

  const foot = { axis: 1, from: sole, to: sole + 95 } as const;
  const left = (x: number): boolean => x > 0;
  const tread = { axis: 1, from: sole, to: sole + 60 } as const;
  const skull = { axis: 1, from: EH - 40, to: SH } as const;
  return {
    SH,
    EH,
    AH,
    ER,
    PH,
    HB,
    TC,
    KH,
    BPL,
    BKL,
    AD,
    CD,
    FF: 2 * furthest(soup, 0, 1, { axis: 1, from: ER, to: ER + 80 }, (_x, _y, z) => z < acromionZ + 120),
    BD: 2 * furthest(soup, 0, 1, { axis: 1, from: 0.79 * AH, to: AH }),
    BA: 2 * acromionX,
    FL: furthest(soup, 2, 1, foot) - furthest(soup, 2, -1, foot),
    FB: furthest(soup, 0, 1, tread, left) - furthest(soup, 0, -1, tread, left),
    HL: Math.max(
      ...range(EH - 6, SH - 30, 4).map((y) => {
        const runs = ahead.inside(0, y, 0);
        return runs.at(-1)!.to - runs[0]!.from;
      }),
    ),
    HBr: 2 * furthest(soup, 0, 1, skull),
  };
}
