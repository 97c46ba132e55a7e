import type { CushionSpec } from '@settlewright/geometry';
import { clothsInWords } from '../cloths-in-words';
import { coversOf, type OrderContent, SPEC_KEYS, toleranceOf } from '../order-content';

export const CHANGED_FIELDS = [
  'revision',
  'title',
  'needed-by',
  'cushions',
  'tolerance',
  'cloths',
  ...SPEC_KEYS,
  'width',
  'depth',
  'thickness',
  'foam-grade',
  'hand',
  'button-count',
  'button-places',
] as const;
export type ChangedField = (typeof CHANGED_FIELDS)[number];

/** One thing that reads otherwise now; sizes in millimetres, the rest in words. */
export interface OrderChange {
  mark: string | null;
  field: ChangedField;
  beforeMm?: number;
  afterMm?: number;
  before?: string;
  after?: string;
}

interface Sending {
  content: OrderContent;
  cushions: readonly CushionSpec[];
}

/** Differences below this do not show on any paper. */
const SEEN_MM = 0.1;

/** What an upholsterer has to look at again when an order is sent once more. */
export function orderChanges(before: Sending, after: Sending): OrderChange[] {
  const earlier = new Map(before.cushions.map((cushion) => [cushion.mark, cushion]));
  return [
    ...contentChanges(before, after),
    ...after.cushions.flatMap((cushion) => {
      const was = earlier.get(cushion.mark);
      return was ? cushionChanges(was, cushion) : [];
    }),
  ];
}

function contentChanges(before: Sending, after: Sending): OrderChange[] {
  const marks = ({ cushions }: Sending) => cushions.map(({ mark }) => mark).join(', ');
  return [
    words(null, 'revision', before.content.revisionLetter, after.content.revisionLetter),
    words(null, 'title', before.content.title, after.content.title),
    words(null, 'needed-by', before.content.neededBy ?? '', after.content.neededBy ?? ''),
    words(null, 'cushions', marks(before), marks(after)),
    size(null, 'tolerance', toleranceOf(before.content), toleranceOf(after.content)),
    words(null, 'cloths', clothsInWords(coversOf(before.content)), clothsInWords(coversOf(after.content))),
    ...SPEC_KEYS.map((key) => words(null, key, before.content.spec[key], after.content.spec[key])),
  ].flat();
}

function cushionChanges(before: CushionSpec, after: CushionSpec): OrderChange[] {
  const { mark } = after;
  const places = ({ buttons }: CushionSpec) =>
    [buttons.columns.map(({ fromSeamMm }) => fromSeamMm), buttons.rowsMm]
      .map((list) => list.map((mm) => Math.round(mm)).join(' '))
      .join(' / ');
  const foam = ({ foam: { grade, densityKgM3, ifd25N } }: CushionSpec) =>
    `${grade}, ${Math.round(densityKgM3)} kg/m³, ${Math.round(ifd25N)} N`;
  return [
    size(mark, 'width', before.finishedMm.widthMm, after.finishedMm.widthMm),
    size(mark, 'depth', before.finishedMm.depthMm, after.finishedMm.depthMm),
    size(mark, 'thickness', before.finishedMm.thicknessMm, after.finishedMm.thicknessMm),
    words(mark, 'foam-grade', foam(before), foam(after)),
    words(mark, 'hand', before.hand, after.hand),
    words(mark, 'button-count', String(before.buttons.count), String(after.buttons.count)),
    words(mark, 'button-places', places(before), places(after)),
  ].flat();
}

function words(mark: string | null, field: ChangedField, before: string, after: string): OrderChange[] {
  return before === after ? [] : [{ mark, field, before, after }];
}

function size(mark: string | null, field: ChangedField, beforeMm: number, afterMm: number): OrderChange[] {
  return Math.abs(beforeMm - afterMm) < SEEN_MM ? [] : [{ mark, field, beforeMm, afterMm }];
}
