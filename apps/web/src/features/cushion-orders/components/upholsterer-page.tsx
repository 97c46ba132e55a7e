import { marksWords } from '@settlewright/geometry';
import { useEffect, type ReactNode } from 'react';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import type { OrderLife } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { setProductionUnits } from '@/lib/unit-choice.ts';
import { usePublicOrder, useReply } from '../api.ts';
import { Changes } from '../life/changes.tsx';
import { Deposits } from '../life/deposits.tsx';
import { type Desk, useLife } from '../life/desk.ts';
import { Files } from '../life/files.tsx';
import { GiveQuote } from '../life/give-quote.tsx';
import { Inspections } from '../life/inspections.tsx';
import { MarkState } from '../life/mark-state.tsx';
import { Questions } from '../life/questions.tsx';
import type { PublicOrder } from '../order.ts';
import { Acknowledge } from './acknowledge.tsx';
import { ClosedLink } from './closed-link.tsx';
import { ClothWords } from './cloth-words.tsx';
import { CushionGroups } from './cushion-groups.tsx';
import { LinkPapers } from './order-papers.tsx';
import { Thread } from './thread.tsx';
import { CORRESPONDENCE_ID, ToCorrespondence } from './to-correspondence.tsx';
import { WriteBox } from './write-box.tsx';

function Fact({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div>
      <dt className="text-sm text-ink-2">{name}</dt>
      <dd className="font-medium">{children}</dd>
    </div>
  );
}

function Opened({ token, order }: { token: string; order: PublicOrder }) {
  const reply = useReply(token);
  const desk: Desk = { side: 'upholsterer', token };
  const life = useLife(desk);
  usePageTitle(order.title);
  useEffect(() => {
    setProductionUnits({ system: order.units, roundTo: order.roundTo });
    return () => setProductionUnits(null);
  }, [order.units, order.roundTo]);
  const marks = order.cushions.map(({ mark }) => mark);
  return (
    <div className="mx-auto grid max-w-[72rem] gap-x-16 gap-y-8 px-8 py-6 max-tablet:px-4 desk:grid-cols-[minmax(0,1fr)_21rem]">
      <div className="min-w-0">
        <h1 tabIndex={-1} data-page-heading className="text-2xl font-light tracking-hero">
          {order.title}
        </h1>
        <p className="text-ink-2">
          Order {order.number}, revision {order.revisionLetter}, issued {dayWords(order.revisionIssuedAt)},
          for {order.upholstererName}.
          {order.workshop.telephone !== '' && ` Shop telephone ${order.workshop.telephone}.`}
        </p>
        <dl className="my-5 flex flex-wrap gap-x-10 gap-y-3">
          <Fact name="Needed by">{order.neededBy ? dayWords(order.neededBy) : 'to be agreed'}</Fact>
          <Fact name="Cushions">
            {marks.length}: {marksWords(marks)}
          </Fact>
          <Fact name="For">
            {order.productionName}, {order.setName}
          </Fact>
        </dl>
        <p className="mb-3">
          <ToCorrespondence words="To papers, questions and price" />
        </p>
        {life.data && <Changes life={life.data} revisionLetter={order.revisionLetter} />}
        <CushionGroups
          cushions={order.cushions}
          words={order.spec}
          covers={order.covers}
          toleranceMm={life.data?.toleranceMm}
        />
        <ClothWords covers={order.covers} />
        {order.spec.notes !== '' && <p className="mb-3 max-w-text whitespace-pre-line">{order.spec.notes}</p>}
        {order.spec.flammability !== '' && (
          <p className="max-w-text text-sm text-ink-2">
            Flammability, recorded and not certified: {order.spec.flammability}
          </p>
        )}
      </div>
      <aside id={CORRESPONDENCE_ID} className="min-w-0 scroll-mt-4">
        <LinkPapers token={token} order={order} />
        <RuleHeading>So far</RuleHeading>
        <Thread messages={order.messages} own="upholsterer" />
        <WriteBox
          keptAs={`link.${order.workshop.name}.${order.number}`}
          label="Ask or answer the workshop"
          verb="Send to the workshop"
          placeholder={`Goes to ${order.workshop.contactName}`}
          busy={reply.isPending}
          send={(text) => reply.mutateAsync(text)}
        />
        <div className="my-8">
          <RuleHeading>Can it be made?</RuleHeading>
          <Acknowledge token={token} order={order} />
        </div>
        {life.isError && !life.data && <Notice tone="wont">{sayProblem(life.error)}</Notice>}
        {life.data && <LinkLife desk={desk} order={order} life={life.data} marks={marks} />}
        <p className="mt-6 text-sm text-ink-2">This link works until {dayWords(order.linkExpiresAt)}.</p>
      </aside>
    </div>
  );
}

interface LinkLifeProps {
  desk: Desk;
  order: PublicOrder;
  life: OrderLife;
  marks: readonly string[];
}

/** The upholsterer's side of what passes between the two. */
function LinkLife({ desk, order, life, marks }: LinkLifeProps) {
  const keptAs = `link.${order.workshop.name}.${order.number}`;
  const open = order.state !== 'closed' && order.state !== 'cancelled';
  const name = `${keptAs}.name`;
  return (
    <>
      <MarkState desk={desk} life={life} nameKeptAs={name} />
      <GiveQuote desk={desk} life={life} order={order} nameKeptAs={name} />
      <Deposits desk={desk} life={life} />
      <Inspections desk={desk} inspections={life.inspections} files={life.files} />
      <Questions {...{ desk, marks, keptAs, open }} questions={life.questions} />
      <Files desk={desk} files={life.files} marks={marks} open={open} />
    </>
  );
}

/** The upholsterer's page: one order by a private link, no account. */
export function UpholstererPage({ token }: { token: string }) {
  const order = usePublicOrder(token);
  return (
    <div className="min-h-dvh bg-paper">
      <header className="flex min-h-14 items-center justify-between gap-4 border-b border-ink px-8 max-tablet:px-4">
        <span className="font-semibold">{order.data?.workshop.name ?? 'Cushion order'}</span>
        <span className="text-sm text-ink-2">Private link, this order only</span>
      </header>
      <main>
        {order.isPending && (
          <div className="page">
            <LoadingLine words="Fetching the order" />
          </div>
        )}
        {order.isError && !order.data && (
          <ClosedLink error={order.error} onTryAgain={() => void order.refetch()} />
        )}
        {order.data && <Opened token={token} order={order.data} />}
      </main>
    </div>
  );
}
