import { dimensionOf, type Dimension } from '@settlewright/geometry';
import { useCallback, useMemo } from 'react';
import { Combobox } from '@/components/combobox.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { Select } from '@/components/select.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { crowdWords, type CrowdChoice } from '@/lib/crowd/crowds.ts';
import { useWidth } from '@/lib/use-width.ts';
import { exactValue, dimensionWords } from '@/lib/dimension-words.ts';
import { bestPairs, type BestPair, type CastMap } from '@settlewright/geometry';
import { useChoices } from '../choices-view.ts';
import { pricedPairs } from '../pair-costs.ts';
import type { TriedValues } from '../tried-values.ts';
import type { AskedCrowd } from '../use-crowd.ts';
import { useCastMap } from '../use-cast-map.ts';
import { BestPairs } from './best-pairs.tsx';
import { MapDrawing } from './map-drawing.tsx';
import { shortName } from '@/lib/short-name.ts';

interface TwoDimensionsProps {
  tried: TriedValues;
  offered: readonly Dimension[];
  second: string | undefined;
  crowd: CrowdChoice;
  asked: AskedCrowd;
  onSecond: (id: string | undefined) => void;
  everyCheck: boolean;
  onEveryCheck: (on: boolean) => void;
}

const WIDTH = 720;
/** Pairs that are looked at with every check, and those of them that are shown. */
const PRICED = 12;
const SHOWN = 5;
const CHECKS = [
  { value: 'own', words: 'the two numbers’ own' },
  { value: 'every', words: 'every check that either moves' },
] as const;

/** The dimension against another one: where everybody is served, and how many of the public. */
export function TwoDimensions({
  tried,
  offered,
  second: secondId,
  crowd,
  asked,
  onSecond,
  everyCheck,
  onEveryCheck,
}: TwoDimensionsProps) {
  const { document, check, replace, ruleBook, style } = useChoices();
  const [measure, width = WIDTH] = useWidth();
  const { dimension: first } = tried;
  const { second, map, shares, done, fault } = useCastMap(
    tried,
    secondId === first.id ? undefined : secondId,
    asked.request,
    everyCheck,
  );
  const now = tried.valueOf(document) ?? first.value;
  const present = useMemo(
    () => ({ across: now, up: (secondId && dimensionOf(document, secondId)?.value) || 0 }),
    [now, document, secondId],
  );
  const setAt = useCallback(
    ({ across, up }: BestPair) => {
      const moved = first.at(across);
      return moved && second?.at(up, moved);
    },
    [first, second],
  );
  const pairs = useMemo(() => {
    if (!map) return [];
    const sheetAt = (pair: BestPair) => {
      const set = setAt(pair);
      return set && check(set);
    };
    const best = bestPairs(map, shares, present, PRICED);
    return pricedPairs(best, check(document), sheetAt, ruleBook).slice(0, SHOWN);
  }, [map, shares, present, setAt, check, document, ruleBook]);
  const take = (pair: BestPair) => {
    const { across, up } = pair;
    const set = setAt(pair);
    if (!set || !second || !replace) return;
    const step = (one: Dimension, from: number, to: number) =>
      `${one.label} ${exactValue(from, one.unit, style)} to ${exactValue(to, one.unit, style)}`;
    replace(set, `${step(first, now, across)}, ${step(second, present.up, up)}`);
  };
  return (
    <section aria-labelledby="two-heading" className="mt-12">
      <RuleHeading id="two-heading">Two dimensions</RuleHeading>
      <div className="mb-4 grid max-w-text gap-2">
        <Combobox
          label={`${first.label} against`}
          placeholder="Choose another dimension"
          value={secondId ?? null}
          choices={offered
            .filter(({ id }) => id !== first.id)
            .map((one) => ({ id: one.id, words: dimensionWords(one) }))}
          onChange={(id) => onSecond(id ?? undefined)}
        />
        {second && (
          <Select
            label="Checks"
            value={everyCheck ? 'every' : 'own'}
            options={CHECKS}
            onChange={(which) => onEveryCheck(which === 'every')}
          />
        )}
        <p className="text-sm text-ink-2">
          Each outline is where that sitter is at least tight by these checks. The darker the ground, the more
          of {crowdWords(crowd, asked.options)} fit all of them at once; dotted lines at 25, 50 and 75 in 100.
        </p>
      </div>
      {fault && (
        <Notice tone="wont" className="mb-4">
          The shares could not be counted. {fault}
        </Notice>
      )}
      {second && !map && <LoadingLine words={`Trying both, ${Math.round(done * 100)} in 100 done`} />}
      {second && map && (
        <div className="grid gap-x-9 gap-y-6 desk:grid-cols-[minmax(0,1fr)_28rem]">
          <div ref={measure} className="min-w-0">
            <MapDrawing
              map={map}
              shares={shares}
              first={first}
              second={second}
              present={present}
              width={width}
            />
            {!shares && !fault && <LoadingLine words="Counting people" />}
            <MapWords map={map} />
          </div>
          <BestPairs
            pairs={pairs}
            map={map}
            isCounted={shares !== undefined}
            first={first}
            second={second}
            onTake={replace && take}
          />
        </div>
      )}
    </section>
  );
}

/** Which checks were asked, and who fits nowhere on the map. */
function MapWords({ map: { regions, ruleIds } }: { map: CastMap }) {
  const { ruleBook } = useChoices();
  const check = (id: string) => ruleBook.rule(id).columnName.toLowerCase();
  const checks = [...new Set(ruleIds.map(check))].join(', ');
  return (
    <div className="mt-2 grid gap-1 text-sm text-ink-2">
      <p>Checks: {checks}.</p>
      {regions.map(
        ({ placeId, name, blockedBy }) =>
          blockedBy && (
            <p key={placeId} className="text-wont">
              {shortName(name)} fits nowhere here: even at best {check(blockedBy)} won’t do.
            </p>
          ),
      )}
    </div>
  );
}
