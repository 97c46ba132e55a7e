import { useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { orderStateWords, TapeOrder } from '@/components/tape-order.tsx';
import type { OrderState } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { download } from '@/lib/download.ts';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useTitleCells } from '@/lib/title-cells.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { orderAddress, useLinkStep, useMessages, useOrder, useWriteMessage, type OrderPath } from '../api.ts';
import type { Order } from '../order.ts';
import { CushionGroups } from './cushion-groups.tsx';
import { ChangeOrderDialog, RecordStateDialog, SendOrderDialog } from './order-dialogs.tsx';
import { Thread } from './thread.tsx';
import { WriteBox } from './write-box.tsx';

const LINK_WORDS: Record<Order['link']['state'], string> = {
  none: 'No link yet: it is made when the order is sent.',
  valid: 'works until',
  expired: 'The private link has expired.',
  revoked: 'The private link was revoked.',
};

const MAIL_WORDS: Record<string, string> = {
  queued: 'The mail waits to go out.',
  sending: 'The mail is going out.',
  sent: 'The mail went out',
  failed: 'The mail could not be sent.',
  'perhaps-sent': 'The mail was perhaps sent: the server stopped while handing it over.',
};

function LinkAndMail({ path, order }: { path: OrderPath; order: Order }) {
  const step = useLinkStep(path);
  if (order.sent === null) return null;
  return (
    <div className="grid gap-2 border-b border-rule py-3 text-sm text-ink-2">
      {order.lastMail && (
        <p>
          {MAIL_WORDS[order.lastMail.state] ?? order.lastMail.state}
          {order.lastMail.state === 'sent' && ` ${dayWords(order.lastMail.at)}.`}
        </p>
      )}
      <p>
        {order.link.state === 'valid'
          ? `The private link works until ${dayWords(order.link.expiresAt)}.`
          : LINK_WORDS[order.link.state]}
      </p>
      <p className="flex gap-4">
        <button type="button" className="link min-h-8" onClick={() => step.mutate('renew')}>
          Mail a new link
        </button>
        {order.link.state === 'valid' && (
          <button type="button" className="link min-h-8" onClick={() => step.mutate('revoke')}>
            Revoke the link
          </button>
        )}
      </p>
      {step.isError && <Notice tone="wont">{sayProblem(step.error)}</Notice>}
    </div>
  );
}

