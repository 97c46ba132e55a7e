import type { LeafEdge } from '../pieces/table-leaves.ts';
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
  /** Where it comes from: the set's entrance, the start of its route, or the open floor beside the set. */
  from: 'entrance' | 'route' | 'open-floor';
  /** From the way in to the seat; empty where nothing leads there. */
  steps: WayStep[];
  /** Absent where there is open floor to both sides all the way. */
  tightest?: TightSpot;
  /** Whether the person gets through. */
  passes: boolean;
  /** Chairs that have to be taken out of the way. */
  chairs: { pieceId: string; mark: string }[];
  /** Leaves of tables that have to be dropped (`down`) or lifted. */
  leaves: { pieceId: string; mark: string; edge: LeafEdge; down: boolean }[];
  /** Who is in the way once seated, and what they can do about it. */
  past: { placeId: string; how: 'stands-up' | 'sits-later' }[];
  /** A narrower way that leads past fewer people, where the widest one leads past some. */
  freer?: FreerWay;
}

/** A way with less room that disturbs fewer people. */
export interface FreerWay {
  steps: WayStep[];
  tightest?: TightSpot;
  /** Whom it still leads past. */
  past: string[];
  /** Whom the widest way leads past. */
  insteadOf: string[];
}
