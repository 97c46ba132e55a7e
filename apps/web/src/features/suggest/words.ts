import type { FitSheet, RuleBook } from '@settlewright/anthropometry';
import type { Blame, Dimension, LengthStyle, Suggestion } from '@settlewright/geometry';
import { capital } from '@/lib/capital.ts';
import { aboutInHundred, dimensionValue, exactValue, joinWords, markWords } from '@/lib/dimension-words.ts';
import { footRails } from '@/lib/foot-rails.ts';
import { countedWords, EVERY_PLACE } from '@/lib/crowd/counted-words.ts';
import type { SearchTold } from './search.ts';
import { checkWords, shortCells, type Effects, type Move, type PersonEffect } from './effects.ts';
import { shortName } from '@/lib/short-name.ts';

/** "Seat height of B1 to B4" inside a sentence. */
function subject({ label, marks, tableMarks }: Dimension): string {
  const name = label.replace(', pressed', '').toLowerCase();
  const tables = tableMarks.length > 0 ? ` with ${markWords(tableMarks)}` : '';
  return `${name} of ${markWords(marks)}${tables}`;
}

/** The parts of an answer's sentence: words and numbers, so that numbers can be set as such. */
export interface MoveWords {
  id: string;
  subject: string;
  from: string;
  to: string;
}

export function moveWords({ dimension, from, to }: Move, style: LengthStyle): MoveWords {
  return {
    id: dimension.id,
    subject: subject(dimension),
    from: dimensionValue(from, dimension.unit, style),
    to: exactValue(to, dimension.unit, style),
  };
}

/** "Seat depth of B1 to B4 and table height of T1 stay." */
export function staysWords(stays: readonly Move[]): string {
  if (stays.length === 0) return '';
  return `${capital(joinWords(stays.map(({ dimension }) => subject(dimension))))} ${stays.length === 1 ? 'stays' : 'stay'} as now.`;
}

/** Name of the undo step: "Suggested: seat height of B1 to B4 18″ to 17″ and 2 more". */
export function stepWords(moves: readonly Move[], style: LengthStyle): string {
  const [first, ...rest] = moves.map((move) => moveWords(move, style));
  if (!first) return 'Suggested dimensions';
  const more = rest.length > 0 ? ` and ${rest.length} more` : '';
  return `Suggested: ${first.subject} ${first.from} to ${first.to}${more}`;
}

/** "Hetty: seat height fits, table height tight". */
export const personWords = ({ name, checks }: PersonEffect): string =>
  `${shortName(name)}: ${checks.join(', ')}`;

/** How many of those to serve an answer serves, and how many now: "2 of 4 sitters to serve … every check, now 1." */
export function servedWords({ served, servedNow, of }: Pick<Effects, 'served' | 'servedNow' | 'of'>): string {
  if (of === 0) return 'Nobody named is to be served.';
  const now = servedNow === served ? ', as now' : `, now ${servedNow === 0 ? 'none' : servedNow}`;
  if (of === 1) {
    const is = served === 1 ? 'is' : 'is not';
    return `The sitter to serve ${is} at least tight in every check${servedNow === served ? ', as now' : ''}.`;
  }
  if (served === of) return `All ${of} sitters to serve are at least tight in every check${now}.`;
  if (served === 0) return `None of ${of} sitters to serve is at least tight in every check${now}.`;
  return `${served} of ${of} sitters to serve ${served === 1 ? 'is' : 'are'} at least tight in every check${now}.`;
}

/** Whether an answer may be offered first: it serves somebody, or where nobody named is asked about, more of the public. */
export function isWorthTaking(
  { served, of }: Pick<Effects, 'served' | 'of'>,
  share: number | undefined,
  shareNow: number | undefined,
): boolean {
  if (of > 0) return served > 0;
  return share !== undefined && share > (shareNow ?? 0);
}

/** What was tried, so that an answer stopped early and a full one can be told apart. */
export function triedWords(state: 'stopped' | 'done', { done, of }: Pick<Suggestion, 'done' | 'of'>): string {
  const choices = `${done} ${done === 1 ? 'choice' : 'choices'}`;
  return state === 'done'
    ? `Finished: ${choices} tried, and these are the best of them.`
    : `Stopped early after ${choices} of at most ${of}: these are the best of those tried, and there may be better ones.`;
}

