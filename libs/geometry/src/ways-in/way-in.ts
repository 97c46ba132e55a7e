import type { Hold, Pose } from './room-around.ts';

/** How somebody goes. */
export type Move = 'walk' | 'sideways' | 'slide' | 'sit';

/** A stretch of the way, one kind of move. */
export interface WayStep {
  move: Move;
  poses: Pose[];
}

/** Where a way in has least room. */
export interface TightSpot extends Hold {
  move: 'stand' | 'slide';
  at: Pose;
}

/** The way in to one place. */
export interface WayIn {
  placeId: string;
  /** Where it comes from: the start of the set's route, or the open floor beside the set. */
  from: 'route' | 'open-floor';
  /** From the way in to the seat; empty where nothing leads there. */
  steps: WayStep[];
  /** Absent where there is open floor to both sides all the way. */
  tightest?: TightSpot;
  /** Whether the person gets through. */
  passes: boolean;
  /** Chairs that have to be taken out of the way. */
  chairs: { pieceId: string; mark: string }[];
  /** Who is in the way once seated, and what they can do about it. */
  past: { placeId: string; how: 'stands-up' | 'sits-later' }[];
}
