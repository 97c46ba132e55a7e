import type { StudyShares } from '@settlewright/anthropometry';
import { measureSet } from '@settlewright/geometry';
import { useEffect, useMemo, useState } from 'react';
import { faultWords } from '@/lib/ask-worker.ts';
import { askCrowd } from '@/lib/crowd/ask-crowd.ts';
import type { CrowdRequest } from '@/lib/crowd/crowd-people.ts';
import type { CrowdTold } from '@/lib/crowd/crowd-tasks.ts';
import { useCrowdView } from './crowd-view.ts';

/** People who are drawn: good to about one in a hundred. */
const CROWD_PEOPLE = 20_000;
/** The slider is moved on in between: only where it rests is counted. */
const REST_MS = 150;

export type Shares = StudyShares & { told: CrowdTold };

interface Asked {
  crowd: CrowdRequest | undefined;
  /** Rules that count at once; all when absent. */
  ruleIds: readonly string[] | undefined;
}

/** Shares of the set as it stands; the last ones stay until new ones are counted. */
export function useShares({ crowd, ruleIds }: Asked): {
  shares?: Shares;
  isCounting: boolean;
  fault?: string;
} {
  const { document } = useCrowdView();
  const { lensHeightMm } = document.asked;
  const places = useMemo(() => measureSet(document).places, [document]);
  const [answer, setAnswer] = useState<{ key: string; shares?: Shares; fault?: string }>();
  const key = JSON.stringify([crowd?.populationId, crowd?.women, crowd?.own?.id, ruleIds, lensHeightMm]);
  const [counted, setCounted] = useState<unknown>();
  useEffect(() => {
    if (!crowd || places.length === 0) return undefined;
    let isWanted = true;
    const ticked = ruleIds ? { ruleIds } : {};
    const asked = { crowd, count: CROWD_PEOPLE, ticked, places, ...(lensHeightMm ? { lensHeightMm } : {}) };
    const rest = setTimeout(() => {
      askCrowd('shares', asked).then(
        (shares) => {
          if (!isWanted) return;
          setAnswer({ key, shares });
          setCounted(places);
        },
        (fault: unknown) => {
          if (isWanted) setAnswer({ key, fault: faultWords(fault) });
        },
      );
    }, REST_MS);
    return () => {
      isWanted = false;
      clearTimeout(rest);
    };
    // The key holds all of the crowd and the ticks.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [key, places]);
  return {
    ...(answer?.shares ? { shares: answer.shares } : {}),
    isCounting: answer?.key !== key || (counted !== places && answer.fault === undefined),
    ...(answer?.key === key && answer.fault !== undefined ? { fault: answer.fault } : {}),
  };
}