/** The share of a crowd with an answer, and now. */
export function shareWords(then: number | undefined, now: number | undefined): string | undefined {
  if (then === undefined) return undefined;
  const before = now === undefined ? '' : `, now ${aboutInHundred(now)}`;
  return `${capital(aboutInHundred(then))}${before}`;
}

/** Which checks the share of the public counts, and which it leaves out and why. */
export function publicWords(
  { counted, unknown, metByNobody }: Pick<SearchTold, 'counted' | 'unknown' | 'metByNobody'>,
  checkOf: (ruleId: string) => string,
): string {
  const named = (ruleIds: readonly string[]) => joinWords(ruleIds.map(checkOf));
  const isNone = counted.length + unknown.length + metByNobody.length === 0;
  return [
    ...(unknown.length > 0
      ? [
          `No share is given: ${named(unknown)} cannot be told of these people, and these dimensions change it.`,
        ]
      : []),
    ...(counted.length > 0 && unknown.length === 0
      ? [countedWords({ passes: 'atLeastTight', checks: counted.map(checkOf), places: EVERY_PLACE })]
      : []),
    ...(metByNobody.length > 0
      ? [`Left out, for nobody was found to meet it in these ranges: ${named(metByNobody)}.`]
      : []),
    isNone
      ? 'None of these dimensions was found to change the share that meets a check.'
      : 'For every other check the share was the same wherever it was looked at: at present, at the ends of the ranges and half-way.',
  ].join(' ');
}

/** Who or what stands in the way of an answer that serves all, and what would help. */
export interface BlameWords {
  what: string;
  help: string[];
}

interface Ground {
  sheet: FitSheet;
  ruleBook: RuleBook;
  show: (mm: number) => string;
}

export function blameWords(blame: Blame, { sheet, ruleBook, show }: Ground): BlameWords {
  const left =
    blame.left === 0
      ? 'nothing would be missed'
      : `${blame.left} ${blame.left === 1 ? 'check' : 'checks'} would still be missed`;
  const rails = railWords(sheet, show);
  if (blame.kind === 'rule') {
    const who = sheet.rows.filter((row) => shortCells(row).some(({ ruleId }) => ruleId === blame.id));
    const names = joinWords(who.map(({ name }) => shortName(name)));
    return {
      what: `${ruleBook.rule(blame.id).columnName} is what stands most in the way${names ? `, for ${names}` : ''}: without it ${left}.`,
      help: [
        ...rails,
        `Let something move that ${checkWords(ruleBook, blame.id)} hangs on, or keep it with a note.`,
      ],
    };
  }
  const row = sheet.rows.find(({ sitterId }) => sitterId === blame.id);
  const name = row ? shortName(row.name) : 'One sitter';
  const unknown = row?.cells.some(
    ({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === 'notKnown',
  );
  return {
    what: `${name} is whom these dimensions serve least: without ${name} ${left}.`,
    help: [
      ...rails,
      ...(unknown ? [`Measure ${name}: some of the checks are not known.`] : []),
      `Seat ${name} elsewhere, where the numbers differ.`,
    ],
  };
}

/** "Give Hetty a foot rail 54 mm high": to whom the seat is too high. */
function railWords(sheet: FitSheet, show: (mm: number) => string): string[] {
  return footRails(sheet).map(
    ({ name, fitsMm }) =>
      `Give ${shortName(name)} a foot rail ${show(fitsMm)} high: the seat is too high by that.`,
  );
}

/** What the known differences will say of the choice not taken. */
export function differenceWords(moves: readonly Move[], style: LengthStyle): string {
  const kept = moves.map((move) => {
    const { subject: of, from, to } = moveWords(move, style);
    return `${of} kept at ${from} (suggested ${to})`;
  });
  return kept.length === 0 ? 'Dimensions kept as they are' : capital(joinWords(kept));
}

/** "about 4 seconds left"; nothing before it can be told. */
export function timeLeftWords(
  { done, of }: Pick<Suggestion, 'done' | 'of'>,
  seconds: number,
  knownAtStart: number,
): string {
  const tried = done - knownAtStart;
  if (tried < 20) return '';
  const left = Math.ceil((seconds / tried) * Math.max(0, of - done));
  if (left > 90) return `at most ${Math.ceil(left / 60)} minutes left`;
  return left <= 1 ? 'nearly done' : `at most ${left} seconds left`;
}
