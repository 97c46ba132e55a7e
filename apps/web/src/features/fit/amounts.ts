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

/** Stands where a number was: it went with the person it told of. */
export const REMOVED = 'removed';

/** A number of a check in its own unit. */
export function amountText(value: number, unit: RuleUnit, style: LengthStyle): string {
  if (unit === 'deg') return formatAngle(value);
  if (unit === 'count') return String(Math.round(value));
  return formatLength(value, style);
}

function spokenAmount(value: number, unit: RuleUnit, style: LengthStyle): string {
  if (unit === 'mm') return spokenLength(value, style);
  return amountText(value, unit, style).replace('−', 'minus ').replace('°', ' degrees');
}

function coarse(valueMm: number, style: LengthStyle): number {
  const step = style.system === 'millimetres' ? 10 : INCH / 2;
  return Math.round(valueMm / step) * step;
}

function signed(text: string, value: number): string {
  return value >= 0 && !text.startsWith('−') ? `+${text}` : text;
}

/** The margin of a verdict; a stored sheet has lost those of people who were removed. */
type WithMargin = { margin: number | null; marginRange?: VerdictOutcome['marginRange'] | null };

/** Margin and half its range, rounded to what is known; no range where nothing was predicted. */
function knownMargin(
  margin: number,
  range: VerdictOutcome['marginRange'] | null,
  unit: RuleUnit,
  style: LengthStyle,
): { margin: number; half: number | undefined } {
  if (unit !== 'mm' || !range) return { margin, half: undefined };
  const half = (range.high - range.low) / 2;
  if (half < WIDE_RANGE_MM) return { margin, half };
  return { margin: coarse(margin, style), half: coarse(half, style) };
}

/** Margin as the sheet shows it: "+1½″", and half its range when it is predicted: "± 1". */
export function marginText(
  outcome: WithMargin,
  unit: RuleUnit,
  style: LengthStyle,
): { margin: string; range: string | undefined } {
  if (outcome.margin === null) return { margin: REMOVED, range: undefined };
  const { margin, half } = knownMargin(outcome.margin, outcome.marginRange ?? null, unit, style);
  const text = signed(amountText(margin, unit, style), margin);
  if (half === undefined) return { margin: text, range: undefined };
  const halfText = formatLength(half, style).replace(/[\s\u202f]*(mm|″)$/, '');
  return { margin: text, range: halfText === '0' ? undefined : `± ${halfText}` };
}

/** The same margin for a screen reader: "minus seven eighths of an inch". */
function spokenMargin(outcome: WithMargin, unit: RuleUnit, style: LengthStyle): string {
  if (outcome.margin === null) return REMOVED;
  const { margin, half } = knownMargin(outcome.margin, outcome.marginRange ?? null, unit, style);
  const spoken = spokenAmount(margin, unit, style);
  const sign = spoken.startsWith('minus') ? '' : 'plus ';
  const doubt = half === undefined ? '' : `, give or take ${spokenAmount(half, unit, style)}`;
  return `${sign}${spoken}${doubt}`;
}

/** Short words for a column or line. */
export function checkName(ruleBook: RuleBook, cell: Pick<FitCell, 'ruleId'>): string {
  return ruleBook.rule(cell.ruleId).columnName;
}

/** What one outcome says, for a screen reader and for lines of text. */
export function outcomeWords(outcome: Outcome, unit: RuleUnit, style: LengthStyle): string {
  switch (outcome.kind) {
    case 'verdict': {
      const doubt = outcome.estimated ? ', estimated' : '';
      return `${verdictWord(outcome.verdict)}${doubt}, ${spokenMargin(outcome, unit, style)}`;
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

/** First name for lines where room is short; a mannequin keeps "Woman, 5th". */
export function shortName(name: string): string {
  const [mannequin] = /^(Woman|Man), \d+\w\w/.exec(name) ?? [];
  return mannequin ?? name.split(' ')[0] ?? name;
}
