import { orderedRows, type SetDocument, type StickRow, type StoryStick } from '@settlewright/geometry';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { exactValue } from '@/lib/dimension-words.ts';
import { answerAt, type Answer } from './answers.ts';
import { useChoices } from './choices-view.ts';
import { bestOffer, type Offer } from './offer.ts';
import type { TriedValues } from './tried-values.ts';
import { EVERY_CHECK } from './use-stick-address.ts';

export interface StickValues {
  rows: StickRow[];
  ruleIds: ReadonlySet<string>;
  /** Where the set stands. */
  present: number;
  /** The value under the hand, not written yet; absent where the set stands. */
  trying: number | undefined;
  /** Where the plumb line hangs. */
  shown: number;
  /** What serves most by every check; its value may be the present one. */
  offer: Offer | undefined;
  /** The offered value where it is another one than the present. */
  suggested: number | undefined;
  answersAt: (value: number) => (Answer | undefined)[];
  move: (value: number) => void;
  /** The set follows the plumb line, as one step. */
  settle: () => void;
  leave: () => void;
}

/** Values closer than this are one. */
const SAME = 1e-6;

/** The values of a stick, and the one under the hand. */
export function useStickValues(tried: TriedValues, stick: StoryStick, rule: string): StickValues {
  const { document, check, replace, style } = useChoices();
  const { dimension } = tried;
  const present = tried.valueOf(document) ?? dimension.value;
  // A value is tried on one set: when that changes otherwise, as by undo, the trial is over.
  const [trial, setTrial] = useState<{ value: number; on: SetDocument }>();
  const held = trial?.on === document ? trial.value : present;
  const trying = Math.abs(held - present) < SAME ? undefined : held;
  const rows = useMemo(() => orderedRows(stick.rows), [stick]);
  const ruleIds = useMemo<ReadonlySet<string>>(
    () => new Set(rule === EVERY_CHECK ? stick.ruleIds : [rule]),
    [stick, rule],
  );
  const offer = useMemo(() => bestOffer(stick, present), [stick, present]);
  const answersAt = useCallback(
    (value: number) => {
      const set = dimension.at(value);
      const sheet = set && check(set);
      return rows.map(({ placeId }) => answerAt(sheet, placeId, ruleIds));
    },
    [dimension, check, rows, ruleIds],
  );
  const write = useRef(() => undefined as void);
  useEffect(() => {
    write.current = () => {
      setTrial(undefined);
      const set = trying === undefined ? undefined : dimension.at(trying);
      if (!replace || !set || trying === undefined) return;
      const show = (value: number) => exactValue(value, dimension.unit, style);
      replace(set, `${dimension.label} ${show(present)} to ${show(trying)}`);
    };
  });
  return {
    rows,
    ruleIds,
    present,
    trying,
    shown: trying ?? present,
    offer,
    suggested: offer && Math.abs(offer.value - present) > SAME ? offer.value : undefined,
    answersAt,
    move: (value) => {
      if (dimension.at(value)) setTrial({ value, on: document });
    },
    settle: useCallback(() => write.current(), []),
    leave: useCallback(() => setTrial(undefined), []),
  };
}
