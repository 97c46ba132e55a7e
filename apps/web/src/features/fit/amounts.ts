import { type FitCell, type Outcome, type RuleBook, type RuleUnit } from '@settlewright/anthropometry';
import { spokenLength, type LengthStyle } from '@settlewright/geometry';
import { verdictWord } from '@/components/verdict.tsx';
import {
  amountText,
  isSurelyShort,
  JUST_SHORT,
  knownMargin,
  REMOVED,
  type WithMargin,
} from '@/lib/margins.ts';

export { amountText, marginText, REMOVED } from '@/lib/margins.ts';

function spokenAmount(value: number, unit: RuleUnit, style: LengthStyle): string {
  if (unit === 'mm') return spokenLength(value, style);
  return amountText(value, unit, style).replace('−', 'minus ').replace('°', ' degrees');
}

/** The same margin for a screen reader: "minus seven eighths of an inch". */
function spokenMargin(outcome: WithMargin, unit: RuleUnit, style: LengthStyle): string {
  if (outcome.margin === null) return REMOVED;
  const { margin, half } = knownMargin(outcome.margin, outcome.marginRange ?? null, unit, style);
  if (isSurelyShort(margin, half, unit, style)) return JUST_SHORT;
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
