import { describe, expect, it } from 'vitest';
import { moneyInput, moneyText, readMoney } from './money.ts';

describe('money', () => {
  it.each([
    ['1860', 'USD', 186_000],
    ['1,860.5', 'USD', 186_050],
    ['$ 1,860.05', 'USD', 186_005],
    ['0.29', 'USD', 29],
    ['1,860', 'JPY', 1860],
    ['1.234', 'KWD', 1234],
  ])('reads %s %s as %i of its smallest unit', (text, currency, minor) => {
    expect(readMoney(text, currency)).toBe(minor);
    expect(readMoney(moneyInput(minor, currency), currency)).toBe(minor);
  });

  it.each(['', 'ten', '1.860,50', '18,60', '1.234', '-5', '1e3'])('does not guess at %j', (text) => {
    expect(readMoney(text, 'USD')).toBeNull();
  });

  it('is shown in its own currency', () => {
    expect(moneyText(186_000, 'USD')).toBe('$1,860.00');
    expect(moneyText(1860, 'JPY')).toBe('¥1,860');
  });
});
