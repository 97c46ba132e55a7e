import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { FormDialog } from '@/components/dialog.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { entryOf } from '@/components/quantity-entry.ts';
import { orderStateWords } from '@/components/tape-order.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import type { OrderState } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useChangeOrder, useRecordState, type OrderPath } from '../api.ts';
import { SPEC_WORDS, type Order, type OrderSpec } from '../order.ts';
import { USUAL_TOLERANCE_MM } from '../size-words.ts';

export interface DialogOfOrder {
  path: OrderPath;
  order: Order;
  open: boolean;
  onClose: () => void;
}

const SPEC_KEYS = Object.keys(SPEC_WORDS) as (keyof OrderSpec)[];

/** The words of the order: title, date, cover, welt and the rest; sizes follow the revision. */
export function ChangeOrderDialog({ path, order, open, onClose }: DialogOfOrder) {
  const change = useChangeOrder(path);
  const [problem, setProblem] = useState<string | null>(null);
  // Read once: an order that is read again under the open dialog takes nothing away that was typed.
  const defaultValues = {
    title: order.title,
    revisionLetter: order.revisionLetter,
    neededBy: order.neededBy ?? '',
    cushionMarks: order.cushionMarks?.join(', ') ?? '',
    ...order.spec,
  };
  const form = useForm({ defaultValues });
  const [tolerance, setTolerance] = useState(entryOf(order.toleranceMm));
  const { errors } = form.formState;
  const submit = form.handleSubmit(async ({ title, revisionLetter, neededBy, cushionMarks, ...spec }) => {
    setProblem(null);
    if (tolerance.problem !== undefined) return;
    const marks = cushionMarks
      .split(/[\s,;]+/)
      .map((mark) => mark.trim().toUpperCase())
      .filter(Boolean);
    try {
      await change.mutateAsync({
        title,
        revisionLetter: revisionLetter.trim().toUpperCase(),
        neededBy: neededBy === '' ? null : neededBy,
        cushionMarks: marks.length === 0 ? null : marks,
        spec,
        toleranceMm: tolerance.value ?? USUAL_TOLERANCE_MM,
      });
      onClose();
    } catch (error) {
      setProblem(applyProblem(error, form, (field) => field.replace(/^spec\./, '')));
    }
  });
  return (
    <FormDialog
      open={open}
      onClose={onClose}
      wide
      title="Change the order"
      describe="Sizes come from the issued revision. What was sent stays as it was until you send again."
      verb="Change the order"
      busy={change.isPending}
      busyWords="Changing"
      problem={problem}
      onSubmit={(event) => void submit(event)}
    >
      <div className="grid gap-4 phone:grid-cols-2">
        <TextField label="Title" error={errors.title?.message} {...form.register('title')} />
        <TextField
          label="Needed by"
          type="date"
          error={errors.neededBy?.message}
          {...form.register('neededBy')}
        />
        <TextField
          label="Issued revision"
          error={errors.revisionLetter?.message}
          {...form.register('revisionLetter')}
        />
        <TextField
          label="Cushions"
          description="Marks such as C1, C2; empty for all of the revision."
          error={errors.cushionMarks?.message}
          {...form.register('cushionMarks')}
        />
        <LengthField
          label="Finished sizes, either way"
          description="How far a size may be off; left empty, a quarter of an inch."
          entry={tolerance}
          minMm={0.5}
          maxMm={25.4}
          feet={false}
          error={tolerance.problem}
          onChange={setTolerance}
        />
        {SPEC_KEYS.map((key) => {
          const lines = key === 'notes' || key === 'flammability';
          const words = { label: SPEC_WORDS[key], error: errors[key]?.message };
          return lines ? (
            <TextArea key={key} {...words} className="phone:col-span-2" {...form.register(key)} />
          ) : (
            <TextField key={key} {...words} {...form.register(key)} />
          );
        })}
      </div>
      <p className="mt-3 text-sm text-ink-2">
        A flammability requirement and its evidence are recorded here, never certified.
      </p>
    </FormDialog>
  );
}

/** Records by hand what happened outside the page: a quote by telephone, a parcel that came. */
export function RecordStateDialog({
  path,
  open,
  onClose,
  to,
}: Omit<DialogOfOrder, 'order'> & { to: OrderState }) {
  const record = useRecordState(path);
  const [note, setNote] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const verb = to === 'cancelled' ? 'Cancel the order' : `Record as ${orderStateWords(to).toLowerCase()}`;
  return (
    <FormDialog
      open={open}
      onClose={onClose}
      title={verb}
      describe={
        to === 'cancelled'
          ? 'The private link stops working. What was written stays here.'
          : 'You record this by hand; your name and the time are kept with it.'
      }
      verb={verb}
      cancelWords="Leave as it is"
      busy={record.isPending}
      problem={problem}
      onSubmit={(event) => {
        event.preventDefault();
        setProblem(null);
        record.mutateAsync({ to, note }).then(onClose, (error: unknown) => setProblem(sayProblem(error)));
      }}
    >
      <TextArea
        label="How it is known"
        optional
        description="For example: by telephone, 2 February."
        maxLength={1000}
        value={note}
        onChange={(event) => setNote(event.target.value)}
      />
    </FormDialog>
  );
}
