import { expect, it } from 'vitest';
import { sayNote } from './note-words.ts';

const inches = { system: 'feet-inches', roundTo: 8 } as const;

it('names the arm where the two lie apart', () => {
  expect(sayNote({ kind: 'forearms-on-table' }, inches)).toBe('forearms on the table');
  expect(sayNote({ kind: 'forearms-on-table', side: 'right' }, inches)).toBe('right forearm on the table');
  expect(sayNote({ kind: 'hands-on-lap', side: 'left' }, inches)).toBe('left hand on the lap');
  expect(sayNote({ kind: 'forearm-on-sill', side: 'right' }, inches)).toBe('right forearm on the sill');
});
