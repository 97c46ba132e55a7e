import { useEffect } from 'react';
import { create } from 'zustand';
import { VIEW_LETTERS, type ViewLetter } from '../scene/views.ts';

const KEY = 'settlewright.single-keys';

function readChoice(): boolean {
  try {
    return localStorage.getItem(KEY) !== 'off';
  } catch {
    return true;
  }
}

/** Whether letters alone do something; some people type by voice or with a switch. */
export const useSingleKeys = create<{ on: boolean }>(() => ({ on: readChoice() }));

export function chooseSingleKeys(on: boolean): void {
  try {
    localStorage.setItem(KEY, on ? 'on' : 'off');
  } catch {
    // The choice then lasts as long as the page.
  }
  useSingleKeys.setState({ on });
}

export interface ShortcutActions extends UndoActions {
  toggleFit: () => void;
  show: (letter: ViewLetter) => void;
  help: () => void;
}

/** What the keys of undo and redo do. */
export interface UndoActions {
  undo: () => void;
  redo: () => void;
}

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  (target.isContentEditable || target.matches('input, textarea, select, [role="listbox"], [role="menu"] *'));

/** Whether a key belongs to something else: a field, a dialog, or whoever acted on it already. */
export const isTaken = (event: KeyboardEvent): boolean =>
  event.defaultPrevented || isTyping(event.target) || document.querySelector('[role="dialog"]') !== null;

/** Undo and redo of the whole page; none while something is typed or a dialog is open. */
export function useUndoKeys({ undo, redo }: UndoActions): void {
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      if (isTaken(event) || !(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      if (key === 'z') (event.shiftKey ? redo : undo)();
      else if (key === 'y') redo();
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', listen);
    return () => window.removeEventListener('keydown', listen);
  }, [undo, redo]);
}

/** Keys of the room; none while something is typed or a dialog is open. */
export function useShortcuts(actions: ShortcutActions): void {
  useUndoKeys(actions);
  const on = useSingleKeys((state) => state.on);
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      if (isTaken(event) || !on || event.altKey || event.ctrlKey || event.metaKey) return;
      const key = event.key.toLowerCase();
      const letter = VIEW_LETTERS.find((candidate) => candidate === event.key.toUpperCase());
      if (key === 'f') actions.toggleFit();
      else if (event.key === '?') actions.help();
      else if (letter) actions.show(letter);
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', listen);
    return () => window.removeEventListener('keydown', listen);
  }, [actions, on]);
}
