import type { Dimension } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { classNames } from '@/components/class-names.ts';
import { Measure } from '@/components/measure.tsx';
import { aboutInHundred, exactValue, joinWords } from '@/lib/dimension-words.ts';
import type { CastMap } from '@settlewright/geometry';
import { useChoices } from '../choices-view.ts';
import type { PricedPair } from '../pair-costs.ts';
import { shortName } from '@/lib/short-name.ts';

interface BestPairsProps {
  pairs: readonly PricedPair[];
  map: CastMap;
  /** The public is counted; a share that is missing then is not known. */
  isCounted: boolean;
  first: Dimension;
  second: Dimension;
  onTake: ((pair: PricedPair) => void) | undefined;
}

const CELL = 'border-b border-rule py-2 pr-5 text-left align-baseline';

/** The best pairs of values in words; the map for those who do not see it. */
export function BestPairs({ pairs, map, isCounted, first, second, onTake }: BestPairsProps) {
  const { style } = useChoices();
  const people = map.regions.length;
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Best pairs of values">
      <table className="w-full text-sm">
        <caption className="pb-2 text-left font-semibold">Best pairs of values</caption>
        <thead className="text-xs text-ink-3">
          <tr>
            {[first.label, second.label, 'Seated here', 'Public'].map((head) => (
              <th key={head} scope="col" className={`${CELL} font-medium`}>
                {head}
              </th>
            ))}
            {onTake && (
              <td className={CELL}>
                <span className="sr-only">Take it</span>
              </td>
            )}
          </tr>
        </thead>
        <tbody>
          {pairs.map((pair) => {
            const [a, b] = [
              exactValue(pair.across, first.unit, style),
              exactValue(pair.up, second.unit, style),
            ];
            const [lost, unknown] = [namesAt(map, pair, 'lost'), namesAt(map, pair, 'notKnown')];
            return (
              <tr key={`${pair.across} ${pair.up}`}>
                <td className={CELL}>
                  <Measure text={a} />
                </td>
                <td className={CELL}>
                  <Measure text={b} />
                </td>
                <td className={CELL}>
                  {pair.served === people ? `all ${people} served` : `${pair.served} of ${people} served`}
                  {lost.length > 0 && `; ${joinWords(lost)} won’t fit`}
                  {unknown.length > 0 && `; ${joinWords(unknown)} not known`}
                  <span className={classNames('block', pair.costs.length > 0 ? 'text-wont' : 'text-ink-2')}>
                    {pair.costs.length > 0 ? `Turns away ${pair.costs.join('; ')}` : 'Turns nobody away'}
                    {pair.lesser > 0 && `. ${pair.lesser} more turn worse`}.
                  </span>
                </td>
                <td className={CELL}>
                  {pair.share !== undefined
                    ? aboutInHundred(pair.share)
                    : isCounted
                      ? 'not known'
                      : 'not counted yet'}
                </td>
                {onTake && (
                  <td className={CELL}>
                    <Button look="word" onClick={() => onTake(pair)}>
                      Take both
                      <span className="sr-only">
                        , {a} and {b}
                      </span>
                    </Button>
                  </td>
                )}
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

function namesAt({ across, up, regions }: CastMap, pair: PricedPair, state: 'lost' | 'notKnown'): string[] {
  const [i, j] = [up.indexOf(pair.up), across.indexOf(pair.across)];
  return regions.filter(({ states }) => states[i]?.[j] === state).map(({ name }) => shortName(name));
}
