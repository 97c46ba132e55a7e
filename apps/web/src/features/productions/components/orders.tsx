import { Link } from 'react-router-dom';
import type { ReactNode } from 'react';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { orderStateWords, TapeOrder } from '@/components/tape-order.tsx';
import type { OrderSummary } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useProduction } from '@/lib/production.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useOrders } from '../api.ts';

function Flag({ children }: { children: ReactNode }) {
  return (
    <span className="inline-flex items-center gap-1.5">
      <svg viewBox="0 0 10 14" width="10" height="14" aria-hidden="true" className="shrink-0">
        <path
          d="M1.5 13V1.5h7L6.5 4.5l2 3h-7"
          fill="currentColor"
          stroke="currentColor"
          strokeWidth="1.2"
          strokeLinejoin="round"
        />
      </svg>
      {children}
    </span>
  );
}

function OrderCard({ order, home }: { order: OrderSummary; home: string }) {
  return (
    <li className="min-w-0">
      <div className="flex items-baseline justify-between gap-4">
        <h3 className="min-w-0 font-medium">
          <Link to={`${home}/orders/${order.id}`} className="link">
            {order.title}
          </Link>
        </h3>
        <span className="text-sm whitespace-nowrap text-ink-2">
          {order.cushionCount} {order.cushionCount === 1 ? 'cushion' : 'cushions'}
        </span>
      </div>
      <TapeOrder state={order.state} className="my-2.5" />
      <p className="text-sm text-ink-2">
        <b className="font-semibold text-ink">{orderStateWords(order.state)}</b> on revision{' '}
        {order.revisionLetter}
        {order.neededBy && `, needed by ${dayWords(order.neededBy)}`}
      </p>
      <p className="text-sm text-ink-2">{order.upholsterer?.name ?? 'no upholsterer chosen yet'}</p>
      {order.openQuestions > 0 && (
        <p className="mt-1 text-sm font-medium text-tight">
          <Flag>{order.openQuestions} unanswered</Flag>
        </p>
      )}
    </li>
  );
}

/** Cushion orders of the production, each as a tape. */
export function Orders({ action }: { action?: ReactNode }) {
  const workshop = useWorkshop();
  const production = useProduction();
  const orders = useOrders(workshop.id, production.id);
  const items = orders.data?.items ?? [];
  return (
    <section aria-labelledby="orders">
      <RuleHeading id="orders" aside={action}>
        Cushion orders
      </RuleHeading>
      {orders.isPending && <PaleBars words="Loading orders" rows={1} />}
      {orders.isError && <Notice tone="wont">{sayProblem(orders.error)}</Notice>}
      {orders.isSuccess && items.length === 0 && (
        <p className="max-w-text py-3 text-ink-2">
          None yet. An order is made from an issued revision, so that what is sewn is what was drawn.
        </p>
      )}
      <ul className="grid gap-x-10 gap-y-7 pt-2 tablet:grid-cols-2 desk:grid-cols-3">
        {items.map((order) => (
          <OrderCard key={order.id} order={order} home={`/w/${workshop.id}/p/${production.id}`} />
        ))}
      </ul>
    </section>
  );
}
