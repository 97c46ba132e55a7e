import { Menu } from '@/components/menu.tsx';
import {
  choosePersonalUnits,
  UNIT_CHOICES,
  UNIT_WORDS,
  unitChoiceId,
  useUnitChoice,
  useUnitStyle,
} from '@/lib/unit-choice.ts';
import { CELL, CellFace, PRESSABLE } from './title-cell.tsx';

/** Units of the open production, with a person's own choice above it. */
export function UnitsCell() {
  const style = useUnitStyle();
  const { personal, production } = useUnitChoice();
  const words = UNIT_WORDS[style.system];
  return (
    <div className="flex max-desk:hidden">
      <Menu
        name={`Units: ${words}, menu`}
        button={<CellFace label="Units" value={words} />}
        buttonClassName={`${CELL} ${PRESSABLE}`}
        side="end"
        entries={[
          {
            id: 'production',
            words: 'As the production says',
            detail: production ? UNIT_WORDS[production.system] : undefined,
            chosen: personal === null,
            onPress: () => choosePersonalUnits(null),
          },
          ...UNIT_CHOICES.map((entry) => ({
            id: entry.id,
            words: entry.words,
            chosen: unitChoiceId(personal) === entry.id,
            onPress: () => choosePersonalUnits(entry.style),
          })),
        ]}
      />
    </div>
  );
}
