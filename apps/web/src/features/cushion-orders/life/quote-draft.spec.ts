import { describe, expect, it } from 'vitest';
import { BLANK_QUOTE, readQuote } from './quote-draft.ts';

const LINES = [
  { text: 'Seat cushion', quantity: '4', price: '425' },
  { text: 'Buttons', quantity: '32', price: '1.50' },
];

describe('a quote that is typed', () => {
  it('adds up in whole smallest units', () => {
    const { quote } = readQuote({ ...BLANK_QUOTE, lines: LINES, tax: '140.10', validUntil: '2099-01-01' });
    expect(quote).toMatchObject({
      totalMinor: 4 * 42_500 + 32 * 150 + 14_010,
      body: { currency: 'USD', taxMinor: 14_010, deliveryOn: null },
    });
  });

  it('names each field that cannot be read', () => {
    const lines = [{ text: '', quantity: '1.5', price: 'ten' }];
    const { quote, faults } = readQuote({ ...BLANK_QUOTE, currency: 'dollars', lines, tax: '1,2' });
    expect(quote).toBeNull();
    expect(Object.keys(faults).sort()).toEqual(
      ['currency', 'lines.0.price', 'lines.0.quantity', 'lines.0.text', 'tax', 'validUntil'].sort(),
    );
  });
});
