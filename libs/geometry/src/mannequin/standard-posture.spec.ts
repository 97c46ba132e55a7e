import { describe, expect, it } from 'vitest';
import jointFile from '@settlewright/seed-data/joint-ranges.json' with { type: 'json' };
import { furthest, LineCaster } from '../../test/mesh-rays.ts';
import { builds, percentilePeople } from '../../test/survey-like-people.ts';
import { jointAngles, jointWarnings } from './joint-angles.ts';
import { readJointRanges } from './joint-ranges.ts';
import { mannequinMesh } from './mesh.ts';
import { poseMannequin, type MannequinPose } from './pose.ts';
import type { FigureMeans } from './figure.ts';

const SHOE_MM = 25;
const ranges = readJointRanges(jointFile);
const people = percentilePeople([1, 5, 50, 95, 99]);
type Over = Partial<Parameters<typeof poseMannequin>[0]>;

/** A level seat as high as the crook of the knee with shoes on, upright, arms as bodies are measured. */
function standard(means: FigureMeans, over: Over = {}): MannequinPose {
  return poseMannequin({
    means,
    shoeMm: SHOE_MM,
    frame: { hipMm: [0, means.popliteal_height! + SHOE_MM, 135], facingRad: 0 },
    situation: { effectiveDepthMm: 380, seatTiltRad: 0, backLeanRad: 0, backTopMm: 1000 },
    sinkMm: 0,
    choice: { arms: 'level' },
    ...over,
  });
}

describe('a body in the standard posture', () => {
  it.each(people)('has eye, elbow and knee where the measures put them: %s', (_, means) => {
    const seat = means.popliteal_height + SHOE_MM;
    const pose = standard(means);
    const mesh = mannequinMesh(pose);
    const arm = pose.segments.find(({ name }) => name === 'left upper arm');
    const elbow = arm?.kind === 'rounded-cone' ? arm.toMm : pose.joints.leftElbow;
    const under = new LineCaster(mesh, 1)
      .inside(...elbow)
      .find(({ from, to }) => from < elbow[1] && to > elbow[1])!.from;
    const kneeTop = furthest(
      mesh,
      1,
      1,
      { axis: 2, from: means.buttock_popliteal_length + 15, to: means.buttock_knee_length },
      (x, y) => x > 0 && y < seat + 200,
    );
    const found = { eye: pose.eyeMm, elbow: under, knee: kneeTop };
    const wanted = {
      eye: seat + means.eye_height_sitting,
      elbow: seat + means.elbow_rest_height,
      knee: means.knee_height_sitting + SHOE_MM,
    };
    for (const key of ['eye', 'elbow', 'knee'] as const) {
      expect(Math.abs(found[key] - wanted[key]), `${key} ${found[key]} ${wanted[key]}`).toBeLessThan(5);
    }
  });

  // Fractions of stature of the arm's links, mean and standard deviation: ANSUR II (NATICK/TR-15/007, public data),
  // acromion to radiale, radiale to stylion, hand length.
  const ARM_RATIOS = {
    women: { 'upper arm': [0.1911, 0.0065], forearm: [0.1482, 0.0068], hand: [0.1112, 0.0047] },
    men: { 'upper arm': [0.1909, 0.0061], forearm: [0.1525, 0.0061], hand: [0.1101, 0.0042] },
  } as const;
  // Thigh, shank and foot: the same survey and Drillis and Contini 1966 as tabled in textbooks of biomechanics.
  const LEG_RATIOS = {
    thigh: [0.233, 0.245, 0.08],
    shank: [0.2384, 0.2475, 0.08],
    foot: [0.1513, 0.1544, 0.08],
  } as const;
  const linkOf = (means: FigureMeans) => {
    const { joints } = standard(means);
    return (a: keyof typeof joints, b: keyof typeof joints): number =>
      Math.hypot(...joints[a].map((x, i) => x - joints[b][i]!)) / means.stature!;
  };

  it.each([...people, ...builds()])(
    'has arms within one deviation of the published ones: %s',
    (who, means) => {
      const { joints } = standard(means);
      const link = linkOf(means);
      const acromion = [
        means.biacromial_breadth / 2,
        means.popliteal_height + SHOE_MM + means.acromial_height_sitting,
      ];
      const shares = {
        'upper arm':
          Math.hypot(joints.leftElbow[0] - acromion[0]!, joints.leftElbow[1] - acromion[1]!) / means.stature,
        forearm: link('leftElbow', 'leftWrist'),
        hand: link('leftWrist', 'leftFingertip'),
      };
      const ratios = ARM_RATIOS[who.includes('women') ? 'women' : 'men'];
      const strays = (Object.keys(shares) as (keyof typeof shares)[]).filter(
        (name) => Math.abs(shares[name] - ratios[name][0]) > ratios[name][1],
      );
      expect(strays.map((name) => `${name} ${shares[name].toFixed(4)}`)).toEqual([]);
    },
  );

  it.each(people)('has legs in the published proportions: %s', (_, means) => {
    const link = linkOf(means);
    const shares: Record<keyof typeof LEG_RATIOS, number> = {
      thigh: link('pelvis', 'leftKnee'),
      shank: link('leftKnee', 'leftAnkle'),
      foot: link('leftHeel', 'leftToe'),
    };
    const strays = (Object.keys(LEG_RATIOS) as (keyof typeof LEG_RATIOS)[]).filter((name) => {
      const [low, high, within] = LEG_RATIOS[name];
      return shares[name] < (1 - within) * low || shares[name] > (1 + within) * high;
    });
    expect(strays.map((name) => `${name} ${shares[name].toFixed(4)}`)).toEqual([]);
  });
});

