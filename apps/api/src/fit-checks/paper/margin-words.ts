import type { LengthStyle } from '@settlewright/geometry';
import { formatLength } from '@settlewright/geometry';
import { isSureOfShort, type RuleUnit } from '@settlewright/anthropometry';

/** From this half range on, a predicted margin is said in coarse steps. */
const COARSE_FROM_MM = 19.05;
/** A hair more than the tolerance within which a value is on its line. */
const EQUAL_MM = 0.1 + 1e-9;
const COARSE_STEP_MM = { millimetres: 10, 'feet-inches': 12.7, 'decimal-inches': 12.7 } as const;

/** The margin before it says the unit already. */
const UNIT_SIGN = /[\s\u202f]*(?:mm|[″°])$/u;

export interface Margin {
  margin: number | null;
  marginRange?: { low: number; high: number };
}

/** "+1½″ ± 1": room left to the fail line, or a minus for what is missing. */
export function marginWords({ margin, marginRange }: Margin, unit: RuleUnit, style: LengthStyle): string {
  if (typeof margin !== 'number') return '';
  const half = marginRange ? (marginRange.high - marginRange.low) / 2 : 0;
  const spread = half > 0 ? ` ± ${amount(half, half, unit, style).replace(UNIT_SIGN, '')}` : '';
  const words = amount(Math.abs(margin), half, unit, style);
  const isNone = words === amount(0, half, unit, style);
  if (isNone && unit === 'mm' && margin < -EQUAL_MM && isSureOfShort(margin, half)) return 'just short';
  return (isNone ? '' : margin < 0 ? '−' : '+') + words + spread;
}

/** A value or limit of a rule. */
export function valueWords(value: number, unit: RuleUnit, style: LengthStyle): string {
  const words = amount(Math.abs(value), 0, unit, style);
  return (value < 0 && words !== amount(0, 0, unit, style) ? '−' : '') + words;
}

function amount(value: number, half: number, unit: RuleUnit, style: LengthStyle): string {
  if (unit === 'deg') return `${Math.round(value * 10) / 10}°`;
  if (unit === 'count') return String(Math.round(value));
  const step = COARSE_STEP_MM[style.system];
  return formatLength(half >= COARSE_FROM_MM ? Math.round(value / step) * step : value, style);
}
