import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { EmptyState } from '@/components/empty-state.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { Select } from '@/components/select.tsx';
import { VerdictCounts } from '@/components/verdict.tsx';
import { download } from '@/lib/download.ts';
import { sayProblem } from '@/lib/problem.ts';
import type { RowOrder } from '../columns.ts';
import { useFitView } from '../fit-view.ts';
import { StandInDialog } from '../stand-in/stand-in-dialog.tsx';
import { AskedForm } from './asked-form.tsx';
import { AtOdds } from './at-odds.tsx';
import { CountedApart } from './counted-apart.tsx';
import { FitGrid } from './fit-grid.tsx';
import { FitCaution, FitConfidence, FitKey } from './fit-key.tsx';
import { FitPeople } from './fit-people.tsx';
import { MeasureNext } from './measure-next.tsx';
import { PiecesAndWays } from './pieces-and-ways.tsx';

const ORDERS: readonly { value: RowOrder; words: string }[] = [
  { value: 'place', words: 'by place' },
  { value: 'margin', words: 'worst margin first' },
  { value: 'name', words: 'by name' },
];

interface FitPageProps {
  roomTo: string;
  /** Address of the draft's fit sheet on the server, for the papers. */
  papersAt: string;
}

/** The whole sheet on a page of its own: sitters, the public, pieces and ways. */
export function FitPage({ roomTo, papersAt }: FitPageProps) {
  const { sheet, basis } = useFitView();
  const [trying, setTrying] = useState(false);
  const [order, setOrder] = useState<RowOrder>('place');
  const [problem, setProblem] = useState<string | null>(null);
  const fetchPaper = (ending: 'pdf' | 'csv') => {
    setProblem(null);
    download(`${papersAt}.${ending}`).catch((error: unknown) => setProblem(sayProblem(error)));
  };
  const nobody = sheet.rows.length === 0;
  return (
    <div className="page">
      <PageHeading
        title="Fit sheet"
        below={
          <>
            <VerdictCounts counts={sheet.counts} className="mt-2 text-lg" />
            <CountedApart className="mt-1 text-sm text-ink-2" />
          </>
        }
        actions={
          <>
            {basis?.sitters.some(({ kind }) => kind === 'cast') && (
              <Button onClick={() => setTrying(true)}>Try with a stand-in</Button>
            )}
            <Button onClick={() => fetchPaper('pdf')}>Print, PDF</Button>
            <Button onClick={() => fetchPaper('csv')}>Table, CSV</Button>
            <Link className="link self-center" to={`${roomTo}/stick`}>
              Story stick
            </Link>
            <Link className="link self-center" to={`${roomTo}/crowd`}>
              Who fits
            </Link>
            <Link className="link self-center" to={roomTo}>
              Back to the room
            </Link>
          </>
        }
      />
      {problem && (
        <Notice tone="wont" className="mb-4">
          {problem}
        </Notice>
      )}
      <div className="ruled mb-2 flex flex-wrap items-center justify-between gap-x-8 gap-y-2 pt-2">
        <div className="min-w-0 flex-1">
          <FitKey />
        </div>
        {!nobody && (
          <Select
            label="Order"
            value={order}
            options={ORDERS}
            onChange={setOrder}
            className="w-52 max-tablet:hidden"
          />
        )}
      </div>
      {nobody && (
        <EmptyState
          title="Nobody is seated"
          actions={
            <Link className="link" to={roomTo}>
              Seat people in the room
            </Link>
          }
        >
          Choose a bench in the room and say who sits at each place: somebody of the cast, or a percentile
          mannequin.
        </EmptyState>
      )}
      <FitGrid
        order={order}
        showPlace
        showPublic
        ground="paper"
        className="max-h-[calc(100dvh-2rem)] max-tablet:hidden"
      />
      <div className="tablet:hidden">
        <FitPeople showPublic />
      </div>
      <div className="mt-10">
        <PiecesAndWays />
      </div>
      <MeasureNext />
      <AtOdds />
      <AskedForm />
      <StandInDialog open={trying} onClose={() => setTrying(false)} />
      <div className="mt-6 flex flex-wrap justify-between gap-x-8 gap-y-2">
        <p className="text-sm text-ink-2 max-tablet:hidden">
          Arrow keys move between cells, Enter opens one, Escape closes it.
        </p>
        <div className="grid gap-1">
          <FitConfidence />
          <FitCaution />
        </div>
      </div>
    </div>
  );
}
