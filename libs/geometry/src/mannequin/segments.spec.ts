import type { MeasureKey } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { measureBody } from '../../test/measure-body.ts';
import { furthest } from '../../test/mesh-rays.ts';
import { builds, percentilePeople } from '../../test/survey-like-people.ts';
import { readFigure } from './figure.ts';
import { measuringMesh } from './mesh.ts';
import { bodySegments } from './segments.ts';
import { measuringStance } from './stance.ts';

const WITHIN_MM = 3;
type Direction = readonly [number, number, number];

/** How far the named solids reach in a direction: centre plus radius for balls, the axes for ellipsoids. */
function reachOf(means: Record<MeasureKey, number>) {
  const f = readFigure(means);
  const solids = bodySegments(f, measuringStance(f), { originMm: [0, 0, 0], facingRad: 0, tiltRad: 0 });
  const reach = (names: RegExp, d: Direction, ends: 'both' | 'far' = 'both'): number => {
    const along = (p: Direction): number => p[0] * d[0] + p[1] * d[1] + p[2] * d[2];
    const reaches = solids
      .filter(({ name }) => names.test(name))
      .flatMap((solid) =>
        solid.kind === 'ellipsoid'
          ? [along(solid.centreMm) + Math.hypot(...solid.radiiMm.map((r, i) => r * d[i]!))]
          : [
              ends === 'both' ? along(solid.fromMm) + solid.fromRadiusMm : -Infinity,
              along(solid.toMm) + solid.toRadiusMm,
            ],
      );
    return Math.max(...reaches);
  };
  return reach;
}

describe('the simple solids reach as far as the near mesh where a check measures', () => {
  it.each([...percentilePeople([5, 50, 95]), ...builds()])('%s', (_, means) => {
    const reach = reachOf(means);
    const mesh = measuringMesh(means);
    const skin = measureBody(mesh);
    const belly = furthest(
      mesh,
      2,
      1,
      { axis: 1, from: skin.TC + 10, to: skin.TC + 0.4 * (0.75 * skin.AH - skin.TC) },
      (x) => Math.abs(x) < 60,
    );
    const sole = furthest(mesh, 1, -1, { axis: 1, from: -2000, to: 2000 });
    const foot = { axis: 1, from: sole, to: sole + 95 } as const;
    const pairs: [string, number, number][] = [
      ['thigh top', reach(/thigh$|thigh root/, [0, 1, 0]), skin.TC],
      ['knee top', reach(/left thigh$/, [0, 1, 0], 'far'), skin.KH - skin.PH],
      ['knee front', reach(/thigh$/, [0, 0, 1]), skin.BKL],
      ['back of the knee', -reach(/shin/, [0, 0, -1]), skin.BPL],
      ['elbow, under it', -reach(/upper arm/, [0, -1, 0]), skin.ER],
      ['elbow, outside', reach(/left (upper arm|forearm)/, [1, 0, 0]), skin.FF / 2],
      ['shoulder', reach(/left shoulder/, [1, 0, 0]), skin.BD / 2],
      ['belly', reach(/belly/, [0, 0, 1]), belly],
      ['buttock', -reach(/pelvis/, [0, 0, -1]), 0],
      ['hips', reach(/pelvis/, [1, 0, 0]), skin.HB / 2],
      ['head', reach(/head/, [0, 1, 0]), skin.SH],
      ['toe', reach(/foot/, [0, 0, 1]), furthest(mesh, 2, 1, foot)],
      ['heel', -reach(/foot/, [0, 0, -1]), furthest(mesh, 2, -1, foot)],
      ['sole', -reach(/foot/, [0, -1, 0]), sole],
    ];
    const strays = pairs
      .filter(([, solid, onSkin]) => !(Math.abs(solid - onSkin) < WITHIN_MM))
      .map(([name, solid, onSkin]) => `${name}: solid ${solid.toFixed(1)}, skin ${onSkin.toFixed(1)}`);
    expect(strays).toEqual([]);
  });
});
