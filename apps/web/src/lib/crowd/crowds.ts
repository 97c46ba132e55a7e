/** What people of a crowd wear; the same for everybody, and said on the page. */
export { CROWD_WEAR } from '@settlewright/anthropometry';

/** Which people a share is about: a population, and how many of 100 are women. */
export interface CrowdChoice {
  populationId: string;
  /** 0 to 100. */
  women: number;
}

/** A population as it stands in the list. */
export interface CrowdOption {
  id: string;
  words: string;
  /** Of what kind its numbers are, in the words of the product. */
  kind: string;
  /** Where the population holds one sex: there is nothing to mix. */
  only?: 'women' | 'men';
}

/** The populations that ship with the product; a workshop may add its own. */
export const CROWDS: readonly CrowdOption[] = [
  { id: 'us-civilians-2015', words: 'US adults 2015–16', kind: 'generated from two surveys' },
  { id: 'us-soldiers-2012', words: 'US soldiers 2012', kind: 'surveyed' },
  { id: 'british', words: 'British adults', kind: 'estimated' },
  { id: 'german', words: 'German adults', kind: 'estimated', only: 'men' },
  { id: 'hong-kong', words: 'Hong Kong adults', kind: 'estimated' },
  { id: 'japanese', words: 'Japanese adults', kind: 'estimated' },
  ...[1, 2, 3, 4, 5, 6].map((mark) => ({
    id: `children-${mark}`,
    words: `Children of size mark ${mark}`,
    kind: 'estimated, three measures only',
  })),
];

export const DEFAULT_CROWD: CrowdChoice = { populationId: 'us-civilians-2015', women: 50 };

/** The one sex of a population that holds no other. */
export const onlySex = (
  populationId: string,
  options: readonly CrowdOption[] = CROWDS,
): CrowdOption['only'] => options.find(({ id }) => id === populationId)?.only;

/** "US adults 2015–16, men and women equally". */
export function crowdWords(
  { populationId, women }: CrowdChoice,
  options: readonly CrowdOption[] = CROWDS,
): string {
  const name = options.find(({ id }) => id === populationId)?.words ?? 'people of your own survey';
  if (populationId.startsWith('children-')) return `${name}, girls and boys`;
  const only = onlySex(populationId, options);
  if (only) return `${name}, ${only}`;
  if (women === 50) return `${name}, men and women equally`;
  if (women === 0) return `${name}, men`;
  if (women === 100) return `${name}, women`;
  return `${name}, ${women} in 100 women`;
}
