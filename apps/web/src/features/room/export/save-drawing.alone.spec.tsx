import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import { ARRANGEMENTS } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { createPictureMaker } from '../picture.ts';
import { RoomContext } from '../room-context.tsx';
import { createRoomStore, RoomStoreContext } from '../store.ts';
import SaveDrawing from './save-drawing.tsx';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const kept: { name: string; blob: Blob }[] = [];

vi.mock('@/lib/download.ts', () => ({
  keepFile: (blob: Blob, name: string) => kept.push({ blob, name }),
}));

beforeEach(() => kept.splice(0));
afterEach(() => vi.restoreAllMocks());

const benches = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();

function open(document = benches) {
  const store = createRoomStore(document);
  const surroundings = {
    path: { workshopId: 'w', productionId: 'p', setId: 's' },
    setName: 'Dining car',
    canEdit: false,
    detail: 'full' as const,
    style: { system: 'feet-inches', roundTo: 16 } as const,
    cast: [],
    engine,
    maker: createPictureMaker(engine, []),
  };
  render(
    <RoomContext value={surroundings}>
      <RoomStoreContext value={store}>
        <SaveDrawing onClose={() => undefined} />
      </RoomStoreContext>
    </RoomContext>,
  );
}

async function choose(label: RegExp, option: RegExp) {
  fireEvent.click(screen.getByRole('button', { name: label }));
  fireEvent.click(await screen.findByRole('option', { name: option }));
}

it('saves a plan in the units of the set, and says what it will be', async () => {
  open();
  expect(screen.getByRole('img', { name: /^Dining car: Plan\. 23⅞″/ })).toBeInTheDocument();
  expect(screen.getByRole('status')).toHaveTextContent('One sheet of Letter.');
  await choose(/^File/, /DXF/);
  expect(screen.getByRole('status')).toHaveTextContent('Full size, in inches.');
  fireEvent.click(screen.getByRole('button', { name: 'Save' }));
  await waitFor(() => expect(kept).toHaveLength(1));
  expect(kept[0]!.name).toBe('dining-car-plan.dxf');
  expect(await kept[0]!.blob.text()).toContain('AC1021');
});

it('shows a section where it is asked for, and none that cannot be read', async () => {
  open();
  await choose(/^View/, /From the left/);
  fireEvent.click(screen.getByRole('switch', { name: 'Cut the set' }));
  expect(screen.getByRole('img', { name: /Section from the left/ })).toBeInTheDocument();
  const field = screen.getByRole('textbox', { name: /Place of the cut/ });
  fireEvent.change(field, { target: { value: 'here' } });
  fireEvent.blur(field);
  expect(screen.getByRole('button', { name: 'Save' })).toBeDisabled();
});

it('leaves hidden pieces out of every file, and says which', async () => {
  const pieces = benches.pieces.map((piece) => (piece.mark === 'T1' ? { ...piece, hidden: true } : piece));
  open({ ...benches, pieces });
  const told = '1 piece hidden: T1; left out of the file.';
  expect(screen.getByRole('status')).toHaveTextContent(told);
  for (const file of [/PNG/, /glTF/, /SVG/]) {
    await choose(/^File/, file);
    expect(screen.getByRole('status')).toHaveTextContent(told);
  }
  fireEvent.click(screen.getByRole('button', { name: 'Save' }));
  await waitFor(() => expect(kept).toHaveLength(1));
  expect(await kept[0]!.blob.text()).toContain('1 piece hidden: T1.');
});

it('prints no more sheets than anybody joins', async () => {
  const [first, ...others] = benches.pieces;
  open({ ...benches, pieces: [{ ...first!, at: { ...first!.at, xMm: 40_000 } }, ...others] });
  expect(screen.getByRole('button', { name: 'Save' })).toBeEnabled();
  await choose(/^Scale/, /^3″/);
  expect(screen.getByRole('status')).toHaveTextContent(/too many to print; at most 100/);
  expect(screen.getByRole('button', { name: 'Save' })).toBeDisabled();
  await choose(/^File/, /SVG/);
  expect(screen.getByRole('button', { name: 'Save' })).toBeEnabled();
});

it('says in words that no scene stands on the screen', async () => {
  open();
  await choose(/^File/, /PNG/);
  fireEvent.click(screen.getByRole('button', { name: 'Save' }));
  expect(await screen.findByText(/there is no picture of it/)).toBeInTheDocument();
  expect(kept).toEqual([]);
});
