import { marksWords } from '@settlewright/geometry';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Combobox } from '@/components/combobox.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import { applyProblem } from '@/lib/form-problem.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useAddressBook, useAddUpholsterer, useSendOrder } from '../api.ts';
import { notSaidYet } from '../order.ts';
import { useKeptText } from '../use-kept-text.ts';
import type { DialogOfOrder } from './order-dialogs.tsx';

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
  const unmade = order.cushions.filter(({ faults }) => faults.length > 0);
  return (
    <>
      <FormDialog
        open={open && adding === null}
        onClose={onClose}
        title="Send the order"
        describe={`Revision ${order.revisionLetter}: ${marks.length} ${marks.length === 1 ? 'cushion' : 'cushions'} (${marksWords(marks)}). The drawing pack goes out as PDF with a private link to this order alone; nobody who sits is named in either.`}
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
          {unmade.length > 0 && (
            <Notice
              tone="wont"
              title={`${marksWords(unmade.map(({ mark }) => mark))} cannot be made as asked`}
            >
              {unmade.map(({ mark, faults }) => `${mark}: ${faults.join('; ')}`).join('. ')}. Change it in the
              room and issue a new revision, or send it so: the paper says that it is not as asked.
            </Notice>
          )}
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
