import type { Stretch } from '@settlewright/geometry';
import { useEffect, useRef, type KeyboardEvent, type PointerEvent } from 'react';
import type { BoardLayout } from '../board-layout.ts';
import { keyMoves } from '../slider-keys.ts';
import type { TriedValues } from '../tried-values.ts';

interface PlumbSliderProps {
  layout: BoardLayout;
  tried: TriedValues;
  shown: number;
  /** What everybody has in common, for the Home and End keys. */
  band: Stretch | undefined;
  label: string;
  words: string;
  onMove: (value: number) => void;
  /** The hand has let go: the set follows. */
  onRelease: () => void;
  /** Escape: back to where the set stands. */
  onLeave: () => void;
}

/** Keys that follow each other within this time are one step of the history. */
const PAUSE_MS = 700;
const BOB = 44;

/** The bob of the plumb line, for the hand and for the keys. */
export function PlumbSlider({
  layout,
  tried,
  shown,
  band,
  label,
  words,
  onMove,
  onRelease,
  onLeave,
}: PlumbSliderProps) {
  const { left, right, tapeTop, tapeBottom, height, x, valueAt } = layout;
  const bob = useRef<HTMLDivElement>(null);
  const pause = useRef<ReturnType<typeof setTimeout>>(undefined);
  const release = useRef(onRelease);
  useEffect(() => {
    release.current = onRelease;
  });
  useEffect(() => () => clearTimeout(pause.current), []);

  const follow = (event: PointerEvent<HTMLElement>) => {
    const box = event.currentTarget.parentElement?.getBoundingClientRect();
    if (box) onMove(tried.snap(valueAt(event.clientX - box.left)));
  };
  const hand = {
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      if (event.button !== 0) return;
      clearTimeout(pause.current);
      event.currentTarget.setPointerCapture(event.pointerId);
      event.preventDefault();
      bob.current?.focus({ preventScroll: true });
      follow(event);
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      if (event.currentTarget.hasPointerCapture(event.pointerId)) follow(event);
    },
    onPointerUp: () => onRelease(),
    onPointerCancel: () => onLeave(),
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (event.key === 'Enter' || event.key === 'Escape') {
      clearTimeout(pause.current);
      if (event.key === 'Enter') onRelease();
      else onLeave();
      return;
    }
    const value = keyMoves(event.key, shown, tried, band);
    if (value === undefined) return;
    event.preventDefault();
    onMove(value);
    clearTimeout(pause.current);
    pause.current = setTimeout(() => release.current(), PAUSE_MS);
  };
  return (
    <>
      <div
        aria-hidden="true"
        className="absolute touch-none cursor-ew-resize"
        style={{ left, width: right - left, top: tapeTop, height: height - tapeTop }}
        onPointerDown={hand.onPointerDown}
        onPointerMove={hand.onPointerMove}
        onPointerUp={hand.onPointerUp}
        onPointerCancel={hand.onPointerCancel}
      />
      <div
        ref={bob}
        role="slider"
        tabIndex={0}
        aria-label={label}
        aria-valuemin={tried.dimension.min}
        aria-valuemax={tried.dimension.max}
        aria-valuenow={shown}
        aria-valuetext={words}
        data-stick-bob
        className="absolute touch-none cursor-ew-resize rounded-sm"
        style={{ left: x(shown) - BOB / 2, width: BOB, top: tapeBottom - 4, height: height - tapeBottom + 4 }}
        onKeyDown={onKeyDown}
        onBlur={() => {
          clearTimeout(pause.current);
          onRelease();
        }}
        {...hand}
      />
    </>
  );
}
