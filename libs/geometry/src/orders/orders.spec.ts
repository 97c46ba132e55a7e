import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { deriveCushions } from '../cushions/derive-cushions.ts';
import { PLAIN_MAKE } from '../cushions/making/cushion-make.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { chooseCushion } from '../room/cushion-choices.ts';
import type { SetDocument } from '../room/document.ts';
import { layCloth } from './order-cloth.ts';
import { describedClothName, orderCoversSchema, plainCover, type OrderCover } from './order-cover.ts';
import { orderModel } from './order-model.ts';
import { buyWords, chartNote, orderAssumptions, rowsWords } from './order-words.ts';
import { fromRunMiddleMm } from './run-middle.ts';

const inch = (value: number): number => value * 25.4;
const INCHES = { system: 'feet-inches', roundTo: 16 } as const;
const TRIES = 60;
const built = (id: string): SetDocument => ARRANGEMENTS.find((a) => a.id === id)!.build();
const cushionsOf = (id: string) => deriveCushions(built(id));
const cover = (change: Partial<OrderCover> = {}): OrderCover => ({
  ...plainCover('plum moquette'),
  ...change,
});

/** Two seats of 72 x 20 x 4 in, boxed, of the trade's own sums. */
function twoSeats() {
  const [seat] = cushionsOf('bench-window');
  const finishedMm = { widthMm: inch(72), depthMm: inch(20), thicknessMm: inch(4) };
  const gaps = seat!.gapsMm;
  const document = structuredClone(built('bench-window'));
  for (const piece of document.pieces) {
    if (piece.kind !== 'bench') continue;
    const ends = piece.ends.left.thicknessMm + piece.ends.right.thicknessMm;
    piece.lengthMm = finishedMm.widthMm + gaps.left + gaps.right + ends;
    piece.upholstery.longestCushionMm = 3000;
    piece.seatDepthMm = finishedMm.depthMm + gaps.back + gaps.front;
    piece.seatTiltDeg = 0;
    piece.seatCushion.thicknessMm = finishedMm.thicknessMm;
    piece.backHeightMm = 0;
  }
  const [one] = deriveCushions(document);
  return [one!, { ...one!, mark: 'C2', key: 'other/seat-1' }];
}

