import type { PlaceSituation } from '@settlewright/anthropometry';
import { toBody, toRoom as bodyToRoom } from '../mannequin/body-placement.ts';
import { readFigure, type Figure } from '../mannequin/figure.ts';
import type { MannequinPose } from '../mannequin/pose.ts';
import { restKnee } from '../mannequin/stance.ts';
import type { Vec3 } from '../parts/part.ts';
import { HIP_BEFORE_BACK_MM } from '../pieces/bench-layout.ts';
import type { PlaceFrame } from '../pieces/place-frames.ts';

/** A place with what it offers and whoever sits there, ready to be measured in the room. */
export interface SeatView {
  frame: PlaceFrame;
  situation: PlaceSituation;
  sitter: string;
  /** Seat under the hip, pressed by this sitter. */
  seatHipMm: number;
  /** Seat front, pressed by this sitter. */
  seatFrontMm: number;
  /** The sitter's measures and pose; `undefined` when they may not be seen. */
  body: { figure: Figure; pose: MannequinPose } | undefined;
  /** A point by distance to the sitter's left of the centreline, height above the floor and distance before the back. */
  at: (leftMm: number, heightMm: number, forwardMm: number) => Vec3;
  /** How far the rearmost buttock sits before the back. */
  slideMm: number;
}

/**
 * @param sinkMm - how far the seat goes down when no pose tells it
 */
export function seatView(
  frame: PlaceFrame,
  situation: PlaceSituation,
  sitter: string,
  pose: MannequinPose | undefined,
  sinkMm: number,
): SeatView {
  const [c, s] = [Math.cos(frame.facingRad), Math.sin(frame.facingRad)];
  const at = (left: number, height: number, forward: number): Vec3 => {
    const ahead = forward - HIP_BEFORE_BACK_MM;
    return [frame.hipMm[0] + left * c + ahead * s, height, frame.hipMm[2] - left * s + ahead * c];
  };
  const hipOnBody = pose ? toBody(pose.placement, frame.hipMm) : undefined;
  const sink = pose && hipOnBody ? hipOnBody[1] / Math.cos(pose.placement.tiltRad) : sinkMm;
  return {
    frame,
    situation,
    sitter,
    seatHipMm: frame.hipMm[1] - sink,
    seatFrontMm: frame.frontMm[1] - sink,
    body: pose ? { figure: readFigure(pose.means), pose } : undefined,
    at,
    slideMm: pose?.notes.find(({ kind }) => kind === 'slides-forward')?.valueMm ?? 0,
  };
}

/** A point of the sitter's own body in the room: to the left, over the pressed seat, before the rearmost buttock. */
export function onBody(view: SeatView, left: number, up: number, forward: number): Vec3 {
  const placement = view.body?.pose.placement;
  return placement
    ? bodyToRoom(placement, [left, up, forward])
    : view.at(left, view.seatHipMm + up, forward + view.slideMm);
}

/** Sideways distance of a knee from the sitter's midline. */
export const kneeAside = (figure: Figure): number => restKnee(figure)[0];
