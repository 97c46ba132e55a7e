import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import {
  addPiece,
  emptySetDocument,
  parametersOf,
  type PieceOf,
  type SetDocument,
} from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { act, fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { useAnnouncement } from '@/lib/announce.ts';
import { createLabelBoxes } from '../overlay/box.ts';
import { createPictureMaker } from '../picture.ts';
import { RoomContext, usePiece, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createViewController } from '../scene/view-controller.ts';
import type { ViewFrame } from '../scene/view-frame.ts';
import { createRoomStore, undoNames, type RoomStore } from '../store.ts';
import { FRONT_FRAME } from '../test/front-frame.ts';
import HandleLayer from './handle-layer.tsx';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const added = addPiece(emptySetDocument(), 'bench', { xMm: 0, zMm: 0, turnDeg: 0 });
const INCH = 25.4;

/** Straight from in front, one pixel to two millimetres. */
const FRONT: ViewFrame = { ...FRONT_FRAME, target: [0, 500, 0], depthMm: [5000, -5000] };

const FREE = createLabelBoxes();

let store: RoomStore;
let leave: () => void;

function Layer({ controller }: { controller: ReturnType<typeof createViewController> }) {
  const piece = usePiece(added.pieceId);
  return (
    piece && (
      <HandleLayer piece={piece} controller={controller} labels={FREE} cut={undefined} narrow={false} />
    )
  );
}

function open(change: Partial<PieceOf<'bench'>> = {}) {
  const pieces = added.document.pieces.map((piece) => ({ ...piece, lengthMm: 44 * INCH, ...change }));
  store = createRoomStore({ ...added.document, pieces } as SetDocument);
  const surroundings: RoomSurroundings = {
    path: { workshopId: 'w', productionId: 'p', setId: 's' },
    setName: 'Dining car',
    canEdit: true,
    detail: 'full',
    style: { system: 'feet-inches', roundTo: 8 },
    cast: [],
    engine,
    maker: createPictureMaker(engine, []),
  };
  const controller = createViewController();
  controller.resize({ width: 1500, height: 1000 });
  controller.show(FRONT, false);
  const { unmount } = render(
    <RoomContext value={surroundings}>
      <RoomStoreProvider store={store}>
        <Layer controller={controller} />
      </RoomStoreProvider>
    </RoomContext>,
  );
  leave = unmount;
  return userEvent.setup();
}

const bench = (): PieceOf<'bench'> => store.getState().document.pieces[0] as PieceOf<'bench'>;
const right = () => screen.getByRole('button', { name: /^Bench B1 length, right end, .*arrows change it$/ });
const field = () => screen.getByRole('textbox', { name: 'Length' });

/** Takes hold of a handle and goes so far to the right. */
function pull(element: HTMLElement, byPx: number, how: { altKey?: boolean } = {}) {
  fireEvent.pointerDown(element, { pointerId: 1, button: 0, clientX: 900, clientY: 500 });
  fireEvent.pointerMove(element, { pointerId: 1, clientX: 900 + byPx, clientY: 500, ...how });
}
const release = (element: HTMLElement) => fireEvent.pointerUp(element, { pointerId: 1 });

beforeEach(() => {
  useAnnouncement.setState({ text: '', count: 0 });
  HTMLElement.prototype.setPointerCapture = () => undefined;
  vi.stubGlobal('requestAnimationFrame', (run: FrameRequestCallback) => {
    run(0);
    return 0;
  });
});

describe('a handle of the selected piece', () => {
  it('is named with its number in words and what the arrows do', () => {
    open();
    expect(right()).toHaveAccessibleName(
      'Bench B1 length, right end, three feet eight inches, arrows change it',
    );
  });

  it('is not there for a locked piece', () => {
    open({ locked: true });
    expect(screen.queryAllByRole('button')).toEqual([]);
  });

  it('shows the set while it is pulled and takes it as one named step, the other end where it was', () => {
    open();
    pull(right(), 50);
    expect(bench().lengthMm).toBe(44 * INCH);
    const preview = store.getState().moving?.pieces[0] as PieceOf<'bench'>;
    const grown = preview.lengthMm - 44 * INCH;
    expect(Math.abs(grown - 100)).toBeLessThanOrEqual(16);
    release(right());
    expect(bench().lengthMm).toBe(preview.lengthMm);
    expect(bench().at.xMm - bench().lengthMm / 2).toBeCloseTo(-22 * INCH, 6);
    expect(undoNames(store).undo).toMatch(/^B1 length 3′\s8″ to /);
    store.temporal.getState().undo();
    expect(bench().lengthMm).toBe(44 * INCH);
    expect(undoNames(store).undo).toBeUndefined();
  });

  it('keeps to half steps alone with Alt', () => {
    open();
    pull(right(), 51.3, { altKey: true });
    const preview = store.getState().moving?.pieces[0] as PieceOf<'bench'>;
    const half = INCH / 16;
    expect(Math.abs(preview.lengthMm - 44 * INCH - 102.6)).toBeLessThanOrEqual(half / 2 + 1e-6);
    release(right());
  });

  it('says the number in both units while it is pulled', () => {
    open();
    pull(right(), 51.3, { altKey: true });
    expect(document.querySelector('[data-handle-flag]:not([hidden])')).toHaveTextContent(/^Length 4′ .*mm/);
    release(right());
    expect(document.querySelector('[data-handle-flag]:not([hidden])')).toBeNull();
  });

  it('lets everything be as it was on Escape', async () => {
    const user = open();
    const before = store.getState().document;
    pull(right(), 50);
    await user.keyboard('{Escape}');
    release(right());
    expect(store.getState().moving).toBeNull();
    expect(store.getState().preview).toBeNull();
    expect(store.getState().document).toBe(before);
  });

  it('takes a number that is typed while it is pulled, and lets go of the pull', async () => {
    const user = open();
    pull(right(), 50);
    await user.keyboard('4');
    expect(field()).toHaveFocus();
    expect(field()).toHaveValue('4');
    fireEvent.pointerMove(right(), { pointerId: 1, clientX: 1100, clientY: 500 });
    release(right());
    await user.type(field(), '8in{Enter}');
    expect(bench().lengthMm).toBeCloseTo(48 * INCH, 6);
    expect(undoNames(store).undo).toMatch(/^B1 length 3′\s8″ to 4′\s0″$/);
    expect(right()).toHaveFocus();
  });

  it('refuses text that is no length with the reason, and restores all on Escape', async () => {
    const user = open();
    pull(right(), 50);
    await user.keyboard('4');
    await user.type(field(), 'x');
    expect(field()).toBeInvalid();
    await user.keyboard('{Enter}');
    expect(screen.getByRole('alert')).toHaveTextContent('4x');
    expect(store.getState().preview).toBeNull();
    await user.keyboard('{Escape}');
    expect(bench().lengthMm).toBe(44 * INCH);
    expect(undoNames(store).undo).toBeUndefined();
    expect(right()).toHaveFocus();
  });

  it.each([
    ['{ArrowRight}', 1],
    ['{ArrowDown}', -1],
    ['{Shift>}{ArrowUp}{/Shift}', 8],
    ['{Alt>}{ArrowUp}{/Alt}', 0.5],
  ])('goes by steps with %s and says so', async (keys, steps) => {
    const user = open();
    act(() => right().focus());
    await user.keyboard(keys);
    expect(bench().lengthMm).toBeCloseTo(44 * INCH + (steps * INCH) / 8, 6);
    expect(useAnnouncement.getState().text).toMatch(/^Length three feet /);
  });

  it('counts nothing any more when the room is left before the step has come to rest', async () => {
    const user = open();
    act(() => right().focus());
    await user.keyboard('{ArrowRight}');
    expect(store.getState().moving).not.toBeNull();
    leave();
    expect(store.getState().moving).toBeNull();
    expect(bench().lengthMm).toBeCloseTo(44 * INCH + INCH / 8, 6);
  });

  it('stops at the limit of its number', () => {
    open();
    const least = parametersOf(bench()).find(({ key }) => key === 'lengthMm')?.min;
    pull(right(), -500);
    expect(document.querySelector('[data-handle-flag]:not([hidden])')).toHaveTextContent('shortest possible');
    release(right());
    expect(bench().lengthMm).toBe(least);
  });
});
