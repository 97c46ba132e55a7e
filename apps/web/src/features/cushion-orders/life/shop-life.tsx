import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { sayProblem } from '@/lib/problem.ts';
import type { OrderPath } from '../api.ts';
import type { Order } from '../order.ts';
import { Deposits } from './deposits.tsx';
import { type Desk, type Inspection, useLife } from './desk.ts';
import { Files } from './files.tsx';
import { InspectDialog } from './inspect-dialog.tsx';
import { Inspections } from './inspections.tsx';
import { Mails } from './mails.tsx';
import { Questions } from './questions.tsx';
import { ShopQuotes } from './shop-quotes.tsx';

/** What can be inspected now. */
function atHand(order: Order, firstArticle: string): Inspection['kind'] | null {
  if (order.state === 'first-article' && firstArticle !== 'accepted') return 'first-article';
  return order.state === 'shipped' || order.state === 'received' ? 'received' : null;
}

/** The workshop's side of what passes between the two: price, deposit, questions, files, inspections, mail. */
export function ShopLife({ path, order }: { path: OrderPath; order: Order }) {
  const desk: Desk = { side: 'workshop', path };
  const life = useLife(desk);
  const [inspecting, setInspecting] = useState<Inspection['kind'] | null>(null);
  if (life.isPending) return <PaleBars words="Loading what passed" rows={3} />;
  if (life.data === undefined) return <Notice tone="wont">{sayProblem(life.error)}</Notice>;
  const open = order.state !== 'closed' && order.state !== 'cancelled';
  const marks = order.cushions.map(({ mark }) => mark);
  const keptAs = `order.${order.id}`;
  const kind = atHand(order, life.data.firstArticle);
  const { questions, files, inspections, mails } = life.data;
  return (
    <>
      {kind && (
        <p className="mb-4">
          <Button look="main" onClick={() => setInspecting(kind)}>
            {kind === 'first-article' ? 'Inspect the first article' : 'Inspect the delivery'}
          </Button>
        </p>
      )}
      <ShopQuotes desk={desk} life={life.data} />
      <Deposits desk={desk} life={life.data} />
      <Questions {...{ desk, marks, keptAs, open }} questions={questions.filter(({ current }) => current)} />
      <Inspections desk={desk} inspections={inspections} files={files} />
      <Files desk={desk} files={files} marks={marks} open={open} />
      {mails.length > 0 && (
        <div className="mb-6">
          <Disclosure words="Mails to the upholsterer">
            <Mails desk={desk} mails={mails} />
          </Disclosure>
        </div>
      )}
      {inspecting && (
        <InspectDialog
          desk={desk}
          kind={inspecting}
          cushions={order.cushions}
          files={files}
          onClose={() => setInspecting(null)}
        />
      )}
    </>
  );
}
