import type { Wear } from './symbols.ts';

/** What everybody of a crowd wears: a house rule, told wherever a share of a crowd is shown. Millimetres. */
export const CROWD_WEAR = { shoeMm: 25, clothing: 'light' } as const satisfies Wear;
