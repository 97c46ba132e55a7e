import { describedClothName, orderModel, plainCover } from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { sayProblem } from '@/lib/problem.ts';
import { useFormat } from '@/lib/format.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useChangeOrder, type OrderPath } from '../api.ts';
import type { Order } from '../order.ts';
import { runText } from '../size-words.ts';
import { ClothDialog } from './cloth-dialog.tsx';
import { ClothFacts } from './cloth-facts.tsx';

const MAX_SHOWN_FAULTS = 8;

/** The cloths of an order, what to buy of them, and what goes into the seams. */
export default function ClothsSection({ path, order }: { path: OrderPath; order: Order }) {
  const { canEdit } = useWorkshop();
  const { style, length } = useFormat();
  const change = useChangeOrder(path);
  const [editing, setEditing] = useState<number | null>(null);
  const { cushions, covers, cushionRules: rules, spec } = order;
  const assumed = covers.length === 0;
  const model = useMemo(
    () =>
      orderModel({
        cushions,
        covers: assumed ? [plainCover(describedClothName(spec.cover))] : covers,
        rules,
      }),
    [cushions, covers, assumed, spec.cover, rules],
  );
  const mayEdit = canEdit && order.mayChange;
  const { totals } = model;
  const faults = model.faults.filter(({ mark }) => mark === undefined).slice(0, MAX_SHOWN_FAULTS);
  const zips = totals.zips.map(({ lengthMm, count }) => `${count} × ${length(lengthMm, { feet: false })}`);
  return (
    <section aria-label="Cloths" className="mb-8">
      <RuleHeading
        aside={
          mayEdit && (
            <Button look="word" onClick={() => setEditing(covers.length)}>
              Add a cloth
            </Button>
          )
        }
      >
        Cloths
      </RuleHeading>
      {assumed && (
        <p className="mb-2 max-w-text text-sm text-tight">
          No cloth is said yet. The paper assumes a plain one of the usual width, and says so.
        </p>
      )}
      {faults.map(({ text }) => (
        <Notice key={text} className="mb-2">
          {text}
        </Notice>
      ))}
      {change.error && editing === null && <Notice tone="wont">{sayProblem(change.error)}</Notice>}
      {model.cloths.map((cloth, at) => (
        <div key={cloth.cover.name} className="mb-5">
          <div className="flex flex-wrap items-baseline justify-between gap-x-4">
            <h3 className="font-semibold">{cloth.cover.name}</h3>
            {mayEdit && !assumed && (
              <span className="flex gap-4">
                <Button look="word" onClick={() => setEditing(at)}>
                  Change<span className="sr-only"> {cloth.cover.name}</span>
                </Button>
                <Button
                  look="word"
                  busy={change.isPending}
                  onClick={() => change.mutate({ covers: covers.filter((_, index) => index !== at) })}
                >
                  Take away<span className="sr-only"> {cloth.cover.name}</span>
                </Button>
              </span>
            )}
          </div>
          <ClothFacts cloth={cloth} assumed={assumed} />
        </div>
      ))}
      <p className="text-sm text-ink-2">
        {[
          `Thread about ${runText(totals.threadMm, style)}`,
          zips.length > 0 ? `zips ${zips.join(', ')}` : 'no zips',
          ...(totals.hookAndLoopMm > 0 ? [`hook and loop ${runText(totals.hookAndLoopMm, style)}`] : []),
          totals.weltMm > 0 ? `welt ${runText(totals.weltMm, style)}` : 'no welt',
          `${totals.buttons} ${totals.buttons === 1 ? 'button' : 'buttons'}`,
        ].join('; ')}
        .
      </p>
      {editing !== null && (
        <ClothDialog path={path} order={order} at={editing} onClose={() => setEditing(null)} />
      )}
    </section>
  );
}
