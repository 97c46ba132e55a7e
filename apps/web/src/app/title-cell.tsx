import type { ReactNode } from 'react';
import { classNames } from '@/components/class-names.ts';

/** The box of one cell of the title block. */
export const CELL =
  'quick flex h-full min-w-0 max-w-[18rem] flex-col justify-center px-5 text-left text-sm leading-[1.15rem] no-underline max-desk:px-4 max-tablet:px-3 max-tablet:max-w-[11.5rem]';
export const PRESSABLE =
  'hover:bg-sunk focus-visible:-outline-offset-2 focus-visible:z-10 data-open:bg-chalk-wash';

export function CellFace({ label, value, quiet }: { label: string; value: ReactNode; quiet?: boolean }) {
  return (
    <>
      <span className="block truncate text-xs text-ink-3">{label}</span>
      <span className={classNames('block truncate', quiet ? 'text-ink-3' : 'font-medium')}>{value}</span>
    </>
  );
}