describe('the model of an order', () => {
  it('totals what the trade’s own example takes', () => {
    const { totals, schedule } = orderModel({ cushions: twoSeats(), covers: [] });
    expect(schedule).toHaveLength(1);
    expect(schedule[0]!.marks).toEqual(['C1', 'C2']);
    const [sized] = schedule;
    // A backless bench has no back pad: its depth gains that gap, so only the width is the example's.
    expect(sized!.spec.finishedMm.widthMm).toBeCloseTo(inch(72), 6);
    const { perimeterMm, closure } = sized!.spec.making!;
    expect(closure.lengthMm).toBeCloseTo(inch(78), 6);
    expect(totals.zips).toEqual([{ lengthMm: Math.round(inch(78)), count: 2 }]);
    expect(totals.weltMm).toBeCloseTo(2 * (2 * perimeterMm + inch(6)), 6);
    // Plates to boxing twice round, the ends of the zip panel, the zip itself, and the welt made up.
    const height = inch(4);
    const seams = 2 * perimeterMm + 2 * height + closure.lengthMm;
    expect(totals.seamsMm).toBeCloseTo(2 * (seams + 2 * perimeterMm + inch(6)), 6);
    expect(totals.threadMm).toBeCloseTo(3 * totals.seamsMm, 6);
    expect(totals.foam).toHaveLength(1);
    expect(totals.foamMassKg).toBeCloseTo(totals.foamVolumeM3 * sized!.spec.foam.densityKgM3, 9);
  });

  it('counts every cushion, button and kilogram once, whatever the set', () => {
    for (const { id } of ARRANGEMENTS) {
      const cushions = cushionsOf(id);
      const { schedule, totals, buttons, faults } = orderModel({ cushions, covers: [cover()] });
      expect(schedule.flatMap(({ marks }) => marks).sort()).toEqual(cushions.map(({ mark }) => mark).sort());
      expect(buttons.reduce((sum, { count, marks }) => sum + count * marks.length, 0)).toBe(totals.buttons);
      const kilograms = schedule.reduce(
        (sum, { foam, marks }) => sum + (foam?.massKg ?? 0) * marks.length,
        0,
      );
      expect(kilograms).toBeCloseTo(totals.foamMassKg, 6);
      expect(totals.foam.flatMap(({ marks }) => marks)).toHaveLength(totals.cushions);
      expect(faults).toEqual([]);
    }
  });

  it('is plain data, the same for the same order', () => {
    const input = { cushions: cushionsOf('u-booth'), covers: [cover()] };
    const once = orderModel(input);
    expect(JSON.parse(JSON.stringify(orderModel(input)))).toEqual(JSON.parse(JSON.stringify(once)));
    expect(structuredClone(once.cloths[0])).toEqual(once.cloths[0]);
  });

  it('says what cannot be made, and leaves it out of the sums', () => {
    const plain = built('facing-benches');
    const [first] = deriveCushions(plain);
    const wrong = chooseCushion(plain, first!.key, {
      make: { ...PLAIN_MAKE, construction: 'bullnose', closureEdge: 'left' },
    });
    const model = orderModel({ cushions: deriveCushions(wrong), covers: [cover()] });
    expect(model.faults[0]).toEqual({ mark: 'C1', text: 'a bullnose front closes at the back edge' });
    expect(model.faults[1]!.text).toMatch(/C1 cannot be made as asked/);
    const ids = layCloth(model.cloths[0]!, TRIES)!.layout.placed.map(({ id }) => id);
    expect(ids.length).toBeGreaterThan(0);
    expect(ids.filter((id) => id.startsWith('C1 '))).toEqual([]);
    expect(model.totals.foam.flatMap(({ marks }) => marks)).not.toContain('C1');
  });

  it('marks button columns that stand off their joints, and says which seat rows are over', () => {
    const plain = built('bench-window');
    const back = deriveCushions(plain).find(({ kind }) => kind === 'back')!;
    const tufted = chooseCushion(plain, back.key, {
      tufting: {
        kind: 'biscuit',
        tuftMm: { widthMm: 200, heightMm: 200 },
        borderMm: 90,
        fullness: 'foam-thickness',
      },
    });
    const [sheet] = orderModel({ cushions: deriveCushions(tufted), covers: [] }).buttons;
    for (const { offJointMm, beyond } of sheet!.columns)
      expect(beyond).toBe(Math.abs(offJointMm) > 3.175 + 1e-6);
    expect(sheet!.columns.some(({ beyond }) => beyond)).toBe(true);
    expect(sheet!.rows.every(({ overSeatMm }) => overSeatMm !== undefined)).toBe(true);
    expect(rowsWords(sheet!, INCHES)).toMatch(/stands on the seat and goes down with it/);
  });
});

