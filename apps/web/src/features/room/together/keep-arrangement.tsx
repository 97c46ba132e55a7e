import { carriedPieces, type Piece } from '@settlewright/geometry';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { toast } from 'sonner';
import { FormDialog } from '@/components/dialog.tsx';
import { TextField } from '@/components/text-field.tsx';
import { useKeepArrangement } from '@/lib/arrangements.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { joinWords } from '../choosing-words.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';

interface Props {
  pieces: readonly Piece[];
  onClose: () => void;
}

/** Keeps pieces in the workshop, for any set of any production to begin with. */
export default function KeepArrangement({ pieces, onClose }: Props) {
  const store = useRoomStore();
  const { path } = useSurroundings();
  const keep = useKeepArrangement(path.workshopId);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<{ name: string }>({ defaultValues: { name: '' } });
  const submit = form.handleSubmit(({ name }) => {
    setProblem(null);
    const ids = pieces.map(({ id }) => id);
    const document = { ...carriedPieces(store.getState().document, ids), seating: [] };
    keep.mutate(
      { name, document },
      {
        onSuccess: (kept) => {
          toast(`“${kept.name}” is kept. Put it into any set from “Add”, or begin a new set with it.`);
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
      title="Keep as an arrangement"
      describe={`${joinWords(pieces.map(({ mark }) => mark))} with their cushions, as they stand to each other. Nobody who sits there is kept.`}
      verb="Keep it"
      busyWords="Keeping it"
      busy={keep.isPending}
      problem={problem}
      onSubmit={(event) => void submit(event)}
    >
      <TextField
        label="Name of the arrangement"
        placeholder="Booth of four"
        maxLength={80}
        error={form.formState.errors.name?.message}
        {...form.register('name', {
          validate: (name) => name.trim() !== '' || 'Name the arrangement, for example after what it is for.',
        })}
      />
    </FormDialog>
  );
}
