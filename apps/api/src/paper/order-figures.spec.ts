import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { CONSTRUCTIONS, type OutlineCorner, outlineStops, type Point2 } from '@settlewright/geometry';
import { TILE_OVERLAP_MM } from '@settlewright/geometry/export';
import { jsPDF } from 'jspdf';
import { create } from 'qrcode';
import { fourWays, orderPack, ORDER_PAGE } from '../../test/factories/order-packs';
import { edgeKinds, edgeProfile } from './edge-profiles';
import { OrderPages } from './order-pages';
import { Pack } from './pack';
import { drawQrCode, qrCode } from './qr-code';
import { type ShapeStyle, Sheet } from './sheet';
import { drawTemplates, tileSpace } from './template-sheets';
import { letters, stretchesIn, templateLines, templateTiles } from './template-tiles';

function rectangleOutline(w: number, d: number, more = 0): OutlineCorner[] {
  const corner = (x: number, y: number, edge: string): OutlineCorner => ({ at: [x, y], radiusMm: 0, edge });
  return [
    corner(-more, -more, 'front'),
    corner(w + more, -more, 'left'),
    corner(w + more, d + more, 'back'),
    corner(-more, d + more, 'right'),
  ];
}

describe('templates at full size', () => {
  const space = tileSpace({ widthMm: 297, heightMm: 210 });

  it('show every stretch of the outline on some sheet, and the same on both sheets of a join', () => {
    const sizes = fc.record({ w: fc.integer({ min: 60, max: 1900 }), d: fc.integer({ min: 40, max: 700 }) });
    fc.assert(
      fc.property(sizes, ({ w, d }) => {
        const lines = templateLines(rectangleOutline(w, d), rectangleOutline(w, d, 12.7), []);
        const tiles = templateTiles(lines, space);
        const samples = lines.finished.flatMap((a, i): Point2[] => {
          const b = lines.finished[(i + 1) % lines.finished.length]!;
          return [0, 0.31, 0.77].map((t) => [a[0] + t * (b[0] - a[0]), a[1] + t * (b[1] - a[1])]);
        });
        for (const [x, y] of samples) {
          const on = tiles.filter(
            ({ xMm, yMm }) =>
              x >= xMm - 1e-6 &&
              x <= xMm + space.widthMm + 1e-6 &&
              y >= yMm - 1e-6 &&
              y <= yMm + space.heightMm + 1e-6,
          );
          expect(on.some(({ used }) => used)).toBe(true);
        }
        for (const tile of tiles) {
          const right = tiles.find(({ column, row }) => column === tile.column + 1 && row === tile.row);
          if (right) expect(tile.xMm + space.widthMm - right.xMm).toBeCloseTo(TILE_OVERLAP_MM, 6);
        }
      }),
      { numRuns: 40 },
    );
  });

  it('carry on each sheet a square of true two inches and the lines at their own size', () => {
    const data = orderPack(fourWays());
    const pdf = new Pack({ paper: 'a4', title: '', author: '', subject: '', issuedAt: new Date(0) });
    const squares: number[] = [];
    const drawn: [number, number, number, number][] = [];
    const { rect, line } = Sheet.prototype;
    Sheet.prototype.rect = function (this: Sheet, x, y, width, height, style?: ShapeStyle) {
      if (width === height) squares.push(width);
      rect.call(this, x, y, width, height, style);
    };
    Sheet.prototype.line = function (this: Sheet, x1, y1, x2, y2, style) {
      if (style?.pen === 0.5) drawn.push([x1, y1, x2, y2]);
      line.call(this, x1, y1, x2, y2, style);
    };
    try {
      drawTemplates(new OrderPages(pdf), { ...data, cloths: [] });
    } finally {
      Object.assign(Sheet.prototype, { rect, line });
    }
    expect(squares).toHaveLength(pdf.sheetCount);
    expect(new Set(squares)).toEqual(new Set([50.8]));
    const { spec } = data.model.schedule[0]!;
    const lines = templateLines(spec.outline, spec.making!.panels[0]!.cut, []);
    const whole = lines.finished.reduce((sum, a, i) => {
      const b = lines.finished[(i + 1) % lines.finished.length]!;
      return sum + Math.hypot(b[0] - a[0], b[1] - a[1]);
    }, 0);
    const length = drawn.reduce((sum, [x1, y1, x2, y2]) => sum + Math.hypot(x2 - x1, y2 - y1), 0);
    // The overlaps are drawn on both sheets.
    expect(length).toBeGreaterThanOrEqual(whole - 1e-6);
    expect(length).toBeLessThan(whole * 1.15);
  });

  it('are cut at the edge of a sheet exactly', () => {
    const box = { x: 10, y: 10, width: 20, height: 20 };
    expect(
      stretchesIn(
        [
          [0, 20],
          [40, 20],
          [40, 90],
        ],
        box,
      ),
    ).toEqual([
      [
        [10, 20],
        [30, 20],
      ],
    ]);
    expect(
      stretchesIn(
        [
          [0, 0],
          [5, 5],
          [0, 5],
        ],
        box,
      ),
    ).toEqual([]);
    expect([0, 25, 26, 27].map(letters)).toEqual(['A', 'Z', 'AA', 'AB']);
  });
});

