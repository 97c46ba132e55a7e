import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import { ARRANGEMENTS, type FoamGrade, type SetDocument } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { act, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it } from 'vitest';
import type { NewTestSit, TestSit } from '@/lib/contract.ts';
import { renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { usePieceActions } from '../hooks/use-piece-actions.ts';
import { createPictureMaker } from '../picture.ts';
import { RoomContext, type RoomSurroundings } from '../room-context.tsx';
import { RoomStoreProvider } from '../room-store-provider.tsx';
import { createRoomStore, undoNames, useRoom, type RoomStore } from '../store.ts';
import { CushionsButton } from './cushions-button.tsx';
import { foamEffect, withFoam } from './foam-effect.ts';
// The button fetches it when it is pressed: here it is there already.
import './make-dialog.tsx';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const maker = createPictureMaker(engine, []);
const start = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const seated: SetDocument = {
  ...start,
  seating: [5, 95].map((percentile, i) => ({
    pieceId: 'b1',
    place: i + 1,
    sitter: { kind: 'mannequin', bodyData: i === 0 ? 'women' : 'men', measure: 'stature', percentile },
  })),
};

const CAST = [{ id: 'c1', name: 'Ottilie Brandt', role: '', colour: 1, weightKg: 77 }];

function Row() {
  const piece = useRoom((state) => state.document.pieces.find(({ id }) => id === 'b1')!);
  const actions = usePieceActions(() => {});
  return <CushionsButton piece={piece} actions={actions} />;
}

const ownFoams: FoamGrade[] = [];

async function open(canEdit = true, detail: RoomSurroundings['detail'] = 'full'): Promise<RoomStore> {
  signInAs('designer');
  const kept = {
    number: 0,
    settings: { allowancesMm: {}, foams: ownFoams },
    changedAt: null,
    changedByName: null,
  };
  server.use(http.get('*/api/workshops/:id/cushion-settings', () => HttpResponse.json(kept)));
  const store = createRoomStore(seated);
  const surroundings: RoomSurroundings = {
    path: { workshopId: WORKSHOP_ID, productionId: 'p', setId: 's' },
    setName: 'Dining car',
    canEdit,
    detail,
    style: { system: 'feet-inches', roundTo: 8 },
    cast: CAST,
    engine,
    maker,
  };
  renderPage(
    <RoomContext value={surroundings}>
      <RoomStoreProvider store={store}>
        <Row />
      </RoomStoreProvider>
    </RoomContext>,
  );
  await userEvent.click(screen.getByRole('button', { name: 'Cushions' }));
  await screen.findByRole('dialog', { name: 'Cushions of B1' });
  return store;
}

async function pick(label: RegExp, option: string | RegExp) {
  await userEvent.click(screen.getByRole('button', { name: label }));
  await userEvent.click(await screen.findByRole('option', { name: option }));
}

describe('what is chosen of a cushion', () => {
  it('is one undoable step by name, drawn at once', async () => {
    const store = await open();
    await pick(/^Construction,/, 'knife edge');
    expect(store.getState().document.cushions?.['b1/seat-1']?.make?.construction).toBe('knife-edge');
    expect(undoNames(store).undo).toBe('C1 made knife edge, zip at the back edge, welt cut straight');
    store.temporal.getState().undo();
    expect(store.getState().document.cushions).toBeUndefined();
    expect(screen.getByRole('img', { name: /^Plan of C1/ })).toBeVisible();
  });

  it('says in words what cannot be made', async () => {
    await open();
    await pick(/^Construction,/, 'bullnose front');
    await pick(/^Closed at the edge,/, 'front');
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'It cannot be made so: a bullnose front closes at the back edge.',
    );
  });

  it('takes a taper when the field is left, and cuts a notch', async () => {
    const store = await open();
    await userEvent.click(screen.getByRole('button', { name: 'Shape' }));
    const field = screen.getByLabelText('Front in at the sitter’s left');
    await userEvent.clear(field);
    await userEvent.type(field, '2');
    await userEvent.tab();
    await userEvent.click(screen.getByRole('button', { name: 'Cut a notch' }));
    const { shape } = store.getState().document.cushions!['b1/seat-1']!;
    expect(shape?.frontInMm?.left).toBeCloseTo(50.8, 6);
    expect(shape?.notches).toHaveLength(1);
  });

  it('marks where it is to look used, by name or by a rectangle, and hatches it', async () => {
    const store = await open();
    const wear = () => store.getState().document.cushions?.['b1/seat-1']?.wear;
    await userEvent.click(screen.getByRole('button', { name: 'Marked wear' }));
    await userEvent.click(screen.getByRole('button', { name: 'Mark an area' }));
    expect(wear()).toEqual([{ place: 'front-edge', look: 'fade' }]);
    await pick(/^Looks,/, 'stained');
    await pick(/^Where,/, 'area');
    const from = screen.getByLabelText('From that end');
    await userEvent.clear(from);
    await userEvent.type(from, '2');
    await userEvent.tab();
    await userEvent.type(screen.getByLabelText('Note (optional)'), 'tea');
    await userEvent.tab();
    expect(wear()).toMatchObject([
      { place: 'area', areaMm: { fromEnd: 'left', fromSideMm: 50.8 }, look: 'stain', note: 'tea' },
    ]);
    const plan = screen.getByRole('img', { name: /^Plan of C1/ });
    expect(plan).toHaveTextContent('A1');
    expect(undoNames(store).undo).toBe('C1 marked wear A1 changed');
    await userEvent.click(screen.getByRole('button', { name: 'Take A1 away' }));
    expect(store.getState().document.cushions).toBeUndefined();
  });

  it('changes nothing for those who only read', async () => {
    await open(false);
    expect(screen.getByRole('button', { name: /^Construction,/ })).toBeDisabled();
    expect(screen.queryByRole('button', { name: 'Shape' })).toBeNull();
  });
});

