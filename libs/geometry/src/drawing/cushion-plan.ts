import type { CushionSpec } from '../cushions/cushion-spec.ts';
import { buttonSpots } from '../cushions/cushion-warnings.ts';
import { fittingSize } from '../cushions/cushion-sizes.ts';
import { closurePath } from '../cushions/making/edge-strip.ts';
import { wearHatch, wearRectangle } from '../cushions/wear-hatch.ts';
import { wearMark } from '../cushions/wear.ts';
import { offsetFault, offsetOutline, outlinePoints, type OutlineCorner } from '../outlines/outline.ts';
import { WELT_MM } from './cushion-views.ts';
import { drawingOf, type Drawing, type DrawShape, type PagePoint } from './drawing.ts';
import { planChains, wallBeside } from './plan-chains.ts';
import { EDGE_WORDS, edgeWords, insetMm } from './plan-edges.ts';

const BUTTON_RADIUS_MM = 11;

/** A cushion from above, back edge up: board lines, seams, zip, wall, buttons, words and chains. */
export function cushionPlan(spec: CushionSpec, labelMm: number, stepMm?: number): Drawing {
  const { widthMm: w, depthMm: d } = fittingSize(spec);
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
    { kind: 'polygon', points: onPage(spec.outline, d), pen: 'edge', fill: 'none' },
    ...wearShapes(spec, labelMm),
    ...seamShapes(spec),
    ...closureShapes(spec, labelMm),
    ...wallShapes(spec, labelMm),
    ...buttonSpots(spec).map(([x, y]): DrawShape => ({
      kind: 'circle',
      centre: [x, d - y],
      radiusMm: BUTTON_RADIUS_MM,
      pen: 'edge',
      fill: 'paper',
    })),
    ...edgeWords(spec, labelMm),
    ...planChains(spec, labelMm, stepMm),
  ];
  return drawingOf(shapes, labelMm / 2);
}

/** Outlines run anticlockwise with y up the page; drawings have it down. */
const onPage = (corners: readonly OutlineCorner[], depthMm: number): PagePoint[] =>
  outlinePoints(corners, 0.5).map(([x, y]): PagePoint => [x, depthMm - y]);

/** What is to look used, hatched and numbered; a number stands where no edge is named. */
function wearShapes(spec: CushionSpec, labelMm: number): DrawShape[] {
  const d = fittingSize(spec).depthMm;
  return (spec.wear ?? []).flatMap((area, i): DrawShape[] => {
    const { x0, x1, y1 } = wearRectangle(spec, area);
    const lines = wearHatch(spec, area, labelMm / 4);
    if (lines.length === 0) return [];
    return [
      ...lines.map((line): DrawShape => ({
        kind: 'polyline',
        points: line.map(([x, y]): PagePoint => [x, d - y]),
        pen: 'hair',
      })),
      {
        kind: 'text',
        at: [x0 + Math.min((x1 - x0) / 2, 1.3 * labelMm), d - y1 + labelMm / 3],
        text: wearMark(i),
        anchor: 'middle',
      },
    ];
  });
}

/** The welt just within the edge, where the outline leaves room for it. */
function seamShapes(spec: CushionSpec): DrawShape[] {
  const inner = offsetOutline(spec.outline, -WELT_MM);
  if (offsetFault(spec.outline, inner)) return [];
  return [{ kind: 'polygon', points: onPage(inner, fittingSize(spec).depthMm), pen: 'hair', fill: 'none' }];
}

/** The closure along its edge and round both ends, with a tick and a word where it ends. */
function closureShapes(spec: CushionSpec, labelMm: number): DrawShape[] {
  const { making, make, outline } = spec;
  const { widthMm, depthMm } = fittingSize(spec);
  if (!making || making.closure.edgeMm === 0) return [];
  const path = closurePath(outline, make.closureEdge, making.closure.wrapMm);
  const page = path.map(([x, y]): PagePoint => [x, depthMm - y]);
  const tick = labelMm / 5;
  const word = make.closure === 'zip' ? 'zip end' : 'closure end';
  const ends = [page.slice(0, 2), page.slice(-2).reverse()];
  return [
    { kind: 'polyline', points: page, pen: 'cut' },
    ...ends.flatMap(([end, next]): DrawShape[] => {
      if (!end || !next || making.closure.wrapMm === 0) return [];
      const upright = Math.abs(next[0] - end[0]) < Math.abs(next[1] - end[1]);
      const across = upright ? [tick, 0] : [0, tick];
      const inwards = upright && end[0] < widthMm / 2 ? 1 : -1;
      return [
        {
          kind: 'polyline',
          points: [
            [end[0] - across[0]!, end[1] - across[1]!],
            [end[0] + across[0]!, end[1] + across[1]!],
          ],
          pen: 'edge',
        },
        ...(upright
          ? [
              {
                kind: 'text' as const,
                at: [end[0] + inwards * 2 * tick, end[1]] as PagePoint,
                text: word,
                anchor: inwards > 0 ? ('start' as const) : ('end' as const),
                short: { text: '', acrossMm: making.closure.wrapMm - insetMm(labelMm) },
              },
            ]
          : []),
      ];
    }),
  ];
}

function wallShapes(spec: CushionSpec, labelMm: number): DrawShape[] {
  const { datum } = spec;
  const { widthMm: w, depthMm: d } = fittingSize(spec);
  const wall = wallBeside(spec, labelMm);
  if (!wall) return [];
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
      text: datum.wallMark ? `${EDGE_WORDS[wall]} ${datum.wallMark}` : EDGE_WORDS[wall],
      anchor: 'middle',
      upright: true,
    },
  ];
}
