import { create } from 'zustand';
import type { RoundTo, UnitSystem } from './contract.ts';

/** How lengths are shown: structurally the `LengthStyle` of the geometry library. */
export interface UnitStyle {
  system: UnitSystem;
  roundTo: RoundTo;
}

interface UnitChoice {
  /** What the open production says. */
  production: UnitStyle | null;
  /** What this person prefers everywhere; wins over the production. */
  personal: UnitStyle | null;
}

const KEY = 'settlewright.units';
const SYSTEMS: readonly UnitSystem[] = ['feet-inches', 'decimal-inches', 'millimetres'];

function readPersonal(): UnitStyle | null {
  try {
    const [system, roundTo] = (localStorage.getItem(KEY) ?? '').split(' ');
    const known = SYSTEMS.find((candidate) => candidate === system);
    return known === undefined ? null : { system: known, roundTo: roundTo === '8' ? 8 : 16 };
  } catch {
    return null;
  }
}

export const useUnitChoice = create<UnitChoice>(() => ({ production: null, personal: readPersonal() }));

export function setProductionUnits(style: UnitStyle | null): void {
  useUnitChoice.setState({ production: style });
}

export function choosePersonalUnits(style: UnitStyle | null): void {
  try {
    if (style === null) localStorage.removeItem(KEY);
    else localStorage.setItem(KEY, `${style.system} ${style.roundTo}`);
  } catch {
    // The choice then lasts as long as the page.
  }
  useUnitChoice.setState({ personal: style });
}

const DEFAULT_STYLE: UnitStyle = { system: 'feet-inches', roundTo: 8 };

/** The style in force: the person's own, else the production's. */
export function useUnitStyle(): UnitStyle {
  return useUnitChoice((state) => state.personal ?? state.production ?? DEFAULT_STYLE);
}

export const UNIT_WORDS: Record<UnitSystem, string> = {
  'feet-inches': 'feet, inches',
  'decimal-inches': 'decimal inches',
  millimetres: 'millimetres',
};

/** What a person may choose, with its words. */
export const UNIT_CHOICES: readonly { id: string; style: UnitStyle; words: string }[] = [
  { id: 'feet-inches-8', style: { system: 'feet-inches', roundTo: 8 }, words: 'Feet, inches, to 1/8' },
  { id: 'feet-inches-16', style: { system: 'feet-inches', roundTo: 16 }, words: 'Feet, inches, to 1/16' },
  { id: 'decimal-inches', style: { system: 'decimal-inches', roundTo: 8 }, words: 'Decimal inches' },
  { id: 'millimetres', style: { system: 'millimetres', roundTo: 8 }, words: 'Millimetres' },
];

/** The entry of `UNIT_CHOICES` a style stands for. */
export function unitChoiceId(style: UnitStyle | null): string | undefined {
  return UNIT_CHOICES.find(
    ({ style: { system, roundTo } }) =>
      system === style?.system && (system !== 'feet-inches' || roundTo === style.roundTo),
  )?.id;
}
