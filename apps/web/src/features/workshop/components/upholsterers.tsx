import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import type { Upholsterer } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { sayProblem } from '@/lib/problem.ts';
import type { WorkshopAtHand } from '@/lib/workshop.ts';
import { type UpholstererInput, useRemoveUpholsterer, useSaveUpholsterer, useUpholsterers } from '../api.ts';

const BLANK: UpholstererInput = { name: '', contactName: '', email: '', telephone: '', notes: '' };

interface EntryDialogProps {
  workshopId: string;
  /** The entry being changed, null for a new one. */
  entry: Upholsterer | null;
  open: boolean;
  onClose: () => void;
}

function EntryDialog({ workshopId, entry, open, onClose }: EntryDialogProps) {
  const save = useSaveUpholsterer(workshopId);
  const remove = useRemoveUpholsterer(workshopId);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<UpholstererInput>({ values: entry ?? BLANK });
  const { errors } = form.formState;
  const close = () => {
    form.reset();
    setProblem(null);
    onClose();
  };
  const submit = form.handleSubmit(({ name, contactName, email, telephone, notes }) => {
    setProblem(null);
    save.mutate(
      { id: entry?.id, name, contactName, email, telephone, notes },
      {
        onSuccess: () => {
          toast(`${name} saved.`);
          close();
        },
        onError: (error) => setProblem(applyProblem(error, form)),
      },
    );
  });
  return (
    <FormDialog
      open={open}
      onClose={close}
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
                  close();
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

export function Upholsterers({ workshop }: { workshop: WorkshopAtHand }) {
  const upholsterers = useUpholsterers(workshop.id);
  const [open, setOpen] = useState(false);
  const [entry, setEntry] = useState<Upholsterer | null>(null);
  const show = (chosen: Upholsterer | null) => {
    setEntry(chosen);
    setOpen(true);
  };
  const items = upholsterers.data?.items ?? [];
  return (
    <section>
      <RuleHeading
        aside={
          workshop.canEdit && (
            <Button look="word" onClick={() => show(null)}>
              Add an upholsterer
            </Button>
          )
        }
      >
        Upholsterers
      </RuleHeading>
      {upholsterers.isPending && <PaleBars words="Loading upholsterers" rows={2} />}
      {upholsterers.isError && <Notice tone="wont">{sayProblem(upholsterers.error)}</Notice>}
      {upholsterers.isSuccess && items.length === 0 && (
        <p className="py-3 text-ink-2">Nobody yet. Cushion orders are sent to somebody in this list.</p>
      )}
      <ul>
        {items.map((upholsterer) => (
          <li key={upholsterer.id} className="flex items-center gap-4 border-b border-rule py-2.5">
            <div className="min-w-0 flex-1">
              <div className="truncate font-medium">{upholsterer.name}</div>
              <div className="truncate text-sm text-ink-2">
                {[upholsterer.contactName, upholsterer.email, upholsterer.telephone]
                  .filter(Boolean)
                  .join(', ')}
              </div>
            </div>
            {workshop.canEdit && (
              <Button look="word" onClick={() => show(upholsterer)}>
                Edit <span className="sr-only">{upholsterer.name}</span>
              </Button>
            )}
          </li>
        ))}
      </ul>
      <EntryDialog workshopId={workshop.id} entry={entry} open={open} onClose={() => setOpen(false)} />
    </section>
  );
}
