import { useMemo } from 'react';
import type { TitleCell } from '@/lib/title-cells.ts';
import {
  choosePersonalUnits,
  UNIT_CHOICES,
  UNIT_WORDS,
  unitChoiceId,
  useUnitChoice,
  useUnitStyle,
} from '@/lib/unit-choice.ts';

/** Units of the open production, with a person's own choice above it. */
export function useUnitsCell(): TitleCell {
  const { system } = useUnitStyle();
  const { personal, production } = useUnitChoice();
  return useMemo(
    () => ({
      id: 'units',
      side: 'right',
      order: 30,
      label: 'Units',
      value: UNIT_WORDS[system],
      yields: 60,
      menu: [
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
      ],
    }),
    [system, personal, production],
  );
}
