import type { MeasureKey } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { readFigure, type FigureMeans } from './figure.ts';
import { MANNEQUIN_TAGS, mannequinMesh, type MannequinMesh } from './mesh.ts';
import { poseMannequin, type MannequinPose, type SeatPosture } from './pose.ts';
import { measuringStance } from './stance.ts';

type Sex = 'men' | 'women';
interface Statistics {
  mean: number;
  p: number[];
}
const stats = survey.stats as unknown as Record<Sex, Record<MeasureKey, Statistics>>;
const regressions = survey.reg_stature_lnweight as unknown as Record<
  Sex,
  Partial<Record<MeasureKey, number[]>>
>;

const PERCENTILE_PLACE = { p1: 0, p5: 1, p95: 7, p99: 8 };

/** A body with every measure at its own percentile, as survey tables list them. */
function surveyBody(sex: Sex, which: 'mean' | keyof typeof PERCENTILE_PLACE): FigureMeans {
  const value = (s: Statistics): number => (which === 'mean' ? s.mean : s.p[PERCENTILE_PLACE[which]]!);
  return Object.fromEntries(Object.entries(stats[sex]).map(([key, s]) => [key, value(s)]));
}

/** A body of a stature and weight, everything else as the survey's regressions expect. */
function bodyOf(sex: Sex, stature: number, weightKg: number): FigureMeans {
  const out: FigureMeans = { stature, weight_kg: weightKg };
  for (const [key, [a, b, c]] of Object.entries(regressions[sex])) {
    out[key as MeasureKey] = a! + b! * stature + c! * Math.log(weightKg);
  }
  return out;
}

const LEVEL_SEAT: SeatPosture = { effectiveDepthMm: 300, seatTiltRad: 0, backLeanRad: 0, backTopMm: 1000 };

function seated(means: FigureMeans, over: Partial<Parameters<typeof poseMannequin>[0]> = {}): MannequinPose {
  return poseMannequin({
    means,
    shoeMm: 0,
    frame: { hipMm: [0, means.popliteal_height!, 135], facingRad: 0 },
    situation: LEVEL_SEAT,
    sinkMm: 0,
    ...over,
  });
}

/** The body in the posture in which its measures are defined, buttock at z = 0, seat at y = 0. */
function measured(means: FigureMeans): MannequinMesh {
  return mannequinMesh({
    ...seated(means),
    stance: measuringStance(readFigure(means)),
    placement: { originMm: [0, 0, 0], facingRad: 0, tiltRad: 0 },
  });
}

/** Greatest value of an axis over the vertices that pass. */
function most(
  mesh: MannequinMesh,
  axis: 0 | 1 | 2,
  keep: (x: number, y: number, z: number) => boolean,
): number {
  let best = -Infinity;
  const p = mesh.positions;
  for (let i = 0; i < p.length; i += 3) {
    if (keep(p[i]!, p[i + 1]!, p[i + 2]!)) best = Math.max(best, p[i + axis]!);
  }
  return best;
}

function least(
  mesh: MannequinMesh,
  axis: 0 | 1 | 2,
  keep: (x: number, y: number, z: number) => boolean,
): number {
  let best = Infinity;
  const p = mesh.positions;
  for (let i = 0; i < p.length; i += 3) {
    if (keep(p[i]!, p[i + 1]!, p[i + 2]!)) best = Math.min(best, p[i + axis]!);
  }
  return best;
}

const bodies: [string, FigureMeans][] = (['women', 'men'] as const).flatMap((sex) =>
  (['mean', 'p5', 'p95'] as const).map((which): [string, FigureMeans] => [
    `${sex}, ${which}`,
    surveyBody(sex, which),
  ]),
);

describe('the skin in the measuring posture', () => {
  // Oracle: the measures themselves, ANSUR II summary statistics (NATICK/TR-15/007).
  it.each(bodies)('has the measures of the survey body %s', (_, means) => {
    const mesh = measured(means);
    const m = means as Record<MeasureKey, number>;
    const near = (found: number, key: MeasureKey): void => {
      expect(
        Math.abs(found - m[key]),
        `${key}: drawn ${found.toFixed(1)}, wanted ${m[key].toFixed(1)}`,
      ).toBeLessThan(5);
    };
    const all = (): boolean => true;
    near(most(mesh, 1, all), 'sitting_height');
    near(2 * most(mesh, 0, (_x, y) => y < 0.6 * m.elbow_rest_height), 'hip_breadth_sitting');
    near(2 * most(mesh, 0, (_x, y) => y > 0.79 * m.acromial_height_sitting), 'bideltoid_breadth');
    near(-least(mesh, 1, all), 'popliteal_height');
    const inFront = m.buttock_popliteal_length + 12;
    near(
      most(
        mesh,
        1,
        (x, y, z) =>
          z > inFront && y < 0.5 * m.elbow_rest_height + 40 && Math.abs(x) < 0.3 * m.hip_breadth_sitting,
      ) + m.popliteal_height,
      'knee_height_sitting',
    );
    near(
      most(mesh, 2, (_x, y) => y < 120 && y > -0.5 * m.popliteal_height),
      'buttock_knee_length',
    );
    near(
      least(mesh, 2, (_x, y) => y < -12 && y > -55),
      'buttock_popliteal_length',
    );
    // The back of the belt stands about 28 before the buttock, so this is just in front of the belly.
    const beforeBelly = 30 + m.abdominal_extension_depth_sitting;
    near(
      most(
        mesh,
        1,
        (x, y, z) =>
          z > beforeBelly &&
          z < beforeBelly + 60 &&
          y < m.elbow_rest_height - 20 &&
          Math.abs(x) < 0.4 * m.hip_breadth_sitting,
      ),
      'thigh_clearance',
    );
    near(
      least(
        mesh,
        1,
        (x, y, z) =>
          z < 0.42 * m.chest_depth + 50 &&
          Math.abs(x) > 0.48 * m.forearm_forearm_breadth - 40 &&
          y > m.thigh_clearance,
      ),
      'elbow_rest_height',
    );
  });

  it('puts the rearmost buttock at the back and the thighs on the seat', () => {
    const mesh = measured(surveyBody('men', 'mean'));
    expect(Math.abs(least(mesh, 2, (_x, y) => y > 5 && y < 200))).toBeLessThan(6);
    expect(least(mesh, 1, (_x, _y, z) => z < 380)).toBeGreaterThanOrEqual(0);
  });
});

