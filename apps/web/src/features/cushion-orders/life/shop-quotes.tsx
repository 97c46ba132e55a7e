import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Dialog } from '@/components/dialog.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import { TextField } from '@/components/text-field.tsx';
import type { OrderLife } from '@/lib/contract.ts';
import type { Desk } from './desk.ts';
import { QuoteCard } from './quote-card.tsx';
import { QuoteForm } from './quote-form.tsx';

function Heard({ desk, onClose }: { desk: Desk; onClose: () => void }) {
  const [heard, setHeard] = useState('');
  const [error, setError] = useState<string | undefined>();
  return (
    <Dialog
      open
      onClose={onClose}
      losesTyping
      title="Note a quote"
      describe="A price that came by telephone or on paper. The upholsterer is told what you noted."
    >
      <QuoteForm
        desk={desk}
        step="quotes"
        verb="Note the quote"
        onGiven={onClose}
        beside={() => {
          if (heard.trim() !== '') return { heard: heard.trim() };
          setError('For example: by telephone, 2 February.');
          return null;
        }}
      >
        <TextField
          label="How it is known"
          value={heard}
          maxLength={1000}
          error={error}
          onChange={(event) => {
            setError(undefined);
            setHeard(event.target.value);
          }}
        />
      </QuoteForm>
    </Dialog>
  );
}

/** The newest price with the answer to it, earlier ones folded away, and whose word is still missing. */
export function ShopQuotes({ desk, life }: { desk: Desk; life: OrderLife }) {
  const [noting, setNoting] = useState(false);
  const [last, ...earlier] = life.quotes;
  const { workshop, upholsterer } = life.agreement;
  return (
    <section aria-label="Price" className="mb-6">
      {last && <QuoteCard desk={desk} quote={last} />}
      {workshop && !upholsterer && (
        <p className="mb-3 text-sm text-tight">
          Waits for the upholsterer to say on the page that they can make it as drawn: then it is agreed.
        </p>
      )}
      {earlier.length > 0 && (
        <Disclosure words={`${earlier.length} earlier ${earlier.length === 1 ? 'quote' : 'quotes'}`}>
          {earlier.map((quote) => (
            <QuoteCard key={quote.id} desk={desk} quote={quote} />
          ))}
        </Disclosure>
      )}
      {life.upholstererMayQuote && (
        <Button look="word" onClick={() => setNoting(true)}>
          Note a quote by hand
        </Button>
      )}
      {noting && <Heard desk={desk} onClose={() => setNoting(false)} />}
    </section>
  );
}
