import type { ButtonColumn, CushionDatum, CushionGroup, CushionSpec } from '../cushions/cushion-spec.ts';
import type { CushionWarning } from '../cushions/cushion-warning.ts';
import { OFF_JOINT_MM } from '../cushions/cushion-warnings.ts';
import { foamOfCushion } from '../cushions/foam-of-cushion.ts';
import { groupCushions } from '../cushions/group-cushions.ts';
import { keptCushionRules, type CushionRules } from '../cushions/workshop-cushions.ts';
import { isRectangle, outlineExtent } from '../outlines/outline.ts';
import { clothOfOrder, coverFaults, type ClothOfOrder } from './order-cloth.ts';
import type { OrderCover } from './order-cover.ts';
import { orderTotals, type OrderTotals } from './order-totals.ts';

/** Cushions that come out of one drawing. */
export interface ScheduleRow extends CushionGroup {
  /** Marks of the benches, in the order of the cushions. */
  benchMarks: string[];
  /** Size of the foam as it is sawn, round its outline. */
  sawnMm?: { widthMm: number; depthMm: number; thicknessMm: number };
  /** Of one of them. */
  foam?: { volumeM3: number; massKg: number };
  /** Panels as they are cut, every allowance included. */
  panels: { name: string; count: number; widthMm: number; heightMm: number }[];
  /** Names of the cloths that cover them. */
  covers: string[];
  /** Whether its plan is more than a rectangle, and needs a template. */
  needsTemplate: boolean;
}

/** Buttons of cushions that come out of one drawing. */
export interface ButtonSheet {
  marks: string[];
  datum: CushionDatum;
  /** From the datum, nearest first; beyond: further off its joint than a sheet lets pass. */
  columns: (ButtonColumn & { beyond: boolean })[];
  /** From the back seam (of a back: the top seam), and of a back over the pressed seat. */
  rows: { fromSeamMm: number; overSeatMm?: number }[];
  pattern: CushionSpec['buttons']['pattern'];
  alignedTo: CushionSpec['buttons']['alignedTo'];
  count: number;
  /** How far the reference sitter presses the seat below, and whether the cushion goes down with it. */
  seat?: { sinkMm: number; goesDown: boolean };
}

/** All that paper, list and cutting file show of one order, but for the layouts of its cloths: see `layCloth`. */
export interface OrderModel {
  schedule: ScheduleRow[];
  cloths: ClothOfOrder[];
  totals: OrderTotals;
  buttons: ButtonSheet[];
  /** Why something cannot be made or covered as asked, by mark where it is of one cushion. */
  faults: { mark?: string; text: string }[];
  warnings: { mark: string; warning: CushionWarning }[];
}

/**
 * The model of an order.
 *
 * @param input - its cushions, its cloths, and the allowances and foams it was issued with
 * @returns plain data; the same for the same input
 */
export function orderModel(input: {
  cushions: readonly CushionSpec[];
  covers: readonly OrderCover[];
  rules?: CushionRules;
}): OrderModel {
  const { cushions, covers } = input;
  const { settings, foams } = input.rules ?? keptCushionRules(null);
  const byMark = new Map(cushions.map((spec) => [spec.mark, spec]));
  const cloths = covers.map((cover) => clothOfOrder(cover, cushions, settings));
  const schedule = groupCushions(cushions).map((group) => scheduleRow(group, byMark, cloths));
  return {
    schedule,
    cloths,
    totals: orderTotals(cushions, foams),
    buttons: schedule.flatMap(({ marks, spec }) =>
      spec.buttons.count > 0 ? [buttonSheet(marks, spec)] : [],
    ),
    faults: [
      ...cushions.flatMap(({ mark, faults }) => faults.map((text) => ({ mark, text }))),
      ...[...new Set([...coverFaults(covers, cushions), ...cloths.flatMap(({ faults }) => faults)])].map(
        (text) => ({ text }),
      ),
    ],
    warnings: cushions.flatMap(({ mark, warnings }) => warnings.map((warning) => ({ mark, warning }))),
  };
}

function scheduleRow(
  group: CushionGroup,
  byMark: ReadonlyMap<string, CushionSpec>,
  cloths: readonly ClothOfOrder[],
): ScheduleRow {
  const { spec, marks } = group;
  const { making, outline } = spec;
  const foam = foamOfCushion(spec);
  return {
    ...group,
    benchMarks: marks.map((mark) => byMark.get(mark)?.benchMark ?? ''),
    ...(making && {
      sawnMm: { ...outlineExtent(making.foam.outline), thicknessMm: making.foam.thicknessMm },
    }),
    ...(foam && { foam }),
    panels: (making?.panels ?? []).map(({ name, count, cut }) => {
      const { widthMm, depthMm } = outlineExtent(cut);
      return { name, count, widthMm, heightMm: depthMm };
    }),
    covers: cloths.filter((one) => one.marks.includes(marks[0] ?? '')).map(({ cover }) => cover.name),
    needsTemplate: !isRectangle(outline),
  };
}

function buttonSheet(marks: string[], { datum, buttons }: CushionSpec): ButtonSheet {
  const { columns, rowsMm, rowsOverSeat, pattern, alignedTo, count } = buttons;
  return {
    marks,
    datum,
    columns: columns.map((column) => ({
      ...column,
      beyond: alignedTo !== 'board-centres' && Math.abs(column.offJointMm) > OFF_JOINT_MM + 1e-6,
    })),
    rows: rowsMm.map((fromSeamMm, i) => {
      const overSeatMm = rowsOverSeat?.overMm[i];
      return { fromSeamMm, ...(overSeatMm !== undefined && { overSeatMm }) };
    }),
    pattern,
    alignedTo,
    count,
    ...(rowsOverSeat && { seat: { sinkMm: rowsOverSeat.sinkMm, goesDown: rowsOverSeat.goesDown } }),
  };
}
