import { Link } from 'react-router-dom';
import { DashedList, EmptyState } from '@/components/empty-state.tsx';
import { LinkButton } from '@/components/button.tsx';
import { Length } from '@/components/length.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { SitterDot } from '@/components/sitter-dot.tsx';
import type { CastMember } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useProduction } from '@/lib/production.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useCast } from '../api.ts';
import { knownBy } from '../known-by.ts';

function MeasuredRow({ person }: { person: CastMember }) {
  const known = knownBy(person);
  return (
    <tr className="border-b border-rule">
      <th scope="row" className="py-2 pr-3 text-left font-medium">
        <span className="flex items-center gap-2.5">
          <SitterDot colour={person.colour} /> <span className="min-w-0 break-words">{person.name}</span>
        </span>
      </th>
      <td className={`py-2 pr-3 text-right ${known.estimated ? 'text-ink-2' : 'font-semibold'}`}>
        {person.statureMm === undefined ? (
          <span className="text-ink-3">any</span>
        ) : (
          <Length mm={person.statureMm} feet />
        )}
      </td>
      <td className="py-2 text-sm text-ink-2">{known.words}</td>
    </tr>
  );
}

function NamedRow({ person }: { person: CastMember }) {
  return (
    <tr className="border-b border-rule">
      <th scope="row" className="py-2 pr-3 text-left font-medium">
        <span className="flex items-center gap-2.5">
          <SitterDot colour={person.colour} /> {person.name}
        </span>
      </th>
      <td className="py-2 text-sm text-ink-2">{person.role}</td>
    </tr>
  );
}

/** Who sits in this production, beside its sets. */
export function PeopleSummary() {
  const workshop = useWorkshop();
  const production = useProduction();
  const cast = useCast({ workshopId: workshop.id, productionId: production.id });
  const people = (cast.data?.items ?? []).filter((person) => !person.removed);
  const home = `/w/${workshop.id}/p/${production.id}/people`;
  const head = workshop.canEdit ? ['Name', 'Height', 'Known by'] : ['Name', 'Part'];
  return (
    <section aria-labelledby="who-sits">
      <RuleHeading
        id="who-sits"
        aside={
          <Link to={home} className="link text-sm">
            {workshop.canEdit ? 'Edit people' : 'All people'}
          </Link>
        }
      >
        Who sits here
      </RuleHeading>
      {cast.isPending && <PaleBars words="Loading people" />}
      {cast.isError && <Notice tone="wont">{sayProblem(cast.error)}</Notice>}
      {cast.isSuccess && people.length === 0 && (
        <EmptyState
          title="Nobody yet"
          drawing={<DashedList />}
          actions={workshop.canEdit && <LinkButton to={`${home}?add=1`}>Add people</LinkButton>}
        >
          A name and a height are enough. Until then the checks are read for the public only.
        </EmptyState>
      )}
      {people.length > 0 && (
        <table className="w-full border-collapse">
          <caption className="sr-only">People of this production</caption>
          <thead>
            <tr className="border-b-[1.25px] border-ink text-xs text-ink-3">
              {head.map((words) => (
                <th
                  key={words}
                  scope="col"
                  className={`pt-1 pb-1.5 font-medium ${words === 'Height' ? 'pr-3 text-right' : 'text-left'}`}
                >
                  {words}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {people.map((person) =>
              workshop.canEdit ? (
                <MeasuredRow key={person.id} person={person} />
              ) : (
                <NamedRow key={person.id} person={person} />
              ),
            )}
          </tbody>
        </table>
      )}
      <p className="mt-2 text-xs text-ink-3">
        Owner and designers see these measures. Carpenters and reviewers see verdicts and margins; the
        upholsterer never sees people.
      </p>
    </section>
  );
}
