import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { aimAt, angleOfViewDeg, fieldAt, frameOnBack, inFrame, lensStand, wedgeOf } from './lens.ts';
import type { LensCamera } from './named-view.ts';
import { frameWords, lensWords } from './view-words.ts';

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

describe('the angle of view', () => {
  it('is that of a published worked figure: 22.5 mm behind 30 mm is 41.1°', () => {
    // Worked example of α = 2 arctan(d / 2f) in ScienceZero, "Angle of view".
    expect(angleOfViewDeg(22.5, 30)).toBeCloseTo(41.1, 1);
  });

  it('is a right angle where the side is twice the focal length, and 39.6° by 27.0° for 50 mm on 36 × 24', () => {
    expect(angleOfViewDeg(40, 20)).toBeCloseTo(90, 9);
    expect(angleOfViewDeg(36, 50)).toBeCloseTo(39.6, 1);
    expect(angleOfViewDeg(24, 50)).toBeCloseTo(27, 1);
  });
});

describe('a frame', () => {
  it('is as wide as the back where it is flatter, and as high where it is taller', () => {
    expect(frameOnBack({ width: 24.89, height: 18.67 }, 2.39).width).toBe(24.89);
    expect(frameOnBack({ width: 24.89, height: 18.67 }, 2.39).height).toBeCloseTo(10.414, 3);
    expect(frameOnBack({ width: 36, height: 24 }, 1)).toEqual({ width: 24, height: 24 });
  });

  it('takes in 3.6 m at 5 m, of which an object of 2 m fills 20 of 36 parts', () => {
    expect(fieldAt(lens, 5000).width).toBeCloseTo(3600, 9);
    const [left, right] = [inFrame(lens, [-1000, 1270, 0]), inFrame(lens, [1000, 1270, 0])];
    expect(right!.across - left!.across).toBeCloseTo(20 / 36, 12);
    expect(right).toMatchObject({ distanceMm: 5000, up: 0 });
  });

  it('holds nothing that stands behind the lens', () => {
    expect(inFrame(lens, [0, 1270, 5001])).toBeUndefined();
  });

  it('keeps what a lens is aimed at in its middle, wherever both stand', () => {
    const far = fc.double({ min: -8000, max: 8000, noNaN: true });
    const high = fc.double({ min: 0, max: 3000, noNaN: true });
    fc.assert(
      fc.property(far, far, high, far, far, high, (x, z, heightMm, px, pz, py) => {
        fc.pre(Math.hypot(px - x, pz - z) > 200);
        const stood = { ...lens, at: { xMm: x, zMm: z }, heightMm };
        const seen = inFrame({ ...stood, ...aimAt(stood, [px, py, pz]) }, [px, py, pz]);
        expect(seen?.across).toBeCloseTo(0, 6);
        expect(seen?.up).toBeCloseTo(0, 6);
      }),
    );
  });

  it('stands level and looks left when it is turned anticlockwise', () => {
    const { right, up, toward } = lensStand({ ...lens, turnDeg: 90 });
    expect(right.map((n) => Math.round(n))).toEqual([0, 0, -1]);
    expect(up[1]).toBeCloseTo(1, 12);
    expect(toward[0]).toBeCloseTo(1, 12);
    expect(inFrame({ ...lens, turnDeg: 90 }, [-3000, 1270, 5000])).toMatchObject({ distanceMm: 3000 });
  });

  it('spreads on the plan as far as it takes in', () => {
    const { left, right } = wedgeOf(lens, 5000);
    expect(left[0]).toBeCloseTo(-1800, 9);
    expect(right[0]).toBeCloseTo(1800, 9);
    expect([left[1], right[1]]).toEqual([0, 0]);
  });
});

it('says a lens as a camera report does', () => {
  const style = { system: 'feet-inches', roundTo: 16 } as const;
  const wide = { ...lens, backMm: { width: 24.89, height: 18.67 }, aspect: 1.85 };
  expect(lensWords(wide, style).replace(/\s/gu, ' ')).toBe('50 mm on 24.9 × 18.7, height 4′ 2″');
  expect(frameWords(wide)).toBe('frame 1.85 : 1, 28.0° across, 15.3° up');
});
