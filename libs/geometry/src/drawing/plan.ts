import { cushionRuns, cushionRunsOf } from '../cushions/cushion-runs.ts';
import { cushionPanel } from '../cushions/cushion-panel.ts';
import type { CushionShape } from '../cushions/cushion-shape.ts';
import { toRoom } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { placeFramesOf } from '../pieces/place-frames.ts';
import { leavesOfTable, tableTop, type LeafEdge } from '../pieces/table-leaves.ts';
import type { Piece, PieceOf, SetDocument } from '../room/document.ts';
import { footprint } from '../room/footprint.ts';
import { drawingOf, type Drawing, type DrawShape, type Fill, type PagePoint, type Pen } from './drawing.ts';
import type { SitterColour } from './sitter-colours.ts';

/** Marks of cushions and what was chosen of them, by key. */
interface Cushions {
  marks: ReadonlyMap<string, string>;
  choices: NonNullable<SetDocument['cushions']>;
}

/** What a plan shows besides the pieces. */
export interface PlanOptions {
  /** Who sits: a circle at each place, in their colour. */
  sitters?: readonly { placeId: string; colour: SitterColour }[];
  /** Words on the plan: marks of pieces, marks of seat cushions, or none. */
  marks?: 'none' | 'pieces' | 'cushions';
  marginMm?: number;
}

const HEAD_RADIUS_MM = 105;
/** How thick the back of a loose seat is shown. */
const LOOSE_BACK_MM = 20;
/** Pieces lower down are painted first. */
const PAINTING_ORDER: readonly Piece['kind'][] = [
  'bulkhead',
  'sill',
  'loose-seat',
  'bench',
  'table',
  'overhead',
];

/** A rectangle of a piece's own frame on the page. */
function rectangle(piece: Piece, x0: number, x1: number, z0: number, z1: number): PagePoint[] {
  return (
    [
      [x0, z0],
      [x1, z0],
      [x1, z1],
      [x0, z1],
    ] as const
  ).map(([x, z]): PagePoint => {
    const [rx, , rz] = toRoom(piece.at, [x, 0, z]);
    return [rx, rz];
  });
}

const area = (piece: Piece, points: PagePoint[], pen: Pen, fill: Fill, dashed?: true): DrawShape => ({
  kind: 'polygon',
  points,
  pen,
  fill,
  pieceId: piece.id,
  ...(dashed ? { dashed } : {}),
});

/** A seat cushion as it lies between two ends and two depths of its piece, in its shape. */
function seatPanel(
  piece: Piece,
  [x0, x1, z0, z1]: readonly [number, number, number, number],
  shape: CushionShape | undefined,
): PagePoint[] {
  const panel = cushionPanel({ widthMm: x1 - x0, depthMm: z1 - z0 }, shape);
  if (!panel) return rectangle(piece, x0, x1, z0, z1);
  return panel.map(([x, y]): PagePoint => {
    const [rx, , rz] = toRoom(piece.at, [(x0 + x1) / 2 + x, 0, (z0 + z1) / 2 - y]);
    return [rx, rz];
  });
}

function benchShapes(bench: PieceOf<'bench'>, { marks, choices }: Cushions): DrawShape[] {
  const layout = benchLayout(bench);
  const half = bench.lengthMm / 2;
  const front = Math.max(layout.frontZMm, layout.deckFrontZMm);
  const shapes = [area(bench, rectangle(bench, -half, half, 0, front), 'edge', 'oak')];
  for (const run of cushionRuns(bench)) {
    const mark = marks.get(run.key);
    const points =
      run.kind === 'seat'
        ? seatPanel(
            bench,
            [run.leftMm, run.rightMm, layout.faceZMm, layout.frontZMm],
            choices[run.key]?.shape,
          )
        : rectangle(bench, run.leftMm, run.rightMm, bench.backThicknessMm, layout.faceZMm);
    shapes.push({
      ...area(bench, points, 'fine', 'cloth'),
      ...(mark ? { cushionMark: mark } : {}),
    });
  }
  if (layout.hasBack) {
    shapes.push(area(bench, rectangle(bench, -half, half, 0, bench.backThicknessMm), 'edge', 'oak'));
  }
  for (const side of ['left', 'right'] as const) {
    const { kind, thicknessMm } = bench.ends[side];
    if (kind === 'open' || thicknessMm === 0) continue;
    const [x0, x1] = side === 'left' ? [-half, thicknessMm - half] : [half - thicknessMm, half];
    shapes.push(area(bench, rectangle(bench, x0, x1, 0, front), 'edge', 'oak'));
  }
  return shapes;
}

function sillShapes(sill: PieceOf<'sill'>): DrawShape[] {
  const half = sill.lengthMm / 2;
  const shapes = [area(sill, rectangle(sill, -half, half, 0, sill.depthMm), 'edge', 'walnut')];
  const { widthMm } = sill.opening;
  if (widthMm > 0) {
    shapes.push({
      kind: 'polyline',
      points: rectangle(sill, -widthMm / 2, widthMm / 2, 0, 0).slice(0, 2),
      pen: 'outline',
      pieceId: sill.id,
    });
  }
  return shapes;
}

