import {
  BoxGeometry,
  BufferAttribute,
  BufferGeometry,
  CylinderGeometry,
  Euler,
  Matrix4,
  Vector3,
} from 'three';
import { MeshBVH } from 'three-mesh-bvh';
import { describe, expect, it } from 'vitest';
import { randomOf, spreadDirections } from '../../test/random-solids.ts';
import { builds, drawnPeople, percentilePeople } from '../../test/survey-like-people.ts';
import { mannequinMesh, nearStretches, type MannequinMesh } from '../mannequin/mesh.ts';
import { poseMannequin } from '../mannequin/pose.ts';
import { STRETCH_NAMES } from '../mannequin/stretches.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import type { PostureChoice } from '../room/posture-choice.ts';
import { sitterDistances } from './sitter-distances.ts';
import { CONTACT_MM, type PlacedBody, type SitterGap } from './sitter-gap.ts';

/** What is promised of every distance between a body and a part. */
const WITHIN_MM = 3;
/** Depths are told to so much; a library looks whether surfaces meet just before and just behind. */
const HAIR_MM = 0.3;
/** Past this, which way is the shortest out of a hollow limb is not promised. */
const DEEPEST_MM = 60;

const named = (name: string) => builds().find(([who]) => who === name)!;
const people = [
  percentilePeople([1])[0]!,
  percentilePeople([99])[1]!,
  named('heavy men, 50 % in stature'),
  named('heavy women, 5 % in stature'),
  ...drawnPeople(2, 11),
];
const postures: PostureChoice[] = [
  { arms: 'lap' },
  { arms: 'table' },
  { arms: 'sill-left', trunk: 'slumped' },
  { arms: 'cup', trunk: 'upright' },
];

function bodyOf(means: (typeof people)[number][1], choice: PostureChoice) {
  const seatMm = means.popliteal_height + 25;
  const elbowMm = seatMm + means.elbow_rest_height;
  const pose = poseMannequin({
    means,
    shoeMm: 25,
    frame: { hipMm: [0, seatMm, 135], facingRad: 0 },
    situation: {
      effectiveDepthMm: 420,
      seatTiltRad: 0.035,
      backLeanRad: 0.14,
      backTopMm: 1000,
      table: { topMm: elbowMm + 30, overlapMm: 60 },
      sills: [{ side: 'left', topMm: elbowMm + 45, centreToEdgeMm: 230, usableDepthMm: 150 }],
    },
    sinkMm: 0,
    choice,
  });
  const mesh = mannequinMesh(pose);
  return { body: { placeId: 'b:1', pieceId: 'b', pose, mesh } satisfies PlacedBody, mesh, pose };
}

const treeOf = ({ positions, indices }: Pick<MannequinMesh, 'positions' | 'indices'>) => {
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(positions, 3));
  geometry.setIndex([...indices]);
  return new MeshBVH(geometry);
};
/** The triangles of one stretch of a near mesh alone. */
const stretchTree = ({ positions, indices }: MannequinMesh, name: string) =>
  treeOf({
    positions,
    indices: indices.filter((_, i) => STRETCH_NAMES[nearStretches()[Math.floor(i / 3)]!] === name),
  });
const geometryOf = ({ solid }: Part): BufferGeometry =>
  solid.shape === 'box'
    ? new BoxGeometry(...solid.sizeMm)
    : new CylinderGeometry(
        solid.shape === 'cylinder' ? solid.radiusMm : 0,
        solid.shape === 'cylinder' ? solid.radiusMm : 0,
        solid.shape === 'cylinder' ? solid.heightMm : 0,
        128,
      );
const placeOf = ({ positionMm, rotationRad }: Part, by: Vec3 = [0, 0, 0]): Matrix4 =>
  new Matrix4()
    .makeRotationFromEuler(new Euler(...rotationRad, 'YXZ'))
    .setPosition(positionMm[0] + by[0], positionMm[1] + by[1], positionMm[2] + by[2]);
