import { Menu } from '@/components/menu.tsx';
import {
  choosePersonalUnits,
  UNIT_WORDS,
  type UnitStyle,
  useUnitChoice,
  useUnitStyle,
} from '@/lib/unit-choice.ts';
import { CELL, CellFace, PRESSABLE } from './title-cell.tsx';

const STYLES: readonly { style: UnitStyle; words: string }[] = [
  { style: { system: 'feet-inches', roundTo: 8 }, words: 'Feet, inches, to ⅛' },
  { style: { system: 'feet-inches', roundTo: 16 }, words: 'Feet, inches, to 1/16' },
  { style: { system: 'decimal-inches', roundTo: 8 }, words: 'Decimal inches' },
  { style: { system: 'millimetres', roundTo: 8 }, words: 'Millimetres' },
];

const same = (a: UnitStyle | null, b: UnitStyle) =>
  a?.system === b.system && (b.system !== 'feet-inches' || a.roundTo === b.roundTo);

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
          ...STYLES.map((entry) => ({
            id: entry.words,
            words: entry.words,
            chosen: same(personal, entry.style),
            onPress: () => choosePersonalUnits(entry.style),
          })),
        ]}
      />
    </div>
  );
}
