import type { Drawing, DrawShape, Fill, Pen } from '@settlewright/geometry';
import type { ReactNode } from 'react';

/** Pens in pixels on the screen; drawings keep them whatever their scale. */
const PENS: Record<Pen, number> = { hair: 0.75, fine: 0.9, edge: 1.1, outline: 2, cut: 3 };

const FILLS: Record<Fill, string> = {
  oak: 'var(--color-oak-2)',
  walnut: 'var(--color-oak-1)',
  cloth: 'var(--color-cloth-2)',
  wall: 'var(--color-ink)',
  glass: 'var(--color-daylight)',
  ply: 'var(--color-oak-1)',
  'sitter-1': 'var(--color-sitter-1)',
  'sitter-2': 'var(--color-sitter-2)',
  'sitter-3': 'var(--color-sitter-3)',
  'sitter-4': 'var(--color-sitter-4)',
  'sitter-5': 'var(--color-sitter-5)',
  'sitter-6': 'var(--color-sitter-6)',
  'sitter-7': 'var(--color-sitter-7)',
  'sitter-8': 'var(--color-sitter-8)',
  'sitter-9': 'var(--color-sitter-9)',
  'sitter-10': 'var(--color-sitter-10)',
  'sitter-11': 'var(--color-sitter-11)',
  'sitter-12': 'var(--color-sitter-12)',
  paper: 'var(--color-sheet)',
  none: 'none',
};

const points = (list: readonly (readonly [number, number])[]) => list.map(([x, y]) => `${x},${y}`).join(' ');

function Shape({ shape }: { shape: DrawShape }) {
  const pen = (width: Pen, dashed?: true) => ({
    stroke: 'var(--color-pen)',
    strokeWidth: PENS[width],
    strokeDasharray: dashed ? '4 3' : undefined,
    strokeLinejoin: 'round' as const,
    vectorEffect: 'non-scaling-stroke' as const,
  });
  switch (shape.kind) {
    case 'polyline':
      return <polyline points={points(shape.points)} fill="none" {...pen(shape.pen, shape.dashed)} />;
    case 'polygon':
      return (
        <polygon points={points(shape.points)} fill={FILLS[shape.fill]} {...pen(shape.pen, shape.dashed)} />
      );
    case 'circle':
      return (
        <circle
          cx={shape.centre[0]}
          cy={shape.centre[1]}
          r={shape.radiusMm}
          fill={FILLS[shape.fill]}
          {...pen(shape.pen)}
        />
      );
    case 'text':
    case 'dimension':
      // Words and measures need room that a thumbnail has not.
      return null;
  }
}

/** Shapes of a drawing over another one, whose element sets the scale. */
export const DrawnShapes = ({ shapes }: { shapes: readonly DrawShape[] }) =>
  shapes.map((shape, index) => <Shape key={index} shape={shape} />);

interface DrawingSvgProps {
  drawing: Drawing;
  /** Pixels for a millimetre, the same for all drawings that stand together. */
  pxPerMm: number;
  /** What it shows, for a screen reader; without it the drawing is decoration beside its words. */
  label?: string;
  className?: string;
  /** Painted over the drawing, in its millimetres. */
  children?: ReactNode;
}

/** A drawing of the geometry library on the screen, at a stated scale. */
export function DrawingSvg({ drawing, pxPerMm, label, className, children }: DrawingSvgProps) {
  const { x, y, width, height } = drawing.boundsMm;
  const pad = 2 / pxPerMm;
  return (
    <svg
      viewBox={`${x - pad} ${y - pad} ${width + 2 * pad} ${height + 2 * pad}`}
      width={width * pxPerMm + 4}
      height={height * pxPerMm + 4}
      className={className}
      {...(label === undefined ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label })}
    >
      <DrawnShapes shapes={drawing.shapes} />
      {children}
    </svg>
  );
}

/** The scale at which all of these fit into the same room. */
export function commonScale(drawings: readonly Drawing[], roomPx: { width: number; height: number }): number {
  const widest = Math.max(1000, ...drawings.map(({ boundsMm }) => boundsMm.width));
  const highest = Math.max(500, ...drawings.map(({ boundsMm }) => boundsMm.height));
  return Math.min(roomPx.width / widest, roomPx.height / highest);
}