describe('the mesh', () => {
  it('is closed: every edge is walked once each way', () => {
    const { positions, indices } = measured(surveyBody('women', 'mean'));
    const points = new Map<string, number>();
    const idOf = Array.from({ length: positions.length / 3 }, (_, v) => {
      const key = Array.from(positions.subarray(v * 3, v * 3 + 3), (x) => x.toFixed(4)).join(' ');
      if (!points.has(key)) points.set(key, points.size);
      return points.get(key)!;
    });
    const edges = new Set<number>();
    let twice = 0;
    for (let i = 0; i < indices.length; i++) {
      const a = idOf[indices[i]!]!;
      const b = idOf[indices[i % 3 === 2 ? i - 2 : i + 1]!]!;
      const edge = a * points.size + b;
      if (edges.has(edge)) twice++;
      edges.add(edge);
    }
    const open = [...edges].filter((edge) => {
      const back = (edge % points.size) * points.size + Math.floor(edge / points.size);
      return !edges.has(back);
    });
    expect(twice).toBe(0);
    expect(open).toEqual([]);
  });

  it('looks outwards: it encloses a volume close to the body mass at water density', () => {
    const means = surveyBody('men', 'mean');
    const { positions: p, indices } = measured(means);
    let volume = 0;
    for (let t = 0; t < indices.length; t += 3) {
      const [a, b, c] = [indices[t]! * 3, indices[t + 1]! * 3, indices[t + 2]! * 3];
      volume +=
        p[a]! * (p[b + 1]! * p[c + 2]! - p[b + 2]! * p[c + 1]!) -
        p[a + 1]! * (p[b]! * p[c + 2]! - p[b + 2]! * p[c]!) +
        p[a + 2]! * (p[b]! * p[c + 1]! - p[b + 1]! * p[c]!);
    }
    const litresPerKg = volume / 6 / 1e6 / means.weight_kg!;
    expect(litresPerKg).toBeGreaterThan(0.75);
    expect(litresPerKg).toBeLessThan(1.1);
  });

  it('has unit normals, between 6 000 and 15 000 triangles, and a tag on every vertex', () => {
    const mesh = measured(surveyBody('men', 'mean'));
    expect(mesh.indices.length / 3).toBeGreaterThan(6000);
    expect(mesh.indices.length / 3).toBeLessThan(15000);
    for (let i = 0; i < mesh.normals.length; i += 3) {
      expect(Math.hypot(mesh.normals[i]!, mesh.normals[i + 1]!, mesh.normals[i + 2]!)).toBeCloseTo(1, 4);
    }
    expect(new Set(mesh.tags).size).toBe(MANNEQUIN_TAGS.length);
    expect(mesh.groups.reduce((sum, group) => sum + group.count, 0)).toBe(mesh.indices.length);
  });

  it('is the mirror image of itself', () => {
    const mesh = measured(surveyBody('women', 'p5'));
    expect(most(mesh, 0, () => true)).toBeCloseTo(-least(mesh, 0, () => true), 3);
  });

  it.each([
    ['the tallest, lightest man', bodyOf('men', 1990, 52)],
    ['a short, very heavy man', bodyOf('men', 1500, 160)],
    ['a short, light woman', bodyOf('women', 1410, 36)],
    ['a tall, very heavy woman', bodyOf('women', 1830, 150)],
    ['all first percentiles', surveyBody('women', 'p1')],
    ['all ninety-ninth percentiles', surveyBody('men', 'p99')],
  ])('stays finite for %s', (_, means) => {
    const pose = seated(means, {
      situation: { ...LEVEL_SEAT, backLeanRad: 0.3, seatTiltRad: 0.1, table: { topMm: 740, overlapMm: 80 } },
    });
    const mesh = mannequinMesh(pose);
    expect(mesh.positions.every(Number.isFinite)).toBe(true);
    expect(mesh.normals.every(Number.isFinite)).toBe(true);
    for (const joint of Object.values(pose.joints)) expect(joint.every(Number.isFinite)).toBe(true);
  });
});

