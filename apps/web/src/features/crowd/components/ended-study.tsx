import type { ServerStudy } from '@/lib/contract.ts';
import { useOwnSurveys } from '@/lib/crowd/own-crowds.ts';
import { momentWords } from '@/lib/dates.ts';
import { studyPeople } from '../study-people.ts';
import { fineWords, overDropWords, tenth } from '../words.ts';

interface EndedStudyProps {
  study: ServerStudy;
  /** The draft that this page shows. */
  draftNumber: number;
}

/** What a count found, of which people and of which state of the set. */
export function EndedStudy({ study, draftNumber }: EndedStudyProps) {
  const { population, people, startedBy, endedAt, startedAt } = study;
  const surveys = useOwnSurveys();
  const isGone =
    population.kind === 'own' && surveys !== undefined && !surveys.some(({ id }) => id === population.id);
  return (
    <p className="border-b border-rule py-2">
      <span className="font-medium">{foundWords(study)}</span>
      <span className="block text-sm text-ink-2 wrap-anywhere">
        {people.toLocaleString('en-GB')} people: {studyPeople(study)}
        {isGone && ' (a survey that was removed since)'}. {documentWords(study, draftNumber)} {startedBy.name}
        , {momentWords(endedAt ?? startedAt)}.
      </span>
    </p>
  );
}

function foundWords({ state, outcome, fault, ruleIds }: ServerStudy): string {
  if (state === 'failed') return `Not counted: ${fault ?? 'the count failed'}`;
  if (outcome?.kind === 'silent') return `Nothing to count: ${outcome.reason}`;
  if (outcome?.kind !== 'shares') return 'Not known: a measure that is read is not known of these people';
  const checks = ruleIds
    ? `${ruleIds.length} ${ruleIds.length === 1 ? 'check' : 'checks at once'}`
    : 'all checks at once';
  const drop = overDropWords(outcome.overDrop?.fits, tenth);
  return `${fineWords(outcome.fits.mixed)} fit ${checks}${drop ? `; ${drop}` : ''}`;
}

function documentWords({ revisionLetter, draftNumber }: ServerStudy, shown: number): string {
  if (revisionLetter) return `Revision ${revisionLetter}.`;
  return draftNumber === shown ? 'The set as it stands.' : `Draft ${draftNumber}, the set has changed since.`;
}