describe('the cloth of an order', () => {
  it('is quick by the chart and true by the layout, with its cost and waste in whole cents', () => {
    const priced = cover({ pricePerMetreMinor: 4250, currency: 'USD', startMm: 100, stepMm: 100 });
    const model = orderModel({ cushions: cushionsOf('facing-benches'), covers: [priced] });
    const [cloth] = model.cloths;
    expect(cloth!.buyMm).toBe(Math.ceil((cloth!.chartMm! + 100) / 100 - 1e-9) * 100);
    expect(cloth!.cost).toEqual({ currency: 'USD', totalMinor: (cloth!.buyMm! / 1000) * 4250 });
    const laid = layCloth(cloth!, TRIES)!;
    expect(laid.layout.lengthMm).toBeGreaterThanOrEqual(laid.layout.boundMm - 1e-6);
    expect(laid.buyMm).toBeGreaterThanOrEqual(laid.layout.lengthMm + 100);
    expect(Number.isInteger(laid.cost!.totalMinor) && Number.isInteger(laid.cost!.wasteMinor)).toBe(true);
    expect(laid.cost!.totalMinor).toBe(Math.round((laid.buyMm / 1000) * 4250));
    expect(laid.cost!.wasteMinor! / laid.cost!.totalMinor).toBeCloseTo(laid.waste, 2);
    expect(layCloth(cloth!, TRIES)).toEqual(laid);
  });

  it('lays a contrast welt and the rest apart: together all panels, none twice', () => {
    const cushions = cushionsOf('facing-benches');
    const whole = orderModel({ cushions, covers: [cover()] });
    const parted = orderModel({
      cushions,
      covers: [cover({ parts: ['faces', 'edges'] }), cover({ name: 'cord cloth', parts: ['welt'] })],
    });
    expect(parted.faults).toEqual([]);
    const ids = parted.cloths.flatMap(({ panels }) => panels.map(({ id }) => id));
    expect(ids.sort()).toEqual(whole.cloths[0]!.panels.map(({ id }) => id).sort());
    expect(parted.cloths[1]!.panels.map(({ id }) => id)).toEqual(['welt strips']);
    // The quick rule speaks of whole covers only.
    expect(parted.cloths[0]!.chartMm).toBeUndefined();
  });

  it('says what no cloth covers and what two do', () => {
    const cushions = cushionsOf('facing-benches');
    const some = orderModel({
      cushions,
      covers: [cover({ cushionMarks: ['C1', 'C2'] }), cover({ name: 'other', cushionMarks: ['C2', 'C3'] })],
    });
    expect(some.faults.map(({ text }) => text)).toEqual(
      expect.arrayContaining([
        'No cloth is said for the faces of C4',
        'Two cloths are said for the faces of C2',
        'Two cloths are said for the welt of C2',
      ]),
    );
    expect(some.schedule.find(({ marks }) => marks.includes('C3'))!.covers).toEqual(['other']);
  });

  it('names a panel that is wider than the cloth, and lays the others as the least to buy', () => {
    const model = orderModel({ cushions: twoSeats(), covers: [cover({ direction: 'up-roll' })] });
    expect(model.faults[0]!.text).toBe('C1 plate 1 is wider than plum moquette in every way it may lie');
    const [cloth] = model.cloths;
    const wide = cloth!.faults.map((fault) => fault.split(' is wider')[0]);
    const laid = layCloth(cloth!, TRIES)!;
    const ids = laid.layout.placed.map(({ id }) => id);
    expect(ids.length).toBeGreaterThan(0);
    expect(ids.filter((id) => wide.includes(id))).toEqual([]);
    expect(laid).toMatchObject({ chartMm: undefined, differs: false });
    expect(buyWords(cloth!)).toEqual({ buy: 'buy at least', missing: cloth!.faults.join('; ') });
    const railroaded = orderModel({ cushions: twoSeats(), covers: [cover({ direction: 'railroad' })] });
    expect(railroaded.faults).toEqual([]);
    expect(layCloth(railroaded.cloths[0]!, TRIES)!.layout.placed.some((panel) => panel.railroaded)).toBe(
      true,
    );
  });

  it('is laid as wide as it was measured, and says what is left of what came', () => {
    const com = { sampleKept: true, dyeLot: '7', measuredWidthMm: 1300, receivedMm: 9000, flaws: '' };
    const [cloth] = orderModel({ cushions: cushionsOf('facing-benches'), covers: [cover({ com })] }).cloths;
    const laid = layCloth(cloth!, TRIES)!;
    for (const { xMm, widthMm } of laid.layout.placed) expect(xMm + widthMm).toBeLessThanOrEqual(1300 + 1e-6);
    expect(laid.spareMm).toBeCloseTo(9000 - laid.layout.lengthMm, 6);
  });

  it('centers a pattern on every cushion, or on the middle of its run', () => {
    const document = structuredClone(built('bench-window'));
    for (const piece of document.pieces) {
      if (piece.kind === 'bench') Object.assign(piece, { lengthMm: 2600 });
    }
    const cushions = deriveCushions(document);
    const seats = cushions.filter(({ kind }) => kind === 'seat');
    expect(seats.length).toBeGreaterThan(1);
    const offsets = seats.map((spec) => fromRunMiddleMm(spec, cushions));
    expect(offsets.reduce((a, b) => a + b, 0)).toBeCloseTo(0, 6);
    // The first from the left as seen from in front is the sitter's right: the middle lies to the right of the page.
    expect(offsets[0]).toBeGreaterThan(0);
    const repeatMm = { acrossMm: 340, alongMm: 0 };
    const phases = (controlLine: OrderCover['controlLine']) => {
      const covers = [cover({ controlLine, repeatMm, direction: 'up-roll' })];
      const [cloth] = orderModel({ cushions, covers }).cloths;
      const plates = layCloth(cloth!, TRIES)!.layout.placed.filter(({ id }) => / plate 1$/.test(id));
      return seats.map(({ mark }, i) => {
        const plate = plates.find(({ id }) => id === `${mark} plate 1`)!;
        const middle = plate.xMm + plate.widthMm / 2 + (controlLine === 'run' ? offsets[i]! : 0);
        return Math.abs(middle / 340 - Math.round(middle / 340));
      });
    };
    for (const controlLine of ['cushion', 'run'] as const) {
      for (const phase of phases(controlLine)) expect(phase).toBeCloseTo(0, 6);
    }
  });

  it('never costs less with a repeat by the chart, and says when chart and layout are far apart', () => {
    const cushions = cushionsOf('facing-benches');
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 600 }), fc.integer({ min: 0, max: 600 }), (acrossMm, alongMm) => {
        const of = (repeatMm: OrderCover['repeatMm']) =>
          orderModel({ cushions, covers: [cover({ repeatMm })] }).cloths[0]!.chartMm!;
        expect(of({ acrossMm, alongMm })).toBeGreaterThanOrEqual(of({ acrossMm: 0, alongMm: 0 }) - 1e-9);
      }),
      { numRuns: 30 },
    );
    const [cloth] = orderModel({ cushions, covers: [cover()] }).cloths;
    const laid = layCloth(cloth!, TRIES)!;
    const far = { ...laid, chartMm: 1.3 * laid.layout.lengthMm, differs: true };
    expect(chartNote(cloth!, far, INCHES)).toMatch(/30 % more than the layout/);
    expect(chartNote(cloth!, { ...far, differs: false }, INCHES)).toBeUndefined();
  });
});

