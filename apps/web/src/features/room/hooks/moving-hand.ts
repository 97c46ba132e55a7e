import type { LetterCamera } from '@settlewright/geometry';
import { createRest } from '../rest.ts';

/** What the hand did to a lettered view. */
export interface Hand {
  zoom: number;
  panMm: readonly [number, number];
  azimuth: number;
  elevation: number;
}

export const START: Hand = { zoom: 1, panMm: [0, 0], azimuth: 0.62, elevation: 0.38 };

export const handOf = ({ zoom, panMm, azimuthDeg, elevationDeg }: LetterCamera): Hand => ({
  zoom,
  panMm,
  azimuth: (azimuthDeg * Math.PI) / 180,
  elevation: (elevationDeg * Math.PI) / 180,
});

/** The hand while it moves the sheet: the page learns of it when it rests. */
export function createMovingHand(settle: (hand: Hand) => void) {
  let hand = START;
  const resting = createRest(() => settle(hand));
  return {
    now: () => hand,
    move: (next: Hand) => {
      hand = next;
      resting.go();
    },
    stand: (next: Hand) => {
      hand = next;
      resting.stop();
    },
    stop: resting.stop,
  };
}
