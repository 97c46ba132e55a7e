import type { Spot } from '@settlewright/geometry';
import { useRef, type PointerEvent } from 'react';

const RADIUS_PX = 9;
const HIT_PX = 26;
const TEXT_PX = 12;

interface SpotHandleProps {
  /** Stands in the handle. */
  words: string;
  spot: Spot;
  /** Millimetres of a pixel. */
  pxMm: number;
  onMove: (event: PointerEvent) => void;
  onDrop: () => void;
  onGiveUp: () => void;
}

/** A spot on the plan that can be dragged. */
export function SpotHandle({ words, spot, pxMm, onMove, onDrop, onGiveUp }: SpotHandleProps) {
  const holds = useRef(false);
  return (
    <g
      className="cursor-move touch-none"
      transform={`translate(${spot.xMm} ${spot.zMm}) scale(${pxMm})`}
      onClick={(event) => event.stopPropagation()}
      onPointerDown={(event) => {
        holds.current = true;
        event.currentTarget.setPointerCapture(event.pointerId);
      }}
      onPointerMove={(event) => holds.current && onMove(event)}
      onPointerUp={() => {
        holds.current = false;
        onDrop();
      }}
      onPointerCancel={() => {
        holds.current = false;
        onGiveUp();
      }}
    >
      <circle r={HIT_PX} fill="transparent" />
      <circle r={RADIUS_PX} fill="var(--color-chalk)" stroke="var(--color-sheet)" strokeWidth="1.5" />
      <text
        y={TEXT_PX / 3}
        textAnchor="middle"
        fontSize={TEXT_PX}
        fontWeight="600"
        fill="var(--color-on-chalk)"
      >
        {words}
      </text>
    </g>
  );
}
