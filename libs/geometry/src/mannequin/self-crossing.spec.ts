import type { MeasureKey } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { selfCrossings, visibleCrossings } from '../../test/self-crossings.ts';
import { builds } from '../../test/survey-like-people.ts';
import type { FeetMoved } from './leg-posture.ts';
import { mannequinMesh, measuringMesh, type MannequinMesh } from './mesh.ts';
import { poseMannequin } from './pose.ts';
import type { PostureChoice } from '../room/posture-choice.ts';

const SHOE_MM = 25;
/** On a bench of the person's own height, leaning back a little; a table stands 20 mm over the elbows. */
function seated(
  means: Record<MeasureKey, number>,
  atTable: boolean,
  choice?: PostureChoice,
  liftMm = 0,
  feet?: FeetMoved,
): MannequinMesh {
  const seatMm = means.popliteal_height + SHOE_MM + liftMm;
  return mannequinMesh(
    poseMannequin({
      means,
      shoeMm: SHOE_MM,
      frame: { hipMm: [0, seatMm, 135], facingRad: 0 },
      situation: {
        effectiveDepthMm: 420,
        seatTiltRad: 0,
        backLeanRad: 0.1,
        backTopMm: 1000,
        ...(atTable && { table: { topMm: seatMm + means.elbow_rest_height + 20, overlapMm: 40 } }),
      },
      sinkMm: 0,
      choice,
      ...(feet && { feet }),
    }),
  );
}

describe('a body does not run through itself where one can see it', () => {
  it.each(builds())('%s: measuring, hands in lap, hands on table', (_, means) => {
    for (const mesh of [measuringMesh(means), seated(means, false), seated(means, true)]) {
      expect(visibleCrossings(mesh, selfCrossings(mesh)).map(({ at }) => at.map(Math.round))).toEqual([]);
    }
  });

  it.each(builds())('%s: ankles crossed, on a seat of their own height, lower and higher', (_, means) => {
    for (const liftMm of [0, -40, 60]) {
      const mesh = seated(means, false, { arms: 'lap', feet: 'ankles-crossed' }, liftMm);
      expect(visibleCrossings(mesh, selfCrossings(mesh)).map(({ at }) => at.map(Math.round))).toEqual([]);
    }
  });

  it.each(builds())('%s: one knee over the other where they can, on the same seats', (_, means) => {
    for (const liftMm of [0, -40, 60]) {
      const mesh = seated(means, false, { arms: 'lap', feet: 'knees-crossed' }, liftMm);
      expect(visibleCrossings(mesh, selfCrossings(mesh)).map(({ at }) => at.map(Math.round))).toEqual([]);
    }
  });

  it.each(builds())('%s: feet drawn back and aside, out of the way of others', (_, means) => {
    for (const leftMm of [-80, 80]) {
      const mesh = seated(means, false, { arms: 'lap' }, -40, { backMm: 90, leftMm });
      expect(visibleCrossings(mesh, selfCrossings(mesh)).map(({ at }) => at.map(Math.round))).toEqual([]);
    }
  });

  it.each(builds())('%s: on a seat so low that the thighs lift off it', (_, means) => {
    const mesh = seated(means, false, { arms: 'lap' }, -150);
    expect(visibleCrossings(mesh, selfCrossings(mesh)).map(({ at }) => at.map(Math.round))).toEqual([]);
  });

  it('would see an arm pushed into the side', () => {
    const [, means] = builds()[7]!;
    const mesh = measuringMesh(means);
    const reach = 0.4 * means.forearm_forearm_breadth;
    const pushed = mesh.positions.map((x, i) => (i % 3 === 0 && x > reach ? x - 0.8 * (x - reach) - 90 : x));
    const spoilt = { ...mesh, positions: pushed };
    expect(visibleCrossings(spoilt, selfCrossings(spoilt)).length).toBeGreaterThan(0);
  });
});
