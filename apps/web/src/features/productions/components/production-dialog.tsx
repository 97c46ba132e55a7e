import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { FormDialog } from '@/components/dialog.tsx';
import { Select } from '@/components/select.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import type { Production } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { type ProductionInput, useChangeProduction, useCreateProduction } from '../api.ts';

const UNITS = [
  { value: 'feet-inches', words: 'Feet and inches', detail: '3′ 8″' },
  { value: 'decimal-inches', words: 'Decimal inches', detail: '44.0″' },
  { value: 'millimetres', words: 'Millimetres', detail: '1118 mm' },
] as const;

const ROUNDING = [
  { value: 8, words: 'to 1/8 inch' },
  { value: 16, words: 'to 1/16 inch' },
] as const;

const BLANK: ProductionInput = { name: '', summary: '', units: 'feet-inches', roundTo: 8 };

interface ProductionDialogProps {
  workshopId: string;
  /** The production to change; absent for a new one. */
  production?: Production;
  open: boolean;
  onClose: () => void;
  onDone?: (production: Production) => void;
}

export function ProductionDialog({ workshopId, production, open, onClose, onDone }: ProductionDialogProps) {
  const create = useCreateProduction(workshopId);
  const change = useChangeProduction(workshopId, production?.id ?? '');
  const save = production ? change : create;
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<ProductionInput>({
    values: production
      ? {
          name: production.name,
          summary: production.summary,
          units: production.units,
          roundTo: production.roundTo,
        }
      : BLANK,
  });
  const { errors } = form.formState;
  const close = () => {
    setProblem(null);
    form.reset();
    onClose();
  };
  const submit = form.handleSubmit((values) => {
    setProblem(null);
    save.mutate(values, {
      onSuccess: (saved) => {
        close();
        onDone?.(saved);
      },
      onError: (error) => setProblem(applyProblem(error, form)),
    });
  });
  return (
    <FormDialog
      open={open}
      onClose={close}
      title={production ? 'Change the production' : 'Start a production'}
      describe={production ? undefined : 'One job for a client: its sets, its people and its orders.'}
      verb={production ? 'Save' : 'Start the production'}
      busyWords="Saving"
      busy={save.isPending}
      problem={problem}
      onSubmit={(event) => void submit(event)}
    >
      <div className="grid gap-5">
        <TextField
          label="Name"
          error={errors.name?.message}
          {...form.register('name', { required: 'A production needs a name.' })}
        />
        <TextArea
          label="In a sentence"
          rows={2}
          description="What it is for and when it opens; stands above the name."
          error={errors.summary?.message}
          {...form.register('summary')}
        />
        <div className="grid gap-5 phone:grid-cols-2">
          <Controller
            control={form.control}
            name="units"
            render={({ field, fieldState }) => (
              <Select
                label="Units"
                options={UNITS}
                value={field.value}
                onChange={field.onChange}
                error={fieldState.error?.message}
              />
            )}
          />
          <Controller
            control={form.control}
            name="roundTo"
            render={({ field, fieldState }) => (
              <Select
                label="Shown lengths are rounded"
                options={ROUNDING}
                value={field.value}
                onChange={field.onChange}
                error={fieldState.error?.message}
              />
            )}
          />
        </div>
        <p className="text-sm text-ink-3">
          Lengths are read however they are typed; this says what a bare number means and how they are shown.
          Everyone can choose their own in the title block.
        </p>
      </div>
    </FormDialog>
  );
}
