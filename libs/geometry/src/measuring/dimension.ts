import { z } from 'zod';

/** Most pinned dimension lines one set may hold. */
export const MAX_DIMENSIONS = 100;

/** Points of a body that have a name; where they lie follows from whoever sits there. */
export const BODY_POINT_KEYS = [
  'crown',
  'eyes',
  'left-shoulder',
  'right-shoulder',
  'left-elbow',
  'right-elbow',
  'left-fingertips',
  'right-fingertips',
  'left-hip',
  'right-hip',
  'hips-back',
  'left-knee',
  'right-knee',
  'left-knee-top',
  'right-knee-top',
  'left-heel',
  'right-heel',
  'left-toe',
  'right-toe',
] as const;
export type BodyPointKey = (typeof BODY_POINT_KEYS)[number];

const length = z.number().min(-50000).max(50000);
const part = { pieceId: z.string().max(40), partId: z.string().max(80) };

const end = z.discriminatedUnion('on', [
  /** A corner of a part, by its place among the part's corners: it follows when the piece is made larger. */
  z.strictObject({ on: z.literal('corner'), ...part, corner: z.number().int().min(0).max(999) }),
  /** A point on an edge of a part; 0 and 1 are its ends. */
  z.strictObject({
    on: z.literal('edge'),
    ...part,
    edge: z.number().int().min(0).max(999),
    along: z.number().min(0).max(1),
  }),
  /** A point on a face, in the piece's own frame. */
  z.strictObject({ on: z.literal('spot'), ...part, atMm: z.tuple([length, length, length]) }),
  /** The whole part: the shortest way to it counts. */
  z.strictObject({ on: z.literal('part'), ...part }),
  /** A named point of whoever sits at a place, or the whole body; never where it lies. */
  z.strictObject({
    on: z.literal('body'),
    pieceId: z.string().max(40),
    place: z.number().int().min(1).max(40),
    point: z.enum([...BODY_POINT_KEYS, 'whole']),
  }),
]);

/** A dimension line that stays with the set: each end is tied to a piece or to a place's body. */
export const dimensionSchema = z.strictObject({
  id: z.string().min(1).max(40),
  ends: z.tuple([end, end]),
});

export type PinnedDimension = z.infer<typeof dimensionSchema>;

/** One end of a measured line. */
export type MeasureEnd = PinnedDimension['ends'][number];
