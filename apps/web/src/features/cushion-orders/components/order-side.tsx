import { Disclosure } from '@/components/disclosure.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { orderStateWords } from '@/components/tape-order.tsx';
import { dayWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useLinkStep, useMailAgain, useMessages, useWriteMessage, type OrderPath } from '../api.ts';
import { EVENT_WORDS, type Order } from '../order.ts';
import { ShopLife } from '../life/shop-life.tsx';
import { ShopPapers } from './order-papers.tsx';
import { Thread } from './thread.tsx';
import { CORRESPONDENCE_ID } from './to-correspondence.tsx';
import { WriteBox } from './write-box.tsx';

function linkWords({ state, expiresAt }: Order['link']): string {
  switch (state) {
    case 'valid':
      return `The private link works until ${dayWords(expiresAt)}.`;
    case 'expired':
      return 'The private link has expired.';
    case 'revoked':
      return 'The private link was revoked.';
    case 'none':
      return 'No link yet: it is made when the order is sent.';
  }
}

const MAIL_WORDS: Partial<Record<string, string>> = {
  queued: 'The mail waits to go out.',
  sending: 'The mail is going out.',
  failed: 'The mail could not be sent.',
  'perhaps-sent': 'The mail was perhaps sent: the server stopped while handing it over.',
  bounced: 'The mail came back. Put the address right and mail a new link.',
};

function mailWords({ state, at }: NonNullable<Order['lastMail']>): string {
  return state === 'sent'
    ? `The mail went out on ${dayWords(at)}.`
    : (MAIL_WORDS[state] ?? `Mail: ${state}.`);
}

/** Mails that did not surely arrive may be sent once more. */
const STUCK = new Set(['failed', 'perhaps-sent']);

function LinkAndMail({ path, order }: { path: OrderPath; order: Order }) {
  const step = useLinkStep(path);
  const again = useMailAgain(path);
  const { lastMail, link } = order;
  const stuck = lastMail !== null && STUCK.has(lastMail.state);
  const error = step.error ?? again.error;
  const busy = step.isPending || again.isPending;
  return (
    <div className="grid gap-1 border-b border-rule py-3 text-sm text-ink-2">
      {lastMail && <p className={stuck ? 'font-medium text-wont' : undefined}>{mailWords(lastMail)}</p>}
      <p>{linkWords(link)}</p>
      <p className="flex flex-wrap gap-x-4 text-ink">
        {stuck && (
          <button
            type="button"
            className="link min-h-8"
            disabled={busy}
            onClick={() => again.mutate(undefined)}
          >
            Send the mail again
          </button>
        )}
        <button type="button" className="link min-h-8" disabled={busy} onClick={() => step.mutate('renew')}>
          Mail a new link
        </button>
        {link.state === 'valid' && (
          <button
            type="button"
            className="link min-h-8"
            disabled={busy}
            onClick={() => step.mutate('revoke')}
          >
            Revoke the link
          </button>
        )}
      </p>
      {error && <Notice tone="wont">{sayProblem(error)}</Notice>}
    </div>
  );
}

function Events({ order }: { order: Order }) {
  return (
    <ol className="text-sm text-ink-2">
      {order.events.map((event, index) => (
        <li key={index} className="border-b border-rule py-1.5 break-words">
          {dayWords(event.at)}, {event.byName}:{' '}
          {event.toState ? orderStateWords(event.toState) : (EVENT_WORDS[event.kind] ?? event.kind)}, revision{' '}
          {event.revisionLetter}
          {event.note !== '' && `. ${event.note}`}
        </li>
      ))}
    </ol>
  );
}

/** What stands between the workshop and the upholsterer: mail and link, what was written, what happened. */
export function OrderSide({ path, order }: { path: OrderPath; order: Order }) {
  const { canEdit } = useWorkshop();
  const messages = useMessages(path, canEdit);
  const write = useWriteMessage(path);
  const sent = order.sent !== null;
  const who = order.upholsterer?.contactName || order.upholsterer?.name || 'the upholsterer';
  return (
    <aside id={CORRESPONDENCE_ID} aria-label="With the upholsterer" className="min-w-0 scroll-mt-16">
      {order.cushions.length > 0 && <ShopPapers path={path} />}
      <RuleHeading>{order.upholsterer ? `With ${order.upholsterer.name}` : 'Not sent yet'}</RuleHeading>
      {order.acknowledgement && (
        <Notice className="mb-2">
          {order.acknowledgement.name} can make revision {order.acknowledgement.revisionLetter} as drawn, said
          on {dayWords(order.acknowledgement.at)}.
        </Notice>
      )}
      {canEdit && sent && <LinkAndMail path={path} order={order} />}
      {canEdit && sent && (
        <div className="pt-4">
          <ShopLife path={path} order={order} />
        </div>
      )}
      {canEdit && messages.isPending && sent && <PaleBars words="Loading messages" rows={2} />}
      {messages.isError && <Notice tone="wont">{sayProblem(messages.error)}</Notice>}
      {messages.data && <Thread messages={messages.data.items} own="workshop" />}
      {!canEdit && (
        <p className="py-2 text-sm text-ink-2">Owners and designers read and write the messages.</p>
      )}
      {canEdit && sent && (
        <WriteBox
          keptAs={`order.${order.id}`}
          label={`Answer ${who}`}
          verb="Send the answer"
          placeholder="Goes out by mail and stands on the private page"
          busy={write.isPending}
          send={(text) => write.mutateAsync(text)}
        />
      )}
      <div className="mt-4">
        <Disclosure words="What happened so far">
          <Events order={order} />
        </Disclosure>
      </div>
    </aside>
  );
}
