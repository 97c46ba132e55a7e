import { lazy, Suspense, useDeferredValue, useState } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { classNames } from '@/components/class-names.ts';
import { EmptyState } from '@/components/empty-state.tsx';
import { AddIcon, SearchIcon } from '@/components/icons.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useProductions } from '../api.ts';
import { FirstProduction } from './first-production.tsx';
import { ProductionRow } from './production-row.tsx';

/** Its form is fetched when somebody starts a production, not with the list. */
const ProductionDialog = lazy(async () => ({
  default: (await import('./production-dialog.tsx')).ProductionDialog,
}));

const TABS = [
  { status: 'active', words: 'At work' },
  { status: 'archived', words: 'Archived' },
] as const;

export function ProductionsPage() {
  const workshop = useWorkshop();
  const navigate = useNavigate();
  usePageTitle(`Productions, ${workshop.name}`);
  const [search, setSearch] = useSearchParams();
  const status = search.get('status') === 'archived' ? 'archived' : 'active';
  const page = Math.max(1, Number(search.get('page') ?? 1) || 1);
  const [typed, setTyped] = useState('');
  const wanted = useDeferredValue(typed.trim());
  const [creating, setCreating] = useState(false);
  const productions = useProductions(workshop.id, { status, search: wanted, page: wanted === '' ? page : 1 });
  const list = productions.data;
  const start = () => setCreating(true);
  const bare = status === 'active' && wanted === '' && list?.total === 0;
  const pages = list ? Math.ceil(list.total / list.pageSize) : 1;
  const goTo = (next: number) =>
    setSearch({ ...(status === 'archived' ? { status } : {}), page: String(next) });

  return (
    <div className="page">
      <PageHeading
        above={workshop.name}
        title="Productions"
        actions={
          workshop.canEdit &&
          !bare && (
            <Button look="main" icon={<AddIcon />} onClick={start}>
              Start a production
            </Button>
          )
        }
      />
      <div className="ruled flex flex-wrap items-center justify-between gap-x-6 gap-y-2 pt-2 pb-3">
        <nav aria-label="Which productions" className="flex gap-5">
          {TABS.map((tab) => (
            <Link
              key={tab.status}
              to={tab.status === 'active' ? '?' : `?status=${tab.status}`}
              aria-current={tab.status === status ? 'page' : undefined}
              className={classNames(
                'inline-flex min-h-9 items-center border-b-2 no-underline',
                tab.status === status
                  ? 'border-chalk font-semibold'
                  : 'border-transparent text-ink-2 hover:border-rule-strong',
              )}
            >
              {tab.words}
            </Link>
          ))}
        </nav>
        <label className="flex h-10 w-full items-center gap-2 border-b-[1.5px] border-rule-strong text-ink-2 focus-within:border-chalk tablet:w-72">
          <SearchIcon />
          <span className="sr-only">Search productions</span>
          <input
            type="search"
            value={typed}
            placeholder="Search productions"
            onChange={(event) => setTyped(event.target.value)}
            className="h-full w-full min-w-0 bg-transparent text-ink outline-none"
          />
        </label>
      </div>
      {productions.isPending && <PaleBars words="Loading productions" rows={5} />}
      {productions.isError && (
        <Notice tone="wont" title="The productions could not be fetched">
          {sayProblem(productions.error)}{' '}
          <Button look="word" onClick={() => void productions.refetch()}>
            Try again
          </Button>
        </Notice>
      )}
      {bare && <FirstProduction canEdit={workshop.canEdit} onStart={start} />}
      {list?.total === 0 && !bare && (
        <EmptyState title={wanted === '' ? 'Nothing archived' : `No production matches “${wanted}”`}>
          {wanted === ''
            ? 'A production that is struck can be archived; nothing in it is lost.'
            : 'The name and the sentence above it are searched.'}
        </EmptyState>
      )}
      {list && list.total > 0 && (
        <ul aria-busy={productions.isPlaceholderData}>
          {list.items.map((production) => (
            <ProductionRow key={production.id} workshop={workshop} production={production} />
          ))}
        </ul>
      )}
      {pages > 1 && (
        <nav aria-label="Pages of productions" className="mt-5 flex items-center gap-3 text-sm">
          <Button size="small" disabled={page <= 1} onClick={() => goTo(page - 1)}>
            Back
          </Button>
          page {page} of {pages}
          <Button size="small" disabled={page >= pages} onClick={() => goTo(page + 1)}>
            On
          </Button>
        </nav>
      )}
      {creating && (
        <Suspense>
          <ProductionDialog
            open
            workshopId={workshop.id}
            onClose={() => setCreating(false)}
            onDone={(production) => void navigate(`/w/${workshop.id}/p/${production.id}`)}
          />
        </Suspense>
      )}
    </div>
  );
}
