import { BufferAttribute, BufferGeometry, Matrix4, Vector3 } from 'three';
import { MeshBVH } from 'three-mesh-bvh';
import { describe, expect, it } from 'vitest';
import { randomOf, randomSolid, type KnownSolid } from '../../test/random-solids.ts';
import { gapBetween } from './gap.ts';

/** 142 solids make 10,011 pairs. */
const SOLIDS = 142;
/** Deepest that a chord cuts into a round solid; triangles lie at most twice that inside, so two solids at most 0.4 mm. */
const SAG_MM = 0.1;
/** Float32 corners of 1 m. */
const ROUNDING_MM = 0.01;
/** What going to and fro leaves, where faces are nearly parallel. */
const TO_AND_FRO_MM = 0.08;
const MOST_TURNS = 3000;
const UNMOVED = new Matrix4();

function treeOf(solid: KnownSolid) {
  const { positions, indices, withinMm } = solid.mesh(SAG_MM);
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(positions, 3));
  geometry.setIndex(indices);
  const tree = new MeshBVH(geometry);
  const first = [positions[0]!, positions[1]!, positions[2]!] as const;
  return { ...solid, geometry, tree, withinMm, first };
}

/**
 * Distance of two solids that are apart, by the library's nearest points alone: from a corner of the one to the other, back
 * again, and so on. Between convex solids that ends at the nearest pair, wherever it starts.
 */
function toAndFro(one: MeshBVH, other: MeshBVH, from: Vector3): number {
  let here = from;
  let least = Infinity;
  for (let turn = 0; turn < MOST_TURNS; turn++) {
    const there = other.closestPointToPoint(here)!.point;
    const back = one.closestPointToPoint(there)!;
    if (least - back.distance < 1e-6) return back.distance;
    least = back.distance;
    here = back.point;
  }
  return least;
}

describe('distances against a library that knows triangles only', () => {
  const random = randomOf(77);
  const solids = Array.from({ length: SOLIDS }, () => treeOf(randomSolid(random, 330)));
  const pairs = solids.flatMap((one, i) =>
    solids.slice(i + 1).map((other) => ({ one, other, gap: gapBetween(one.shape, other.shape)! })),
  );

  it('agree over every pair that is apart, within what the triangles can know', () => {
    const apart = pairs.filter(({ gap }) => gap.distanceMm > 0);
    expect(apart.length).toBeGreaterThan(2500);
    const wrong = apart.flatMap(({ one, other, gap }) => {
      const byTriangles = toAndFro(one.tree, other.tree, new Vector3(...one.first));
      // The triangles lie inside: what they say is never too little, and too much by what the chords cut off.
      const tooMuch = byTriangles - gap.distanceMm;
      return tooMuch > -ROUNDING_MM && tooMuch < one.withinMm + other.withinMm + ROUNDING_MM + TO_AND_FRO_MM
        ? []
        : [`${one.kind}, ${other.kind}: ${gap.distanceMm} against ${byTriangles}`];
    });
    expect(wrong).toEqual([]);
  });

  it('agree on which pairs meet, but for those that meet by less than the chords cut off', () => {
    // One in fifteen: the library looks at every triangle for this.
    const wrong = pairs
      .filter((_, i) => i % 15 === 0)
      .flatMap(({ one, other, gap }) => {
        const cut = one.withinMm + other.withinMm + ROUNDING_MM;
        if (gap.distanceMm <= 0 && gap.distanceMm > -cut) return [];
        const meets =
          one.tree.intersectsGeometry(other.geometry, UNMOVED) ||
          one.outside(other.first) < 0 ||
          other.outside(one.first) < 0;
        return meets === gap.distanceMm <= 0
          ? []
          : [`${one.kind}, ${other.kind}: ${gap.distanceMm}, ${meets}`];
      });
    expect(wrong).toEqual([]);
  });
});
