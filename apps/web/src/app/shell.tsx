import { Suspense } from 'react';
import { Navigate, Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { LoadingLine } from '@/components/loading.tsx';
import { useSession } from '@/lib/session.ts';
import { ConnectionBar } from './connection-bar.tsx';
import { RouteFocus } from './route-focus.tsx';
import { Toasts } from './toasts.tsx';
import { TitleBlock } from './title-block.tsx';
import { useHome } from './use-home.ts';

/** The signed-in frame: title block, the page on its sheet, and nothing else. */
export function Shell() {
  const status = useSession((state) => state.status);
  const location = useLocation();
  const home = useHome();
  if (status === 'unknown') {
    return (
      <div className="page">
        <LoadingLine words="Opening the workshop" />
      </div>
    );
  }
  if (status === 'signed-out') {
    const back = `${location.pathname}${location.search}`;
    return <Navigate to={back === '/' ? '/sign-in' : `/sign-in?back=${encodeURIComponent(back)}`} replace />;
  }
  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#page"
        className="fixed top-[-5rem] left-4 z-50 rounded-sm bg-chalk px-4 py-2 text-on-chalk focus:top-2"
        onClick={(event) => {
          event.preventDefault();
          document.getElementById('page')?.focus();
        }}
      >
        Skip to the page
      </a>
      <TitleBlock home={home} />
      <ConnectionBar />
      <main id="page" tabIndex={-1} className="flex min-h-0 flex-1 flex-col outline-none">
        <Suspense
          fallback={
            <div className="page">
              <LoadingLine words="Fetching the page" />
            </div>
          }
        >
          <Outlet />
        </Suspense>
      </main>
      <RouteFocus />
      <ScrollRestoration />
      <Toasts />
    </div>
  );
}
