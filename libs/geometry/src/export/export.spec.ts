import DxfParser, { type ICircleEntity, type ILineEntity, type ITextEntity } from 'dxf-parser';
import { SaxesParser, type SaxesTagPlain } from 'saxes';
import { describe, expect, it } from 'vitest';
import { benchAlone, cushionsOf, shaped } from '../../test/shaped.ts';
import { setDrawing } from '../drawing/set-drawing.ts';
import type { SetView } from '../drawing/set-view.ts';
import type { Part } from '../parts/part.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { dxfOf } from './dxf.ts';
import { plainText } from './plain-text.ts';
import { svgOf } from './svg.ts';
import { tilesOf } from './tiles.ts';

const style = { system: 'feet-inches', roundTo: 16 } as const;
const plan: SetView = { direction: 'above', hidden: 'dashed', scale: 24 };
const facing = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const table = facing.pieces.find((piece): piece is PieceOf<'table'> => piece.kind === 'table')!;
const tableAlone: SetDocument = { ...facing, pieces: [table] };

// The package is the reader itself; its types say it were a module that holds one.
const Reader = DxfParser as unknown as typeof DxfParser.DxfParser;

function read(text: string) {
  const parsed = new Reader().parseSync(text);
  if (!parsed) throw new Error('The DXF cannot be read.');
  return parsed;
}

const span = (values: readonly number[]) => Math.max(...values) - Math.min(...values);

function spanOf(dxf: string, layer: string): [number, number] {
  const lines = read(dxf).entities.filter(
    (entity): entity is ILineEntity => entity.type === 'LINE' && entity.layer === layer,
  );
  const corners = lines.flatMap(({ vertices }) => vertices);
  return [span(corners.map(({ x }) => x)), span(corners.map(({ y }) => y))];
}

describe('DXF, read back by a general-purpose reader', () => {
  it.each([
    ['millimetres', 1, 4],
    ['inches', 25.4, 1],
  ] as const)('in %s says its unit and holds the table at its own size', (units, per, header) => {
    const dxf = dxfOf(setDrawing(tableAlone, plan, style), units);
    expect(read(dxf).header['$INSUNITS']).toBe(header);
    const [width, height] = spanOf(dxf, 'EDGES');
    expect(width).toBeCloseTo(table.widthMm / per, 6);
    expect(height).toBeCloseTo(table.lengthMm / per, 6);
  });

  it('has a layer for each role, dashed where lines are hidden', () => {
    const { tables } = read(dxfOf(setDrawing(facing, plan, style), 'millimetres'));
    const { layers } = tables.layer;
    expect(Object.keys(layers)).toEqual(
      expect.arrayContaining(['CUT', 'EDGES', 'SEAMS', 'HIDDEN', 'ABOVE', 'DIMENSIONS', 'MARKS', 'TITLE']),
    );
  });

  it('holds every line and arc of the drawing', () => {
    for (const { build } of ARRANGEMENTS) {
      const drawing = setDrawing(build(), plan, style);
      const { entities } = read(dxfOf(drawing, 'millimetres'));
      expect(entities.filter(({ type }) => type === 'LINE')).toHaveLength(drawing.lines.length);
      expect(entities.filter(({ type }) => type === 'CIRCLE' || type === 'ARC')).toHaveLength(
        drawing.arcs.length,
      );
      expect(entities.filter(({ type }) => type === 'TEXT')).toHaveLength(drawing.words.length);
    }
  });

  it('holds a column as a true circle', () => {
    const circles = read(dxfOf(setDrawing(facing, plan, style), 'millimetres')).entities.filter(
      (entity): entity is ICircleEntity => entity.type === 'CIRCLE',
    );
    expect(table.base.kind).toBe('columns');
    expect(circles).toHaveLength(1);
    expect(circles[0]!.radius).toBeCloseTo(table.base.kind === 'columns' ? table.base.diameterMm / 2 : 0, 6);
    expect(circles[0]!.center).toMatchObject({ x: table.at.xMm, y: -table.at.zMm });
  });

  it('holds a notched and rounded seat with sides as long as those of its part', () => {
    const shape = {
      notches: [{ edge: 'back' as const, fromMm: 0, widthMm: 300, depthMm: 200 }],
      cornerRadiusMm: { backLeft: 0, backRight: 0, frontLeft: 0, frontRight: 90 },
    };
    const set = shaped(benchAlone(), 'seat', shape);
    const [{ solid }] = cushionsOf(set, 'seat') as [Part];
    const outline = solid.shape === 'prism' ? solid.outlineMm : [];
    const sides = outline.map(([x, y], i) => {
      const [bx, by] = outline[(i + 1) % outline.length]!;
      return Math.hypot(bx - x, by - y);
    });
    const drawn = read(dxfOf(setDrawing(set, plan, style), 'millimetres'))
      .entities.filter((entity): entity is ILineEntity => entity.type === 'LINE')
      .map(({ vertices: [a, b] }) => Math.hypot(a!.x - b!.x, a!.y - b!.y));
    // Sides along the bench's own border are drawn with it; those of the notch and the chords stand alone.
    const alone = sides.filter((length) => length < 100 || [200, 300].includes(length));
    expect(alone.length).toBeGreaterThan(8);
    for (const side of alone) {
      expect(drawn.some((length) => Math.abs(length - side) < 1e-3)).toBe(true);
    }
  });

  it('is ASCII, with fractions that every font has', () => {
    const dxf = dxfOf(setDrawing(facing, plan, style), 'inches');
    // eslint-disable-next-line no-control-regex
    expect(dxf).toMatch(/^[\x00-\x7f]*$/);
    const texts = read(dxf)
      .entities.filter((entity): entity is ITextEntity => entity.type === 'TEXT')
      .map(({ text }) => text);
    expect(texts).toContain('23 7/8"');
    expect(plainText('17½″ × 3′ 1¹¹⁄₁₆″')).toBe(`17 1/2" \\U+00D7 3' 1 11/16"`);
  });
});

