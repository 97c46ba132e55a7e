import type { FitSheet, RuleBook } from '@settlewright/anthropometry';
import { isLoss, sheetChanges, type BestPair, type CellChange, type CellState } from '@settlewright/geometry';
import { joinWords } from '@/lib/dimension-words.ts';
import { checkName, whoIn } from './effects.ts';

/** A pair of values, and whom it costs a verdict by any check. */
export interface PricedPair extends BestPair {
  /** Whom it turns away who is at least tight now: "Marcus, thigh room"; empty when nobody. */
  costs: string[];
  /** How many people and pieces those are. */
  turnedAway: number;
  /** Other verdicts that turn worse. */
  lesser: number;
}

/** Pairs with whom they cost, those that turn the fewest people away first. */
export function pricedPairs(
  pairs: readonly BestPair[],
  before: FitSheet,
  sheetAt: (pair: BestPair) => FitSheet | undefined,
  ruleBook: RuleBook,
): PricedPair[] {
  const whoOf = whoIn(before);
  return pairs
    .flatMap((pair): PricedPair[] => {
      const after = sheetAt(pair);
      if (!after) return [];
      const losses = sheetChanges(before, after).filter(isLoss);
      const away = losses.filter(isAway);
      const byWho = new Map<string, string[]>();
      for (const change of away) {
        const who = whoOf(change);
        byWho.set(who, [...(byWho.get(who) ?? []), checkName(change, ruleBook)]);
      }
      return [
        {
          ...pair,
          costs: [...byWho].map(([who, checks]) => `${who}, ${joinWords(checks)}`),
          turnedAway: byWho.size,
          lesser: losses.length - away.length,
        },
      ];
    })
    .sort((a, b) => a.turnedAway - b.turnedAway);
}

const MET: readonly CellState[] = ['fits', 'tight', 'inside'];

const isAway = ({ from, to }: CellChange): boolean => MET.includes(from) && !MET.includes(to);
