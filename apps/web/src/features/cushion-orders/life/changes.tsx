import { partText, phraseText } from '@settlewright/geometry';
import { Fragment, type ReactNode } from 'react';
import { Measure } from '@/components/measure.tsx';
import { Notice } from '@/components/notice.tsx';
import type { OrderLife } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { useFormat } from '@/lib/format.ts';
import { SPEC_WORDS } from '../order.ts';
import { OutlinePicture } from './outline-picture.tsx';

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
  make: 'make',
  outline: 'outline',
  joints: 'place in its run',
  curve: 'curve of the back',
  'foam-grade': 'foam',
  hand: 'hand',
  tufting: 'buttons and tufts',
  'button-count': 'buttons',
  'button-places': 'places of the buttons, from the seams',
  camera: 'edges the camera sees',
  'hold-down': 'hold-down',
  wear: 'marked wear',
  'cushion-notes': 'notes',
};

/** One side of a change: its words, with quantities in the units of the page, and an outline drawn. */
function Side({ change, side }: { change: Change; side: 'before' | 'after' }): ReactNode {
  const { style } = useFormat();
  const parts = change[side];
  const outline = change.outlines?.[side];
  if (parts.length === 0) return 'nothing';
  if (change.field === 'needed-by') return dayWords(phraseText(parts, style));
  return (
    <>
      {outline && <OutlinePicture outline={outline} beside={change.outlines} />}
      {parts.map((part, index) =>
        part.text === undefined ? (
          <Measure key={index} text={partText(part, style)} />
        ) : (
          <Fragment key={index}>{part.text}</Fragment>
        ),
      )}
    </>
  );
}

/** A change too small for the units of the page would look like none. */
function HairChange({ change }: { change: Change }): ReactNode {
  const { style } = useFormat();
  const { before, after } = change;
  if (phraseText(before, style) !== phraseText(after, style)) return null;
  const [from, to] = [before, after].map((parts) => (parts.length === 1 ? parts[0]?.mm : undefined));
  if (from === undefined || to === undefined) return ', moved by less than is shown';
  return `, ${Math.abs(to - from).toFixed(1)} mm ${to > from ? 'more' : 'less'}`;
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
          <table className="w-full table-fixed text-left text-sm">
            <thead>
              <tr className="border-b border-ink">
                <th scope="col" className="w-[22%] py-1.5 pr-3 font-semibold">
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
                  <th scope="row" className="py-1.5 pr-3 font-normal break-words">
                    {change.mark ? `${change.mark}, ` : ''}
                    {FIELD_WORDS[change.field]}
                  </th>
                  <td className="py-1.5 pr-3 break-words text-ink-2">
                    <Side change={change} side="before" />
                  </td>
                  <td className="py-1.5 font-medium break-words">
                    <Side change={change} side="after" />
                    <HairChange change={change} />
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
