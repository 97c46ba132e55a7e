import type { PoseNote, PostureChoice } from '@settlewright/geometry';
import { expect, it } from 'vitest';
import type { SeatedBody } from '../picture.ts';
import { sayChoice, sayMeasuredAs } from './choice-words.ts';

const inches = { system: 'feet-inches', roundTo: 8 } as const;

it('says a chosen posture, each part in its own words, and to which side somebody is moved', () => {
  expect(sayChoice({ trunk: 'upright', arms: 'sill-right', feet: 'rail' }, inches)).toBe(
    'upright, off the back, right forearm on the sill, feet on the rail',
  );
  expect(sayChoice({ feet: 'ankles-crossed' }, inches)).toBe('ankles crossed');
  expect(sayChoice({ feet: 'knees-crossed' }, inches)).toBe('knees crossed');
  expect(sayChoice({ nudge: { leftMm: -25.4, aheadMm: 50.8 } }, inches)).toBe(
    'moved 1″ to the sitter’s right, moved 2″ forward',
  );
});

it('says what the checks measured only where somebody chose otherwise, and what is shown of it', () => {
  const body = (choice: PostureChoice | undefined, ...kinds: PoseNote['kind'][]) =>
    ({ at: { choice }, pose: { notes: kinds.map((kind) => ({ kind })) } }) as unknown as SeatedBody;
  expect(sayMeasuredAs(undefined, inches)).toBe('');
  expect(sayMeasuredAs(body(undefined), inches)).toBe('');
  expect(sayMeasuredAs(body({ arms: 'table' }), inches)).toBe(
    'Measured in the standard posture; shown forearms on the table.',
  );
  const chosen: PostureChoice = { arms: 'lap', feet: 'knees-crossed' };
  expect(sayMeasuredAs(body(chosen, 'table-over-knees'), inches)).toBe(
    'Measured in the standard posture; shown hands on the lap.',
  );
  expect(sayMeasuredAs(body({ feet: 'rail' }, 'rail-out-of-reach'), inches)).toBe('');
  expect(sayMeasuredAs(body({ arms: 'lap' }, 'feet-drawn-back'), inches)).toBe(
    'Measured in the standard posture; shown hands on the lap, feet out of the way.',
  );
});
