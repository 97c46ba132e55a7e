/** What stands in a text where the name of an erased person stood. */
export const ERASED_NAME = 'a person erased';

/** Parts of a name shorter than this say too little to look for. */
const LEAST_LETTERS = 3;
/** Articles, prepositions and forms of address that stand in names and in every other sentence. */
const COMMON_WORDS = new Set(
  (
    'and the for with from von vom van der den dem des die das ten ter zum zur del della delle dei degli dos les los ' +
    'las une und een bin ibn bint sir mrs miss lady lord prof jnr snr senior junior'
  ).split(' '),
);

const NO_LETTER_BEFORE = '(?<![\\p{L}\\p{M}\\p{N}])';
const NO_LETTER_AFTER = '(?![\\p{L}\\p{M}\\p{N}])';
/** Joined by a hyphen it is another name. */
const NOT_JOINED_BEFORE = '(?<![\\p{L}\\p{M}\\p{N}][-\\u2010\\u2011])';
const NOT_JOINED_AFTER = '(?![-\\u2010\\u2011][\\p{L}\\p{N}])';
const APOSTROPHES = /['\u2018\u2019\u02bc]/g;

/** A hit with what stands around it. */
export interface Mention {
  before: string;
  name: string;
  after: string;
}

const lettersOf = (part: string): number => (part.match(/\p{L}/gu) ?? []).length;
const isCommon = (part: string): boolean => COMMON_WORDS.has(part.toLowerCase());

/** One name looked for in texts: as whole words, in capitals or not, however it is spaced. */
export class PersonName {
  private readonly whole: RegExp;
  private readonly parts: RegExp | null;

  constructor(name: string) {
    const words = name.normalize('NFC').trim().split(/\s+/u).filter(Boolean);
    this.whole = new RegExp(
      `${NO_LETTER_BEFORE}${NOT_JOINED_BEFORE}${words.map(literal).join('\\s+')}${NO_LETTER_AFTER}${NOT_JOINED_AFTER}`,
      'giu',
    );
    const telling = words.flatMap((word) => word.match(/[\p{L}\p{M}'\u2019]+/gu) ?? []);
    const long = telling.filter((part) => lettersOf(part) >= LEAST_LETTERS && !isCommon(part));
    this.parts = long.length
      ? new RegExp(`${NO_LETTER_BEFORE}(?:${long.map(literal).join('|')})${NO_LETTER_AFTER}`, 'giu')
      : null;
  }

  isIn(text: string): boolean {
    return this.mentions(text).length > 0;
  }

  /** Where the whole name stands. */
  mentions(text: string): Mention[] {
    return mentionsOf(this.whole, text);
  }

  /** Where a part of the name stands by itself; it may be somebody else's. */
  partMentions(text: string): Mention[] {
    return this.parts ? mentionsOf(this.parts, this.replacedIn(text, '…')) : [];
  }

  /** The text with the whole name taken out; a text without it comes back as it was. */
  removedFrom(text: string): string {
    return this.replacedIn(text, ERASED_NAME);
  }

  replacedIn(text: string, newName: string): string {
    return this.isIn(text) ? text.normalize('NFC').replace(this.whole, () => newName) : text;
  }
}

const AROUND = 60;

function mentionsOf(pattern: RegExp, written: string): Mention[] {
  const text = written.normalize('NFC');
  return [...text.matchAll(pattern)].map(({ 0: name, index }) => ({
    before: shortened(text.slice(0, index), 'end'),
    name,
    after: shortened(text.slice(index + name.length), 'start'),
  }));
}

/** The piece of a text next to a hit, cut at a word where it is long. */
function shortened(text: string, keep: 'start' | 'end'): string {
  const letters = [...text.replace(/\s+/gu, ' ')];
  if (letters.length <= AROUND) return letters.join('');
  if (keep === 'start') return `${letters.slice(0, AROUND).join('').replace(/\S*$/u, '')}…`;
  return `…${letters.slice(-AROUND).join('').replace(/^\S*/u, '')}`;
}

function literal(word: string): string {
  return word.replace(/[.*+?^${}()|[\]\\]/g, '\\$&').replace(APOSTROPHES, "['\u2018\u2019\u02bc]");
}
