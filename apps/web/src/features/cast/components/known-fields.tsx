import { Controller, type UseFormReturn } from 'react-hook-form';
import { ChoiceGroup } from '@/components/choice-group.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { MassField } from '@/components/mass-field.tsx';
import { Select } from '@/components/select.tsx';
import { TextField } from '@/components/text-field.tsx';
import { BODY_DATA_CHOICES } from '@/lib/body-data-choices.ts';
import { SHOE_MM, STATURE_MM, WEIGHT_KG } from '@/lib/body-limits.ts';
import type { PersonForm } from '../person-form.ts';
import { quantityAt } from '../quantity-at.ts';

const CLOTHING = [
  { value: 'light', words: 'Light', detail: 'shirt, summer dress' },
  { value: 'medium', words: 'Medium', detail: 'suit, jacket' },
  { value: 'heavy', words: 'Heavy', detail: 'coat, costume' },
] as const;

const SOURCES = [
  { value: 'told', words: 'Told', describe: 'by themselves or an agency; a little doubt is added' },
  { value: 'measured', words: 'Measured', describe: 'against a wall, without shoes' },
] as const;

/** Name, height, weight and what else most people know of themselves. */
export function KnownFields({ form }: { form: UseFormReturn<PersonForm> }) {
  const { control, register } = form;
  const { errors } = form.formState;
  return (
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
        render={(at) => (
          <LengthField
            label="Height"
            optional
            feet
            description="Without shoes, for example 5′ 6 1/2″ or 169 cm."
            minMm={STATURE_MM.min}
            maxMm={STATURE_MM.max}
            {...quantityAt(at)}
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
        render={(at) => (
          <MassField
            label="Weight"
            optional
            description="Says how far the cushion sinks; for example 150 lb, 11 st 4 lb or 72 kg."
            minKg={WEIGHT_KG.min}
            maxKg={WEIGHT_KG.max}
            {...quantityAt(at)}
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
            options={BODY_DATA_CHOICES}
            value={field.value}
            onChange={field.onChange}
            error={fieldState.error?.message}
          />
        )}
      />
      <Controller
        control={control}
        name="shoe"
        render={(at) => (
          <LengthField
            label="Shoe, under the heel"
            minMm={SHOE_MM.min}
            maxMm={SHOE_MM.max}
            {...quantityAt(at)}
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
  );
}