const times = (v: Vec3, s: number): Vec3 => [v[0] * s, v[1] * s, v[2] * s];

/** Boards, walls, rails, columns and beams about a body, each a little off it or a little in it. */
function partsAround({ mesh, pose }: ReturnType<typeof bodyOf>, random: () => number): Part[] {
  const off = (): number => -25 + 70 * random();
  const part = (role: Part['role'], solid: Part['solid'], positionMm: Vec3, rotationRad: Vec3): Part => ({
    id: `p/${role}-1`,
    pieceId: 'p',
    role,
    material: 'oak',
    solid,
    positionMm,
    rotationRad,
  });
  const box = (...sizeMm: Vec3): Part['solid'] => ({ shape: 'box', sizeMm });
  const { leftElbow, rightElbow, leftKnee, leftAnkle, pelvis, crown } = pose.joints;
  const axisMost = (axis: 0 | 1 | 2, sign: 1 | -1): number =>
    mesh.positions.reduce((far, x, i) => (i % 3 === axis && sign * x > sign * far ? x : far), -sign * 1e6);
  const thighTop = leftKnee[1] + 60;
  const turn = (): number => 0.3 * (random() - 0.5);
  return [
    part('top', box(900, 24, 500), [0, thighTop + off() + 12, leftKnee[2] + 60], [turn(), 0, 0]),
    part('apron', box(900, 90, 20), [0, thighTop + 60, pelvis[2] + 190 + off()], [0, turn(), 0]),
    part('end-wall', box(20, 1200, 900), [axisMost(0, 1) + off() + 10, 900, 300], [0, turn(), 0]),
    part(
      'sill-board',
      box(160, 28, 700),
      [leftElbow[0] + 60, leftElbow[1] - 55 - off(), leftElbow[2]],
      [0, turn(), 0.1],
    ),
    part(
      'arm',
      box(50, 40, 500),
      [rightElbow[0] - 40 - off(), rightElbow[1] - 20, rightElbow[2]],
      [turn(), turn(), turn()],
    ),
    part('rail', box(900, 45, 45), [0, leftAnkle[1] + 120, leftAnkle[2] + 75 + off()], [0.5, 0, 0]),
    part(
      'column',
      { shape: 'cylinder', radiusMm: 40, heightMm: 700 },
      [leftKnee[0] + 60, 300, leftKnee[2] + 105 + off()],
      [turn(), 0, turn()],
    ),
    part('beam', box(400, 120, 160), [40, crown[1] + 60 + off(), crown[2] - 40], [turn(), 0.4, turn()]),
  ];
}

const random = randomOf(5);
const bodies = people.flatMap(([who, means]) =>
  postures.map((choice) => ({ who: `${who}, ${JSON.stringify(choice)}`, ...bodyOf(means, choice) })),
);
const measured = bodies.flatMap((one) => {
  const tree = treeOf(one.mesh);
  return partsAround(one, random).map((part) => ({
    words: `${one.who}: ${part.role}`,
    mesh: one.mesh,
    tree,
    part,
    found: sitterDistances([one.body], [part])[0]!,
  }));
});
const all = ({ found }: (typeof measured)[number]): SitterGap[] => [...found.overlaps, ...found.contacts];