describe('the section of an edge', () => {
  const size = { height: 20, reach: 22, strip: 16 };

  it('has as many seams as its construction sews there', () => {
    const seams = (kind: (typeof CONSTRUCTIONS)[number], end: 'front' | 'back') =>
      edgeProfile(edgeKinds(kind)[end], size).seams.length;
    expect(CONSTRUCTIONS.map((kind) => [kind, seams(kind, 'back'), seams(kind, 'front')])).toEqual([
      ['boxed', 2, 2],
      ['tight-boxed', 2, 2],
      ['knife-edge', 1, 1],
      ['waterfall', 2, 0],
      ['bullnose', 2, 0],
      ['plywood-backed', 0, 0],
    ]);
    expect(edgeProfile('pulled', size).staples.length).toBeGreaterThan(0);
  });

  it('keeps foam and cloth within its height, and a bullnose a true half circle', () => {
    for (const kind of ['boxed', 'tight-boxed', 'knife-edge', 'waterfall', 'bullnose'] as const) {
      const { foam } = edgeProfile(kind, size);
      for (const [x, y] of foam) {
        expect(x).toBeGreaterThanOrEqual(-1e-9);
        expect(y).toBeGreaterThanOrEqual(-1e-9);
        expect(y).toBeLessThanOrEqual(20 + 1e-9);
      }
    }
    const round = edgeProfile('bullnose', size).foam.slice(1, -1);
    for (const [x, y] of round) expect(Math.hypot(x - 10, y - 10)).toBeCloseTo(10, 9);
  });
});

describe('the chains of an outline', () => {
  it('say what a rectangle does not: nothing of it, the inset of a taper, the ends of a notch', () => {
    expect(outlineStops(rectangleOutline(900, 400))).toEqual({ above: [], below: [], upright: [] });
    const taper = rectangleOutline(900, 400).map((corner, i) => ({
      ...corner,
      at: [corner.at[0] + (i === 0 ? 60 : 0), corner.at[1]] as const,
    }));
    expect(outlineStops(taper)).toEqual({ above: [], below: [0, 60, 900], upright: [] });
  });
});

describe('the code of the order’s page', () => {
  it('is drawn module for module', () => {
    const bars: [number, number, number][] = [];
    class Bars extends Sheet {
      override rect(x: number, y: number, width: number): void {
        bars.push([x, y, width]);
      }
    }
    const code = qrCode(ORDER_PAGE);
    const module = 30 / (code.size + 8);
    drawQrCode(new Bars(new jsPDF(), 297, 210), code, { x: 0, y: 0, sizeMm: 30 });
    const drawn = new Uint8Array(code.size ** 2);
    for (const [x, y, width] of bars) {
      const [column, row] = [Math.round(x / module) - 4, Math.round(y / module) - 4];
      drawn.fill(1, row * code.size + column, row * code.size + column + Math.round(width / module));
    }
    const { data } = create(ORDER_PAGE, { errorCorrectionLevel: 'M' }).modules;
    expect([...drawn]).toEqual([...data].map(Number));
  });
});
