import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

interface RuleHeadingProps {
  children: ReactNode;
  /** Stands at the right on the same line. */
  aside?: ReactNode;
  level?: 2 | 3;
  id?: string;
  className?: string;
}

/** A group of a page: an ink rule above, words, space below. No box. */
export function RuleHeading({ children, aside, level = 2, id, className }: RuleHeadingProps) {
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <div
      className={classNames(
        'ruled flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1 pt-2 pb-2',
        className,
      )}
    >
      <Heading id={id} className="font-semibold">
        {children}
      </Heading>
      {aside}
    </div>
  );
}
