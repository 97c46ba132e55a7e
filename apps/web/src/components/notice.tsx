import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

interface NoticeProps {
  /** `wont` for what failed, `ink` for what is worth knowing. */
  tone?: 'wont' | 'ink';
  title?: string;
  children?: ReactNode;
  className?: string;
}

/** A thick rule at the left and a sentence: trouble, or what changed. */
export function Notice({ tone = 'ink', title, children, className }: NoticeProps) {
  return (
    <div
      role={tone === 'wont' ? 'alert' : undefined}
      className={classNames(
        'border-l-4 py-1 pl-4',
        tone === 'wont' ? 'border-wont' : 'border-rule-strong',
        className,
      )}
    >
      {title && <p className="text-lg">{title}</p>}
      {children && (
        <div className={classNames('max-w-text', title ? 'text-ink-2' : 'text-ink')}>{children}</div>
      )}
    </div>
  );
}
