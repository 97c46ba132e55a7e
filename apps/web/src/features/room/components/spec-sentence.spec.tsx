import { addPiece, emptySetDocument, parametersOf, type SetDocument } from '@settlewright/geometry';
import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import rules from '@settlewright/seed-data/fit-rules.json';
import { act, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it } from 'vitest';
import { useAnnouncement } from '@/lib/announce.ts';
import { createPictureMaker } from '../picture.ts';
import { RoomContext, usePiece, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createRoomStore, undoNames, type RoomStore } from '../store.ts';
import { SpecSentence } from './spec-sentence.tsx';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const added = addPiece(emptySetDocument(), 'bench');
const document: SetDocument = {
  ...added.document,
  seating: [
    {
      pieceId: added.pieceId,
      place: 1,
      sitter: { kind: 'mannequin', bodyData: 'women', measure: 'stature', percentile: 5 },
    },
  ],
};
let store: RoomStore;

function Sentence() {
  const piece = usePiece(added.pieceId);
  return piece && <SpecSentence piece={piece} />;
}

function valueOf(key: string): number {
  const piece = store.getState().document.pieces[0];
  const parameter = piece && parametersOf(piece).find((candidate) => candidate.key === key);
  return Number(parameter?.value);
}

function open(canEdit = true, opened = document) {
  store = createRoomStore(opened);
  const surroundings: RoomSurroundings = {
    path: { workshopId: 'w', productionId: 'p', setId: 's' },
    setName: 'Dining car',
    canEdit,
    detail: 'full',
    style: { system: 'feet-inches', roundTo: 8 },
    cast: [],
    engine,
    maker: createPictureMaker(engine, []),
  };
  render(
    <RoomContext value={surroundings}>
      <RoomStoreProvider store={store}>
        <Sentence />
      </RoomStoreProvider>
    </RoomContext>,
  );
  return userEvent.setup();
}

const seat = () => screen.getByRole('button', { name: /^Seat height, .*edit$/ });
const field = () => screen.getByRole('textbox', { name: 'Seat height' });

beforeEach(() => useAnnouncement.setState({ text: '', count: 0 }));

