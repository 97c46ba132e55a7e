import { useState } from 'react';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import type { OwnSurvey } from '@/lib/contract.ts';
import { ownPath, useOwnSurveys } from '@/lib/crowd/own-crowds.ts';
import { dayWords } from '@/lib/dates.ts';
import { download } from '@/lib/download.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useForgetRows } from './api.ts';
import { RemoveSurvey } from './remove-survey.tsx';

/** The workshop's own surveys, each with what is kept of it and the way to remove it. */
export function OwnSurveys({ onRemoved }: { onRemoved: (id: string) => void }) {
  const surveys = useOwnSurveys();
  const [leaving, setLeaving] = useState<OwnSurvey | null>(null);
  if (!surveys || surveys.length === 0) return null;
  return (
    <div className="w-full">
      <Disclosure words={`Your own surveys: ${surveys.length}`}>
        <ul className="border-t border-rule" aria-label="Your own surveys">
          {surveys.map((survey) => (
            <Row key={survey.id} survey={survey} onRemove={() => setLeaving(survey)} />
          ))}
        </ul>
      </Disclosure>
      <RemoveSurvey survey={leaving} onClose={() => setLeaving(null)} onRemoved={onRemoved} />
    </div>
  );
}

function Row({ survey, onRemove }: { survey: OwnSurvey; onRemove: () => void }) {
  const { id: workshopId, isOwner } = useWorkshop();
  const forget = useForgetRows(workshopId);
  const { id, name, source, women, men, rowsKept, addedBy, addedAt } = survey;
  const fail = (error: unknown) => toast(sayProblem(error));
  return (
    <li className="border-b border-rule py-2.5">
      <p className="font-medium wrap-anywhere">{name}</p>
      <p className="text-sm text-ink-2 wrap-anywhere">{source}</p>
      <p className="text-sm text-ink-2">
        {women} women and {men} men. {addedBy.name}, {dayWords(addedAt)}.{' '}
        {rowsKept ? 'The measured rows are kept, too.' : 'Only statistics are kept.'}
      </p>
      <div className="mt-1 flex flex-wrap gap-x-5">
        {rowsKept && isOwner && (
          <Button
            look="word"
            onClick={() => void download(`${ownPath(workshopId)}/${id}/rows.csv`).catch(fail)}
          >
            Download the rows <span className="sr-only">of {name}</span>
          </Button>
        )}
        {rowsKept && (
          <Button
            look="word"
            busy={forget.isPending}
            busyWords="Forgetting"
            onClick={() =>
              forget.mutate(id, {
                onSuccess: () => toast(`The rows of ${name} are gone; its statistics stay.`),
                onError: fail,
              })
            }
          >
            Keep statistics only <span className="sr-only">of {name}</span>
          </Button>
        )}
        <Button look="word" onClick={onRemove}>
          Remove <span className="sr-only">{name}</span>
        </Button>
      </div>
    </li>
  );
}
