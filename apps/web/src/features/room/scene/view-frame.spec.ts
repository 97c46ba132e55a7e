import { Matrix4, Quaternion, Vector3, Vector4 } from 'three';
import { describe, expect, it } from 'vitest';
import { between, project, projectionColumns, rayThrough } from './view-frame.ts';
import { frameFor, VIEW_LETTERS, type ViewRequest } from './views.ts';

const viewport = { width: 1056, height: 600 };
const request = (letter: (typeof VIEW_LETTERS)[number]): ViewRequest => ({
  letter,
  bounds: { min: [-1800, 0, -600], max: [1900, 1350, 700] },
  viewport,
  insets: { top: 70, right: 20, bottom: 40, left: 90 },
  zoom: 1,
  panMm: [0, 0],
  azimuth: 0.6,
  elevation: 0.4,
});

describe.each(VIEW_LETTERS)('view %s', (letter) => {
  const frame = frameFor(request(letter));

  it('keeps the whole set between the margins of the sheet', () => {
    for (const x of [-1800, 1900]) {
      for (const y of [0, 1350]) {
        for (const z of [-600, 700]) {
          const at = project(frame, viewport, [x, y, z]);
          expect(at.x).toBeGreaterThan(89.9);
          expect(at.x).toBeLessThan(1036.1);
          expect(at.y).toBeGreaterThan(69.9);
          expect(at.y).toBeLessThan(560.1);
        }
      }
    }
  });

  it('agrees with the matrices the picture is drawn with', () => {
    const camera = new Matrix4().compose(
      new Vector3(...frame.target),
      new Quaternion(...frame.orientation),
      new Vector3(1, 1, 1),
    );
    const matrix = new Matrix4()
      .fromArray(projectionColumns(frame, viewport.width / viewport.height))
      .multiply(camera.invert());
    const clip = new Vector4(400, 830, -220, 1).applyMatrix4(matrix);
    const at = project(frame, viewport, [400, 830, -220]);
    expect(((clip.x / clip.w + 1) / 2) * viewport.width).toBeCloseTo(at.x, 6);
    expect(((1 - clip.y / clip.w) / 2) * viewport.height).toBeCloseTo(at.y, 6);
    expect(Math.abs(clip.z / clip.w)).toBeLessThan(1);
  });

  it('finds a point again on the line of sight through its pixel', () => {
    const point = [310, 512, 140] as const;
    const at = project(frame, viewport, point);
    const { origin, direction } = rayThrough(frame, viewport, at.x, at.y);
    const away = new Vector3(...point).sub(new Vector3(...origin)).cross(new Vector3(...direction));
    expect(away.length()).toBeLessThan(1e-6 * 10_000);
  });
});

describe('view A', () => {
  it('keeps uprights upright', () => {
    const frame = frameFor(request('A'));
    const foot = project(frame, viewport, [-1500, 0, -500]);
    const head = project(frame, viewport, [-1500, 1300, -500]);
    expect(foot.x).toBeCloseTo(head.x, 9);
  });
});

describe('views B, C and D', () => {
  it.each(['B', 'C', 'D'] as const)('%s is to scale at every depth', (letter) => {
    const frame = frameFor(request(letter));
    const inch = (depth: number) => {
      const [a, b]: [readonly [number, number, number], readonly [number, number, number]] =
        letter === 'D'
          ? [
              [0, depth, 0],
              [100, depth, 0],
            ]
          : letter === 'B'
            ? [
                [depth, 0, 0],
                [depth, 100, 0],
              ]
            : [
                [0, 0, depth],
                [0, 100, depth],
              ];
      const [p, q] = [project(frame, viewport, a), project(frame, viewport, b)];
      return Math.hypot(p.x - q.x, p.y - q.y);
    };
    expect(inch(0)).toBeCloseTo(inch(900), 9);
  });
});

describe('moving between views', () => {
  it('starts at one and ends exactly at the other', () => {
    const [a, d] = [frameFor(request('A')), frameFor(request('D'))];
    expect(between(a, d, 1)).toBe(d);
    expect(between(a, d, 0).perspective).toBe(a.perspective);
    expect(between(a, d, 0.5).perspective).toBeCloseTo(a.perspective / 2, 12);
  });
});
