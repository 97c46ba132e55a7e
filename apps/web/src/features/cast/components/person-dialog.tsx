import { zodResolver } from '@hookform/resolvers/zod';
import { TAPE_MEASURE_KEYS, type TapeMeasureKey } from '@settlewright/anthropometry';
import { useEffect, useState } from 'react';
import { useForm } from 'react-hook-form';
import { toast } from 'sonner';
import { FormDialog } from '@/components/dialog.tsx';
import { TextArea } from '@/components/text-field.tsx';
import type { CastMember } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { type CastPlace, useSaveCastMember } from '../api.ts';
import { KnownFields } from './known-fields.tsx';
import { TapeFields } from './tape-fields.tsx';
import { formOf, formPath, inputOf, type PersonForm, personFormSchema } from '../person-form.ts';

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
  const { register, setFocus } = form;
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
      <KnownFields form={form} />
      <TapeFields
        form={form}
        person={person}
        open={first?.startsWith('measured') ?? false}
        onPrint={onPrint}
      />
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