describe('sitting down', () => {
  const man = surveyBody('men', 'mean');
  const stand = (seatMm: number, shoeMm = 25): MannequinPose =>
    seated(man, { shoeMm, frame: { hipMm: [0, seatMm, 135], facingRad: 0 } });

  it('hangs by what the seat is higher than popliteal height and shoe', () => {
    expect(stand(man.popliteal_height! + 25 + 60).heelGapMm).toBeCloseTo(60, 6);
    expect(stand(man.popliteal_height! + 25 + 60).notes[0]).toEqual({
      kind: 'feet-hang',
      valueMm: expect.closeTo(60, 6),
    });
    expect(stand(man.popliteal_height! + 25).heelGapMm).toBeCloseTo(0, 6);
  });

  it('sinks with the cushion: 20 mm of foam take 20 mm off the gap, the eye and the head', () => {
    const frame = { hipMm: [0, 540, 135] as const, facingRad: 0 };
    const firm = seated(man, { frame });
    const soft = seated(man, { frame, sinkMm: 20 });
    expect(firm.heelGapMm - soft.heelGapMm).toBeCloseTo(20, 6);
    expect(firm.eyeMm - soft.eyeMm).toBeCloseTo(20, 6);
    expect(firm.headTopMm - soft.headTopMm).toBeCloseTo(20, 6);
  });

  it('has eye and head at the measures over the pressed seat when upright', () => {
    const pose = stand(450);
    expect(pose.eyeMm - 450).toBeCloseTo(man.eye_height_sitting!, 6);
    expect(pose.headTopMm - 450).toBeCloseTo(man.sitting_height!, 6);
  });

  it.each([300, 360, 420, 450, 480])('stands on the floor, not through it, on a seat of %i mm', (seatMm) => {
    const pose = stand(seatMm);
    const lowest = least(mannequinMesh(pose), 1, () => true);
    expect(lowest - pose.heelGapMm).toBeGreaterThan(-pose.heelGapMm - 1);
    if (pose.heelGapMm === 0) expect(Math.abs(lowest)).toBeLessThan(2);
  });

  it('slides forward on a seat that is too deep and says so', () => {
    const depth = man.buttock_popliteal_length! + 20;
    const pose = seated(man, { situation: { ...LEVEL_SEAT, effectiveDepthMm: depth } });
    expect(pose.notes[0]?.kind).toBe('slides-forward');
    expect(pose.notes[0]?.valueMm).toBeCloseTo(70, 6);
    expect(pose.placement.originMm[2]).toBeCloseTo(70, 6);
  });

  it('keeps the links: knees, elbows and wrists are as far apart as the body says', () => {
    const upright = seated(man).joints;
    const bent = seated(man, {
      frame: { hipMm: [500, 380, 100], facingRad: 2 },
      situation: { ...LEVEL_SEAT, backLeanRad: 0.2, seatTiltRad: 0.05, table: { topMm: 720, overlapMm: 60 } },
    }).joints;
    const gap = (a: readonly number[], b: readonly number[]): number =>
      Math.hypot(...a.map((v, i) => v - b[i]!));
    for (const [from, to] of [
      ['leftKnee', 'leftAnkle'],
      ['leftHip', 'leftKnee'],
      ['leftShoulder', 'leftElbow'],
      ['rightElbow', 'rightWrist'],
    ] as const) {
      expect(gap(bent[from], bent[to])).toBeCloseTo(gap(upright[from], upright[to]), 3);
    }
  });

  it('lays the forearms on a table in reach and on the lap otherwise', () => {
    const at = (overlapMm: number): MannequinPose =>
      seated(man, {
        frame: { hipMm: [0, 450, 135], facingRad: 0 },
        situation: { ...LEVEL_SEAT, effectiveDepthMm: 440, table: { topMm: 740, overlapMm } },
      });
    const near = at(75);
    expect(near.notes.map((n) => n.kind)).toContain('forearms-on-table');
    expect(near.joints.leftWrist[1]).toBeGreaterThan(740);
    expect(near.joints.leftWrist[2]).toBeGreaterThan(440 - 75);
    expect(at(-500).notes.map((n) => n.kind)).toContain('hands-on-lap');
  });

  it('turns with the place: moving and turning the frame moves every joint alike', () => {
    const here = seated(man).joints;
    const there = seated(man, {
      frame: { hipMm: [1000, man.popliteal_height!, 2000], facingRad: Math.PI / 2 },
    }).joints;
    expect(there.leftKnee[0] - 1000).toBeCloseTo(here.leftKnee[2] - 135, 6);
    expect(there.leftKnee[1]).toBeCloseTo(here.leftKnee[1], 6);
    expect(there.leftKnee[2] - 2000).toBeCloseTo(-here.leftKnee[0], 6);
  });

  it('names a measure it cannot do without', () => {
    expect(() => seated({ ...man, thigh_clearance: undefined })).toThrow(/thigh_clearance/);
  });
});
