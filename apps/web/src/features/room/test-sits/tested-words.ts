import type { Foam, FoamBuild } from '@settlewright/geometry';
import { dayWords } from '@/lib/dates.ts';

type Tested = NonNullable<Foam['tested']>;

const sitsWords = (sits: number): string => (sits === 1 ? 'one test sit' : `${sits} test sits`);

/** "By 2 test sits, the last on 3 November 2026, it goes down 1.18 times as far as estimated, give or take 13 %". */
export function testedWords({ factor, error, sits, on }: Tested): string {
  const times = factor.toFixed(2);
  const last = sits === 1 ? `on ${dayWords(on)}` : `the last on ${dayWords(on)}`;
  return `by ${sitsWords(sits)}, ${last}, it goes down ${times} times as far as estimated, give or take ${Math.round(error * 100)} %`;
}

/** "4″, in 2 layers, ½″ of wrap". */
export function builtWords({ thicknessMm, layers, wrap }: FoamBuild, length: (mm: number) => string): string {
  const more = [
    ...(layers ? [`in ${layers.length} layers`] : []),
    ...(wrap ? [`${length(wrap.thicknessMm)} of wrap`] : []),
  ];
  return [length(thicknessMm), ...more].join(', ');
}

/** Name of the undo step. */
export const takenWords = (tested: Tested | undefined): string =>
  tested ? `seat foam by ${sitsWords(tested.sits)}` : 'seat foam by the estimate';
