import {
  ARRANGEMENTS,
  chooseCushion,
  cushionRunsOf,
  deriveParts,
  type CushionShape,
  type SetDocument,
} from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { addCushion } from './cushion-solid.ts';
import type { SeatPrint } from './seat-print.ts';
import { createSink } from './solid-arrays.ts';
import { softPart, type SoftPart } from './soft-part.ts';
import { add, cross, dot, scale, subtract } from './vectors.ts';

const bench = ARRANGEMENTS.find(({ id }) => id === 'banquette')!.build();
const curvedBench: SetDocument = {
  ...bench,
  pieces: bench.pieces.map((piece) =>
    piece.kind === 'bench' ? { ...piece, lumbar: { apexMm: 200, recessMm: 25 } } : piece,
  ),
};
const softOf = (document: SetDocument, kind: SoftPart['kind']) =>
  deriveParts(document)
    .flatMap((part) => softPart(part) ?? [])
    .find((soft) => soft.kind === kind)!;
const shapedBench = (kind: SoftPart['kind'], shape: CushionShape): SetDocument =>
  chooseCushion(bench, cushionRunsOf(bench).find((run) => run.kind === kind)!.key, { shape });
const NOTCHED: CushionShape = {
  notches: [{ edge: 'back', fromMm: 0, widthMm: 200, depthMm: 150 }],
  cornerRadiusMm: { backLeft: 0, backRight: 0, frontLeft: 120, frontRight: 0 },
};
const notched = softOf(shapedBench('seat', NOTCHED), 'seat');
const notchedBack = softOf(shapedBench('back', NOTCHED), 'back');
const seat = softOf(bench, 'seat');
const back = softOf(bench, 'back');
const pad = softOf(curvedBench, 'back');
const topMm = seat.centre[1] + seat.thickMm / 2;

/** Somebody in the middle of the cushion, thighs along it, 30 mm into it. */
const print: SeatPrint = {
  origin: [seat.centre[0], topMm - 30, seat.centre[2]],
  up: [0, 1, 0],
  stretches: [
    {
      from: [seat.centre[0], topMm - 30 + 80, seat.centre[2] - 60],
      to: [seat.centre[0], topMm - 30 + 80, seat.centre[2] + 60],
      radii: [80, 80],
    },
  ],
  backs: [],
};

/** Somebody who leans on the middle of a back and reaches 20 mm into it. */
const leaning = (soft: SoftPart): SeatPrint => ({
  ...print,
  backs: [
    {
      centre: add(soft.centre, scale(soft.outward, soft.thickMm / 2 + 100)),
      axes: [soft.across, scale(soft.down, -1), soft.outward],
      radii: [170, 200, 120],
    },
  ],
});

/** Corners of the triangles of a cushion, three numbers each, and which way each looks. */
interface Drawn {
  positions: number[];
  normals: number[];
}

function drawn(soft: SoftPart, prints: readonly SeatPrint[] = []): Drawn {
  const out = createSink();
  addCushion(out, soft, 2, prints);
  const cornersOf = (list: 'positions' | 'normals') =>
    [...out.indices.packed()].flatMap((n) => [...out[list].memory.subarray(n * 3, n * 3 + 3)]);
  return { positions: cornersOf('positions'), normals: cornersOf('normals') };
}

/** Points of a drawn cushion from its middle: across, outwards, down. */
const from = (soft: SoftPart, { positions }: Drawn) =>
  positions.flatMap((x, n) => {
    if (n % 3 !== 0) return [];
    const gap = subtract([x, positions[n + 1]!, positions[n + 2]!], soft.centre);
    return [[dot(gap, soft.across), dot(gap, soft.outward), dot(gap, soft.down)] as const];
  });
/** Points of the panel near one of its own. */
const panelAt = (soft: SoftPart, out: Drawn, across: number, down: number) =>
  from(soft, out)
    .filter(([u, , v]) => Math.abs(u - across) < 40 && Math.abs(v - down) < 40)
    .map(([, outward]) => outward);

