import type { StickRow } from '@settlewright/geometry';
import { memo } from 'react';
import { Disclosure } from '@/components/disclosure.tsx';
import { Measure } from '@/components/measure.tsx';
import { dimensionValue, exactValue } from '@/lib/dimension-words.ts';
import { answerWords, type Answer } from '../answers.ts';
import { useChoices } from '../choices-view.ts';

interface StickTableProps {
  caption: string;
  unit: 'mm' | 'deg' | 'N';
  rows: readonly StickRow[];
  present: number;
  answers: readonly (Answer | undefined)[];
  suggested: number | undefined;
  suggestedAnswers: readonly (Answer | undefined)[];
}

const CELL = 'border-b border-rule py-2 pr-4 text-left align-baseline';

/** The stick in words. */
export const StickTable = memo(function StickTable({
  caption,
  unit,
  rows,
  present,
  answers,
  suggested,
  suggestedAnswers,
}: StickTableProps) {
  const { ruleBook, style } = useChoices();
  const end = (value: number | undefined) =>
    value === undefined ? 'nowhere here' : <Measure text={dimensionValue(value, unit, style)} />;
  const said = (answer: Answer | undefined) => answerWords(answer, ruleBook, style);
  return (
    <Disclosure words="The same as a table">
      <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
        <table className="w-full text-sm">
          <caption className="sr-only">{caption}</caption>
          <thead className="text-xs text-ink-3">
            <tr>
              {['Sitter', 'Lowest', 'Highest', `At ${exactValue(present, unit, style)}`].map((head) => (
                <th key={head} scope="col" className={`${CELL} font-medium`}>
                  <Measure text={head} />
                </th>
              ))}
              {suggested !== undefined && (
                <th scope="col" className={`${CELL} font-medium`}>
                  <Measure text={`At ${exactValue(suggested, unit, style)}`} />
                </th>
              )}
            </tr>
          </thead>
          <tbody>
            {rows.map(({ placeId, name, estimated, tight }, n) => (
              <tr key={placeId}>
                <th scope="row" className={`${CELL} font-medium`}>
                  {name}
                  {estimated && ', est.'}
                </th>
                <td className={CELL}>{end(tight[0]?.from)}</td>
                <td className={CELL}>{end(tight.at(-1)?.to)}</td>
                <td className={CELL}>
                  <Measure text={said(answers[n])} />
                </td>
                {suggested !== undefined && (
                  <td className={CELL}>
                    <Measure text={said(suggestedAnswers[n])} />
                  </td>
                )}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Disclosure>
  );
});
