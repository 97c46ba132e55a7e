import { LEAF_WORDS, type FreerWay, type TightSpot, type WayIn } from '@settlewright/geometry';
import { joinWords } from '../choosing-words.ts';

/** How lengths and people are called. */
export interface Naming {
  length: (mm: number) => string;
  /** Who sits at a place. */
  name: (placeId: string) => string;
}

const AT: Record<TightSpot['band'], string> = {
  thighs: 'at the thighs',
  trunk: 'at the trunk',
  shins: 'at the shins',
};

const where = ({ between, band, move }: TightSpot): string => {
  const marks = [...new Set(between.map(({ mark }) => mark))];
  const at = marks.length > 1 ? `between ${joinWords(marks)}` : `at ${joinWords(marks)}`;
  return `${at}, ${AT[band]}${move === 'slide' ? ', sliding along the seat' : ''}`;
};

/** What a way in comes to, in a sentence or two. */
export function sayWay({ steps, tightest, passes, placeId }: WayIn, { length, name }: Naming): string {
  const who = name(placeId);
  if (steps.length === 0) return `No way leads to the place of ${who}, however thin one is.`;
  if (tightest === undefined) return `${who} gets in with room to spare on both sides.`;
  const { widthMm, depthMm, clearMm } = tightest;
  const sizes = `${length(widthMm)} wide for a body ${length(depthMm)} deep`;
  if (passes) {
    return `${who} gets in. Tightest ${where(tightest)}: ${sizes}, ${length(clearMm)} to spare on each side.`;
  }
  return `${who} is stuck ${where(tightest)}: ${sizes}. The deepest person who passes is ${length(Math.max(0, depthMm + 2 * clearMm))}.`;
}

/** What others have to do for it. */
export function sayHelp({ past, chairs, leaves, freer }: WayIn, { name, length }: Naming): string[] {
  const of = (how: WayIn['past'][number]['how']) =>
    past.filter((one) => one.how === how).map(({ placeId }) => name(placeId));
  const [later, up] = [of('sits-later'), of('stands-up')];
  return [
    ...(later.length > 0 ? [`Goes in before ${joinWords(later)}.`] : []),
    ...(up.length > 0 ? [`Past ${joinWords(up)} once seated only where they stand up.`] : []),
    ...(chairs.length > 0 ? [`Take ${joinWords(chairs.map(({ mark }) => mark))} out of the way.`] : []),
    ...leaves.map(({ mark, edge, down }) => `${down ? 'Drop' : 'Lift'} the ${LEAF_WORDS[edge]} of ${mark}.`),
    ...(freer ? [sayFreer(freer, { name, length })] : []),
  ];
}

/** "Or past nobody, 14½″ at the tightest." */
export function sayFreer({ past, insteadOf, tightest }: FreerWay, { name, length }: Naming): string {
  const whom = past.length === 0 ? 'nobody' : `${joinWords(past.map(name))} alone`;
  const room = tightest ? `${length(tightest.widthMm)} at the tightest` : 'with room to spare';
  return `The widest way leads past ${joinWords(insteadOf.map(name))} once seated. Or past ${whom}, ${room}.`;
}

/** Neither how they get in nor whether others get past them. */
const nothingKnownOf = (names: readonly string[]): string =>
  `Not known: how ${joinWords(names)} ${names.length === 1 ? 'gets' : 'get'} in, and whether others get past.`;

/** Of whom nothing is known here. */
export const sayLeftOut = (names: readonly string[]): string =>
  `${nothingKnownOf(names)} Their measures are not known here.`;

/** Why nothing is said of children: their breadths and depths are borrowed for the drawing. */
export const sayChildren = (names: readonly string[]): string =>
  `${nothingKnownOf(names)} Of a child only height, weight and lower leg are known; how broad and deep it is drawn is for scale.`;
