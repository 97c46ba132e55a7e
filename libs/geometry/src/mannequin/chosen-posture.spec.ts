import { describe, expect, it } from 'vitest';
import jointFile from '@settlewright/seed-data/joint-ranges.json' with { type: 'json' };
import { builds, percentilePeople } from '../../test/survey-like-people.ts';
import { jointAngles, jointWarnings } from './joint-angles.ts';
import { readFigure } from './figure.ts';
import { readJointRanges } from './joint-ranges.ts';
import { poseMannequin, type MannequinPose, type SeatPosture } from './pose.ts';
import { kneeRadius } from './stance.ts';
import type { PostureChoice } from '../room/posture-choice.ts';

const [, woman] = percentilePeople([50])[0]!;
const figure = readFigure(woman);
const SHOE_MM = 25;
const seatMm = woman.popliteal_height + SHOE_MM;
const situation: SeatPosture = {
  effectiveDepthMm: 400,
  seatTiltRad: 0,
  backLeanRad: 0.15,
  backTopMm: 1000,
  table: { topMm: seatMm + woman.elbow_rest_height + 30, overlapMm: 60 },
};
function sit(
  choice: PostureChoice | undefined,
  over: Partial<SeatPosture> = {},
  liftMm = 0,
  means = woman,
): MannequinPose {
  return poseMannequin({
    means,
    shoeMm: SHOE_MM,
    frame: { hipMm: [0, seatMm + liftMm, 135], facingRad: 0 },
    situation: { ...situation, ...over },
    sinkMm: 0,
    choice,
  });
}
const ranges = readJointRanges(jointFile);
const apart = (pose: MannequinPose, a: keyof MannequinPose['joints'], b: keyof MannequinPose['joints']) =>
  Math.hypot(...pose.joints[a].map((x, i) => x - pose.joints[b][i]!));
/** Legs as long as before, toes over the floor, nothing bent too far, hips turned by so many degrees. */
function expectSound(
  crossed: MannequinPose,
  usual: MannequinPose,
  turn: 'rotation' | 'adduction',
  [least, most]: [number, number],
) {
  for (const side of ['left', 'right'] as const) {
    for (const [from, to] of [
      ['Hip', 'Knee'],
      ['Knee', 'Ankle'],
      ['Ankle', 'Toe'],
    ] as const) {
      const [a, b] = [`${side}${from}`, `${side}${to}`] as const;
      expect(apart(crossed, a, b)).toBeCloseTo(apart(usual, a, b), 6);
    }
    expect(crossed.joints[`${side}Toe`][1]).toBeGreaterThan(-1);
  }
  expect(jointWarnings(crossed, ranges)).toEqual([]);
  const turned = jointAngles(crossed).filter(({ motion }) => motion === turn);
  expect(turned.map(({ side, deg }) => [side, deg > least && deg < most])).toEqual([
    ['left', true],
    ['right', true],
  ]);
}
const kinds = (pose: MannequinPose) => pose.notes.map(({ kind }) => kind);

