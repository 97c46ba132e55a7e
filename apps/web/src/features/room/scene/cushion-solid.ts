import type { Vec3 } from '@settlewright/geometry';
import {
  addBoxing,
  addSheet,
  LEAST_MM,
  placerOf,
  pressOf,
  ROUNDING,
  roundOf,
  sagAt,
  type Sheet,
} from './cushion-cover.ts';
import { addOutlinedCushion } from './outlined-cushion.ts';
import type { SeatPrint } from './seat-print.ts';
import type { SoftPart } from './soft-part.ts';
import type { SolidSink } from './solid-arrays.ts';
import { normalise, scale } from './vectors.ts';

/** Distances of the lines of a panel: close where somebody sits or leans on it and down a curve, mm. */
const PRESSED_STEP_MM = 56;
const LEANED_STEP_MM = 100;
const CURVED_STEP_MM = 26;
const FREE_STEP_MM = 240;
/** Lines across a panel of half width `half`: close at the rounded edges. */
function lines(half: number, round: number, step: number): number[] {
  const edge = ROUNDING.map((share) => half - round * (1 - share));
  const shoulder = [half - round - 40, half - round - 100].filter((at) => at > step / 2);
  const inner = shoulder.at(-1) ?? half - round;
  const count = Math.max(1, Math.ceil((2 * inner) / step));
  const between = Array.from({ length: count - 1 }, (_, n) => inner - ((n + 1) * 2 * inner) / count);
  const outer = [...edge, ...shoulder];
  return [...outer.map((at) => -at), ...between, ...outer].sort((a, b) => a - b);
}

/** Normal of each point of a sheet, from the points next to it. */
function normalsOf(sheet: Sheet): Sheet {
  return sheet.map((points, row) => {
    const before = sheet[row - 1] ?? points;
    const after = sheet[row + 1] ?? points;
    return points.map((point, column) => {
      const [left, right] = [points[column - 1] ?? point, points[column + 1] ?? point];
      const [over, under] = [before[column] ?? point, after[column] ?? point];
      const [ax, ay, az] = [under[0] - over[0], under[1] - over[1], under[2] - over[2]];
      const [bx, by, bz] = [right[0] - left[0], right[1] - left[1], right[2] - left[2]];
      return normalise([ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx]);
    });
  });
}

/** Points round the rim of a panel, closed. */
function rimOf(panel: Sheet): Vec3[] {
  const first = panel[0] ?? [];
  const last = panel.at(-1) ?? [];
  const right = panel.slice(1, -1).map((row) => row.at(-1)!);
  const left = panel.slice(1, -1).map((row) => row[0]!);
  const round = [...first, ...right, ...[...last].reverse(), ...left.reverse()];
  return [...round, round[0]!];
}

/** Distances of the lines across and down a panel. */
function stepsOf({ kind, hollowAt }: SoftPart, prints: readonly SeatPrint[]): [number, number] {
  if (prints.length === 0) return [FREE_STEP_MM, hollowAt ? CURVED_STEP_MM : FREE_STEP_MM];
  return kind === 'seat' ? [PRESSED_STEP_MM, PRESSED_STEP_MM] : [LEANED_STEP_MM, LEANED_STEP_MM];
}

/**
 * A cushion as it is upholstered: a crowned panel over a boxing with a welt between, all inside the measured box, and
 * pressed in where somebody sits or leans. The seat's panel looks up, the back's forwards.
 */
export function addCushion(out: SolidSink, soft: SoftPart, material: number, prints: readonly SeatPrint[]) {
  const { outward, thickMm: thick, hollowAt, outlineMm } = soft;
  if (outlineMm) {
    addOutlinedCushion(out, { ...soft, outlineMm }, material, prints);
    return;
  }
  const [a, b] = [soft.widthMm / 2, soft.lengthMm / 2];
  const round = roundOf(thick, a, b);
  const [stepAcross, stepDown] = stepsOf(soft, prints);
  const press = pressOf(prints, soft);
  const place = placerOf(soft);

  const columns = lines(a, round, stepAcross);
  const panel: Sheet = lines(b, round, stepDown).map((v) =>
    columns.map((u) => {
      const [eu, ev] = [
        Math.max(0, Math.abs(u) - a + round) / round,
        Math.max(0, Math.abs(v) - b + round) / round,
      ];
      const [du, dv] = [eu * Math.sqrt(1 - (ev * ev) / 2), ev * Math.sqrt(1 - (eu * eu) / 2)];
      const sag = sagAt(thick, Math.min(a - Math.abs(u), b - Math.abs(v)));
      const rise = round * Math.sqrt(Math.max(0, 1 - du * du - dv * dv));
      const at: readonly [number, number] = [
        eu > 0 ? Math.sign(u) * (a - round + round * du) : u,
        ev > 0 ? Math.sign(v) * (b - round + round * dv) : v,
      ];
      const top = thick / 2 - round + rise - sag - (hollowAt?.(at[1]) ?? 0);
      return place(at[0], Math.max(LEAST_MM - thick / 2, top - press(place(at[0], top, at[1]))), at[1]);
    }),
  );
  addSheet(out, panel, normalsOf(panel), material);

  const foot = addBoxing(out, soft, rimOf(panel), material);
  const under = foot.map(() => place(0, -thick / 2, 0));
  const away = foot.map(() => scale(outward, -1));
  addSheet(out, [under, foot], [away, away], material);
}
