import { z } from 'zod';
import { cushionShapeSchema } from './cushion-shape.ts';
import { cushionMakeSchema } from './making/cushion-make.ts';
import { tuftingSchema } from './tufting-choice.ts';
import { MAX_WEAR, wearAreaSchema } from './wear.ts';

/** An edge of a cushion; left and right as the sitter sees them. */
export const CUSHION_EDGES = ['back', 'front', 'left', 'right'] as const;
export type CushionEdge = (typeof CUSHION_EDGES)[number];

/** What keeps a cushion where it is. */
export const HOLD_DOWNS = [
  'none',
  'non-slip-mesh',
  'hook-and-loop',
  'snaps',
  'turn-buttons',
  'french-cleat',
  'keyhole-plates',
] as const;
export type HoldDown = (typeof HOLD_DOWNS)[number];

/** The same in the words of the sheet. */
export const HOLD_DOWN_WORDS: Record<HoldDown, string> = {
  none: 'loose, nothing holds it',
  'non-slip-mesh': 'loose on non-slip mesh',
  'hook-and-loop': 'hook-and-loop, hook on the wood',
  snaps: 'snaps, studs on the wood',
  'turn-buttons': 'turn-buttons',
  'french-cleat': 'French cleat',
  'keyhole-plates': 'plywood back with keyhole plates',
};

/** What somebody chose of one cushion; what is absent is as the workshop makes it otherwise. */
export const cushionChoiceSchema = z.strictObject({
  make: cushionMakeSchema.optional(),
  shape: cushionShapeSchema.optional(),
  tufting: tuftingSchema.optional(),
  /** Edges that the camera sees: no closure belongs there. */
  cameraSides: z.array(z.enum(CUSHION_EDGES)).max(4).optional(),
  holdDown: z.enum(HOLD_DOWNS).optional(),
  /** Areas that are to look used. */
  wear: z.array(wearAreaSchema).max(MAX_WEAR).optional(),
  notes: z.string().trim().max(1000).optional(),
});

export type CushionChoice = z.infer<typeof cushionChoiceSchema>;

/** What a field of a choice is called where two versions of a set are compared. */
export const CUSHION_CHOICE_WORDS: Record<keyof CushionChoice, string> = {
  make: 'Make',
  shape: 'Shape',
  tufting: 'Tufting',
  cameraSides: 'Camera sides',
  holdDown: 'Hold-down',
  wear: 'Marked wear',
  notes: 'Notes',
};
