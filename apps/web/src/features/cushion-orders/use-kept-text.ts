import { useState } from 'react';

/** Text that stays on this device until it is sent, also when the page is closed. */
export function useKeptText(key: string): [string, (text: string) => void] {
  const name = `settlewright.kept.${key}`;
  const [text, setText] = useState(() => {
    try {
      return localStorage.getItem(name) ?? '';
    } catch {
      return '';
    }
  });
  const keep = (next: string) => {
    setText(next);
    try {
      if (next === '') localStorage.removeItem(name);
      else localStorage.setItem(name, next);
    } catch {
      // Then it lasts as long as the page.
    }
  };
  return [text, keep];
}
