import { useMemo, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { type DataColumn, DataTable } from '@/components/data-table.tsx';
import { DashedList, EmptyState } from '@/components/empty-state.tsx';
import { AddIcon } from '@/components/icons.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import type { CastMember } from '@/lib/contract.ts';
import { useFormat } from '@/lib/format.ts';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useProduction } from '@/lib/production.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { csvPath, measuringSheetPath, useCast, useMeasureNext } from '../api.ts';
import { fetchFile } from '../fetch-file.ts';
import { EraseDialog } from './erase-dialog.tsx';
import { ImportDialog } from './import-dialog.tsx';
import { nextColumn } from './next-column.tsx';
import { measureColumns, nameColumn, namesOnly } from './people-columns.tsx';
import { NextLeftOut } from './next-left-out.tsx';
import { RowMenu } from './row-menu.tsx';
import { MannequinNote } from './mannequin-note.tsx';
import { PersonDialog } from './person-dialog.tsx';

export function PeoplePage() {
  const workshop = useWorkshop();
  const production = useProduction();
  usePageTitle(`People, ${production.name}`);
  const format = useFormat();
  const place = useMemo(
    () => ({ workshopId: workshop.id, productionId: production.id }),
    [workshop.id, production.id],
  );
  const cast = useCast(place);
  const [search, setSearch] = useSearchParams();
  const adding = search.get('add') === '1' && workshop.canEdit;
  const [edited, setEdited] = useState<CastMember | null>(null);
  const [erased, setErased] = useState<CastMember | null>(null);
  const [importing, setImporting] = useState(false);
  const people = cast.data?.items ?? [];
  const next = useMeasureNext(place, workshop.canEdit).data?.items;
  const toEdit = search.get('edit');
  const field = search.get('field');
  const shown = edited ?? people.find(({ id, removed }) => id === toEdit && !removed) ?? null;
  const add = () => setSearch({ add: '1' });

  const columns = useMemo<DataColumn<CastMember>[]>(() => {
    if (!workshop.canEdit) return namesOnly;
    return [
      nameColumn,
      ...measureColumns(format),
      nextColumn(next),
      {
        id: 'actions',
        header: '',
        sortable: false,
        align: 'right',
        value: () => undefined,
        cell: (person) => (
          <RowMenu
            place={place}
            person={person}
            onEdit={() => setEdited(person)}
            onErase={() => setErased(person)}
          />
        ),
      },
    ];
  }, [workshop.canEdit, format, place, next]);

  return (
    <div className="page">
      <PageHeading
        above={production.name}
        title="People"
        actions={
          workshop.canEdit && (
            <>
              <Button onClick={() => setImporting(true)}>Add from a table</Button>
              <Button look="main" icon={<AddIcon />} onClick={add}>
                Add a person
              </Button>
            </>
          )
        }
      />
      <div className="ruled pt-4">
        {cast.isPending && <PaleBars words="Loading people" rows={6} />}
        {cast.isError && (
          <Notice tone="wont" title="The people could not be fetched">
            {sayProblem(cast.error)}
          </Notice>
        )}
        {cast.isSuccess && people.length === 0 && (
          <EmptyState
            title="Nobody yet"
            drawing={<DashedList />}
            actions={
              workshop.canEdit && (
                <Button look="main" onClick={add}>
                  Add a person
                </Button>
              )
            }
          >
            A name and a height are enough to begin with; what is measured later makes the verdicts firm.
          </EmptyState>
        )}
        {people.length > 0 && (
          <DataTable
            caption="People of this production"
            rows={people}
            columns={columns}
            rowKey={(person) => person.id}
            filterLabel="Find a person"
            nothingFound="Nobody goes by that name."
            tools={
              workshop.canEdit && (
                <span className="flex flex-wrap gap-x-5 gap-y-2">
                  <Button look="word" onClick={() => fetchFile(measuringSheetPath(place))}>
                    Measuring sheets (PDF)
                  </Button>
                  <Button look="word" onClick={() => fetchFile(csvPath(place))}>
                    All as a table (CSV)
                  </Button>
                </span>
              )
            }
          />
        )}
        {people.length > 0 && workshop.canEdit && <NextLeftOut place={place} />}
      </div>
      <div className="mt-8 grid gap-x-14 gap-y-6 desk:grid-cols-2">
        <MannequinNote />
        <section className="ruled pt-2">
          <h2 className="font-semibold">Who sees what</h2>
          <p className="mt-1 max-w-text text-sm text-ink-2">
            {workshop.canEdit
              ? 'Owner and designers see these measures. Carpenters and reviewers see names, verdicts and margins; the upholsterer never sees people.'
              : 'Heights, weights and measures are personal. As a ' +
                workshop.role +
                ' you see names here, and verdicts and margins on the fit sheet.'}
          </p>
        </section>
      </div>
      {workshop.canEdit && (
        <>
          <PersonDialog
            key={`${shown?.id ?? 'new'}|${field ?? ''}`}
            place={place}
            person={shown}
            field={field ?? undefined}
            onPrint={(id) => fetchFile(measuringSheetPath(place), { person: id })}
            open={adding || shown !== null}
            onClose={() => {
              setEdited(null);
              if (adding || toEdit !== null) setSearch({}, { replace: true });
            }}
          />
          <ImportDialog place={place} open={importing} onClose={() => setImporting(false)} />
          <EraseDialog place={place} person={erased} onClose={() => setErased(null)} />
        </>
      )}
    </div>
  );
}
