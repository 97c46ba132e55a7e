import type { Handle, Piece, RoomFor, SnappedPull } from '@settlewright/geometry';
import { memo, useLayoutEffect, useRef, useState, type KeyboardEvent } from 'react';
import { announce } from '@/lib/announce.ts';
import { useChangeNumber } from '../hooks/use-change-number.ts';
import { useNumberEdit } from '../hooks/use-number-edit.ts';
import { stepped } from '../numbers.ts';
import { useSurroundings } from '../room-context.tsx';
import { beyondRoom } from '../room-limits.ts';
import type { ViewController } from '../scene/view-controller.ts';
import { HandleField } from './handle-field.tsx';
import { numberOf, readOutPull, sayHandle } from './handle-words.ts';
import { usePull } from './use-pull.ts';

interface Props {
  piece: Piece;
  /** As the committed set has it. */
  handle: Handle;
  controller: ViewController;
  /** Tells which handle is in the hand, so that it keeps its place. */
  onHand: (handleId: string | undefined) => void;
}

const MORE = new Set(['ArrowUp', 'ArrowRight']);
const LESS = new Set(['ArrowDown', 'ArrowLeft']);

/** One handle: a button to pull, to step with the arrows, or to type at. */
export const HandleGrip = memo(function HandleGrip({ piece, handle, controller, onHand }: Props) {
  const { style } = useSurroundings();
  const number = numberOf(handle);
  const change = useChangeNumber(handle.pieceId, number, handle);
  const button = useRef<HTMLButtonElement>(null);
  const flag = useRef<HTMLDivElement>(null);
  const [back, setBack] = useState(false);
  const edit = useNumberEdit(number, style, change, { left: () => setBack(true) });
  /** How far there is room takes long to find: it is sought on the press, and no frame waits for it. */
  const room = useRef<RoomFor>(undefined);
  const pulled = useRef<SnappedPull>(undefined);

  function seekRoom() {
    room.current = undefined;
    setTimeout(() => {
      room.current = change.room();
      if (pulled.current) say(pulled.current);
    });
  }

  function say(snapped: SnappedPull | undefined) {
    pulled.current = snapped;
    onHand(snapped && handle.id);
    const element = flag.current;
    if (!element) return;
    element.toggleAttribute('hidden', snapped === undefined);
    if (!snapped) return;
    const beyond = room.current && beyondRoom(number, snapped.value, room.current, style);
    element.replaceChildren(readOutPull(number, snapped, beyond, piece, style));
  }

  const pull = usePull({ handle, controller, change, onTake: seekRoom, onPull: say });

  useLayoutEffect(() => {
    if (back && !edit.editing) button.current?.focus({ preventScroll: true });
  }, [back, edit.editing]);

  function begin(text?: string) {
    pull.hold();
    onHand(handle.id);
    edit.begin(text);
  }

  function step(event: KeyboardEvent, way: 1 | -1) {
    const size = event.shiftKey ? 8 : event.altKey ? 0.5 : 1;
    const refused = change.step(stepped(number, style, handle.value, way * size));
    if (refused !== undefined) announce(refused);
  }

  function keys(event: KeyboardEvent) {
    if (event.key === 'Escape' && pull.isPulling()) pull.cancel();
    else if (event.ctrlKey || event.metaKey) return;
    else if (/^[0-9.]$/.test(event.key) && !event.altKey) begin(event.key);
    else if (event.key === 'F2') begin();
    else if (MORE.has(event.key)) step(event, 1);
    else if (LESS.has(event.key)) step(event, -1);
    else return;
    event.preventDefault();
    event.stopPropagation();
  }

  return (
    <div data-handle={handle.id} className="absolute top-0 left-0 z-10 size-7 focus-within:z-30 hover:z-20">
      <button
        ref={button}
        type="button"
        aria-label={sayHandle(piece, handle, style)}
        title={handle.label}
        onKeyDown={keys}
        onBlur={() => setBack(false)}
        onClick={() => {
          if (!pull.tookPress()) begin();
        }}
        {...pull.handlers}
        className="quick reach pointer-events-auto flex size-7 touch-none items-center justify-center rounded-full border-[1.25px] border-chalk bg-sheet text-chalk hover:bg-chalk-wash active:bg-chalk active:text-on-chalk"
      >
        <svg data-arrow width="18" height="18" viewBox="-9 -9 18 18" aria-hidden="true" fill="none">
          <path
            d="M-7 0H6M2-4l4 4-4 4M-7-4v8"
            stroke="currentColor"
            strokeWidth="1.5"
            strokeLinecap="round"
            strokeLinejoin="round"
          />
        </svg>
      </button>
      <div
        ref={flag}
        hidden
        aria-hidden="true"
        data-handle-flag
        className="pointer-events-none absolute bottom-full left-1/2 mb-2 w-max max-w-72 -translate-x-1/2 rounded-sm bg-ink px-2 text-sm leading-6 text-paper"
      />
      {edit.editing && (
        <HandleField
          piece={piece}
          number={number}
          edit={edit}
          room={change.room()}
          onLeft={() => onHand(undefined)}
        />
      )}
    </div>
  );
});