describe('another foam', () => {
  it('is told before it is taken, with the lightest and the heaviest who sit', async () => {
    const store = await open();
    await userEvent.click(screen.getByRole('button', { name: /^Foam, and what another/ }));
    const seats = screen.getAllByText(/seat .* off the floor at the front/);
    expect(seats).toHaveLength(2);
    await pick(/^Try another foam,/, /^quick-dry outdoors/);
    expect(screen.getByRole('table', { name: 'Verdicts before and after' })).toBeVisible();
    expect(store.getState().document).toBe(seated);
    await userEvent.click(screen.getByRole('button', { name: 'Take it' }));
    const bench = store.getState().document.pieces.find(({ id }) => id === 'b1');
    expect(bench?.kind === 'bench' && bench.seatCushion.foam.grade).toBe('quick-dry outdoors');
    expect(within(screen.getByRole('dialog')).queryByRole('table')).toBeNull();
  });

  it('in layers and with a wrap is taken as the workshop buys it', async () => {
    const layer = { name: 'layer', densityKgM3: 40, thicknessMm: 50, ifd25N: 150 };
    ownFoams.push({
      ...{
        name: 'two on one',
        use: 'seat',
        densityKgM3: 40,
        ifd25N: 200,
        supportFactor: 2,
        thicknessMm: 100,
      },
      ...{ layers: [layer, { ...layer, ifd25N: 300 }], wrapMm: 25.4 },
    });
    server.use(http.get('*/sets/s/test-sits', () => HttpResponse.json({ items: [], total: 0 })));
    const store = await open();
    ownFoams.length = 0;
    await userEvent.click(screen.getByRole('button', { name: /^Foam, and what another/ }));
    await pick(/^Try another foam,/, /^two on one/);
    await userEvent.click(screen.getByRole('button', { name: 'Take it' }));
    const bench = store.getState().document.pieces.find(({ id }) => id === 'b1');
    expect(bench?.kind === 'bench' && bench.seatCushion.foam).toMatchObject({
      layers: [
        { share: 0.5, times: 0.75 },
        { share: 0.5, times: 1.5 },
      ],
      wrap: { thicknessMm: 25.4, lostMm: 12.7 },
    });
    expect(
      screen.getByText(/in 2 layers, with 1″ of wrap over it, of which ½″ is lost under a sitter/),
    ).toBeVisible();
  });

  it('that is softer lets everybody down, the heaviest most, within its band', () => {
    const piece = seated.pieces.find((one) => one.id === 'b1')!;
    if (piece.kind !== 'bench') throw new Error('no bench');
    const soft = { ...piece.seatCushion.foam, grade: 'soft', ifd25N: 120 };
    const changed = withFoam(piece, 'seat', soft, piece.seatCushion.thicknessMm);
    const after = { ...seated, pieces: seated.pieces.map((one) => (one.id === 'b1' ? changed : one)) };
    const bodies = maker.picture(seated).bodies;
    const was = foamEffect({ before: seated, after: seated, piece }, maker.check, bodies, engine.ruleBook);
    const is = foamEffect({ before: seated, after, piece: changed }, maker.check, bodies, engine.ruleBook);
    expect(was.changes).toEqual([]);
    expect(is.before).toEqual(was.before);
    for (const who of ['lightest', 'heaviest'] as const) {
      const { low, best, high } = is[who].heightMm;
      expect(low).toBeLessThanOrEqual(best);
      expect(best).toBeLessThanOrEqual(high);
      expect(best).toBeLessThan(was[who].heightMm.best);
    }
    expect(is.heaviest.heightMm.best).toBeLessThan(is.lightest.heightMm.best);
    expect(changed.deckHeightMm).toBe(piece.deckHeightMm);
  });
});

