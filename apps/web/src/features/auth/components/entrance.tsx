import { lazy, Suspense } from 'react';
import { Link, Outlet } from 'react-router-dom';
import { Wordmark } from '@/components/brand.tsx';

/** The form comes first; the drawing may arrive after it. */
const BayDrawing = lazy(async () => ({ default: (await import('../drawing/bay-drawing.tsx')).BayDrawing }));

/** The pages before the workshop: a form on the paper, the drawing on its sheet beside it. */
export function Entrance() {
  return (
    <div className="grid min-h-dvh desk:grid-cols-[33rem_1fr]">
      <main className="flex flex-col px-[4.5rem] py-9 max-tablet:px-4 max-tablet:py-6">
        <Link to="/sign-in" aria-label="Settlewright, sign in" className="self-start no-underline">
          <Wordmark />
        </Link>
        <div className="w-full max-w-[24.5rem] flex-1 pt-12 max-tablet:pt-8">
          <Outlet />
        </div>
        <p className="mt-10 max-w-[24.5rem] text-xs text-ink-3">
          Guidance, not certification. Body data describe surveyed groups, not a person: try the seat.
        </p>
      </main>
      <aside className="hidden min-h-0 flex-col border-l border-ink bg-sheet desk:sticky desk:top-0 desk:flex desk:h-dvh">
        <div className="min-h-0 flex-1 px-6 pt-4">
          <Suspense>
            <BayDrawing />
          </Suspense>
        </div>
        <p className="ruled mx-10 py-5 text-xl leading-8 font-light">
          The seat is <b className="font-semibold">18″</b> off the floor with the cushion pressed. He fits;
          her heels hang{' '}
          <b className="font-semibold whitespace-nowrap">
            1<span className="frac">3/4</span>″
          </b>{' '}
          clear of it.
        </p>
      </aside>
    </div>
  );
}
