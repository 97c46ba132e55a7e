import { describe, expect, it } from 'vitest';
import { personAt, seated, setOf } from '../../test/seated-room.ts';
import type { MannequinSegment } from '../mannequin/segments.ts';
import { mannequinMesh } from '../mannequin/mesh.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { gapBetween } from './gap.ts';
import { sitterDistances } from './sitter-distances.ts';
import { CONTACT_MM } from './sitter-gap.ts';
import { partShape, segmentShape } from './solids.ts';

const ball = (name: string, at: Vec3, r: number): MannequinSegment => ({
  kind: 'rounded-cone',
  tag: 'suit',
  name,
  fromMm: at,
  toMm: at,
  fromRadiusMm: r,
  toRadiusMm: r,
});
const body = (placeId: string, ...segments: MannequinSegment[]) => ({
  placeId,
  pieceId: placeId.split(':')[0]!,
  pose: { segments },
});
const board = (id: string, positionMm: Vec3, role: Part['role'] = 'top'): Part => ({
  id: `${id}/${role}-1`,
  pieceId: id,
  role,
  material: 'oak',
  solid: { shape: 'box', sizeMm: [1000, 20, 1000] },
  positionMm,
  rotationRad: [0, 0, 0],
});

describe('what a sitter touches and how much room is left', () => {
  it('says where, how much and to what, for parts and neighbours alike', () => {
    const left = body('b:1', ball('left knee', [0, 100, 0], 50), ball('right knee', [-200, 100, 0], 45));
    const right = body('b:2', ball('left knee', [300, 100, 0], 50));
    const [one, two] = sitterDistances([left, right], [board('t', [0, 200, 0]), board('u', [0, 37, 0])]);
    expect(one!.smallest!.distanceMm).toBeCloseTo(40, 3);
    expect(one!.smallest!.thing).toEqual({ kind: 'part', partId: 't/top-1', pieceId: 't', role: 'top' });
    expect(one!.smallest!.fromMm[1]).toBeCloseTo(150, 3);
    expect(one!.smallest!.toMm[1]).toBeCloseTo(190, 3);
    expect(one!.contacts.map(({ segment }) => segment)).toEqual(['left knee']);
    expect(one!.contacts[0]!.distanceMm).toBeCloseTo(3, 3);
    expect(two!.contacts).toHaveLength(1);
  });

  it('lists every stretch that is inside of something, deepest first, and the gap to what is not touched', () => {
    const both = body('b:1', ball('left knee', [0, 150, 0], 50), ball('right knee', [-200, 157, 0], 45));
    const [one] = sitterDistances(
      [both, body('b:2', ball('left elbow', [0, -200, 0], 60))],
      [board('t', [0, 200, 0])],
    );
    expect(one!.overlaps.map(({ segment, distanceMm }) => [segment, Math.round(distanceMm)])).toEqual([
      ['right knee', -12],
      ['left knee', -10],
    ]);
    expect(one!.smallest!.thing).toEqual({ kind: 'body', placeId: 'b:2', segment: 'left elbow' });
    expect(one!.smallest!.distanceMm).toBeCloseTo(240, 3);
  });

  it('leaves out the seat and the back it rests on, and no other seat', () => {
    const sitter = body('b:1', ball('pelvis', [0, 40, 0], 50));
    const seats = [board('b', [0, 0, 0], 'seat-cushion'), board('c', [0, 0, 0], 'seat-cushion')];
    expect(sitterDistances([sitter], [seats[0]!])[0]!.overlaps).toEqual([]);
    expect(sitterDistances([sitter], [seats[1]!])[0]!.overlaps).toHaveLength(1);
  });
});

