import { describe, expect, it } from 'vitest';
import type { Part, Vec3 } from '../parts/part.ts';
import { roomCutFaces } from './room-cut-faces.ts';

const box: Part = {
  id: 'p',
  pieceId: 'b',
  role: 'top',
  material: 'oak',
  solid: { shape: 'box', sizeMm: [400, 60, 200] },
  positionMm: [1000, 700, -300],
  rotationRad: [0, 0, 0],
};

const extent = (corners: readonly Vec3[]) =>
  ([0, 1, 2] as const).map((n) => {
    const all = corners.map((corner) => corner[n]);
    return [Math.min(...all), Math.max(...all)].map((value) => Math.round(value * 1e6) / 1e6 + 0);
  });

describe('roomCutFaces', () => {
  it.each<[string, Vec3, Vec3, number[][]]>([
    [
      'across z',
      [0, 0, -320],
      [0, 0, 1],
      [
        [800, 1200],
        [670, 730],
        [-320, -320],
      ],
    ],
    [
      'across x, seen from the left',
      [950, 0, 0],
      [-1, 0, 0],
      [
        [950, 950],
        [670, 730],
        [-400, -200],
      ],
    ],
    [
      'level',
      [0, 710, 0],
      [0, 1, 0],
      [
        [800, 1200],
        [710, 710],
        [-400, -200],
      ],
    ],
  ])('cuts a box %s where it stands', (_, point, toward, expected) => {
    const faces = roomCutFaces([box], point, toward);
    expect(faces).toHaveLength(1);
    expect(extent(faces[0]!.corners)).toEqual(expected);
  });

  it('cuts a box turned by 45° through its middle along its diagonal', () => {
    const turned: Part = {
      ...box,
      rotationRad: [0, Math.PI / 4, 0],
      solid: { shape: 'box', sizeMm: [200, 60, 200] },
    };
    const [face] = roomCutFaces([turned], [0, 0, -300], [0, 0, 1]);
    expect(extent(face!.corners)[0]).toEqual([858.578644, 1141.421356]);
  });

  it('leaves a part that is missed or only touched', () => {
    expect(roomCutFaces([box], [0, 0, -100], [0, 0, 1])).toEqual([]);
    expect(roomCutFaces([box], [0, 730, 0], [0, 1, 0])).toEqual([]);
  });
});
