import { formatLength, parseLength } from '@settlewright/geometry';
import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Measure, splitFractions, typedForm } from './measure.tsx';

const STYLE = { system: 'feet-inches', roundTo: 16, feet: true } as const;

describe('splitFractions', () => {
  it('finds eighths drawn as one glyph and sixteenths drawn with raised and lowered numerals', () => {
    expect(splitFractions('17½″')).toEqual([
      { text: '17', fraction: false },
      { text: '1/2', fraction: true },
      { text: '″', fraction: false },
    ]);
    expect(splitFractions('¹¹⁄₁₆″')[0]).toEqual({ text: '11/16', fraction: true });
  });
});

describe('typedForm', () => {
  it('gives a text that reads as the same length, for every sixteenth of six feet', () => {
    for (let sixteenth = 1; sixteenth <= 72 * 16; sixteenth += 1) {
      const mm = (sixteenth * 25.4) / 16;
      const reading = parseLength(typedForm(formatLength(mm, STYLE)), 'in');
      expect(reading.ok && Math.abs(reading.value - mm) < 1e-6, `${sixteenth} sixteenths`).toBe(true);
    }
  });
});

describe('Measure', () => {
  it('is read out in words and shown with a diagonal fraction', () => {
    render(<Measure text="17½″" spoken="seventeen and one half inches" />);
    expect(screen.getByText('seventeen and one half inches')).toHaveClass('sr-only');
    expect(screen.getByText('1/2')).toHaveClass('frac');
  });
});
