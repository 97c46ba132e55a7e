import { Button } from '@/components/button.tsx';
import { MoreIcon } from '@/components/icons.tsx';
import { Menu } from '@/components/menu.tsx';
import type { CastMember } from '@/lib/contract.ts';
import { type CastPlace, exportPath, measuringSheetPath } from '../api.ts';
import { fetchFile } from '../fetch-file.ts';

interface RowMenuProps {
  place: CastPlace;
  person: CastMember;
  onEdit: () => void;
  onErase: () => void;
}

/** What can be done with one person. */
export function RowMenu({ place, person, onEdit, onErase }: RowMenuProps) {
  if (person.removed) return null;
  return (
    <span className="flex items-center justify-end gap-4">
      <Button look="word" onClick={onEdit}>
        Edit <span className="sr-only">{person.name}</span>
      </Button>
      <Menu
        name={`More for ${person.name}`}
        button={<MoreIcon />}
        buttonClassName="quick flex size-9 items-center justify-center rounded-sm hover:bg-sunk data-open:bg-chalk-wash"
        side="end"
        entries={[
          {
            id: 'sheet',
            words: 'Measuring sheet (PDF)',
            onPress: () => fetchFile(measuringSheetPath(place), { person: person.id }),
          },
          {
            id: 'export',
            words: 'Export what is held',
            onPress: () => fetchFile(exportPath(place, person.id)),
          },
          { id: 'erase', words: 'Erase', onPress: onErase },
        ]}
      />
    </span>
  );
}