describe('a cushion', () => {
  it.each([
    ['seat', seat],
    ['back', back],
    ['curved back', pad],
    ['notched seat', notched],
    ['notched back', notchedBack],
  ])('stays inside its box and has its crown at the measured height: %s', (_, soft) => {
    const over = from(soft, drawn(soft)).map(([, outward]) => outward);
    expect(Math.max(...over)).toBeGreaterThan(soft.thickMm / 2 - 1.5);
    expect(Math.max(...over)).toBeLessThan(soft.thickMm / 2 + 0.01);
    expect(Math.min(...over)).toBeCloseTo(-soft.thickMm / 2, 3);
  });

  it('looks outwards with every triangle', () => {
    for (const [soft, prints] of [
      [seat, []],
      [seat, [print]],
      [back, [leaning(back)]],
      [pad, []],
      [pad, [leaning(pad)]],
      [notched, []],
      [notched, [print]],
      [notchedBack, [leaning(notchedBack)]],
    ] as const) {
      const { positions, normals } = drawn(soft, prints);
      for (let n = 0; n < positions.length; n += 9) {
        const corner = (at: number) =>
          [positions[n + at]!, positions[n + at + 1]!, positions[n + at + 2]!] as const;
        const facing = cross(subtract(corner(3), corner(0)), subtract(corner(6), corner(0)));
        const told = [normals[n]!, normals[n + 1]!, normals[n + 2]!] as const;
        expect(Math.hypot(...told)).toBeCloseTo(1, 3);
        expect(dot(facing, told)).toBeGreaterThanOrEqual(-1e-3);
      }
    }
  });

  it('is hollow where a curved back gives way, and full at its apex', () => {
    const out = drawn(pad);
    const low = Math.min(
      ...panelAt(pad, out, 0, pad.lengthMm / 2 - 90).filter((w) => w > -pad.thickMm / 2 + 1),
    );
    const high = Math.max(...panelAt(pad, out, 0, 0));
    expect(pad.thickMm / 2 - low).toBeGreaterThan(15);
    expect(pad.thickMm / 2 - high).toBeLessThan(2);
  });

  it('goes in under a back that leans on it, and nowhere far from there', () => {
    for (const soft of [back, pad]) {
      const leant = drawn(soft, [leaning(soft)]);
      const deepest = Math.min(...panelAt(soft, leant, 0, 0).filter((w) => w > -soft.thickMm / 2 + 1));
      expect(soft.thickMm / 2 - deepest).toBeGreaterThan(20);
      expect(soft.thickMm / 2 - deepest).toBeLessThan(24);
      const beside = Math.max(...panelAt(soft, leant, 330, 0));
      expect(soft.thickMm / 2 - beside).toBeLessThan(2);
    }
  });

  it('goes down under a sitter by the sink of that sitter, and nowhere far from there', () => {
    const pressed = drawn(seat, [print]);
    const near = (out: Drawn, x: number) =>
      out.positions.flatMap((value, n) =>
        n % 3 === 0 &&
        Math.abs(value - x) < 40 &&
        Math.abs(out.positions[n + 2]! - seat.centre[2]) < 40 &&
        out.normals[n + 1]! > 0.5
          ? [out.positions[n + 1]!]
          : [],
      );
    expect(Math.min(...near(pressed, seat.centre[0]))).toBeCloseTo(topMm - 30, 0);
    expect(Math.min(...near(pressed, seat.centre[0] + 350))).toBeGreaterThan(topMm - 1);
  });

  it('of a plan of its own is closed: every side of a triangle is met by another', () => {
    for (const prints of [[], [print]]) {
      const { positions } = drawn(notched, prints);
      const sides = new Map<string, number>();
      const name = (n: number) =>
        positions
          .slice(n, n + 3)
          .map((value) => value.toFixed(2))
          .join();
      for (let n = 0; n < positions.length; n += 9) {
        const corners = [name(n), name(n + 3), name(n + 6)];
        if (new Set(corners).size < 3) continue;
        corners.forEach((corner, m) => {
          const next = corners[(m + 1) % 3]!;
          const [side, way] = corner < next ? [`${corner} ${next}`, 1] : [`${next} ${corner}`, -1];
          sides.set(side, (sides.get(side) ?? 0) + way);
        });
      }
      expect([...sides].filter(([, met]) => met !== 0)).toEqual([]);
    }
  });

  it('of a plan of its own goes down under a sitter, and leaves its notch free', () => {
    const out = drawn(notched, [print]);
    const plain = drawn(notched);
    const under = (of: Drawn) =>
      Math.min(...panelAt(notched, of, 0, 0).filter((w) => w > -notched.thickMm / 2 + 1));
    expect(under(plain) - under(out)).toBeCloseTo(30, -0.5);
    const taken = softOf(bench, 'seat');
    const inNotch = from(taken, out).filter(
      ([u, , v]) => Math.abs(u) > taken.widthMm / 2 - 199 && u > 0 && v < -taken.lengthMm / 2 + 149,
    );
    expect(inNotch).toEqual([]);
  });
});
