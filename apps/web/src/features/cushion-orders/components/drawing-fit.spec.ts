import {
  addPiece,
  chooseCushion,
  cushionDrawing,
  deriveCushions,
  emptySetDocument,
  formatLength,
  type DimensionShape,
} from '@settlewright/geometry';
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

  it.each([500, 340])(
    'has every number of a notched, tapered, rounded one apart from the others at %i pixels',
    (px) => {
      const shape = {
        frontInMm: { left: 120, right: 0 },
        notches: [{ edge: 'back' as const, fromMm: 0, widthMm: 250, depthMm: 150 }],
        cornerRadiusMm: { backLeft: 0, backRight: 0, frontLeft: 50, frontRight: 76.2 },
      };
      const { document } = addPiece(emptySetDocument(), 'bench');
      const [first] = deriveCushions(document);
      const spec = deriveCushions(chooseCushion(document, first!.key, { shape })).find(
        ({ key }) => key === first!.key,
      )!;
      const { widthMm, depthMm } = spec.finishedMm;
      const { plan } = cushionDrawing(spec, { labelMm: 0.1 * Math.max(widthMm, depthMm) });
      for (const system of ['millimetres', 'feet-inches'] as const) {
        const say = ({ valueMm, label = '' }: DimensionShape) =>
          `${formatLength(valueMm, { system, roundTo: 8 })} ${label}`.trim();
        const { at } = fitDrawing(plan, px, say);
        const boxes = plan.shapes.flatMap((one) => {
          if (one.kind !== 'dimension') return [];
          const [x, y] = dimensionLine(one, at).middle;
          const half = textWidthPx(say(one)) / 2;
          return [{ said: say(one), left: x - half, right: x + half, top: y - 7, bottom: y + 7 }];
        });
        expect(boxes.length).toBeGreaterThan(8);
        const meeting = boxes.flatMap((a, i) =>
          boxes
            .slice(i + 1)
            .filter((b) => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom)
            .map((b) => `${a.said} and ${b.said}`),
        );
        expect(meeting).toEqual([]);
      }
    },
  );

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
