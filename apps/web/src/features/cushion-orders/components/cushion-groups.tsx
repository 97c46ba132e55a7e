import {
  curveWords,
  cushionDrawing,
  cushionWarningWords,
  groupCushions,
  makeWords,
  orderDrop,
  orderDropWords,
  outlineExtent,
  phraseText,
  wearMark,
  wearPhrase,
  type CushionGroup,
  type CushionSpec,
} from '@settlewright/geometry';
import { Fragment, useMemo, type ReactNode } from 'react';
import { MarkTag } from '@/components/mark-tag.tsx';
import { Measure } from '@/components/measure.tsx';
import { useFormat } from '@/lib/format.ts';
import type { OrderSpec } from '../order.ts';
import {
  foamText,
  otherSystem,
  runText,
  sizeTexts,
  toleranceText,
  USUAL_TOLERANCE_MM,
} from '../size-words.ts';
import { CushionDrawing } from './cushion-drawing.tsx';

const HAND_WORDS: Record<CushionSpec['hand'], string> = {
  left: 'left hand',
  right: 'right hand',
  either: 'either hand',
};

const ALIGNED_WORDS: Record<CushionSpec['buttons']['alignedTo'], string> = {
  joints: 'on board joints',
  'board-centres': 'on board centres',
  field: 'in a field of tufts',
};

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

function Row({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="grid grid-cols-[5.5rem_1fr] gap-3 border-b border-rule py-2">
      <dt className="text-sm text-ink-2">{name}</dt>
      <dd className="text-sm font-medium break-words">{children}</dd>
    </div>
  );
}

function Facts({ spec, words }: { spec: CushionSpec; words: OrderSpec }) {
  const format = useFormat();
  const { making, make, foam, buttons } = spec;
  const sawn = making && outlineExtent(making.foam.outline);
  const closed = making?.closure;
  const drop = orderDrop(spec);
  const show = (mm: number) => <Measure text={format.length(mm)} />;
  return (
    <dl className="grid content-start gap-x-8 border-t border-rule @min-[36rem]:@max-[54rem]:grid-cols-2">
      <Row name="Place">
        {show(spec.placeMm.widthMm)} × {show(spec.placeMm.depthMm)}, wood to wood
      </Row>
      {spec.curve && <Row name="Curve">{curveWords(spec.curve, format.style)}</Row>}
      <Row name="Made">
        {spec.faults.length > 0 ? `Not as asked: ${spec.faults.join('; ')}` : makeWords(make, spec.kind)}
      </Row>
      <Row name="Foam">
        {making && sawn && (
          <>
            {show(sawn.widthMm)} × {show(sawn.depthMm)} × {show(making.foam.thicknessMm)},{' '}
          </>
        )}
        {foamText(foam, format.style)}
        {words.foam !== '' && `; ${words.foam}`}
      </Row>
      {drop && <Row name="Loaded">{orderDropWords(drop, format.style)}</Row>}
      {making && (
        <Row name="Cloth cut">
          {making.panels.map(({ name, count, cut }, i) => {
            const { widthMm, depthMm } = outlineExtent(cut);
            return (
              <Fragment key={name}>
                {i > 0 && ', '}
                {count} {name} {show(widthMm)} × {show(depthMm)}
              </Fragment>
            );
          })}
        </Row>
      )}
      {words.cover !== '' && <Row name="Cover">{words.cover}</Row>}
      {making && making.welt.lengthMm > 0 && (
        <Row name="Welt">
          {show(making.welt.lengthMm)} ({runText(making.welt.lengthMm, format.style)}) for {making.welt.seams}{' '}
          {making.welt.seams === 1 ? 'seam' : 'seams'}
          {words.welt !== '' && `; ${words.welt}`}
        </Row>
      )}
      {closed && closed.edgeMm > 0 && (
        <Row name="Closure">
          {show(closed.lengthMm)}
          {closed.wrapMm > 0 && <>, {show(closed.wrapMm)} round each corner</>}
          {words.closure !== '' && `; ${words.closure}`}
        </Row>
      )}
      {spec.warnings.length > 0 && (
        <Row name="Look at">
          {spec.warnings.map((warning) => cushionWarningWords(warning, format.style)).join(' ')}
        </Row>
      )}
      {buttons.count > 0 && (
        <Row name="Buttons">
          {buttons.count}, {ALIGNED_WORDS[buttons.alignedTo]}
          {words.buttons !== '' && `; ${words.buttons}`}
        </Row>
      )}
      {spec.wear && (
        <Row name="Wear">
          <ol aria-label={`Marked wear of ${spec.mark}`}>
            {spec.wear.map((area, i) => (
              <li key={i}>
                {wearMark(i)} {phraseText(wearPhrase(area, spec.kind), format.style)}
              </li>
            ))}
          </ol>
        </Row>
      )}
      {words.fixing !== '' && <Row name="Fixing">{words.fixing}</Row>}
    </dl>
  );
}

/** Length that a number takes on the plan, for a plan about as wide as the column. */
const NUMBER_OF_WIDTH = 0.1;

interface GroupsProps {
  words: OrderSpec;
  toleranceMm?: number;
}

function Group({ group, words, toleranceMm = USUAL_TOLERANCE_MM }: GroupsProps & { group: CushionGroup }) {
  const { spec, marks, mirroredMarks } = group;
  const { style } = useFormat();
  const { widthMm, depthMm } = spec.finishedMm;
  const other = sizeTexts(spec.finishedMm, otherSystem(style));
  const drawing = useMemo(
    () => cushionDrawing(spec, { labelMm: NUMBER_OF_WIDTH * Math.max(widthMm, depthMm) }),
    [spec, widthMm, depthMm],
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
            <span>{HAND_WORDS[group.hand]}</span>
            <span className="ml-auto font-normal text-ink-2">make {marks.length}</span>
          </h2>
          <p className="mt-3 text-2xl font-light tracking-hero whitespace-nowrap">
            <Sizes size={spec.finishedMm} />
          </p>
          <p className="text-sm text-ink-2">
            Finished, seam to seam. <Measure text={other.join(' × ')} />,{' '}
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
              <span className="text-ink-2">drawn: {HAND_WORDS[group.hand]} as sat in</span>
            )}
          </p>
          <CushionDrawing
            drawing={drawing.plan}
            label={`${marks.join(', ')}, plan with measures`}
            leastPx={500}
          />
          <p className="mt-4 border-t border-rule pt-2 text-sm text-ink-2">From the front</p>
          <CushionDrawing drawing={drawing.front} label={`${first}, front edge`} leastPx={410} />
          <p className="mt-4 border-t border-rule pt-2 text-sm text-ink-2">
            Cut from back to front, front at the right, not loaded
          </p>
          <CushionDrawing drawing={drawing.section} label={`${first}, section`} leastPx={300} mostPx={420} />
        </div>
        <Facts spec={spec} words={words} />
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
