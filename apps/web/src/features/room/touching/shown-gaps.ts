import type { JointEnvelope, SitterGap } from '@settlewright/geometry';
import { create } from 'zustand';

interface ShownGaps {
  /** What reaches into something, for as long as the list is open. */
  overlaps: readonly SitterGap[];
  /** The gap that is pointed at. */
  lit: SitterGap | undefined;
  /** What elbows and knees sweep, where it is asked for. */
  envelopes: readonly JointEnvelope[];
}

const NONE: ShownGaps = { overlaps: [], lit: undefined, envelopes: [] };

/** Gaps that the drawing shows as well. */
export const useShownGaps = create<ShownGaps>(() => NONE);

export const showGaps = (gaps: Partial<ShownGaps>): void => useShownGaps.setState(gaps);
export const hideGaps = (): void => useShownGaps.setState(NONE);
