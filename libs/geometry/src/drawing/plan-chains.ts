import { fittingSize } from '../cushions/cushion-sizes.ts';
import type { CushionSpec } from '../cushions/cushion-spec.ts';
import { outlineBox, outlineStretches } from '../outlines/outline.ts';
import { datumChain, dimensionChain } from './dimension-chain.ts';
import type { DimensionShape, PagePoint } from './drawing.ts';
import { MOST_CHAINED_CORNERS, outlineStops } from './outline-stops.ts';

/** From a line of numbers to the next one further out, and for each that was lifted out of its line; lengths of a number. */
const NEXT_ROW = 1.2;
const LIFTED = 0.35;
/** How far the number of a round corner stands in from its arc: past the words along the end. */
const LEADER = { across: 1.6, up: 0.75 };

/** A datum further off than this is named by its numbers alone, so that the cushion stays large. */
const isFar = ({ datum }: Pick<CushionSpec, 'datum'>, labelMm: number): boolean =>
  datum.toSeamMm > 4 * labelMm;

/** What a cushion stands beside where that is drawn: near it, and no mere end of a bench. */
export const wallBeside = ({ datum }: CushionSpec, labelMm: number) =>
  datum.meets === 'bench-end' || isFar({ datum }, labelMm) ? undefined : datum.meets;

/** Where a cushion lies on the page, and which of its ends its columns are measured from. */
interface PlanFrame {
  spec: CushionSpec;
  labelMm: number;
  stepMm: number | undefined;
  left: number;
  right: number;
  back: number;
  front: number;
}

/**
 * The dimensions of a plan from the outline outwards, as on the paper: corners, buttons, the whole; round corners within.
 *
 * @param spec - of the cushion
 * @param labelMm - length of a number on the drawing
 * @param stepMm - smallest step that lengths are shown in
 */
export function planChains(spec: CushionSpec, labelMm: number, stepMm?: number): DimensionShape[] {
  const { depthMm: d } = fittingSize(spec);
  const { x0: left, x1: right, y0, y1 } = outlineBox(spec.outline);
  const frame = { spec, labelMm, stepMm, left, right, back: d - y1, front: d - y0 };
  const corners = cornerChains(frame);
  return [
    ...corners.above,
    ...corners.below,
    ...corners.upright,
    ...radii(frame),
    ...wholeSize(frame, rowsOf(corners.below)),
    ...buttonChains(frame, rowsOf(corners.above)),
  ];
}

/** Lengths of a number that a chain takes. */
const rowsOf = (chain: readonly DimensionShape[]): number =>
  chain.length === 0 ? 0 : NEXT_ROW + LIFTED * Math.max(...chain.map(({ labelLane }) => labelLane));

/** What is notched, tapered or drawn, from corner to corner. */
function cornerChains({ spec, labelMm, stepMm, right, front }: PlanFrame) {
  const { depthMm: d } = fittingSize(spec);
  const { above, below, upright } = outlineStops(spec.outline);
  const { datum } = spec;
  const wallMm = datum.side === 'left' && wallBeside(spec, labelMm) ? datum.toSeamMm + labelMm : 0;
  return {
    above: dimensionChain(above, { at: (mm) => [mm, 0], offsetMm: 0.9 * labelMm, labelMm, stepMm }),
    below: dimensionChain(below, { at: (mm) => [mm, front], offsetMm: -1.1 * labelMm, labelMm, stepMm }),
    upright: dimensionChain(upright.map((y) => d - y).reverse(), {
      at: (mm) => [right, mm],
      offsetMm: 1.1 * labelMm + wallMm,
      labelMm: labelMm / 2,
      stepMm,
    }),
  };
}

/** The radius of each round corner, along a leader into the cushion. */
function radii({ spec, labelMm }: PlanFrame): DimensionShape[] {
  if (spec.outline.length > MOST_CHAINED_CORNERS) return [];
  const { depthMm: d } = fittingSize(spec);
  return outlineStretches(spec.outline).flatMap((stretch): DimensionShape[] => {
    if (stretch.kind !== 'arc') return [];
    const { from, to, centre, radiusMm, sweepRad } = stretch;
    const [x, y] = [(from[0] + to[0]) / 2 - centre[0], (from[1] + to[1]) / 2 - centre[1]];
    const toArc = radiusMm / (Math.hypot(x, y) || 1);
    const inwards = sweepRad > 0 ? -1 : 1;
    const onArc: PagePoint = [centre[0] + x * toArc, d - centre[1] - y * toArc];
    const number: PagePoint = [
      onArc[0] + inwards * Math.sign(x) * LEADER.across * labelMm,
      onArc[1] - inwards * Math.sign(y) * LEADER.up * labelMm,
    ];
    return [
      {
        kind: 'dimension',
        from: onArc,
        to: number,
        offsetMm: 0,
        valueMm: radiusMm,
        label: 'R',
        labelLane: -1,
        labelAt: 'to',
      },
    ];
  });
}

function wholeSize({ spec, labelMm, left, right, back, front }: PlanFrame, rows: number): DimensionShape[] {
  const hasButtons = spec.buttons.columns.length > 0;
  return [
    {
      kind: 'dimension',
      from: [left, front],
      to: [right, front],
      offsetMm: -(1.1 + rows) * labelMm,
      valueMm: right - left,
      label: 'finished, seam to seam',
      labelLane: 0,
    },
    {
      kind: 'dimension',
      from: [left, front],
      to: [left, back],
      offsetMm: (hasButtons ? 2.4 : 1.2) * labelMm,
      valueMm: front - back,
      labelLane: 0,
    },
  ];
}

/** Columns and rows of buttons from seam to seam, and columns from the wall. */
function buttonChains({ spec, labelMm, stepMm }: PlanFrame, rows: number): DimensionShape[] {
  const { widthMm: w, depthMm: d } = fittingSize(spec);
  const { columns, rowsMm } = spec.buttons;
  if (columns.length === 0) return [];
  const fromLeft = spec.datum.side === 'left';
  const across = columns.map(({ fromSeamMm }) => (fromLeft ? w - fromSeamMm : fromSeamMm));
  const { toSeamMm } = spec.datum;
  const datumX = fromLeft ? w + toSeamMm : -toSeamMm;
  const inwards = fromLeft ? -1 : 1;
  const gapShown = toSeamMm > 0.5 && !isFar(spec, labelMm);
  return [
    ...dimensionChain([0, ...across.sort((a, b) => a - b), w], {
      at: (mm) => [mm, 0],
      offsetMm: (0.9 + rows) * labelMm,
      labelMm,
      stepMm,
    }),
    ...dimensionChain([0, ...rowsMm, d], {
      at: (mm) => [0, mm],
      offsetMm: -1.1 * labelMm,
      labelMm: labelMm / 2,
      stepMm,
    }),
    ...datumChain(
      columns.map(({ fromDatumMm }) => fromDatumMm),
      {
        at: (mm) => [datumX + inwards * mm, 0],
        offsetMm: inwards * (2.1 + rows) * labelMm,
        labelMm,
        quiet: true,
        ...(isFar(spec, labelMm) ? { drawnFromMm: toSeamMm - labelMm } : {}),
      },
    ),
    ...(gapShown
      ? [
          {
            kind: 'dimension' as const,
            from: [Math.min(datumX, fromLeft ? w : 0), d] as const,
            to: [Math.max(datumX, fromLeft ? w : 0), d] as const,
            offsetMm: -1.1 * labelMm,
            valueMm: toSeamMm,
            label: 'gap',
            labelLane: toSeamMm < labelMm ? 1 : 0,
            quiet: true as const,
          },
        ]
      : []),
  ];
}
