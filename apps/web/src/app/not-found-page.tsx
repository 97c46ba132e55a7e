import { LinkButton } from '@/components/button.tsx';
import { usePageTitle } from '@/lib/page-title.ts';

/** The address leads nowhere, or to another workshop's work: both read the same. */
export function NotFoundPage() {
  usePageTitle('Not here');
  return (
    <div className="page">
      <svg
        viewBox="0 0 240 84"
        width="240"
        height="84"
        fill="none"
        aria-hidden="true"
        className="tape mb-6 text-rule-strong"
      >
        <path
          d="M64 6 78 44h62v-8H74M82 44v24M132 44v24"
          stroke="currentColor"
          strokeWidth="1.5"
          strokeDasharray="5 4"
        />
        <path d="M4 68.5h232" stroke="var(--color-ink)" strokeWidth="1.5" />
      </svg>
      <h1 tabIndex={-1} data-page-heading className="text-3xl font-light tracking-hero">
        Nobody sits here
      </h1>
      <p className="mt-2 max-w-text text-lg text-ink-2">
        The page may have been archived, or the link belongs to a workshop you are not a member of.
      </p>
      <div className="mt-6">
        <LinkButton to="/" look="main">
          All productions
        </LinkButton>
      </div>
    </div>
  );
}
