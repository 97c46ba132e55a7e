import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { EmptyState } from '@/components/empty-state.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { Select, type SelectOption } from '@/components/select.tsx';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useTitleCells, type TitleCell } from '@/lib/title-cells.ts';
import { useCast, useRevisions, useSetInfo, type SetPath } from '../api.ts';
import { loadFitEngine } from '../engine.ts';
import { ComparedVersions } from './compared-versions.tsx';
import { DRAFT, otherSet, useSetsBeside, useVersion } from './use-version.ts';

/** Two versions of a set, or two sets, side by side: what changed, who gained, who lost. */
export function ComparePage({ path }: { path: SetPath }) {
  const info = useSetInfo(path);
  const revisions = useRevisions(path);
  const sets = useSetsBeside(path);
  const cast = useCast(path);
  const engine = useQuery({ queryKey: ['fit-engine'], queryFn: loadFitEngine, staleTime: Infinity });
  const [params, setParams] = useSearchParams();
  const setName = info.data?.name ?? 'Set';
  usePageTitle(`Compare, ${setName}`);
  const home = `/w/${path.workshopId}/p/${path.productionId}/sets/${path.setId}`;
  const cells = useMemo<TitleCell[]>(
    () => [{ id: 'set', side: 'left', order: 30, label: 'Set', value: setName, to: home, shortens: true }],
    [setName, home],
  );
  useTitleCells(cells);

  const letters = [...(revisions.data ?? [])].sort((a, b) => b.number - a.number).map(({ letter }) => letter);
  const others = (sets.data ?? []).filter(({ id }) => id !== path.setId);
  const options: SelectOption<string>[] = [
    { value: DRAFT, words: 'Draft as saved' },
    ...letters.map((letter) => ({ value: letter, words: `Revision ${letter}` })),
    ...others.map(({ id, name }) => ({ value: otherSet(id), words: name, detail: 'another set' })),
  ];
  const fallback = letters[0] ?? (others[0] && otherSet(others[0].id));
  const [from, to] = [params.get('from') ?? fallback, params.get('to') ?? DRAFT];
  const choose = (next: { from?: string; to?: string }) =>
    setParams({ from: from ?? DRAFT, to, ...next }, { replace: true });

  const before = useVersion(path, from, sets.data);
  const after = useVersion(path, to, sets.data);
  const trouble = before.error ?? after.error ?? revisions.error ?? sets.error ?? cast.error ?? engine.error;
  const nothing = revisions.data && sets.data && from === undefined;
  return (
    <div className="page">
      <PageHeading
        title="Compare"
        below="Two versions side by side: what changed, who gains and who loses. Both keep what was known of people when they were made."
        actions={
          <Link className="link self-center" to={home}>
            Back to the room
          </Link>
        }
      />
      {nothing ? (
        <EmptyState title="One version only">
          Issue a revision, or duplicate the set to try another way, and both can be compared here.
        </EmptyState>
      ) : (
        <div className="ruled mb-6 flex flex-wrap items-end gap-x-6 gap-y-3 pt-3">
          <Select
            label="From"
            value={from ?? DRAFT}
            options={options}
            onChange={(value) => choose({ from: value })}
            className="w-60 max-phone:w-full"
          />
          <Select
            label="To"
            value={to}
            options={options}
            onChange={(value) => choose({ to: value })}
            className="w-60 max-phone:w-full"
          />
          <Button onClick={() => choose({ from: to, to: from ?? DRAFT })}>Turn round</Button>
        </div>
      )}
      {trouble && <Notice tone="wont">{sayProblem(trouble)}</Notice>}
      {!trouble && !nothing && !(before.data && after.data && cast.data && engine.data) && (
        <LoadingLine words="Fetching both versions" />
      )}
      {before.data && after.data && cast.data && engine.data && (
        <ComparedVersions
          before={before.data}
          after={after.data}
          cast={cast.data}
          ruleBook={engine.data.ruleBook}
        />
      )}
    </div>
  );
}
