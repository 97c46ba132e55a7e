import { classNames } from './class-names.ts';

export type MarkTimber = 'bench' | 'table' | 'sill' | 'cushion' | 'wall' | 'seat';

const TIMBERS: Record<MarkTimber, string> = {
  bench: 'border-oak-3 bg-oak-1',
  table: 'border-walnut-3 bg-oak-2',
  sill: 'border-walnut-2 bg-sitter-6',
  cushion: 'border-cloth-3 bg-sitter-1',
  wall: 'border-rule-strong bg-sunk text-ink!',
  seat: 'border-walnut-2 bg-oak-1',
};

const BY_KIND: Record<string, MarkTimber> = {
  bench: 'bench',
  table: 'table',
  sill: 'sill',
  bulkhead: 'wall',
  overhead: 'wall',
  'loose-seat': 'seat',
};

/** Which timber the tag of a piece is cut from. */
export function timberOf(kind: string): MarkTimber {
  return BY_KIND[kind] ?? 'bench';
}

interface MarkTagProps {
  mark: string;
  timber: MarkTimber;
  selected?: boolean;
  className?: string;
}

/** The timber says what kind of piece it is, the letters say which. */
export function MarkTag({ mark, timber, selected = false, className }: MarkTagProps) {
  return (
    <span
      className={classNames(
        'inline-block min-w-[2.6rem] rounded-[1px] border-l-[5px] px-[7px] py-px text-center text-sm font-semibold',
        selected ? 'border-ink bg-ink text-paper' : classNames('text-on-timber', TIMBERS[timber]),
        className,
      )}
    >
      {mark}
    </span>
  );
}
