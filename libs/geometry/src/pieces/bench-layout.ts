import type { PieceOf } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import { cushionHeightMm } from './foam-situation.ts';
import { pressedSeatHeightMm, unpressedSeatTopMm } from './seat-sink.ts';

/** Thickness of the deck panel and of the other panels of a bench base, millimetres. */
export const PANEL_MM = 18;

/** Hip point of the sitting rules: this far before the back, millimetres. */
export const HIP_BEFORE_BACK_MM = 135;

/** The lines a bench is built on, in its own frame; z runs from the rear face of the back to the front. */
export interface BenchLayout {
  tiltRad: number;
  leanRad: number;
  hasBack: boolean;
  pressedTopMm: number;
  /** Unpressed seat top at the front edge. */
  seatTopFrontMm: number;
  /** Unpressed seat top at the face of the back. */
  seatTopRearMm: number;
  /** Top of the back above the floor. */
  backTopMm: number;
  /** Face of the unpressed back cushion at the seat. */
  faceZMm: number;
  frontZMm: number;
  /** Upper front edge of the deck. */
  deckFrontYMm: number;
  deckFrontZMm: number;
  /** Rear panel behind the back. */
  rearPanelMm: number;
  /** Thickness of the back boards, square to their face. */
  backBoardMm: number;
  riserFrontZMm: number;
  kickFrontZMm: number;
  hasKick: boolean;
  /** Between the end walls or arms, along x. */
  innerLeftMm: number;
  innerRightMm: number;
  /** The stretch the cushions lie on. */
  cushionLeftMm: number;
  cushionRightMm: number;
  /** Upper face of the deck at a depth. */
  deckTopAt(zMm: number): number;
  /** Lower face of the deck at a depth. */
  deckUndersideAt(zMm: number): number;
}

/**
 * Works out the lines of a bench from its parameters.
 *
 * @param bench - the bench
 * @returns heights above the floor and depths before the rear face of the back, millimetres
 */
export function benchLayout(bench: PieceOf<'bench'>): BenchLayout {
  const tiltRad = radians(bench.seatTiltDeg);
  const leanRad = radians(bench.backLeanDeg);
  const hasBack = bench.backHeightMm > 0;
  const tilt = Math.tan(tiltRad);
  const lean = Math.tan(leanRad);
  const pressedTopMm = pressedSeatHeightMm(bench);
  const seatTopFrontMm = unpressedSeatTopMm(bench);
  const cushionMm = cushionHeightMm(bench.seatCushion);
  const seatTopRearMm = seatTopFrontMm - bench.seatDepthMm * tilt;
  const backTopMm = pressedTopMm + bench.backHeightMm;
  const faceZMm = hasBack
    ? bench.backThicknessMm +
      Math.max(0, backTopMm - seatTopRearMm) * lean +
      cushionHeightMm(bench.backCushion) / Math.cos(leanRad)
    : 0;
  const frontZMm = faceZMm + bench.seatDepthMm;
  const deckFrontYMm = seatTopFrontMm - cushionMm * Math.cos(tiltRad);
  const deckFrontZMm = frontZMm + cushionMm * Math.sin(tiltRad);
  const rearPanelMm = hasBack ? Math.min(6, bench.backThicknessMm * 0.2) : 0;
  const riserFrontZMm = frontZMm - bench.lipMm;
  const hasKick = bench.base === 'box' && bench.kick.depthMm > 0 && bench.kick.heightMm > 0;
  const deepest = rearPanelMm + 3 * PANEL_MM;
  const { left, right } = bench.ends;
  const innerLeftMm = -bench.lengthMm / 2 + (left.kind === 'open' ? 0 : left.thicknessMm);
  const innerRightMm = bench.lengthMm / 2 - (right.kind === 'open' ? 0 : right.thicknessMm);
  const deckTopAt = (zMm: number) => deckFrontYMm - (deckFrontZMm - zMm) * tilt;
  return {
    tiltRad,
    leanRad,
    hasBack,
    pressedTopMm,
    seatTopFrontMm,
    seatTopRearMm,
    backTopMm,
    faceZMm,
    frontZMm,
    deckFrontYMm,
    deckFrontZMm,
    rearPanelMm,
    backBoardMm: Math.min(PANEL_MM, bench.backThicknessMm * 0.5),
    riserFrontZMm,
    kickFrontZMm: hasKick ? Math.max(riserFrontZMm - bench.kick.depthMm, deepest) : riserFrontZMm,
    hasKick,
    innerLeftMm,
    innerRightMm,
    cushionLeftMm: innerLeftMm + (left.kind === 'open' ? left.thicknessMm : 0),
    cushionRightMm: innerRightMm - (right.kind === 'open' ? right.thicknessMm : 0),
    deckTopAt,
    deckUndersideAt: (zMm: number) => deckTopAt(zMm) - PANEL_MM / Math.cos(tiltRad),
  };
}
