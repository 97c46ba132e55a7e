import { classNames } from '@/components/class-names.ts';

/** The box of one cell of the title block. */
export const CELL =
  'quick flex h-full min-w-0 max-w-[18rem] flex-col justify-center px-(--cell-pad) text-left text-sm leading-[1.15rem] no-underline';
export const PRESSABLE =
  'hover:bg-sunk focus-visible:-outline-offset-2 focus-visible:z-10 data-open:bg-chalk-wash';

export function CellFace({ label, value, quiet }: { label: string; value: string; quiet?: boolean }) {
  return (
    <>
      <span className="block truncate text-xs text-ink-3" data-words>
        {label}
      </span>
      <span
        className={classNames('block truncate', quiet ? 'text-ink-3' : 'font-medium')}
        title={value}
        data-words
      >
        {value}
      </span>
    </>
  );
}
