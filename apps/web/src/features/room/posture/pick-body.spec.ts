import type { MannequinSegment, Vec3 } from '@settlewright/geometry';
import { expect, it } from 'vitest';
import type { SeatedBody } from '../picture.ts';
import { bodyUnder } from './pick-body.ts';

const at = (name: string, [x, y, z]: Vec3): SeatedBody => {
  const ball: MannequinSegment = {
    kind: 'rounded-cone',
    tag: 'suit',
    name: 'chest',
    fromMm: [x, y, z],
    toMm: [x, y + 200, z],
    fromRadiusMm: 100,
    toRadiusMm: 100,
  };
  return { name, pose: { segments: [ball] } } as unknown as SeatedBody;
};
const bodies = [at('behind', [0, 500, -800]), at('before', [0, 500, 0]), at('aside', [900, 500, 0])];
const along = (x: number, y: number) => ({ origin: [x, y, 9000] as Vec3, direction: [0, 0, -2] as Vec3 });

it('chooses the body that is met first, and nobody beside them', () => {
  expect(bodyUnder(bodies, along(0, 600))?.name).toBe('before');
  expect(bodyUnder(bodies, along(890, 600))?.name).toBe('aside');
  expect(bodyUnder(bodies, along(400, 600))).toBeUndefined();
  expect(bodyUnder(bodies, { origin: [0, 600, 9000], direction: [0, 0, 1] })).toBeUndefined();
});

it('chooses nobody behind what stands before them', () => {
  expect(bodyUnder(bodies, along(0, 600), 8000)).toBeUndefined();
  expect(bodyUnder(bodies, along(0, 600), 8950)?.name).toBe('before');
});
