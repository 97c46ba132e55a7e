import { describe, expect, it } from 'vitest';
import { borderedField, diamondCloth, fieldButtons, tuftedCloth } from './tufting.ts';

const inch = (value: number): number => value * 25.4;
const size = (width: number, height: number) => ({ widthMm: inch(width), heightMm: inch(height) });
const inInches = ({ widthMm, heightMm }: { widthMm: number; heightMm: number }) =>
  [widthMm, heightMm].map((mm) => Number((mm / 25.4).toFixed(6)));

describe('published sums of tufting', () => {
  // Upholstery Journal, deep tufting: 42 x 31 top, border 4.
  it('fills 42 x 31 in within a border of 4 with 4 x 2 diamonds of 8 1/2 x 11 1/2', () => {
    const laid = borderedField(size(42, 31), inch(4), size(8, 12));
    expect([laid.across, laid.high]).toEqual([4, 2]);
    expect(inInches(laid.field)).toEqual([34, 23]);
    expect(inInches(laid.diamond)).toEqual([8.5, 11.5]);
    // The middle of the field is the middle of a diamond.
    const middle = [inch(17), inch(11.5)];
    const nearest = Math.min(
      ...fieldButtons(laid, 'diamond').map(([x, y]) => Math.hypot(x - middle[0]!, y - middle[1]!)),
    );
    expect(nearest).toBeLessThan(1e-6);
  });

  // Apartment Therapy: 2 in of foam, 8 x 5 in diamonds, 12 x 9 in of cloth.
  it('gives a diamond of 8 x 5 in on 2 in of foam 12 x 9 in of cloth', () => {
    expect(inInches(diamondCloth(size(8, 5), inch(2)))).toEqual([12, 9]);
  });

  // Stephenson, Cutting and Draping: 12 x 18 in takes 20 x 29 with 1 in all round.
  it('gives 12 x 18 in by the older rule 20 x 29 in of cloth', () => {
    const tufts = { across: 4, high: 3, foamMm: inch(2) };
    expect(inInches(tuftedCloth(size(12, 18), 'half-again', tufts))).toEqual([20, 29]);
    expect(inInches(tuftedCloth(size(32, 15), 'foam-thickness', tufts))).toEqual([48, 27]);
  });
});

describe('buttons of a field', () => {
  it('stand at the corners and middles of diamonds', () => {
    const laid = borderedField(size(38, 18), inch(4), size(10, 10));
    expect([laid.across, laid.high]).toEqual([3, 1]);
    const spots = fieldButtons(laid, 'diamond');
    expect(spots).toHaveLength(4 + 3 + 4);
    expect(spots.map(([x, y]) => [Math.round(x / 25.4), Math.round(y / 25.4)])).toEqual([
      [0, 0],
      [10, 0],
      [20, 0],
      [30, 0],
      [5, 5],
      [15, 5],
      [25, 5],
      [0, 10],
      [10, 10],
      [20, 10],
      [30, 10],
    ]);
    expect(fieldButtons(laid, 'biscuit')).toHaveLength(8);
  });

  it('are none where the border leaves no field', () => {
    const none = borderedField(size(7, 7), inch(4), size(3, 5));
    expect([none.across, none.high]).toEqual([0, 0]);
    expect(none.diamond).toEqual({ widthMm: 0, heightMm: 0 });
  });
});
