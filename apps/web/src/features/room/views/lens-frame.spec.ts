import { inFrame, type LensCamera, type Vec3 } from '@settlewright/geometry';
import fc from 'fast-check';
import { expect, it } from 'vitest';
import { project } from '../scene/view-frame.ts';
import { frameBox, lensFrame, NO_INSETS } from './lens-frame.ts';

const lens: LensCamera = {
  kind: 'lens',
  focalLengthMm: 50,
  backMm: { width: 36, height: 24 },
  aspect: 1.5,
  at: { xMm: 0, zMm: 5000 },
  heightMm: 1270,
  turnDeg: 0,
  tiltDeg: 0,
};

it('shows an object of 2 m, 5 m before 50 mm on 36, over 20 of 36 parts of the picture', () => {
  const sheet = { width: 1800, height: 1200 };
  const frame = lensFrame(lens, sheet, NO_INSETS);
  const [left, right] = [-1000, 1000].map((x) => project(frame, sheet, [x, 1270, 0]));
  expect(right!.x - left!.x).toBeCloseTo((1800 * 20) / 36, 6);
  expect(left!.y).toBeCloseTo(600, 6);
});

it('puts every point where the frame has it, on a sheet of any shape, however the lens is held', () => {
  const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  fc.assert(
    fc.property(
      fc.record({ turnDeg: number(-180, 180), tiltDeg: number(-60, 60), focalLengthMm: number(10, 200) }),
      fc.tuple(number(-4000, 4000), number(0, 2500), number(-4000, 4000)),
      fc.record({ width: number(300, 2000), height: number(300, 1200) }),
      (held, [x, y, z], sheet) => {
        const camera = { ...lens, ...held };
        const point: Vec3 = [x, y, z];
        const seen = inFrame(camera, point);
        fc.pre(seen !== undefined && seen.distanceMm > 100);
        const insets = { top: 74, right: 40, bottom: 56, left: 96 };
        const box = frameBox(camera, sheet, insets);
        const shown = project(lensFrame(camera, sheet, insets), sheet, point);
        expect((shown.x - box.left) / box.width - 0.5).toBeCloseTo(seen.across, 6);
        expect(0.5 - (shown.y - box.top) / box.height).toBeCloseTo(seen.up, 6);
      },
    ),
  );
});
