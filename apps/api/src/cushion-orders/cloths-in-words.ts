import { DIRECTION_WORDS, NAP_WORDS, type OrderCover } from '@settlewright/geometry';

/**
 * All that is said of the cloths of an order, to set beside what was said before; lengths in millimetres. What the
 * workshop pays for them is its own.
 */
export const clothsInWords = (covers: readonly OrderCover[]): string => covers.map(clothInWords).join('; ');

function clothInWords(cover: OrderCover): string {
  const { repeatMm, parts, cushionMarks, com } = cover;
  return [
    `${cover.name}: ${mm(cover.widthMm)} wide`,
    cover.selvedgeMm > 0 && `selvedge ${mm(cover.selvedgeMm)}`,
    DIRECTION_WORDS[cover.direction],
    NAP_WORDS[cover.nap],
    repeatMm.acrossMm + repeatMm.alongMm > 0 &&
      `repeat ${mm(repeatMm.acrossMm)} across and ${mm(repeatMm.alongMm)} along, centered on each ${cover.controlLine}`,
    cover.startMm > 0 && `${mm(cover.startMm)} left out for flaws`,
    `bought by ${mm(cover.stepMm)}`,
    `for ${parts?.join(', ') ?? 'the whole cover'} of ${cushionMarks?.join(', ') ?? 'every cushion'}`,
    com && ownInWords(com),
  ]
    .filter((words) => words !== false && words !== undefined)
    .join(', ');
}

function ownInWords({ sampleKept, dyeLot, measuredWidthMm, receivedMm, receivedOn, flaws }: Own): string {
  return [
    'sent in by the workshop',
    sampleKept && 'sample kept',
    dyeLot !== '' && `dye lot ${dyeLot}`,
    measuredWidthMm !== undefined && `measured ${mm(measuredWidthMm)} wide`,
    receivedMm !== undefined && `${mm(receivedMm)} came`,
    receivedOn !== undefined && `on ${receivedOn}`,
    flaws !== '' && `flaws: ${flaws}`,
  ]
    .filter((words) => words !== false)
    .join(', ');
}

type Own = NonNullable<OrderCover['com']>;

const mm = (length: number): string => `${Math.round(length * 10) / 10} mm`;