describe('a posture that somebody chose', () => {
  it('is the usual one when nothing is chosen, and says so when something is', () => {
    expect(kinds(sit(undefined))).toEqual(['forearms-on-table']);
    expect(kinds(sit({}))).toEqual(['forearms-on-table']);
    expect(kinds(sit({ arms: 'lap' }))).toEqual(['hands-on-lap', 'not-as-checked']);
  });

  it('sits upright off a leaning back, or slumps by 40 mm', () => {
    const back = sit({ arms: 'lap' });
    const upright = sit({ arms: 'lap', trunk: 'upright' });
    expect(upright.joints.leftShoulder[2]).toBeGreaterThan(back.joints.leftShoulder[2] + 40);
    expect(kinds(upright)).toContain('sits-upright');
    const slumped = sit({ arms: 'lap', trunk: 'slumped' });
    expect(Math.abs(back.eyeMm - slumped.eyeMm - 40)).toBeLessThan(4);
    expect(kinds(slumped)).toContain('slumps');
  });

  it('moves with the nudge and no further', () => {
    const [from, to] = [sit({ arms: 'lap' }), sit({ arms: 'lap', nudge: { leftMm: 40, aheadMm: -25 } })];
    for (const joint of ['pelvis', 'leftKnee', 'eye'] as const) {
      expect(to.joints[joint][0] - from.joints[joint][0]).toBeCloseTo(40, 6);
      expect(to.joints[joint][2] - from.joints[joint][2]).toBeCloseTo(-25, 6);
    }
  });

  it('has one forearm on a sill in reach: wrist on it and over it, the other arm as before', () => {
    const topMm = seatMm + woman.elbow_rest_height + 25;
    const sill = { topMm, centreToEdgeMm: 230, usableDepthMm: 150 };
    for (const side of ['left', 'right'] as const) {
      const pose = sit({ arms: `sill-${side}` }, { sills: [{ ...sill, side }] });
      expect(pose.notes).toContainEqual({ kind: 'forearm-on-sill', side });
      expect(pose.notes).toContainEqual({
        kind: 'forearms-on-table',
        side: side === 'left' ? 'right' : 'left',
      });
      const wrist = pose.joints[`${side}Wrist`];
      expect(Math.abs(wrist[0])).toBeGreaterThan(230);
      expect(Math.abs(wrist[0])).toBeLessThan(230 + 150);
      expect(wrist[1] - topMm).toBeGreaterThan(10);
      expect(wrist[1] - topMm).toBeLessThan(45);
      expect(Math.sign(wrist[0])).toBe(side === 'left' ? 1 : -1);
      const other = side === 'left' ? 'rightWrist' : 'leftWrist';
      expect(pose.joints[other]).toEqual(sit(undefined).joints[other]);
    }
  });

  it('says when the sill is not there, and leaves the arms as they were', () => {
    const far = { side: 'left', topMm: seatMm + 240, centreToEdgeMm: 900, usableDepthMm: 150 } as const;
    const pose = sit({ arms: 'sill-left' }, { sills: [far] });
    expect(pose.notes).toContainEqual({ kind: 'sill-out-of-reach', side: 'left' });
    expect(pose.joints.leftWrist).toEqual(sit(undefined).joints.leftWrist);
  });

  it('has the right hand at a cup over the table, or says that there is none', () => {
    const pose = sit({ arms: 'cup' });
    expect(kinds(pose)).toContain('hand-to-cup');
    expect(pose.joints.rightFingertip[1] - situation.table!.topMm).toBeGreaterThan(20);
    expect(pose.joints.rightWrist).not.toEqual(sit(undefined).joints.rightWrist);
    expect(pose.joints.leftWrist).toEqual(sit(undefined).joints.leftWrist);
    expect(kinds(sit({ arms: 'cup' }, { table: undefined }))).toContain('table-out-of-reach');
  });

  it('crosses the ankles: each foot beyond the other, links as long as before, nothing bent too far', () => {
    for (const liftMm of [0, -40, 60]) {
      const [usual, crossed] = [sit(undefined, {}, liftMm), sit({ feet: 'ankles-crossed' }, {}, liftMm)];
      expect(kinds(crossed)).toEqual(expect.arrayContaining(['ankles-crossed', 'not-as-checked']));
      const { leftAnkle, rightAnkle, leftKnee, rightKnee } = crossed.joints;
      expect(leftAnkle[0]).toBeLessThan(-30);
      expect(rightAnkle[0]).toBeGreaterThan(30);
      expect(leftAnkle[2]).toBeGreaterThan(rightAnkle[2] + 60);
      expect([leftKnee, rightKnee]).toEqual([usual.joints.leftKnee, usual.joints.rightKnee]);
      expectSound(crossed, usual, 'rotation', [10, 45]);
    }
  });

  it('lays one knee over the other: left over right, links as long as before, nothing bent too far', () => {
    for (const liftMm of [0, -40, 60]) {
      const [usual, crossed] = [sit(undefined, {}, liftMm), sit({ feet: 'knees-crossed' }, {}, liftMm)];
      expect(kinds(crossed)).toEqual(expect.arrayContaining(['knees-crossed', 'not-as-checked']));
      const { leftKnee, rightKnee, leftAnkle, rightAnkle } = crossed.joints;
      expect(leftKnee[0]).toBeLessThan(-40);
      expect(Math.abs(rightKnee[0])).toBeLessThan(1);
      expect(leftKnee[1]).toBeGreaterThan(rightKnee[1] + 100);
      expect(leftAnkle[0]).toBeLessThan(rightAnkle[0] - 80);
      expectSound(crossed, usual, 'adduction', [5, 30]);
    }
  });

  it('has one hand on the knee that is up, and the other along that thigh', () => {
    const { joints } = sit({ arms: 'lap', feet: 'knees-crossed' });
    expect(joints.rightWrist[1]).toBeGreaterThan(joints.leftKnee[1] + kneeRadius(figure));
    const thigh = (joints.leftHip[1] + joints.leftKnee[1]) / 2;
    expect(Math.abs(joints.leftWrist[1] - thigh)).toBeLessThan(90);
    expect(joints.leftWrist[0]).toBeGreaterThan(joints.leftKnee[0] + 60);
    expect(sit({ feet: 'knees-crossed' }).joints.leftWrist).toEqual(sit(undefined).joints.leftWrist);
  });

  it('crosses the knees of people of every stature', () => {
    for (const [name, means] of percentilePeople([5, 25, 50, 75, 95])) {
      const higher = means.popliteal_height - woman.popliteal_height;
      expect([name, kinds(sit({ feet: 'knees-crossed' }, {}, higher, means))]).toEqual([
        name,
        expect.arrayContaining(['knees-crossed']),
      ]);
    }
  });

  it('says why knees do not cross, and leaves the legs as they were', () => {
    const stays = (pose: MannequinPose, usual: MannequinPose) =>
      expect(pose.stance.legs).toEqual(usual.stance.legs);
    const stout = { ...woman, abdominal_extension_depth_sitting: 340 };
    const full = sit({ feet: 'knees-crossed' }, {}, 0, stout);
    expect(kinds(full)).toContain('knees-stay-apart');
    stays(full, sit(undefined, {}, 0, stout));
    const under = (mm: number) => ({ table: { ...situation.table!, undersideMm: seatMm + mm } });
    expect(kinds(sit({ feet: 'knees-crossed' }, under(320)))).toContain('knees-crossed');
    const meets = sit({ feet: 'knees-crossed' }, under(230));
    expect(kinds(meets)).toContain('table-over-knees');
    stays(meets, sit(undefined, under(230)));
  });

  it('leaves the lower foot on a rail where feet would hang', () => {
    const rail = { footRail: { topMm: 200, aheadOfHipMm: 470 } };
    const [usual, crossed] = [sit(undefined, rail, 180), sit({ feet: 'knees-crossed' }, rail, 180)];
    expect(kinds(crossed)).toContain('knees-crossed');
    expect(crossed.notes).toContainEqual({ kind: 'feet-on-rail', side: 'right' });
    expect(crossed.joints.rightAnkle[1]).toBeCloseTo(usual.joints.rightAnkle[1], 0);
    expect(crossed.joints.leftAnkle[1]).toBeGreaterThan(crossed.joints.rightAnkle[1] + 40);
    const hangs = sit({ feet: 'knees-crossed' }, {}, 60);
    expect(hangs.notes).toContainEqual({ kind: 'feet-hang', valueMm: expect.closeTo(60, 0), side: 'right' });
  });

  it('crosses the knees of all but full builds, also where a seat is so low that thighs lift off it', () => {
    for (const liftMm of [0, -80]) {
      const crossing = builds().filter(([, means]) => {
        const higher = means.popliteal_height - woman.popliteal_height;
        return kinds(sit({ feet: 'knees-crossed' }, {}, higher + liftMm, means)).includes('knees-crossed');
      });
      for (const [, means] of crossing) {
        const higher = means.popliteal_height - woman.popliteal_height;
        const { leftToe, leftAnkle } = sit({ feet: 'knees-crossed' }, {}, higher + liftMm, means).joints;
        expect(Math.min(leftToe[1], leftAnkle[1])).toBeGreaterThan(0);
      }
      const names = crossing.map(([name]) => name);
      expect(names).toEqual(
        expect.arrayContaining(
          builds()
            .map(([name]) => name)
            .filter((name) => !name.startsWith('heavy')),
        ),
      );
    }
  });

  it('keeps elbows near the sides where hands lie on crossed knees', () => {
    for (const [name, means] of builds()) {
      const higher = means.popliteal_height - woman.popliteal_height;
      const elbow = (choice: PostureChoice) => sit(choice, {}, higher, means).joints.leftElbow[0];
      const out = elbow({ arms: 'lap', feet: 'knees-crossed' }) - elbow({ arms: 'lap' });
      expect([name, out < 75]).toEqual([name, true]);
    }
  });

  it('puts hanging feet on a rail under them, and says when there is none in reach', () => {
    const high = 180;
    expect(kinds(sit(undefined, {}, high))).toContain('feet-hang');
    const footRail = { topMm: high + 20, aheadOfHipMm: 470 };
    const railed = sit(undefined, { footRail }, high);
    expect(kinds(railed)).toContain('feet-on-rail');
    expect(kinds(railed)).not.toContain('feet-hang');
    expect(railed.joints.leftAnkle[1]).toBeCloseTo(
      footRail.topMm + SHOE_MM + woman.lateral_malleolus_height,
      0,
    );
    expect(kinds(sit({ feet: 'rail' }, { footRail: { topMm: 30, aheadOfHipMm: 1500 } }, high))).toContain(
      'rail-out-of-reach',
    );
  });
});
