import { z } from 'zod';
import { COVER_PARTS } from '../cloth/cover-panels.ts';
import { CUSHION_SETTINGS, type CushionSettings } from '../cushions/cushion-settings.ts';

/** Most cloths of one order. */
export const MAX_COVERS = 12;

const length = (min: number, max: number) => z.number().min(min).max(max);
const text = (max: number) => z.string().trim().max(max);

/** Cloth that the workshop sends in: what was seen of it when it came. */
const ownClothSchema = z.strictObject({
  /** A sample was kept to compare with. */
  sampleKept: z.boolean(),
  dyeLot: text(60),
  /** As measured on the roll; goes before the width that was said. */
  measuredWidthMm: length(300, 3500).optional(),
  /** Length that came, when it is there. */
  receivedMm: length(0, 1_000_000).optional(),
  receivedOn: z.iso.date().optional(),
  flaws: text(1000),
});

/** One cloth of an order, and which cushions it covers. */
export const orderCoverSchema = z
  .strictObject({
    name: text(120).min(1),
    widthMm: length(300, 3500),
    selvedgeMm: length(0, 100),
    /** How its own up lies on a cushion. */
    direction: z.enum(['up-roll', 'railroad', 'either']),
    /** Where its pile runs on a cushion that lies before the reader, back edge up. */
    nap: z.enum(['none', 'to-the-front', 'to-the-back', 'to-the-left', 'to-the-right']),
    repeatMm: z.strictObject({ acrossMm: length(0, 2000), alongMm: length(0, 2000) }),
    /** Line on which the pattern is centered. */
    controlLine: z.enum(['cushion', 'run']),
    /** Left out at the start of the roll for flaws and for centering. */
    startMm: length(0, 5000),
    /** Bought in whole steps of this. */
    stepMm: length(1, 5000),
    /** In the smallest unit of the currency; both or neither. */
    pricePerMetreMinor: z.number().int().min(0).max(100_000_000).optional(),
    currency: z
      .string()
      .regex(/^[A-Z]{3}$/)
      .optional(),
    com: ownClothSchema.optional(),
    /** Absent: every cushion of the order. */
    cushionMarks: z
      .array(z.string().regex(/^C\d{1,4}$/))
      .max(1000)
      .optional(),
    /** What is cut from it; absent: all of the cover. */
    parts: z.array(z.enum(COVER_PARTS)).min(1).max(3).optional(),
  })
  .refine(({ nap, direction }) => nap === 'none' || direction !== 'either', {
    path: ['direction'],
    message: 'A cloth with a nap lies one way: up the roll or railroaded',
  })
  .refine(({ pricePerMetreMinor: price, currency }) => (price === undefined) === (currency === undefined), {
    path: ['currency'],
    message: 'A price needs its currency, and a currency its price',
  });

/** All cloths of an order. */
export const orderCoversSchema = z
  .array(orderCoverSchema)
  .max(MAX_COVERS)
  .refine((covers) => new Set(covers.map(({ name }) => name)).size === covers.length, {
    message: 'Two cloths have the same name',
  });

export type OrderCover = z.infer<typeof orderCoverSchema>;

/** Letters that a cloth named out of a description may have. */
const NAME_LETTERS = 60;

/**
 * What a cloth is called that was only described: the words before the first comma, never cut within one.
 *
 * @param words - as they were written: "plum moquette, 54 in wide, pile to the front"
 * @returns "cover" where nothing was written
 */
export function describedClothName(words: string): string {
  const [first = ''] = words.trim().split(/\s*[,;\n]\s*/);
  const name = first.replace(/\s+/g, ' ');
  if (name.length <= NAME_LETTERS) return name || 'cover';
  const whole = name.slice(0, NAME_LETTERS + 1).replace(/\s+\S*$/, '');
  return whole.slice(0, NAME_LETTERS);
}

/**
 * A cloth of which nothing is known but its name: plain, bought by the eighth of a yard.
 *
 * @param name - of the cloth
 * @param settings - allowances of the workshop, for its width
 */
export const plainCover = (
  name: string,
  { clothWidth }: Pick<CushionSettings, 'clothWidth'> = CUSHION_SETTINGS,
): OrderCover => ({
  name,
  widthMm: clothWidth.valueMm,
  selvedgeMm: 0,
  direction: 'either',
  nap: 'none',
  repeatMm: { acrossMm: 0, alongMm: 0 },
  controlLine: 'cushion',
  startMm: 0,
  stepMm: 114.3,
});
