import { isDeepStrictEqual } from 'node:util';
import type { OrderCover } from '@settlewright/geometry';

/** The words of the order; sizes come from the revision. */
export interface OrderSpec {
  cover: string;
  foam: string;
  welt: string;
  closure: string;
  fixing: string;
  buttons: string;
  notes: string;
  /** A requirement and its evidence, recorded; never a claim that it is met. */
  flammability: string;
}

export const SPEC_KEYS = [
  'cover',
  'foam',
  'welt',
  'closure',
  'fixing',
  'buttons',
  'notes',
  'flammability',
] as const satisfies readonly (keyof OrderSpec)[];

/** What an order asks for, cited from one issued revision. */
export interface OrderContent {
  revisionLetter: string;
  title: string;
  /** YYYY-MM-DD */
  neededBy: string | null;
  /** null: every cushion of the revision */
  cushionMarks: string[] | null;
  spec: OrderSpec;
  /** How far a finished size may be off; absent in what was sent before it could be agreed. */
  toleranceMm?: number;
  /** Its cloths; none as long as nobody said them, absent in what was sent before they could be. */
  covers?: OrderCover[];
}

/** A quarter of an inch either way, unless an order says otherwise. */
export const DEFAULT_TOLERANCE_MM = 6.35;

export const toleranceOf = ({ toleranceMm }: Pick<OrderContent, 'toleranceMm'>): number =>
  toleranceMm ?? DEFAULT_TOLERANCE_MM;

export const coversOf = ({ covers }: Pick<OrderContent, 'covers'>): OrderCover[] => covers ?? [];

/** The content as the upholsterer last received it. */
export interface SentContent extends OrderContent {
  at: string;
  byUserId: string;
  byName: string;
}

export function contentOf(from: OrderContent): OrderContent {
  const { revisionLetter, title, neededBy, cushionMarks, spec } = from;
  return {
    revisionLetter,
    title,
    neededBy,
    cushionMarks,
    spec,
    toleranceMm: toleranceOf(from),
    covers: coversOf(from),
  };
}

export function sameContent(a: OrderContent, b: OrderContent): boolean {
  const plain = ({ revisionLetter, title, neededBy, cushionMarks, spec, toleranceMm }: OrderContent) =>
    JSON.stringify([
      revisionLetter,
      title,
      neededBy,
      cushionMarks && [...cushionMarks].sort(),
      SPEC_KEYS.map((key) => spec[key]),
      toleranceOf({ toleranceMm }),
    ]);
  return plain(a) === plain(b) && isDeepStrictEqual(unpriced(coversOf(a)), unpriced(coversOf(b)));
}

/** What a workshop pays for its cloth is no matter of the upholsterer, and no reason to send an order again. */
export const unpriced = (covers: readonly OrderCover[]): OrderCover[] =>
  covers.map((cover) => ({ ...cover, pricePerMetreMinor: undefined, currency: undefined }));
