import type { NextMeasureKey } from '@settlewright/anthropometry';
import type { Point } from '../../../paper/sheet';
import { SEAT_MM, type View } from './lay-figure';

/** Where a measure is taken on the figure: the dimension line, and what its ends are led from. */
export interface MeasuredLine {
  view: View;
  from: Point;
  to: Point;
  /** Points of the body that the ends of the line stand for, where they are not on it. */
  ends: readonly [Point | undefined, Point | undefined];
}

const upright = (view: View, x: number, y1: number, y2: number, from?: Point, to?: Point): MeasuredLine => ({
  view,
  from: [x, y1],
  to: [x, y2],
  ends: [from, to],
});

const level = (view: View, y: number, x1: number, x2: number, from?: Point, to?: Point): MeasuredLine => ({
  view,
  from: [x1, y],
  to: [x2, y],
  ends: [from, to],
});

const ON_SEAT: Point = [0, SEAT_MM];

/** From where to where each measure goes on the lay figure; absent for the weight, which no tape takes. */
export const MEASURED_LINES: Record<Exclude<NextMeasureKey, 'weight_kg'>, MeasuredLine> = {
  stature: upright('standing', 380, 0, 1705, undefined, [0, 1705]),
  sitting_height: upright('side', -150, SEAT_MM, 1300, ON_SEAT, [148, 1300]),
  eye_height_sitting: upright('side', -150, SEAT_MM, 1190, ON_SEAT, [222, 1190]),
  acromial_height_sitting: upright('side', -150, SEAT_MM, 1012, ON_SEAT, [118, 1012]),
  elbow_rest_height: upright('side-arm', -150, SEAT_MM, 660, ON_SEAT, [130, 660]),
  popliteal_height: upright('side', 450, 0, 413),
  knee_height_sitting: upright('side', 800, 0, 514, undefined, [540, 514]),
  buttock_popliteal_length: level('side', 250, 0, 490, [0, 440], [490, 440]),
  buttock_knee_length: level('side', 250, 0, 600, [0, 440], [600, 455]),
  thigh_clearance: upright('side', 660, SEAT_MM, 588, [400, SEAT_MM], [190, 588]),
  hip_breadth_sitting: level('front', 500, -190, 190),
  bideltoid_breadth: level('front', 915, -236, 236),
  forearm_forearm_breadth: level('front-arms', 700, -247, 247),
  abdominal_extension_depth_sitting: level('side', 650, 0, 250),
};
