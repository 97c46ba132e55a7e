import type { StoryStick } from '@settlewright/geometry';
import { useId, useMemo, useRef } from 'react';
import { Measure } from '@/components/measure.tsx';
import { Notice } from '@/components/notice.tsx';
import { PopulationFields } from '@/components/population-fields.tsx';
import { CROWD_WEAR, crowdWords, type CrowdChoice } from '@/lib/crowd/crowds.ts';
import { useWidth } from '@/lib/use-width.ts';
import { aboutInHundred, dimensionValue, exactValue } from '@/lib/dimension-words.ts';
import { boardLayout } from '../board-layout.ts';
import { useChoices } from '../choices-view.ts';
import { commonWords, countsWords } from '../common-words.ts';
import { stickBands } from '@settlewright/geometry';
import type { TriedValues } from '../tried-values.ts';
import type { AskedCrowd } from '../use-crowd.ts';
import { shareAt, useShareCurves } from '../use-share-curve.ts';
import { stickPaper } from '../stick-paper.ts';
import { useResting } from '../use-resting.ts';
import { useRejection } from '../use-rejection.ts';
import { useStickValues } from '../use-stick-values.ts';
import { sayValue } from '../words.ts';
import { Decision } from './decision.tsx';
import { PlumbSlider } from './plumb-slider.tsx';
import { PublicWords } from './public-words.tsx';
import { SaveStick } from './save-stick.tsx';
import { StickBoard } from './stick-board.tsx';
import { StickLegend } from './stick-legend.tsx';
import { StickTable } from './stick-table.tsx';

interface StickDeskProps {
  tried: TriedValues;
  stick: StoryStick;
  rule: string;
  crowd: CrowdChoice;
  asked: AskedCrowd;
  onCrowd: (crowd: CrowdChoice) => void;
}

const WIDTH = 962;

/** The stick, the hand on its plumb line, and the choice beside it. */
export function StickDesk({ tried, stick, rule, crowd, asked, onCrowd }: StickDeskProps) {
  const { ruleBook, style } = useChoices();
  const { dimension } = tried;
  const { unit } = dimension;
  const drawing = useRef<SVGSVGElement>(null);
  const [measure, width = WIDTH] = useWidth();
  const values = useStickValues(tried, stick, rule);
  const { rows, ruleIds, present, trying, shown, offer, suggested, answersAt } = values;
  const rested = useResting(trying);
  const resting = trying === undefined ? undefined : rested;
  const aboutKeys = useId();
  const counted = useMemo(() => [...ruleIds], [ruleIds]);
  const { curves, fault = asked.fault } = useShareCurves(tried, counted, asked.request);
  const rejection = useRejection(curves, asked.request);
  const bands = useMemo(() => stickBands(stick, ruleBook, style), [stick, ruleBook, style]);
  const layout = useMemo(
    () =>
      boardLayout({
        width,
        rows: rows.length,
        bands: bands.length,
        min: dimension.min,
        max: dimension.max,
      }),
    [width, rows, bands, dimension],
  );
  const answers = useMemo(() => answersAt(shown), [answersAt, shown]);
  const presentAnswers = useMemo(() => answersAt(present), [answersAt, present]);
  const suggestedAnswers = useMemo(
    () => (suggested === undefined ? [] : answersAt(suggested)),
    [answersAt, suggested],
  );
  const whole = useMemo(() => crowdWords(crowd, asked.options), [crowd, asked]);
  const crowdLines = useMemo(() => whole.split(/(?<=,) /), [whole]);
  const share = curves && shareAt(curves.points, shown);
  const words = [
    sayValue(shown, unit, style),
    countsWords(answers.map((answer) => answer?.outcome.verdict)),
    ...(share === undefined ? [] : [aboutInHundred(share)]),
  ].join('; ');
  const hung = resting ?? present;
  const paper = useMemo(
    () => stickPaper(dimension, hung, rule, crowd, asked.options, style),
    [dimension, hung, rule, crowd, asked.options, style],
  );
  const common = useMemo(
    () => commonWords(stick, { present, step: tried.step, style }),
    [stick, present, tried, style],
  );
  const below = useMemo(() => [common, ...bands.map((band) => band.words)], [common, bands]);
  return (
    <div className="grid gap-x-9 gap-y-6 desk:grid-cols-[minmax(0,1fr)_20rem] desk:grid-rows-[auto_1fr]">
      <div className="min-w-0">
        <div ref={measure} className="relative">
          <StickBoard
            ref={drawing}
            layout={layout}
            stick={stick}
            rows={rows}
            bands={bands}
            curves={curves}
            crowd={crowdLines}
            shown={shown}
            start={trying === undefined ? undefined : present}
            answers={answers}
            suggested={suggested}
            suggestedAnswers={suggestedAnswers}
          />
          <PlumbSlider
            layout={layout}
            tried={tried}
            shown={shown}
            band={stick.allFit[0] ?? stick.allTight[0]}
            label={dimension.label}
            words={words}
            isTrying={trying !== undefined}
            describedBy={aboutKeys}
            onMove={values.move}
            onTake={values.settle}
            onLeave={values.leave}
          />
        </div>
        <p id={aboutKeys} className="mt-2 text-sm text-ink-2">
          + room left, − short. Left and right keys move the plumb line by{' '}
          <Measure text={exactValue(tried.step, unit, style)} />; Enter writes the value, Escape goes back to{' '}
          <Measure text={exactValue(present, unit, style)} />.
        </p>
        <StickLegend common={common} bands={bands} />
      </div>
      <Decision
        tried={tried}
        stick={stick}
        ruleIds={ruleIds}
        present={present}
        trying={resting}
        offer={offer}
        suggested={suggested}
        curves={curves}
        onTake={values.settle}
        onLeave={values.leave}
      />
      <div className="min-w-0">
        {fault && (
          <Notice tone="wont" className="mt-3">
            The shares could not be counted. {fault}
          </Notice>
        )}
        <PublicWords
          curves={curves}
          ruleIds={ruleIds}
          rejection={rejection}
          present={present}
          suggested={suggested}
          unit={unit}
          whole={whole}
          wear={`shoes of ${dimensionValue(CROWD_WEAR.shoeMm, 'mm', style)}, ${CROWD_WEAR.clothing} clothes`}
        />
        <div className="mt-4 max-w-text">
          <PopulationFields crowd={crowd} own={asked.own} onChange={onCrowd} />
        </div>
        <div className="mt-4 flex flex-wrap items-start gap-x-8 gap-y-3">
          <StickTable
            caption={`Bands of ${dimension.label.toLowerCase()}`}
            unit={unit}
            rows={rows}
            present={present}
            answers={presentAnswers}
            suggested={suggested}
            suggestedAnswers={suggestedAnswers}
          />
          <SaveStick drawing={drawing} dimension={dimension} words={below} asked={paper} />
        </div>
      </div>
    </div>
  );
}
