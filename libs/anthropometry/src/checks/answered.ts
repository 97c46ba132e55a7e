import { best } from './amount.ts';
import type { Outcome, Verdict, VerdictOutcome } from './fit-sheet.ts';
import type { Answer, Said } from './person-check.ts';
import type { PlaceSituation } from './situation.ts';
import { find, writeOut, type Judgement } from './verdict.ts';

/** Worst first: what is not known is never better than tight. */
export const WORST_FIRST: readonly Verdict[] = ['wontFit', 'notKnown', 'tight', 'fits'];

/** What a cell says, and the pieces and the hand it says it of. */
export interface Answered {
  outcome: Outcome;
  pieces: { pieceId: string; mark: string }[];
  side?: 'left' | 'right';
}

/** Judges what a rule said; of several answers the one with the least room stands. */
export function answered(said: Said, judgement: Judgement): Answered {
  if ('reason' in said) {
    const { kind = 'doesNotApply', reason } = said;
    return { outcome: { kind, reason }, pieces: [] };
  }
  if ('information' in said) {
    const { value, words } = said.information;
    return { outcome: { kind: 'information', value: best(value), words }, pieces: [] };
  }
  const [{ answer, finding }] = worstFirst(said, judgement);
  const { question, pieces = [], side } = answer;
  return {
    outcome: writeOut(question, finding, judgement),
    pieces,
    ...(side ? { side } : {}),
  };
}

/** One thing a rule looked at and what was found. */
export interface Found {
  answer: Answer;
  finding: ReturnType<typeof find>;
}

/** At least one answer, the worst first. */
export function worstFirst(answers: readonly Answer[], judgement: Judgement): [Found, ...Found[]] {
  const found = answers.map((answer): Found => ({ answer, finding: find(answer.question, judgement) }));
  found.sort((a, b) => (isWorse(a.finding, b.finding) ? -1 : isWorse(b.finding, a.finding) ? 1 : 0));
  return found as [Found, ...Found[]];
}

type Ranked = Pick<VerdictOutcome, 'verdict' | 'margin'>;

/** Whether one answer is worse than another: by its word, and of one word by the room. */
export function isWorse(a: Ranked, b: Ranked): boolean {
  const rank = WORST_FIRST.indexOf(a.verdict) - WORST_FIRST.indexOf(b.verdict);
  return rank === 0 ? a.margin < b.margin : rank < 0;
}

/** The pieces of a cell: the one sat on, and others the answer is about. */
export function cellPieces(
  place: PlaceSituation | undefined,
  others: readonly { pieceId: string; mark: string }[],
): { pieceIds: string[]; marks: string[] } {
  const pieces = place ? [{ pieceId: place.pieceId, mark: place.mark }, ...others] : others;
  return { pieceIds: pieces.map(({ pieceId }) => pieceId), marks: pieces.map(({ mark }) => mark) };
}
