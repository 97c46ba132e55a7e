import { useLayoutEffect, useRef, useState, type KeyboardEvent } from 'react';
import { classNames } from '@/components/class-names.ts';
import { Measure } from '@/components/measure.tsx';
import { useChangeNumber } from '../hooks/use-change-number.ts';
import { useNumberEdit } from '../hooks/use-number-edit.ts';
import { sayNumber, showNumber, type NumberParameter, type Reading } from '../numbers.ts';
import { useSurroundings } from '../room-context.tsx';
import { focusWayOut } from './focus-way-out.ts';

/** The number that has the hand just now; its slip stands beside the sentence. */
export interface NumberAtHand {
  pieceId: string;
  parameter: NumberParameter;
  reading: Reading;
  editing: boolean;
  take: (value: number) => void;
}

interface Props {
  pieceId: string;
  parameter: NumberParameter;
  look: 'main' | 'quiet';
  slipId: string;
  /** Tells the slip which number it speaks of; null when the number lets go. */
  onHand: (hand: NumberAtHand | null) => void;
  /** Tab in the field: goes on to the next number; false when there is none. */
  onNext: (backwards: boolean) => boolean;
}

const LOOKS = {
  main: 'min-h-9 px-[7px] text-[1em] leading-8 max-tablet:leading-7',
  quiet: 'px-[5px] text-[0.94em] leading-6',
};

/** A number of a sentence, on the tape flag of the drawing; a button at rest, a field in the hand. */
export function NumberFlag({ pieceId, parameter, look, slipId, onHand, onNext }: Props) {
  const { style, canEdit } = useSurroundings();
  const change = useChangeNumber(pieceId, parameter);
  const button = useRef<HTMLButtonElement>(null);
  const field = useRef<HTMLInputElement>(null);
  const [width, setWidth] = useState(0);
  const [held, setHeld] = useState(false);
  const backToButton = useRef(false);
  /** A digit that began the edit stands already; what was there before is replaced as a whole. */
  const selectAll = useRef(true);
  const edit = useNumberEdit(parameter, style, change, {
    left: () => {
      const active = document.activeElement;
      backToButton.current = active === field.current || active?.closest(`#${CSS.escape(slipId)}`) != null;
    },
  });
  const { editing, reading } = edit;
  const shown = showNumber(parameter, style);
  const name = `${parameter.label}, ${sayNumber(parameter, style)}${canEdit ? ', edit' : ''}`;

  useLayoutEffect(() => {
    if (editing) {
      field.current?.focus();
      if (selectAll.current) field.current?.select();
    } else if (backToButton.current) {
      backToButton.current = false;
      button.current?.focus();
    }
  }, [editing]);

  const handKey = `${held} ${editing} ${edit.text} ${reading.kind} ${parameter.value}`;
  useLayoutEffect(() => {
    if (held || editing) onHand({ pieceId, parameter, reading, editing, take: edit.take });
    // The hand changes with what is typed, not with the identity of the callbacks.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [handKey]);

  function begin(text?: string) {
    setWidth(button.current?.offsetWidth ?? 0);
    selectAll.current = text === undefined;
    edit.begin(text);
  }

  function buttonKeys(event: KeyboardEvent) {
    if (event.key === 'F2') {
      event.preventDefault();
      begin();
    } else if (/^[0-9.]$/.test(event.key) && !event.ctrlKey && !event.metaKey && !event.altKey) {
      event.preventDefault();
      begin(event.key);
    } else if (event.key === 'ArrowUp' || event.key === 'ArrowDown') {
      setWidth(button.current?.offsetWidth ?? 0);
      selectAll.current = true;
      edit.keys(event);
    }
  }

  function fieldKeys(event: KeyboardEvent<HTMLInputElement>) {
    edit.keys(event);
    if (event.key !== 'Tab') return;
    if (reading.kind !== 'value' || edit.beyond) {
      event.preventDefault();
      focusWayOut(slipId);
    } else if (!edit.finish() || onNext(event.shiftKey)) event.preventDefault();
  }

  if (!canEdit) {
    return (
      <span className="font-semibold">
        <Measure text={shown} spoken={sayNumber(parameter, style)} />
      </span>
    );
  }
  const wrong = editing && reading.kind !== 'value';
  return (
    <span className="tape relative mx-[10px] inline-block whitespace-nowrap">
      <Ticks wrong={wrong} />
      {editing ? (
        <input
          ref={field}
          value={edit.text}
          onChange={(event) => edit.type(event.target.value)}
          onKeyDown={fieldKeys}
          onFocus={() => setHeld(true)}
          onBlur={(event) => {
            setHeld(false);
            // The buttons of the slip act on what stands in the field.
            if (event.relatedTarget?.closest(`#${CSS.escape(slipId)}`)) return;
            if (!edit.finish()) edit.cancel();
          }}
          aria-label={parameter.label}
          aria-describedby={slipId}
          aria-invalid={wrong || undefined}
          autoComplete="off"
          spellCheck={false}
          style={{ width: `max(${width}px, ${edit.text.length + 2}ch)` }}
          className={classNames(
            'inline-block rounded-sm border-[1.25px] text-center font-semibold outline-2 outline-transparent',
            LOOKS[look],
            wrong
              ? 'border-wont bg-wont-wash text-ink shadow-[inset_0_-3px_0_var(--color-wont)]'
              : 'border-chalk bg-chalk text-on-chalk selection:bg-on-chalk selection:text-chalk',
          )}
        />
      ) : (
        <button
          ref={button}
          type="button"
          aria-label={name}
          data-number={parameter.key}
          onClick={() => begin()}
          onKeyDown={buttonKeys}
          // The slip moves the sentence: shown at the press already, it would take the number from under the hand.
          onFocus={(event) => setHeld(event.currentTarget.matches(':focus-visible'))}
          onBlur={() => setHeld(false)}
          className={classNames(
            'quick reach inline-block rounded-sm border-[1.25px] border-chalk bg-sheet text-center font-semibold text-chalk hover:bg-chalk-wash',
            LOOKS[look],
          )}
        >
          <Measure text={shown} />
        </button>
      )}
    </span>
  );
}

/** End ticks of the tape that the flag sits on. */
function Ticks({ wrong }: { wrong: boolean }) {
  const colour = wrong ? 'bg-wont' : 'bg-chalk';
  return (['-left-[8px]', '-right-[8px]'] as const).map((side) => (
    <span key={side} aria-hidden="true" className={classNames('absolute top-1/2 h-px w-[8px]', side, colour)}>
      <span
        className={classNames(
          'absolute -top-[5px] h-[11px] w-[1.25px]',
          side === '-left-[8px]' ? 'left-0' : 'right-0',
          colour,
        )}
      />
    </span>
  ));
}
