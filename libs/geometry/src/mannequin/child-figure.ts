import type { ChildSizeMark, MeasureKey } from '@settlewright/anthropometry';
import { FIGURE_KEYS, type FigureMeans } from './figure.ts';

/** A child to be drawn for scale: which measures are children's and which are only borrowed. */
export interface ChildFigure {
  means: FigureMeans;
  /** From the size mark: estimates of children. */
  estimated: MeasureKey[];
  /** Shares of stature of a grown-up, so that there is something to draw; nothing may be checked on them. */
  borrowed: MeasureKey[];
}

/**
 * The middle child of a size mark, to be drawn for scale and never checked.
 *
 * Stature and lower leg are the mark's. Every other measure is not known
 * of children here, and is a grown-up's share of stature: `borrowed` says so, and whoever draws the body must too.
 *
 * @param mark - from `readChildren`
 * @param shoeWithinMm - shoe that the mark's lower legs hold, mm
 * @param adult - measures of a grown-up, mm and kg
 * @returns measures in millimetres
 * @throws RangeError when the grown-up has no stature
 * @source EN 1729-1 size marks (middles of the printed ranges); the rest borrowed
 */
export function childFigure(mark: ChildSizeMark, shoeWithinMm: number, adult: FigureMeans): ChildFigure {
  const tall = adult.stature;
  if (tall === undefined || !(tall > 0)) {
    throw new RangeError(`stature: read ${String(tall)}; a grown-up's height in millimetres is needed`);
  }
  const middle = ([low, high]: readonly [number, number]): number => (low + high) / 2;
  const stature = middle(mark.statureMm);
  const popliteal = middle(mark.poplitealWithShoesMm) - shoeWithinMm;
  const share = stature / tall;
  const means: FigureMeans = {};
  const borrowed: MeasureKey[] = [];
  for (const key of FIGURE_KEYS) {
    const value = adult[key];
    if (value === undefined || key === 'stature' || key === 'popliteal_height') continue;
    means[key] = value * (key === 'weight_kg' ? share ** 3 : share);
    borrowed.push(key);
  }
  const kneeOverSeat = (adult.knee_height_sitting ?? 0) - (adult.popliteal_height ?? 0);
  if (kneeOverSeat > 0) means.knee_height_sitting = popliteal + kneeOverSeat * share;
  return {
    means: { ...means, stature, popliteal_height: popliteal },
    estimated: ['stature', 'popliteal_height'],
    borrowed,
  };
}
