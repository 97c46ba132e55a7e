import { lengthStep, storyStick, type StoryStick } from '@settlewright/geometry';
import { useEffect, useState } from 'react';
import { useChoices } from './choices-view.ts';
import { inSlices } from './in-slices.ts';
import { triedValues, type TriedValues } from './tried-values.ts';
import { EVERY_CHECK } from './use-stick-address.ts';

interface Base {
  dimensionId: string;
  stepMm: number;
  check: unknown;
  document: unknown;
  tried: TriedValues | undefined;
}

/** The sets along a dimension, kept while the set only moves along it, so that the tape does not slide away. */
export function useTriedValues(dimensionId: string): TriedValues | undefined {
  const { document, check, style } = useChoices();
  const stepMm = lengthStep(style);
  const make = (): Base => ({
    dimensionId,
    stepMm,
    check,
    document,
    tried: triedValues(document, dimensionId, stepMm),
  });
  const [base, setBase] = useState(make);
  const stands =
    base.dimensionId === dimensionId &&
    base.stepMm === stepMm &&
    base.check === check &&
    (base.tried ? base.tried.valueOf(document) !== undefined : base.document === document);
  if (stands) return base.tried;
  const next = make();
  setBase(next);
  return next.tried;
}

export interface StickProgress {
  /** The last finished stick of this dimension and rule. */
  stick: StoryStick | undefined;
  /** 0 to 1. */
  done: number;
}

interface Finished {
  stick: StoryStick;
  dimensionId: string;
  ruleId: string;
}

/** Finds the bands of everybody, a few milliseconds at a time. */
export function useStick(tried: TriedValues | undefined, ruleId: string): StickProgress {
  const { check } = useChoices();
  const [finished, setFinished] = useState<Finished>();
  const [done, setDone] = useState(0);
  useEffect(() => {
    if (!tried) return undefined;
    const stop = new AbortController();
    const { dimension, values } = tried;
    const steps = storyStick({ dimension, values, check, ...(ruleId === EVERY_CHECK ? {} : { ruleId }) });
    void inSlices(steps, stop.signal, (count) => setDone(count / values.length)).then((stick) => {
      if (stick) setFinished({ stick, dimensionId: dimension.id, ruleId });
      setDone(0);
    });
    return () => stop.abort();
  }, [tried, check, ruleId]);
  const current = finished?.dimensionId === tried?.dimension.id && finished?.ruleId === ruleId;
  return { stick: current ? finished?.stick : undefined, done };
}
