import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { dimensionsOf } from '@settlewright/geometry';
import { effectsOf, type Effects } from '../effects.ts';
import { SuggestContext } from '../suggest-view.ts';
import { bay, check, INCHES, ruleBook, sitters } from '../test/show-suggest.tsx';
import { AnswerSection } from './answer-section.tsx';

const dimensions = dimensionsOf(bay);
const height = dimensions.find(({ id }) => id === 'seat-height');
if (!height) throw new Error('The bay has no seat height.');
const ids = new Set(sitters.map(({ id }) => id));
const lower = effectsOf(
  { values: [height.value - 25] },
  {
    document: bay,
    dimensions,
    free: [{ dimensionId: height.id, min: height.min, max: height.max, step: 3.175 }],
    check,
    ruleBook,
    people: ids,
    toServe: ids,
  },
);
if (!lower) throw new Error('The seats cannot be lower.');

function show(effects: Effects, shares: { share?: number; shareNow?: number } = {}) {
  const view = {
    setId: 'set-1',
    setName: 'Dining car',
    document: bay,
    sheet: check(bay),
    check,
    sitters,
    placesWithoutBody: 0,
    ruleBook,
    style: INCHES,
    colourOf: () => 1,
  };
  return render(
    <SuggestContext value={view}>
      <AnswerSection
        kind="best"
        effects={effects}
        share={shares.share}
        shareNow={shares.shareNow}
        onTake={() => undefined}
      />
    </SuggestContext>,
  );
}

describe('an answer', () => {
  it('that serves nobody says so in its name and is no main action', () => {
    show({ ...lower, served: 0, servedNow: 0, of: 2 });
    expect(screen.getByRole('region', { name: 'Best found, serves nobody in full' })).toBeVisible();
    const take = screen.getByRole('button', { name: 'Take it all the same, best found' });
    expect(take.className).not.toContain('bg-chalk');
    expect(
      screen.getByText('None of 2 sitters to serve is at least tight in every check, as now.'),
    ).toBeVisible();
  });

  it('that serves somebody is the main action', () => {
    show({ ...lower, served: 1, servedNow: 0, of: 2 });
    expect(screen.getByRole('region', { name: 'Best found' })).toBeVisible();
    expect(screen.getByRole('button', { name: 'Take it, best found' }).className).toContain('bg-chalk');
  });

  it('for the public alone is the main action where more of it are served', () => {
    const nobody = { ...lower, served: 0, servedNow: 0, of: 0 };
    const { unmount } = show(nobody, { share: 0.3, shareNow: 0.1 });
    expect(screen.getByRole('button', { name: 'Take it, best found' })).toBeVisible();
    unmount();
    show(nobody, { share: 0.1, shareNow: 0.1 });
    expect(screen.getByRole('button', { name: 'Take it all the same, best found' })).toBeVisible();
  });
});
