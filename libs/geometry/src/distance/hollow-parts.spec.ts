import { describe, expect, it } from 'vitest';
import { benchAlone, cushionsOf, shaped } from '../../test/shaped.ts';
import { ellipsoid } from './shape.ts';
import { partSurface } from './solids.ts';
import { solidSurface, surfaceGap } from './surface.ts';

/** 400 wide and 300 deep out of the middle of the front of a seat of 1200 by 450. */
const [seat] = cushionsOf(
  shaped(benchAlone(), 'seat', {
    notches: [{ edge: 'front', fromMm: 400, widthMm: 400, depthMm: 300 }],
  }),
  'seat',
);
const [x, y, z] = seat!.positionMm;
const front = z + 225;

const ball = (dx: number, atZ: number, radius: number) =>
  solidSurface(
    ellipsoid(
      [x + dx, y, atZ],
      [
        [radius, 0, 0],
        [0, radius, 0],
        [0, 0, radius],
      ],
    ),
  );

describe('distances to a notched seat', () => {
  it('are measured to the edge of the notch, not across its mouth', () => {
    const gap = surfaceGap(ball(0, front - 100, 30), partSurface(seat!), 1000);
    expect(gap?.distanceMm).toBeCloseTo(200 - 30, 3);
    expect(surfaceGap(ball(90, front - 100, 30), partSurface(seat!), 1000)?.distanceMm).toBeCloseTo(80, 3);
  });

  it('are those of its front beside the notch', () => {
    expect(surfaceGap(ball(400, front + 120, 30), partSurface(seat!), 1000)?.distanceMm).toBeCloseTo(90, 3);
  });

  it('say that what stands in a leg of it meets it', () => {
    expect(surfaceGap(ball(400, front - 40, 30), partSurface(seat!), 1000)!.distanceMm).toBeLessThan(0);
  });
});
