import { type LengthStyle, phraseText } from '@settlewright/geometry';
import { dayInWords } from './day-in-words';
import type { OrderChange } from './life/order-changes';

/** More are left to the page of the order. */
const MOST_SAID = 12;

/** Too long to say twice on a first sheet. */
const ON_ITS_SHEET: ReadonlySet<OrderChange['field']> = new Set(['outline', 'button-places']);

/** What reads otherwise than in the earlier sending, for the first sheet; nothing where all is the same. */
export function changesOnPaper(changes: readonly OrderChange[], style: LengthStyle): string {
  const told = changes
    .filter(({ field }) => field !== 'revision')
    .map((change) => changeWords(change, style));
  const rest = told.length - MOST_SAID;
  return [...told.slice(0, MOST_SAID), ...(rest > 0 ? [`${rest} more on the order’s page`] : [])].join('; ');
}

function changeWords({ mark, field, before, after }: OrderChange, style: LengthStyle): string {
  const name = [mark, field.replace('cushion-', '').replace('-', ' ')].filter(Boolean).join(' ');
  if (ON_ITS_SHEET.has(field)) return `${name}: see its sheet`;
  const words = (parts: OrderChange['before']) => {
    const text = phraseText(parts, style) || 'nothing';
    return field === 'needed-by' && parts.length > 0 ? dayInWords(text) : text;
  };
  const [was, now] = [words(before), words(after)];
  return was === now ? `${name}: by less than is shown` : `${name}: ${now}, was ${was}`;
}
