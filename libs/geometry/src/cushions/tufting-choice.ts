import { z } from 'zod';
import type { FullnessRule } from './tufting.ts';

const length = (min: number, max: number) => z.number().min(min).max(max);

/** How far buttons go in; absent: as the allowances of the workshop say, or the whole foam where tufts are deep. */
const pullMm = length(1, 250).optional();

const RULES = ['foam-thickness', 'half-again'] as const satisfies readonly FullnessRule[];

const TUFT_LINES = ['joints', 'board-centres'] as const;

export type TuftLinesOf = (typeof TUFT_LINES)[number];

/** The same in words. */
export const TUFT_LINE_WORDS: Record<TuftLinesOf, string> = {
  joints: 'columns on board joints',
  'board-centres': 'columns on board centres',
};

/** A field of tufts: the size wanted of one, the border left free, what its columns stand on, and the rule that gives the cloth its fullness. */
const field = {
  pullMm,
  tuftMm: z.strictObject({ widthMm: length(20, 1000), heightMm: length(20, 1000) }),
  borderMm: length(0, 500),
  /** Board lines the columns stand on; absent: they fill the face within its border. */
  columnsOn: z.enum(TUFT_LINES).optional(),
  fullness: z.enum(RULES),
};

/** What is chosen of a cushion's buttons; where they stand on board lines is chosen of the piece. */
export const tuftingSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('none') }),
  z.strictObject({ kind: z.literal('pull-in'), pullMm }),
  z.strictObject({ kind: z.literal('biscuit'), ...field }),
  z.strictObject({ kind: z.literal('diamond'), ...field }),
]);

export type TuftingChoice = z.infer<typeof tuftingSchema>;
export type TuftingKind = TuftingChoice['kind'];

/** The same in the words of the sheet. */
export const TUFTING_WORDS: Record<TuftingKind, string> = {
  none: 'no buttons',
  'pull-in': 'buttons pulled in, no fullness',
  biscuit: 'biscuit tufts',
  diamond: 'diamond tufts',
};
