import {
  orderCoverSchema,
  plainCover,
  type CoverPart,
  type CushionSpec,
  type OrderCover,
} from '@settlewright/geometry';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { moneyInput, readMoney } from '../life/money.ts';

/** Which cushions a cloth covers. */
export type Covered = 'all' | 'seat' | 'back' | 'marks';
export type PartChoice = 'whole' | 'no-welt' | 'no-faces' | 'no-edges' | 'faces' | 'edges' | 'welt';

export const LENGTHS = [
  'width',
  'selvedge',
  'across',
  'along',
  'start',
  'step',
  'measured',
  'received',
] as const;
export type LengthKey = (typeof LENGTHS)[number];

/** A cloth as it is typed. */
export interface ClothDraft extends Pick<OrderCover, 'name' | 'direction' | 'nap' | 'controlLine'> {
  lengths: Record<LengthKey, QuantityEntry>;
  /** Of a yard or a metre, as the page measures. */
  price: string;
  currency: string;
  covered: Covered;
  marks: string;
  parts: PartChoice;
  own: boolean;
  sampleKept: boolean;
  dyeLot: string;
  receivedOn: string;
  flaws: string;
}

const PARTS: Record<PartChoice, CoverPart[] | undefined> = {
  whole: undefined,
  'no-welt': ['faces', 'edges'],
  'no-faces': ['edges', 'welt'],
  'no-edges': ['faces', 'welt'],
  faces: ['faces'],
  edges: ['edges'],
  welt: ['welt'],
};

const marksOf = (cushions: readonly CushionSpec[], kind: CushionSpec['kind']) =>
  cushions.filter((cushion) => cushion.kind === kind).map(({ mark }) => mark);

function coveredBy(marks: readonly string[] | undefined, cushions: readonly CushionSpec[]): Covered {
  if (!marks) return 'all';
  const same = (kind: CushionSpec['kind']) =>
    [...marks].sort().join() === marksOf(cushions, kind).sort().join();
  return same('seat') ? 'seat' : same('back') ? 'back' : 'marks';
}

/**
 * @param cover - as it stands; a plain one when absent
 * @param cushions - of the order
 * @param perMm - length that a price is for
 */
export function draftOf(
  cover: OrderCover | undefined,
  cushions: readonly CushionSpec[],
  perMm: number,
): ClothDraft {
  const from = cover ?? plainCover('');
  const { com, repeatMm, pricePerMetreMinor, currency = 'USD', cushionMarks, parts } = from;
  const { name, direction, nap, controlLine } = from;
  const sorted = (list: readonly CoverPart[] | undefined) => list && [...list].sort().join();
  const choice = (Object.keys(PARTS) as PartChoice[]).find((key) => sorted(PARTS[key]) === sorted(parts));
  return {
    ...{ name, direction, nap, controlLine, currency },
    lengths: {
      width: entryOf(from.widthMm),
      selvedge: entryOf(from.selvedgeMm),
      across: entryOf(repeatMm.acrossMm),
      along: entryOf(repeatMm.alongMm),
      start: entryOf(from.startMm),
      step: entryOf(from.stepMm),
      measured: entryOf(com?.measuredWidthMm),
      received: entryOf(com?.receivedMm),
    },
    price:
      pricePerMetreMinor === undefined
        ? ''
        : moneyInput(Math.round((pricePerMetreMinor * perMm) / 1000), currency),
    covered: coveredBy(cushionMarks, cushions),
    marks: cushionMarks?.join(', ') ?? '',
    parts: choice ?? 'whole',
    own: com !== undefined,
    sampleKept: com?.sampleKept ?? false,
    dyeLot: com?.dyeLot ?? '',
    receivedOn: com?.receivedOn ?? '',
    flaws: com?.flaws ?? '',
  };
}

/**
 * What is kept of a draft, or what cannot be read, by the path of the schema.
 *
 * @param perMm - length that the price is for
 */
export function readCloth(
  draft: ClothDraft,
  cushions: readonly CushionSpec[],
  perMm: number,
): { cover: OrderCover } | { faults: Record<string, string> } {
  const { lengths, parts } = draft;
  const mm = (key: LengthKey) => lengths[key].value ?? undefined;
  const currency = draft.currency.trim().toUpperCase();
  const minor = draft.price.trim() === '' ? undefined : readMoney(draft.price, currency);
  const cushionMarks = {
    all: undefined,
    seat: marksOf(cushions, 'seat'),
    back: marksOf(cushions, 'back'),
    marks: draft.marks
      .toUpperCase()
      .split(/[\s,;]+/)
      .filter(Boolean),
  }[draft.covered];
  const faults = Object.fromEntries(
    LENGTHS.flatMap((key) => {
      const { problem } = lengths[key];
      return problem === undefined ? [] : [[key, problem]];
    }),
  );
  if (minor === null) faults.pricePerMetreMinor = `“${draft.price}” is no amount. Type it as 48.00.`;
  if (cushionMarks?.length === 0) faults.cushionMarks = 'No cushion of the order is covered by it.';
  const strange = cushionMarks?.filter((mark) => !cushions.some((cushion) => cushion.mark === mark)) ?? [];
  if (strange.length > 0) faults.cushionMarks = `The order has no ${strange.join(', ')}.`;
  const read = orderCoverSchema.safeParse({
    ...{ name: draft.name, direction: draft.direction, nap: draft.nap, controlLine: draft.controlLine },
    widthMm: mm('width'),
    selvedgeMm: mm('selvedge') ?? 0,
    repeatMm: { acrossMm: mm('across') ?? 0, alongMm: mm('along') ?? 0 },
    startMm: mm('start') ?? 0,
    stepMm: mm('step') ?? 1,
    ...(typeof minor === 'number' && { pricePerMetreMinor: Math.round((minor * 1000) / perMm), currency }),
    ...(draft.own && {
      com: {
        ...{ sampleKept: draft.sampleKept, dyeLot: draft.dyeLot, flaws: draft.flaws },
        ...(mm('measured') !== undefined && { measuredWidthMm: mm('measured') }),
        ...(mm('received') !== undefined && { receivedMm: mm('received') }),
        ...(draft.receivedOn !== '' && { receivedOn: draft.receivedOn }),
      },
    }),
    ...(cushionMarks && { cushionMarks }),
    ...(PARTS[parts] && { parts: PARTS[parts] }),
  });
  if (read.success && Object.keys(faults).length === 0) return { cover: read.data };
  const refused = read.error?.issues.map(({ path, message }) => [path.join('.'), message] as const) ?? [];
  const words: Record<string, string> = {
    name: 'What is it called?',
    widthMm: 'How wide is the roll?',
    currency: 'Three letters, as USD or EUR.',
  };
  return {
    faults: {
      ...Object.fromEntries(refused.map(([path, message]) => [path, words[path] ?? message])),
      ...faults,
    },
  };
}
