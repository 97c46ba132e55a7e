import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import { ARRANGEMENTS } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { act, renderHook, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { createPictureMaker } from '../picture.ts';
import type { Cut } from '../scene/views.ts';
import { useView } from './use-view.ts';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const picture = createPictureMaker(engine, []).picture(document);
const ELSEWHERE: Cut = { pointMm: [0, 0, 100], toward: [0, 0, 1] };

beforeEach(() => {
  vi.stubGlobal('matchMedia', () => ({ matches: true }));
});
afterEach(() => {
  vi.unstubAllGlobals();
});

function open() {
  const element = globalThis.document.createElement('div');
  element.getBoundingClientRect = () => new DOMRect(0, 0, 900, 600);
  const sheet = { current: element };
  const { result, rerender } = renderHook(
    ({ section }: { section: Cut | undefined }) =>
      useView(picture, 'A', undefined, sheet, { named: undefined, lens: undefined, section }),
    { initialProps: { section: undefined as Cut | undefined } },
  );
  return { view: () => result.current, rerender };
}

it('takes every step of a wheel that turns faster than the page follows', () => {
  const { view } = open();
  const { zoomBy } = view();
  act(() => {
    zoomBy(1.1);
    zoomBy(1.1);
  });
  expect(view().hand.zoom).toBeCloseTo(1.21, 9);
});

it('stays where the hand moved the sheet, though the page is drawn anew before the hand rests', async () => {
  const { view, rerender } = open();
  const { centreMm: before } = view().controller.frame()!;
  act(() => view().panBy(120, 0));
  const { centreMm: moved } = view().controller.frame()!;
  expect(moved[0]).toBeLessThan(before[0] - 50);
  rerender({ section: ELSEWHERE });
  expect(view().controller.frame()!.centreMm).toEqual(moved);
  await waitFor(() => expect(view().hand.panMm[0]).toBeLessThan(-50));
  expect(view().controller.frame()!.centreMm).toEqual(moved);
});
