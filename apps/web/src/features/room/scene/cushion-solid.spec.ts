import { ARRANGEMENTS, deriveParts } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { addCushion, isCushion } from './cushion-solid.ts';
import type { SeatPrint } from './seat-print.ts';
import type { SolidArrays } from './solid-arrays.ts';
import { mergeParts } from './solids.ts';
import { cross, dot, partAxes, subtract } from './vectors.ts';

const document = ARRANGEMENTS.find(({ id }) => id === 'banquette')!.build();
const cushion = deriveParts(document)
  .filter(isCushion)
  .find(({ role }) => role === 'seat-cushion')!;
const [, thick] = cushion.solid.sizeMm;
const topMm = cushion.positionMm[1] + thick / 2;
const empty = () => mergeParts([]);

/** Somebody in the middle of the cushion, thighs along it, 30 mm into it. */
const print: SeatPrint = {
  origin: [cushion.positionMm[0], topMm - 30, cushion.positionMm[2]],
  up: [0, 1, 0],
  stretches: [
    {
      from: [cushion.positionMm[0], topMm - 30 + 80, cushion.positionMm[2] - 60],
      to: [cushion.positionMm[0], topMm - 30 + 80, cushion.positionMm[2] + 60],
      radii: [80, 80],
    },
  ],
};

function heights(prints: readonly SeatPrint[]) {
  const out = empty();
  addCushion(out, cushion, 2, prints);
  return out;
}

describe('a cushion', () => {
  it('stays inside its box and has its crown at the measured height', () => {
    const { positions } = heights([]);
    const up = partAxes(cushion.rotationRad)[1];
    const over = positions.flatMap((x, n) =>
      n % 3 === 0 ? [dot(up, subtract([x, positions[n + 1]!, positions[n + 2]!], cushion.positionMm))] : [],
    );
    expect(Math.max(...over)).toBeCloseTo(thick / 2, 1);
    expect(Math.min(...over)).toBeCloseTo(-thick / 2, 3);
  });

  it('looks outwards with every triangle', () => {
    for (const prints of [[], [print]]) {
      const { positions, normals } = heights(prints);
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

  it('goes down under a sitter by the sink of that sitter, and nowhere far from there', () => {
    const pressed = heights([print]);
    const near = (out: SolidArrays, x: number) =>
      out.positions.flatMap((value, n) =>
        n % 3 === 0 &&
        Math.abs(value - x) < 40 &&
        Math.abs(out.positions[n + 2]! - cushion.positionMm[2]) < 40 &&
        out.normals[n + 1]! > 0.5
          ? [out.positions[n + 1]!]
          : [],
      );
    expect(Math.min(...near(pressed, cushion.positionMm[0]))).toBeCloseTo(topMm - 30, 0);
    expect(Math.min(...near(pressed, cushion.positionMm[0] + 350))).toBeGreaterThan(topMm - 1);
  });
});
