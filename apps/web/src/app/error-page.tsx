import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Button, LinkButton } from '@/components/button.tsx';
import { BrandMark } from '@/components/brand.tsx';
import { isMissingPart } from '@/lib/newer-version.ts';
import { Problem, sayProblem, Unreachable } from '@/lib/problem.ts';
import { usePageTitle } from '@/lib/page-title.ts';
import { NotFoundPage } from './not-found-page.tsx';

/** A page that could not be shown. What the person did is not lost by it, and there is always a way on. */
export function ErrorPage() {
  const error = useRouteError();
  const missing =
    (isRouteErrorResponse(error) && error.status === 404) ||
    (error instanceof Problem && error.status === 404);
  usePageTitle(missing ? 'Not here' : 'Trouble');
  if (missing) return <NotFoundPage />;
  const known = error instanceof Problem || error instanceof Unreachable;
  const [title, words, action] = isMissingPart(error)
    ? [
        'A newer version is there',
        'Settlewright was renewed while this page stood open, so a part of it could not be fetched. Reload to go on with the new version. What was saved stays saved, and what waits on this computer still waits.',
        'Reload',
      ]
    : known
      ? ['This page could not be fetched', sayProblem(error), 'Try again']
      : [
          'This page has a fault',
          'Something broke while it was being drawn. What was saved stays saved, and what waits on this computer still waits.',
          'Try again',
        ];
  return (
    <div className="page">
      <BrandMark size={36} />
      <h1 tabIndex={-1} data-page-heading className="mt-6 text-3xl font-light tracking-hero">
        {title}
      </h1>
      <p className="mt-2 max-w-text text-lg text-ink-2">{words}</p>
      <div className="mt-6 flex flex-wrap gap-3">
        <Button look="main" onClick={() => window.location.reload()}>
          {action}
        </Button>
        <LinkButton to="/">All productions</LinkButton>
      </div>
    </div>
  );
}
