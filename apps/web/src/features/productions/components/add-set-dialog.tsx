import { ARRANGEMENTS, planOf } from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { ChoiceGroup } from '@/components/choice-group.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { commonScale, DrawingSvg } from '@/components/drawing-svg.tsx';
import { TextField } from '@/components/text-field.tsx';
import { applyProblem } from '@/lib/form-problem.ts';
import { useProduction } from '@/lib/production.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useArrangements } from '@/lib/arrangements.ts';
import type { KeptArrangement } from '@/lib/contract.ts';
import { useAddSet } from '../api.ts';

const NONE: readonly KeptArrangement[] = [];

/** The usual arrangements and those that the workshop keeps, each with its plan. */
function usePlans(kept: readonly KeptArrangement[]) {
  return useMemo(() => {
    const usual = ARRANGEMENTS.map((one) => ({ ...one, document: one.build() }));
    const own = kept.map(({ id, name, document }) => ({
      id,
      title: name,
      words: 'Kept by the workshop.',
      document,
    }));
    const plans = [...usual, ...own].map((one) => ({ ...one, plan: planOf(one.document) }));
    const pxPerMm = commonScale(
      plans.map(({ plan }) => plan),
      { width: 190, height: 92 },
    );
    return { plans, pxPerMm };
  }, [kept]);
}

interface AddSetDialogProps {
  open: boolean;
  onClose: () => void;
}

/** A new set: its name, and what stands in it to begin with. */
export function AddSetDialog({ open, onClose }: AddSetDialogProps) {
  const workshop = useWorkshop();
  const production = useProduction();
  const navigate = useNavigate();
  const add = useAddSet(workshop.id, production.id);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<{ name: string; arrangement: string }>({
    defaultValues: { name: '', arrangement: 'facing-benches' },
  });
  const kept = useArrangements(workshop.id, open).data ?? NONE;
  const { plans, pxPerMm } = usePlans(kept);
  const close = () => {
    setProblem(null);
    form.reset();
    onClose();
  };
  const submit = form.handleSubmit((values) => {
    setProblem(null);
    const own = kept.find(({ id }) => id === values.arrangement);
    const sent = own ? { name: values.name, document: own.document } : values;
    add.mutate(sent, {
      onSuccess: (set) => {
        close();
        void navigate(`/w/${workshop.id}/p/${production.id}/sets/${set.id}`);
      },
      onError: (error) => setProblem(applyProblem(error, form)),
    });
  });
  return (
    <FormDialog
      wide
      open={open}
      onClose={close}
      title="Add a set"
      describe="One buildable interior. Every size of the arrangement can be changed afterwards."
      verb="Add the set"
      busyWords="Laying it out"
      busy={add.isPending}
      problem={problem}
      onSubmit={(event) => void submit(event)}
    >
      <div className="grid gap-6">
        <TextField
          label="Name"
          placeholder="Dining car"
          error={form.formState.errors.name?.message}
          {...form.register('name', { required: 'Name the set, for example after the room it stands for.' })}
        />
        <Controller
          control={form.control}
          name="arrangement"
          render={({ field }) => (
            <ChoiceGroup
              label="Begin with"
              columns={3}
              value={field.value}
              onChange={field.onChange}
              choices={plans.map(({ id, title, words, plan }) => ({
                value: id,
                words: title,
                describe: words,
                drawing: (
                  <span className="mb-2 flex h-24 items-center">
                    {plan.shapes.length > 0 ? (
                      <DrawingSvg drawing={plan} pxPerMm={pxPerMm} />
                    ) : (
                      <span className="h-16 w-36 border-[1.5px] border-dashed border-rule-strong" />
                    )}
                  </span>
                ),
              }))}
            />
          )}
        />
        <p className="text-sm text-ink-3">The plans are drawn at one scale.</p>
      </div>
    </FormDialog>
  );
}