describe('distances of bodies and parts against a library that knows triangles only', () => {
  it('agree where the two are apart, whatever the solids say', () => {
    const apart = measured.filter(({ found }) => found.smallest);
    expect(apart.length).toBeGreaterThan(60);
    const wrong = apart.flatMap(({ words, tree, part, found }) => {
      const geometry = geometryOf(part);
      const nearest = tree.closestPointToGeometry(geometry, placeOf(part));
      return Math.abs(nearest!.distance - found.smallest!.distanceMm) < HAIR_MM &&
        found.smallest!.distanceMm > CONTACT_MM
        ? []
        : [`${words}: ${found.smallest!.distanceMm} against ${nearest!.distance}`];
    });
    expect(wrong).toEqual([]);
  });

  it('agree on what meets, and part it by the depth that is told and by no less', () => {
    const met = measured.filter((one) => all(one).length > 0);
    expect(met.length).toBeGreaterThan(60);
    const wrong = met.flatMap((one) =>
      all(one).flatMap((gap) => {
        const { distanceMm, direction, segment } = gap;
        if (distanceMm > 0) return [];
        const tree = stretchTree(one.mesh, segment);
        const geometry = geometryOf(one.part);
        const meets = (by: number): boolean =>
          tree.intersectsGeometry(geometry, placeOf(one.part, times(direction, by)));
        const said = `${one.words}, ${segment}, ${distanceMm.toFixed(2)}`;
        return [
          ...(meets(0) ? [] : [`${said}: does not meet`]),
          ...(meets(-distanceMm + HAIR_MM) ? [`${said}: still meets`] : []),
          ...(distanceMm > -HAIR_MM || meets(-distanceMm - HAIR_MM) ? [] : [`${said}: parts sooner`]),
        ];
      }),
    );
    expect(wrong).toEqual([]);
  });

  it('tell the shortest way within 3 mm: no direction of 200 parts them by less', () => {
    const directions = spreadDirections(200);
    const deep = measured.flatMap((one) =>
      one.found.overlaps
        .filter(({ distanceMm }) => distanceMm < -WITHIN_MM && distanceMm > -DEEPEST_MM)
        .map((gap) => ({ ...one, gap })),
    );
    expect(deep.length).toBeGreaterThan(80);
    const wrong = deep.flatMap(({ words, mesh, part, gap }) => {
      const tree = stretchTree(mesh, gap.segment);
      const geometry = geometryOf(part);
      const less = -gap.distanceMm - WITHIN_MM;
      const shorter = directions.find(
        (way) => !tree.intersectsGeometry(geometry, placeOf(part, times(way, less))),
      );
      return shorter ? [`${words}, ${gap.segment}: ${less} along ${shorter.join()}`] : [];
    });
    expect(wrong).toEqual([]);
  });
});

describe('distances of two bodies against the library', () => {
  const [one] = bodies;
  const pairs = bodies.slice(4, 12).map((other, i) => {
    // Beside each other, turned a little, from well apart to well into each other.
    const by = 640 - 40 * i;
    const positions = other.mesh.positions.map((x, n) => (n % 3 === 0 ? x + by : x));
    const mesh = { ...other.mesh, positions };
    return { mesh, gaps: sitterDistances([one!.body, { ...other.body, placeId: 'b:2', mesh }], [])[0]! };
  });

  it('part them by the depth that is told, and by no less', () => {
    const wrong = pairs.flatMap(({ mesh, gaps }) =>
      [...gaps.overlaps, ...gaps.contacts].flatMap((gap) => {
        if (gap.thing.kind !== 'body' || gap.distanceMm > 0) return [];
        const [ours, theirs] = [stretchTree(one!.mesh, gap.segment), stretchTree(mesh, gap.thing.segment)];
        const meets = (by: number): boolean =>
          ours.intersectsGeometry(
            theirs.geometry,
            new Matrix4().setPosition(new Vector3(...times(gap.direction, by))),
          );
        const said = `${gap.segment}, ${gap.thing.segment}, ${gap.distanceMm.toFixed(2)}`;
        return [
          ...(meets(-gap.distanceMm + HAIR_MM) ? [`${said}: still meets`] : []),
          ...(gap.distanceMm > -HAIR_MM || meets(-gap.distanceMm - HAIR_MM) ? [] : [`${said}: parts sooner`]),
        ];
      }),
    );
    expect(wrong).toEqual([]);
    expect(pairs.some(({ gaps }) => gaps.overlaps.length > 0)).toBe(true);
    expect(pairs.some(({ gaps }) => gaps.smallest && gaps.smallest.distanceMm > 5)).toBe(true);
  });
});
