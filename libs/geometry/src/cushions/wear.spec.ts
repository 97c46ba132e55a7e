import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cushionDrawing } from '../drawing/cushion-drawing.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { chooseCushion } from '../room/cushion-choices.ts';
import type { SetDocument } from '../room/document.ts';
import { readSetDocument } from '../room/read-document.ts';
import { phraseText } from '../units/phrase.ts';
import { shapedOutline } from './cushion-shape.ts';
import { deriveCushions } from './derive-cushions.ts';
import { groupCushions } from './group-cushions.ts';
import { wearHatch, wearRectangle } from './wear-hatch.ts';
import { allWearPhrase, mirroredWear, WEAR_PLACES, wearAreaSchema, type WearArea } from './wear.ts';

const MM = { system: 'millimetres', roundTo: 8 } as const;
const INCHES = { system: 'feet-inches', roundTo: 8 } as const;
const SIZE = { widthMm: 1000, depthMm: 400 };
const outlineOf = (shape = {}) => {
  const plan = shapedOutline(SIZE, shape);
  if (!plan.ok) throw new Error(plan.fault);
  return plan.corners;
};
const AREA: WearArea = {
  place: 'area',
  areaMm: { fromEnd: 'left', fromSideMm: 100, fromFrontMm: 50, widthMm: 300, depthMm: 120 },
  look: 'stain',
  note: 'tea, light',
};

describe('a marked area', () => {
  it('lies where the sitter sees it: their left is at the right of the page, the front below', () => {
    const spec = { outline: outlineOf() };
    expect(wearRectangle(spec, AREA)).toEqual({ x0: 600, x1: 900, y0: 50, y1: 170 });
    const right = { ...AREA, areaMm: { ...AREA.areaMm!, fromEnd: 'right' as const } };
    expect(wearRectangle(spec, right)).toEqual({ x0: 100, x1: 400, y0: 50, y1: 170 });
    expect(wearRectangle(spec, { place: 'left-end', look: 'fade' }).x1).toBe(1000);
    expect(wearRectangle(spec, { place: 'front-edge', look: 'fade' }).y0).toBe(0);
  });

  it('is hatched only where there is cushion', () => {
    const notch = { notches: [{ edge: 'front' as const, fromMm: 0, widthMm: 250, depthMm: 110 }] };
    const outline = outlineOf(notch);
    const lines = wearHatch({ outline }, AREA, 10);
    expect(lines.length).toBeGreaterThan(5);
    for (const [from, to] of lines) {
      expect(to[1] - to[0]).toBeCloseTo(from[1] - from[0], 6);
      for (const [x, y] of [from, to]) {
        expect(x).toBeGreaterThanOrEqual(600 - 1e-6);
        expect(x).toBeLessThanOrEqual(900 + 1e-6);
        // The notch takes what lies beyond 750 and in front of 110.
        expect(x > 750 + 1e-6 && y < 110 - 1e-6).toBe(false);
      }
    }
    expect(
      wearHatch({ outline: outlineOf() }, { ...AREA, areaMm: { ...AREA.areaMm!, fromSideMm: 5000 } }, 10),
    ).toEqual([]);
  });

  it('is covered evenly: its lines’ length times their distance is its area, whatever the place', () => {
    fc.assert(
      fc.property(fc.constantFrom(...WEAR_PLACES.filter((one) => one !== 'area')), (place) => {
        const spec = { outline: outlineOf() };
        const { x0, x1, y0, y1 } = wearRectangle(spec, { place, look: 'fade' });
        const step = 2;
        // Lines at 45 degrees with `step` between them along x stand step / √2 apart.
        const long = wearHatch(spec, { place, look: 'fade' }, step).reduce(
          (sum, [a, b]) => sum + Math.hypot(b[0] - a[0], b[1] - a[1]),
          0,
        );
        const area = (x1 - x0) * (y1 - y0);
        expect(Math.abs((long * step) / Math.SQRT2 - area)).toBeLessThan(0.02 * area);
      }),
    );
  });

  it('is said with its number, its place and its look, in the units of the reader', () => {
    const all = [{ place: 'front-edge', look: 'worn-through' } as const, AREA];
    expect(phraseText(allWearPhrase(all, 'seat'), MM)).toMatch(
      /^A1 front edge: worn through; A2 300\smm × 120\smm, 100\smm from the sitter’s left end and 50\smm from the front edge: stained, tea, light$/u,
    );
    expect(phraseText(allWearPhrase(all, 'back'), INCHES)).toMatch(
      /^A1 bottom edge: .*¾″.*from the bottom edge/u,
    );
  });

  it('needs its sizes, and a named place has none', () => {
    expect(wearAreaSchema.safeParse({ place: 'area', look: 'fade' }).success).toBe(false);
    expect(wearAreaSchema.safeParse({ ...AREA, place: 'middle' }).success).toBe(false);
    expect(wearAreaSchema.safeParse(AREA).success).toBe(true);
  });
});

