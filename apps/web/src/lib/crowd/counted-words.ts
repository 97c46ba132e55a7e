import { joinWords } from '@/lib/dimension-words.ts';

/** What a share of the public counts. */
export interface Counted {
  passes: 'fit' | 'atLeastTight';
  /** Names of the checks that must pass at once; a number where they are all that there are. */
  checks: readonly string[] | number;
  /** "every place of the set". */
  places: string;
}

const PASSES: Record<Counted['passes'], string> = { fit: 'fit', atLeastTight: 'are at least tight' };

/** "Counted are people who fit seat height and seat depth at once, at every place of the set." The same words on every page. */
export function countedWords({ passes, checks, places }: Counted): string {
  const many = typeof checks === 'number' ? checks : checks.length;
  const names = typeof checks === 'number' ? `all ${checks} checks that are asked here` : joinWords(checks);
  const joint = passes === 'fit' ? names : `in ${names}`;
  return `Counted are people who ${PASSES[passes]} ${joint}${many > 1 ? ' at once' : ''}, at ${places}.`;
}

export const EVERY_PLACE = 'every place of the set';

const PAGES = {
  whoFits: '“Who fits” counts people who fit all ticked checks at every place',
  stick: 'a story stick counts people who fit the checks that it shows, at the places that it moves',
  suggest: '“Suggest dimensions” counts people who are at least tight in the checks that its ranges change',
} as const;

/** Why a share on this page and one on another are not the same number. */
export function sharesDiffer(here: keyof typeof PAGES): string {
  const others = Object.entries(PAGES).flatMap(([page, words]) => (page === here ? [] : [words]));
  return `Other pages count otherwise: ${others.join('; ')}.`;
}
