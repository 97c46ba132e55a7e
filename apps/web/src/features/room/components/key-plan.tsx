import { Radio, RadioGroup } from '@headlessui/react';
import { ruleNumber } from '@settlewright/anthropometry';
import {
  askedShapes,
  drawingOf,
  footprint,
  formatLength,
  placeFrames,
  type DrawShape,
  type Piece,
} from '@settlewright/geometry';
import { DrawnShapes } from '@/components/drawing-svg.tsx';
import { Measure } from '@/components/measure.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import type { RoomAddress } from '../hooks/use-address.ts';
import type { RoomPicture } from '../picture.ts';
import { initials } from '@/lib/short-name.ts';
import { sitterFill } from '@/lib/sitter-colours.ts';
import { useSurroundings } from '../room-context.tsx';
import { VIEW_LETTERS, VIEW_TITLES, type ViewLetter } from '../scene/views.ts';
import { NamedViews } from '../views/named-views.tsx';
import { EyeMark } from './eye-mark.tsx';

const WIDTH = 240;
const LEFT = 34;
const BOTTOM = 36;
const TALLEST = 170;
const HEAD_MM = 110;
/** A head this large holds initials that can be read. */
const READABLE = 7.5;

const FILLS: Record<Piece['kind'], string> = {
  bench: 'var(--color-cloth-2)',
  'loose-seat': 'var(--color-cloth-1)',
  table: 'var(--color-oak-1)',
  sill: 'var(--color-sitter-6)',
  bulkhead: 'var(--color-oak-3)',
  overhead: 'none',
};

/** Lowest first, so that a table lies over the bench it stands in. */
const ORDER: Piece['kind'][] = ['bulkhead', 'sill', 'bench', 'loose-seat', 'table', 'overhead'];

interface Props {
  picture: RoomPicture;
  address: RoomAddress;
}

