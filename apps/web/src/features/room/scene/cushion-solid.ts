import type { Vec3 } from '@settlewright/geometry';
import { leanedInBy } from './back-print.ts';
import { pressedBy, type SeatPrint } from './seat-print.ts';
import type { SoftPart } from './soft-part.ts';
import type { SolidSink } from './solid-arrays.ts';
import { add, cross, dot, normalise, scale, subtract } from './vectors.ts';

/** Edge of the cover, its crown over the panel and the width over which the crown rises, mm. */
const ROUND_MM = 20;
const CROWN_MM = 9;
const CROWN_RUN_MM = 150;
/** Distances of the lines of a panel: close where somebody sits or leans on it and down a curve, mm. */
const PRESSED_STEP_MM = 56;
const LEANED_STEP_MM = 100;
const CURVED_STEP_MM = 26;
const FREE_STEP_MM = 240;
/** A pressed panel stays so far over the deck, mm. */
const LEAST_MM = 8;
const ROUNDING = [1, 0.75, 0] as const;

type Sheet = Vec3[][];

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

/** Corners of the two triangles between two lines of a sheet: how far down and across. */
const CORNERS = [0, 0, 1, 0, 1, 1, 0, 0, 1, 1, 0, 1] as const;

/** Made anew for each frame of a pull: plain loops, as lists and spreads cost ten times as much. */
/** Its outline is drawn round the edges alone: inside them a panel is never seen against anything but itself. */
function addSheet(out: SolidSink, sheet: Sheet, normals: Sheet, material: number) {
  const { positions, normals: facing, materials, roundPositions, roundNormals } = out;
  for (let row = 0; row + 1 < sheet.length; row++) {
    const width = sheet[row]!.length;
    for (let column = 0; column + 1 < width; column++) {
      const border = Math.min(row, column, sheet.length - 2 - row, width - 2 - column) < ROUNDING.length;
      for (let n = 0; n < CORNERS.length; n += 2) {
        const [r, c] = [row + CORNERS[n]!, column + CORNERS[n + 1]!];
        const [at, normal] = [sheet[r]![c]!, normals[r]![c]!];
        positions.push(at[0], at[1], at[2]);
        facing.push(normal[0], normal[1], normal[2]);
        materials.push(material);
        if (!border) continue;
        roundPositions.push(at[0], at[1], at[2]);
        roundNormals.push(normal[0], normal[1], normal[2]);
      }
    }
  }
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

function addLoop(out: SolidSink, loop: readonly Vec3[], weight: number) {
  loop.slice(1).forEach((point, n) => {
    out.edges.push(...loop[n]!, ...point);
    out.edgeWeights.push(weight);
  });
}

/** How far the panel of a cushion goes in at a point of its free face. */
type Press = (point: Vec3) => number;

function pressOf(prints: readonly SeatPrint[], { kind, outward }: SoftPart): Press {
  if (kind === 'seat') return (point) => pressedBy(prints, point);
  const backs = prints.flatMap((print) => print.backs);
  const inward = scale(outward, -1);
  return (point) => leanedInBy(backs, point, inward);
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
  const { centre, across, outward, down, thickMm: thick, hollowAt } = soft;
  const [a, b] = [soft.widthMm / 2, soft.lengthMm / 2];
  const round = Math.min(ROUND_MM, thick * 0.35, a * 0.4, b * 0.4);
  const crown = Math.min(CROWN_MM, thick * 0.12);
  const [stepAcross, stepDown] = stepsOf(soft, prints);
  const press = pressOf(prints, soft);
  const [cx, cy, cz] = centre;
  const place = (u: number, w: number, v: number): Vec3 => [
    cx + across[0] * u + outward[0] * w + down[0] * v,
    cy + across[1] * u + outward[1] * w + down[1] * v,
    cz + across[2] * u + outward[2] * w + down[2] * v,
  ];

  const columns = lines(a, round, stepAcross);
  const panel: Sheet = lines(b, round, stepDown).map((v) =>
    columns.map((u) => {
      const [eu, ev] = [
        Math.max(0, Math.abs(u) - a + round) / round,
        Math.max(0, Math.abs(v) - b + round) / round,
      ];
      const [du, dv] = [eu * Math.sqrt(1 - (ev * ev) / 2), ev * Math.sqrt(1 - (eu * eu) / 2)];
      const inward = Math.min(a - Math.abs(u), b - Math.abs(v)) / CROWN_RUN_MM;
      const sag = crown * (1 - Math.min(1, inward)) ** 2;
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

  const rim = rimOf(panel);
  const foot = rim.map((point) =>
    add(point, scale(outward, -thick / 2 - dot(subtract(point, centre), outward))),
  );
  const sideways = rim.map((_, n) => {
    const run = subtract(rim[n + 1] ?? rim[1]!, rim[n - 1] ?? rim.at(-2)!);
    return normalise(cross(outward, run));
  });
  addSheet(out, [foot, rim], [sideways, sideways], material);
  const under = foot.map(() => place(0, -thick / 2, 0));
  const away = foot.map(() => scale(outward, -1));
  addSheet(out, [under, foot], [away, away], material);
  addLoop(out, rim, 1);
  addLoop(out, foot, 1);
}
