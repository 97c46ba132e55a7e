import { SINK_ERROR, SOURCE_MARK_WORDS, type Verdict } from '@settlewright/anthropometry';
import { verdictWord } from '@/components/verdict.tsx';
import { capital } from '@/lib/capital.ts';
import { useFormat } from '@/lib/format.ts';
import { testedWords } from '../test-sits/tested-words.ts';
import type { FoamEffect, SeatUnder } from './foam-effect.ts';

const VERDICTS: readonly Verdict[] = ['fits', 'tight', 'wontFit', 'notKnown'];
const BOTTOMS = { no: '', perhaps: '; the foam may bottom out', yes: '; the foam bottoms out' };

function Seat({ seat: { name, heightMm, bottomsOut } }: { seat: SeatUnder }) {
  const { length } = useFormat();
  return (
    <li>
      {name}: seat {length(heightMm.best)} off the floor at the front, {length(heightMm.low)} to{' '}
      {length(heightMm.high)}
      {BOTTOMS[bottomsOut]}
    </li>
  );
}

/** Before and after, in words: nothing is taken until somebody says so. */
export function FoamEffectWords({
  effect,
  differs,
  isSeat,
}: {
  effect: FoamEffect;
  differs: boolean;
  isSeat: boolean;
}) {
  const { before, after, changes, tested, lightest, heaviest } = effect;
  return (
    <div className="grid gap-3 text-sm" aria-live="polite">
      {differs && (
        <>
          <table className="w-full max-w-md">
            <caption className="sr-only">Verdicts before and after</caption>
            <thead>
              <tr className="text-left text-ink-2">
                <th scope="col" className="font-normal">
                  Verdict
                </th>
                <th scope="col" className="font-normal">
                  Now
                </th>
                <th scope="col" className="font-normal">
                  With it
                </th>
              </tr>
            </thead>
            <tbody>
              {VERDICTS.map((verdict) => (
                <tr key={verdict} className="border-t border-rule">
                  <th scope="row" className="py-1 text-left font-normal">
                    {verdictWord(verdict)}
                  </th>
                  <td className="tabular-nums">{before[verdict]}</td>
                  <td className="font-medium tabular-nums">{after[verdict]}</td>
                </tr>
              ))}
            </tbody>
          </table>
          {changes.length === 0 ? (
            <p>No verdict changes.</p>
          ) : (
            <ul className="list-disc pl-5">
              {changes.map(({ words, worse }) => (
                <li key={words} className={worse ? 'font-medium' : undefined}>
                  {words}
                  {worse && ' (worse)'}
                </li>
              ))}
            </ul>
          )}
        </>
      )}
      {isSeat && (
        <>
          <p className="text-ink-2">
            {tested
              ? `${capital(testedWords(tested))}.`
              : `How far the foam goes down is an estimate, give or take ${Math.round(SINK_ERROR.share * 100)} % (${SOURCE_MARK_WORDS[SINK_ERROR.mark]}).`}{' '}
            Lightest and heaviest of those who sit here{differs ? ', with it' : ''}:
          </p>
          <ul className="list-disc pl-5">
            <Seat seat={lightest} />
            {heaviest.name !== lightest.name && <Seat seat={heaviest} />}
          </ul>
          <p className="text-ink-2">
            Verdicts count all of that range: nobody fits where it leaves that open. A test sit on the foam
            narrows it.
          </p>
        </>
      )}
    </div>
  );
}
