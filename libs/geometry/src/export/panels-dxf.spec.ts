import DxfParser, { type ILwpolylineEntity, type ITextEntity } from 'dxf-parser';
import { describe, expect, it } from 'vitest';
import { PLAIN_MAKE } from '../cushions/making/cushion-make.ts';
import { makeCushion } from '../cushions/making/make-cushion.ts';
import { outlineArea, outlinePerimeter } from '../outlines/outline.ts';
import { panelsDxf } from './panels-dxf.ts';

/** The package's types and its module disagree on what is the default. */
const Reader = DxfParser as unknown as typeof DxfParser.DxfParser;

const made = makeCushion({
  finishedMm: { widthMm: 1085.85, depthMm: 438.15, thicknessMm: 101.6 },
  shape: { cornerRadiusMm: { backLeft: 0, backRight: 0, frontLeft: 60, frontRight: 60 } },
  make: PLAIN_MAKE,
});
if (!made.ok) throw new Error(made.fault);
const { panels } = made.made;

/** Length and area of a closed polyline with bulges, worked out from the file alone. */
function measured({ vertices }: ILwpolylineEntity): { length: number; area: number } {
  let [length, area] = [0, 0];
  vertices.forEach((a, i) => {
    const b = vertices[(i + 1) % vertices.length]!;
    const chord = Math.hypot(b.x - a.x, b.y - a.y);
    const sweep = 4 * Math.atan(a.bulge ?? 0);
    const radius = sweep === 0 ? 0 : chord / (2 * Math.sin(sweep / 2));
    length += sweep === 0 ? chord : radius * sweep;
    area += (a.x * b.y - b.x * a.y) / 2 + (radius ** 2 * (sweep - Math.sin(sweep))) / 2;
  });
  return { length, area };
}

describe.each([
  ['millimetres', 1],
  ['inches', 25.4],
] as const)('panels for cutting in %s', (units, per) => {
  const text = panelsDxf(
    panels.map((panel) => ({ title: `C1 ${panel.name}`, panel })),
    units,
  );
  const file = new Reader().parseSync(text)!;
  const closed = (layer: string) =>
    file.entities.filter((e): e is ILwpolylineEntity => e.type === 'LWPOLYLINE' && e.layer === layer);

  it('are as long round and as large as they are cut and sewn, arcs included', () => {
    for (const [layer, side] of [
      ['CUT', 'cut'],
      ['SEAMS', 'finished'],
    ] as const) {
      expect(closed(layer)).toHaveLength(panels.length);
      closed(layer).forEach((entity, i) => {
        const { length, area } = measured(entity);
        expect(length * per).toBeCloseTo(outlinePerimeter(panels[i]![side]), 3);
        expect(area * per * per).toBeCloseTo(outlineArea(panels[i]![side]), 1);
        expect(entity.shape).toBe(true);
      });
    }
  });

  it('name who wrote the file, once', () => {
    expect(text.match(/\$LASTSAVEDBY\s+1\s+(.*)/g)).toEqual([expect.stringContaining('Settlewright')]);
  });

  it('stand apart, with their words and marks', () => {
    const spans = closed('CUT').map(({ vertices }) => [
      Math.min(...vertices.map(({ x }) => x)),
      Math.max(...vertices.map(({ x }) => x)),
    ]);
    for (const [i, [left]] of spans.entries()) {
      if (i > 0) expect(left! * per - spans[i - 1]![1]! * per).toBeCloseTo(50, 3);
    }
    const words = file.entities.filter((e) => e.type === 'TEXT').map((e) => (e as ITextEntity).text);
    expect(words).toEqual(panels.map(({ name, count }) => `C1 ${name}, ${count} off`));
    expect(file.entities.filter((e) => e.layer === 'MARKS')).toHaveLength(
      panels.reduce((sum, { marksMm }) => sum + marksMm.length, 0),
    );
  });
});