/** The top with its leaves; a hanging one is a thin strip at its edge. */
function tableShapes(table: PieceOf<'table'>): DrawShape[] {
  const leaves = leavesOfTable(table);
  if (leaves.length === 0) return [area(table, corners(table), 'edge', 'walnut')];
  const [x, z] = [table.lengthMm / 2, table.widthMm / 2];
  const whole = tableTop(table);
  const strips: Record<LeafEdge, [number, number, number, number]> = {
    left: [whole.x0, -x, -z, z],
    right: [x, whole.x1, -z, z],
    back: [-x, x, whole.z0, -z],
    front: [-x, x, z, whole.z1],
  };
  return [
    area(table, rectangle(table, -x, x, -z, z), 'edge', 'walnut'),
    ...leaves.map(({ edge }) => area(table, rectangle(table, ...strips[edge]), 'edge', 'walnut')),
  ];
}

function pieceShapes(piece: Piece, cushions: Cushions): DrawShape[] {
  switch (piece.kind) {
    case 'bench':
      return benchShapes(piece, cushions);
    case 'sill':
      return sillShapes(piece);
    case 'bulkhead':
      return [area(piece, corners(piece), 'cut', 'wall')];
    case 'table':
      return tableShapes(piece);
    case 'overhead':
      return [area(piece, corners(piece), 'hair', 'none', true)];
    case 'loose-seat': {
      const half = piece.widthMm / 2;
      const shapes = [area(piece, corners(piece), 'edge', 'oak')];
      if (piece.seatCushion.thicknessMm > 0) {
        const inside = [-half + 15, half - 15, 15, piece.seatDepthMm - 10] as const;
        const shape = cushionRuns(piece).map(({ key }) => cushions.choices[key]?.shape)[0];
        shapes.push(area(piece, seatPanel(piece, inside, shape), 'fine', 'cloth'));
      }
      if (piece.backHeightMm > 0) {
        shapes.push(area(piece, rectangle(piece, -half, half, -LOOSE_BACK_MM, 0), 'edge', 'oak'));
      }
      return shapes;
    }
  }
}

const corners = (piece: Piece): PagePoint[] => footprint(piece).corners.map(([x, z]): PagePoint => [x, z]);

/** Centre of an area; its corners alone would say a rounded corner many times over. */
function middle(points: readonly PagePoint[]): PagePoint {
  let [x, y, twice] = [0, 0, 0];
  points.forEach(([ax, ay], i) => {
    const [bx, by] = points[(i + 1) % points.length]!;
    const part = ax * by - bx * ay;
    [x, y, twice] = [x + (ax + bx) * part, y + (ay + by) * part, twice + part];
  });
  return [x / (3 * twice), y / (3 * twice)];
}

/**
 * The set seen from above: walls as thick areas, benches with back and cushions, tables, loose seats,
 * sills with their openings, beams dashed.
 *
 * @param document - the set
 * @param options - sitters and marks to show
 * @returns page x is the room's x, page y the room's z (towards the viewer), millimetres
 */
export function planOf(document: SetDocument, options: PlanOptions = {}): Drawing {
  const cushionMarks = new Map(
    cushionRunsOf(document).map((run, i): [string, string] => [run.key, `C${i + 1}`]),
  );
  const cushions = { marks: cushionMarks, choices: document.cushions ?? {} };
  const ordered = PAINTING_ORDER.flatMap((kind) => document.pieces.filter((piece) => piece.kind === kind));
  const shapes = ordered.flatMap((piece) => pieceShapes(piece, cushions));
  for (const frame of placeFramesOf(document)) {
    const sitter = options.sitters?.find(({ placeId }) => placeId === frame.placeId);
    if (!sitter) continue;
    shapes.push({
      kind: 'circle',
      centre: [frame.hipMm[0], frame.hipMm[2]],
      radiusMm: HEAD_RADIUS_MM,
      pen: 'fine',
      fill: `sitter-${sitter.colour}`,
      pieceId: frame.pieceId,
      placeId: frame.placeId,
    });
  }
  if (options.marks === 'pieces') {
    for (const piece of ordered) {
      shapes.push({
        kind: 'text',
        at: middle(corners(piece)),
        text: piece.mark,
        anchor: 'middle',
        pieceId: piece.id,
      });
    }
  }
  if (options.marks === 'cushions') {
    for (const shape of [...shapes]) {
      if (shape.kind !== 'polygon' || !shape.cushionMark) continue;
      const { cushionMark, pieceId, points } = shape;
      shapes.push({
        kind: 'text',
        at: middle(points),
        text: cushionMark,
        anchor: 'middle',
        pieceId,
        cushionMark,
      });
    }
  }
  return drawingOf(shapes, options.marginMm ?? 0);
}
