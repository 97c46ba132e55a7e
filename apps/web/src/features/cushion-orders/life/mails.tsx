import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextField } from '@/components/text-field.tsx';
import type { OrderLife } from '@/lib/contract.ts';
import { momentWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { type Desk, useLifeStep } from './desk.ts';

type Mail = OrderLife['mails'][number];

const STATE_WORDS: Record<Mail['state'], string> = {
  queued: 'waits to go out',
  sending: 'is going out',
  sent: 'went out',
  failed: 'could not be sent',
  'perhaps-sent': 'perhaps sent: the server stopped while handing it over',
  bounced: 'came back',
};
const IN_DOUBT = new Set<Mail['state']>(['failed', 'perhaps-sent', 'bounced']);

function CameBack({ desk, mail, onClose }: { desk: Desk; mail: Mail; onClose: () => void }) {
  const step = useLifeStep(desk);
  const [note, setNote] = useState('');
  return (
    <FormDialog
      open
      onClose={onClose}
      title="Note that a mail came back"
      describe="Put the address right in the address book, then mail a new link."
      verb="Note it"
      busy={step.isPending}
      problem={step.error && sayProblem(step.error)}
      onSubmit={(event) => {
        event.preventDefault();
        step.mutate({ step: `mails/${mail.id}/bounced`, body: { note } }, { onSuccess: onClose });
      }}
    >
      <TextField
        label="What came back"
        description="For example: no such address."
        maxLength={500}
        value={note}
        onChange={(event) => setNote(event.target.value)}
      />
    </FormDialog>
  );
}

/** The mails to the upholsterer, each with what is known of it. */
export function Mails({ desk, mails }: { desk: Desk; mails: readonly Mail[] }) {
  const step = useLifeStep(desk);
  const [back, setBack] = useState<Mail | null>(null);
  return (
    <>
      <ol className="text-sm text-ink-2">
        {mails.map((mail) => (
          <li key={mail.id} className="border-b border-rule py-1.5 break-words">
            {momentWords(mail.at)}: {mail.subject},{' '}
            <span className={IN_DOUBT.has(mail.state) ? 'font-medium text-wont' : undefined}>
              {STATE_WORDS[mail.state]}
            </span>
            <span className="flex flex-wrap gap-x-4">
              {(mail.state === 'failed' || mail.state === 'perhaps-sent') && (
                <Button
                  look="word"
                  busy={step.isPending}
                  onClick={() => step.mutate({ step: `mails/${mail.id}/send-again` })}
                >
                  Send again
                </Button>
              )}
              {(mail.state === 'sent' || mail.state === 'perhaps-sent') && (
                <Button look="word" onClick={() => setBack(mail)}>
                  It came back
                </Button>
              )}
            </span>
          </li>
        ))}
      </ol>
      {step.error && <Notice tone="wont">{sayProblem(step.error)}</Notice>}
      {back && <CameBack desk={desk} mail={back} onClose={() => setBack(null)} />}
    </>
  );
}
