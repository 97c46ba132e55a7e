import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import { ARRANGEMENTS, movePiece } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { act, renderHook } from '@testing-library/react';
import { expect, it } from 'vitest';
import { createPictureMaker } from '../picture.ts';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createRoomStore } from '../store.ts';
import { useDrawn } from './use-drawn.ts';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const maker = createPictureMaker(engine, []);
const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();

it('follows the hand, and stays where it rests until that is counted', () => {
  const store = createRoomStore(document);
  const { result, rerender } = renderHook(({ picture }) => useDrawn(picture), {
    initialProps: { picture: maker.picture(document) },
    wrapper: ({ children }) => <RoomStoreProvider store={store}>{children}</RoomStoreProvider>,
  });
  expect(result.current).toBe(maker.picture(document));
  const [bench] = document.pieces;
  const moved = movePiece(document, bench!.id, { ...bench!.at, xMm: bench!.at.xMm + 400 });
  act(() => store.getState().showMoving(moved));
  expect(result.current.document).toBe(moved);
  act(() => store.getState().rest());
  expect(result.current.document).toBe(moved);
  expect(result.current.carried?.before.has(bench!.id)).toBe(true);
  rerender({ picture: maker.picture(moved) });
  expect(result.current).toBe(maker.picture(moved));
});
