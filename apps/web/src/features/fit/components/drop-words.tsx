import { SINK_ERROR, SOURCE_MARK_WORDS, type CushionDrop } from '@settlewright/anthropometry';
import { formatLength } from '@settlewright/geometry';
import { Measure } from '@/components/measure.tsx';
import { useFitView } from '../fit-view.ts';

const BOTTOMS = { no: '', perhaps: '; the foam may bottom out', yes: '; the foam bottoms out' };

/** What a drop rests on: the estimate with its mark, or test sits. */
const restsOn = ({ error, sits }: CushionDrop): string => {
  const range = `give or take ${Math.round(error * 100)} %`;
  if (sits === 0) return `estimate, ${range}, ${SOURCE_MARK_WORDS[SINK_ERROR.mark]}`;
  return `by ${sits} test ${sits === 1 ? 'sit' : 'sits'}, ${range}`;
};

/** How far each cushion behind a number goes down, its range, and where that comes from. */
export function DropWords({ drops }: { drops: readonly CushionDrop[] }) {
  const { style } = useFitView();
  const show = (mm: number) => <Measure text={formatLength(mm, style)} />;
  return drops.map((drop, n) => (
    <p key={n} className="mt-2 text-sm text-ink-2">
      {drops.length > 1 ? `Cushion ${n + 1} of ${drops.length}` : 'The cushion'} goes down {show(drop.bestMm)}
      , {show(drop.lowMm)} to {show(drop.highMm)} in 90 of 100 cases{BOTTOMS[drop.bottomsOut]} (
      {restsOn(drop)}
      ).
    </p>
  ));
}
