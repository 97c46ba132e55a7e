import type { CushionSpec, EdgeMeets } from '../cushions/cushion-spec.ts';
import { datumChain, dimensionChain } from './dimension-chain.ts';
import { drawingOf, type Drawing, type DrawShape, type PagePoint } from './drawing.ts';

/** The views of one cushion. */
export interface CushionDrawing {
  /** From above, back edge up, so the sitter's left is at the right of the page. A back cushion: from the front, top up. */
  plan: Drawing;
  /** The front (or lower) edge, level. */
  front: Drawing;
  /** Cut from back to front, front at the right. */
  section: Drawing;
}

/** Sizes of what is drawn but not measured, millimetres of the real thing. */
const BUTTON_RADIUS_MM = 11;
const WELT_MM = 8;
const CROWN_MM = 6.35;
const BOARD_MM = 9.5;
const DECK_MM = 18;

const EDGE_WORDS: Record<EdgeMeets, string> = {
  wall: 'wall',
  'end-wall': 'end wall',
  arm: 'arm',
  neighbour: 'next cushion',
  'corner-cushion': 'cushion of the other leg',
  free: 'free end',
  'back-pad': 'back edge, meets the back pad',
  front: 'front edge',
  'seat-cushion': 'lower edge, meets the seat cushion',
  top: 'top edge',
};

/**
 * Draws one cushion as data: plan with board lines, buttons, zip and chains of dimensions, front and section.
 *
 * @param spec - the cushion
 * @param options.labelMm - length a number takes on the drawing; short stretches lift theirs to another lane
 * @returns three drawings, millimetres; numbers are left to the consumer
 */
export function cushionDrawing(spec: CushionSpec, options: { labelMm?: number } = {}): CushionDrawing {
  const { widthMm, depthMm } = spec.finishedMm;
  const labelMm = options.labelMm ?? 0.06 * Math.max(widthMm, depthMm);
  return { plan: plan(spec, labelMm), front: front(spec), section: section(spec) };
}

