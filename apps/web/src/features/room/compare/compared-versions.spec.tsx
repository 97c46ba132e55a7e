import { createBodyModel, loadRuleBook } from '@settlewright/anthropometry';
import { ARRANGEMENTS, dimensionOf, type SetDocument } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { render, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { createPictureMaker } from '../picture.ts';
import { ComparedVersions } from './compared-versions.tsx';
import type { Version } from './use-version.ts';

const engine = { model: createBodyModel(summary), ruleBook: loadRuleBook(rules) };
const maker = createPictureMaker(engine, []);

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const seated: SetDocument = {
  ...bay,
  seating: (['women', 'men'] as const).map((bodyData, i) => ({
    pieceId: bay.pieces.filter(({ kind }) => kind === 'bench')[i]?.id ?? '',
    place: 1,
    sitter: {
      kind: 'mannequin',
      bodyData,
      measure: 'stature',
      percentile: bodyData === 'women' ? 5 : 95,
    },
  })),
};
const height = dimensionOf(seated, 'seat-height');
const lower = height?.at(height.value - 63.5) as SetDocument;

const version = (words: string, document: SetDocument): Version => ({
  words,
  document,
  sheet: { detail: 'full', ...maker.check(document) },
});

const show = (before: Version, after: Version) =>
  render(<ComparedVersions before={before} after={after} cast={[]} ruleBook={engine.ruleBook} />);

describe('two versions side by side', () => {
  it('tells what changed in the units of the shop, who gains and who loses', () => {
    show(version('Revision A', seated), version('Draft 4', lower));
    const changed = within(screen.getByRole('region', { name: 'What changed' }));
    expect(changed.getByRole('row', { name: /B1, seat height/ })).toBeInTheDocument();
    const gains = within(screen.getByRole('region', { name: 'Who gains' }));
    expect(gains.getByRole('heading', { name: /^Woman, 5th/ })).toBeInTheDocument();
    expect(gains.getAllByText('Seat height').length).toBeGreaterThan(0);
    const losses = within(screen.getByRole('region', { name: 'Who loses' }));
    expect(losses.getByRole('heading', { name: /^Man, 95th/ })).toBeInTheDocument();
  });

  it('says so when nothing differs', () => {
    show(version('Revision A', seated), version('Draft 4', seated));
    expect(screen.getByText(/^Nothing: both hold the same set/)).toBeInTheDocument();
    expect(screen.getAllByText('Nobody.')).toHaveLength(2);
  });

  it('names who sits in one version only', () => {
    show(
      version('Revision A', seated),
      version('Draft 4', { ...seated, seating: seated.seating.slice(0, 1) }),
    );
    expect(screen.getByText(/Only in Revision A: Man, 95th in stature/)).toBeInTheDocument();
  });
});
