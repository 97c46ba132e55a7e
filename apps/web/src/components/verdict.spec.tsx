import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Verdict, VerdictCell, VerdictCounts } from './verdict.tsx';

describe('Verdict', () => {
  it('never stands without its word and says when it is estimated', () => {
    render(<Verdict verdict="tight" estimated more=", seat height" />);
    expect(screen.getByText('tight, est., seat height')).toBeVisible();
  });

  it('dashes the uprights of an estimate only', () => {
    const { container, rerender } = render(<VerdictCell verdict="fits" margin="+1″" estimated />);
    expect(container.querySelectorAll('[stroke-dasharray]')).toHaveLength(2);
    rerender(<VerdictCell verdict="fits" margin="+1″" />);
    expect(container.querySelectorAll('[stroke-dasharray]')).toHaveLength(0);
  });

  it('counts what occurs and leaves out the rest', () => {
    render(<VerdictCounts counts={{ fits: 31, tight: 0, wontFit: 2, notKnown: 1 }} />);
    expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
      '31 fit',
      '2 won’t fit',
      '1 not known',
    ]);
  });
});
