import type { LengthStyle } from '@settlewright/geometry';
import { useRef, useState, type KeyboardEvent } from 'react';
import { typedForm } from '@/components/measure.tsx';
import { readNumber, showNumber, stepped, type NumberParameter, type Reading } from '../numbers.ts';
import type { ChangeNumber } from './use-change-number.ts';

export interface NumberEdit {
  editing: boolean;
  text: string;
  reading: Reading;
  begin: (text?: string) => void;
  type: (text: string) => void;
  /** Takes a value that was offered: a limit, or one of two readings. */
  take: (value: number) => void;
  cancel: () => void;
  /** Commits what stands there; false when it could not be read or is impossible. */
  finish: () => boolean;
  keys: (event: KeyboardEvent) => void;
}

const stepsOf = (event: KeyboardEvent): number => {
  const size = event.shiftKey ? 8 : event.altKey ? 0.5 : 1;
  return event.key === 'ArrowUp' ? size : -size;
};

/** The life of one number while it is typed: the same in the sentence, on a tape and in the form. */
export function useNumberEdit(
  parameter: NumberParameter,
  style: LengthStyle,
  change: ChangeNumber,
  after: { committed?: () => void; left?: () => void } = {},
): NumberEdit {
  const [text, setText] = useState<string | null>(null);
  const [refused, setRefused] = useState<string>();
  const exact = useRef<number | undefined>(undefined);
  const shown = showNumber(parameter, style);
  const read = (typed: string): Reading => {
    if (exact.current !== undefined) return { kind: 'value', value: exact.current };
    return readNumber(parameter, typed, style);
  };
  const reading: Reading =
    refused !== undefined ? { kind: 'unreadable', message: refused } : read(text ?? shown);

  function put(typed: string, value?: number) {
    exact.current = value;
    setRefused(undefined);
    setText(typed);
    const next =
      value === undefined ? readNumber(parameter, typed, style) : { kind: 'value' as const, value };
    change.preview(next.kind === 'value' ? next.value : null);
  }

  function close() {
    exact.current = undefined;
    setRefused(undefined);
    setText(null);
    after.left?.();
  }

  function take(value: number) {
    const refusal = change.commit(value);
    if (refusal !== undefined) {
      setRefused(refusal);
      return;
    }
    close();
    after.committed?.();
  }

  function finish(): boolean {
    if (text === null) return true;
    const now = read(text);
    if (now.kind !== 'value') return false;
    const refusal = change.commit(now.value);
    if (refusal !== undefined) {
      setRefused(refusal);
      return false;
    }
    close();
    after.committed?.();
    return true;
  }

  function cancel() {
    change.preview(null);
    close();
  }

  function step(event: KeyboardEvent) {
    const from = read(text ?? shown);
    const value = from.kind === 'value' || from.kind === 'outside' ? from.value : parameter.value;
    const next = stepped(parameter, style, value, stepsOf(event));
    put(typedForm(showNumber(parameter, style, next)), next);
  }

  function keys(event: KeyboardEvent) {
    if (event.key === 'ArrowUp' || event.key === 'ArrowDown') {
      event.preventDefault();
      event.stopPropagation();
      step(event);
    } else if (event.key === 'Escape' && text !== null) {
      event.preventDefault();
      event.stopPropagation();
      cancel();
    } else if (event.key === 'Enter' && text !== null) {
      event.preventDefault();
      finish();
    }
  }

  return {
    editing: text !== null,
    text: text ?? shown,
    reading,
    begin: (typed) => (typed === undefined ? setText(typedForm(shown)) : put(typed)),
    type: (typed) => put(typed),
    take,
    cancel,
    finish,
    keys,
  };
}
