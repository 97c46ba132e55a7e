import { useState } from 'react';
import { Disclosure } from '@/components/disclosure.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { TextField } from '@/components/text-field.tsx';
import type { OrderLife } from '@/lib/contract.ts';
import type { PublicOrder } from '../order.ts';
import { useKeptText } from '../use-kept-text.ts';
import type { Desk } from './desk.ts';
import { QuoteCard } from './quote-card.tsx';
import { QuoteForm } from './quote-form.tsx';

interface GiveQuoteProps {
  desk: Desk;
  life: OrderLife;
  order: PublicOrder;
  nameKeptAs: string;
}

/** The upholsterer's price for what was sent last, and how earlier ones were answered. */
export function GiveQuote({ desk, life, order, nameKeptAs }: GiveQuoteProps) {
  const [name, keepName] = useKeptText(nameKeptAs);
  const [error, setError] = useState<string | undefined>();
  const [last, ...earlier] = life.quotes;
  const inForce = last?.inForce && last.state !== 'declined';
  const form = (
    <QuoteForm
      desk={desk}
      step="quote"
      verb={inForce ? 'Send the new price' : 'Send the quote'}
      beside={() => {
        if (name.trim() !== '') return { name: name.trim(), sentAt: order.sentAt };
        setError('No name was typed. It is kept with the quote.');
        return null;
      }}
    >
      <TextField
        label="Who quotes, typed"
        autoComplete="name"
        maxLength={120}
        value={name}
        error={error}
        onChange={(event) => {
          setError(undefined);
          keepName(event.target.value);
        }}
      />
    </QuoteForm>
  );
  if (!life.upholstererMayQuote && !last) return null;
  return (
    <section aria-label="Price" className="mb-8">
      <RuleHeading>Price</RuleHeading>
      <div className="pt-3">
        {last && <QuoteCard desk={desk} quote={last} />}
        {earlier.length > 0 && (
          <Disclosure words={`${earlier.length} earlier`}>
            {earlier.map((quote) => (
              <QuoteCard key={quote.id} desk={desk} quote={quote} />
            ))}
          </Disclosure>
        )}
        {life.upholstererMayQuote && (
          <div className="print:hidden">
            {inForce ? <Disclosure words="Change my price">{form}</Disclosure> : form}
          </div>
        )}
      </div>
    </section>
  );
}
