import type { DimensionShape, Drawing, DrawShape, Pen } from '@settlewright/geometry';
import { useMemo } from 'react';
import { splitFractions } from '@/components/measure.tsx';
import { useFormat } from '@/lib/format.ts';
import { useWidth } from '@/lib/use-width.ts';
import {
  dimensionLine,
  fitDrawing,
  shownText,
  spreadWords,
  TEXT_PX,
  textWidthPx,
  wordBox,
  type At,
  type Move,
  type TextShape,
} from './drawing-fit.ts';

const PENS: Record<Pen, number> = { hair: 0.75, fine: 1, edge: 1.3, outline: 2, cut: 3.2 };
const TICK_PX = 5;
/** Used until the page has said how wide it is. */
const FIRST_WIDTH_PX = 640;

const lineOf = (pen: Pen, dashed?: true) => ({
  stroke: 'var(--color-ink)',
  strokeWidth: PENS[pen],
  strokeDasharray: dashed ? '5 4' : undefined,
});

function DimensionLines({ shape, at }: { shape: DimensionShape; at: At }) {
  const { a, b, aside } = dimensionLine(shape, at);
  const tick = ([x, y]: readonly [number, number]) =>
    `M${x - aside[0] * TICK_PX} ${y - aside[1] * TICK_PX}L${x + aside[0] * TICK_PX} ${y + aside[1] * TICK_PX}`;
  return (
    <path
      d={`M${a.join(' ')}L${b.join(' ')}${tick(a)}${tick(b)}`}
      fill="none"
      stroke={shape.quiet ? 'var(--color-rule-strong)' : 'var(--color-ink)'}
      strokeWidth={shape.quiet ? 0.9 : 1.1}
    />
  );
}

/** The number of a dimension on its ground, over all lines. */
function DimensionNumber({ shape, at, text }: { shape: DimensionShape; at: At; text: string }) {
  const [x, y] = dimensionLine(shape, at).middle;
  const width = textWidthPx(text) + 10;
  return (
    <>
      <rect x={x - width / 2} y={y - 8} width={width} height="16" fill="var(--color-paper)" />
      <text
        x={x}
        y={y + 4.5}
        textAnchor="middle"
        fill={shape.quiet ? 'var(--color-ink-2)' : 'var(--color-ink)'}
        fontSize={TEXT_PX}
        fontWeight={shape.quiet ? 400 : 600}
      >
        {splitFractions(text).map((piece, index) => (
          <tspan key={index} style={piece.fraction ? { fontFeatureSettings: "'frac'" } : undefined}>
            {piece.text}
          </tspan>
        ))}
      </text>
    </>
  );
}

function Lines({ shape, at }: { shape: DrawShape; at: At }) {
  const points = (list: readonly (readonly [number, number])[]) =>
    list.map(([x, y]) => `${at.x(x)},${at.y(y)}`).join(' ');
  switch (shape.kind) {
    case 'polyline':
      return <polyline points={points(shape.points)} fill="none" {...lineOf(shape.pen, shape.dashed)} />;
    case 'polygon':
      return (
        <polygon
          points={points(shape.points)}
          fill={shape.fill === 'none' ? 'none' : 'var(--color-sheet)'}
          {...lineOf(shape.pen, shape.dashed)}
        />
      );
    case 'circle':
      return (
        <circle
          cx={at.x(shape.centre[0])}
          cy={at.y(shape.centre[1])}
          r={Math.max(3, at.x(shape.radiusMm) - at.x(0))}
          fill="var(--color-sheet)"
          {...lineOf('edge')}
        />
      );
    case 'dimension':
      return <DimensionLines shape={shape} at={at} />;
    case 'text':
      return null;
  }
}

interface WordProps {
  shape: TextShape;
  at: At;
  move: Move | undefined;
}

/** Paper under a word, so that no board line runs through it. */
function WordGround({ shape, at, move }: WordProps) {
  const { left, right, top, bottom } = wordBox(shape, at);
  const { right: aside, down } = move ?? { right: 0, down: 0 };
  return (
    <rect
      x={left + aside}
      y={top + down}
      width={right - left}
      height={bottom - top}
      fill="var(--color-paper)"
    />
  );
}

function Word({ shape, at, move }: WordProps) {
  const { right, down } = move ?? { right: 0, down: 0 };
  const [x, y] = [at.x(shape.at[0]), at.y(shape.at[1])];
  const middle = x + right;
  return (
    <>
      {down > 0 && <path d={`M${x - 6} ${y}L${x - 2} ${y + down}`} fill="none" {...lineOf('hair')} />}
      <text
        x={middle}
        y={y + down + 4.5}
        textAnchor={shape.anchor}
        fontSize={TEXT_PX}
        fill="var(--color-ink)"
        transform={shape.upright ? `rotate(-90 ${middle} ${y})` : undefined}
      >
        {shownText(shape, at)}
      </text>
    </>
  );
}

interface CushionDrawingProps {
  drawing: Drawing;
  label: string;
  /** Never drawn narrower than this; a small page scrolls it. */
  leastPx: number;
  mostPx?: number;
}

/** A drawing to be read: ink lines, every measure written, as on the paper. */
export function CushionDrawing({ drawing, label, leastPx, mostPx = Infinity }: CushionDrawingProps) {
  const format = useFormat();
  const [measure, widthPx = FIRST_WIDTH_PX] = useWidth();
  const { at, box, numberText, moves } = useMemo(() => {
    const numberText = (shape: DimensionShape) =>
      [format.length(shape.valueMm), shape.label].filter(Boolean).join(' ');
    const fitted = fitDrawing(drawing, Math.min(mostPx, Math.max(leastPx, widthPx)), numberText);
    const moves = spreadWords(drawing.shapes, fitted.at, numberText);
    const lowered = Math.max(0, ...[...moves.values()].map(({ down }) => down));
    const box = { ...fitted.box, height: fitted.box.height + lowered };
    return { at: fitted.at, box, numberText, moves };
  }, [drawing, format, widthPx, leastPx, mostPx]);
  return (
    // What has to be scrolled can be reached and scrolled with the keys.
    <div
      ref={measure}
      className="overflow-x-auto"
      {...(box.width > widthPx + 1 && {
        tabIndex: 0,
        role: 'group',
        'aria-label': `${label}, scrolls sideways`,
      })}
    >
      <svg
        viewBox={`${box.x} ${box.y} ${box.width} ${box.height}`}
        width={box.width}
        height={box.height}
        className="max-w-none"
        role="img"
        aria-label={label}
      >
        {drawing.shapes.map((shape, index) => (
          <Lines key={index} shape={shape} at={at} />
        ))}
        {drawing.shapes.map(
          (shape, index) =>
            shape.kind === 'text' &&
            shownText(shape, at) !== '' && (
              <WordGround key={index} shape={shape} at={at} move={moves.get(shape)} />
            ),
        )}
        {drawing.shapes.map((shape, index) => {
          if (shape.kind === 'text')
            return <Word key={index} shape={shape} at={at} move={moves.get(shape)} />;
          if (shape.kind !== 'dimension') return null;
          return <DimensionNumber key={index} shape={shape} at={at} text={numberText(shape)} />;
        })}
      </svg>
    </div>
  );
}
