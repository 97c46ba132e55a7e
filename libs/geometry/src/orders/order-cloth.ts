import { boughtLengthMm, chartClothMm, layPanels, type ClothOrder } from '../cloth/cloth-to-buy.ts';
import { waysOf, type ClothLayout, type ClothPanel } from '../cloth/cloth.ts';
import { COVER_PARTS, coverPanels, usableWidthMm, type CoverPart } from '../cloth/cover-panels.ts';
import type { CushionSettings } from '../cushions/cushion-settings.ts';
import type { CushionSpec } from '../cushions/cushion-spec.ts';
import type { OrderCover } from './order-cover.ts';
import { fromRunMiddleMm } from './run-middle.ts';

/** What is spent on a cloth, in the smallest unit of its currency. */
export interface ClothCost {
  currency: string;
  totalMinor: number;
  /** Part of it that ends in no panel; known from a layout only. */
  wasteMinor?: number;
}

/** A cloth of an order, ready to be laid, with the quick answer until it is. */
export interface ClothOfOrder {
  cover: OrderCover;
  marks: string[];
  cloth: ClothOrder;
  /** Those that the cloth is wide enough for, of cushions that can be made. */
  panels: ClothPanel[];
  /** By the quick rule and the chart for repeats, for whole covers; `undefined` beyond the chart. */
  chartMm: number | undefined;
  /** What to buy by the chart; `undefined` where there is no chart for it or the cloth covers parts only. */
  buyMm: number | undefined;
  cost?: ClothCost;
  /** What is not among the panels and why, in words: a layout is then of the rest, and what it buys the least. */
  faults: string[];
}

/** A cloth that was laid. */
export interface LaidCloth {
  layout: ClothLayout;
  buyMm: number;
  /** Part of what is bought that ends in no panel. */
  waste: number;
  /** `undefined` also where panels are missing: nothing to be compared with. */
  chartMm: number | undefined;
  /** True when layout and chart differ by more than 15 in 100. */
  differs: boolean;
  cost?: ClothCost;
  /** Length that came in, less what has to be there; negative when it is short. The most where panels are missing. */
  spareMm?: number;
}

/** How many layouts an order tries, unless it says otherwise: a third of a second for forty cushions, within 2 in 100 of the bound. */
const TRIES = 300;

/**
 * Panels of one cloth of an order.
 *
 * @param cover - the cloth
 * @param cushions - all of the order
 * @param settings - allowances of the workshop
 */
export function clothOfOrder(
  cover: OrderCover,
  cushions: readonly CushionSpec[],
  settings: CushionSettings,
): ClothOfOrder {
  const covered = cushions.filter(({ mark }) => cover.cushionMarks?.includes(mark) ?? true);
  const cloth: ClothOrder = {
    widthMm: cover.com?.measuredWidthMm ?? cover.widthMm,
    selvedgeMm: cover.selvedgeMm,
    lies: cover.direction,
    repeatMm: cover.repeatMm,
    startMm: cover.startMm,
    stepMm: cover.stepMm,
  };
  const all = coverPanels(
    covered.flatMap((spec) =>
      spec.making
        ? [
            {
              mark: spec.mark,
              make: spec.make,
              made: spec.making,
              ...(cover.parts && { parts: cover.parts }),
              ...(cover.controlLine === 'run' && { controlMm: fromRunMiddleMm(spec, cushions) }),
            },
          ]
        : [],
    ),
    cloth,
    settings,
  );
  const usable = usableWidthMm(cloth);
  const fits = (panel: ClothPanel) => waysOf(panel, usable).length > 0;
  const wide = all.filter((panel) => !fits(panel));
  const unmade = covered.filter(({ making }) => !making).map(({ mark }) => mark);
  const whole = (cover.parts ?? COVER_PARTS).length === COVER_PARTS.length;
  const chartMm = whole
    ? chartClothMm(
        covered.map(({ finishedMm }) => finishedMm),
        cloth,
      )
    : undefined;
  const buyMm = chartMm === undefined ? undefined : boughtLengthMm(chartMm, cloth);
  const cost = buyMm === undefined ? undefined : costOf(cover, buyMm);
  return {
    cover,
    marks: covered.map(({ mark }) => mark),
    cloth,
    panels: all.filter(fits),
    chartMm,
    buyMm,
    ...(cost && { cost }),
    faults: [
      ...wide.map(({ id }) => `${id} is wider than ${cover.name} in every way it may lie`),
      ...unmade.map((mark) => `${mark} cannot be made as asked, so its panels are missing`),
    ],
  };
}

/**
 * Lays the panels of a cloth. Takes a good part of a second for a large order: for a worker, never for a thread that answers people.
 *
 * @param one - from `orderModel`; plain data, so it can be sent to a worker
 * @param tries - layouts to try; the answer is the same for the same number
 * @returns the layout of its panels; `undefined` without any. Ask `faults` what is missing
 */
export function layCloth(one: ClothOfOrder, tries = TRIES): LaidCloth | undefined {
  const { cover, cloth, panels, faults } = one;
  if (panels.length === 0) return undefined;
  const chartMm = faults.length === 0 ? one.chartMm : undefined;
  const laid = layPanels(panels, cloth, chartMm, tries);
  const cost = costOf(cover, laid.buyMm, laid.waste);
  const received = cover.com?.receivedMm;
  return {
    ...laid,
    ...(cost && { cost }),
    ...(received !== undefined && { spareMm: received - laid.layout.lengthMm - cloth.startMm }),
  };
}

function costOf(
  { pricePerMetreMinor, currency }: OrderCover,
  buyMm: number,
  waste?: number,
): ClothCost | undefined {
  if (pricePerMetreMinor === undefined || currency === undefined) return undefined;
  const totalMinor = Math.round((buyMm / 1000) * pricePerMetreMinor);
  return { currency, totalMinor, ...(waste !== undefined && { wasteMinor: Math.round(totalMinor * waste) }) };
}

/**
 * What no cloth covers, and what two cloths cover.
 *
 * @param covers - of the order
 * @param cushions - of the order
 * @returns faults in words; none where there is no cloth yet
 */
export function coverFaults(covers: readonly OrderCover[], cushions: readonly CushionSpec[]): string[] {
  if (covers.length === 0) return [];
  const covering = (mark: string, part: CoverPart) =>
    covers.filter(
      ({ cushionMarks, parts }) => (cushionMarks?.includes(mark) ?? true) && (parts?.includes(part) ?? true),
    );
  const marksOf = (part: CoverPart, isSo: (count: number) => boolean) =>
    cushions
      .filter(({ making }) => part !== 'welt' || (making?.welt.lengthMm ?? 0) > 0)
      .map(({ mark }) => mark)
      .filter((mark) => isSo(covering(mark, part).length));
  return COVER_PARTS.flatMap((part) => {
    const [none, twice] = [marksOf(part, (n) => n === 0), marksOf(part, (n) => n > 1)];
    return [
      ...(none.length > 0 ? [`No cloth is said for the ${part} of ${none.join(', ')}`] : []),
      ...(twice.length > 0 ? [`Two cloths are said for the ${part} of ${twice.join(', ')}`] : []),
    ];
  });
}
