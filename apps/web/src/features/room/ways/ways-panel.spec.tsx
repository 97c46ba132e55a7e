import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import { ARRANGEMENTS, findWaysIn, seatSitter, type SetDocument } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { CastMember } from '@/lib/contract.ts';
import { createPictureMaker } from '../picture.ts';
import { RoomContext, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { MANNEQUINS } from '../sitters.ts';
import { createRoomStore } from '../store.ts';
import { useShownWay } from './shown-way.ts';
import type { WaysQuestion } from './ways.worker.ts';
import { WaysPanel } from './ways-panel.tsx';

/** A worker that answers in this thread: a test has no other. */
class NearWorker {
  onmessage?: (event: { data: unknown }) => void;
  postMessage({ id, document, comers, heightsMm, mayMove }: WaysQuestion) {
    const answer = findWaysIn(document, comers, heightsMm, mayMove);
    queueMicrotask(() => this.onmessage?.({ data: { id, answer } }));
  }
  terminate = () => undefined;
}

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const empty = ARRANGEMENTS.find(({ id }) => id === 'bench-window')?.build() as SetDocument;
const [small, middle] = MANNEQUINS;

function open(document: SetDocument, reducedMotion = false, cast: readonly CastMember[] = []) {
  vi.stubGlobal('Worker', NearWorker);
  vi.stubGlobal('matchMedia', () => ({ matches: reducedMotion, addEventListener: () => undefined }));
  const surroundings: RoomSurroundings = {
    path: { workshopId: 'w', productionId: 'p', setId: 's' },
    setName: 'Dining car',
    canEdit: true,
    detail: 'full',
    style: { system: 'millimetres', roundTo: 8 },
    cast,
    engine,
    maker: createPictureMaker(engine, []),
  };
  render(
    <RoomContext value={surroundings}>
      <RoomStoreProvider store={createRoomStore(document)}>
        <WaysPanel />
      </RoomStoreProvider>
    </RoomContext>,
  );
  return userEvent.setup();
}

const seated = (): SetDocument => {
  const one = seatSitter(empty, 'b1', 1, small ?? null);
  return seatSitter(one, 'b1', 2, middle ?? null);
};

describe('ways in', () => {
  afterEach(() => vi.unstubAllGlobals());

  it('are found when asked for, and say where it is tight and who sits first', async () => {
    const user = open(seated());
    expect(screen.queryByText(/gets in/)).not.toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Show ways in' }));
    expect(await screen.findByText(/gets in\. Tightest between B1 and T1/)).toBeVisible();
    const order = within(screen.getByRole('list')).getAllByRole('listitem');
    expect(order.map((item) => item.textContent)).toEqual([
      expect.stringContaining('50th'),
      expect.stringContaining('5th'),
    ]);
    expect(useShownWay.getState().way?.placeId).toBe('b1:1');
    await user.click(screen.getByRole('button', { name: 'Close ways in' }));
    expect(useShownWay.getState().way).toBeUndefined();
  });

  it('are walked by a button that stops as well', async () => {
    const user = open(seated());
    await user.click(screen.getByRole('button', { name: 'Show ways in' }));
    await user.click(await screen.findByRole('button', { name: 'Walk the way' }));
    await user.click(screen.getByRole('button', { name: 'Stop the walk' }));
    expect(screen.getByRole('button', { name: 'Walk the way' })).toBeVisible();
  });

  it('stand still where motion is unwelcome', async () => {
    const user = open(seated(), true);
    await user.click(screen.getByRole('button', { name: 'Show ways in' }));
    expect(await screen.findByText(/gets in/)).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Walk the way' })).not.toBeInTheDocument();
  });

  it('name those whose measures are not seen here or make no body, and count nothing of them', async () => {
    const member = (id: string, name: string): CastMember => ({ id, name, role: '', colour: 1 });
    const slipped: CastMember = {
      ...member('c2', 'Ben'),
      bodyData: 'men',
      measured: { acromial_height_sitting: { mm: 60 } },
      shoeMm: 25,
      clothing: 'light',
    };
    const first = seatSitter(empty, 'b1', 1, { kind: 'cast', castId: 'c1' });
    const second = seatSitter(first, 'b1', 2, { kind: 'cast', castId: 'c2' });
    const user = open(second, false, [member('c1', 'Ada'), slipped]);
    await user.click(screen.getByRole('button', { name: 'Show ways in' }));
    expect(
      screen.getByText(/^Not known: how Ada and Ben get in, and whether others get past\./),
    ).toBeVisible();
    expect(screen.queryByText(/gets in/)).not.toBeInTheDocument();
  });

  it('ask for people where nobody sits', async () => {
    const user = open(empty);
    await user.click(screen.getByRole('button', { name: 'Show ways in' }));
    expect(screen.getByText(/Seat somebody/)).toBeVisible();
  });

  it('start where people come in, once that is said, as one step', async () => {
    const user = open(seated());
    await user.click(screen.getByRole('button', { name: 'Show ways in' }));
    expect(screen.getByText('From open floor beside the set; no entrance is set.')).toBeVisible();
    await user.type(screen.getByRole('textbox', { name: 'To the right' }), '2000 mm');
    await user.type(screen.getByRole('textbox', { name: 'To the front' }), '2500 mm');
    await user.click(screen.getByRole('button', { name: 'Set the entrance' }));
    expect(screen.getByText('At the spot marked on the plan.')).toBeVisible();
    await screen.findAllByText(/gets in|is stuck/);
    const [first] = useShownWay.getState().way?.steps[0]?.poses ?? [];
    expect(Math.hypot((first?.xMm ?? 0) - 2000, (first?.zMm ?? 0) - 2500)).toBeLessThan(80);
    await user.click(screen.getByRole('button', { name: 'No entrance' }));
    expect(screen.getByText('From open floor beside the set; no entrance is set.')).toBeVisible();
  });
});
