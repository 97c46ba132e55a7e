import { cushionDrawing, formatLength, type DimensionShape } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { CUSHIONS } from '../test/orders.ts';
import { dimensionLine, fitDrawing, shownText, spreadWords, textWidthPx, wordBox } from './drawing-fit.ts';

const inMm = ({ valueMm }: DimensionShape) => formatLength(valueMm, { system: 'millimetres', roundTo: 8 });

describe('a cushion drawn in millimetres', () => {
  it.each(CUSHIONS.map((spec) => [spec.mark, spec] as const))('has room for all numbers of %s', (_, spec) => {
    const { plan } = cushionDrawing(spec, {
      labelMm: 0.1 * Math.max(spec.finishedMm.widthMm, spec.finishedMm.depthMm),
    });
    const { at, box } = fitDrawing(plan, 500, inMm);
    for (const shape of plan.shapes) {
      if (shape.kind !== 'dimension') continue;
      const [x] = dimensionLine(shape, at).middle;
      expect(x - textWidthPx(inMm(shape)) / 2).toBeGreaterThanOrEqual(box.x);
      expect(x + textWidthPx(inMm(shape)) / 2).toBeLessThanOrEqual(box.x + box.width);
    }
    const moves = spreadWords(plan.shapes, at, inMm);
    const texts = plan.shapes.filter((shape) => shape.kind === 'text');
    const edges = texts.filter((shape) => shape.upright).map((shape) => wordBox(shape, at));
    for (const zip of texts.filter(({ text }) => text === 'zip end')) {
      const { left, right, top, bottom } = wordBox(zip, at);
      const aside = moves.get(zip)?.right ?? 0;
      for (const edge of edges) {
        const beside = left + aside >= edge.right || right + aside <= edge.left;
        expect(beside || bottom <= edge.top || top >= edge.bottom).toBe(true);
      }
    }
  });

  it('says less where a page is narrow', () => {
    const [spec] = CUSHIONS;
    const { plan } = cushionDrawing(spec!, { labelMm: 0.1 * spec!.finishedMm.widthMm });
    const saidAt = (widthPx: number) => {
      const { at } = fitDrawing(plan, widthPx, inMm);
      return plan.shapes.flatMap((shape) => (shape.kind === 'text' ? [shownText(shape, at)] : []));
    };
    expect(saidAt(900)).toEqual(
      expect.arrayContaining(['zip end', 'back edge, meets the back pad, zip', 'free end, sitter’s left']),
    );
    expect(saidAt(320)).toEqual(expect.arrayContaining(['', 'back edge, zip', 'sitter’s left']));
  });

  it('takes wide letters as wide: six of a number are no six of an average word', () => {
    // Work Sans, 13 pixels, semi-bold: "438" is 24 pixels wide and "mm" 23.
    expect(textWidthPx('438\u202fmm')).toBeGreaterThan(47);
  });
});
