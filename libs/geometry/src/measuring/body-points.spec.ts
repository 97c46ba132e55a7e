import { describe, expect, it } from 'vitest';
import { personAt, seated, setOf } from '../../test/seated-room.ts';
import { mannequinMesh } from '../mannequin/mesh.ts';
import type { MeasureEnd } from './dimension.ts';
import { bodyPoint } from './body-points.ts';
import { measureEnds } from './measure-ends.ts';
import { measuringScene } from './measuring-scene.ts';
import { snapEnd } from './snap-end.ts';

const { document, ids } = setOf([
  ['bench', { xMm: 0, zMm: 0, turnDeg: 0 }],
  ['table', { xMm: 0, zMm: 2600, turnDeg: 0 }],
]);
const { bodies, parts } = seated(document, [personAt('men', 50)]);
const measured = bodies.map(({ pieceId, pose }) => ({
  pieceId,
  place: 1,
  name: 'Imre',
  pose,
  mesh: mannequinMesh(pose),
}));
const scene = measuringScene(document, parts, measured);
const [body] = measured;
const pieceId = ids[0]!;
const point = (key: Parameters<typeof bodyPoint>[1]) => bodyPoint(body!, key);

describe('points of a body', () => {
  it('lie on the skin outside their joints, on the side they are named for', () => {
    const { joints } = body!.pose;
    expect(point('left-knee')[2]).toBeGreaterThan(joints.leftKnee[2] + 20);
    expect(point('left-knee-top')[1]).toBeGreaterThan(joints.leftKnee[1] + 20);
    expect(point('hips-back')[2]).toBeLessThan(joints.pelvis[2] - 50);
    expect(point('left-shoulder')[0]).toBeGreaterThan(joints.leftShoulder[0]);
    expect(point('right-shoulder')[0]).toBeLessThan(joints.rightShoulder[0]);
    expect(point('crown')).toEqual(joints.crown);
  });

  it('measure the whole body as near as its nearest point', () => {
    const top = parts.find(({ role }) => role === 'top')!;
    const table: MeasureEnd = { on: 'part', pieceId: ids[1]!, partId: top.id };
    const to = (key: 'whole' | 'left-toe'): number =>
      measureEnds([{ on: 'body', pieceId, place: 1, point: key }, table], scene)!.distanceMm;
    expect(to('whole')).toBeGreaterThan(0);
    expect(to('whole')).toBeLessThanOrEqual(to('left-toe') + 0.1);
    const [one, other] = [
      measureEnds([{ on: 'body', pieceId, place: 1, point: 'whole' }, table], scene)!,
      measureEnds([table, { on: 'body', pieceId, place: 1, point: 'whole' }], scene)!,
    ];
    expect(other.fromMm).toEqual(one.toMm);
  });

  it('are snapped to from in front, and bare skin takes the nearest of them', () => {
    const [x, y] = point('left-knee');
    const look = (dx: number, dy: number) =>
      snapEnd(scene, {
        line: { origin: [x + dx, y + dy, 5000], direction: [0, 0, -1] },
        reachMm: () => 12,
        parts: [],
      })?.end;
    expect(look(3, -4)).toEqual({ on: 'body', pieceId, place: 1, point: 'left-knee' });
    expect(look(0, -80)).toMatchObject({ on: 'body', pieceId, place: 1 });
  });
});
