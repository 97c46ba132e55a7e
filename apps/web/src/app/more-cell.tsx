import { Menu } from '@/components/menu.tsx';
import { MoreIcon } from '@/components/icons.tsx';
import type { TitleCell } from '@/lib/title-cells.ts';
import { CELL, PRESSABLE } from './title-cell.tsx';

/** The cells that have no room in the title block, as one menu. */
export function MoreCell({ cells }: { cells: readonly TitleCell[] }) {
  if (cells.length === 0) return null;
  // What is no menu itself would read as the last entry of the one before.
  const plainFirst = [...cells].sort((a, b) => Number(a.menu !== undefined) - Number(b.menu !== undefined));
  return (
    <div className="flex shrink-0 border-l border-rule">
      <Menu
        name={`More: ${cells.map(({ label }) => label.toLowerCase()).join(', ')}`}
        button={<MoreIcon />}
        buttonClassName={`${CELL} ${PRESSABLE}`}
        side="end"
        entries={plainFirst.map(({ id, label, value, menu, to, onPress, disabled }) =>
          menu
            ? { id, heading: `${label}: ${value}`, entries: menu }
            : { id, words: label, detail: value, to, onPress, disabled },
        )}
      />
    </div>
  );
}
