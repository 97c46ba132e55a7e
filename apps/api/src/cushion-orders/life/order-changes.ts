import {
  clothPhrase,
  type CushionSpec,
  joined,
  type OutlineCorner,
  phrase,
  type Phrase,
  SAID_OF_CUSHION,
  type SaidOfCushion,
  saidOfCushion,
  samePhrase,
} from '@settlewright/geometry';
import { coversOf, type OrderContent, SPEC_KEYS, toleranceOf } from '../order-content';

const SAID_OF_ORDER = [
  'revision',
  'title',
  'needed-by',
  'cushions',
  'tolerance',
  'cloths',
  ...SPEC_KEYS,
] as const;
type SaidOfOrder = (typeof SAID_OF_ORDER)[number];

export const CHANGED_FIELDS = [...SAID_OF_ORDER, ...SAID_OF_CUSHION] as const;
export type ChangedField = (typeof CHANGED_FIELDS)[number];

/** One thing that reads otherwise now; what is empty was not said. */
export interface OrderChange {
  mark: string | null;
  field: ChangedField;
  before: Phrase;
  after: Phrase;
  /** Of an outline: to draw both. */
  outlines?: { before: OutlineCorner[]; after: OutlineCorner[] };
}

export interface Sending {
  content: OrderContent;
  cushions: readonly CushionSpec[];
}

/** What an upholsterer has to look at again when an order is sent once more. */
export function orderChanges(before: Sending, after: Sending): OrderChange[] {
  const earlier = new Map(before.cushions.map((cushion) => [cushion.mark, cushion]));
  return [
    ...changed(null, SAID_OF_ORDER, saidOfOrder(before), saidOfOrder(after)),
    ...after.cushions.flatMap((cushion) => {
      const was = earlier.get(cushion.mark);
      return was ? cushionChanges(was, cushion) : [];
    }),
  ];
}

function saidOfOrder({ content, cushions }: Sending): Record<SaidOfOrder, Phrase> {
  const words = Object.fromEntries(SPEC_KEYS.map((key) => [key, phrase`${content.spec[key]}`]));
  return {
    revision: phrase`${content.revisionLetter}`,
    title: phrase`${content.title}`,
    'needed-by': phrase`${content.neededBy ?? ''}`,
    cushions: phrase`${cushions.map(({ mark }) => mark).join(', ')}`,
    tolerance: [{ mm: toleranceOf(content) }],
    cloths: joined(coversOf(content).map(clothPhrase), '; '),
    ...(words as Record<(typeof SPEC_KEYS)[number], Phrase>),
  };
}

function cushionChanges(before: CushionSpec, after: CushionSpec): OrderChange[] {
  const outlines = { before: before.outline, after: after.outline };
  return changed(after.mark, SAID_OF_CUSHION, saidOfCushion(before), saidOfCushion(after)).map((change) =>
    change.field === 'outline' ? { ...change, outlines } : change,
  );
}

function changed<Field extends SaidOfOrder | SaidOfCushion>(
  mark: string | null,
  fields: readonly Field[],
  before: Record<Field, Phrase>,
  after: Record<Field, Phrase>,
): OrderChange[] {
  return fields
    .filter((field) => !samePhrase(before[field], after[field]))
    .map((field) => ({ mark, field, before: before[field], after: after[field] }));
}
