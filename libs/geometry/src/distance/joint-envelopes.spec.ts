import { describe, expect, it } from 'vitest';
import jointFile from '@settlewright/seed-data/joint-ranges.json' with { type: 'json' };
import { personAt, seated, setOf } from '../../test/seated-room.ts';
import { readJointRanges } from '../mannequin/joint-ranges.ts';
import { footRailOf } from '../mannequin/foot-rail.ts';
import type { Part } from '../parts/part.ts';
import { envelopeGap, jointEnvelopes } from './joint-envelopes.ts';

const ranges = readJointRanges(jointFile);
const { document } = setOf([
  ['bench', { xMm: 0, zMm: 0, turnDeg: 0 }, { lengthMm: 1800, 'places.count': 2 }],
]);
const { bodies } = seated(document, [personAt('men', 50)]);
const { pose } = bodies[0]!;
const envelopes = jointEnvelopes(pose, ranges);
const of = (joint: string, side: string) =>
  envelopes.find((one) => one.joint === joint && one.side === side)!;

const wallAt = (xMm: number): Part => ({
  id: 'w/wall-board-1',
  pieceId: 'w',
  role: 'wall-board',
  material: 'wall',
  solid: { shape: 'box', sizeMm: [20, 2000, 2000] },
  positionMm: [xMm + 10, 1000, 300],
  rotationRad: [0, 0, 0],
});

describe('what elbows and knees sweep', () => {
  // The flesh of an elbow reaches as far round its middle; the joint lies within it.
  const { leftShoulder, leftElbow } = pose.joints;
  const link = Math.hypot(...of('elbow', 'left').centresMm[0]!.map((x, i) => x - leftShoulder[i]!));

  it('starts at the joint, keeps the length of the link and says its source', () => {
    const elbow = of('elbow', 'left');
    expect(Math.abs(link - Math.hypot(...leftElbow.map((x, i) => x - leftShoulder[i]!)))).toBeLessThan(
      elbow.radiusMm / 2,
    );
    for (const at of elbow.centresMm) {
      expect(Math.hypot(...at.map((x, i) => x - leftShoulder[i]!))).toBeCloseTo(link, 3);
    }
    expect(elbow.sweep.source.mark).toBe('RETRIEVED');
    expect(of('knee', 'left').sweep.source.mark).toBe('HOUSE RULE');
    const [first] = of('knee', 'left').centresMm;
    expect(Math.hypot(...first!.map((x, i) => x - pose.joints.leftKnee[i]!))).toBeLessThan(1e-6);
  });

  it('reaches as far out as 35 degrees carry the elbow', () => {
    const out = Math.max(...of('elbow', 'left').centresMm.map(([x]) => x));
    expect(out - leftShoulder[0]).toBeCloseTo(link * Math.sin((35 * Math.PI) / 180), 3);
  });

  it('finds a wall at the elbow: room left or how much is missing', () => {
    const elbow = of('elbow', 'left');
    const out = elbow.shape.maxMm[0];
    expect(envelopeGap(elbow, [wallAt(out + 30)], 500)!.distanceMm).toBeCloseTo(30, 1);
    const missing = envelopeGap(elbow, [wallAt(out - 40)], 500)!;
    expect(missing.distanceMm).toBeLessThan(-15);
    expect(missing.thing.partId).toBe('w/wall-board-1');
    expect(envelopeGap(elbow, [wallAt(out + 900)], 500)).toBeUndefined();
  });

  it('finds the wall that is deepest in, whichever comes first', () => {
    const elbow = of('elbow', 'left');
    const out = elbow.shape.maxMm[0];
    const [little, much] = [wallAt(out - 10), wallAt(out - 40)];
    const deepest = envelopeGap(elbow, [much], 500)!.distanceMm;
    expect(deepest).toBeLessThan(envelopeGap(elbow, [little], 500)!.distanceMm - 1);
    expect(envelopeGap(elbow, [little, much], 500)!.distanceMm).toBeCloseTo(deepest, 3);
    expect(envelopeGap(elbow, [much, little], 500)!.distanceMm).toBeCloseTo(deepest, 3);
  });

  it('finds the room inside a hollow part', () => {
    const elbow = of('elbow', 'left');
    const [x, y, z] = elbow.centresMm[0]!;
    const [inside, wall] = [elbow.radiusMm + 400, 20];
    const outside = inside + wall;
    const bay: Part = {
      id: 'bay',
      pieceId: 'w',
      role: 'wall-board',
      material: 'wall',
      positionMm: [x, y, z],
      rotationRad: [0, 0, 0],
      // A bay of three walls round the elbow, open to the right; its hull would hold the elbow.
      solid: {
        shape: 'prism',
        isPanel: true,
        depthMm: 2000,
        outlineMm: [
          [-outside, -outside],
          [outside, -outside],
          [outside, outside],
          [-outside, outside],
          [-outside, inside],
          [inside, inside],
          [inside, -inside],
          [-outside, -inside],
        ],
      },
    };
    const gap = envelopeGap(elbow, [bay], 2000)!;
    const furthest = Math.max(...elbow.centresMm.map((centre) => centre[0]));
    expect(gap.distanceMm).toBeGreaterThan(0);
    expect(gap.distanceMm).toBeLessThanOrEqual(x + inside - furthest - elbow.radiusMm + 0.5);
  });
});

describe('a rail for the feet', () => {
  const rail = (xMm: number, yMm: number): Part => ({
    ...wallAt(0),
    role: 'rail',
    solid: { shape: 'box', sizeMm: [800, 40, 40] },
    positionMm: [xMm, yMm, 600],
  });
  const place = { hipMm: [0, 600, 135], facingRad: 0 } as const;
  it('is the highest one across the way of the soles', () => {
    expect(footRailOf([rail(0, 100), rail(0, 180)], place)).toEqual({ topMm: 200, aheadOfHipMm: 465 });
    expect(footRailOf([rail(900, 180), rail(0, 700)], place)).toBeUndefined();
    const turned = { hipMm: [0, 600, 1065], facingRad: Math.PI } as const;
    expect(footRailOf([rail(0, 180)], turned)!.aheadOfHipMm).toBeCloseTo(465, 6);
  });
});
