import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import rules from '@settlewright/seed-data/fit-rules.json';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { Toaster } from 'sonner';
import { beforeEach, describe, expect, it } from 'vitest';
import { useAnnouncement } from '@/lib/announce.ts';
import { useClipboard } from '../clipboard/use-clipboard.ts';
import { useRoomAddress } from '../hooks/use-address.ts';
import { useChoosing } from '../hooks/use-choosing.ts';
import { useGroupActions } from '../hooks/use-group-actions.ts';
import { usePieceActions } from '../hooks/use-piece-actions.ts';
import { createPictureMaker } from '../picture.ts';
import { RoomContext, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createRoomStore, undoNames, useRoom, type RoomStore } from '../store.ts';
import { ChosenPieces } from './chosen-pieces.tsx';
import { PiecesPanel } from './pieces-panel.tsx';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const banquette = ARRANGEMENTS.find(({ id }) => id === 'banquette')!.build();
let store: RoomStore;

function Desk() {
  const document = useRoom((state) => state.document);
  const address = useRoomAddress();
  const choosing = useChoosing(document, address);
  const group = useGroupActions(address.choose);
  const actions = usePieceActions(address.select);
  const clipboard = useClipboard(address.choose);
  return (
    <>
      <button type="button" onClick={() => choosing.setSeveral(!choosing.several)}>
        Choose several
      </button>
      <PiecesPanel
        document={document}
        selectedPieceId={address.pieceId}
        onSelect={address.select}
        actions={actions}
        several={{ choosing, clipboard }}
      />
      {choosing.pieces.length > 1 && (
        <ChosenPieces document={document} choosing={choosing} actions={group} onCopy={clipboard.copy} />
      )}
    </>
  );
}

function open(document: SetDocument = banquette) {
  store = createRoomStore(document);
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
  render(
    <MemoryRouter>
      <RoomContext value={surroundings}>
        <RoomStoreProvider store={store}>
          <Desk />
          <Toaster />
        </RoomStoreProvider>
      </RoomContext>
    </MemoryRouter>,
  );
  return userEvent.setup();
}

const row = (mark: string) => screen.getByRole('button', { name: new RegExp(`^${mark} ?[A-Z]`) });
const press = (name: string, group?: string) =>
  (group ? within(screen.getByRole('group', { name: group })) : screen).getByRole('button', { name });
const said = () => useAnnouncement.getState().text;
const xOf = (id: string) => store.getState().document.pieces.find((piece) => piece.id === id)?.at.xMm ?? NaN;
const chosenMarks = () =>
  banquette.pieces
    .map(({ mark }) => mark)
    .filter((mark) => row(mark).getAttribute('aria-pressed') === 'true');

beforeEach(() => useAnnouncement.setState({ text: '', count: 0 }));

describe('choosing several pieces in the list', () => {
  it('adds and takes out with Shift or Ctrl and a press, and says who is chosen', async () => {
    const user = open();
    await user.click(row('L1'));
    await user.keyboard('{Shift>}');
    await user.click(row('L2'));
    await user.keyboard('{/Shift}{Control>}');
    await user.click(row('L3'));
    await user.keyboard('{/Control}');
    expect(chosenMarks()).toEqual(['L1', 'L2', 'L3']);
    expect(said()).toBe('L1, L2 and L3 chosen. L1 stays when they line up');
    expect(screen.getByRole('heading', { name: '3 pieces chosen' })).toBeInTheDocument();
    await user.keyboard('{Shift>}');
    await user.click(row('L1'));
    await user.keyboard('{/Shift}');
    expect(said()).toBe('L2 and L3 chosen. L2 stays when they line up');
    await user.click(row('B1'));
    expect(chosenMarks()).toEqual(['B1']);
  });

  it('does the same with keys, and lets go with Escape', async () => {
    const user = open();
    row('L1').focus();
    await user.keyboard('{Enter}');
    row('L3').focus();
    await user.keyboard('{Shift>} {/Shift}');
    row('T1').focus();
    await user.keyboard('{Shift>}{Enter}{/Shift}');
    expect(chosenMarks()).toEqual(['T1', 'L1', 'L3']);
    await user.keyboard('{Control>}a{/Control}');
    expect(chosenMarks()).toHaveLength(banquette.pieces.length);
    expect(said()).toMatch(/^L1, .* chosen\. L1 stays/);
    await user.keyboard('{Escape}');
    expect(chosenMarks()).toEqual([]);
  });

  it('adds with every press once that is switched on, for hands without a Shift key', async () => {
    const user = open();
    await user.click(press('Choose several'));
    await user.click(row('L1'));
    await user.click(row('L2'));
    expect(chosenMarks()).toEqual(['L1', 'L2']);
  });

  it('chooses all of a kind from one piece', async () => {
    const user = open();
    await user.click(row('L3'));
    await user.click(press('More of L3, menu'));
    await user.click(screen.getByRole('menuitem', { name: /^Choose all of its kind/ }));
    expect(chosenMarks()).toEqual(['L1', 'L2', 'L3', 'L4']);
    expect(said()).toMatch(/L3 stays/);
  });
});

