import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { Combobox } from '@/components/combobox.tsx';
import { Notice } from '@/components/notice.tsx';
import { Select } from '@/components/select.tsx';
import { TextField } from '@/components/text-field.tsx';
import type { Workshop } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { useSession } from '@/lib/session.ts';
import { useSaveSettings } from '../api.ts';

const PAPERS = [
  { value: 'letter', words: 'Letter', detail: '8½ × 11″' },
  { value: 'a4', words: 'A4', detail: '210 × 297 mm' },
] as const;

const ZONES = Intl.supportedValuesOf('timeZone').map((zone) => ({
  id: zone,
  words: zone.replaceAll('_', ' '),
}));

export function SettingsForm({ workshop, canChange }: { workshop: Workshop; canChange: boolean }) {
  const save = useSaveSettings(workshop.id);
  const [problem, setProblem] = useState<string | null>(null);
  const { name, telephone, paper, timeZone } = workshop;
  const form = useForm({ values: { name, telephone: telephone ?? '', paper, timeZone } });
  const { errors } = form.formState;

  const submit = form.handleSubmit((values) => {
    setProblem(null);
    save.mutate(values, {
      onSuccess: () => {
        useSession.setState((state) => ({
          workshops: state.workshops.map((known) =>
            known.id === workshop.id ? { ...known, name: values.name } : known,
          ),
        }));
        toast('Workshop saved.');
      },
      onError: (error) => setProblem(applyProblem(error, form)),
    });
  });

  if (!canChange) {
    return (
      <dl className="grid gap-3">
        {[
          ['Name', name],
          ['Telephone', telephone || 'none'],
          ['Paper', paper === 'a4' ? 'A4' : 'Letter'],
          ['Time zone', timeZone],
        ].map(([term, words]) => (
          <div key={term} className="border-b border-rule pb-2">
            <dt className="text-sm text-ink-3">{term}</dt>
            <dd className="font-medium">{words}</dd>
          </div>
        ))}
      </dl>
    );
  }
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-4">
      {problem && <Notice tone="wont">{problem}</Notice>}
      <TextField
        label="Name"
        error={errors.name?.message}
        {...form.register('name', { required: 'A workshop needs a name.' })}
      />
      <TextField
        label="Telephone"
        type="tel"
        description="Printed in the title block of drawings for the upholsterer."
        error={errors.telephone?.message}
        {...form.register('telephone')}
      />
      <Controller
        control={form.control}
        name="paper"
        render={({ field, fieldState }) => (
          <Select
            label="Paper"
            options={PAPERS}
            value={field.value}
            onChange={field.onChange}
            error={fieldState.error?.message}
          />
        )}
      />
      <Controller
        control={form.control}
        name="timeZone"
        render={({ field, fieldState }) => (
          <Combobox
            label="Time zone"
            description="Dates on drawings and in mails follow it."
            choices={
              ZONES.some((zone) => zone.id === field.value)
                ? ZONES
                : [{ id: field.value, words: field.value }, ...ZONES]
            }
            value={field.value}
            onChange={(zone) => {
              if (zone !== null) field.onChange(zone);
            }}
            error={fieldState.error?.message}
          />
        )}
      />
      <div>
        <Button type="submit" look="main" busy={save.isPending} busyWords="Saving">
          Save the workshop
        </Button>
      </div>
    </form>
  );
}
