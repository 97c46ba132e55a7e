import { readMoney } from './money.ts';

export interface DraftLine {
  text: string;
  quantity: string;
  price: string;
}

/** A quote as it is typed. */
export interface QuoteDraft {
  currency: string;
  lines: DraftLine[];
  taxText: string;
  tax: string;
  validUntil: string;
  deliveryOn: string;
  note: string;
}

export const BLANK_LINE: DraftLine = { text: '', quantity: '1', price: '' };
export const BLANK_QUOTE: QuoteDraft = {
  ...{ currency: 'USD', taxText: '', tax: '', validUntil: '', deliveryOn: '', note: '' },
  lines: [BLANK_LINE],
};

export interface ReadQuote {
  body: object;
  totalMinor: number;
}

/** What is sent, or what cannot be read, by field: `lines.0.price`. */
export function readQuote(draft: QuoteDraft): { quote: ReadQuote | null; faults: Record<string, string> } {
  const faults: Record<string, string> = {};
  const currency = draft.currency.trim().toUpperCase();
  if (!/^[A-Z]{3}$/.test(currency)) faults.currency = 'Three letters, as USD or EUR.';
  const money = (text: string, path: string): number => {
    const minor = readMoney(text, currency);
    if (minor === null) faults[path] = `“${text}” is no amount. Type it as 1,860.00.`;
    return minor ?? 0;
  };
  const lines = draft.lines.map(({ text, quantity, price }, index) => {
    if (text.trim() === '') faults[`lines.${index}.text`] = 'Say what it is for.';
    if (!/^[1-9]\d{0,3}$/.test(quantity.trim())) faults[`lines.${index}.quantity`] = 'A whole number.';
    return {
      text: text.trim(),
      quantity: Number(quantity),
      unitMinor: money(price, `lines.${index}.price`),
    };
  });
  const taxMinor = draft.tax.trim() === '' ? 0 : money(draft.tax, 'tax');
  if (draft.validUntil === '') faults.validUntil = 'Until when does the price hold?';
  if (Object.keys(faults).length > 0) return { quote: null, faults };
  const { validUntil, taxText, note } = draft;
  const deliveryOn = draft.deliveryOn === '' ? null : draft.deliveryOn;
  return {
    quote: {
      body: { currency, lines, taxMinor, taxText, validUntil, deliveryOn, note },
      totalMinor: lines.reduce((sum, line) => sum + line.quantity * line.unitMinor, taxMinor),
    },
    faults,
  };
}
