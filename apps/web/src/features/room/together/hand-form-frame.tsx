import type { SetDocument } from '@settlewright/geometry';
import { useEffect, useRef, type KeyboardEvent, type ReactNode } from 'react';
import { Button } from '@/components/button.tsx';
import { useRoomStore } from '../store.ts';
import { closeHandForm } from './hand-form.ts';

interface FrameProps {
  title: string;
  verb: string;
  /** What the form would do; null while it cannot be done. */
  next: SetDocument | null;
  refusal?: string | undefined;
  onTake: () => void;
  children: ReactNode;
}

/** Heading, fields and buttons of such a form. Escape leaves everything as it was. */
export function HandFormFrame({ title, verb, next, refusal, onTake, children }: FrameProps) {
  const store = useRoomStore();
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  useEffect(() => {
    store.getState().showPreview(next);
    return () => store.getState().showPreview(null);
  }, [store, next]);
  const keys = (event: KeyboardEvent) => {
    if (event.key === 'Escape' && !event.defaultPrevented) closeHandForm();
  };
  return (
    <form
      aria-labelledby="hand-form-heading"
      className="ruled grid gap-3 pt-3 pb-4"
      onKeyDown={keys}
      onSubmit={(event) => {
        event.preventDefault();
        if (!next) return;
        store.getState().showPreview(null);
        onTake();
        closeHandForm();
      }}
    >
      <h2 id="hand-form-heading" ref={heading} tabIndex={-1} className="text-lg outline-none">
        {title}
      </h2>
      {children}
      {refusal && (
        <p role="status" className="text-sm text-wont">
          {refusal}
        </p>
      )}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" look="main" size="small" disabled={!next}>
          {verb}
        </Button>
        <Button size="small" onClick={closeHandForm}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