/** The plan to scale, with the eyes from which the room can be seen. */
export function KeyPlan({ picture, address }: Props) {
  const { engine, style } = useSurroundings();
  const { document, bodies } = picture;
  const asked = askedShapes(document.asked, ruleNumber(engine.ruleBook.rule('ACC-08'), 'circle'));
  const plan = planOfSet(document.pieces, asked);
  const pieces = planOfSet(document.pieces);
  const { minX, maxX, minZ, maxZ } = plan;
  const scale = Math.min((WIDTH - LEFT - 6) / (maxX - minX), TALLEST / (maxZ - minZ));
  const height = (maxZ - minZ) * scale;
  const tall = height + BOTTOM + 10;
  const x = (mm: number) => LEFT + (mm - minX) * scale;
  const z = (mm: number) => 8 + (mm - minZ) * scale;
  const chosen = new Set(address.chosenIds);
  const selected = document.pieces.find((piece) => piece.id === address.pieceId);
  const frames = document.pieces.flatMap((piece) => placeFrames(piece, document));
  const dots = bodies.flatMap((body) => {
    const frame = frames.find((candidate) => candidate.placeId === body.placeId);
    return frame
      ? [{ id: body.placeId, colour: body.colour, words: initials(body.name), hip: frame.hipMm }]
      : [];
  });
  const radius = headRadius(
    dots.map(({ hip }) => [hip[0] * scale, hip[2] * scale]),
    HEAD_MM * scale,
  );
  const cutX = selected ? x(selected.at.xMm) : undefined;
  const width = (maxX - minX) * scale;

  const eyes: Record<ViewLetter, { left: number; top: number; turn: number }> = {
    A: { left: LEFT + width / 2, top: height + 26, turn: 0 },
    B: { left: 15, top: 8 + height / 2, turn: 90 },
    C: {
      left: Math.min(Math.max(cutX ?? LEFT + 30, LEFT + 14), LEFT + width / 2 - 32),
      top: height + 26,
      turn: 0,
    },
    D: { left: LEFT + width - 14, top: height + 26, turn: 0 },
    E: { left: 15, top: height + 26, turn: 45 },
  };

  return (
    <section aria-labelledby="plan-heading">
      <RuleHeading
        id="plan-heading"
        aside={
          <span className="text-sm text-ink-3">
            <Measure text={formatLength(pieces.maxX - pieces.minX, { ...style, feet: true })} />
          </span>
        }
      >
        Key plan
      </RuleHeading>
      <RadioGroup<'div', ViewLetter | null>
        value={address.throughNamed ? null : address.view}
        onChange={(letter) => letter && address.show(letter)}
        aria-label="View"
        className="relative w-full"
        style={{ maxWidth: WIDTH, aspectRatio: `${WIDTH} / ${tall}` }}
      >
        <svg viewBox={`0 0 ${WIDTH} ${tall}`} aria-hidden="true" className="tape absolute inset-0 size-full">
          {ORDER.flatMap((kind) => document.pieces.filter((piece) => piece.kind === kind)).map((piece) => (
            <polygon
              key={piece.id}
              points={footprint(piece)
                .corners.map(([cx, cz]) => `${x(cx).toFixed(1)},${z(cz).toFixed(1)}`)
                .join(' ')}
              fill={piece.hidden ? 'none' : FILLS[piece.kind]}
              stroke={chosen.has(piece.id) ? 'var(--color-ink)' : 'var(--color-pen)'}
              strokeWidth={chosen.has(piece.id) ? 2.5 : 1}
              strokeDasharray={piece.kind === 'overhead' ? '4 3' : piece.hidden ? '2 3' : undefined}
            />
          ))}
          {dots.map((dot) => (
            <g key={dot.id} transform={`translate(${x(dot.hip[0])} ${z(dot.hip[2])})`}>
              <circle r={radius} fill={sitterFill(dot.colour)} stroke="var(--color-pen)" />
              {radius >= READABLE && (
                <text
                  textAnchor="middle"
                  dy="0.36em"
                  fontSize={radius * 1.1}
                  fontWeight={600}
                  fill="var(--color-pen)"
                >
                  {dot.words}
                </text>
              )}
            </g>
          ))}
          <g transform={`translate(${x(0)} ${z(0)}) scale(${scale})`}>
            <DrawnShapes shapes={asked} />
          </g>
          {cutX !== undefined && address.view === 'C' && !address.throughNamed && (
            <path
              d={`M${cutX} 2V${height + 14}`}
              stroke="var(--color-ink)"
              strokeWidth="1.25"
              strokeDasharray="7 3 1.5 3"
            />
          )}
        </svg>
        {VIEW_LETTERS.map((letter) => (
          <Radio
            key={letter}
            value={letter}
            aria-label={`${letter}, ${VIEW_TITLES[letter].toLowerCase()}`}
            title={VIEW_TITLES[letter]}
            className="quick reach absolute flex size-[30px] -translate-1/2 cursor-pointer items-center justify-center rounded-sm data-focus:shadow-(--focus-ring)"
            style={{
              left: `${(eyes[letter].left / WIDTH) * 100}%`,
              top: `${(eyes[letter].top / tall) * 100}%`,
            }}
          >
            <EyeMark
              letter={letter}
              chosen={!address.throughNamed && letter === address.view}
              turnDeg={eyes[letter].turn}
            />
          </Radio>
        ))}
      </RadioGroup>
      <NamedViews picture={picture} address={address} />
    </section>
  );
}

/** Heads are drawn larger than to scale for their initials, as long as none covers another. */
function headRadius(middles: readonly (readonly [number, number])[], toScale: number): number {
  const apart = middles.flatMap(([ax, az], n) =>
    middles.slice(n + 1).map(([bx, bz]) => Math.hypot(ax - bx, az - bz)),
  );
  return Math.max(3.5, toScale, Math.min(READABLE + 0.5, ...apart.map((gap) => gap / 2 - 0.5)));
}

function planOfSet(pieces: readonly Piece[], asked: DrawShape[] = []) {
  const corners = pieces.flatMap((piece) => footprint(piece).corners);
  const xs = corners.map(([cx]) => cx);
  const zs = corners.map(([, cz]) => cz);
  // Without shapes the bounds are a point at the origin.
  const { x, y, width, height } = drawingOf(asked).boundsMm;
  return {
    minX: Math.min(...xs, x, 0),
    maxX: Math.max(...xs, x + width, 100),
    minZ: Math.min(...zs, y, 0),
    maxZ: Math.max(...zs, y + height, 100),
  };
}
