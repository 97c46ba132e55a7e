import type { DimensionShape, Drawing, DrawShape, Pen } from '@settlewright/geometry';
import { typedForm } from '@/components/measure.tsx';
import { useFormat } from '@/lib/format.ts';

const PENS: Record<Pen, number> = { hair: 0.75, fine: 1, edge: 1.3, outline: 2, cut: 3.2 };
const LETTER_PX = 7.2;
const TICK_PX = 5;

interface At {
  x: (mm: number) => number;
  y: (mm: number) => number;
}

/** A measured line in pixels: ticks at both ends, the number on its ground in the line or above it. */
function Dimension({ shape, at, text }: { shape: DimensionShape; at: At; text: string }) {
  const from = [at.x(shape.from[0]), at.y(shape.from[1])] as const;
  const to = [at.x(shape.to[0]), at.y(shape.to[1])] as const;
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]) || 1;
  const along = [(to[0] - from[0]) / length, (to[1] - from[1]) / length] as const;
  const aside = [along[1], -along[0]] as const;
  const off = Math.abs(at.x(shape.offsetMm) - at.x(0)) * Math.sign(shape.offsetMm);
  const point = (t: number, lift = 0) =>
    [
      from[0] + along[0] * t + aside[0] * (off + lift),
      from[1] + along[1] * t + aside[1] * (off + lift),
    ] as const;
  const [a, b] = [point(0), point(length)];
  const middle = point(
    shape.labelAt === 'to' ? length : length / 2,
    shape.labelLane * 13 * Math.sign(off || 1),
  );
  const width = text.length * LETTER_PX + 6;
  const tick = (end: readonly [number, number]) =>
    `M${end[0] - aside[0] * TICK_PX} ${end[1] - aside[1] * TICK_PX}L${end[0] + aside[0] * TICK_PX} ${end[1] + aside[1] * TICK_PX}`;
  return (
    <g
      stroke="var(--color-ink)"
      strokeWidth={shape.quiet ? 0.75 : 1.1}
      fill="none"
      opacity={shape.quiet ? 0.75 : 1}
    >
      <path d={`M${a.join(' ')}L${b.join(' ')}${tick(a)}${tick(b)}`} />
      <rect
        x={middle[0] - width / 2}
        y={middle[1] - 8}
        width={width}
        height="16"
        fill="var(--color-paper)"
        stroke="none"
      />
      <text
        x={middle[0]}
        y={middle[1] + 4.5}
        textAnchor="middle"
        stroke="none"
        fill={shape.quiet ? 'var(--color-ink-2)' : 'var(--color-ink)'}
        fontSize="13"
        fontWeight={shape.quiet ? 400 : 600}
      >
        {text}
      </text>
    </g>
  );
}

function Shape({ shape, at, lengthText }: { shape: DrawShape; at: At; lengthText: (mm: number) => string }) {
  const line = (pen: Pen, dashed?: true) => ({
    stroke: 'var(--color-ink)',
    strokeWidth: PENS[pen],
    strokeDasharray: dashed ? '5 4' : undefined,
  });
  const points = (list: readonly (readonly [number, number])[]) =>
    list.map(([x, y]) => `${at.x(x)},${at.y(y)}`).join(' ');
  switch (shape.kind) {
    case 'polyline':
      return <polyline points={points(shape.points)} fill="none" {...line(shape.pen, shape.dashed)} />;
    case 'polygon':
      return (
        <polygon
          points={points(shape.points)}
          fill={shape.fill === 'none' ? 'none' : 'var(--color-sheet)'}
          {...line(shape.pen, shape.dashed)}
        />
      );
    case 'circle':
      return (
        <circle
          cx={at.x(shape.centre[0])}
          cy={at.y(shape.centre[1])}
          r={Math.max(3, at.x(shape.radiusMm) - at.x(0))}
          fill="var(--color-sheet)"
          {...line('edge')}
        />
      );
    case 'text': {
      const [x, y] = [at.x(shape.at[0]), at.y(shape.at[1])];
      return (
        <text
          x={x}
          y={y}
          textAnchor={shape.anchor}
          fontSize="13"
          fill="var(--color-ink)"
          transform={shape.upright ? `rotate(-90 ${x} ${y})` : undefined}
          paintOrder="stroke"
          stroke="var(--color-paper)"
          strokeWidth="4"
        >
          {shape.text}
        </text>
      );
    }
    case 'dimension':
      return (
        <Dimension
          shape={shape}
          at={at}
          text={[lengthText(shape.valueMm), shape.label].filter(Boolean).join(' ')}
        />
      );
  }
}

/** A drawing to be read: black lines, every measure written, as on the paper. */
export function CushionDrawing({
  drawing,
  label,
  widthPx,
}: {
  drawing: Drawing;
  label: string;
  widthPx: number;
}) {
  const format = useFormat();
  const { boundsMm } = drawing;
  const factor = widthPx / boundsMm.width;
  const at: At = {
    x: (mm) => (mm - boundsMm.x) * factor,
    y: (mm) => (mm - boundsMm.y) * factor,
  };
  return (
    <svg
      viewBox={`-24 -24 ${widthPx + 48} ${boundsMm.height * factor + 48}`}
      className="h-auto w-full"
      style={{ maxWidth: widthPx + 48 }}
      role="img"
      aria-label={label}
    >
      {drawing.shapes.map((shape, index) => (
        <Shape key={index} shape={shape} at={at} lengthText={(mm) => typedForm(format.length(mm))} />
      ))}
    </svg>
  );
}
