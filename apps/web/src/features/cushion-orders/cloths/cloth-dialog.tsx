import type { OrderCover } from '@settlewright/geometry';
import { useState, type FormEvent } from 'react';
import { FormDialog } from '@/components/dialog.tsx';
import { useFormat } from '@/lib/format.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useChangeOrder, type OrderPath } from '../api.ts';
import type { Order } from '../order.ts';
import { draftOf, readCloth } from './cloth-draft.ts';
import { ClothFields } from './cloth-fields.tsx';
import { pricedLength } from './cloth-words.ts';

interface ClothDialogProps {
  path: OrderPath;
  order: Order;
  /** Which of its cloths; one more when it has none there. */
  at: number;
  onClose: () => void;
}

/** Says one cloth of an order. */
export function ClothDialog({ path, order, at, onClose }: ClothDialogProps) {
  const change = useChangeOrder(path);
  const { per, perMm } = pricedLength(useFormat().style);
  // Read once: an order that is read again under the open dialog takes nothing away that was typed.
  const [covers] = useState<readonly OrderCover[]>(order.covers);
  const [draft, setDraft] = useState(() => draftOf(covers[at], order.cushions, perMm));
  const [faults, setFaults] = useState<Record<string, string>>({});
  const verb = covers[at] ? 'Change the cloth' : 'Add the cloth';
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const read = readCloth(draft, order.cushions, perMm);
    if ('faults' in read) return setFaults(read.faults);
    const others = covers.filter((_, index) => index !== at);
    if (others.some(({ name }) => name === read.cover.name)) {
      return setFaults({ name: 'Another cloth of the order has this name.' });
    }
    setFaults({});
    change.mutate({ covers: covers.toSpliced(at, 1, read.cover) }, { onSuccess: onClose });
  };
  return (
    <FormDialog
      open
      onClose={onClose}
      wide
      title={verb}
      describe="Sent with the order and drawn on its paper. What was sent stays as it was until you send again."
      verb={verb}
      busy={change.isPending}
      problem={change.error && sayProblem(change.error)}
      onSubmit={submit}
    >
      <ClothFields
        draft={draft}
        faults={faults}
        per={per}
        onChange={(more) => setDraft((now) => ({ ...now, ...more }))}
      />
    </FormDialog>
  );
}
