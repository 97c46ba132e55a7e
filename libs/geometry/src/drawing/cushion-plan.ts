import type { CushionSpec, EdgeMeets } from '../cushions/cushion-spec.ts';
import { rectangle, WELT_MM } from './cushion-views.ts';
import { datumChain, dimensionChain } from './dimension-chain.ts';
import { drawingOf, type Drawing, type DrawShape, type PagePoint } from './drawing.ts';

const BUTTON_RADIUS_MM = 11;

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

/** A cushion from above, back edge up: board lines, seams, zip, wall, buttons, words and chains. */
export function cushionPlan(spec: CushionSpec, labelMm: number): Drawing {
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
    { kind: 'polygon', points: rectangle(0, 0, w, d), pen: 'edge', fill: 'none' },
    {
      kind: 'polygon',
      points: rectangle(WELT_MM, WELT_MM, w - WELT_MM, d - WELT_MM),
      pen: 'hair',
      fill: 'none',
    },
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
