import { CUSHION_SETTINGS, type CushionSettings } from '../cushions/cushion-settings.ts';
import type { CushionSize } from '../cushions/cushion-sizes.ts';
import type { ClothLayout } from './cloth.ts';
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
  const roll = { usableWidthMm: usableWidthMm(cloth), repeatMm: cloth.repeatMm };
  const layout = nestPanels(panels, roll, { tries: options.tries });
  const buyMm = Math.ceil((layout.lengthMm + cloth.startMm) / cloth.stepMm - 1e-9) * cloth.stepMm;
  const area = panels.reduce((sum, { widthMm, lengthMm }) => sum + widthMm * lengthMm, 0);
  const plain = cushions.reduce((sum, { finishedMm }) => sum + quickClothMm(finishedMm), 0);
  const percent = repeatChartPercent(cloth.repeatMm, cloth.widthMm);
  const chartMm = percent === undefined ? undefined : plain * (1 + percent / 100);
  return {
    layout,
    buyMm,
    waste: buyMm > 0 ? 1 - area / (buyMm * cloth.widthMm) : 0,
    chartMm,
    differs: chartMm !== undefined && Math.abs(chartMm - layout.lengthMm) > CHART_DIFFERS * layout.lengthMm,
  };
}
