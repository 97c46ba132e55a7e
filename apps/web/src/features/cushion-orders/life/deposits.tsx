import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { TextField } from '@/components/text-field.tsx';
import type { OrderLife } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { type Desk, type Payment, useBeginDeposit, useLifeStep } from './desk.ts';
import { moneyInput, moneyText, readMoney } from './money.ts';

type ShopDesk = Extract<Desk, { side: 'workshop' }>;

const STATE_WORDS: Record<Payment['state'], string> = {
  begun: 'begun, the payment provider has not said that it was paid',
  paid: 'paid',
  lapsed: 'ended without being paid',
};

function Row({ desk, payment }: { desk: Desk; payment: Payment }) {
  const step = useLifeStep(desk);
  const { kind, state, byHand, note, byName, amountMinor, currency, at, settledAt } = payment;
  const words = state === 'paid' ? (kind === 'refund' ? 'given back' : 'paid') : STATE_WORDS[state];
  return (
    <li className="border-b border-rule py-2 text-sm">
      <b className="font-semibold">
        {kind === 'refund' ? 'Refund' : 'Deposit'} {moneyText(amountMinor, currency)}
      </b>
      , {words}
      <span className="block break-words text-ink-2">
        {dayWords(settledAt ?? at)},{' '}
        {byHand ? `put down by ${byName}: ${note}` : 'through the payment provider'}
      </span>
      {desk.side === 'workshop' && state === 'begun' && (
        <Button
          look="word"
          busy={step.isPending}
          onClick={() => step.mutate({ step: `payments/${payment.id}/end` })}
        >
          End it unpaid
        </Button>
      )}
      {step.error && <Notice tone="wont">{sayProblem(step.error)}</Notice>}
    </li>
  );
}

interface PayProps {
  desk: ShopDesk;
  currency: string;
  /** What of the quote is not paid yet. */
  leftMinor: number;
  onClose: () => void;
}

function Pay({ desk, currency, leftMinor, onClose }: PayProps) {
  const begin = useBeginDeposit(desk.path);
  const [text, setText] = useState(moneyInput(Math.round(leftMinor / 2), currency));
  const minor = readMoney(text, currency);
  return (
    <FormDialog
      open
      onClose={onClose}
      title="Pay a deposit"
      describe={`It goes to the upholsterer’s own account. ${moneyText(leftMinor, currency)} of the quote is not paid yet. You pay on the page of the payment provider and come back here.`}
      verb="Go to the payment page"
      busy={begin.isPending}
      problem={begin.error && sayProblem(begin.error)}
      onSubmit={(event) => {
        event.preventDefault();
        if (minor === null) return;
        begin.mutate(minor, { onSuccess: ({ url }) => window.location.assign(url) });
      }}
    >
      <TextField
        label={`Amount, ${currency}`}
        inputMode="decimal"
        value={text}
        error={minor === null ? `“${text}” is no amount. Type it as 930.00.` : undefined}
        onChange={(event) => setText(event.target.value)}
      />
    </FormDialog>
  );
}

function ByHand({ desk, currency: given, onClose }: { desk: Desk; currency: string; onClose: () => void }) {
  const step = useLifeStep(desk);
  const [kind, setKind] = useState<Payment['kind']>('deposit');
  const [currency, setCurrency] = useState(given);
  const [text, setText] = useState('');
  const [note, setNote] = useState('');
  const [tried, setTried] = useState(false);
  const minor = readMoney(text, currency);
  return (
    <FormDialog
      open
      onClose={onClose}
      title="Put a payment down by hand"
      describe="For money that went another way. Your name and the time are kept with it, and the upholsterer is told."
      verb="Put it down"
      busy={step.isPending}
      problem={step.error && sayProblem(step.error)}
      onSubmit={(event) => {
        event.preventDefault();
        setTried(true);
        if (minor === null || minor === 0 || note.trim() === '') return;
        const body = { kind, currency: currency.toUpperCase(), amountMinor: minor, note };
        step.mutate({ step: 'payments', body }, { onSuccess: onClose });
      }}
    >
      <div className="grid gap-4 phone:grid-cols-2">
        <label className="text-sm font-medium">
          What it was
          <select
            className="mt-1 block h-12 w-full rounded-sm border-b-[1.5px] border-rule-strong bg-paper px-3"
            value={kind}
            onChange={(event) => setKind(event.target.value as Payment['kind'])}
          >
            <option value="deposit">A deposit, paid</option>
            <option value="refund">A refund, come back</option>
          </select>
        </label>
        <TextField
          label="Currency"
          maxLength={3}
          value={currency}
          onChange={(event) => setCurrency(event.target.value.toUpperCase())}
        />
        <TextField
          label="Amount"
          inputMode="decimal"
          value={text}
          error={tried && !minor ? 'Type it as 930.00.' : undefined}
          onChange={(event) => setText(event.target.value)}
        />
        <TextField
          label="How and when"
          value={note}
          maxLength={500}
          error={tried && note.trim() === '' ? 'For example: bank transfer, 2 February.' : undefined}
          onChange={(event) => setNote(event.target.value)}
        />
      </div>
    </FormDialog>
  );
}

/** Money of the order: what was paid, how, and what can be paid now. */
export function Deposits({ desk, life }: { desk: Desk; life: OrderLife }) {
  const [dialog, setDialog] = useState<'pay' | 'hand' | null>(null);
  const payments = life.payments.filter(({ current }) => current);
  const accepted = life.quotes.find(({ state, current }) => state === 'accepted' && current);
  const paidMinor = payments
    .filter(({ state, currency }) => state === 'paid' && currency === accepted?.currency)
    .reduce((sum, { kind, amountMinor }) => sum + (kind === 'refund' ? -amountMinor : amountMinor), 0);
  const leftMinor = (accepted?.totalMinor ?? 0) - paidMinor;
  if (desk.side === 'upholsterer' && payments.length === 0) return null;
  return (
    <section aria-label="Deposit" className="mb-8">
      <RuleHeading>Deposit</RuleHeading>
      {payments.length === 0 && (
        <p className="py-2 text-sm text-ink-2">
          {accepted ? 'Nothing is paid yet.' : 'Not due until a quote is accepted.'}
        </p>
      )}
      <ul>
        {payments.map((payment) => (
          <Row key={payment.id} desk={desk} payment={payment} />
        ))}
      </ul>
      {desk.side === 'workshop' && (
        <p className="mt-3 flex flex-wrap gap-3 print:hidden">
          {life.depositOnline && accepted?.inForce && leftMinor > 0 && (
            <Button size="small" onClick={() => setDialog('pay')}>
              Pay a deposit
            </Button>
          )}
          <Button size="small" onClick={() => setDialog('hand')}>
            Put a payment down
          </Button>
        </p>
      )}
      {desk.side === 'workshop' && dialog === 'pay' && accepted && (
        <Pay desk={desk} currency={accepted.currency} leftMinor={leftMinor} onClose={() => setDialog(null)} />
      )}
      {dialog === 'hand' && (
        <ByHand desk={desk} currency={accepted?.currency ?? 'USD'} onClose={() => setDialog(null)} />
      )}
    </section>
  );
}
