import type { Piece, RoomFor } from '@settlewright/geometry';
import { useEffect, useId, useLayoutEffect, useRef } from 'react';
import { classNames } from '@/components/class-names.ts';
import { NumberInput } from '../components/number-input.tsx';
import { NumberSlip } from '../components/number-slip.tsx';
import type { NumberEdit } from '../hooks/use-number-edit.ts';
import type { NumberParameter } from '../numbers.ts';

interface Props {
  piece: Piece;
  number: NumberParameter;
  edit: NumberEdit;
  room: RoomFor;
  onLeft: () => void;
}

/** The flag of a handle while its number is typed, with the slip of the sentence below. */
export function HandleField({ piece, number, edit, room, onLeft }: Props) {
  const field = useRef<HTMLInputElement>(null);
  const box = useRef<HTMLDivElement>(null);
  const slipId = useId();
  const wrong = edit.reading.kind !== 'value';
  const begunWith = useRef(edit.text);

  useLayoutEffect(() => {
    field.current?.focus({ preventScroll: true });
    // What stood there is replaced as a whole; a digit that began the edit stays.
    if (begunWith.current.length > 1) field.current?.select();
  }, []);
  useLayoutEffect(() => keepOnSheet(box.current));
  const left = useRef(onLeft);
  useEffect(() => () => left.current(), []);

  return (
    <div
      ref={box}
      className="pointer-events-auto absolute top-full left-1/2 mt-1.5 w-64 rounded-md bg-sheet p-3 text-ink shadow-slip"
      onPointerDown={(event) => event.stopPropagation()}
    >
      <label className="flex items-baseline gap-2 text-sm">
        <span aria-hidden="true">{number.label}</span>
        <NumberInput
          ref={field}
          edit={edit}
          label={number.label}
          slipId={slipId}
          className={classNames(
            'w-24 rounded-sm border-[1.25px] px-2 text-center font-semibold',
            wrong ? 'border-wont bg-wont-wash' : 'border-chalk bg-sheet',
          )}
        />
      </label>
      <div className="mt-2">
        <NumberSlip
          id={slipId}
          pieceId={piece.id}
          parameter={number}
          reading={edit.reading}
          editing
          room={room}
          onTake={edit.take}
        />
      </div>
    </div>
  );
}

/** Under its handle, moved as far as it takes to stay on the sheet, or above it where there is no room below. */
function keepOnSheet(box: HTMLElement | null) {
  if (!box) return;
  box.style.transform = 'translateX(-50%)';
  const sheet = box.closest('[data-handles]')?.getBoundingClientRect();
  if (!sheet) return;
  const edges = box.getBoundingClientRect();
  const aside = Math.max(0, sheet.left + 4 - edges.left) - Math.max(0, edges.right + 4 - sheet.right);
  const below = Math.max(0, edges.bottom + 4 - sheet.bottom);
  const up = below > 0 ? -Math.min(below, edges.top - sheet.top - 4) : 0;
  box.style.transform = `translate(calc(-50% + ${aside}px), ${up}px)`;
}
