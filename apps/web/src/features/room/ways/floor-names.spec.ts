import { expect, it } from 'vitest';
import { clearOfEachOther } from './floor-names.ts';

it('names what is blocked first, and leaves a name that would lie on another or under a flag to the list', () => {
  const free = { x: 100, y: 100, letters: 20, first: false };
  const blocked = { x: 150, y: 104, letters: 20, first: true };
  const below = { x: 100, y: 130, letters: 20, first: false };
  const beside = { x: 300, y: 104, letters: 20, first: false };
  expect([...clearOfEachOther([free, blocked, below, beside], [])]).toEqual([blocked, below, beside]);
  expect([...clearOfEachOther([free, below], [])]).toEqual([free, below]);
  const flag = { left: 140, right: 200, top: 90, bottom: 110 };
  expect([...clearOfEachOther([free, below], [flag])]).toEqual([below]);
});
