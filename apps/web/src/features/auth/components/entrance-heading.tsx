import type { ReactNode } from 'react';
import { usePageTitle } from '@/lib/page-title.ts';

interface EntranceHeadingProps {
  title: string;
  tab: string;
  children?: ReactNode;
}

export function EntranceHeading({ title, tab, children }: EntranceHeadingProps) {
  usePageTitle(tab);
  return (
    <div className="mb-7">
      <h1
        tabIndex={-1}
        data-page-heading
        className="text-3xl leading-[3.25rem] font-light tracking-hero text-balance max-tablet:text-2xl max-tablet:leading-10"
      >
        {title}
      </h1>
      {children && <div className="mt-3 text-ink-2">{children}</div>}
    </div>
  );
}
