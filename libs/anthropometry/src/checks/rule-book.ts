import type { MeasureKey } from '../measures/measures.ts';
import type { RuleScope, RuleUnit, SourceMark } from './fit-sheet.ts';
import { bookSchema } from './rule-book-schema.ts';

/** What the screen says for each way a source was read. */
export const SOURCE_MARK_WORDS: Record<SourceMark, string> = {
  RETRIEVED: 'read in the source',
  'FROM MEMORY': 'from memory',
  DERIVED: 'worked out here',
  'HOUSE RULE': 'shop rule',
};

/** One rule as data: its words, its sources and every number it decides with. */
export interface Rule {
  id: string;
  name: string;
  /** Short words for the column or line of the sheet. */
  columnName: string;
  group: string;
  scope: RuleScope;
  unit: RuleUnit;
  tier: 'guidance' | 'code';
  /** One plain sentence; `{sitter}` stands for whoever sits there. */
  why: string;
  sources: { cite: string; mark: SourceMark }[];
  /** What the numbers rest on. */
  thresholdBasis: string;
  sourceWord: 'published source' | 'common practice' | 'shop rule' | 'from memory';
  /** Clause of the code, for rules of tier `code`. */
  clause?: string;
  /** The rule that reads the public in this rule's column. */
  publicRule?: string;
  /** At which end of the population the public is read, and in what words. */
  publicRead?: {
    readAs: string;
    bodyData?: 'women' | 'men';
    measure?: MeasureKey;
    percentile?: number;
  };
  /** Names end in Mm, In (inches govern) or Deg; shares and percentiles are bare. */
  numbers: Record<string, number>;
  /** One example worked by hand. */
  worked: {
    given: Record<string, number | string>;
    expected: Record<string, number | string | boolean>;
    hand: string;
  };
}

/** A range that the trade builds to, shown beside what the sitters need; it decides no verdict. */
export interface Practice {
  id: string;
  words: string;
  lowerIn: number;
  usualIn: number;
  upperIn: number;
  sourceWord: Rule['sourceWord'];
  source: string;
}

/** One side of two rules that pull against each other. */
export interface ConflictSide {
  /** The public's and the person's form of one demand stand together; none where no rule asks for it. */
  rules: string[];
  /** What this side is for, in one plain sentence. */
  purpose: string;
}

/** Rules that pull against each other: meeting one makes it harder to meet the other. */
export interface RuleConflict {
  id: string;
  /** When it comes up, in one plain sentence. */
  when: string;
  sides: [ConflictSide, ConflictSide];
  /** One sentence with `{name}` for each number. */
  note: string;
  /** Names as in a rule; shares are bare and end in Share. */
  numbers: Record<string, number>;
  sources: Rule['sources'];
  /** At odds wherever this rule's value lies between these two, whatever the verdicts are. */
  atValue?: { rule: string; lowerMm: number; upperMm: number };
}

/** All rules of one version, in the order of the sheet. */
export interface RuleBook {
  version: string;
  /** Probability from which a verdict is given. */
  confidence: number;
  confidenceSource: Rule['sources'][number];
  /** How far past a line still counts as on it. */
  boundaryTolerance: Record<RuleUnit, number>;
  /** From which difference between two bodies, in what a check reads, one of them says little by sitting for the other. */
  standIn: { littleSaidMm: number; source: Rule['sources'][number] };
  practices: Practice[];
  conflicts: RuleConflict[];
  rules: Rule[];
  /** @throws RangeError when the book has no such rule */
  rule(id: string): Rule;
}

/**
 * Reads the rule data and refuses a file that does not hold together.
 *
 * @param json - parsed `seed-data/fit-rules.json`
 * @returns the rule book
 * @throws Error naming the field, what was read and what is accepted
 */
export function loadRuleBook(json: unknown): RuleBook {
  const parsed = bookSchema.safeParse(json);
  if (!parsed.success) {
    const [issue] = parsed.error.issues;
    throw new Error(`Fit rules: ${issue?.path.join('.') ?? ''}: ${issue?.message ?? 'not readable'}`);
  }
  const { conflicts, rules } = parsed.data;
  const byId = new Map(rules.map((rule) => [rule.id, rule]));
  if (byId.size !== rules.length)
    throw new Error('Fit rules: two rules carry the same id; accepted: one each');
  const unknown = conflicts
    .flatMap(({ sides }) => sides.flatMap((side) => side.rules))
    .find((id) => !byId.has(id));
  if (unknown !== undefined)
    throw new Error(`Fit rules: a conflict names ${unknown}; accepted: a rule of the book`);
  return {
    ...parsed.data,
    rule(id) {
      const rule = byId.get(id);
      if (!rule) throw new RangeError(`Fit rules: no rule ${id}; accepted: ${[...byId.keys()].join(', ')}`);
      return rule;
    },
  };
}

/** Exact. */
export const MM_PER_INCH = 25.4;

/**
 * One number of a rule.
 *
 * @param rule - the rule
 * @param name - name without its unit: `pass` finds `passMm`, `passIn` (times 25.4), `passDeg` or `pass`
 * @returns millimetres, degrees or the bare number
 * @throws RangeError when the rule has no such number
 */
export function ruleNumber(rule: Rule, name: string): number {
  let numbers = byName.get(rule);
  if (!numbers) {
    numbers = new Map(
      Object.entries(rule.numbers).map(([key, value]) =>
        key.endsWith('In') ? [key.slice(0, -2), value * MM_PER_INCH] : [key.replace(/(Mm|Deg)$/, ''), value],
      ),
    );
    byName.set(rule, numbers);
  }
  const value = numbers.get(name);
  if (value === undefined) {
    throw new RangeError(
      `Fit rules: ${rule.id} has no number ${name}; accepted: ${Object.keys(rule.numbers).join(', ')}`,
    );
  }
  return value;
}

/** Numbers of a rule by their name without the unit. */
const byName = new WeakMap<Rule, Map<string, number>>();

/**
 * The plain sentence of a rule about one sitter.
 *
 * @param rule - the rule
 * @param sitter - shown name
 * @returns a sentence that starts with a capital letter
 */
export function whyFor(rule: Rule, sitter: string): string {
  const sentence = rule.why.replaceAll('{sitter}', sitter);
  return sentence.charAt(0).toUpperCase() + sentence.slice(1);
}
