import { describe, expect, it } from 'vitest';
import { deriveCushions } from '../cushions/derive-cushions.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { cushionDrawing } from './cushion-drawing.ts';
import { labelLanes } from './dimension-chain.ts';
import type { DimensionShape, Drawing, DrawShape } from './drawing.ts';
import { frontOf } from './front.ts';
import { planOf } from './plan.ts';
import { sectionOf } from './section.ts';

const built = (id: string): SetDocument => ARRANGEMENTS.find((a) => a.id === id)!.build();
const dimensions = (drawing: Drawing): DimensionShape[] =>
  drawing.shapes.filter((s) => s.kind === 'dimension');

function finite(drawing: Drawing): void {
  const check = (value: unknown): void => {
    if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true);
    else if (typeof value === 'object' && value !== null) Object.values(value).forEach(check);
  };
  check(drawing);
}

describe('plan', () => {
  it('shows a table at its size where it stands', () => {
    const document = built('bench-window');
    const table = document.pieces.find((p): p is PieceOf<'table'> => p.kind === 'table')!;
    const shape = planOf(document).shapes.find((s) => s.kind === 'polygon' && s.pieceId === table.id);
    const points = (shape as Extract<DrawShape, { kind: 'polygon' }>).points;
    const xs = points.map(([x]) => x);
    const ys = points.map(([, y]) => y);
    const spans = [Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys)].sort(
      (a, b) => a - b,
    );
    expect(spans[0]).toBeCloseTo(Math.min(table.lengthMm, table.widthMm), 6);
    expect(spans[1]).toBeCloseTo(Math.max(table.lengthMm, table.widthMm), 6);
    expect((Math.max(...xs) + Math.min(...xs)) / 2).toBeCloseTo(table.at.xMm, 6);
  });

  it('puts a circle at each sitter given and none otherwise', () => {
    const document = built('facing-benches');
    const bench = document.pieces.find((p) => p.kind === 'bench')!;
    expect(planOf(document).shapes.some((s) => s.kind === 'circle')).toBe(false);
    const drawn = planOf(document, { sitters: [{ placeId: `${bench.id}:1`, colour: 3 }] });
    expect(drawn.shapes.filter((s) => s.kind === 'circle')).toMatchObject([
      { fill: 'sitter-3', pieceId: bench.id },
    ]);
  });

  it('marks the cushions as the order does', () => {
    const document = built('u-booth');
    const marks = planOf(document, { marks: 'cushions' })
      .shapes.filter((s) => s.kind === 'text')
      .map((s) => s.text);
    expect(new Set(marks)).toEqual(new Set(deriveCushions(document).map(({ mark }) => mark)));
  });

  it.each(ARRANGEMENTS.map(({ id }) => id))('of %s has finite numbers and holds all shapes', (id) => {
    const document = built(id);
    for (const drawing of [planOf(document, { marks: 'pieces' }), frontOf(document)]) finite(drawing);
    const drawing = planOf(document);
    const { x, y, width, height } = drawing.boundsMm;
    for (const shape of drawing.shapes) {
      if (shape.kind !== 'polygon') continue;
      for (const [px, py] of shape.points) {
        expect(px).toBeGreaterThanOrEqual(x - 1e-6);
        expect(px).toBeLessThanOrEqual(x + width + 1e-6);
        expect(py).toBeGreaterThanOrEqual(y - 1e-6);
        expect(py).toBeLessThanOrEqual(y + height + 1e-6);
      }
    }
  });
});

describe('front', () => {
  it('stands on the floor and reaches the top of the wall', () => {
    const document = built('bench-window');
    const wall = document.pieces.find((p): p is PieceOf<'bulkhead'> => p.kind === 'bulkhead')!;
    const { y, height } = frontOf(document).boundsMm;
    expect(y).toBeCloseTo(-wall.heightMm, 6);
    expect(y + height).toBeCloseTo(0, 6);
  });
});

