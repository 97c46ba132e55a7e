import { describe, expect, it } from 'vitest';
import jointFile from '@settlewright/seed-data/joint-ranges.json' with { type: 'json' };
import { personAt } from '../../test/seated-room.ts';
import { jointWarnings } from '../mannequin/joint-angles.ts';
import { readJointRanges } from '../mannequin/joint-ranges.ts';
import { poseMannequin, type MannequinPose } from '../mannequin/pose.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { feetClear } from './feet-clear.ts';
import { gapBetween } from './gap.ts';
import { segmentShape } from './solids.ts';

const STILL = { backMm: 0, leftMm: 0 };
const man = personAt('men', 95);
const woman = personAt('women', 50);

/** Somebody on a stool whose crook of the knee is as high as the seat; facing 0 looks along +z. */
const sit = (
  means: typeof man,
  zMm: number,
  facingRad: number,
  over: Partial<Parameters<typeof poseMannequin>[0]> = {},
): MannequinPose =>
  poseMannequin({
    means,
    shoeMm: 25,
    frame: { hipMm: [0, means.popliteal_height + 10, zMm], facingRad },
    situation: { effectiveDepthMm: 380, seatTiltRad: 0, backLeanRad: 0.1, backTopMm: 1000 },
    sinkMm: 0,
    ...over,
  });

const feetOf = ({ segments }: MannequinPose) =>
  segments.filter(({ tag }) => tag === 'shoe').map((segment) => segmentShape(segment));
const gapOfFeet = (one: MannequinPose, other: MannequinPose): number =>
  Math.min(...feetOf(one).flatMap((a) => feetOf(other).map((b) => gapBetween(a, b)!.distanceMm)));
const lowerLegsOf = ({ segments }: MannequinPose) =>
  segments.filter(({ name }) => /shin|foot/.test(name)).map((segment) => segmentShape(segment));
const gapOfLegs = (one: MannequinPose, other: MannequinPose): number =>
  Math.min(...lowerLegsOf(one).flatMap((a) => lowerLegsOf(other).map((b) => gapBetween(a, b)!.distanceMm)));
const toe = (pose: MannequinPose): number => Math.max(...feetOf(pose).map(({ maxMm }) => maxMm[2]));

const post = (zMm: number, xMm = 0): Part => ({
  id: 'post',
  pieceId: 't1',
  role: 'column',
  material: 'oak',
  solid: { shape: 'box', sizeMm: [400, 700, 60] },
  positionMm: [xMm, 350, zMm],
  rotationRad: [0, 0, 0],
});

