import { toast } from 'sonner';
import { FormDialog } from '@/components/dialog.tsx';
import { Notice } from '@/components/notice.tsx';
import type { OwnSurvey, SurveyUse } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useRemoveSurvey, useSurveyUses } from './api.ts';

interface RemoveSurveyProps {
  survey: OwnSurvey | null;
  onClose: () => void;
  onRemoved: (id: string) => void;
}

/** Says what goes, what stays and who used it, before a survey is removed. */
export function RemoveSurvey({ survey, onClose, onRemoved }: RemoveSurveyProps) {
  const { id: workshopId } = useWorkshop();
  const remove = useRemoveSurvey(workshopId);
  // Once it is gone there is nothing left to ask about.
  const isAsked = survey !== null && !(remove.variables === survey.id && !remove.isError);
  const uses = useSurveyUses(workshopId, survey?.id ?? '', isAsked);
  return (
    <FormDialog
      open={survey !== null}
      onClose={onClose}
      title={`Remove ${survey?.name ?? ''}?`}
      describe={
        <>
          <p>
            Its statistics go for good{survey?.rowsKept && ', and the measured rows with them'}; nobody in the
            workshop can choose these people any more. This cannot be undone.
          </p>
          <p className="mt-2">
            Counts that were made with it stay, with its name and source. Known differences and issued
            revisions stay as they are. An address that names it says that it was removed.
          </p>
        </>
      }
      verb="Remove"
      busyWords={remove.isPending ? 'Removing' : 'Looking'}
      busy={remove.isPending || (isAsked && uses.isPending)}
      problem={remove.isError ? sayProblem(remove.error) : null}
      onSubmit={(event) => {
        event.preventDefault();
        if (survey === null) return;
        remove.mutate(survey.id, {
          onSuccess: () => {
            toast(`${survey.name} removed.`);
            onClose();
            onRemoved(survey.id);
          },
        });
      }}
    >
      {uses.isError && isAsked ? (
        <Notice tone="wont">{sayProblem(uses.error)}</Notice>
      ) : (
        uses.data && <Uses uses={uses.data} />
      )}
    </FormDialog>
  );
}

const counts = (n: number): string => (n === 1 ? '1 count' : `${n} counts`);

function underWay(studies: number, unfinished: number): string {
  if (unfinished === 0) return '';
  const which = unfinished === studies ? 'under way' : `${unfinished} of them under way`;
  return `, ${which}; ${unfinished === 1 ? 'it goes' : 'they go'} on`;
}

function Uses({ uses }: { uses: readonly SurveyUse[] }) {
  if (uses.length === 0) return <p>Nothing was counted with it on the server.</p>;
  return (
    <>
      <p className="font-medium">Counted with it</p>
      <ul className="max-h-48 overflow-y-auto" aria-label="Counted with it">
        {uses.map(({ setId, setName, productionName, studies, unfinished }) => (
          <li key={setId} className="border-b border-rule py-1.5 text-sm">
            {setName}, {productionName}: {counts(studies)}
            {underWay(studies, unfinished)}
          </li>
        ))}
      </ul>
    </>
  );
}
