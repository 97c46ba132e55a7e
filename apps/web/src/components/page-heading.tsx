import type { ReactNode } from 'react';

interface PageHeadingProps {
  title: string;
  /** Quiet line above, as a drawing names its job. */
  above?: ReactNode;
  /** Quiet line below. */
  below?: ReactNode;
  actions?: ReactNode;
}

/** The name of the page; takes the focus when the page opens. */
export function PageHeading({ title, above, below, actions }: PageHeadingProps) {
  return (
    <div className="mb-6 flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
      <div className="min-w-0">
        {above && <div className="text-sm text-ink-2">{above}</div>}
        <h1
          tabIndex={-1}
          data-page-heading
          className="text-3xl font-light tracking-hero text-balance break-words max-tablet:text-2xl"
        >
          {title}
        </h1>
        {below && <div className="mt-1 max-w-text text-ink-2">{below}</div>}
      </div>
      {actions && <div className="flex flex-wrap gap-3">{actions}</div>}
    </div>
  );
}
