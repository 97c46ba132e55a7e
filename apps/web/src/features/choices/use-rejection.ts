import type { Rejection } from '@settlewright/anthropometry';
import { measureSet } from '@settlewright/geometry';
import { useEffect, useState } from 'react';
import { askCrowd } from '@/lib/crowd/ask-crowd.ts';
import type { CrowdRequest } from '@/lib/crowd/crowd-people.ts';
import { useChoices } from './choices-view.ts';
import { CROWD_COUNT, type ShareCurves } from './use-share-curve.ts';

/** The check that turns most of the public away in the set as it stands; it says why the joint share is small. */
export function useRejection(
  curves: ShareCurves | undefined,
  crowd: CrowdRequest | undefined,
): Rejection | undefined {
  const { document } = useChoices();
  const [found, setFound] = useState<{ document: unknown; rejection: Rejection | undefined }>();
  useEffect(() => {
    if (!curves || !crowd) return undefined;
    let current = true;
    const { lensHeightMm } = document.asked;
    askCrowd('shares', {
      crowd,
      count: CROWD_COUNT,
      places: measureSet(document).places,
      ticked: { placeIds: curves.placeIds },
      ...(lensHeightMm === undefined ? {} : { lensHeightMm }),
    }).then(
      ({ rejectsMost }) => current && setFound({ document, rejection: rejectsMost }),
      // The curve has said what went wrong.
      () => undefined,
    );
    return () => {
      current = false;
    };
  }, [curves, crowd, document]);
  return found?.document === document ? found.rejection : undefined;
}
