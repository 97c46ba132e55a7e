import {
  buildPhrase,
  curveWords,
  cushionWarningWords,
  edgeWords,
  HOLD_DOWN_WORDS,
  makeWords,
  orderDrop,
  orderDropWords,
  outlineExtent,
  panelCountWords,
  phraseText,
  wearMark,
  wearPhrase,
  type CushionSpec,
  type OrderCover,
} from '@settlewright/geometry';
import { Fragment, type ReactNode } from 'react';
import { Measure } from '@/components/measure.tsx';
import { useFormat } from '@/lib/format.ts';
import type { OrderSpec } from '../order.ts';
import { foamText, runText } from '../size-words.ts';

const ALIGNED_WORDS: Record<CushionSpec['buttons']['alignedTo'], string> = {
  joints: 'on board joints',
  'board-centres': 'on board centres',
  field: 'in a field of tufts',
};

function Row({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="grid grid-cols-[5.5rem_1fr] gap-3 border-b border-rule py-2">
      <dt className="text-sm text-ink-2">{name}</dt>
      <dd className="text-sm font-medium break-words">{children}</dd>
    </div>
  );
}

interface CushionFactsProps {
  spec: CushionSpec;
  words: OrderSpec;
  /** Cloths of the order. */
  covers: readonly OrderCover[];
}

/** Names of the cloths that cover it, and what was written of the cover. */
function Cover({ spec, words, covers }: CushionFactsProps) {
  const cloths = covers.filter(({ cushionMarks }) => cushionMarks?.includes(spec.mark) ?? true);
  const said = [...cloths.map(({ name }) => name), words.cover].filter(Boolean);
  return said.length > 0 && <Row name="Cover">{said.join('; ')}</Row>;
}

/** What follows from the finished size of a cushion, and what its maker is told. */
export function CushionFacts({ spec, words, covers }: CushionFactsProps) {
  const format = useFormat();
  const { making, make, foam, buttons } = spec;
  const sawn = making && outlineExtent(making.foam.outline);
  const closed = making?.closure;
  const board = making?.board && { ...outlineExtent(making.board.outline), ...making.board };
  const drop = orderDrop(spec);
  const built = phraseText(buildPhrase(foam, spec.finishedMm.thicknessMm), format.style);
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
        {built !== '' && `; ${built}`}
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
                {panelCountWords(count, name)} {show(widthMm)} × {show(depthMm)}
              </Fragment>
            );
          })}
        </Row>
      )}
      {board && (
        <Row name="Board">
          {show(board.widthMm)} × {show(board.depthMm)}, {show(board.thicknessMm)} plywood, beyond the
          finished thickness
        </Row>
      )}
      <Cover spec={spec} words={words} covers={covers} />
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
      {spec.cameraSides.length > 0 && (
        <Row name="Camera">
          sees the {spec.cameraSides.map((edge) => edgeWords(spec.kind)[edge]).join(', ')}
        </Row>
      )}
      {(spec.holdDown || words.fixing !== '') && (
        <Row name="Hold-down">
          {[spec.holdDown && HOLD_DOWN_WORDS[spec.holdDown], words.fixing].filter(Boolean).join('; ')}
        </Row>
      )}
      {spec.notes && <Row name="Notes">{spec.notes}</Row>}
    </dl>
  );
}