describe('SVG, read back by a general-purpose reader', () => {
  function tags(svg: string): SaxesTagPlain[] {
    const found: SaxesTagPlain[] = [];
    const parser = new SaxesParser();
    parser.on('opentag', (tag) => found.push(tag));
    parser.on('error', (error) => {
      throw error;
    });
    parser.write(svg).close();
    return found;
  }

  it('prints at its scale and holds the table at its own size', () => {
    const all = tags(svgOf(setDrawing(tableAlone, plan, style), 'Table <T1> & "others"'));
    const [root] = all;
    const [, , width, height] = root!.attributes['viewBox']!.split(' ').map(Number);
    expect(Number.parseFloat(root!.attributes['width']!) * 24).toBeCloseTo(width!, 1);
    expect(Number.parseFloat(root!.attributes['height']!) * 24).toBeCloseTo(height!, 1);
    const edges = all.slice(all.findIndex(({ attributes }) => attributes['id'] === 'edge') + 1);
    const own = edges.slice(
      0,
      edges.findIndex(({ name }) => name === 'g'),
    );
    const numbers = own.flatMap(({ attributes }) => [...attributes['d']!.matchAll(/-?[\d.]+/g)].map(Number));
    expect(span(numbers.filter((_, i) => i % 2 === 0))).toBeCloseTo(table.widthMm, 2);
    expect(span(numbers.filter((_, i) => i % 2 === 1))).toBeCloseTo(table.lengthMm, 2);
  });

  it('of every arrangement is well-formed', () => {
    for (const { build, title } of ARRANGEMENTS) {
      expect(
        tags(svgOf(setDrawing(build(), { ...plan, sectionMm: 600 }, style), title)).length,
      ).toBeGreaterThan(8);
    }
  });
});

describe('tiles', () => {
  const bounds = { x: -100, y: -200, width: 5000, height: 2000 };

  it('put what fits on one sheet, in its middle', () => {
    const tiles = tilesOf(bounds, 20, { widthMm: 260, heightMm: 180 });
    expect(tiles).toHaveLength(1);
    expect(tiles[0]).toMatchObject({ column: 0, row: 0, xMm: 2400 - (260 * 20) / 2 });
  });

  it('cover everything, overlap where they meet and never change the scale', () => {
    for (const scale of [4, 10, 13]) {
      const sheet = { widthMm: 260, heightMm: 180 };
      const tiles = tilesOf(bounds, scale, sheet);
      const [across, down] = [sheet.widthMm * scale, sheet.heightMm * scale];
      for (const [x, y] of [
        [-100, -200],
        [4900, 1800],
        [2000, 0],
        [-100, 1800],
        [1234.5, 678.9],
      ] as const) {
        expect(
          tiles.some(({ xMm, yMm }) => x >= xMm && x <= xMm + across && y >= yMm && y <= yMm + down),
        ).toBe(true);
      }
      if (tiles.length > 1) expect(tiles[0]).toMatchObject({ xMm: bounds.x });
      const [first, second] = tiles.filter(({ row }) => row === 0);
      if (second) expect((first!.xMm + across - second.xMm) / scale).toBeCloseTo(10, 6);
    }
  });
});