describe('in a real set', () => {
  const { document } = setOf([
    ['bench', { xMm: 0, zMm: 0, turnDeg: 0 }, { lengthMm: 2000, 'places.count': 3 }],
    ['table', { xMm: 0, zMm: 900, turnDeg: 0 }],
    ['bulkhead', { xMm: 0, zMm: 0, turnDeg: 0 }],
  ]);
  const people = [personAt('men', 95), personAt('women', 5), personAt('men', 50)];
  const { bodies, parts } = seated(document, people);
  const found = sitterDistances(bodies, parts);

  it('finds what looking at every pair finds', () => {
    bodies.forEach((one, i) => {
      const solids = one.pose.segments.map(segmentShape);
      const others = [
        ...parts
          .filter((part) => part.pieceId !== one.pieceId || !/cushion|deck|lip|back/.test(part.role))
          .map((part) => [partShape(part)]),
        ...bodies.filter((_, j) => j !== i).map(({ pose }) => pose.segments.map(segmentShape)),
      ];
      const least = others.map((them) =>
        Math.min(...solids.flatMap((a) => them.map((b) => gapBetween(a, b)!.distanceMm))),
      );
      const clear = Math.min(...least.filter((mm) => mm > CONTACT_MM));
      expect(found[i]!.smallest!.distanceMm).toBeCloseTo(clear, 2);
      const met = [...found[i]!.overlaps, ...found[i]!.contacts].map(({ distanceMm }) => distanceMm);
      const deepest = Math.min(...least);
      if (deepest <= CONTACT_MM) expect(Math.min(...met)).toBeCloseTo(deepest, 1);
      else expect(met).toEqual([]);
    });
  });

  it('measures on the skin where it is given, a few millimetres from the solids', () => {
    const withSkin = bodies.map((one) => ({ ...one, mesh: mannequinMesh(one.pose) }));
    const onSkin = sitterDistances(withSkin, parts);
    const { smallest } = onSkin.find(({ smallest: s }) => s?.measuredOn === 'skin')!;
    expect(smallest!.thing.kind).toBe('part');
    const i = onSkin.findIndex((one) => one.smallest === smallest);
    const part = parts.find(({ id }) => smallest!.thing.kind === 'part' && id === smallest!.thing.partId)!;
    const { positions } = withSkin[i]!.mesh;
    let nearest = Infinity;
    for (let v = 0; v < positions.length; v += 3) {
      const at: Vec3 = [positions[v]!, positions[v + 1]!, positions[v + 2]!];
      nearest = Math.min(
        nearest,
        gapBetween(segmentShape(ball('point', at, 0)), partShape(part), nearest)?.distanceMm ?? Infinity,
      );
    }
    // Between its corners a triangle may come nearer, never further.
    expect(smallest!.distanceMm).toBeLessThanOrEqual(nearest + 0.01);
    expect(smallest!.distanceMm).toBeGreaterThan(nearest - 3);
  });

  it('sees what lies wholly inside the flesh, where no skin meets it', () => {
    const [one] = bodies.map((each) => ({ ...each, mesh: mannequinMesh(each.pose) }));
    const [x, y, z] = one!.pose.joints.pelvis;
    const inside: Part = {
      ...board('k', [x, y + 160, z]),
      solid: { shape: 'box', sizeMm: [30, 30, 30] },
    };
    const [deepest] = sitterDistances([one!], [inside])[0]!.overlaps;
    expect(deepest).toMatchObject({ measuredOn: 'solids', thing: { partId: 'k/top-1' } });
    expect(deepest!.distanceMm).toBeLessThan(-50);
    const outside = { ...inside, positionMm: [x, y + 160, z + 400] as const };
    expect(sitterDistances([one!], [outside])[0]!.overlaps).toEqual([]);
  });

  it('measures two neighbours from skin to skin, the same from either side', () => {
    const withSkin = bodies.map((one) => ({ ...one, mesh: mannequinMesh(one.pose) }));
    const onSkin = sitterDistances(withSkin, []);
    const between = (i: number, j: number): number => {
      const [a, b] = [withSkin[i]!.mesh.positions, withSkin[j]!.mesh.positions];
      let least = Infinity;
      for (let v = 0; v < a.length; v += 3) {
        for (let w = 0; w < b.length; w += 3) {
          const apart = (a[v]! - b[w]!) ** 2 + (a[v + 1]! - b[w + 1]!) ** 2 + (a[v + 2]! - b[w + 2]!) ** 2;
          if (apart < least) least = apart;
        }
      }
      return Math.sqrt(least);
    };
    const gap = onSkin[0]!.smallest!;
    expect(gap.measuredOn).toBe('skin');
    const j = bodies.findIndex(({ placeId }) => gap.thing.kind === 'body' && placeId === gap.thing.placeId);
    const corners = between(0, j);
    expect(gap.distanceMm).toBeLessThanOrEqual(corners + 0.01);
    expect(gap.distanceMm).toBeGreaterThan(corners - 3);
    const back = sitterDistances([withSkin[j]!, withSkin[0]!], [])[0]!.smallest!;
    expect(back.distanceMm).toBeCloseTo(gap.distanceMm, 2);
    expect(back.thing).toMatchObject({ kind: 'body', segment: gap.segment });
  });
});
