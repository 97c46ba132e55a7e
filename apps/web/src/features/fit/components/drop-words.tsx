import { dropSourceWords, type CushionDrop } from '@settlewright/anthropometry';
import { formatLength } from '@settlewright/geometry';
import { Measure } from '@/components/measure.tsx';
import { useFitView } from '../fit-view.ts';

const BOTTOMS = { no: '', perhaps: '; the foam may bottom out', yes: '; the foam bottoms out' };

/** How far each cushion behind a number goes down, its range, and where that comes from. */
export function DropWords({ drops }: { drops: readonly CushionDrop[] }) {
  const { style } = useFitView();
  const show = (mm: number) => <Measure text={formatLength(mm, style)} />;
  return drops.map((drop, n) => (
    <p key={n} className="mt-2 text-sm text-ink-2">
      {drops.length > 1 ? `Cushion ${n + 1} of ${drops.length}` : 'The cushion'} goes down {show(drop.bestMm)}
      , {show(drop.lowMm)} to {show(drop.highMm)} in 90 of 100 cases{BOTTOMS[drop.bottomsOut]} (
      {dropSourceWords(drop)}
      ).
    </p>
  ));
}
