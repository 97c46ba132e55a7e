import { Button } from '@/components/button.tsx';
import { usePageTitle } from '@/lib/page-title.ts';
import { Problem, sayProblem } from '@/lib/problem.ts';

interface Words {
  title: string;
  about: string;
  /** A line that was down may be up again; a link that was ended stays so. */
  mayTryAgain: boolean;
}

function wordsFor(error: unknown): Words {
  if (!(error instanceof Problem)) {
    return { title: 'The order cannot be fetched just now', about: sayProblem(error), mayTryAgain: true };
  }
  if (error.code === 'link-revoked') {
    return {
      title: 'This link was ended by the workshop',
      about:
        'The order may have changed or been withdrawn. Ask the workshop; if the order stands, it mails a new link.',
      mayTryAgain: false,
    };
  }
  if (error.status === 410) {
    return {
      title: 'This link has expired',
      about: 'Ask the workshop to mail a new one. What you wrote has reached it and is not lost.',
      mayTryAgain: false,
    };
  }
  if (error.status === 404) {
    return {
      title: 'No order stands behind this link',
      about:
        'Perhaps a part of it was lost on the way. Open it from the mail again, or ask the workshop for a new one.',
      mayTryAgain: false,
    };
  }
  return { title: 'The order cannot be shown', about: sayProblem(error), mayTryAgain: true };
}

/** Why a private link shows no order, and what to do. */
export function ClosedLink({ error, onTryAgain }: { error: unknown; onTryAgain: () => void }) {
  const { title, about, mayTryAgain } = wordsFor(error);
  usePageTitle(title);
  return (
    <div className="page" role="alert">
      <h1 tabIndex={-1} data-page-heading className="mb-3 text-2xl font-light tracking-hero">
        {title}
      </h1>
      <p className="mb-5 max-w-text text-ink-2">{about}</p>
      {mayTryAgain && <Button onClick={onTryAgain}>Try again</Button>}
    </div>
  );
}
