import { describe, expect, it } from 'vitest';
import { ruleBook } from '../../test/seed.ts';
import { lensHeightMm, places as mixed, soldiers, wear } from '../../test/study-people.ts';
import { UNCALIBRATED } from '../checks/sink-band.ts';
import type { PlaceSituation, SinkCalibration } from '../checks/situation.ts';
import { mergePartials } from './counts.ts';
import { placesAtDrop } from './drop-ends.ts';
import { sharesOf, type ShareOutcome, type StudyShares } from './shares.ts';
import { createStudy } from './study.ts';

/** Every place on a cushion that nobody tried. */
const places = mixed.map((place): PlaceSituation => ({
  ...place,
  foam: { thicknessMm: 90, ifd25N: 150, supportFactor: 2.2 },
}));
const setup = { places, ruleBook, wear, lensHeightMm };
const people = soldiers.draw(400, 3);
const OVER = { overDrop: true };

const tried = (tested: SinkCalibration): PlaceSituation[] =>
  places.map((place) => ({ ...place, foam: { ...place.foam!, tested } }));
const hard = places.map((place): PlaceSituation => ({ ...place, foam: undefined }));

function sharesIn(outcome: ShareOutcome) {
  if (outcome.kind !== 'shares') throw new Error(outcome.kind);
  return outcome;
}
/** Shares of all, of each rule and of each place, that say something. */
const told = ({ all, checks, places: at }: StudyShares) =>
  [all, ...checks.map(({ outcome }) => outcome), ...at.map(({ outcome }) => outcome)].filter(
    (outcome) => outcome.kind === 'shares',
  );

describe('shares over the range of a drop', () => {
  it('are those of seats that go down least, as is best known, and most', () => {
    const over = told(createStudy(people, setup).shares(OVER));
    const { error } = UNCALIBRATED;
    const [least, most] = [1 - error, 1 + error].map((factor) =>
      told(createStudy(people, { ...setup, places: tried({ ...UNCALIBRATED, factor }) }).shares()),
    ) as [ShareOutcome[], ShareOutcome[]];
    expect(over.some(({ overDrop }) => overDrop)).toBe(true);
    over.forEach(({ fits, atLeastTight, overDrop }, n) => {
      const [a, b] = [sharesIn(least[n]!), sharesIn(most[n]!)];
      const fitting = [a.fits.mixed.value, fits.mixed.value, b.fits.mixed.value];
      const tight = [a, { atLeastTight }, b].map((one) => one.atLeastTight.mixed.value);
      const [span, tightSpan] = overDrop
        ? [overDrop.fits, overDrop.atLeastTight]
        : [
            { low: fits.mixed.value, high: fits.mixed.value },
            { low: atLeastTight.mixed.value, high: atLeastTight.mixed.value },
          ];
      expect(span.low).toBeCloseTo(Math.min(...fitting), 12);
      expect(span.high).toBeCloseTo(Math.max(...fitting), 12);
      expect(tightSpan.low).toBeCloseTo(Math.min(...tight), 12);
      expect(tightSpan.high).toBeCloseTo(Math.max(...tight), 12);
    });
  });

  it('are narrower where test sits were taken', () => {
    const widthOf = (at: readonly PlaceSituation[]) => {
      const { overDrop } = sharesIn(
        createStudy(people, { ...setup, places: at, ticked: { ruleIds: ['SEAT-02'] } }).shares(OVER).all,
      );
      return overDrop ? overDrop.fits.high - overDrop.fits.low : 0;
    };
    const often = widthOf(tried({ factor: 1, error: 0.1, sits: 8 }));
    expect(often).toBeLessThan(widthOf(places));
  });

  it('leave what is best known as it is, and are told only where somebody sits on foam and where it matters', () => {
    const study = createStudy(people, setup);
    const { overDrop, ...plain } = study.partial(0, OVER);
    expect(overDrop).toBeDefined();
    expect(study.partial()).toEqual(plain);
    expect(createStudy(people, { ...setup, places: hard }).partial(0, OVER)).not.toHaveProperty('overDrop');
    const width = createStudy(people, { ...setup, ticked: { ruleIds: ['SEAT-05'] } }).shares(OVER);
    expect(sharesIn(width.all)).not.toHaveProperty('overDrop');
  });

  it('add up over blocks, and are left out where a block was counted without', () => {
    const blocks = [0, 1].map((n) => createStudy(soldiers.draw(200, 5, n), setup));
    const over = blocks.map((study, n) => study.partial(n, OVER));
    const whole = mergePartials(over);
    expect(whole.overDrop!.most.all.fits.men).toBe(
      over[0]!.overDrop!.most.all.fits.men + over[1]!.overDrop!.most.all.fits.men,
    );
    const partly = mergePartials([over[0]!, blocks[1]!.partial(1)]);
    expect(partly).not.toHaveProperty('overDrop');
    expect(sharesOf(partly).all).toEqual(sharesOf(mergePartials(blocks.map((b, n) => b.partial(n)))).all);
  });

  it('move the factor alone, of seats with foam alone', () => {
    expect(placesAtDrop(hard, 'least')).toEqual(hard);
    expect(placesAtDrop(places, 'most')[0]!.foam).toEqual({
      ...places[0]!.foam,
      tested: { ...UNCALIBRATED, factor: 1.3 },
    });
  });
});
