import { emptySetDocument, type WaysIn } from '@settlewright/geometry';
import { expect, it, vi } from 'vitest';
import { askWays } from './ask-ways.ts';
import type { WaysQuestion } from './ways.worker.ts';

/** A worker that answers when the test says so. */
class SlowWorker {
  static put: number[] = [];
  static answer: (answer: WaysIn) => void = () => undefined;
  onmessage?: (event: { data: unknown }) => void;
  postMessage({ id, heightsMm }: WaysQuestion) {
    SlowWorker.put.push(heightsMm[0]);
    SlowWorker.answer = (answer) => this.onmessage?.({ data: { id, answer } });
  }
  terminate = () => undefined;
}

const nobody: WaysIn = { ways: [], order: { placeIds: [], knotted: [] } };

it('puts one question at a time, and none that nobody wants any more', async () => {
  vi.stubGlobal('Worker', SlowWorker);
  const wanted = new Set([1, 2, 3]);
  const ask = (n: number) =>
    askWays({ document: emptySetDocument(), comers: [], heightsMm: [n, 1200] }, () => wanted.has(n));
  const [first, second, third] = [ask(1), ask(2), ask(3)];
  await vi.waitFor(() => expect(SlowWorker.put).toEqual([1]));
  wanted.delete(2);
  SlowWorker.answer(nobody);
  expect(await first).toEqual(nobody);
  expect(await second).toBeUndefined();
  await vi.waitFor(() => expect(SlowWorker.put).toEqual([1, 3]));
  SlowWorker.answer(nobody);
  expect(await third).toEqual(nobody);
  vi.unstubAllGlobals();
});
