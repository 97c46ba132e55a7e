import type { MeasureKey } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { furthest } from '../../test/mesh-rays.ts';
import { builds, percentilePeople } from '../../test/survey-like-people.ts';
import { gapBetween } from '../distance/gap.ts';
import { hull } from '../distance/shape.ts';
import { segmentShape } from '../distance/solids.ts';
import type { PostureChoice } from '../room/posture-choice.ts';
import { mannequinMesh } from './mesh.ts';
import { poseMannequin, type MannequinPose, type SeatPosture } from './pose.ts';

const WITHIN_MM = 3;
/** A raised arm draws the skin of the shoulder with it, and the elbow's skin slides over its tip. */
const WITHIN_ON_ARMS_MM: Partial<Record<string, number>> = {
  'elbow, under it': 4.5,
  'elbow, outside': 6.5,
  'right elbow, under it': 4.5,
  'right elbow, outside': 6.5,
  shoulder: 10.5,
};
/** Around the point that solids reach furthest with, the skin is looked at this far. */
const NEAR_MM = 100;
type Axis = 0 | 1 | 2;

const seat = { effectiveDepthMm: 420, seatTiltRad: 0.035, backLeanRad: 0.14, backTopMm: 1000 };

/** A place whose seat is at the crook of the knee with shoes on, and what is beside and before it. */
function sit(
  means: Record<MeasureKey, number>,
  over: Partial<SeatPosture>,
  choice?: PostureChoice,
): MannequinPose {
  return poseMannequin({
    means,
    shoeMm: 25,
    frame: { hipMm: [0, means.popliteal_height + 10, 135], facingRad: 0 },
    situation: { ...seat, ...over },
    sinkMm: 0,
    choice,
  });
}

/** Where a check measures, which solids reach there, and in which direction. */
const MARKS: readonly (readonly [name: string, solids: RegExp, axis: Axis, sign: 1 | -1])[] = [
  ['thigh top', /left thigh( root)?$/, 1, 1],
  ['knee front', /left thigh$/, 2, 1],
  ['back of the knee', /left shin$/, 2, -1],
  ['elbow, under it', /left (upper arm|forearm)$/, 1, -1],
  ['elbow, outside', /left (upper arm|forearm)$/, 0, 1],
  ['right elbow, under it', /right (upper arm|forearm)$/, 1, -1],
  ['right elbow, outside', /right (upper arm|forearm)$/, 0, -1],
  ['shoulder', /left shoulder$/, 0, 1],
  ['belly', /belly$/, 2, 1],
  ['buttock', /pelvis$/, 2, -1],
  ['hips', /pelvis$/, 0, 1],
  ['head', /^head$/, 1, 1],
  ['toe', /left foot/, 2, 1],
  ['heel', /left foot/, 2, -1],
  ['sole', /left foot/, 1, -1],
];

/** Legs that cross press each other and draw the skin along; arms lie over them. */
const WITHIN_CROSSED_MM = 25;

/** Differences of the solids and the near mesh, each looked for around the point the solids reach furthest with. */
function differences(pose: MannequinPose, withinMm?: number): string[] {
  const { positions, indices, groups } = mannequinMesh(pose);
  const bare = groups.filter(({ tag }) => tag !== 'hand');
  const mesh = {
    positions,
    indices: Uint32Array.from(
      bare.flatMap(({ start, count }) => [...indices.subarray(start, start + count)]),
    ),
  };
  const shapes = pose.segments.map((segment) => ({ name: segment.name, shape: segmentShape(segment) }));
  const out = new Float64Array(3);
  return MARKS.flatMap(([name, solids, axis, sign]) => {
    const d = [0, 0, 0].map((_, i) => (i === axis ? sign : 0)) as [number, number, number];
    const ends = pose.segments
      .filter((segment) => solids.test(segment.name))
      .map((segment) => {
        const shape = segmentShape(segment);
        shape.support(...d, out);
        return [...out].map((x, i) => x + d[i]! * shape.marginMm);
      });
    const end = ends.reduce((far, one) => (sign * one[axis]! > sign * far[axis]! ? one : far));
    // Skin of another limb that lies nearby says nothing of these solids.
    const isTheirs = (x: number, y: number, z: number): boolean => {
      const point = hull([[x, y, z]]);
      const gaps = shapes.map((one) => gapBetween(one.shape, point)!.distanceMm);
      return solids.test(shapes[gaps.indexOf(Math.min(...gaps))]!.name);
    };
    const skin = furthest(
      mesh,
      axis,
      sign,
      { axis, from: end[axis]! - 30, to: end[axis]! + 30 },
      (x, y, z) => {
        const away = Math.hypot(x - end[0]!, y - end[1]!, z - end[2]!);
        const beyond = sign * ([x, y, z][axis]! - end[axis]!);
        return (
          away < (name === 'back of the knee' ? 30 : NEAR_MM) && (beyond < WITHIN_MM || isTheirs(x, y, z))
        );
      },
    );
    const more = sign * (end[axis]! - skin);
    return Math.abs(more) < (withinMm ?? WITHIN_ON_ARMS_MM[name] ?? WITHIN_MM)
      ? []
      : [`${name}: solids ${more.toFixed(1)} further than the skin`];
  });
}

describe('the simple solids reach as far as the near mesh in the postures people sit in', () => {
  const people = [...percentilePeople([5, 95]), ...builds().filter(([who]) => who.includes('50 %'))];
  const table = { topMm: 0, overlapMm: 60 };
  const postures: [string, (means: Record<MeasureKey, number>) => MannequinPose][] = [
    ['hands on the lap', (means) => sit(means, {})],
    [
      'forearms on a table',
      (means) =>
        sit(means, { table: { ...table, topMm: means.popliteal_height + means.elbow_rest_height + 30 } }),
    ],
    [
      'a forearm on a sill',
      (means) =>
        sit(
          means,
          {
            sills: [
              {
                side: 'left',
                topMm: means.popliteal_height + means.elbow_rest_height + 25,
                centreToEdgeMm: means.forearm_forearm_breadth / 2 - 40,
                usableDepthMm: 150,
              },
            ],
          },
          { arms: 'sill-left' },
        ),
    ],
  ];
  const crossed: typeof postures = (['ankles-crossed', 'knees-crossed'] as const).map((feet) => [
    feet,
    (means) => sit(means, {}, { feet, arms: 'lap' }),
  ]);
  it.each(crossed)('%s, roughly', (_, pose) => {
    const strays = people.flatMap(([who, means]) =>
      differences(pose(means), WITHIN_CROSSED_MM).map((words) => `${who}: ${words}`),
    );
    expect(strays).toEqual([]);
  });

  it.each(postures)('%s', (_, pose) => {
    const strays = people.flatMap(([who, means]) =>
      differences(pose(means)).map((words) => `${who}: ${words}`),
    );
    expect(strays).toEqual([]);
  });
});
