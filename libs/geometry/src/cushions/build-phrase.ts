import type { Foam } from '../room/document.ts';
import { joined, phrase, type Phrase } from '../units/phrase.ts';

/**
 * Layers and wrap of a foam in the words of an order.
 *
 * @param foam - of a cushion
 * @param thicknessMm - of the foam as it is sawn
 * @returns "from the top 1″ of 25 lb on 3″ of 60 lb; ½″ of wrap over it, both faces together"; nothing of a plain foam
 */
export function buildPhrase({ ifd25N, layers = [], wrap }: Foam, thicknessMm: number): Phrase {
  const whole = layers.reduce((sum, { share }) => sum + share, 0);
  const stack = joined(
    layers.map(
      ({ share, times }) =>
        phrase`${{ mm: (share / whole) * thicknessMm }} of ${{ firmnessN: times * ifd25N }}`,
    ),
    ' on ',
  );
  return joined(
    [
      layers.length > 0 ? phrase`from the top ${stack}` : [],
      wrap ? phrase`${{ mm: wrap.thicknessMm }} of wrap over it, both faces together` : [],
    ],
    '; ',
  );
}
