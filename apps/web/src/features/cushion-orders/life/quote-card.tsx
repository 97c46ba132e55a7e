import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { dateWords, dayWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { type Desk, type Quote, useLifeStep } from './desk.ts';
import { moneyText } from './money.ts';

function standing({ state, inForce, answeredByName, answeredAt, answer, revisionLetter }: Quote): string {
  switch (state) {
    case 'accepted':
      return `Accepted by ${answeredByName} on ${dayWords(answeredAt)}${inForce ? '' : ', for what was sent before'}.`;
    case 'declined':
      return `Declined by ${answeredByName} on ${dayWords(answeredAt)}: ${answer}`;
    case 'replaced':
      return 'Replaced by a later quote.';
    case 'offered':
      return inForce
        ? 'Waits for the workshop.'
        : `For revision ${revisionLetter} as it was sent before, or past its day: it cannot be accepted any more.`;
  }
}

function Decline({ desk, quote, onClose }: { desk: Desk; quote: Quote; onClose: () => void }) {
  const step = useLifeStep(desk);
  const [reason, setReason] = useState('');
  const [error, setError] = useState<string | undefined>();
  return (
    <FormDialog
      open
      onClose={onClose}
      title="Decline the quote"
      describe="The reason goes to the upholsterer by mail. A new quote can be given on the page."
      verb="Decline the quote"
      cancelWords="Leave it open"
      busy={step.isPending}
      problem={step.error && sayProblem(step.error)}
      onSubmit={(event) => {
        event.preventDefault();
        if (reason.trim() === '') {
          setError('No reason was written. A sentence is enough.');
          return;
        }
        step.mutate({ step: `quotes/${quote.id}/decline`, body: { reason } }, { onSuccess: onClose });
      }}
    >
      <TextArea
        label="Reason"
        value={reason}
        error={error}
        maxLength={1000}
        onChange={(event) => {
          setError(undefined);
          setReason(event.target.value);
        }}
      />
    </FormDialog>
  );
}

/** One price with what it covers; the workshop answers it while it is in force. */
export function QuoteCard({ desk, quote }: { desk: Desk; quote: Quote }) {
  const step = useLifeStep(desk);
  const [declining, setDeclining] = useState(false);
  const money = (minor: number) => moneyText(minor, quote.currency);
  const open = quote.state === 'offered' && quote.inForce;
  return (
    <section
      aria-label={`Quote of ${money(quote.totalMinor)}`}
      className="mb-4 rounded-md bg-sheet p-4 shadow-slip"
    >
      <p className="text-sm">
        Quote for revision {quote.revisionLetter}, {dayWords(quote.at)}, {quote.byName}
      </p>
      <p className="text-3xl font-light tracking-hero tabular-nums">{money(quote.totalMinor)}</p>
      <ul className="mt-2 text-sm">
        {quote.lines.map((line, index) => (
          <li key={index} className="flex justify-between gap-3 border-b border-rule py-1">
            <span className="min-w-0 break-words">
              {line.quantity} × {line.text}
            </span>
            <span className="tabular-nums">{money(line.quantity * line.unitMinor)}</span>
          </li>
        ))}
        {quote.taxMinor > 0 && (
          <li className="flex justify-between gap-3 border-b border-rule py-1">
            <span>{quote.taxText || 'Tax'}</span>
            <span className="tabular-nums">{money(quote.taxMinor)}</span>
          </li>
        )}
      </ul>
      <p className="mt-2 text-sm text-ink-2">
        Good until {dateWords(quote.validUntil)}.
        {quote.deliveryOn && ` Delivery ${dateWords(quote.deliveryOn)}.`}
      </p>
      {quote.note !== '' && <p className="mt-1 text-sm break-words whitespace-pre-line">{quote.note}</p>}
      <p className="mt-2 text-sm font-medium">{standing(quote)}</p>
      {desk.side === 'workshop' && open && (
        <div className="mt-3 flex flex-wrap gap-3 print:hidden">
          <Button
            look="main"
            busy={step.isPending}
            busyWords="Accepting"
            onClick={() => step.mutate({ step: `quotes/${quote.id}/accept` })}
          >
            Accept the quote
          </Button>
          <Button onClick={() => setDeclining(true)}>Decline</Button>
        </div>
      )}
      {step.error && (
        <Notice tone="wont" className="mt-3">
          {sayProblem(step.error)}
        </Notice>
      )}
      {declining && <Decline desk={desk} quote={quote} onClose={() => setDeclining(false)} />}
    </section>
  );
}
