import { useMemo } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { classNames } from '@/components/class-names.ts';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { VerdictCounts } from '@/components/verdict.tsx';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useTitleCells, type TitleCell } from '@/lib/title-cells.ts';
import { useRevisions, useSetInfo, type Revision, type SetPath } from '../api.ts';
import { RevisionView } from './revision-view.tsx';
import { momentWords } from '@/lib/dates.ts';
import { sayApproval } from './revision-words.ts';

/** All issued revisions of a set; the chosen one is shown as it was frozen. */
export function RevisionsPage({ path }: { path: SetPath }) {
  const info = useSetInfo(path);
  const revisions = useRevisions(path);
  const [params, setParams] = useSearchParams();
  const name = info.data?.name ?? 'Set';
  usePageTitle(`Revisions of ${name}`);
  const home = `/w/${path.workshopId}/p/${path.productionId}/sets/${path.setId}`;
  const cells = useMemo<TitleCell[]>(
    () => [{ id: 'set', side: 'left', order: 30, label: 'Set', value: name, to: home, shortens: true }],
    [name, home],
  );
  useTitleCells(cells);

  const list = [...(revisions.data ?? [])].sort((a, b) => b.number - a.number);
  const letter = params.get('letter') ?? list[0]?.letter;
  return (
    <div className="page">
      <PageHeading
        title={`Revisions of ${name}`}
        below="Issued revisions are frozen. Orders, quotes, papers and approvals cite them; the draft goes on."
        actions={
          list.length > 0 && (
            <Link className="link self-center" to={`${home}/compare${letter ? `?from=${letter}` : ''}`}>
              Compare{letter ? ` ${letter}` : ''} with the draft
            </Link>
          )
        }
      />
      {revisions.isError && <Notice tone="wont">{sayProblem(revisions.error)}</Notice>}
      {revisions.isPending && <PaleBars words="Fetching the revisions" />}
      {revisions.data && list.length === 0 && (
        <p className="max-w-text text-ink-2">
          Nothing is issued yet. The button “Issue revision A” stands beside the drawing of the room.
        </p>
      )}
      {list.length > 0 && (
        <div className="grid gap-x-10 gap-y-8 desk:grid-cols-[19rem_minmax(0,1fr)]">
          <nav aria-label="Revisions">
            <ul className="border-t-[1.25px] border-ink">
              {list.map((revision) => (
                <RevisionRow
                  key={revision.letter}
                  revision={revision}
                  chosen={revision.letter === letter}
                  onChoose={() => setParams({ letter: revision.letter }, { replace: true })}
                />
              ))}
            </ul>
          </nav>
          {letter !== undefined && <RevisionView key={letter} path={path} letter={letter} setName={name} />}
        </div>
      )}
    </div>
  );
}

interface RowProps {
  revision: Revision;
  chosen: boolean;
  onChoose: () => void;
}

function RevisionRow({ revision, chosen, onChoose }: RowProps) {
  return (
    <li className={classNames('border-b', chosen ? 'border-ink' : 'border-rule')}>
      <button
        type="button"
        aria-current={chosen || undefined}
        onClick={onChoose}
        className="quick flex w-full gap-4 py-3 text-left hover:bg-sunk"
      >
        <span
          className={classNames(
            'w-10 shrink-0 text-2xl leading-8',
            chosen ? 'font-normal text-chalk' : 'font-light',
          )}
        >
          {revision.letter}
        </span>
        <span className="min-w-0 flex-1 text-sm">
          <span className="block font-medium">{momentWords(revision.issuedAt)}</span>
          <span className="block text-ink-2">
            {revision.issuedBy.name}, from draft {revision.number}
          </span>
          <span className="mt-0.5 block text-ink-2">{sayApproval(revision.approval)}</span>
          <VerdictCounts counts={revision.counts} className="mt-1 text-xs" />
        </span>
      </button>
    </li>
  );
}
