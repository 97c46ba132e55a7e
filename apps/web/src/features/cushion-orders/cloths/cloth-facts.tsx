import {
  buyWords,
  chartNote,
  DIRECTION_WORDS,
  marksWords,
  NAP_WORDS,
  type ClothOfOrder,
} from '@settlewright/geometry';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useFormat } from '@/lib/format.ts';
import { sayProblem } from '@/lib/problem.ts';
import { moneyText } from '../life/money.ts';
import { askLay } from './ask-lay.ts';
import { clothLength, priceWords } from './cloth-words.ts';

function Fact({ words, children }: { words: string; children: ReactNode }) {
  return (
    <div className="grid gap-x-4 border-b border-rule py-1.5 phone:grid-cols-[9rem_1fr]">
      <dt className="text-ink-2">{words}</dt>
      <dd>{children}</dd>
    </div>
  );
}

/** One cloth: what was said of it, and what to buy; by the chart at once, by its layout a moment later. */
export function ClothFacts({ cloth, assumed }: { cloth: ClothOfOrder; assumed: boolean }) {
  const { style, length } = useFormat();
  const layout = useQuery({
    queryKey: ['cloth-layout', cloth.cloth, cloth.cover, cloth.panels],
    queryFn: () => askLay(cloth),
    retry: false,
    staleTime: Infinity,
  });
  const laid = layout.data ?? undefined;
  const { cover, marks } = cloth;
  const { acrossMm, alongMm } = cover.repeatMm;
  const inches = (mm: number) => length(mm, { feet: false });
  const { missing } = buyWords(cloth);
  const long = (mm: number) => clothLength(mm, style);
  const cost = laid?.cost ?? cloth.cost;
  const note = laid && chartNote(cloth, laid, style);
  return (
    <dl className="text-sm">
      <Fact words="Cloth to buy">
        {laid ? (
          <>
            {missing && 'at least '}
            <b className="font-semibold">{long(laid.buyMm)}</b>
          </>
        ) : cloth.buyMm !== undefined && !missing ? (
          `about ${long(cloth.buyMm)} by the chart`
        ) : (
          'not known yet'
        )}
        {assumed && laid && ', as assumed'}
        {laid && `, ${Math.round(100 * laid.waste)} % of it waste`}
        {layout.isPending && ', being laid'}
      </Fact>
      {missing && <Fact words="Not in it">{missing}</Fact>}
      {layout.error && <Fact words="Layout">{sayProblem(layout.error)}</Fact>}
      {laid?.chartMm !== undefined && <Fact words="Chart of the trade">{long(laid.chartMm)}</Fact>}
      {note && <Fact words="Note">{note}</Fact>}
      {cost && (
        <Fact words="Cost">
          {missing && 'at least '}
          {moneyText(cost.totalMinor, cost.currency)}
          {cost.wasteMinor !== undefined &&
            `, ${moneyText(cost.wasteMinor, cost.currency)} of it for what is wasted`}
        </Fact>
      )}
      {cover.pricePerMetreMinor !== undefined && cover.currency && (
        <Fact words="Price">{priceWords(cover.pricePerMetreMinor, cover.currency, style)}</Fact>
      )}
      <Fact words="Roll">
        {inches(cloth.cloth.widthMm)} wide{cover.com?.measuredWidthMm === undefined ? '' : ' as measured'},{' '}
        {DIRECTION_WORDS[cover.direction]}, {NAP_WORDS[cover.nap]}
      </Fact>
      {acrossMm + alongMm > 0 && (
        <Fact words="Repeat">
          {inches(alongMm)} along, {inches(acrossMm)} across, centered on{' '}
          {cover.controlLine === 'run' ? 'the run' : 'each cushion'}
        </Fact>
      )}
      {cover.startMm > 0 && <Fact words="Left out for flaws">{inches(cover.startMm)}</Fact>}
      <Fact words="Covers">
        {cover.parts ? `${cover.parts.join(' and ')} of ` : ''}
        {marksWords(marks) || 'no cushion of this order'}
      </Fact>
      {cover.com && (
        <Fact words="Our own cloth">
          {[
            cover.com.sampleKept ? 'sample kept' : 'no sample kept',
            cover.com.dyeLot ? `dye lot ${cover.com.dyeLot}` : 'dye lot not said',
            cover.com.receivedMm === undefined ? 'not yet received' : `${long(cover.com.receivedMm)} came`,
            cover.com.flaws ? `flaws: ${cover.com.flaws}` : 'no flaws written down',
          ].join('; ')}
          {laid?.spareMm !== undefined && (
            <span className={laid.spareMm < 0 ? 'font-medium text-wont' : undefined}>
              ;{' '}
              {laid.spareMm < 0
                ? `short by ${long(-laid.spareMm)}`
                : `${long(laid.spareMm)} to spare${missing ? ' at most' : ''}`}
            </span>
          )}
        </Fact>
      )}
    </dl>
  );
}
