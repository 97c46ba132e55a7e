import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

/** A small sheet laid over the work. */
export function Slip({ children, className }: { children: ReactNode; className?: string }) {
  return <div className={classNames('rounded-md bg-sheet px-5 py-4 shadow-slip', className)}>{children}</div>;
}
