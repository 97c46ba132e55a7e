import { type FormEvent, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import { type Desk, useLifeStep } from './desk.ts';
import { moneyText } from './money.ts';
import { BLANK_LINE, BLANK_QUOTE, type DraftLine, readQuote } from './quote-draft.ts';
import { refusalOf } from './refusal.ts';

/** Fields of the form as the server names them. */
const FIELDS =
  /^(lines\.\d+\.(text|quantity|unitMinor)|currency|taxMinor|taxText|validUntil|deliveryOn|note)$/;

interface QuoteFormProps {
  desk: Desk;
  /** What goes with the quote: who says so and for which sending, or how it was heard. */
  beside: () => object | null;
  step: string;
  verb: string;
  /** Fields that belong to `beside`. */
  children?: React.ReactNode;
  onGiven?: () => void;
}

/** Lines, tax and days of a price, added up while it is typed. */
export function QuoteForm({ desk, beside, step, verb, children, onGiven }: QuoteFormProps) {
  const give = useLifeStep(desk);
  const [draft, setDraft] = useState(BLANK_QUOTE);
  const [tried, setTried] = useState(false);
  const { quote, faults } = readQuote(draft);
  const set = (change: Partial<typeof draft>) => setDraft({ ...draft, ...change });
  const setLine = (at: number, change: Partial<DraftLine>) =>
    set({ lines: draft.lines.map((line, index) => (index === at ? { ...line, ...change } : line)) });
  const refused = refusalOf(give.error, (path) => FIELDS.test(path));
  const fault = (path: string, server = path) => (tried ? (faults[path] ?? refused.at[server]) : undefined);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    const more = beside();
    if (!quote || !more) return;
    give.mutate(
      { step, body: { ...quote.body, ...more } },
      {
        onSuccess: () => {
          setDraft(BLANK_QUOTE);
          setTried(false);
          onGiven?.();
        },
      },
    );
  };
  return (
    <form noValidate onSubmit={submit} className="grid gap-4">
      {draft.lines.map((line, index) => (
        <fieldset key={index} className="grid grid-cols-[1fr_5.5rem_6rem] items-start gap-2">
          <legend className="sr-only">Line {index + 1}</legend>
          <TextField
            label="For"
            value={line.text}
            maxLength={200}
            error={fault(`lines.${index}.text`)}
            onChange={(event) => setLine(index, { text: event.target.value })}
          />
          <TextField
            label="How many"
            inputMode="numeric"
            value={line.quantity}
            error={fault(`lines.${index}.quantity`)}
            onChange={(event) => setLine(index, { quantity: event.target.value })}
          />
          <TextField
            label="Each"
            inputMode="decimal"
            value={line.price}
            error={fault(`lines.${index}.price`, `lines.${index}.unitMinor`)}
            onChange={(event) => setLine(index, { price: event.target.value })}
          />
        </fieldset>
      ))}
      <p className="flex flex-wrap gap-x-4">
        <Button look="word" onClick={() => set({ lines: [...draft.lines, BLANK_LINE] })}>
          Add a line
        </Button>
        {draft.lines.length > 1 && (
          <Button look="word" onClick={() => set({ lines: draft.lines.slice(0, -1) })}>
            Take the last line away
          </Button>
        )}
      </p>
      <div className="grid gap-4 phone:grid-cols-2">
        <TextField
          label="Currency"
          value={draft.currency}
          maxLength={3}
          error={fault('currency')}
          onChange={(event) => set({ currency: event.target.value })}
        />
        <TextField
          label="Tax"
          optional
          inputMode="decimal"
          value={draft.tax}
          error={fault('tax', 'taxMinor')}
          onChange={(event) => set({ tax: event.target.value })}
        />
        <TextField
          label="Name of the tax"
          optional
          value={draft.taxText}
          maxLength={80}
          error={fault('taxText')}
          onChange={(event) => set({ taxText: event.target.value })}
        />
        <TextField
          label="Good until"
          type="date"
          value={draft.validUntil}
          error={fault('validUntil')}
          onChange={(event) => set({ validUntil: event.target.value })}
        />
        <TextField
          label="Delivery"
          optional
          type="date"
          value={draft.deliveryOn}
          error={fault('deliveryOn')}
          onChange={(event) => set({ deliveryOn: event.target.value })}
        />
      </div>
      <TextArea
        label="Note"
        optional
        value={draft.note}
        maxLength={2000}
        error={fault('note')}
        onChange={(event) => set({ note: event.target.value })}
      />
      {children}
      <p aria-live="polite" className="text-lg tabular-nums">
        {quote ? `Total ${moneyText(quote.totalMinor, draft.currency.trim().toUpperCase())}` : ''}
      </p>
      {refused.whole && <Notice tone="wont">{refused.whole}</Notice>}
      <div>
        <Button type="submit" look="main" busy={give.isPending} busyWords="Sending">
          {verb}
        </Button>
      </div>
    </form>
  );
}
