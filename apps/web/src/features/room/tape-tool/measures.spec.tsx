import { ARRANGEMENTS, deriveParts, type SetDocument } from '@settlewright/geometry';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it } from 'vitest';
import type { RoomPicture } from '../picture.ts';
import { RoomContext, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createRoomStore } from '../store.ts';
import Measures from './measures.tsx';
import { useTapeTool } from './tape-store.ts';

const start = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const table = start.pieces.find((piece) => piece.kind === 'table')!;
const pictureOf = (document: SetDocument) =>
  ({ document, parts: deriveParts(document), bodies: [] }) as unknown as RoomPicture;

function open(canEdit = true) {
  const store = createRoomStore(start);
  const room = {
    path: { setId: 's' },
    canEdit,
    detail: 'full',
    style: { system: 'millimetres', roundTo: 8 },
    maker: { picture: pictureOf },
  } as unknown as RoomSurroundings;
  render(
    <RoomStoreProvider store={store}>
      <RoomContext value={room}>
        <Measures />
      </RoomContext>
    </RoomStoreProvider>,
  );
  return store;
}

async function choose(label: 'From' | 'To', corner: string) {
  await userEvent.click(screen.getByRole('button', { name: new RegExp(`^${label}, piece`) }));
  await userEvent.click(screen.getByRole('option', { name: new RegExp(`^${table.mark} `) }));
  await userEvent.type(screen.getByRole('combobox', { name: `${label}, point` }), corner);
  await userEvent.click(screen.getByRole('option', { name: `${corner} of ${table.mark} top` }));
}

async function layAlongTheTop() {
  await choose('From', 'front left upper corner');
  await choose('To', 'front right upper corner');
  await userEvent.click(screen.getByRole('button', { name: 'Lay the tape' }));
}

describe('Measures', () => {
  beforeEach(() => useTapeTool.setState({ tapes: {} }));

  it('measures between two corners by name, in both units and three shares', async () => {
    open();
    await layAlongTheTop();
    const tapes = within(screen.getByRole('list', { name: 'Tapes' }));
    expect(tapes.getByText(new RegExp(`^${Math.round(table.lengthMm)}.mm \\(.*″\\)$`))).toBeVisible();
    // The table stands turned: its length runs along the room.
    expect(tapes.getByText(/^across 0.mm, up 0.mm, along [1-9]\d+.mm$/)).toBeVisible();
  });

  it('pins a tape in one step that can be undone', async () => {
    const store = open();
    await layAlongTheTop();
    await userEvent.click(screen.getByRole('button', { name: /^Pin / }));
    expect(store.getState().document.dimensions).toHaveLength(1);
    expect(store.getState().step).toBe('Dimension line pinned');
    expect(screen.queryByRole('list', { name: 'Tapes' })).toBeNull();
    expect(screen.getByRole('list', { name: 'Pinned dimension lines' })).toBeVisible();
    store.temporal.getState().undo();
    expect(store.getState().document).toEqual(start);
  });

  it('offers no pin to whoever may not change the set', async () => {
    open(false);
    await layAlongTheTop();
    expect(screen.queryByRole('button', { name: /^Pin / })).toBeNull();
    await userEvent.click(screen.getByRole('button', { name: /^Remove / }));
    expect(screen.queryByRole('list', { name: 'Tapes' })).toBeNull();
  });
});
