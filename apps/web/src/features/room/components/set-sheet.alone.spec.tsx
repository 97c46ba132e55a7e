import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import { addPiece, emptySetDocument, setParameter, type SetDocument } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { act, fireEvent, screen } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import type { ReactNode } from 'react';
import { expect, it, vi } from 'vitest';
import { PRODUCTION_ID, renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { createPictureMaker } from '../picture.ts';
import { AutosaveContext, RoomContext } from '../room-context.tsx';
import { createAutosave } from '../save/autosave.ts';
import { createRoomStore, RoomStoreContext } from '../store.ts';
import { SetSheet } from './set-sheet.tsx';

// Opening is another thing: here the set is open.
vi.mock('./open-room.tsx', () => ({ OpenRoom: ({ children }: { children: ReactNode }) => children }));

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const added = addPiece(emptySetDocument(), 'bench');
function deep(mm: number): SetDocument {
  const set = setParameter(added.document, added.pieceId, 'seatDepthMm', mm);
  if (!set.ok) throw new Error(set.error.message);
  return set.value;
}
const path = { workshopId: WORKSHOP_ID, productionId: PRODUCTION_ID, setId: 's' };

function open() {
  signInAs('owner');
  server.use(
    http.get('/api/workshops/:w/productions/:p/sets/:s', () =>
      HttpResponse.json({ id: 's', name: 'Dining car', draftNumber: 41 }),
    ),
  );
  const store = createRoomStore(deep(430));
  const outbox = {
    read: () => Promise.resolve(undefined),
    write: () => Promise.resolve(),
    clear: () => Promise.resolve(),
  };
  const base = { number: 41, document: store.getState().document };
  const put = () => Promise.resolve({ kind: 'unreachable' as const });
  const autosave = createAutosave({ store, outbox, put, base });
  const surroundings = {
    path,
    setName: 'Dining car',
    canEdit: true,
    detail: 'full' as const,
    style: { system: 'feet-inches', roundTo: 8 } as const,
    cast: [],
    engine,
    maker: createPictureMaker(engine, []),
  };
  renderPage(
    <RoomContext value={surroundings}>
      <RoomStoreContext value={store}>
        <AutosaveContext value={autosave}>
          <SetSheet path={path}>
            <p>the stick</p>
          </SetSheet>
        </AutosaveContext>
      </RoomStoreContext>
    </RoomContext>,
  );
  return { store, autosave };
}

it('undoes and redoes by the keys, on every page of a set', () => {
  const { store, autosave } = open();
  act(() => store.getState().commit(deep(440), 'Seat depth'));
  fireEvent.keyDown(document.body, { key: 'z', ctrlKey: true });
  expect(store.getState().document).toEqual(deep(430));
  fireEvent.keyDown(document.body, { key: 'Z', ctrlKey: true, shiftKey: true });
  expect(store.getState().document).toEqual(deep(440));
  autosave.stop();
});

it('shows what two people changed in place of the page', async () => {
  const { autosave } = open();
  const theirs = {
    number: 42,
    document: deep(450),
    savedAt: '2027-01-30T10:42:00Z',
    savedBy: { id: 'u2', name: 'Joss Verity' },
  };
  act(() =>
    autosave.state.setState({ save: { kind: 'conflict', conflict: { current: theirs, base: null } } }),
  );
  expect(
    await screen.findByRole('heading', { name: 'Dining car changed while you were working.' }),
  ).toBeVisible();
  expect(screen.queryByText('the stick')).toBeNull();
  autosave.stop();
});

it('says that the draft was not taken, and goes on', () => {
  const { autosave } = open();
  act(() => autosave.state.setState({ save: { kind: 'refused', message: 'Too many pieces.' } }));
  expect(screen.getByRole('alert')).toHaveTextContent('The draft was not taken');
  expect(screen.getByText('the stick')).toBeVisible();
  autosave.stop();
});