describe('feet keep clear of what is before them', () => {
  const apart = (zMm: number): [MannequinPose, MannequinPose] => [sit(man, 0, 0), sit(woman, zMm, Math.PI)];
  /** Where hips of both stand so that their toes are so far into each other. */
  const distance = (overlapMm: number): number => {
    const [one, other] = apart(0);
    return toe(one) - Math.min(...feetOf(other).map(({ minMm }) => minMm[2])) - overlapMm;
  };

  it('draws back those opposite each other alike, until there is room between them', () => {
    const zMm = distance(60);
    const [one, other] = apart(zMm);
    expect(gapOfFeet(one, other)).toBeLessThan(-30);
    const feet = feetClear([one, other], []);
    expect(feet[0]).toEqual(feet[1]);
    const { backMm, leftMm } = feet[0]!;
    expect(backMm).toBeGreaterThanOrEqual(30);
    expect(backMm).toBeLessThanOrEqual(45);
    expect(leftMm).toBe(0);
    const drawn = [sit(man, 0, 0, { feet: feet[0]! }), sit(woman, zMm, Math.PI, { feet: feet[1]! })] as const;
    expect(gapOfFeet(...drawn)).toBeGreaterThan(5);
    expect(Math.abs(toe(one) - toe(drawn[0]) - backMm)).toBeLessThan(1);
    expect(drawn[0].notes).toContainEqual({ kind: 'feet-drawn-back', valueMm: backMm });
    expect(feetClear([other, one], [])).toEqual(feet);
  });

  it('goes past each other, each to their own left, where shins go no further back', () => {
    const zMm = distance(330);
    const [one, other] = apart(zMm);
    const feet = feetClear([one, other], []);
    expect(feet[0]!.leftMm).toBe(feet[1]!.leftMm);
    const { leftMm } = feet[0]!;
    expect(leftMm).toBeGreaterThan(0);
    const drawn = [sit(man, 0, 0, { feet: feet[0]! }), sit(woman, zMm, Math.PI, { feet: feet[1]! })] as const;
    expect(gapOfFeet(...drawn)).toBeGreaterThan(5);
    expect(drawn[0].joints.leftAnkle[0] - one.joints.leftAnkle[0]).toBeCloseTo(leftMm, 0);
    expect(other.joints.leftAnkle[0] - drawn[1].joints.leftAnkle[0]).toBeCloseTo(leftMm, 0);
    expect(drawn[0].notes.map(({ kind }) => kind)).toEqual(
      expect.arrayContaining(['feet-drawn-back', 'feet-aside']),
    );
    expect(jointWarnings(drawn[0], readJointRanges(jointFile))).toEqual([]);
  });

  it('leaves feet that are clear, and those that look the same way', () => {
    expect(feetClear(apart(distance(-30)), [])).toEqual([STILL, STILL]);
    for (const facingRad of [0, 1.57, -1.57, 3]) {
      const beside = [0, 240].map((mm) => {
        const hipMm: Vec3 = [Math.cos(facingRad) * mm, man.popliteal_height + 10, -Math.sin(facingRad) * mm];
        return sit(man, 0, facingRad, { frame: { hipMm, facingRad } });
      }) as [MannequinPose, MannequinPose];
      expect(gapOfFeet(...beside)).toBeLessThan(10);
      expect(feetClear(beside, [])).toEqual([STILL, STILL]);
    }
  });

  it('moves one alone where the other has crossed ankles or feet on a rail', () => {
    const zMm = distance(40);
    const crossed = sit(man, 0, 0, { choice: { feet: 'ankles-crossed' } });
    const [stays, goes] = feetClear([crossed, sit(woman, zMm, Math.PI)], []);
    expect(stays).toEqual(STILL);
    expect(goes!.backMm).toBeGreaterThan(30);
    expect(feetClear([sit(woman, zMm, Math.PI), crossed], [])).toEqual([goes, stays]);
  });

  it('never brings anybody nearer than they were, whoever was seated first', () => {
    let seed = 1;
    const random = (): number => (seed = (seed * 16807) % 2147483647) / 2147483647;
    for (let n = 0; n < 40; n++) {
      const seatMm = 380 + 120 * random();
      const between = 900 + 350 * random();
      const people = [0, 1].flatMap((row) =>
        [0, 1, 2].map((column) => {
          const means = personAt(random() < 0.5 ? 'men' : 'women', 1 + Math.floor(98 * random()));
          const facingRad = row * Math.PI;
          const hipMm: Vec3 = [column * (480 + 100 * random()), seatMm, row * between];
          const feet = random() < 0.2 ? 'ankles-crossed' : undefined;
          const over = { frame: { hipMm, facingRad }, choice: { feet } as const };
          return { means, facingRad, over };
        }),
      );
      const alone = people.map(({ means, facingRad, over }) => sit(means, 0, facingRad, over));
      const feet = feetClear(alone, []);
      const there = people.map(({ means, facingRad, over }, i) =>
        sit(means, 0, facingRad, { ...over, feet: feet[i]! }),
      );
      for (let i = 0; i < 6; i++) {
        for (let j = i + 1; j < 6; j++) {
          const [was, is] = [gapOfLegs(alone[i]!, alone[j]!), gapOfLegs(there[i]!, there[j]!)];
          expect(is).toBeGreaterThan(Math.min(was, 10) - 3);
        }
      }
      expect(feetClear([...alone].reverse(), []).reverse()).toEqual(feet);
    }
  });

  it('goes back from a post, as far as another behind the heels lets it', () => {
    const one = sit(man, 0, 0);
    const before = post(toe(one) + 10);
    const [{ backMm } = STILL] = feetClear([one], [before]);
    expect(backMm).toBeGreaterThanOrEqual(30);
    expect(backMm).toBeLessThanOrEqual(40);
    const heel = Math.min(...feetOf(one).map(({ minMm }) => minMm[2]));
    expect(feetClear([one], [before, { ...post(heel - 45), id: 'riser' }])).toEqual([STILL]);
  });

  it('stays where going back frees nothing: a wall beside, a post further in than shins go', () => {
    const one = sit(man, 0, 0);
    const wall: Part = {
      ...post(0),
      solid: { shape: 'box', sizeMm: [20, 2000, 4000] },
      positionMm: [Math.max(...feetOf(one).map(({ maxMm }) => maxMm[0])), 1000, 0],
    };
    expect(feetClear([one], [wall])).toEqual([STILL]);
    expect(feetClear([one], [post(toe(one) - 250)])).toEqual([STILL]);
  });

  it('keeps soles on the floor and thighs near the seat while feet go back, on low and high seats', () => {
    for (const seatMm of [man.popliteal_height - 60, man.popliteal_height, man.popliteal_height + 24]) {
      const frame = { hipMm: [0, seatMm, 135] as const, facingRad: 0 };
      const usual = sit(man, 0, 0, { frame });
      for (const backMm of [20, 60, 100]) {
        const drawn = sit(man, 0, 0, { frame, feet: { backMm, leftMm: 0 } });
        const went = usual.joints.leftAnkle[2] - drawn.joints.leftAnkle[2];
        expect(Math.abs(went - backMm)).toBeLessThan(2);
        expect(Math.abs(Math.min(...feetOf(drawn).map(({ minMm }) => minMm[1])))).toBeLessThan(6);
        // A shin that stands up from leaning forwards lifts the knee.
        const rise = drawn.joints.leftKnee[1] - usual.joints.leftKnee[1];
        expect(rise).toBeGreaterThan(-0.1);
        expect(rise).toBeLessThan(45);
      }
    }
  });
});