describe('test sits', () => {
  const seatOf = (store: RoomStore) => {
    const bench = store.getState().document.pieces.find(({ id }) => id === 'b1');
    if (bench?.kind !== 'bench') throw new Error('no bench');
    return bench.seatCushion;
  };
  const keysSorted = (value: unknown) =>
    JSON.stringify(value, (_key, one: unknown) =>
      one && typeof one === 'object' && !Array.isArray(one)
        ? Object.fromEntries(Object.entries(one).sort(([a], [b]) => a.localeCompare(b)))
        : one,
    );
  const sits: TestSit[] = [];
  const sent: NewTestSit[] = [];
  beforeEach(() => {
    sits.length = 0;
    sent.length = 0;
    server.use(
      http.get('*/sets/s/test-sits', () => HttpResponse.json({ items: sits, total: sits.length })),
      http.post('*/sets/s/test-sits', async ({ request }) => {
        const body = (await request.json()) as NewTestSit;
        sent.push(body);
        const { note = '', weightKg = 77 } = body;
        const kept = { ...body, note, weightKg, id: `sit-${sits.length}`, name: 'Ottilie Brandt' };
        sits.push({ ...kept, predictedMm: 16 });
        return HttpResponse.json(sits.at(-1), { status: 201 });
      }),
      http.delete('*/sets/s/test-sits/:id', ({ params }) => {
        sits.splice(0, sits.length, ...sits.filter(({ id }) => id !== params.id));
        return new HttpResponse(null, { status: 204 });
      }),
    );
  });
  const show = async (canEdit?: boolean, detail?: RoomSurroundings['detail']) => {
    const store = await open(canEdit, detail);
    await userEvent.click(screen.getByRole('button', { name: 'Test sits' }));
    return store;
  };

  it('are kept by keyboard, counted with by one undoable step, and taken out', async () => {
    const store = await show();
    const user = userEvent.setup();
    expect(await screen.findByText(/No test sits are kept/)).toBeVisible();
    await pick(/^Who sat,/, 'Ottilie Brandt');
    await user.type(screen.getByLabelText('It went down'), '1{Enter}');
    expect(await screen.findByRole('table', { name: 'Test sits of this set' })).toHaveTextContent(
      'Ottilie Brandt',
    );
    expect(sent).toMatchObject([{ castId: 'c1', grade: 'firm seat', thicknessMm: 95.25, measuredMm: 25.4 }]);
    expect(sent[0]).not.toHaveProperty('weightKg');
    await user.click(await screen.findByRole('button', { name: 'Count with it' }));
    const { tested } = seatOf(store).foam;
    expect(tested).toMatchObject({ sits: 1, on: sent[0]?.satOn, of: { thicknessMm: 95.25 } });
    expect(tested!.factor).toBeGreaterThan(1);
    expect(JSON.stringify(store.getState().document)).not.toMatch(/weightKg|Ottilie/);
    expect(undoNames(store).undo).toBe('B1 seat foam by one test sit');
    expect(screen.getByText(/^The set counts with it: by one test sit/)).toBeVisible();
    // The server keeps the document with its keys in an order of its own.
    act(() =>
      store.setState(({ document }) => ({ document: JSON.parse(keysSorted(document)) as typeof document })),
    );
    expect(seatOf(store).foam.tested).not.toBe(tested);
    expect(screen.queryByRole('button', { name: 'Count with it' })).not.toBeInTheDocument();
    act(() => store.temporal.getState().undo());
    store.temporal.getState().undo();
    expect(seatOf(store).foam.tested).toBeUndefined();
    await user.click(await screen.findByRole('button', { name: /^Take the sit of Ottilie Brandt/ }));
    expect(await screen.findByText(/No test sits are kept/)).toBeVisible();
  });

  it('calibrate layers in a wrap, and only those', async () => {
    const store = await show();
    const layered = {
      layers: [
        { share: 0.25, times: 0.7 },
        { share: 0.75, times: 1.4 },
      ],
      wrap: { thicknessMm: 12.7, lostMm: 6.35 },
    };
    act(() =>
      store.setState(({ document }) => ({
        document: {
          ...document,
          pieces: document.pieces.map((piece) =>
            piece.kind === 'bench'
              ? {
                  ...piece,
                  seatCushion: { ...piece.seatCushion, foam: { ...piece.seatCushion.foam, ...layered } },
                }
              : piece,
          ),
        },
      })),
    );
    expect(screen.getByText(/^A sit on firm seat, 3¾″, in 2 layers, ½″ of wrap, as B1/)).toBeVisible();
    await pick(/^Who sat,/, 'Ottilie Brandt');
    await userEvent.type(screen.getByLabelText('It went down'), '1{Enter}');
    await userEvent.click(await screen.findByRole('button', { name: 'Count with it' }));
    expect(sent).toMatchObject([layered]);
    expect(seatOf(store).foam.tested).toMatchObject({ sits: 1, of: layered });
  });

  it('say what is missing before anything is sent', async () => {
    await show();
    await screen.findByText(/No test sits are kept/);
    await userEvent.click(screen.getByRole('button', { name: 'Keep this sit' }));
    for (const words of ['Who sat?', 'How heavy?', 'How far did it go down?']) {
      expect(screen.getByText(words)).toBeVisible();
    }
    expect(sent).toEqual([]);
  });

  it('are no longer counted with once another foam or thickness is taken', async () => {
    const store = await show();
    await pick(/^Who sat,/, 'Ottilie Brandt');
    await userEvent.type(screen.getByLabelText('It went down'), '1{Enter}');
    await userEvent.click(await screen.findByRole('button', { name: 'Count with it' }));
    await userEvent.click(screen.getByRole('button', { name: /^Foam, and what another/ }));
    await pick(/^Try another foam,/, /^quick-dry outdoors/);
    await userEvent.click(screen.getByRole('button', { name: 'Take it' }));
    expect(seatOf(store).foam).not.toHaveProperty('tested');
  });

  it('are told to readers without measures by the factor alone', async () => {
    await show(false, 'verdicts');
    expect(screen.getByText(/^The set counts with the estimate/)).toBeVisible();
    expect(screen.queryByText(/No test sits are kept/)).toBeNull();
    expect(screen.queryByRole('form')).toBeNull();
  });
});
