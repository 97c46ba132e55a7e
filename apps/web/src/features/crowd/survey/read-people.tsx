import { MEASURE_INFO } from '@settlewright/anthropometry';
import { Disclosure } from '@/components/disclosure.tsx';
import { Notice } from '@/components/notice.tsx';
import { capital } from '@/lib/capital.ts';
import type { SurveyPreview } from '@/lib/contract.ts';
import { joinWords, sentence } from '@/lib/dimension-words.ts';
import { RowFaults } from './row-faults.tsx';

/** Who can be read of the table, who is left out and why, and what will be estimated. */
export function ReadPeople({ read, isReading }: { read: SurveyPreview; isReading: boolean }) {
  const { women, men, leftOut, rows, problems, estimated, faults, faultCount } = read;
  const measures = joinWords(estimated.map((key) => MEASURE_INFO[key].plain));
  return (
    <div role="status" aria-busy={isReading} className={isReading ? 'quick opacity-60' : 'quick'}>
      {women + men + leftOut > 0 && (
        <p className="text-lg">
          {women} women and {men} men can be read
          {leftOut > 0 &&
            `; ${leftOut} of ${rows} rows ${leftOut === 1 ? 'has' : 'have'} a fault and ${leftOut === 1 ? 'is' : 'are'} left out`}
          .
        </p>
      )}
      {problems.map(({ path, message }) => (
        <Notice key={path + message} tone="wont" className="mt-2">
          {capital(sentence(message))}
        </Notice>
      ))}
      <RowFaults faults={faults} count={faultCount} />
      {estimated.length > 0 && (
        <Disclosure
          words={`${estimated.length} measures are not in the table and are estimated from the rest`}
        >
          <p className="text-sm text-ink-2">
            As they hang together in US soldiers of 2012: {measures}. Shares that read them say more of those
            soldiers than of your people.
          </p>
        </Disclosure>
      )}
    </div>
  );
}
