import { z } from 'zod';

const source = z.strictObject({
  cite: z.string().min(1),
  mark: z.enum(['RETRIEVED', 'FROM MEMORY', 'DERIVED', 'HOUSE RULE']),
});
const range = z.tuple([z.number(), z.number()]);

const schema = z.strictObject({
  about: z.string(),
  limits: z.array(
    z.strictObject({
      joint: z.enum(['shoulder', 'elbow', 'wrist', 'hip', 'knee', 'ankle']),
      motion: z.enum([
        'flexion',
        'extension',
        'abduction',
        'adduction',
        'rotation',
        'plantar flexion',
        'dorsiflexion',
      ]),
      deg: z.number().positive(),
      source,
    }),
  ),
  sweeps: z.array(
    z.strictObject({
      joint: z.enum(['elbow', 'knee']),
      words: z.string().min(1),
      forwardsDeg: range,
      outwardsDeg: range,
      source,
    }),
  ),
});

/** How far joints bend and what elbows and knees sweep, with sources. */
export type JointRanges = z.infer<typeof schema>;
export type JointLimit = JointRanges['limits'][number];
export type JointSweep = JointRanges['sweeps'][number];

/**
 * Reads the data about joints.
 *
 * @param data - `joint-ranges.json` of the seed data
 * @returns the ranges in degrees; throws when a number has no source
 */
export const readJointRanges = (data: unknown): JointRanges => schema.parse(data);
