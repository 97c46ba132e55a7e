import type { FitSheetPaper } from '../../fit-checks/paper/fit-sheet-paper';
import type { ShownRule } from '../shown-rules';
import type { ShownStick } from '../shown-stick';

/** All that a printed story stick says. */
export interface StickPaper extends Omit<FitSheetPaper, 'sheet' | 'ruleBook'> {
  stick: ShownStick;
  rules: readonly ShownRule[];
}

/** Where things stand across the sheet, millimetres. */
export interface Across {
  left: number;
  right: number;
  /** Names end here. */
  namesRight: number;
  /** The tape, from the least to the most value. */
  from: number;
  to: number;
  /** Columns of verdicts: at the present value, and at the tried one where there is one. */
  verdicts: readonly number[];
  x: (value: number) => number;
}

const NAMES_MM = 58;
const GUTTER_MM = 4;
const VERDICT_MM = 31;

export function across(
  { left, right }: { left: number; right: number },
  { dimension, value }: Pick<ShownStick, 'dimension' | 'value'>,
): Across {
  const count = isTried({ dimension, value }) ? 2 : 1;
  const from = left + NAMES_MM + GUTTER_MM;
  const to = right - count * VERDICT_MM - GUTTER_MM;
  const scale = (to - from) / Math.max(dimension.max - dimension.min, 1e-6);
  return {
    left,
    right,
    namesRight: left + NAMES_MM,
    from,
    to,
    verdicts: [...Array(count).keys()].map((n) => to + GUTTER_MM + n * VERDICT_MM),
    x: (at) => from + (Math.min(Math.max(at, dimension.min), dimension.max) - dimension.min) * scale,
  };
}

/** A value other than the present one was asked for. */
export const isTried = ({ dimension, value }: Pick<ShownStick, 'dimension' | 'value'>): boolean =>
  Math.abs(value - dimension.value) > 1e-6;