describe('section', () => {
  const document = built('facing-benches');
  const bench = document.pieces.find((p): p is PieceOf<'bench'> => p.kind === 'bench')!;
  const drawing = sectionOf(document, bench.id);

  it('cuts seat and back cushion, deck, table and the bench opposite', () => {
    const cut = drawing.shapes.filter((s) => s.kind === 'polygon' && s.pen === 'cut');
    const ids = new Set(cut.map((s) => ('pieceId' in s ? s.pieceId : undefined)));
    expect(
      cut.filter((s) => s.kind === 'polygon' && s.fill === 'cloth' && s.pieceId === bench.id),
    ).toHaveLength(2);
    for (const kind of ['table', 'bench'] as const) {
      for (const piece of document.pieces.filter((p) => p.kind === kind))
        expect(ids.has(piece.id)).toBe(true);
    }
  });

  it('draws the curve of a back from the seat up to its apex, and no line for a flat one', () => {
    const layout = benchLayout(bench);
    const curveWith = (lumbar: PieceOf<'bench'>['lumbar']) => {
      const pieces = document.pieces.map((p) => (p.id === bench.id ? { ...bench, lumbar } : p));
      const lines = sectionOf({ ...document, pieces }, bench.id).shapes.filter(
        (s) => s.kind === 'polyline' && s.pieceId === bench.id,
      );
      return lines.map((line) => ('points' in line ? line.points : []));
    };
    expect(curveWith(undefined)).toEqual([]);
    expect(curveWith({ apexMm: 0, recessMm: 0 })).toEqual([]);
    const [curve = []] = curveWith({ apexMm: 220, recessMm: 30 });
    const behindFace = curve.map(
      ([x, y]) => layout.faceZMm - (-y - layout.seatTopRearMm) * Math.tan(layout.leanRad) - x,
    );
    expect(behindFace[0]).toBeCloseTo(30, 6);
    expect(behindFace.at(-1)).toBeCloseTo(0, 6);
    expect(behindFace).toEqual([...behindFace].sort((a, b) => b - a));
    expect(-curve.at(-1)![1]).toBeCloseTo(layout.pressedTopMm + 220, 6);
  });

  it('cuts the pad along the curve that it draws', () => {
    const lumbar = { apexMm: 220, recessMm: 30 };
    const pieces = document.pieces.map((p) => (p.id === bench.id ? { ...bench, lumbar } : p));
    const { shapes } = sectionOf({ ...document, pieces }, bench.id);
    const [line] = shapes.filter((s) => s.kind === 'polyline' && s.pieceId === bench.id);
    const curve = line && 'points' in line ? line.points : [];
    const pads = shapes.flatMap((s) => (s.kind === 'polygon' && s.fill === 'cloth' ? [s.points] : []));
    const onCurve = pads.find((points) => points.length > 8) ?? [];
    expect(curve.length).toBeGreaterThan(8);
    for (const [x, y] of curve.slice(1, -1)) {
      expect(onCurve.some(([px, py]) => Math.hypot(px - x, py - y) < 0.01)).toBe(true);
    }
  });

  it('measures what the bench says', () => {
    const layout = benchLayout(bench);
    const values = new Map(dimensions(drawing).map((d) => [d.label, d.valueMm]));
    expect(values.get('depth')).toBeCloseTo(bench.seatDepthMm, 6);
    expect(values.get('pressed seat')).toBeCloseTo(layout.pressedTopMm, 6);
    expect(values.get('back over the pressed seat')).toBeCloseTo(bench.backHeightMm, 6);
    const seats = drawing.shapes
      .filter((s): s is Extract<DrawShape, { kind: 'polygon' }> => s.kind === 'polygon' && s.fill === 'cloth')
      .flatMap(({ points }) => points);
    const top = Math.max(...seats.filter(([x]) => Math.abs(x - layout.frontZMm) < 1).map(([, y]) => -y));
    expect(top).toBeCloseTo(layout.seatTopFrontMm, 3);
  });

  it('is empty for a piece that is not there', () => {
    expect(sectionOf(document, 'nothing').shapes).toEqual([]);
  });
});

describe('cushion drawing', () => {
  const both = structuredClone(built('facing-benches'));
  for (const piece of both.pieces) if (piece.kind === 'bench') piece.upholstery.buttons.on = 'both';
  const specs = deriveCushions(both);

  it('writes chains that add up: columns to the width, rows to the depth', () => {
    for (const spec of specs) {
      const { plan } = cushionDrawing(spec);
      const loud = dimensions(plan).filter((d) => !d.quiet && d.label === undefined);
      const level = loud.filter((d) => Math.abs(d.from[1] - d.to[1]) < 1e-6);
      const upright = loud.filter(
        (d) => Math.abs(d.from[0] - d.to[0]) < 1e-6 && d.valueMm < spec.finishedMm.depthMm - 1e-6,
      );
      const sum = (list: DimensionShape[]): number => list.reduce((total, d) => total + d.valueMm, 0);
      expect(sum(level)).toBeCloseTo(spec.finishedMm.widthMm, 6);
      expect(sum(upright)).toBeCloseTo(spec.finishedMm.depthMm, 6);
    }
  });

  it('has the wall on the page side of the sitter’s hand, back edge up', () => {
    const left = cushionDrawing(specs[0]!);
    const wall = left.plan.shapes.find((s) => s.kind === 'polyline' && s.pen === 'outline');
    expect((wall as Extract<DrawShape, { kind: 'polyline' }>).points[0]![0]).toBeGreaterThan(
      specs[0]!.finishedMm.widthMm,
    );
    const right = cushionDrawing(specs[1]!);
    const other = right.plan.shapes.find((s) => s.kind === 'polyline' && s.pen === 'outline');
    expect((other as Extract<DrawShape, { kind: 'polyline' }>).points[0]![0]).toBeLessThan(0);
  });

  it('draws the zip as long as it is', () => {
    for (const spec of specs) {
      const zip = cushionDrawing(spec).plan.shapes.find((s) => s.kind === 'polyline' && s.pen === 'cut');
      const { points } = zip as Extract<DrawShape, { kind: 'polyline' }>;
      const drawn = points
        .slice(1)
        .reduce((total, [x, y], i) => total + Math.hypot(x - points[i]![0], y - points[i]![1]), 0);
      expect(drawn).toBeCloseTo(spec.making!.closure.lengthMm, 6);
    }
  });

  it('is finite throughout', () => {
    for (const spec of specs) Object.values(cushionDrawing(spec)).forEach(finite);
  });
});

describe('label lanes', () => {
  it('leave long stretches in line and lift short ones clear of each other', () => {
    expect(
      labelLanes(
        [
          [0, 100],
          [100, 200],
        ],
        60,
      ),
    ).toEqual([0, 0]);
    expect(
      labelLanes(
        [
          [0, 100],
          [100, 120],
          [120, 140],
          [140, 160],
          [160, 300],
        ],
        60,
      ),
    ).toEqual([0, 1, 2, 3, 0]);
  });

  it('never let two numbers of one lane overlap', () => {
    const stops = [0, 8, 30, 33, 60, 61, 62, 120, 125, 300];
    const stretches = stops.slice(1).map((to, i): [number, number] => [stops[i]!, to]);
    const lanes = labelLanes(stretches, 40);
    stretches.forEach(([a, b], i) =>
      stretches.forEach(([c, d], j) => {
        if (i < j && lanes[i] === lanes[j])
          expect(Math.abs((a + b) / 2 - (c + d) / 2)).toBeGreaterThanOrEqual(40);
      }),
    );
  });
});
