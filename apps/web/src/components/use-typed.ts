import { useEffect, useRef, type FocusEvent } from 'react';

type Field = HTMLInputElement | HTMLTextAreaElement;

const isField = (target: EventTarget): target is Field =>
  target instanceof HTMLTextAreaElement ||
  (target instanceof HTMLInputElement &&
    !['checkbox', 'radio', 'button', 'submit', 'file'].includes(target.type));

/** Whether something was typed into the fields of a box since it opened, and is still there. */
export function useTyped(open: boolean) {
  const before = useRef(new Map<Field, string>());
  useEffect(() => {
    if (open) before.current.clear();
  }, [open]);
  return {
    /** For the box around the fields: what a field held when it was first entered. */
    onFocus: ({ target }: FocusEvent) => {
      if (isField(target) && !before.current.has(target)) before.current.set(target, target.value);
    },
    isTyped: () => [...before.current].some(([field, value]) => field.isConnected && field.value !== value),
  };
}
