import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Combobox } from '@/components/combobox.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { Notice } from '@/components/notice.tsx';
import { orderStateWords } from '@/components/tape-order.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import type { OrderState } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { sayProblem } from '@/lib/problem.ts';
import {
  useAddressBook,
  useAddUpholsterer,
  useChangeOrder,
  useRecordState,
  useSendOrder,
  type OrderPath,
} from '../api.ts';
import { notSaidYet, SPEC_WORDS, type Order, type OrderSpec } from '../order.ts';
import { useKeptText } from '../use-kept-text.ts';

interface DialogOfOrder {
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
  const { errors } = form.formState;
  const submit = form.handleSubmit(async ({ title, revisionLetter, neededBy, cushionMarks, ...spec }) => {
    setProblem(null);
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

/** Somebody new for the address book, without leaving the order; what was typed may be a name or an address. */
function NewUpholsterer({
  workshopId,
  typed,
  onAdded,
  onClose,
}: {
  workshopId: string;
  typed: string;
  onAdded: (id: string) => void;
  onClose: () => void;
}) {
  const add = useAddUpholsterer(workshopId);
  const [problem, setProblem] = useState<string | null>(null);
  const isAddress = typed.includes('@');
  const form = useForm({
    defaultValues: {
      name: isAddress ? '' : typed,
      contactName: '',
      email: isAddress ? typed : '',
      telephone: '',
      notes: '',
    },
  });
  const { errors } = form.formState;
  const submit = form.handleSubmit(async (input) => {
    setProblem(null);
    try {
      onAdded((await add.mutateAsync(input)).id);
    } catch (error) {
      setProblem(applyProblem(error, form));
    }
  });
  return (
    <FormDialog
      open
      onClose={onClose}
      title="Add an upholsterer"
      verb="Add to the address book"
      busy={add.isPending}
      problem={problem}
      onSubmit={(event) => void submit(event)}
    >
      <div className="grid gap-4">
        <TextField label="Business" error={errors.name?.message} {...form.register('name')} />
        <TextField label="Contact" error={errors.contactName?.message} {...form.register('contactName')} />
        <TextField label="E-mail" type="email" error={errors.email?.message} {...form.register('email')} />
        <TextField
          label="Telephone"
          optional
          error={errors.telephone?.message}
          {...form.register('telephone')}
        />
      </div>
    </FormDialog>
  );
}

/** Mails the pack with a private link; says what will happen before it does. */
export function SendOrderDialog({ path, order, open, onClose }: DialogOfOrder) {
  const book = useAddressBook(path.workshopId);
  const send = useSendOrder(path);
  const [upholstererId, setUpholstererId] = useState<string | null>(order.upholsterer?.id ?? null);
  const [message, setMessage] = useKeptText(`send.${order.id}`);
  const [adding, setAdding] = useState<string | null>(null);
  const [missing, setMissing] = useState<string | undefined>();
  const [problem, setProblem] = useState<string | null>(null);
  const choices = (book.data?.items ?? []).map(({ id, name, email }) => ({ id, words: name, detail: email }));
  const marks = order.cushions.map(({ mark }) => mark);
  const notSaid = notSaidYet(order);
  return (
    <>
      <FormDialog
        open={open && adding === null}
        onClose={onClose}
        title="Send the order"
        describe={`Revision ${order.revisionLetter}: ${marks.length} ${marks.length === 1 ? 'cushion' : 'cushions'} (${marks.join(', ')}). The drawing pack goes out as PDF with a private link to this order alone; nobody who sits is named in either.`}
        verb="Send the order"
        busy={send.isPending}
        busyWords="Sending"
        problem={problem}
        onSubmit={(event) => {
          event.preventDefault();
          if (upholstererId === null) {
            setMissing('Nobody was chosen. Choose or add an upholsterer.');
            return;
          }
          setProblem(null);
          send.mutateAsync({ upholstererId, message }).then(
            () => {
              setMessage('');
              onClose();
            },
            (error: unknown) => setProblem(sayProblem(error)),
          );
        }}
      >
        <div className="grid gap-4">
          {notSaid.length > 0 && (
            <Notice>
              Not said yet: {notSaid.join(', ')}. The upholsterer’s first question will be about{' '}
              {notSaid.length === 1 ? 'it' : 'them'}.
            </Notice>
          )}
          <Combobox
            label="To"
            value={upholstererId}
            choices={choices}
            error={missing}
            onChange={(id) => {
              setMissing(undefined);
              setUpholstererId(id);
            }}
            onAdd={(typed) => setAdding(typed)}
            addWords={(typed) => (typed === '' ? 'Add an upholsterer' : `Add “${typed}”`)}
          />
          <TextArea
            label="Message"
            optional
            rows={4}
            maxLength={4000}
            value={message}
            onChange={(event) => setMessage(event.target.value)}
          />
        </div>
      </FormDialog>
      {adding !== null && (
        <NewUpholsterer
          workshopId={path.workshopId}
          typed={adding}
          onAdded={(id) => {
            setUpholstererId(id);
            setMissing(undefined);
            setAdding(null);
          }}
          onClose={() => setAdding(null)}
        />
      )}
    </>
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
