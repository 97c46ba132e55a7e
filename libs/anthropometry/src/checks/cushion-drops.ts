import type { Amount } from './amount.ts';
import type { CushionDrop } from './fit-sheet.ts';

/**
 * The cushions that a value hangs on, with how far each goes down and what that rests on.
 *
 * @param value - of a question
 * @returns one entry a cushion, millimetres
 */
export const dropsIn = ({ doubts }: Amount): CushionDrop[] => doubts.map(({ drop }) => drop);