describe('what may be said of a cloth', () => {
  const read = (change: Record<string, unknown>) =>
    orderCoversSchema.safeParse([{ ...cover(), ...change }]).error?.issues.map(({ path }) => path.join('.'));

  it('is refused where it contradicts itself', () => {
    expect(read({})).toBeUndefined();
    expect(read({ nap: 'to-the-front' })).toEqual(['0.direction']);
    expect(read({ nap: 'to-the-front', direction: 'up-roll' })).toBeUndefined();
    expect(read({ pricePerMetreMinor: 100 })).toEqual(['0.currency']);
    expect(read({ pricePerMetreMinor: 10.5, currency: 'USD' })).toEqual(['0.pricePerMetreMinor']);
    expect(orderCoversSchema.safeParse([cover(), cover()]).success).toBe(false);
  });

  it.each([
    ['Plum moquette, supplied by us, 54 in wide, pile to the front', 'Plum moquette'],
    ['  green   cord ', 'green cord'],
    ['', 'cover'],
    [
      'a heavy woven cloth with a small raised figure in plum and oak and no name at all',
      'a heavy woven cloth with a small raised figure in plum and',
    ],
  ])('is called by the first words of what was written of it: %s', (words, name) => {
    expect(describedClothName(words)).toBe(name);
  });

  it('stands among the assumptions', () => {
    const covers = [cover({ nap: 'to-the-front', direction: 'railroad' })];
    const words = orderAssumptions(orderModel({ cushions: cushionsOf('facing-benches'), covers }), INCHES);
    expect(words).toContain(
      'plum moquette: 54″ wide as said, railroaded, nap runs to the front edge, no repeat.',
    );
    expect(words.join(' ')).toMatch(/77 kg/);
  });
});
