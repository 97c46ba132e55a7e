import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import type { Upholsterer } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { sayProblem } from '@/lib/problem.ts';
import { type UpholstererInput, useRemoveUpholsterer, useSaveUpholsterer } from '../api.ts';

interface UpholstererDialogProps {
  workshopId: string;
  /** The entry being changed, null for a new one. */
  entry: Upholsterer | null;
  onClose: () => void;
}

/** A choice of which the first is none. */
const orNone = <T extends string>(value: T | null | undefined): T | '' => value ?? '';

/** As typed: what may be left open is empty text. */
function typedOf(entry: Upholsterer | null) {
  return {
    name: entry?.name ?? '',
    contactName: entry?.contactName ?? '',
    email: entry?.email ?? '',
    telephone: entry?.telephone ?? '',
    notes: entry?.notes ?? '',
    leadDays: entry?.leadDays?.toString() ?? '',
    clothNotes: entry?.clothNotes ?? '',
    units: orNone(entry?.units),
    paper: orNone(entry?.paper),
    currency: entry?.currency ?? '',
    accountId: entry?.accountId ?? '',
  };
}

function inputOf(typed: ReturnType<typeof typedOf>): UpholstererInput {
  const { units, paper, leadDays, ...words } = typed;
  return {
    ...words,
    leadDays: leadDays.trim() === '' ? null : Number(leadDays),
    units: units === '' ? null : units,
    paper: paper === '' ? null : paper,
    currency: words.currency.trim() === '' ? null : words.currency.trim().toUpperCase(),
    accountId: words.accountId.trim() === '' ? null : words.accountId.trim(),
  };
}

const CHOICE = 'mt-1 block h-12 w-full rounded-sm border-b-[1.5px] border-rule-strong bg-paper px-3';

/** An entry of the address book: whom to write to, and how they like to work. */
export function UpholstererDialog({ workshopId, entry, onClose }: UpholstererDialogProps) {
  const save = useSaveUpholsterer(workshopId);
  const remove = useRemoveUpholsterer(workshopId);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm({ defaultValues: typedOf(entry) });
  const { errors } = form.formState;
  const submit = form.handleSubmit((typed) => {
    setProblem(null);
    save.mutate(
      { id: entry?.id, ...inputOf(typed) },
      {
        onSuccess: () => {
          toast(`${typed.name} saved.`);
          onClose();
        },
        onError: (error) => setProblem(applyProblem(error, form)),
      },
    );
  });
  return (
    <FormDialog
      open
      onClose={onClose}
      title={entry ? entry.name : 'Add an upholsterer'}
      verb={entry ? 'Save' : 'Add'}
      busyWords="Saving"
      busy={save.isPending}
      problem={problem}
      onSubmit={(event) => void submit(event)}
    >
      <div className="grid gap-4 phone:grid-cols-2">
        <TextField
          label="Name of the shop"
          className="phone:col-span-2"
          error={errors.name?.message}
          {...form.register('name', { required: 'Type the name of the shop.' })}
        />
        <TextField
          label="Whom to ask for"
          error={errors.contactName?.message}
          {...form.register('contactName')}
        />
        <TextField
          label="Telephone"
          type="tel"
          error={errors.telephone?.message}
          {...form.register('telephone')}
        />
        <TextField
          label="E-mail"
          type="email"
          className="phone:col-span-2"
          description="Orders go here, each with a private link."
          error={errors.email?.message}
          {...form.register('email', { required: 'Orders are sent by e-mail; type the address.' })}
        />
        <TextField
          label="Usual time, working days"
          optional
          inputMode="numeric"
          error={errors.leadDays?.message}
          {...form.register('leadDays', {
            pattern: { value: /^\s*([1-9]\d{0,2})?\s*$/, message: 'A whole number of days, 1 to 365.' },
          })}
        />
        <TextField
          label="Currency"
          optional
          maxLength={3}
          description="Three letters, as USD."
          error={errors.currency?.message}
          {...form.register('currency')}
        />
        <label className="text-sm font-medium">
          Measures they work in
          <select className={CHOICE} {...form.register('units')}>
            <option value="">as the production</option>
            <option value="feet-inches">feet and inches</option>
            <option value="decimal-inches">decimal inches</option>
            <option value="millimetres">millimetres</option>
          </select>
        </label>
        <label className="text-sm font-medium">
          Paper they print on
          <select className={CHOICE} {...form.register('paper')}>
            <option value="">as the workshop</option>
            <option value="letter">Letter</option>
            <option value="a4">A4</option>
          </select>
        </label>
        <TextField
          label="Account for deposits"
          optional
          className="phone:col-span-2"
          description="Their connected account at the payment provider, as acct_1AbC. Without it deposits are put down by hand."
          error={errors.accountId?.message}
          {...form.register('accountId')}
        />
        <TextArea
          label="Cloth they like to work with"
          optional
          rows={2}
          className="phone:col-span-2"
          error={errors.clothNotes?.message}
          {...form.register('clothNotes')}
        />
        <TextArea
          label="Notes"
          className="phone:col-span-2"
          error={errors.notes?.message}
          {...form.register('notes')}
        />
      </div>
      {entry && (
        <div className="mt-4">
          <Button
            look="word"
            busy={remove.isPending}
            onClick={() =>
              remove.mutate(entry.id, {
                onSuccess: () => {
                  toast(`${entry.name} removed.`);
                  onClose();
                },
                onError: (error) => setProblem(sayProblem(error)),
              })
            }
          >
            Remove from the address book
          </Button>
        </div>
      )}
    </FormDialog>
  );
}