function Side({ path, order }: { path: OrderPath; order: Order }) {
  const { canEdit } = useWorkshop();
  const messages = useMessages(path, canEdit);
  const write = useWriteMessage(path);
  const who = order.upholsterer?.contactName || order.upholsterer?.name || 'the upholsterer';
  return (
    <aside aria-label="With the upholsterer">
      <RuleHeading>{order.upholsterer ? `With ${order.upholsterer.name}` : 'Not sent yet'}</RuleHeading>
      {order.acknowledgement && (
        <Notice className="mb-2">
          {order.acknowledgement.name} acknowledged revision {order.acknowledgement.revisionLetter} on{' '}
          {dayWords(order.acknowledgement.at)}.
        </Notice>
      )}
      {canEdit && <LinkAndMail path={path} order={order} />}
      {canEdit && messages.isPending && order.sent !== null && <PaleBars words="Loading messages" rows={2} />}
      {messages.isError && <Notice tone="wont">{sayProblem(messages.error)}</Notice>}
      {messages.data && <Thread messages={messages.data.items} own="workshop" />}
      {canEdit && order.sent !== null && (
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
          <ol className="text-sm text-ink-2">
            {order.events.map((event) => (
              <li key={`${event.at}${event.kind}`} className="border-b border-rule py-1.5">
                {dayWords(event.at)}, {event.byName}:{' '}
                {event.toState ? orderStateWords(event.toState) : event.kind}, revision {event.revisionLetter}
                {event.note !== '' && `. ${event.note}`}
              </li>
            ))}
          </ol>
        </Disclosure>
      </div>
    </aside>
  );
}

function Opened({ path, order }: { path: OrderPath; order: Order }) {
  const { canEdit } = useWorkshop();
  const [dialog, setDialog] = useState<'change' | 'send' | OrderState | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  usePageTitle(order.title);
  useTitleCells(
    useMemo(
      () => [
        { id: 'order', side: 'left', order: 30, label: 'Cushion order', value: `No. ${order.number}` },
        {
          id: 'revision',
          side: 'left',
          order: 40,
          label: 'Revision',
          value: `${order.revisionLetter}, issued ${dayWords(order.revisionIssuedAt)}`,
        },
      ],
      [order.number, order.revisionLetter, order.revisionIssuedAt],
    ),
  );
  const marks = order.cushions.map(({ mark }) => mark);
  const getPack = () => {
    setProblem(null);
    download(`${orderAddress(path)}/spec.pdf`).catch((error: unknown) => setProblem(sayProblem(error)));
  };
  const close = () => setDialog(null);
  const next = order.nextStates.filter((state) => state !== 'cancelled');
  return (
    <div className="page">
      <PageHeading
        title={order.title}
        below={`${marks.length} ${marks.length === 1 ? 'cushion' : 'cushions'}${marks.length > 0 ? `, ${marks.join(', ')}` : ''}. ${order.upholsterer?.name ?? 'No upholsterer yet'}.${order.neededBy ? ` Needed by ${dayWords(order.neededBy)}.` : ''}`}
        actions={
          <>
            <Button onClick={getPack}>Drawing pack, PDF</Button>
            {canEdit && order.mayChange && (
              <Button onClick={() => setDialog('change')}>Change the order</Button>
            )}
            {canEdit && order.maySend && marks.length > 0 && (
              <Button look={order.sent === null ? 'main' : 'ruled'} onClick={() => setDialog('send')}>
                {order.sent === null ? 'Send the order' : 'Send again'}
              </Button>
            )}
          </>
        }
      />
      {problem && <Notice tone="wont">{problem}</Notice>}
      <TapeOrder state={order.state} labelled className="mb-3" />
      <div className="mb-8 flex flex-wrap gap-x-6 gap-y-2 text-sm">
        {order.state === 'cancelled' && <b className="text-wont">Cancelled.</b>}
        {order.sent?.changedSince && (
          <span className="text-tight">
            The order was changed after it was sent on {dayWords(order.sent.at)}. Send it again so that both
            see the same.
          </span>
        )}
        {order.openQuestions > 0 && (
          <span className="text-tight">
            {order.openQuestions} {order.openQuestions === 1 ? 'question' : 'questions'} open
          </span>
        )}
        {canEdit &&
          next.map((state) => (
            <button key={state} type="button" className="link min-h-8" onClick={() => setDialog(state)}>
              Record as {orderStateWords(state).toLowerCase()}
            </button>
          ))}
        {canEdit && order.nextStates.includes('cancelled') && (
          <button type="button" className="link min-h-8" onClick={() => setDialog('cancelled')}>
            Cancel the order
          </button>
        )}
      </div>
      <div className="grid gap-10 desk:grid-cols-[1fr_20rem]">
        <div className="min-w-0">
          <CushionGroups cushions={order.cushions} words={order.spec} />
          {order.spec.notes !== '' && (
            <p className="mb-3 max-w-text whitespace-pre-line">
              <b className="font-semibold">Notes.</b> {order.spec.notes}
            </p>
          )}
          {order.spec.flammability !== '' && (
            <p className="max-w-text text-sm text-ink-2">
              Flammability, recorded and not certified: {order.spec.flammability}
            </p>
          )}
        </div>
        <Side path={path} order={order} />
      </div>
      {dialog === 'change' && <ChangeOrderDialog path={path} order={order} open onClose={close} />}
      {dialog === 'send' && <SendOrderDialog path={path} order={order} open onClose={close} />}
      {dialog !== null && dialog !== 'change' && dialog !== 'send' && (
        <RecordStateDialog path={path} to={dialog} open onClose={close} />
      )}
    </div>
  );
}

/** One cushion order: how far it has come, what is to be made, and what was said. */
export function OrderPage({ path }: { path: OrderPath }) {
  const order = useOrder(path);
  if (order.isPending) {
    return (
      <div className="page">
        <PaleBars words="Loading the order" rows={6} />
      </div>
    );
  }
  if (order.isError) {
    return (
      <div className="page">
        <Notice tone="wont" title="The order cannot be shown">
          {sayProblem(order.error)}
        </Notice>
      </div>
    );
  }
  return <Opened path={path} order={order.data} />;
}
