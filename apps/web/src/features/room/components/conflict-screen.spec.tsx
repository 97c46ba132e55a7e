import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import {
  addPiece,
  emptySetDocument,
  parametersOf,
  setParameter,
  type SetDocument,
} from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { createPictureMaker } from '../picture.ts';
import { AutosaveContext, RoomContext, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createAutosave, type DraftConflict, type PutOutcome } from '../save/autosave.ts';
import { createRoomStore } from '../store.ts';
import { ConflictScreen } from './conflict-screen.tsx';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const added = addPiece(emptySetDocument(), 'bench');
const base: SetDocument = {
  ...added.document,
  seating: [
    {
      pieceId: added.pieceId,
      place: 1,
      sitter: { kind: 'mannequin', bodyData: 'women', measure: 'stature', percentile: 5 },
    },
  ],
};

function changed(document: SetDocument, key: string, value: number): SetDocument {
  const result = setParameter(document, added.pieceId, key, value);
  if (!result.ok) throw new Error(result.error.message);
  return result.value;
}

const inches = (n: number) => n * 25.4;
const numberOf = (document: SetDocument, key: string): number =>
  Number(parametersOf(document.pieces[0]!).find((parameter) => parameter.key === key)?.value);

function open() {
  const mine = changed(changed(base, 'seatDepthMm', inches(17)), 'backHeightMm', inches(30));
  const theirs = changed(changed(base, 'seatDepthMm', inches(18.5)), 'backLeanDeg', 10);
  const conflict: DraftConflict = {
    current: {
      number: 42,
      document: theirs,
      savedAt: '2027-01-30T10:42:00Z',
      savedBy: { id: 'u2', name: 'Joss Verity' },
    },
    base: { number: 41, document: base },
  };
  const store = createRoomStore(mine);
  const sent: SetDocument[] = [];
  const put = (baseNumber: number, document: SetDocument): Promise<PutOutcome> => {
    sent.push(document);
    return Promise.resolve({ kind: 'saved', number: baseNumber + 1, savedAt: '2027-01-30T10:50:00Z' });
  };
  const outbox = {
    read: () => Promise.resolve(undefined),
    write: () => Promise.resolve(),
    clear: () => Promise.resolve(),
  };
  const autosave = createAutosave({ store, outbox, put, base: { number: 41, document: base } });
  autosave.state.setState({ save: { kind: 'conflict', conflict } });
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
          <AutosaveContext value={autosave}>
            <ConflictScreen conflict={conflict} />
          </AutosaveContext>
        </RoomStoreProvider>
      </RoomContext>
    </MemoryRouter>,
  );
  return { user: userEvent.setup(), store, sent, autosave };
}

describe('two people edited', () => {
  it('asks only for what both changed, and chooses nothing by itself', () => {
    open();
    const groups = screen.getAllByRole('radiogroup');
    expect(groups).toHaveLength(1);
    expect(groups[0]).toHaveAccessibleName('B1, seat depth');
    for (const radio of screen.getAllByRole('radio')) expect(radio).not.toBeChecked();
    expect(screen.getByRole('button', { name: 'Save these choices' })).toBeDisabled();
    expect(screen.getByText('1 still to choose.')).toBeInTheDocument();
  });

  it('lists what one side changed as kept', () => {
    open();
    expect(screen.getByText('changed by you only, kept')).toBeInTheDocument();
    expect(screen.getByText('changed by Joss only, kept')).toBeInTheDocument();
  });

  it('shows both values with the verdict of who sits there', () => {
    open();
    const group = screen.getByRole('radiogroup', { name: 'B1, seat depth' });
    const [mine, theirs] = within(group).getAllByRole('radio');
    expect(mine).toHaveAccessibleName('Yours: 17″');
    expect(theirs).toHaveAccessibleName('Joss’s: 18½″');
    for (const radio of [mine, theirs])
      expect(radio).toHaveTextContent(/Woman, 5th, seat depth.*(fits|tight|won’t fit)/);
  });

  it('saves the choice together with the changes of either side, on top of their draft', async () => {
    const { user, store, sent, autosave } = open();
    await user.click(screen.getByRole('radio', { name: /^Joss’s/ }));
    await user.click(screen.getByRole('button', { name: 'Save these choices' }));
    await expect.poll(() => sent.length).toBe(1);
    const saved = sent[0]!;
    expect(numberOf(saved, 'seatDepthMm')).toBeCloseTo(inches(18.5), 6);
    expect(numberOf(saved, 'backHeightMm')).toBeCloseTo(inches(30), 6);
    expect(numberOf(saved, 'backLeanDeg')).toBe(10);
    expect(autosave.state.getState().base.number).toBe(43);
    store.temporal.getState().undo();
    expect(numberOf(store.getState().document, 'seatDepthMm')).toBeCloseTo(inches(17), 6);
  });
});