describe('bends of the joints', () => {
  it('are what the posture says: hips, knees and elbows square, ankles and shoulders at rest', () => {
    const [, means] = people[2]!;
    const of = Object.fromEntries(
      jointAngles(standard(means))
        .filter(({ side }) => side !== 'right')
        .map(({ joint, motion, deg }) => [`${joint} ${motion}`, deg]),
    );
    expect(of['hip flexion']).toBeCloseTo(90, 6);
    expect(of['knee flexion']).toBeCloseTo(90, 0);
    expect(Math.abs(of['ankle plantar flexion']!)).toBeLessThan(3);
    expect(Math.abs(of['elbow flexion']! - 90)).toBeLessThan(6);
    expect(Math.abs(of['shoulder flexion']!)).toBeLessThan(6);
    expect(Math.abs(of['wrist flexion']!)).toBeLessThan(1);
  });

  it('stay within the published ranges in every posture people sit in', () => {
    for (const [, means] of people) {
      const table = { topMm: means.popliteal_height + means.elbow_rest_height + 60, overlapMm: 60 };
      for (const arms of ['lap', 'table', 'cup', 'level'] as const) {
        const situation = {
          effectiveDepthMm: 420,
          seatTiltRad: 0.05,
          backLeanRad: 0.2,
          backTopMm: 1000,
          table,
        };
        expect(jointWarnings(standard(means, { situation, choice: { arms } }), ranges)).toEqual([]);
      }
    }
  });

  it('are warned of with their source when a range is narrower', () => {
    const [, means] = people[2]!;
    const pose = standard(means);
    const narrow = {
      ...ranges,
      limits: [{ ...ranges.limits.find(({ joint }) => joint === 'knee')!, deg: 80 }],
    };
    const [warning, ...others] = jointWarnings(pose, narrow);
    expect(others).toEqual([]);
    expect(warning).toMatchObject({ joint: 'knee', motion: 'flexion', limitDeg: 80 });
    expect(warning!.source.mark).toBe('RETRIEVED');
  });

  it('keep to the table they were read from', () => {
    const of = Object.fromEntries(ranges.limits.map(({ joint, motion, deg }) => [`${joint} ${motion}`, deg]));
    expect(of).toEqual({
      'shoulder flexion': 180,
      'shoulder extension': 60,
      'shoulder abduction': 180,
      'elbow flexion': 150,
      'wrist flexion': 80,
      'wrist extension': 70,
      'hip adduction': 30,
      'hip flexion': 125,
      'knee flexion': 130,
      'hip rotation': 45,
      'ankle plantar flexion': 50,
      'ankle dorsiflexion': 20,
    });
  });
});
