import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import rules from '@settlewright/seed-data/fit-rules.json';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { Toaster } from 'sonner';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
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
import { ChosenPieces } from '../components/chosen-pieces.tsx';
import { PiecesPanel } from '../components/pieces-panel.tsx';
import HandFormPanel from './hand-form-panel.tsx';
import { HiddenNote } from './hidden-note.tsx';
import { wipeClip } from '../clipboard/clip.ts';

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
      <HiddenNote document={document} actions={group} />
      <HandFormPanel choose={address.choose} />
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
const said = () => useAnnouncement.getState().text;
const docNow = () => store.getState().document;
const at = (id: string) => docNow().pieces.find((piece) => piece.id === id)?.at;

async function chooseTwo(user: ReturnType<typeof userEvent.setup>, one: string, other: string) {
  await user.click(row(one));
  await user.keyboard('{Shift>}');
  await user.click(row(other));
  await user.keyboard('{/Shift}');
}

beforeEach(() => useAnnouncement.setState({ text: '' }));
afterEach(wipeClip);

describe('chosen pieces', () => {
  it('are mirrored about their middle as one step that is seen before it is taken', async () => {
    const user = open();
    await chooseTwo(user, 'T1', 'L1');
    const [t1, l1] = [at('t1'), at('l1')];
    await user.click(screen.getByRole('button', { name: 'Mirror' }));
    const form = screen.getByRole('form', { name: 'Mirror T1 and L1' });
    expect(store.getState().preview).not.toBeNull();
    expect(docNow()).toBe(store.getState().document);
    expect(at('l1')).toEqual(l1);
    await user.click(within(form).getByRole('button', { name: 'Mirror' }));
    expect(at('l1')?.xMm).not.toBeCloseTo(l1?.xMm ?? 0, 0);
    expect(at('t1')?.zMm).toBeCloseTo(t1?.zMm ?? 0, 3);
    expect(undoNames(store).undo).toBe('Mirror T1 and L1 about their middle, left and right');
    expect(said()).toContain('Mirror T1 and L1');
    expect(store.getState().preview).toBeNull();
  });

  it('leave everything as it was on Escape', async () => {
    const user = open();
    await chooseTwo(user, 'T1', 'L1');
    await user.click(screen.getByRole('button', { name: 'Mirror' }));
    await user.keyboard('{Escape}');
    expect(screen.queryByRole('form')).not.toBeInTheDocument();
    expect(store.getState().preview).toBeNull();
    expect(docNow()).toBe(banquette);
  });

  it('stand in a row along a wall, on whole boards, as one step', async () => {
    const user = open();
    await chooseTwo(user, 'T1', 'L1');
    await user.click(screen.getByRole('button', { name: 'Repeat in a row' }));
    const form = screen.getByRole('form', { name: 'Repeat T1 and L1 in a row' });
    const count = within(form).getByRole('textbox', { name: 'How many in all' });
    await user.clear(count);
    await user.type(count, '1');
    expect(within(form).getByText(/A whole number from 2 to/)).toBeVisible();
    expect(within(form).getByRole('button', { name: 'Set the row' })).toBeDisabled();
    await user.clear(count);
    await user.type(count, '4');
    await user.click(within(form).getByRole('button', { name: /^Take \d+ whole boards of W1/ }));
    await user.click(within(form).getByRole('button', { name: 'Set the row' }));
    expect(docNow().pieces).toHaveLength(banquette.pieces.length + 6);
    expect(undoNames(store).undo).toMatch(/^Row of 4 of T1 and L1, .* apart$/);
    const steps = ['t1', 't3', 't4', 't5'].map((id) => at(id)?.xMm ?? NaN);
    const pitch = (steps[1] ?? 0) - (steps[0] ?? 0);
    expect((steps[3] ?? 0) - (steps[0] ?? 0)).toBeCloseTo(3 * pitch, 6);
  });

  it('are hidden and shown again, and locked pieces are not removed', async () => {
    const user = open();
    await chooseTwo(user, 'T1', 'L1');
    await user.click(screen.getByRole('button', { name: 'Hide' }));
    expect(screen.getByText(/2 pieces hidden, still measured: T1 and L1/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Show L1' }));
    expect(docNow().pieces.find(({ id }) => id === 'l1')).not.toHaveProperty('hidden');
    await user.click(screen.getByRole('button', { name: 'Lock' }));
    expect(screen.getByRole('button', { name: 'Remove' })).toBeDisabled();
    expect(said()).toContain('2 pieces locked');
  });

  it('are kept as a group that one press chooses', async () => {
    const user = open();
    await chooseTwo(user, 'T1', 'L1');
    await user.click(screen.getByRole('button', { name: 'Keep as a group' }));
    await user.type(screen.getByRole('textbox', { name: 'Name of the group' }), 'Left table');
    await user.click(screen.getByRole('button', { name: 'Keep it' }));
    await user.click(row('B1'));
    await user.click(screen.getByRole('button', { name: 'Choose Left table: T1 and L1' }));
    expect(screen.getByRole('heading', { name: '2 pieces chosen' })).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Let go of the group Left table' }));
    expect(docNow().groups).toBeUndefined();
  });

  it('are copied and pasted beside, with new marks', async () => {
    const user = open();
    await chooseTwo(user, 'T1', 'L1');
    await user.click(screen.getByRole('button', { name: 'Copy for another set' }));
    await user.click(screen.getByRole('button', { name: 'Paste T1 and L1 from Dining car' }));
    expect(docNow().pieces.map(({ mark }) => mark)).toEqual(expect.arrayContaining(['T3', 'L5']));
    expect(said()).toContain('T1 is T3 here and L1 is L5 here');
    expect(undoNames(store).undo).toBe('Paste T1 and L1');
  });
});
