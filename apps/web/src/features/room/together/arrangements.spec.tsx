import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import rules from '@settlewright/seed-data/fit-rules.json';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { expect, it, vi } from 'vitest';
import { renderPage, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { createPictureMaker } from '../picture.ts';
import { RoomContext, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createRoomStore, undoNames, type RoomStore } from '../store.ts';
import KeepArrangement from './keep-arrangement.tsx';
import PutArrangement from './put-arrangement.tsx';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const booth = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const ROUTE = `*/api/workshops/${WORKSHOP_ID}/arrangements`;
const kept = { id: 'a1', name: 'Booth of four', document: booth, keptAt: '2026-01-20T10:00:00Z' };

const surroundings: RoomSurroundings = {
  path: { workshopId: WORKSHOP_ID, productionId: 'p', setId: 's' },
  setName: 'Dining car',
  canEdit: true,
  detail: 'full',
  style: { system: 'feet-inches', roundTo: 8 },
  cast: [],
  engine,
  maker: createPictureMaker(engine, []),
};

function open(element: React.JSX.Element, store: RoomStore = createRoomStore(booth)) {
  renderPage(
    <RoomContext value={surroundings}>
      <RoomStoreProvider store={store}>{element}</RoomStoreProvider>
    </RoomContext>,
  );
  return { store, user: userEvent.setup() };
}

it('keeps pieces in the workshop with nobody in them, under a name', async () => {
  const sent = vi.fn<(body: { name: string; document: SetDocument }) => void>();
  server.use(
    http.post(ROUTE, async ({ request }) => {
      sent((await request.json()) as { name: string; document: SetDocument });
      return HttpResponse.json(kept, { status: 201 });
    }),
  );
  const onClose = vi.fn();
  const { user } = open(<KeepArrangement pieces={booth.pieces.slice(0, 2)} onClose={onClose} />);
  await user.click(screen.getByRole('button', { name: 'Keep it' }));
  expect(screen.getByText(/Name the arrangement/)).toBeInTheDocument();
  await user.type(screen.getByRole('textbox', { name: 'Name of the arrangement' }), 'Booth of four');
  await user.click(screen.getByRole('button', { name: 'Keep it' }));
  await waitFor(() => expect(onClose).toHaveBeenCalled());
  const [{ name, document }] = sent.mock.calls[0]!;
  expect(name).toBe('Booth of four');
  expect(document.pieces.map(({ mark }) => mark)).toEqual(booth.pieces.slice(0, 2).map(({ mark }) => mark));
  expect(document.seating).toEqual([]);
});

it('puts a kept arrangement into the set as one step, with free marks', async () => {
  server.use(http.get(ROUTE, () => HttpResponse.json({ items: [kept], total: 1, page: 1, pageSize: 200 })));
  const [onChoose, onClose] = [vi.fn(), vi.fn()];
  const { store, user } = open(<PutArrangement onChoose={onChoose} onClose={onClose} />);
  await user.click(await screen.findByRole('button', { name: 'Put in Booth of four' }));
  const { pieces } = store.getState().document;
  expect(pieces).toHaveLength(2 * booth.pieces.length);
  expect(new Set(pieces.map(({ mark }) => mark)).size).toBe(pieces.length);
  expect(undoNames(store).undo).toBe('Put in “Booth of four”');
  expect(onChoose).toHaveBeenCalledWith(pieces.slice(booth.pieces.length).map(({ id }) => id));
  expect(onClose).toHaveBeenCalled();
});

it('takes one off the list at the second press, and says where the first comes from', async () => {
  let items = [kept];
  server.use(
    http.get(ROUTE, () => HttpResponse.json({ items, total: items.length, page: 1, pageSize: 200 })),
    http.delete(`${ROUTE}/a1`, () => {
      items = [];
      return new HttpResponse(null, { status: 204 });
    }),
  );
  const { user } = open(<PutArrangement onChoose={vi.fn()} onClose={vi.fn()} />);
  await user.click(
    await screen.findByRole('button', { name: 'Take Booth of four off the list, asks first' }),
  );
  const again = () => screen.getByRole('button', { name: 'Take it off for the whole workshop' });
  expect(again()).toHaveFocus();
  await user.tab();
  await user.click(screen.getByRole('button', { name: /asks first$/ }));
  expect(items).toEqual([kept]);
  await user.click(again());
  expect(await screen.findByText(/None is kept yet/)).toBeInTheDocument();
});
