import { createBodyModel, readChildren } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import childrenFile from '@settlewright/seed-data/populations/children.json' with { type: 'json' };
import { furthest } from '../../test/mesh-rays.ts';
import { selfCrossings, visibleCrossings } from '../../test/self-crossings.ts';
import { bodyRange, ghostPoses } from './body-range.ts';
import { mannequinMesh } from './mesh.ts';
import { poseMannequin, type MannequinPose } from './pose.ts';

const model = createBodyModel(survey);
const woman = model
  .predict(model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 50 }))
  .means();
const place = (seatMm: number) => ({
  frame: { hipMm: [0, seatMm, 135] as const, facingRad: 0 },
  situation: { effectiveDepthMm: 400, seatTiltRad: 0, backLeanRad: 0.1, backTopMm: 1000 },
  sinkMm: 0,
});
const sitting = (over: { shoeMm?: number; forefootMm?: number; slumpMm?: number } = {}): MannequinPose => {
  const shoeMm = over.shoeMm ?? 25;
  return poseMannequin({
    means: woman,
    ...place(woman.popliteal_height + shoeMm),
    ...over,
    shoeMm,
  });
};
const everywhere = { axis: 1, from: -3000, to: 3000 } as const;

describe('slump', () => {
  // 40 mm off sitting, eye and shoulder heights for a relaxed posture: City University of Hong Kong, Online
  // Anthropometry, chapter 1 and item 10.
  it.each([20, 40])('lowers eye and head by %i mm', (slumpMm) => {
    const upright = sitting();
    const relaxed = sitting({ slumpMm });
    expect(Math.abs(upright.eyeMm - relaxed.eyeMm - slumpMm)).toBeLessThan(2);
    expect(Math.abs(upright.headTopMm - relaxed.headTopMm - slumpMm)).toBeLessThan(2);
    const tops = [upright, relaxed].map((pose) => furthest(mannequinMesh(pose), 1, 1, everywhere));
    // The neck draws the crown a little with it.
    expect(Math.abs(tops[0]! - tops[1]! - slumpMm)).toBeLessThan(6);
  });

  it('moves the pelvis forward and leaves shoulders and back behind it', () => {
    const upright = sitting();
    const relaxed = sitting({ slumpMm: 40 });
    expect(relaxed.joints.pelvis[2]).toBeGreaterThan(upright.joints.pelvis[2] + 20);
    const rear = [upright, relaxed].map((pose) =>
      furthest(mannequinMesh(pose), 2, -1, { axis: 1, from: 500, to: 1000 }),
    );
    expect(rear[1]!).toBeGreaterThan(rear[0]! - 25);
  });

  it('does not run through itself', () => {
    const mesh = mannequinMesh(sitting({ slumpMm: 40 }));
    expect(visibleCrossings(mesh, selfCrossings(mesh))).toEqual([]);
  });
});

describe('heels', () => {
  const instep = (pose: MannequinPose): number => {
    const mesh = mannequinMesh(pose);
    const toe = pose.joints.leftToe;
    return furthest(mesh, 1, 1, { axis: 2, from: toe[2] - 75, to: toe[2] - 60 }, (x, y) => x > 0 && y < 250);
  };

  it('raise the ankle by the heel and keep the sole on the floor', () => {
    const flat = sitting({ shoeMm: 25 });
    const heel = sitting({ shoeMm: 70, forefootMm: 15 });
    expect(heel.joints.leftAnkle[1] - flat.joints.leftAnkle[1]).toBeCloseTo(45, 6);
    expect(Math.abs(furthest(mannequinMesh(heel), 1, -1, everywhere))).toBeLessThan(2);
  });

  it('run down to the ball: the foot over it rises by the sole, not by the heel', () => {
    const flat = sitting({ shoeMm: 15, forefootMm: 15 });
    const heel = sitting({ shoeMm: 70, forefootMm: 15 });
    expect(Math.abs(instep(heel) - instep(flat))).toBeLessThan(9);
  });
});

describe('the far mesh', () => {
  it('has less than a third of the triangles and stays near the near one', () => {
    const pose = sitting();
    const [near, far] = [mannequinMesh(pose), mannequinMesh(pose, 'far')];
    expect(near.indices.length / 3).toBeGreaterThan(14_000);
    expect(near.indices.length / 3).toBeLessThan(15_500);
    expect(far.indices.length).toBeLessThan(near.indices.length / 3);
    for (const axis of [0, 1, 2] as const) {
      for (const sign of [1, -1] as const) {
        const ends = [near, far].map((mesh) => furthest(mesh, axis, sign, everywhere));
        expect(Math.abs(ends[0]! - ends[1]!)).toBeLessThan(12);
      }
    }
  });
});

describe('ghosts of what is not known', () => {
  const told = model.predict({
    bodyData: 'women',
    stature: { mm: 1640, source: 'measured' },
    measured: { elbow_rest_height: 240 },
    shoeMm: 25,
    clothing: 'light',
  });

  it('keep what was taken and spread what was not, the larger never below the smaller', () => {
    const range = bodyRange(told);
    expect(range.uncertain).not.toContain('stature');
    expect(range.uncertain).not.toContain('elbow_rest_height');
    expect(range.smaller.elbow_rest_height).toBe(240);
    for (const key of range.uncertain) expect(range.larger[key]!).toBeGreaterThan(range.smaller[key]!);
    const best = told.means();
    for (const key of range.uncertain) {
      expect(best[key]).toBeGreaterThan(range.smaller[key]!);
      expect(best[key]).toBeLessThan(range.larger[key]!);
    }
  });

  it('are two bodies around the drawn one, and none where everything is known', () => {
    const at = { ...place(430), shoeMm: 25 };
    const ghosts = ghostPoses(bodyRange(told), at)!;
    const drawn = poseMannequin({ ...at, means: told.means() });
    const hips = [ghosts.smaller, drawn, ghosts.larger].map((pose) =>
      furthest(mannequinMesh(pose, 'far'), 0, 1, { axis: 1, from: 440, to: 560 }),
    );
    expect(hips[1]! - hips[0]!).toBeGreaterThan(5);
    expect(hips[2]! - hips[1]!).toBeGreaterThan(5);
    const exact = model.predict(model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 5 }));
    expect(ghostPoses(bodyRange(exact), at)).toBeUndefined();
  });

  it('can be posed and drawn whole for anybody of whom nothing was told', () => {
    for (const bodyData of ['women', 'men', 'mixed'] as const) {
      const nobody = model.predict({ bodyData, measured: {}, shoeMm: 25, clothing: 'light' });
      const ghosts = ghostPoses(bodyRange(nobody), { ...place(430), shoeMm: 25 })!;
      for (const pose of [ghosts.smaller, ghosts.larger]) {
        expect(mannequinMesh(pose, 'far').positions.every(Number.isFinite)).toBe(true);
      }
    }
  });
});

describe('children', () => {
  const withChildren = createBodyModel(survey, childrenFile);

  it.each(readChildren(childrenFile).marks)(
    'of size mark $mark sit on its seat with their feet down',
    (mark) => {
      const child = withChildren.child(mark.mark);
      const means = withChildren.predict(child).means();
      const pose = poseMannequin({ means, shoeMm: child.shoeMm, ...place(mark.seatHeightMm) });
      expect(mannequinMesh(pose).positions.every(Number.isFinite)).toBe(true);
      expect(pose.heelGapMm).toBeLessThan(20);
      expect(pose.headTopMm).toBeGreaterThan(0.68 * means.stature);
    },
  );
});
