import { joined, phrase, type Phrase } from '../units/phrase.ts';
import type { OrderCover } from './order-cover.ts';
import { marksWords } from './marks-words.ts';
import { DIRECTION_WORDS, NAP_WORDS } from './order-words.ts';

const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

/**
 * All that is said of a cloth of an order to whoever sews with it. What the workshop pays for it is its own.
 *
 * @param cover - the cloth
 */
export function clothPhrase(cover: OrderCover): Phrase {
  const { repeatMm, parts, cushionMarks, com, controlLine } = cover;
  const { acrossMm, alongMm } = repeatMm;
  return joined(
    [
      phrase`${cover.name}: ${{ mm: cover.widthMm }} wide`,
      cover.selvedgeMm > 0 ? phrase`selvedge ${{ mm: cover.selvedgeMm }}` : [],
      DIRECTION_WORDS[cover.direction],
      NAP_WORDS[cover.nap],
      acrossMm + alongMm > 0
        ? phrase`repeat ${{ mm: acrossMm }} across and ${{ mm: alongMm }} along, centered on each ${controlLine}`
        : [],
      cover.startMm > 0 ? phrase`${{ mm: cover.startMm }} left out for flaws` : [],
      phrase`bought by ${{ mm: cover.stepMm }}`,
      `for ${parts ? `the ${parts.join(' and ')}` : 'the whole cover'} of ${cushionMarks ? marksWords(cushionMarks) : 'every cushion'}`,
      com ? ownPhrase(com) : [],
    ],
    ', ',
  );
}

function ownPhrase(own: NonNullable<OrderCover['com']>): Phrase {
  const { sampleKept, dyeLot, measuredWidthMm, receivedMm, receivedOn, flaws } = own;
  return joined(
    [
      'sent in by the workshop',
      sampleKept ? 'sample kept' : [],
      dyeLot === '' ? [] : `dye lot ${dyeLot}`,
      measuredWidthMm === undefined ? [] : phrase`measured ${{ mm: measuredWidthMm }} wide`,
      receivedMm === undefined ? [] : phrase`${{ mm: receivedMm }} came`,
      receivedOn === undefined ? [] : `on ${DAY.format(new Date(receivedOn))}`,
      flaws === '' ? [] : `flaws: ${flaws}`,
    ],
    ', ',
  );
}
