import { MEASURE_INFO, TAPE_MEASURE_KEYS, type TapeMeasureKey } from '@settlewright/anthropometry';
import { Controller, type UseFormReturn } from 'react-hook-form';
import { Button } from '@/components/button.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { TextField } from '@/components/text-field.tsx';
import { TAPE_MM } from '@/lib/body-limits.ts';
import { capital } from '@/lib/capital.ts';
import type { CastMember } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import type { PersonForm } from '../person-form.ts';
import { quantityAt } from '../quantity-at.ts';

interface TapeFieldsProps {
  form: UseFormReturn<PersonForm>;
  person: CastMember | null;
  /** Shown at once: one of them is to be entered. */
  open: boolean;
  onPrint: (castId: string) => void;
}

/** When and by whom a measure was taken, then how to take it. */
function aboutMeasure(key: TapeMeasureKey, person: CastMember | null): string {
  const before = person?.measured?.[key];
  const { howToTake } = MEASURE_INFO[key];
  const by = [before?.takenOn && dayWords(before.takenOn), before?.takenBy && `by ${before.takenBy}`]
    .filter(Boolean)
    .join(' ');
  return by === '' ? howToTake : `Taken ${by}. ${howToTake}`;
}

/** What was taken with a tape, with who took it and when. */
export function TapeFields({ form, person, open, onPrint }: TapeFieldsProps) {
  const { control, register } = form;
  const { errors } = form.formState;
  const taken = Object.keys(person?.measured ?? {}).length;
  return (
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
        open={open || taken > 0}
        words={taken > 0 ? `${taken} taken; see all ${TAPE_MEASURE_KEYS.length}` : `Enter what was measured`}
      >
        <div className="mb-5 grid gap-x-6 gap-y-5 tablet:grid-cols-2">
          <TextField
            label="Taken by"
            description="For the ones you enter or change now."
            error={errors.takenBy?.message}
            {...register('takenBy')}
          />
          <TextField label="Taken on" type="date" error={errors.takenOn?.message} {...register('takenOn')} />
        </div>
        <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-2">
          {TAPE_MEASURE_KEYS.map((key) => (
            <Controller
              key={key}
              control={control}
              name={`measured.${key}`}
              render={(at) => (
                <LengthField
                  label={capital(MEASURE_INFO[key].plain)}
                  description={aboutMeasure(key, person)}
                  minMm={TAPE_MM[key].min}
                  maxMm={TAPE_MM[key].max}
                  {...quantityAt(at)}
                />
              )}
            />
          ))}
        </div>
      </Disclosure>
    </div>
  );
}
