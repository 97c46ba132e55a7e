import { toast } from 'sonner';
import { FormDialog } from '@/components/dialog.tsx';
import type { CastMember } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import { type CastPlace, useErase, useNamedPlaces } from '../api.ts';
import { NamedPlaces } from './named-places.tsx';

interface EraseDialogProps {
  place: CastPlace;
  person: CastMember | null;
  onClose: () => void;
}

export function EraseDialog({ place, person, onClose }: EraseDialogProps) {
  const erase = useErase(place);
  const found = useNamedPlaces(place, person?.id);
  return (
    <FormDialog
      open={person !== null}
      onClose={onClose}
      title={`Erase ${person?.name ?? ''}?`}
      describe={
        <>
          <p>
            Name, measures and notes go for good, from cast, drafts, issued revisions, fit sheets and stored
            papers too, and the name from what people typed. Where they sat stands “removed sitter”.
          </p>
          <p className="mt-2">
            Issued fit sheets keep their verdicts, without the numbers behind them. A draft has no body at the
            place any more: its checks there become not known, until somebody else is seated. This cannot be
            undone. Export them first if they ask for what is held.
          </p>
        </>
      }
      verb="Erase"
      busyWords={erase.isPending ? 'Erasing' : 'Looking'}
      busy={erase.isPending || (person !== null && found.isPending)}
      problem={erase.isError ? sayProblem(erase.error) : null}
      onSubmit={(event) => {
        event.preventDefault();
        if (person === null) return;
        erase.mutate(person.id, {
          onSuccess: () => {
            toast(`${person.name} erased.`);
            onClose();
          },
        });
      }}
    >
      <NamedPlaces found={found} />
    </FormDialog>
  );
}
