import { marksWords } from '@settlewright/geometry';
import { lazy, Suspense, useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { orderStateWords, TapeOrder } from '@/components/tape-order.tsx';
import type { OrderState } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { download } from '@/lib/download.ts';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useTitleCells } from '@/lib/title-cells.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { orderAddress, useOrder, type OrderPath } from '../api.ts';
import type { Order } from '../order.ts';
import { CushionGroups } from './cushion-groups.tsx';
import { ChangeOrderDialog, RecordStateDialog } from './order-dialogs.tsx';
import { OrderSide } from './order-side.tsx';
import { SendOrderDialog } from './send-order-dialog.tsx';
import { ToCorrespondence } from './to-correspondence.tsx';

const ClothsSection = lazy(() => import('../cloths/cloths-section.tsx'));

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
          yields: 30,
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
        below={`${marks.length} ${marks.length === 1 ? 'cushion' : 'cushions'}${marks.length > 0 ? `, ${marksWords(marks)}` : ''}. ${order.upholsterer?.name ?? 'No upholsterer yet'}.${order.neededBy ? ` Needed by ${dayWords(order.neededBy)}.` : ''}`}
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
      {problem && (
        <Notice tone="wont" className="mb-4">
          {problem}
        </Notice>
      )}
      <TapeOrder state={order.state} labelled className="mb-3" />
      <div className="mb-8 flex flex-wrap items-center gap-x-6 gap-y-2 text-sm">
        {order.state === 'cancelled' && <b className="text-wont">Cancelled.</b>}
        {order.sent?.changedSince && (
          <span className="text-tight">
            The order was changed after it was sent on {dayWords(order.sent.at)}. Send it again so that both
            see the same.
          </span>
        )}
        {order.openQuestions > 0 && <span className="text-tight">{order.openQuestions} unanswered</span>}
        {canEdit &&
          next.map((state) => (
            <button key={state} type="button" className="link min-h-8" onClick={() => setDialog(state)}>
              Record as {orderStateWords(state).toLowerCase()}
            </button>
          ))}
        {order.cushions.length > 0 && <ToCorrespondence words="To quote, questions and files" />}
        {canEdit && order.nextStates.includes('cancelled') && (
          <button type="button" className="link min-h-8" onClick={() => setDialog('cancelled')}>
            Cancel the order
          </button>
        )}
      </div>
      <div className="grid gap-10 desk:grid-cols-[minmax(0,1fr)_20rem]">
        <div className="min-w-0">
          <CushionGroups
            cushions={order.cushions}
            words={order.spec}
            covers={order.covers}
            toleranceMm={order.toleranceMm}
          />
          {marks.length > 0 && (
            <Suspense fallback={<PaleBars words="Working out the cloth" rows={3} />}>
              <ClothsSection path={path} order={order} />
            </Suspense>
          )}
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
        <OrderSide path={path} order={order} />
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
  // An order that was read once stays on the page while the server does not answer.
  if (order.isError && order.data === undefined) {
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
