import type { FitSheet, RuleBook } from '@settlewright/anthropometry';
import {
  isGain,
  isLoss,
  sheetChanges,
  type CellChange,
  type CellState,
  type LengthStyle,
} from '@settlewright/geometry';
import { verdictWord } from '@/components/verdict.tsx';
import { joinWords } from '@/lib/dimension-words.ts';
import { answerAt, shortBy } from './answers.ts';
import { shortName } from '@/lib/short-name.ts';

/** What a choice does, in words. */
export interface Effects {
  better: string[];
  worse: string[];
  /** Who still does not fit by the checks that the dimension moves, and what is missing. */
  lost: string[];
  /** Of whom some such check is not known. */
  unknown: string[];
  /** Other checks that keep what they say. */
  kept: number;
  /** Who falls to which verdict, for beside the button. */
  newly: { words: string; names: string }[];
}

const STATE_WORDS: Partial<Record<CellState, string>> = {
  inside: 'inside the clause',
  outside: 'outside the clause',
  gone: 'does not apply',
};
const stateWord = (state: CellState): string => STATE_WORDS[state] ?? verdictWord(state as 'fits');

interface Input {
  before: FitSheet;
  after: FitSheet;
  /** Rules that the page is about; their gains are said shortest. */
  ruleIds: ReadonlySet<string>;
  /** Rules that the dimension moves, shown or not. */
  moving: ReadonlySet<string>;
  ruleBook: RuleBook;
  style: LengthStyle;
}

/** Who gains and who loses between two sheets, by name. */
export function effectsOf({ before, after, ruleIds, moving, ruleBook, style }: Input): Effects {
  const whoOf = whoIn(before);
  const checkOf = (change: CellChange) => checkName(change, ruleBook);
  const changes = sheetChanges(before, after);
  const alone = ruleIds.size === 1;
  const brief = (change: CellChange) => alone && ruleIds.has(change.ruleId) && change.sitterId !== undefined;
  const inFull = (change: CellChange) =>
    `, ${checkOf(change)}: ${stateWord(change.from)} to ${stateWord(change.to)}`;
  const losses = changes.filter(isLoss);
  const gains = changes.filter(isGain);
  return {
    better: [
      ...gathered(gains.filter(brief), ({ to }) => to, whoOf).map(({ change, who, many }) =>
        change.to === 'fits'
          ? `${who} ${many ? 'fit' : 'fits'}`
          : `${who} ${many ? 'turn' : 'turns'} ${stateWord(change.to)}`,
      ),
      ...gathered(
        gains.filter((change) => !brief(change)),
        inFull,
        whoOf,
      ).map(({ change, who }) => who + inFull(change)),
    ],
    worse: gathered(losses, inFull, whoOf).map(({ change, who }) => who + inFull(change)),
    lost: lostIn(after, moving, ruleBook, style),
    unknown: unknownIn(after, moving, ruleBook),
    kept:
      before.rows
        .flatMap(({ cells }) => cells)
        .concat(before.piecesAndWays)
        .filter(speaks).length - changes.length,
    newly: gathered(losses, ({ to }) => to, whoOf).map(({ change, who }) => ({
      words: `Newly ${stateWord(change.to)}`,
      names: who,
    })),
  };
}

/** Tells whom a change is about: a sitter's short name, or the marks of the pieces. */
export function whoIn({ rows }: FitSheet): (change: CellChange) => string {
  const names = new Map(rows.map(({ sitterId, name }) => [sitterId, shortName(name)]));
  return ({ sitterId, marks }) => names.get(sitterId ?? '') ?? joinWords(marks);
}

const speaks = ({ outcome: { kind } }: FitSheet['piecesAndWays'][number]): boolean =>
  kind === 'verdict' || kind === 'clause';

/** Who does not fit by some rules, and what is missing: "Hetty, seat height: 2⅛″ short". */
export function lostIn(
  sheet: FitSheet,
  ruleIds: ReadonlySet<string>,
  ruleBook: RuleBook,
  style: LengthStyle,
): string[] {
  return sheet.rows.flatMap(({ placeId, name }) => {
    const answer = answerAt(sheet, placeId, ruleIds);
    return answer?.outcome.verdict === 'wontFit'
      ? [`${shortName(name)}, ${checkName(answer, ruleBook)}: ${shortBy(answer, ruleBook, style)}`]
      : [];
  });
}

/** Whose worst answer by some rules is that it is not known: "Wren, elbow to sill". */
function unknownIn(sheet: FitSheet, ruleIds: ReadonlySet<string>, ruleBook: RuleBook): string[] {
  return sheet.rows.flatMap(({ placeId, name }) => {
    const answer = answerAt(sheet, placeId, ruleIds);
    return answer?.outcome.verdict === 'notKnown'
      ? [`${shortName(name)}, ${checkName(answer, ruleBook)}`]
      : [];
  });
}

/** "seat height": how a check is called inside a sentence. */
export const checkName = ({ ruleId }: Pick<CellChange, 'ruleId'>, ruleBook: RuleBook): string =>
  ruleBook.rule(ruleId).columnName.toLowerCase();

/** Changes that are said in one line, with everybody whom they touch. */
function gathered(
  changes: readonly CellChange[],
  keyOf: (change: CellChange) => string,
  whoOf: (change: CellChange) => string,
): { change: CellChange; who: string; many: boolean }[] {
  const groups = new Map<string, CellChange[]>();
  for (const change of changes) groups.set(keyOf(change), [...(groups.get(keyOf(change)) ?? []), change]);
  return [...groups.values()].map((group) => {
    const who = [...new Set(group.map(whoOf))];
    return { change: group[0] as CellChange, who: joinWords(who), many: who.length > 1 };
  });
}
