import type { Stretch } from '@settlewright/geometry';
import { useRef, type FocusEvent, type KeyboardEvent, type PointerEvent } from 'react';
import type { BoardLayout } from '../board-layout.ts';
import { keyMoves } from '../slider-keys.ts';
import type { TriedValues } from '../tried-values.ts';

interface PlumbSliderProps {
  layout: BoardLayout;
  tried: TriedValues;
  shown: number;
  /** A value is tried that is not written yet. */
  isTrying: boolean;
  /** What everybody has in common, for the Home and End keys. */
  band: Stretch | undefined;
  label: string;
  words: string;
  /** Id of the sentence that says which keys do what. */
  describedBy: string;
  onMove: (value: number) => void;
  /** The set follows the line: Enter, or the focus goes elsewhere. */
  onTake: () => void;
  /** Back to where the set stands. */
  onLeave: () => void;
}

const BOB = 44;

/** Where the focus may go while a value is still being tried; the bob itself is such a place. */
export const TRIAL_MARK = { 'data-stick-trial': '' };

/** The focus moves between the line and what is said of the value under the hand. */
export const staysNear = ({ relatedTarget }: FocusEvent): boolean =>
  relatedTarget instanceof Element && relatedTarget.closest('[data-stick-trial]') !== null;

/** Gives the focus back to the line, where a button that had it goes. */
export function focusLine(): void {
  document.querySelector<HTMLElement>('[data-stick-bob]')?.focus({ preventScroll: true });
}

/** Keys that end a trial and go back: Escape, and undo while nothing is written yet. */
export const goesBack = ({ key, ctrlKey, metaKey, shiftKey, altKey }: KeyboardEvent): boolean =>
  key === 'Escape' || ((ctrlKey || metaKey) && !shiftKey && !altKey && key.toLowerCase() === 'z');

/** The bob of the plumb line, for the hand and for the keys. */
export function PlumbSlider({
  layout,
  tried,
  shown,
  isTrying,
  band,
  label,
  words,
  describedBy,
  onMove,
  onTake,
  onLeave,
}: PlumbSliderProps) {
  const { left, right, tapeTop, tapeBottom, height, x, valueAt } = layout;
  const bob = useRef<HTMLDivElement>(null);
  const held = useRef<{ element: HTMLElement; pointerId: number }>(undefined);

  const follow = (event: PointerEvent<HTMLElement>) => {
    const box = event.currentTarget.parentElement?.getBoundingClientRect();
    if (box) onMove(tried.snap(valueAt(event.clientX - box.left)));
  };
  const letGo = () => {
    held.current = undefined;
  };
  const leave = () => {
    const hand = held.current;
    if (hand?.element.hasPointerCapture(hand.pointerId)) hand.element.releasePointerCapture(hand.pointerId);
    letGo();
    onLeave();
  };
  const hand = {
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      if (event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      held.current = { element: event.currentTarget, pointerId: event.pointerId };
      event.preventDefault();
      bob.current?.focus({ preventScroll: true });
      follow(event);
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      if (held.current?.pointerId === event.pointerId) follow(event);
    },
    onPointerUp: letGo,
    onPointerCancel: leave,
  };

  const onKeyDown = (event: KeyboardEvent) => {
    if (isTrying && goesBack(event)) {
      event.preventDefault();
      leave();
      return;
    }
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (event.key === 'Enter') {
      letGo();
      onTake();
      return;
    }
    const value = keyMoves(event.key, shown, tried, band);
    if (value === undefined) return;
    event.preventDefault();
    onMove(value);
  };

  return (
    <>
      <div
        aria-hidden="true"
        className="absolute touch-none cursor-ew-resize"
        style={{ left, width: right - left, top: tapeTop, height: height - tapeTop }}
        {...hand}
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
        aria-describedby={describedBy}
        data-stick-bob
        {...TRIAL_MARK}
        className="absolute touch-none cursor-ew-resize rounded-sm"
        style={{ left: x(shown) - BOB / 2, width: BOB, top: tapeBottom - 4, height: height - tapeBottom + 4 }}
        onKeyDown={onKeyDown}
        onBlur={(event) => {
          if (!staysNear(event)) onTake();
        }}
        {...hand}
      />
    </>
  );
}