describe('several pieces in the hand', () => {
  async function choose(...marks: string[]) {
    const user = open();
    await user.click(press('Choose several'));
    for (const mark of marks) await user.click(row(mark));
    return user;
  }

  it('line up with the one that stays, as one named step', async () => {
    const user = await choose('L2', 'L1', 'L3');
    const before = xOf('l2');
    await user.click(press('Left', 'Line up'));
    expect([xOf('l1'), xOf('l2'), xOf('l3')].map((x) => Math.round(x - before))).toEqual([0, 0, 0]);
    expect(undoNames(store).undo).toBe('Line up 3 pieces on the left');
    expect(said()).toMatch(/^Line up 3 pieces on the left/);
    store.temporal.getState().undo();
    expect(store.getState().document).toBe(banquette);
  });

  it.each([
    ['Line up', 'Middles, left to right', 'Already in line on their middles, left to right.'],
    ['Space evenly', 'Left to right', 'Already spaced evenly, left to right.'],
  ])('%s a second time changes nothing and says so', async (group, button, words) => {
    const user = await choose('L1', 'L2', 'L4');
    await user.click(press(button, group));
    const after = store.getState().document;
    expect(after).not.toBe(banquette);
    await user.click(press(button, group));
    expect(await screen.findByText(words)).toBeVisible();
    expect(store.getState().document).toBe(after);
  });

  it('say that all the others are locked', async () => {
    const pieces = banquette.pieces.map((one) => (one.id === 'l2' ? { ...one, locked: true } : one));
    const user = open({ ...banquette, pieces });
    await user.click(press('Choose several'));
    for (const mark of ['L1', 'L2']) await user.click(row(mark));
    await user.click(press('Left', 'Line up'));
    expect(await screen.findByText('L2 is locked and stays.')).toBeVisible();
    expect(undoNames(store).undo).toBeUndefined();
  });

  it('let another one stay', async () => {
    const user = await choose('L2', 'L1');
    expect(screen.getByText(/^L2 stays where it is/)).toBeInTheDocument();
    await user.click(press('L1 stays'));
    expect(screen.getByText(/^L1 stays where it is/)).toBeInTheDocument();
    const before = xOf('l1');
    await user.click(press('Middles, left to right'));
    expect(xOf('l2')).toBeCloseTo(before, 6);
    expect(xOf('l1')).toBe(before);
  });

  it('are spaced evenly once there are three', async () => {
    const user = await choose('L1', 'L2');
    expect(screen.getAllByRole('button', { name: 'Left to right' })[0]).toBeDisabled();
    await user.click(row('L4'));
    await user.click(press('Left to right', 'Space evenly'));
    expect(xOf('l2') - xOf('l1')).toBeCloseTo(xOf('l4') - xOf('l2'), 6);
    expect(undoNames(store).undo).toBe('Space 3 pieces evenly, left to right');
  });

  it('are turned, copied and removed as one step each, the copies then in the hand', async () => {
    const user = await choose('T1', 'L1');
    await user.click(press('Turn 15° left'));
    expect(undoNames(store).undo).toBe('Turn 2 pieces 15° left');
    await user.click(press('Copy', 'All together'));
    expect(undoNames(store).undo).toBe('Copy 2 pieces');
    expect(said()).toMatch(/Copy 2 pieces/);
    expect(screen.getByText(/^T3 stays where it is/)).toBeInTheDocument();
    await user.click(press('Remove'));
    expect(undoNames(store).undo).toBe('Remove 2 pieces');
    expect(store.getState().document.pieces).toHaveLength(banquette.pieces.length);
    expect(store.temporal.getState().pastStates).toHaveLength(3);
  });

  it('take a number together, and say that they differ', async () => {
    const user = await choose('T1', 'T2');
    await user.click(press('Their numbers'));
    const width = screen.getByRole('textbox', { name: 'Width' });
    await user.click(width);
    await user.clear(width);
    await user.type(width, '28in{Enter}');
    const widths = store
      .getState()
      .document.pieces.flatMap((one) => (one.kind === 'table' ? [one.widthMm] : []));
    expect(widths).toEqual([expect.closeTo(711.2, 6), expect.closeTo(711.2, 6)]);
    expect(undoNames(store).undo).toBe('Width of 2 table pieces to 28″');
  });

  it('say plainly that numbers need one kind', async () => {
    await choose('T1', 'L1');
    expect(screen.queryByRole('button', { name: 'Their numbers' })).not.toBeInTheDocument();
    expect(screen.getByText(/^Numbers are changed for pieces of one kind/)).toBeInTheDocument();
  });

  it('say which is locked and stays', async () => {
    const locked = {
      ...banquette,
      pieces: banquette.pieces.map((one) => (one.id === 'l2' ? { ...one, locked: true } : one)),
    };
    const user = open(locked);
    await user.click(press('Choose several'));
    for (const mark of ['L1', 'L2', 'L3']) await user.click(row(mark));
    await user.click(press('Front'));
    expect(await screen.findByText('Already in line at the front.')).toBeVisible();
    expect(undoNames(store).undo).toBeUndefined();
    await user.click(press('Left', 'Line up'));
    expect(said()).toMatch(/L2 is locked and stays/);
    expect(xOf('l3')).toBeCloseTo(xOf('l1'), 6);
    expect(xOf('l2')).toBe(banquette.pieces.find(({ id }) => id === 'l2')?.at.xMm);
  });
});
