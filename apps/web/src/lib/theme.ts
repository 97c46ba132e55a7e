import { create } from 'zustand';

export type ThemeChoice = 'system' | 'light' | 'dark';

const KEY = 'settlewright.theme';

function readChoice(): ThemeChoice {
  try {
    const kept = localStorage.getItem(KEY);
    return kept === 'light' || kept === 'dark' ? kept : 'system';
  } catch {
    return 'system';
  }
}

const systemDark = () =>
  typeof window.matchMedia === 'function' && window.matchMedia('(prefers-color-scheme: dark)').matches;

function paint(choice: ThemeChoice): void {
  const dark = choice === 'dark' || (choice === 'system' && systemDark());
  document.documentElement.dataset.theme = dark ? 'dark' : 'light';
  const tint = document.querySelector('meta[name="theme-color"]');
  tint?.setAttribute('content', dark ? '#1e1a15' : '#f5efe3');
}

export const useTheme = create<{ choice: ThemeChoice }>(() => ({ choice: readChoice() }));

export function chooseTheme(choice: ThemeChoice): void {
  try {
    if (choice === 'system') localStorage.removeItem(KEY);
    else localStorage.setItem(KEY, choice);
  } catch {
    // The choice then lasts as long as the page.
  }
  useTheme.setState({ choice });
  paint(choice);
}

/** Follows the system while nobody has chosen. */
export function followSystemTheme(): void {
  window.matchMedia('(prefers-color-scheme: dark)').addEventListener('change', () => {
    paint(useTheme.getState().choice);
  });
}
