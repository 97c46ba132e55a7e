import type { LengthStyle } from '@settlewright/geometry';
import { useState, type KeyboardEvent } from 'react';
import { typedForm } from '@/components/measure.tsx';
import { readNumber, showNumber, stepped, type NumberParameter, type Reading } from '../numbers.ts';
import { beyondRoom, type BeyondRoom } from '../room-limits.ts';
import type { ChangeNumber } from './use-change-number.ts';

export interface NumberEdit {
  editing: boolean;
  text: string;
  reading: Reading;
  /** Set while what stands in the field goes further than the room it has. */
  beyond: BeyondRoom | undefined;
  begin: (text?: string) => void;
  type: (text: string) => void;
  /** Takes a value that was offered: a limit, or one of two readings. */
  take: (value: number) => void;
  cancel: () => void;
  /** Commits what stands there; false when it could not be read or is impossible. */
  finish: () => boolean;
  keys: (event: KeyboardEvent) => void;
}

/** What stands in the field; a stepped value keeps its exact size beside what is shown of it. */
interface Typed {
  text: string;
  exact?: number;
}

const stepsOf = (event: KeyboardEvent): number => {
  const size = event.shiftKey ? 8 : event.altKey ? 0.5 : 1;
  return event.key === 'ArrowUp' ? size : -size;
};

/** The life of one number while it is typed: the same in the sentence, on a tape and in the form. */
export function useNumberEdit(
  parameter: NumberParameter,
  style: LengthStyle,
  change: Pick<ChangeNumber, 'preview' | 'commit'> & Partial<ChangeNumber>,
  after: { committed?: () => void; left?: () => void } = {},
): NumberEdit {
  const [typed, setTyped] = useState<Typed | null>(null);
  const [refused, setRefused] = useState<string>();
  const shown = showNumber(parameter, style);
  const read = (now: Typed): Reading =>
    now.exact === undefined ? readNumber(parameter, now.text, style) : { kind: 'value', value: now.exact };
  const inHand: Typed = typed ?? { text: shown };
  const reading: Reading = refused === undefined ? read(inHand) : { kind: 'unreadable', message: refused };

  const beyond =
    typed !== null && change.room && 'value' in reading
      ? beyondRoom(parameter, reading.value, change.room(), style)
      : undefined;

  function put(next: Typed) {
    setRefused(undefined);
    setTyped(next);
    const value = read(next);
    change.preview(value.kind === 'value' ? value.value : null);
  }

  function close() {
    setRefused(undefined);
    setTyped(null);
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
    if (typed === null) return true;
    const now = read(typed);
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
    const from = read(inHand);
    const value = from.kind === 'value' || from.kind === 'outside' ? from.value : parameter.value;
    const next = stepped(parameter, style, value, stepsOf(event));
    put({ text: typedForm(showNumber(parameter, style, next)), exact: next });
  }

  function keys(event: KeyboardEvent) {
    if (event.key === 'ArrowUp' || event.key === 'ArrowDown') {
      event.preventDefault();
      event.stopPropagation();
      step(event);
    } else if (event.key === 'Escape' && typed !== null) {
      event.preventDefault();
      event.stopPropagation();
      cancel();
    } else if (event.key === 'Enter' && typed !== null) {
      event.preventDefault();
      finish();
    }
  }

  return {
    editing: typed !== null,
    text: inHand.text,
    reading,
    beyond,
    begin: (text) => (text === undefined ? setTyped({ text: typedForm(shown) }) : put({ text })),
    type: (text) => put({ text }),
    take,
    cancel,
    finish,
    keys,
  };
}
