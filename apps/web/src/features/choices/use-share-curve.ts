import { useEffect, useState } from 'react';
import { askCrowd } from '@/lib/crowd/ask-crowd.ts';
import type { CrowdTold, CurveShare } from '@/lib/crowd/crowd-tasks.ts';
import type { CrowdRequest } from '@/lib/crowd/crowd-people.ts';
import { useChoices } from './choices-view.ts';
import { inSlices } from './in-slices.ts';
import { changingPlaces, measuredPlaces } from '@settlewright/geometry';
import type { TriedValues } from './tried-values.ts';

/** People who are asked: the answer is good to about one in a hundred. */
export const CROWD_COUNT = 10_000;
const MOST_POINTS = 49;

/** Shares along a dimension. */
export interface ShareCurves {
  /** Of the rules that are shown. */
  points: CurveShare[];
  /** Of every check of a person at once, everything else held. */
  joint: CurveShare[];
  told: CrowdTold;
  /** Places that the dimension changes: a person counts who fits at all of them. */
  placeIds: string[];
}

type Answer = { key: unknown; curves: ShareCurves } | { key: unknown; fault: string };

/** Asks a crowd along a dimension; `undefined` while it is counted. */
export function useShareCurves(
  tried: TriedValues | undefined,
  ruleIds: readonly string[] | undefined,
  crowd: CrowdRequest | undefined,
): { curves?: ShareCurves; fault?: string } {
  const { document } = useChoices();
  const { lensHeightMm } = document.asked;
  const [answer, setAnswer] = useState<Answer>();
  const key = `${ruleIds?.join(' ')} ${crowd?.populationId} ${crowd?.women} ${lensHeightMm}`;
  useEffect(() => {
    if (!tried || !ruleIds || !crowd) return undefined;
    const stop = new AbortController();
    const every = Math.ceil(tried.values.length / MOST_POINTS);
    const values = tried.values.filter((_, n) => n % every === 0 || n === tried.values.length - 1);
    const ask = async (): Promise<void> => {
      const along = await inSlices(
        measuredPlaces(values.map((value) => tried.dimension.at(value))),
        stop.signal,
      );
      if (!along) return;
      const asked = {
        crowd,
        count: CROWD_COUNT,
        values: values.filter((_, n) => (along[n] ?? []).length > 0),
        placesAt: along.filter((places) => places.length > 0),
        ...(lensHeightMm === undefined ? {} : { lensHeightMm }),
      };
      const placeIds = changingPlaces(along);
      if (placeIds.length === 0) return;
      const one = await askCrowd('curve', { ...asked, ticked: { ruleIds, placeIds } });
      const all = await askCrowd('curve', { ...asked, ticked: { placeIds } });
      const curves = { points: one.points, joint: all.points, told: one.told, placeIds };
      if (!stop.signal.aborted) setAnswer({ key, curves });
    };
    ask().catch((error: unknown) => {
      const fault = error instanceof Error ? error.message : 'The shares could not be counted.';
      if (!stop.signal.aborted) setAnswer({ key, fault });
    });
    return () => stop.abort();
    // Rules and crowd are in the key, whatever holds them.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [tried, key]);
  if (answer?.key !== key) return {};
  return 'fault' in answer ? { fault: answer.fault } : { curves: answer.curves };
}

/** Share at a value, between two counted ones by straight interpolation; `undefined` where it is not known. */
export function shareAt(points: readonly CurveShare[], value: number): number | undefined {
  const after = points.findIndex((point) => point.value >= value - 1e-6);
  if (after < 0) return undefined;
  const [a, b] = [points[Math.max(0, after - 1)], points[after]];
  if (a?.fits === undefined || b?.fits === undefined) return undefined;
  if (b.value === a.value || Math.abs(b.value - value) < 1e-6) return b.fits;
  return a.fits + ((value - a.value) / (b.value - a.value)) * (b.fits - a.fits);
}

/** Shares closer than this are said to be the same. */
const SAME = 0.005;

/** "25 more in 100", never "fewer people, 25 in 100". */
export function moreWords(from: number | undefined, to: number | undefined, than = ''): string | undefined {
  if (from === undefined || to === undefined) return undefined;
  const by = Math.round(to * 100) - Math.round(from * 100);
  if (Math.abs(to - from) < SAME || by === 0) return `about as many${than.replace(/^ than/, ' as')}`;
  return `about ${Math.abs(by)} ${by > 0 ? 'more' : 'fewer'} in 100${than}`;
}
