import { snapPull, valueUnder, type Handle, type SnappedPull } from '@settlewright/geometry';
import { useEffect, useRef, type PointerEvent } from 'react';
import { announce } from '@/lib/announce.ts';
import type { ChangeNumber } from '../hooks/use-change-number.ts';
import { stepOf } from '../numbers.ts';
import { useSurroundings } from '../room-context.tsx';
import type { ViewController } from '../scene/view-controller.ts';
import { pixelsPerMm, rayThrough } from '../scene/view-frame.ts';
import { useRoomStore } from '../store.ts';
import { numberOf } from './handle-words.ts';

const DRAG_STARTS_PX = 3;
/** A line this near to the pointer is taken. */
const SNAP_PX = 8;
/** In degrees there are no lines to take, and no scale. */
const NO_LINES = 0;

interface Pull {
  pointerId: number;
  startX: number;
  startY: number;
  /** The value under the pointer when the handle was taken hold of. */
  from: number;
  moving: boolean;
  snapped: SnappedPull;
}

export interface Pulling {
  isPulling: () => boolean;
  /** Lets go without a change. */
  cancel: () => void;
  /** Lets go and leaves what is shown as it is: a number is typed from here on. */
  hold: () => void;
  /** True once after a pull, so that its release is not taken for a press. */
  tookPress: () => boolean;
  handlers: Record<
    'onPointerDown' | 'onPointerMove' | 'onPointerUp' | 'onPointerCancel',
    (event: PointerEvent<HTMLElement>) => void
  >;
}

/** One handle in the hand: pulled along its line, kept out of React but for what the set then looks like. */
export function usePull(options: {
  /** Of the committed set. */
  handle: Handle;
  controller: ViewController;
  change: Pick<ChangeNumber, 'preview' | 'drag' | 'commit'>;
  /** The handle is pressed, and may be pulled. */
  onTake: () => void;
  /** Says the number while it is pulled; undefined when it is let go. */
  onPull: (snapped: SnappedPull | undefined) => void;
}): Pulling {
  const { handle, controller, change, onTake, onPull } = options;
  const store = useRoomStore();
  const { style } = useSurroundings();
  const pull = useRef<Pull | null>(null);
  const pulled = useRef(false);
  const request = useRef(0);

  useEffect(() => () => cancelAnimationFrame(request.current), []);

  function under(event: PointerEvent<HTMLElement>): number | undefined {
    const frame = controller.frame();
    const sheet = event.currentTarget.closest('[data-handles]')?.getBoundingClientRect();
    if (!frame || !sheet) return undefined;
    const ray = rayThrough(
      frame,
      controller.viewport(),
      event.clientX - sheet.left,
      event.clientY - sheet.top,
    );
    return valueUnder(handle, ray);
  }

  function within(): number {
    const frame = controller.frame();
    if (!frame || handle.kind === 'angle') return NO_LINES;
    return (SNAP_PX / pixelsPerMm(frame, controller.viewport())) * handle.perMm;
  }

  function onPointerDown(event: PointerEvent<HTMLElement>) {
    pulled.current = false;
    if (event.button !== 0) return;
    event.stopPropagation();
    const from = under(event);
    if (from === undefined) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    event.currentTarget.focus({ preventScroll: true });
    const { pointerId, clientX: startX, clientY: startY } = event;
    pull.current = { pointerId, startX, startY, from, moving: false, snapped: { value: handle.value } };
    onTake();
  }

  function onPointerMove(event: PointerEvent<HTMLElement>) {
    const hand = pull.current;
    if (hand?.pointerId !== event.pointerId) return;
    event.stopPropagation();
    const far = Math.hypot(event.clientX - hand.startX, event.clientY - hand.startY);
    if (!hand.moving && far < DRAG_STARTS_PX) return;
    hand.moving = true;
    const now = under(event);
    if (now === undefined) return;
    const step = stepOf(numberOf(handle), style);
    const wanted = handle.value + now - hand.from;
    hand.snapped = snapPull(
      store.getState().document,
      handle,
      wanted,
      event.altKey ? { step: step / 2, within: NO_LINES } : { step, within: within() },
    );
    const { snapped } = hand;
    cancelAnimationFrame(request.current);
    request.current = requestAnimationFrame(() => {
      change.drag(snapped.value);
      onPull(snapped);
    });
  }

  function stop() {
    cancelAnimationFrame(request.current);
    pulled.current = pull.current?.moving ?? false;
    pull.current = null;
    onPull(undefined);
  }

  function onPointerUp(event: PointerEvent<HTMLElement>) {
    const hand = pull.current;
    if (hand?.pointerId !== event.pointerId) return;
    event.stopPropagation();
    stop();
    if (!hand.moving) return;
    const refused = change.commit(hand.snapped.value);
    if (refused === undefined) return;
    change.preview(null);
    announce(refused);
  }

  /** What is shown stays, and is counted. */
  function hold() {
    stop();
    store.getState().rest();
  }

  function cancel() {
    if (!pull.current) return;
    stop();
    change.preview(null);
  }

  return {
    isPulling: () => pull.current?.moving === true,
    cancel,
    hold,
    tookPress: () => {
      const took = pulled.current;
      pulled.current = false;
      return took;
    },
    handlers: { onPointerDown, onPointerMove, onPointerUp, onPointerCancel: cancel },
  };
}
