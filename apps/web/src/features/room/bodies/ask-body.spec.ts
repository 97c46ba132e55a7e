import { mannequinMesh, poseMannequin, type SeatPoint } from '@settlewright/geometry';
import { createBodyModel } from '@settlewright/anthropometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { afterEach, expect, it, vi } from 'vitest';
import { askBody, knownBody } from './ask-body.ts';
import type { BodyQuestion } from './body.worker.ts';

const model = createBodyModel(summary);
const pose = (shoeMm = 25, frame: SeatPoint = { hipMm: [0, 450, 135], facingRad: 0 }) =>
  poseMannequin({
    means: model.predict({ bodyData: 'women', measured: {}, shoeMm: 25, clothing: 'light' }).means(),
    shoeMm,
    frame,
    situation: { effectiveDepthMm: 430, seatTiltRad: 0, backLeanRad: 0.1, backTopMm: 900 },
    sinkMm: 10,
  });

afterEach(() => void vi.unstubAllGlobals());

it('makes the skin on the page where there are no workers, and once only', async () => {
  vi.stubGlobal('Worker', undefined);
  const seated = pose();
  const mesh = await askBody(seated, 'far', () => true);
  expect(mesh).toEqual(mannequinMesh(seated, 'far'));
  expect(await askBody(seated, 'far', () => true)).toBe(mesh);
  expect(knownBody(seated, 'near')).toBeUndefined();
});

it('makes one at a time in the worker, and none that nobody wants any more', async () => {
  const put: BodyQuestion[] = [];
  let answer: () => void = () => undefined;
  class SlowWorker {
    onmessage?: (event: { data: unknown }) => void;
    postMessage(question: BodyQuestion) {
      put.push(question);
      answer = () =>
        this.onmessage?.({ data: { id: question.id, answer: mannequinMesh(question.pose, 'far') } });
    }
  }
  vi.stubGlobal('Worker', SlowWorker);
  const poses = [pose(10), pose(15), pose(20)] as const;
  let wanted = true;
  const asked = [
    askBody(poses[0], 'far', () => true),
    askBody(poses[1], 'far', () => wanted),
    askBody(poses[2], 'far', () => true),
  ];
  await vi.waitFor(() => expect(put).toHaveLength(1));
  wanted = false;
  answer();
  expect(await asked[0]).toBe(knownBody(poses[0], 'far'));
  expect(await asked[1]).toBeUndefined();
  await vi.waitFor(() => expect(put).toHaveLength(2));
  answer();
  expect((await asked[2])?.positions.every(Number.isFinite)).toBe(true);
});

it('sets a skin down where the same body sits the same way, and makes another for another posture', async () => {
  vi.stubGlobal('Worker', undefined);
  await askBody(pose(), 'near', () => true);
  const moved = pose(25, { hipMm: [1200, 450, -700], facingRad: 2.1 });
  const [set, made] = [knownBody(moved, 'near')!, mannequinMesh(moved, 'near')];
  for (const key of ['positions', 'normals'] as const) {
    const off = made[key].map((x, n) => Math.abs(x - set[key][n]!));
    expect(off.reduce((most, x) => Math.max(most, x))).toBeLessThan(1e-3);
  }
  expect(knownBody(moved, 'near')).toBe(set);
  expect(knownBody(pose(25, { hipMm: [1200, 520, -700], facingRad: 2.1 }), 'near')).toBeUndefined();
});
