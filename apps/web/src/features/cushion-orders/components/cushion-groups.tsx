import {
  cushionDrawing,
  groupCushions,
  handednessOf,
  HANDEDNESS_WORDS,
  lengthStep,
  thicknessWords,
  type CushionGroup,
  type CushionSpec,
  type OrderCover,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { MarkTag } from '@/components/mark-tag.tsx';
import { Measure } from '@/components/measure.tsx';
import { useFormat } from '@/lib/format.ts';
import type { OrderSpec } from '../order.ts';
import { otherSystem, sizeTexts, toleranceText, USUAL_TOLERANCE_MM } from '../size-words.ts';
import { CushionDrawing } from './cushion-drawing.tsx';
import { CushionFacts } from './cushion-facts.tsx';

/** Three sizes in a row, the unit once at the end. */
function Sizes({ size }: { size: CushionSpec['finishedMm'] }) {
  const { style } = useFormat();
  const [width, depth, thickness] = sizeTexts(size, style);
  return (
    <>
      <Measure text={width} />
      <span className="px-1.5 text-base text-ink-3">×</span>
      <Measure text={depth} />
      <span className="px-1.5 text-base text-ink-3">×</span>
      <Measure text={thickness} />
    </>
  );
}

/** Narrowest plan on which the numbers of its chain still stand beside each other; longer chains lift theirs. */
const leastPlanPx = ({ buttons }: CushionSpec) =>
  Math.min(500, Math.max(340, 130 + 44 * (buttons.columns.length + 1)));

/** Length that a number takes on the plan, for a plan about as wide as the column. */
const NUMBER_OF_WIDTH = 0.1;

interface GroupsProps {
  words: OrderSpec;
  covers: readonly OrderCover[];
  toleranceMm?: number;
}

function Group({
  group,
  words,
  covers,
  toleranceMm = USUAL_TOLERANCE_MM,
}: GroupsProps & { group: CushionGroup }) {
  const { spec, marks, mirroredMarks } = group;
  const { style } = useFormat();
  const { widthMm, depthMm } = spec.finishedMm;
  const other = sizeTexts(spec.finishedMm, otherSystem(style));
  const drawing = useMemo(
    () =>
      cushionDrawing(spec, {
        labelMm: NUMBER_OF_WIDTH * Math.max(widthMm, depthMm),
        stepMm: lengthStep(style),
      }),
    [spec, widthMm, depthMm, style],
  );
  const first = marks[0] ?? '';
  const seat = spec.kind === 'seat';
  return (
    <section className="ruled @container pt-3 pb-10" aria-label={`Cushions ${marks.join(', ')}`}>
      <div className="grid gap-x-10 gap-y-4 @min-[54rem]:grid-cols-[17.5rem_minmax(0,1fr)] @min-[54rem]:grid-rows-[auto_1fr]">
        <div>
          <h2 className="flex flex-wrap items-center gap-2 font-semibold">
            {marks.map((mark) => (
              <MarkTag key={mark} timber="cushion" mark={mark} />
            ))}
            <span>{HANDEDNESS_WORDS[handednessOf(spec)]}</span>
            <span className="ml-auto font-normal text-ink-2">make {marks.length}</span>
          </h2>
          <p className="mt-3 text-2xl font-light tracking-hero whitespace-nowrap">
            <Sizes size={spec.finishedMm} />
          </p>
          <p className="text-sm text-ink-2">
            Finished, seam to seam. {thicknessWords(spec, style)} <Measure text={other.join(' × ')} />,{' '}
            <Measure text={toleranceText(toleranceMm, style)} />. {seat ? 'Seat' : 'Back'} of {spec.benchMark}
            .
          </p>
          {mirroredMarks.length > 0 && (
            <p className="mt-2 text-sm text-ink-2">{mirroredMarks.join(', ')}: the same, mirrored.</p>
          )}
        </div>
        <div className="min-w-0 @min-[54rem]:row-span-2">
          <p className="mb-2 flex flex-wrap justify-between gap-x-4">
            <b className="font-semibold">
              {first} {seat ? 'from above, back edge up' : 'from the front, top edge up'}
            </b>
            {group.hand !== 'either' && (
              <span className="text-ink-2">drawn: {HANDEDNESS_WORDS[group.hand]} as sat in</span>
            )}
          </p>
          <CushionDrawing
            drawing={drawing.plan}
            label={`${marks.join(', ')}, plan with measures`}
            leastPx={leastPlanPx(spec)}
          />
          <p className="mt-4 border-t border-rule pt-2 text-sm text-ink-2">From the front</p>
          <CushionDrawing drawing={drawing.front} label={`${first}, front edge`} leastPx={340} />
          <p className="mt-4 border-t border-rule pt-2 text-sm text-ink-2">
            Cut from back to front, front at the right, not loaded
          </p>
          <CushionDrawing drawing={drawing.section} label={`${first}, section`} leastPx={300} mostPx={420} />
        </div>
        <CushionFacts spec={spec} words={words} covers={covers} />
      </div>
    </section>
  );
}

/** Every distinct cushion of an order with its sizes and drawings. */
export function CushionGroups({ cushions, ...rest }: GroupsProps & { cushions: readonly CushionSpec[] }) {
  const groups = useMemo(() => groupCushions(cushions), [cushions]);
  if (groups.length === 0) {
    return (
      <p className="ruled py-4 text-ink-2">
        This revision has no cushioned bench, so there is nothing to order.
      </p>
    );
  }
  return groups.map((group) => <Group key={group.marks.join()} group={group} {...rest} />);
}
