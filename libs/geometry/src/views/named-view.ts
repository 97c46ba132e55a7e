import { z } from 'zod';

/** Most named views one set may hold. */
export const MAX_VIEWS = 40;

const length = (min: number, max: number) => z.number().min(min).max(max);
const vector = (reach: number) =>
  z.tuple([length(-reach, reach), length(-reach, reach), length(-reach, reach)]);

/** One of the lettered views, with what the hand did to it. */
const letterCamera = z.strictObject({
  kind: z.literal('letter'),
  letter: z.enum(['A', 'B', 'C', 'D', 'E']),
  /** 1 fits the set into the sheet. */
  zoom: length(0.1, 20),
  panMm: z.tuple([length(-100_000, 100_000), length(-100_000, 100_000)]),
  /** Of the free view E, about the vertical and above the level. */
  azimuthDeg: length(-3600, 3600),
  elevationDeg: length(-90, 90),
});

/** A camera that stands in the room: where its lens is, how it looks, and what it takes in. */
const lensCamera = z.strictObject({
  kind: z.literal('lens'),
  focalLengthMm: length(4, 2000),
  /** Picture area behind the lens; the frame is cut out of it. */
  backMm: z.strictObject({ width: length(2, 200), height: length(2, 200) }),
  /** Width of the frame over its height. */
  aspect: length(0.5, 4),
  at: z.strictObject({ xMm: length(-50000, 50000), zMm: length(-50000, 50000) }),
  heightMm: length(0, 10000),
  /** 0 looks from the front straight into the room, along -z; anticlockwise from above, so to the left. */
  turnDeg: length(-360, 360),
  /** Up from the level. */
  tiltDeg: length(-89, 89),
});

/** A view that somebody gave a name to: from where, what is shown, where the set is cut. */
export const namedViewSchema = z.strictObject({
  id: z.string().min(1).max(40),
  name: z.string().trim().min(1).max(80),
  camera: z.discriminatedUnion('kind', [letterCamera, lensCamera]),
  shown: z.strictObject({ bodies: z.boolean(), tapes: z.boolean(), clientView: z.boolean() }),
  /** What stands before this plane is taken away: a point in it, and the unit vector that looks out of it. */
  section: z.strictObject({ pointMm: vector(100_000), toward: vector(1) }).optional(),
});

export type NamedView = z.infer<typeof namedViewSchema>;
export type LensCamera = z.infer<typeof lensCamera>;
export type LetterCamera = z.infer<typeof letterCamera>;