describe('a number of the spec sentence', () => {
  it('is named with its value in words', () => {
    open();
    expect(seat()).toHaveAccessibleName('Seat height, eighteen inches, edit');
  });

  it('says how long a table is with its leaves in feet and inches', () => {
    const table = addPiece(emptySetDocument(), 'table').document.pieces[0];
    if (table?.kind !== 'table') throw new Error('a table was added');
    const end = { widthMm: 254, down: false };
    const longer = { ...table, id: added.pieceId, lengthMm: 1000, leaves: { left: end, right: end } };
    open(true, { ...emptySetDocument(), pieces: [longer] });
    expect(screen.getByRole('group', { name: /in words$/ })).toHaveTextContent(
      /4′ 11⅜″ long in all as they are\.$/,
    );
  });

  it('takes what is typed on Enter, as one named step, and says the verdicts that changed', async () => {
    const user = open();
    act(() => seat().focus());
    await user.keyboard('{Enter}');
    expect(field()).toHaveValue('18″');
    await user.clear(field());
    await user.type(field(), '15 1/2in');
    expect(store.getState().document).toBe(document);
    expect(store.getState().preview).not.toBeNull();
    await user.keyboard('{Enter}');
    expect(valueOf('pressedSeatHeight')).toBeCloseTo(393.7, 6);
    expect(undoNames(store).undo).toBe('B1 seat height 18″ to 15½″');
    expect(seat()).toHaveFocus();
    expect(useAnnouncement.getState().text).toMatch(
      /^Seat height fifteen and one half inches\..*Woman, 5th, seat height, tight/,
    );
  });

  it('begins with the digit that is typed on it', async () => {
    const user = open();
    act(() => seat().focus());
    await user.keyboard('457mm{Enter}');
    expect(valueOf('pressedSeatHeight')).toBeCloseTo(457, 9);
  });

  it('leaves the old value on Escape and makes no step', async () => {
    const user = open();
    await user.click(seat());
    await user.clear(field());
    await user.type(field(), '16{Escape}');
    expect(store.getState().document).toBe(document);
    expect(store.getState().preview).toBeNull();
    expect(seat()).toHaveFocus();
  });

  it('steps by an eighth, with Shift by an inch, with Alt by a sixteenth', async () => {
    const user = open();
    await user.click(seat());
    await user.keyboard('{ArrowDown}');
    expect(field()).toHaveValue('17 7/8″');
    await user.keyboard('{Shift>}{ArrowDown}{/Shift}');
    expect(field()).toHaveValue('16 7/8″');
    await user.keyboard('{Alt>}{ArrowUp}{/Alt}{Enter}');
    expect(valueOf('pressedSeatHeight')).toBeCloseTo(16.9375 * 25.4, 6);
  });

  it('goes on to the next number with Tab', async () => {
    const user = open();
    await user.click(seat());
    await user.keyboard('{ArrowDown}{Tab}');
    expect(undoNames(store).undo).toBe('B1 seat height 18″ to 17⅞″');
    await expect(screen.findByRole('button', { name: /^Seat depth/ })).resolves.toHaveFocus();
  });

  it('refuses what has two readings, offers both, and keeps the old value until one is chosen', async () => {
    const user = open();
    await user.click(seat());
    await user.clear(field());
    await user.type(field(), '1/6{Enter}');
    expect(field()).toHaveAttribute('aria-invalid', 'true');
    expect(store.getState().document).toBe(document);
    expect(screen.getByRole('alert')).toHaveTextContent('It stays at 18″ until you choose.');
    await user.click(screen.getByRole('button', { name: /457\.2\smm/ }));
    expect(valueOf('pressedSeatHeight')).toBeCloseTo(457.2, 6);
  });

  it('leads with Tab from what could not be read to the ways out, and back to the number', async () => {
    const user = open();
    await user.click(seat());
    await user.clear(field());
    await user.type(field(), '1/5');
    await user.tab();
    expect(screen.getAllByRole('button', { name: /mm$/ })[0]).toHaveFocus();
    await user.keyboard('{Enter}');
    expect(valueOf('pressedSeatHeight')).toBeCloseTo(17 * 25.4, 6);
    expect(seat()).toHaveFocus();
  });

  it('names the limit of what is impossible and offers it', async () => {
    const user = open();
    const limit = parametersOf(document.pieces[0]!).find(({ key }) => key === 'seatDepthMm')!.max;
    await user.click(screen.getByRole('button', { name: /^Seat depth/ }));
    const depth = screen.getByRole('textbox', { name: 'Seat depth' });
    await user.clear(depth);
    await user.type(depth, '9 ft');
    expect(screen.getByRole('alert')).toHaveTextContent(/^Deepest possible is ≈.*39⅜″/);
    await user.click(screen.getByRole('button', { name: 'Use it' }));
    expect(valueOf('seatDepthMm')).toBeCloseTo(limit, 6);
  });

  describe('that goes further than the room it has', () => {
    // A second bench stands 300 to the right of the first, which grows both ways about its middle.
    const bay = addPiece(document, 'bench').document;
    const length = () => screen.getByRole('textbox', { name: 'Length' });
    async function typeLength(text: string) {
      const user = open(true, bay);
      await user.click(screen.getByRole('button', { name: /^Length, / }));
      await user.clear(length());
      await user.type(length(), text);
      return user;
    }

    it('says what it meets, and takes the longest there is with Tab and Enter', async () => {
      const user = await typeLength("6' 6in");
      expect(screen.getByRole('alert')).toHaveTextContent(/^Longest here is 5′.*11½″ \(then it meets B2\)\./);
      await user.tab();
      expect(screen.getByRole('button', { name: 'Use it' })).toHaveFocus();
      expect(store.getState().document).toBe(bay);
      await user.keyboard('{Enter}');
      expect(valueOf('lengthMm')).toBeCloseTo(71.5 * 25.4, 6);
      expect(undoNames(store).undo).toMatch(/^B1 length 4′\s0″ to 5′\s11½″$/);
    });

    it('is kept knowingly with Enter, and the meeting is said', async () => {
      const user = await typeLength("6' 6in{Enter}");
      expect(valueOf('lengthMm')).toBeCloseTo(78 * 25.4, 6);
      expect(useAnnouncement.getState().text).toMatch(/Longest here is 5′\s11½″ \(then it meets B2\)/);
      await user.keyboard('{Enter}');
      expect(screen.getByText(/^Longest here is/)).toBeInTheDocument();
    });

    it('can be kept with a press as well', async () => {
      const user = await typeLength("6' 6in");
      await user.click(screen.getByRole('button', { name: /^Keep 6′/ }));
      expect(valueOf('lengthMm')).toBeCloseTo(78 * 25.4, 6);
    });

    it('names the bay before the limit of the piece itself', async () => {
      const user = await typeLength('200 ft{Enter}');
      expect(store.getState().document).toBe(bay);
      expect(screen.getByRole('alert')).toHaveTextContent(/^Longest here is 5′.*11½″/);
      expect(screen.queryByRole('button', { name: /^Keep/ })).not.toBeInTheDocument();
      await user.click(screen.getByRole('button', { name: 'Use it' }));
      expect(valueOf('lengthMm')).toBeCloseTo(71.5 * 25.4, 6);
    });

    it('goes unmentioned while it has room', async () => {
      await typeLength("5' 6in");
      expect(screen.queryByText(/Longest here/)).not.toBeInTheDocument();
    });
  });

  it('says in both units what is read, and who needs it otherwise', async () => {
    const user = open();
    await user.click(seat());
    expect(screen.getByText(/457\.2\smm/)).toBeInTheDocument();
    expect(screen.getByText(/Woman, 5th needs it lower/)).toBeInTheDocument();
  });

  it('is plain text for those who only read', () => {
    open(false);
    expect(screen.queryByRole('button')).not.toBeInTheDocument();
    expect(screen.getByRole('group')).toHaveTextContent('18″');
  });
});
