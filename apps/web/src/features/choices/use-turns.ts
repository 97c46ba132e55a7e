import { useState } from 'react';
import type { Answer } from './answers.ts';

/** How often the verdict of each row has turned; the same list while none turns. */
export function useTurns(answers: readonly (Answer | undefined)[]): readonly number[] {
  const verdicts = answers.map((answer) => answer?.outcome.verdict);
  const [seen, setSeen] = useState({ verdicts, turns: verdicts.map(() => 0) });
  const turned = verdicts.map((verdict, n) => verdict !== seen.verdicts[n]);
  if (verdicts.length === seen.verdicts.length && !turned.includes(true)) return seen.turns;
  const isSamePeople = verdicts.length === seen.verdicts.length;
  const turns = verdicts.map((_, n) => (isSamePeople ? (seen.turns[n] ?? 0) + Number(turned[n]) : 0));
  setSeen({ verdicts, turns });
  return turns;
}
