import type { ReactNode } from 'react';
import { Measure } from '@/components/measure.tsx';
import { Notice } from '@/components/notice.tsx';
import type { OrderLife } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { useFormat } from '@/lib/format.ts';
import { SPEC_WORDS } from '../order.ts';

type Change = OrderLife['changes'][number];

const FIELD_WORDS: Record<Change['field'], string> = {
  revision: 'Revision',
  title: 'Title',
  'needed-by': 'Needed by',
  cushions: 'Cushions',
  tolerance: 'Tolerance, either way',
  cloths: 'Cloths',
  ...SPEC_WORDS,
  width: 'width',
  depth: 'depth',
  thickness: 'thickness',
  'foam-grade': 'foam',
  hand: 'hand',
  'button-count': 'buttons',
  'button-places': 'places of the buttons, mm from the seams',
};

function Side({ mm, words, field }: { mm?: number; words?: string; field: Change['field'] }): ReactNode {
  const format = useFormat();
  if (mm !== undefined) return <Measure text={format.length(mm)} />;
  if (field === 'needed-by' && words) return dayWords(words);
  return words || 'nothing';
}

/** What reads otherwise than in what was sent before, side by side. */
export function Changes({ life, revisionLetter }: { life: OrderLife; revisionLetter: string }) {
  const { earlierRevision, changes } = life;
  if (earlierRevision === null) return null;
  const replaced =
    earlierRevision === revisionLetter
      ? `Revision ${revisionLetter} was sent again.`
      : `Revision ${revisionLetter} replaces revision ${earlierRevision}.`;
  return (
    <section aria-label="What changed" className="mb-6">
      <Notice title={replaced}>
        {changes.length === 0
          ? 'No size and no word of the order changed.'
          : 'What was quoted and agreed before no longer holds: it asks for a new word.'}
      </Notice>
      {changes.length > 0 && (
        <div className="mt-3 overflow-x-auto" tabIndex={0} role="group" aria-label="Before and now">
          <table className="w-full text-left text-sm">
            <thead>
              <tr className="border-b border-ink">
                <th scope="col" className="py-1.5 pr-3 font-semibold">
                  Changed
                </th>
                <th scope="col" className="py-1.5 pr-3 font-semibold">
                  Before
                </th>
                <th scope="col" className="py-1.5 font-semibold">
                  Now
                </th>
              </tr>
            </thead>
            <tbody>
              {changes.map((change, index) => (
                <tr key={index} className="border-b border-rule align-top">
                  <th scope="row" className="py-1.5 pr-3 font-normal">
                    {change.mark ? `${change.mark}, ` : ''}
                    {FIELD_WORDS[change.field]}
                  </th>
                  <td className="py-1.5 pr-3 text-ink-2">
                    <Side mm={change.beforeMm} words={change.before} field={change.field} />
                  </td>
                  <td className="py-1.5 font-medium">
                    <Side mm={change.afterMm} words={change.after} field={change.field} />
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </section>
  );
}
