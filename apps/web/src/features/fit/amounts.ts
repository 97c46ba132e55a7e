import {
  MEASURE_INFO,
  type FitCell,
  type Outcome,
  type RuleBook,
  type RuleUnit,
  type VerdictOutcome,
} from '@settlewright/anthropometry';
import { formatAngle, formatLength, spokenLength, type LengthStyle } from '@settlewright/geometry';
import { verdictWord } from '@/components/verdict.tsx';

const INCH = 25.4;
/** A prediction this wide or wider each way is shown to the half inch or the ten millimetres. */
const WIDE_RANGE_MM = 0.75 * INCH;

/** A number of a check in its own unit. */
export function amountText(value: number, unit: RuleUnit, style: LengthStyle): string {
  if (unit === 'deg') return formatAngle(value);
  if (unit === 'count') return String(Math.round(value));
  return formatLength(value, style);
}

function coarse(valueMm: number, style: LengthStyle): number {
  const step = style.system === 'millimetres' ? 10 : INCH / 2;
  return Math.round(valueMm / step) * step;
}

function signed(text: string, value: number): string {
  return value >= 0 && !text.startsWith('−') ? `+${text}` : text;
}

/** Margin as the sheet shows it: "+1½″", and half its range when it is predicted: "± 1". */
export function marginText(
  outcome: Pick<VerdictOutcome, 'margin' | 'marginRange'>,
  unit: RuleUnit,
  style: LengthStyle,
): { margin: string; range: string | undefined } {
  const { margin, marginRange } = outcome;
  if (unit !== 'mm' || marginRange === undefined) {
    return { margin: signed(amountText(margin, unit, style), margin), range: undefined };
  }
  const half = (marginRange.high - marginRange.low) / 2;
  const rounded = half >= WIDE_RANGE_MM ? coarse(margin, style) : margin;
  const roundedHalf = half >= WIDE_RANGE_MM ? coarse(half, style) : half;
  const halfText = formatLength(roundedHalf, style).replace(/[\s\u202f]*(mm|″)$/, '');
  return {
    margin: signed(formatLength(rounded, style), rounded),
    range: halfText === '0' ? undefined : `± ${halfText}`,
  };
}

/** Short words for a column or line. */
export function checkName(ruleBook: RuleBook, cell: Pick<FitCell, 'ruleId'>): string {
  return ruleBook.rule(cell.ruleId).columnName;
}

/** What one outcome says, for a screen reader and for lines of text. */
export function outcomeWords(outcome: Outcome, unit: RuleUnit, style: LengthStyle): string {
  switch (outcome.kind) {
    case 'verdict': {
      const spoken =
        unit === 'mm' ? spokenLength(outcome.margin, style) : amountText(outcome.margin, unit, style);
      const sign = outcome.margin >= 0 ? 'plus ' : '';
      const doubt = outcome.estimated ? ', estimated' : '';
      return `${verdictWord(outcome.verdict)}${doubt}, ${sign}${spoken}`;
    }
    case 'clause':
      return `${outcome.inside ? 'inside' : 'outside'} clause ${outcome.clause}`;
    case 'information':
      return outcome.words;
    default:
      return outcome.reason;
  }
}

/** Measures as a person with a tape would name them: "elbow rest height and thigh clearance". */
export function measureWords(keys: readonly (keyof typeof MEASURE_INFO)[]): string {
  const names = keys.map((key) => MEASURE_INFO[key].name.toLowerCase());
  return new Intl.ListFormat('en', { type: 'conjunction' }).format(names);
}
