import { dimensionOf, lengthStep, type Dimension } from '@settlewright/geometry';
import { useEffect, useMemo, useState } from 'react';
import { faultWords } from '@/lib/ask-worker.ts';
import { askCrowd } from '@/lib/crowd/ask-crowd.ts';
import type { CrowdRequest } from '@/lib/crowd/crowd-people.ts';
import { castMap, gridValues, type CastMap } from '@settlewright/geometry';
import { useChoices } from './choices-view.ts';
import { inSlices } from './in-slices.ts';
import { changingPlaces } from '@settlewright/geometry';
import { type TriedValues } from './tried-values.ts';
import { dimensionStep } from '@/lib/dimension-words.ts';

/** Fewer than for a curve: the map is shaded in broad tones. */
const MAP_COUNT = 4000;

export interface MapProgress {
  second: Dimension | undefined;
  map: CastMap | undefined;
  /** Joint share at each point; `undefined` while it is counted. */
  shares: (number | null)[][] | undefined;
  /** 0 to 1. */
  done: number;
  fault: string | undefined;
}

/** Tries two dimensions against each other, and then counts the public over both. */
export function useCastMap(
  tried: TriedValues,
  secondId: string | undefined,
  crowd: CrowdRequest | undefined,
  everyCheck: boolean,
): MapProgress {
  const { document, check, ruleBook, style } = useChoices();
  const { dimension: first } = tried;
  const { lensHeightMm } = document.asked;
  // From the same set as the first dimension, so that a move along that one changes nothing here.
  const second = useMemo(() => {
    const base = first.at(first.value);
    return base && secondId ? dimensionOf(base, secondId) : undefined;
  }, [first, secondId]);
  const stepMm = lengthStep(style);
  const [found, setFound] = useState<{ second: Dimension; everyCheck: boolean; map: CastMap }>();
  const [counted, setCounted] = useState<{
    key: string;
    map: CastMap;
    shares?: (number | null)[][];
    fault?: string;
  }>();
  const [done, setDone] = useState(0);

  useEffect(() => {
    if (!second) return undefined;
    const stop = new AbortController();
    const across = gridValues(first, dimensionStep(first.unit, stepMm));
    const up = gridValues(second, dimensionStep(second.unit, stepMm));
    const documentAt = (x: number, y: number) => {
      const moved = first.at(x);
      return moved && second.at(y, moved);
    };
    const own = [first.ruleId, second.ruleId].filter((id) => ruleBook.rule(id).scope === 'person');
    const shown = everyCheck || own.length === 0 ? undefined : new Set(own);
    const steps = castMap({ across, up, documentAt, check, shown });
    void inSlices(steps, stop.signal, (tries) => setDone(tries / (across.length * up.length))).then((map) => {
      if (map) setFound({ second, everyCheck, map });
      setDone(0);
    });
    return () => stop.abort();
  }, [first, second, stepMm, check, ruleBook, everyCheck]);

  const stands = second !== undefined && found?.second === second && found.everyCheck === everyCheck;
  const map = stands ? found.map : undefined;
  const key = `${crowd?.populationId} ${crowd?.women} ${lensHeightMm}`;
  useEffect(() => {
    if (!map || !crowd) return undefined;
    let current = true;
    const { across, up, placesAt, ruleIds } = map;
    const placeIds = changingPlaces(placesAt.flat());
    if (placeIds.length === 0) return undefined;
    askCrowd('map', {
      crowd,
      count: MAP_COUNT,
      ticked: { placeIds, ruleIds },
      across,
      up,
      placesAt,
      ...(lensHeightMm === undefined ? {} : { lensHeightMm }),
    }).then(
      ({ fits }) => current && setCounted({ key, map, shares: fits }),
      (error: unknown) => current && setCounted({ key, map, fault: faultWords(error) }),
    );
    return () => {
      current = false;
    };
  }, [map, key, crowd, lensHeightMm]);

  const current = counted && counted.map === map && counted.key === key ? counted : undefined;
  return { second, map, shares: current?.shares, done, fault: current?.fault };
}
