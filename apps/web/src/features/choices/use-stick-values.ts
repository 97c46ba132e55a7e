import { orderedRows, type StickRow, type StoryStick } from '@settlewright/geometry';
import { useCallback, useMemo, useState } from 'react';
import { exactValue } from '@/lib/dimension-words.ts';
import { answerAt, type Answer } from './answers.ts';
import { useChoices } from './choices-view.ts';
import { bestValue } from './suggestion.ts';
import type { TriedValues } from './tried-values.ts';
import { EVERY_CHECK } from './use-stick-address.ts';

export interface StickValues {
  rows: StickRow[];
  ruleIds: ReadonlySet<string>;
  /** Where the set stands. */
  present: number;
  /** Where the plumb line hangs: the present value, or the one under the hand. */
  shown: number;
  suggested: number | undefined;
  answersAt: (value: number) => (Answer | undefined)[];
  move: (value: number) => void;
  /** The set follows the plumb line, as one step. */
  settle: () => void;
  leave: () => void;
}

/** The values of a stick, and the one under the hand. */
export function useStickValues(tried: TriedValues, stick: StoryStick, rule: string): StickValues {
  const { document, check, replace, style } = useChoices();
  const { dimension } = tried;
  const present = tried.valueOf(document) ?? dimension.value;
  const [trial, setTrial] = useState<number>();
  const rows = useMemo(() => orderedRows(stick.rows), [stick]);
  const ruleIds = useMemo<ReadonlySet<string>>(
    () => new Set(rule === EVERY_CHECK ? stick.ruleIds : [rule]),
    [stick, rule],
  );
  const suggested = useMemo(() => {
    const best = bestValue(stick, present);
    return best && Math.abs(best.value - present) > 1e-6 ? best.value : undefined;
  }, [stick, present]);
  const answersAt = useCallback(
    (value: number) => {
      const set = dimension.at(value);
      const sheet = set && check(set);
      return rows.map(({ placeId }) => answerAt(sheet, placeId, ruleIds));
    },
    [dimension, check, rows, ruleIds],
  );
  const shown = trial ?? present;
  return {
    rows,
    ruleIds,
    present,
    shown,
    suggested,
    answersAt,
    move: (value) => {
      if (dimension.at(value)) setTrial(value);
    },
    settle: () => {
      setTrial(undefined);
      const set = dimension.at(shown);
      if (!replace || !set || Math.abs(shown - present) < 1e-6) return;
      const show = (value: number) => exactValue(value, dimension.unit, style);
      replace(set, `${dimension.label} ${show(present)} to ${show(shown)}`);
    },
    leave: () => setTrial(undefined),
  };
}
