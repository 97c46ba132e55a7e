import { z } from 'zod';

const nudge = z.number().min(-300).max(300);

/**
 * How somebody sits when it is chosen; what is absent is as the place suggests. Checks answer for the suggested posture
 * whatever is chosen here.
 */
export const postureChoiceSchema = z.strictObject({
  /** With the back, upright on its own, or slumped as people do after a while. */
  trunk: z.enum(['back', 'upright', 'slumped']).optional(),
  /** `level`: hanging, forearms level, the posture in which bodies are measured. */
  arms: z.enum(['lap', 'table', 'cup', 'sill-left', 'sill-right', 'level']).optional(),
  /** `ankles-crossed`: the left ankle before the right; `knees-crossed`: the left knee over the right. */
  feet: z.enum(['floor', 'rail', 'ankles-crossed', 'knees-crossed']).optional(),
  /** Moved from where the place puts the sitter: to the sitter's left, and forwards; millimetres. */
  nudge: z.strictObject({ leftMm: nudge, aheadMm: nudge }).optional(),
});

export type PostureChoice = z.infer<typeof postureChoiceSchema>;
