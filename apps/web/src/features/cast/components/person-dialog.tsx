import { zodResolver } from '@hookform/resolvers/zod';
import { MEASURE_INFO, TAPE_MEASURE_KEYS, type TapeMeasureKey } from '@settlewright/anthropometry';
import { useEffect, useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { ChoiceGroup } from '@/components/choice-group.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { MassField } from '@/components/mass-field.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { Select } from '@/components/select.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import type { CastMember } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { type CastPlace, useSaveCastMember } from '../api.ts';
import { SHOE_MM, STATURE_MM, TAPE_MM, WEIGHT_KG } from '@/lib/body-limits.ts';
import { formOf, formPath, inputOf, type PersonForm, personFormSchema } from '../person-form.ts';

const BODY_DATA = [
  { value: 'mixed', words: 'Not said', detail: 'both surveys' },
  { value: 'women', words: 'Women' },
  { value: 'men', words: 'Men' },
] as const;

const CLOTHING = [
  { value: 'light', words: 'Light', detail: 'shirt, summer dress' },
  { value: 'medium', words: 'Medium', detail: 'suit, jacket' },
  { value: 'heavy', words: 'Heavy', detail: 'coat, costume' },
] as const;

const SOURCES = [
  { value: 'told', words: 'Told', describe: 'by themselves or an agency; a little doubt is added' },
  { value: 'measured', words: 'Measured', describe: 'against a wall, without shoes' },
] as const;

const FOCUS_MS = 60;

interface PersonDialogProps {
  place: CastPlace;
  /** The person to change, null to add one. */
  person: CastMember | null;
  /** Measure whose field has the focus at once. */
  field?: string | undefined;
  onPrint: (castId: string) => void;
  open: boolean;
  onClose: () => void;
}

type FieldPath = 'stature' | 'weight' | `measured.${TapeMeasureKey}`;

/** Where the form holds a measure. */
function pathOf(measure: string | undefined): FieldPath | undefined {
  if (measure === 'stature') return 'stature';
  if (measure === 'weight_kg') return 'weight';
  const key = TAPE_MEASURE_KEYS.find((one) => one === measure);
  return key && `measured.${key}`;
}

/** Takes whatever is known of a person; a name alone is enough. */
export function PersonDialog({ place, person, field: measure, onPrint, open, onClose }: PersonDialogProps) {
  const save = useSaveCastMember(place);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<PersonForm>({ resolver: zodResolver(personFormSchema), values: formOf(person) });
  const { control, register, setFocus } = form;
  const first = pathOf(measure);
  useEffect(() => {
    if (!open || first === undefined) return undefined;
    // The dialog takes the focus first, as it opens.
    const timer = setTimeout(() => setFocus(first), FOCUS_MS);
    return () => clearTimeout(timer);
  }, [open, first, setFocus]);
  const { errors } = form.formState;
  const close = () => {
    setProblem(null);
    form.reset();
    onClose();
  };
  const submit = form.handleSubmit((values) => {
    setProblem(null);
    save.mutate(
      { id: person?.id, ...inputOf(values, person) },
      {
        onSuccess: (saved) => {
          toast(person ? `${saved.name} saved.` : `${saved.name} added.`);
          close();
        },
        onError: (error) => setProblem(applyProblem(error, form, formPath)),
      },
    );
  });
  const taken = Object.keys(person?.measured ?? {}).length;

  return (
    <FormDialog
      wide
      open={open}
      onClose={close}
      title={person ? person.name : 'Add a person'}
      describe="Fill in what is known; a name alone will do. The rest is predicted and marked as estimated wherever it counts."
      verb={person ? 'Save' : 'Add the person'}
      busyWords="Saving"
      busy={save.isPending}
      problem={problem}
      onSubmit={(event) => void submit(event)}
    >
      <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-2">
        <TextField label="Name" error={errors.name?.message} {...register('name')} />
        <TextField
          label="Part"
          description="Who they play, or where they belong."
          error={errors.role?.message}
          {...register('role')}
        />
        <Controller
          control={control}
          name="stature"
          render={({ field, fieldState }) => (
            <LengthField
              label="Height"
              optional
              feet
              description="Without shoes, for example 5′ 6 1/2″ or 169 cm."
              minMm={STATURE_MM.min}
              maxMm={STATURE_MM.max}
              entry={field.value}
              onChange={field.onChange}
              onBlur={field.onBlur}
              ref={field.ref}
              error={field.value.problem ?? fieldState.error?.message}
            />
          )}
        />
        <Controller
          control={control}
          name="statureSource"
          render={({ field }) => (
            <ChoiceGroup
              label="The height was"
              columns={2}
              value={field.value}
              onChange={field.onChange}
              choices={SOURCES}
            />
          )}
        />
        <Controller
          control={control}
          name="weight"
          render={({ field, fieldState }) => (
            <MassField
              label="Weight"
              optional
              description="Says how far the cushion sinks."
              minKg={WEIGHT_KG.min}
              maxKg={WEIGHT_KG.max}
              entry={field.value}
              onChange={field.onChange}
              onBlur={field.onBlur}
              ref={field.ref}
              error={field.value.problem ?? fieldState.error?.message}
            />
          )}
        />
        <TextField
          label="Age"
          optional
          inputMode="numeric"
          description="Years; moves a few measures where height and weight are known."
          error={errors.age?.message}
          {...register('age')}
        />
        <Controller
          control={control}
          name="bodyData"
          render={({ field, fieldState }) => (
            <Select
              label="Predict the rest from the survey of"
              options={BODY_DATA}
              value={field.value}
              onChange={field.onChange}
              error={fieldState.error?.message}
            />
          )}
        />
        <Controller
          control={control}
          name="shoe"
          render={({ field, fieldState }) => (
            <LengthField
              label="Shoe, under the heel"
              minMm={SHOE_MM.min}
              maxMm={SHOE_MM.max}
              entry={field.value}
              onChange={field.onChange}
              onBlur={field.onBlur}
              ref={field.ref}
              error={field.value.problem ?? fieldState.error?.message}
            />
          )}
        />
        <Controller
          control={control}
          name="clothing"
          render={({ field, fieldState }) => (
            <Select
              label="Clothing"
              options={CLOTHING}
              value={field.value}
              onChange={field.onChange}
              error={fieldState.error?.message}
            />
          )}
        />
      </div>
      <div className="mt-7">
        <RuleHeading
          level={3}
          aside={
            person && (
              <Button look="word" onClick={() => onPrint(person.id)}>
                Measuring sheet (PDF)
              </Button>
            )
          }
        >
          Taken with a tape, seated
        </RuleHeading>
        <Disclosure
          open={taken > 0 || (first?.startsWith('measured') ?? false)}
          words={
            taken > 0 ? `${taken} taken; see all ${TAPE_MEASURE_KEYS.length}` : `Enter what was measured`
          }
        >
          <div className="mb-5 grid gap-x-6 gap-y-5 tablet:grid-cols-2">
            <TextField
              label="Taken by"
              description="For the ones you enter or change now."
              error={errors.takenBy?.message}
              {...register('takenBy')}
            />
            <TextField
              label="Taken on"
              type="date"
              error={errors.takenOn?.message}
              {...register('takenOn')}
            />
          </div>
          <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-2">
            {TAPE_MEASURE_KEYS.map((key) => {
              const info = MEASURE_INFO[key];
              const before = person?.measured?.[key];
              const by = [
                before?.takenOn && dayWords(before.takenOn),
                before?.takenBy && `by ${before.takenBy}`,
              ]
                .filter(Boolean)
                .join(' ');
              return (
                <Controller
                  key={key}
                  control={control}
                  name={`measured.${key}`}
                  render={({ field, fieldState }) => (
                    <LengthField
                      label={info.plain.charAt(0).toUpperCase() + info.plain.slice(1)}
                      description={by === '' ? info.howToTake : `Taken ${by}. ${info.howToTake}`}
                      minMm={TAPE_MM[key].min}
                      maxMm={TAPE_MM[key].max}
                      entry={field.value}
                      onChange={field.onChange}
                      onBlur={field.onBlur}
                      ref={field.ref}
                      error={field.value.problem ?? fieldState.error?.message}
                    />
                  )}
                />
              );
            })}
          </div>
        </Disclosure>
      </div>
      <div className="mt-5">
        <TextArea
          label="Notes"
          description="Read by owner and designers only."
          error={errors.notes?.message}
          {...register('notes')}
        />
      </div>
    </FormDialog>
  );
}
