import { CUSHION_SETTINGS, type CushionSettings } from '../cushions/cushion-settings.ts';
import type { CushionSize } from '../cushions/cushion-sizes.ts';
import type { ClothLayout, ClothPanel } from './cloth.ts';
import { coverPanels, usableWidthMm, type CoverCloth, type CoveredCushion } from './cover-panels.ts';
import { nestPanels } from './nest-panels.ts';
import { quickClothMm, repeatChartPercent } from './repeat-chart.ts';

/** Layout and chart may differ by so much before a sheet says so. */
export const CHART_DIFFERS = 0.15;

/** A cloth with what is bought of it. */
export interface ClothOrder extends CoverCloth {
  /** Left out at the start of the roll for flaws and for centering the pattern. */
  startMm: number;
  /** Bought in whole steps of this. */
  stepMm: number;
}

/** What has to be bought of one cloth, and how it was found. */
export interface ClothToBuy {
  layout: ClothLayout;
  /** Layout and start together, rounded up to a step. */
  buyMm: number;
  /** Part of what is bought that ends in no panel. */
  waste: number;
  /** By the quick rule and the chart for repeats; `undefined` where the repeat is beyond the chart. */
  chartMm: number | undefined;
  /** True when both differ by more than 15 in 100 of the layout. */
  differs: boolean;
}

/**
 * Plain length by the quick rule, with what the chart of the trade adds for the repeat.
 *
 * @param sizes - finished sizes of the cushions
 * @param cloth - the roll
 * @returns millimetres; `undefined` where the repeat is beyond the chart
 */
export function chartClothMm(
  sizes: readonly CushionSize[],
  { repeatMm, widthMm }: Pick<CoverCloth, 'repeatMm' | 'widthMm'>,
): number | undefined {
  const percent = repeatChartPercent(repeatMm, widthMm);
  if (percent === undefined) return undefined;
  return sizes.reduce((sum, size) => sum + quickClothMm(size), 0) * (1 + percent / 100);
}

/**
 * A length of cloth as it is bought: with what is left out at the start of the roll, in whole steps.
 *
 * @param lengthMm - taken up by panels
 * @param cloth - start and step
 */
export const boughtLengthMm = (lengthMm: number, { startMm, stepMm }: ClothOrder): number =>
  lengthMm <= 0 ? 0 : Math.ceil((lengthMm + startMm) / stepMm - 1e-9) * stepMm;

/**
 * Lays panels on a cloth and says what has to be bought of it.
 *
 * @param panels - as `coverPanels` makes them
 * @param cloth - the roll
 * @param chartMm - the cross-check, as `chartClothMm` gives it
 * @param tries - layouts to try
 * @throws Error naming the first panel that is wider than the roll in every way it may lie
 */
export function layPanels(
  panels: readonly ClothPanel[],
  cloth: ClothOrder,
  chartMm: number | undefined,
  tries: number,
): ClothToBuy {
  const layout = nestPanels(
    panels,
    { usableWidthMm: usableWidthMm(cloth), repeatMm: cloth.repeatMm },
    { tries },
  );
  const buyMm = boughtLengthMm(layout.lengthMm, cloth);
  const area = panels.reduce((sum, { widthMm, lengthMm }) => sum + widthMm * lengthMm, 0);
  return {
    layout,
    buyMm,
    waste: buyMm > 0 ? 1 - area / (buyMm * cloth.widthMm) : 0,
    chartMm,
    differs: chartMm !== undefined && Math.abs(chartMm - layout.lengthMm) > CHART_DIFFERS * layout.lengthMm,
  };
}

/**
 * Cloth to buy for some cushions, from a layout of their panels, with a chart of the trade as a cross-check.
 *
 * @param cushions - those with this cover, with their finished sizes
 * @param cloth - the roll
 * @param options - layouts to try, and allowances
 * @throws Error naming the first panel that is wider than the roll in every way it may lie
 */
export function clothToBuy(
  cushions: readonly (CoveredCushion & { finishedMm: CushionSize })[],
  cloth: ClothOrder,
  options: { tries: number; settings?: CushionSettings },
): ClothToBuy {
  const panels = coverPanels(cushions, cloth, options.settings ?? CUSHION_SETTINGS);
  const sizes = cushions.map(({ finishedMm }) => finishedMm);
  return layPanels(panels, cloth, chartClothMm(sizes, cloth), options.tries);
}