const box = (x0: number, y0: number, x1: number, y1: number): PagePoint[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

function plan(spec: CushionSpec, labelMm: number): Drawing {
  const { widthMm: w, depthMm: d } = spec.finishedMm;
  const pageX = (fromSeam: number): number => (spec.datum.side === 'left' ? w - fromSeam : fromSeam);
  const shapes: DrawShape[] = [
    ...spec.boardLinesMm.map((line): DrawShape => ({
      kind: 'polyline',
      points: [
        [pageX(line), -labelMm / 4],
        [pageX(line), d + labelMm / 4],
      ],
      pen: 'hair',
      dashed: true,
    })),
    { kind: 'polygon', points: box(0, 0, w, d), pen: 'edge', fill: 'none' },
    { kind: 'polygon', points: box(WELT_MM, WELT_MM, w - WELT_MM, d - WELT_MM), pen: 'hair', fill: 'none' },
    ...zipShapes(spec, labelMm),
    ...wallShapes(spec, labelMm),
    ...spec.buttons.columns.flatMap(({ fromSeamMm }) =>
      spec.buttons.rowsMm.map((row): DrawShape => ({
        kind: 'circle',
        centre: [pageX(fromSeamMm), row],
        radiusMm: BUTTON_RADIUS_MM,
        pen: 'edge',
        fill: 'paper',
      })),
    ),
    ...edgeWords(spec, labelMm),
    ...planChains(spec, labelMm),
  ];
  return drawingOf(shapes, labelMm / 2);
}

function zipShapes(
  { finishedMm: { widthMm: w, depthMm: d }, cut, zipEdge }: CushionSpec,
  labelMm: number,
): DrawShape[] {
  const y = zipEdge === 'back' ? 0 : d;
  const end = zipEdge === 'back' ? cut.zip.wrapMm : d - cut.zip.wrapMm;
  const tick = labelMm / 5;
  const line = (points: PagePoint[], pen: 'cut' | 'edge'): DrawShape => ({ kind: 'polyline', points, pen });
  return [
    line(
      [
        [0, end],
        [0, y],
        [w, y],
        [w, end],
      ],
      'cut',
    ),
    line(
      [
        [-tick, end],
        [tick, end],
      ],
      'edge',
    ),
    line(
      [
        [w - tick, end],
        [w + tick, end],
      ],
      'edge',
    ),
    { kind: 'text', at: [2 * tick, end], text: 'zip end', anchor: 'start' },
    { kind: 'text', at: [w - 2 * tick, end], text: 'zip end', anchor: 'end' },
  ];
}

/** A datum further off than this is named by its numbers alone, so that the cushion stays large. */
const isFar = ({ datum }: CushionSpec, labelMm: number): boolean => datum.toSeamMm > 4 * labelMm;

function wallShapes(spec: CushionSpec, labelMm: number): DrawShape[] {
  const { datum } = spec;
  const { widthMm: w, depthMm: d } = spec.finishedMm;
  if (datum.meets === 'bench-end' || isFar(spec, labelMm)) return [];
  const x = datum.side === 'left' ? w + datum.toSeamMm : -datum.toSeamMm;
  const beside = datum.side === 'left' ? labelMm / 2 : -labelMm / 2;
  return [
    {
      kind: 'polyline',
      points: [
        [x, -labelMm],
        [x, d + labelMm / 2],
      ],
      pen: 'outline',
    },
    {
      kind: 'text',
      at: [x + beside, d / 2],
      text: datum.wallMark ? `${EDGE_WORDS[datum.meets]} ${datum.wallMark}` : EDGE_WORDS[datum.meets],
      anchor: 'middle',
      upright: true,
    },
  ];
}

function edgeWords(spec: CushionSpec, labelMm: number): DrawShape[] {
  const { widthMm: w, depthMm: d } = spec.finishedMm;
  const inset = WELT_MM + labelMm / 3;
  const words = (at: PagePoint, text: string, upright?: true): DrawShape => ({
    kind: 'text',
    at,
    text,
    anchor: 'middle',
    ...(upright ? { upright } : {}),
  });
  const zip = (edge: 'back' | 'bottom', text: string): string =>
    spec.zipEdge === edge ? `${text}, zip` : text;
  return [
    words([w / 2, inset], zip('back', EDGE_WORDS[spec.edges.back])),
    words([w / 2, d - inset], zip('bottom', EDGE_WORDS[spec.edges.front])),
    words([inset, d / 2], `${EDGE_WORDS[spec.edges.right]}, sitter’s right`, true),
    words([w - inset, d / 2], `${EDGE_WORDS[spec.edges.left]}, sitter’s left`, true),
  ];
}

function planChains(spec: CushionSpec, labelMm: number): DrawShape[] {
  const { widthMm: w, depthMm: d } = spec.finishedMm;
  const fromLeft = spec.datum.side === 'left';
  const columns = spec.buttons.columns.map(({ fromSeamMm }) => fromSeamMm);
  const pageStops = [0, ...columns.map((c) => (fromLeft ? w - c : c)), w].sort((a, b) => a - b);
  const rows = [0, ...spec.buttons.rowsMm, d];
  const shapes: DrawShape[] = [
    {
      kind: 'dimension',
      from: [0, d],
      to: [w, d],
      offsetMm: -1.1 * labelMm,
      valueMm: w,
      label: 'finished, seam to seam',
      labelLane: 0,
    },
    {
      kind: 'dimension',
      from: [0, d],
      to: [0, 0],
      offsetMm: (columns.length > 0 ? 2.4 : 1.2) * labelMm,
      valueMm: d,
      labelLane: 0,
    },
  ];
  if (columns.length === 0) return shapes;
  shapes.push(
    ...dimensionChain(pageStops, { at: (mm) => [mm, 0], offsetMm: 0.9 * labelMm, labelMm }),
    ...dimensionChain(rows, { at: (mm) => [0, mm], offsetMm: -1.1 * labelMm, labelMm: labelMm / 2 }),
  );
  const { toSeamMm } = spec.datum;
  const datumX = fromLeft ? w + toSeamMm : -toSeamMm;
  const inwards = fromLeft ? -1 : 1;
  const stops = spec.buttons.columns.map(({ fromDatumMm }) => fromDatumMm);
  shapes.push(
    ...datumChain(stops, {
      at: (mm) => [datumX + inwards * mm, 0],
      offsetMm: inwards * 2.1 * labelMm,
      labelMm,
      quiet: true,
      ...(isFar(spec, labelMm) ? { drawnFromMm: toSeamMm - labelMm } : {}),
    }),
  );
  if (toSeamMm > 0.5 && !isFar(spec, labelMm)) {
    shapes.push({
      kind: 'dimension',
      from: [Math.min(datumX, fromLeft ? w : 0), d],
      to: [Math.max(datumX, fromLeft ? w : 0), d],
      offsetMm: -1.1 * labelMm,
      valueMm: toSeamMm,
      label: 'gap',
      labelLane: toSeamMm < labelMm ? 1 : 0,
      quiet: true,
    });
  }
  return shapes;
}

/** A face of a stuffed cushion: straight ends that bow a little, crowned top. */
function stuffed(length: number, thickness: number): DrawShape[] {
  const bow = CROWN_MM / 2;
  const crown = Array.from({ length: 13 }, (_, i): PagePoint => {
    const t = i / 12;
    return [t * length, -Math.sin(Math.PI * t) * CROWN_MM];
  });
  return [
    {
      kind: 'polygon',
      points: [
        [0, 0],
        [length, 0],
        [length + bow, thickness / 2],
        [length, thickness],
        [0, thickness],
        [-bow, thickness / 2],
      ],
      pen: 'edge',
      fill: 'none',
    },
    { kind: 'polyline', points: crown, pen: 'fine' },
  ];
}

function front(spec: CushionSpec): Drawing {
  const { widthMm: w, thicknessMm: t } = spec.finishedMm;
  return drawingOf(
    [
      ...stuffed(w, t),
      {
        kind: 'text',
        at: [w / 2, t / 2],
        text: 'boxing between welt seams; the crown may add',
        anchor: 'middle',
      },
      { kind: 'dimension', from: [0, t], to: [0, 0], offsetMm: t / 2, valueMm: t, labelLane: 0 },
    ],
    t / 3,
  );
}

function section(spec: CushionSpec): Drawing {
  const { depthMm: d, thicknessMm: t } = spec.finishedMm;
  const { boardMm } = spec.cut;
  const inset = (d - boardMm.depthMm) / 2;
  const under = spec.kind === 'seat' ? 'deck' : 'back boards';
  const leader = (y: number, text: string): DrawShape[] => [
    {
      kind: 'polyline',
      points: [
        [d - 12, y],
        [d + t / 3, y],
      ],
      pen: 'hair',
    },
    { kind: 'text', at: [d + t / 3 + 8, y], text, anchor: 'start' },
  ];
  const shapes: DrawShape[] = [
    ...stuffed(d, t),
    { kind: 'polygon', points: box(WELT_MM, WELT_MM, d - WELT_MM, t - WELT_MM), pen: 'hair', fill: 'cloth' },
    { kind: 'polygon', points: box(inset, t, d - inset, t + BOARD_MM), pen: 'cut', fill: 'ply' },
    {
      kind: 'polygon',
      points: box(-20, t + BOARD_MM, d + 20, t + BOARD_MM + DECK_MM),
      pen: 'cut',
      fill: 'none',
    },
    ...spec.buttons.rowsMm.map((row): DrawShape => ({
      kind: 'polyline',
      points: [
        [row, 0],
        [row, t + BOARD_MM],
      ],
      pen: 'fine',
      dashed: true,
    })),
    { kind: 'dimension', from: [0, t], to: [0, 0], offsetMm: t / 2, valueMm: t, labelLane: 0 },
    ...leader(t / 2, 'foam'),
    ...leader(t + BOARD_MM / 2, 'board'),
    ...leader(t + BOARD_MM + DECK_MM / 2, under),
  ];
  return drawingOf(shapes, t);
}
