import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { beforeEach, describe, expect, it } from 'vitest';
import { useUnitChoice } from '@/lib/unit-choice.ts';
import { LengthField } from './length-field.tsx';
import { entryOf, type QuantityEntry } from './quantity-entry.ts';

let latest: QuantityEntry | null = null;

function Harness({ mm }: { mm: number | null }) {
  const [entry, setEntry] = useState(entryOf(mm));
  return (
    <LengthField
      label="Height"
      optional
      feet
      minMm={1000}
      maxMm={2300}
      entry={entry}
      onChange={(next) => {
        latest = next;
        setEntry(next);
      }}
      error={entry.problem}
    />
  );
}

const field = () => screen.getByLabelText('Height (if known)');

describe('LengthField', () => {
  beforeEach(() => {
    latest = null;
    useUnitChoice.setState({ production: { system: 'feet-inches', roundTo: 8 }, personal: null });
  });

  it('keeps the stored millimetres of a field nobody types in', async () => {
    render(<Harness mm={1577.3} />);
    expect(field()).toHaveValue('5′ 2 1/8″');
    await userEvent.click(field());
    await userEvent.tab();
    expect(latest).toBeNull();
  });

  it('reads feet, inches, fractions and metric, and says both units', async () => {
    render(<Harness mm={null} />);
    await userEvent.type(field(), `5' 6 1/2"`);
    expect(latest?.value).toBeCloseTo(66.5 * 25.4, 6);
    expect(screen.getByText(/1689/)).toBeVisible();
    await userEvent.clear(field());
    await userEvent.type(field(), '184 cm');
    expect(latest?.value).toBe(1840);
  });

  it('refuses what has two readings, keeps the old value and offers those within the limits', async () => {
    render(<Harness mm={1600} />);
    await userEvent.clear(field());
    await userEvent.type(field(), '6 3');
    expect(field()).toHaveAttribute('aria-invalid', 'true');
    expect(latest?.problem).toMatch(/more than one way/);
    await userEvent.click(screen.getByRole('button', { name: /^6′\s3″/ }));
    expect(latest).toEqual({ value: 75 * 25.4 });
    expect(field()).not.toHaveAttribute('aria-invalid');
  });

  it('names what was read and what is taken when a length is out of range', async () => {
    render(<Harness mm={null} />);
    await userEvent.type(field(), '9 ft');
    expect(latest?.problem).toMatch(/reads as 9′\s0″/);
    expect(latest?.problem).toContain('is taken');
    expect(latest?.value).toBeNull();
  });

  it('moves one rounding step with the arrow keys, eight with Shift', async () => {
    render(<Harness mm={1524} />);
    await userEvent.click(field());
    await userEvent.keyboard('{ArrowUp}');
    expect(latest?.value).toBeCloseTo(1524 + 25.4 / 8, 6);
    await userEvent.keyboard('{Shift>}{ArrowDown}{/Shift}');
    expect(latest?.value).toBeCloseTo(1524 + 25.4 / 8 - 25.4, 6);
  });
});