describe('a set with marked cushions', () => {
  const start = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();

  it('is read back as it was, and its cushion carries the areas', () => {
    const marked = chooseCushion(start, 'b1/seat-1', { wear: [AREA] });
    const read = readSetDocument(JSON.parse(JSON.stringify(marked)));
    expect(read.ok && read.value).toEqual(marked);
    expect(deriveCushions(marked).find(({ key }) => key === 'b1/seat-1')?.wear).toEqual([AREA]);
  });

  it('parts a marked cushion from its mirror image, until that is marked likewise', () => {
    const specs = deriveCushions(start);
    const pair = groupCushions(specs).find(({ mirroredMarks }) => mirroredMarks.length > 0)!;
    const keyOf = (mark: string | undefined) => specs.find((spec) => spec.mark === mark)!.key;
    const groupOf = (document: SetDocument) =>
      groupCushions(deriveCushions(document)).find(({ marks }) => marks[0] === pair.marks[0])!;
    const one = chooseCushion(start, keyOf(pair.marks[0]), { wear: [AREA] });
    expect(groupOf(one).mirroredMarks).toEqual([]);
    const both = chooseCushion(one, keyOf(pair.mirroredMarks[0]), { wear: [mirroredWear(AREA)] });
    expect(groupOf(both).mirroredMarks).toContain(pair.mirroredMarks[0]);
    const { look, ...rest } = mirroredWear(AREA);
    const inAnotherOrder = chooseCushion(one, keyOf(pair.mirroredMarks[0]), { wear: [{ ...rest, look }] });
    expect(groupOf(inAnotherOrder).mirroredMarks).toContain(pair.mirroredMarks[0]);
    expect(mirroredWear({ place: 'left-end', look: 'patch' }).place).toBe('right-end');
  });

  it('is drawn with its areas hatched and numbered, and no edge is named across a notch', () => {
    const change = {
      wear: [AREA],
      shape: { notches: [{ edge: 'back' as const, fromMm: 500, widthMm: 200, depthMm: 60 }] },
    };
    const shapesOf = (document: SetDocument) =>
      cushionDrawing(deriveCushions(document).find(({ key }) => key === 'b1/seat-1')!).plan.shapes;
    const plain = shapesOf(start);
    const drawn = shapesOf(chooseCushion(start, 'b1/seat-1', change));
    const hairs = (shapes: typeof drawn) =>
      shapes.filter((one) => one.kind === 'polyline' && one.pen === 'hair');
    expect(hairs(drawn).length).toBeGreaterThan(hairs(plain).length + 5);
    expect(drawn.some((one) => one.kind === 'text' && one.text === 'A1')).toBe(true);
    const back = drawn.find((one) => one.kind === 'text' && one.text.startsWith('back edge'));
    const { finishedMm } = deriveCushions(start).find(({ key }) => key === 'b1/seat-1')!;
    const notch = [finishedMm.widthMm - 700, finishedMm.widthMm - 500];
    const x = back?.kind === 'text' ? back.at[0] : NaN;
    expect(x < notch[0]! || x > notch[1]!).toBe(true);
  });
});
