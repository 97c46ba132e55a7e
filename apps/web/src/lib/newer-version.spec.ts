import { describe, expect, it } from 'vitest';
import { isMissingPart, takeReload } from './newer-version.ts';

const memory = () => {
  const kept = new Map<string, string>();
  return {
    getItem: (key: string) => kept.get(key) ?? null,
    setItem: (key: string, value: string) => void kept.set(key, value),
  };
};

describe('a page whose parts have gone with an older version', () => {
  it('knows the failure in each browser’s words, and no other', () => {
    for (const words of [
      'Failed to fetch dynamically imported module: http://localhost/assets/fit-4f2.js',
      'error loading dynamically imported module: http://localhost/assets/fit-4f2.js',
      'Importing a module script failed.',
      'Unable to preload CSS for /assets/fit-4f2.css',
    ]) {
      expect(isMissingPart(new TypeError(words))).toBe(true);
    }
    expect(isMissingPart(new TypeError('Failed to fetch'))).toBe(false);
    expect(isMissingPart(undefined)).toBe(false);
  });

  it('is fetched anew once and does not loop, and again when the next version comes', () => {
    const kept = memory();
    expect(takeReload(kept, 1_000)).toBe(true);
    expect(takeReload(kept, 4_000)).toBe(false);
    expect(takeReload(kept, 290_000)).toBe(false);
    expect(takeReload(kept, 302_000)).toBe(true);
  });

  it('is left alone where the browser keeps nothing', () => {
    const closed = () => {
      throw new Error('The operation is insecure.');
    };
    expect(takeReload({ getItem: closed, setItem: closed }, 1_000)).toBe(false);
  });
});
