import type { CSSProperties, Ref } from 'react';
import type { NumberEdit } from '../hooks/use-number-edit.ts';
import { focusWayOut } from './focus-way-out.ts';

interface Props {
  ref: Ref<HTMLInputElement>;
  edit: NumberEdit;
  label: string;
  /** Of the slip that says what was read; its buttons act on what stands in the field. */
  slipId: string;
  className: string;
  style?: CSSProperties;
}

/** The field of a number that is edited over the drawing: leaving it takes the number, or restores what was there. */
export function NumberInput({ ref, edit, label, slipId, className, style }: Props) {
  return (
    <input
      ref={ref}
      value={edit.text}
      onChange={(event) => edit.type(event.target.value)}
      onKeyDown={(event) => {
        event.stopPropagation();
        edit.keys(event);
        if (event.key === 'Tab' && (edit.beyond || !edit.finish())) {
          event.preventDefault();
          focusWayOut(slipId);
        }
      }}
      onBlur={(event) => {
        if (event.relatedTarget?.closest(`#${CSS.escape(slipId)}`)) return;
        if (!edit.finish()) edit.cancel();
      }}
      aria-label={label}
      aria-describedby={slipId}
      aria-invalid={edit.reading.kind !== 'value' || undefined}
      autoComplete="off"
      style={style}
      className={className}
    />
  );
}
