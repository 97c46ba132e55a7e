import { addPiece, emptySetDocument, type SitterGap } from '@settlewright/geometry';
import { expect, it } from 'vitest';
import { outlineOf } from './outline.ts';
import { isMeant, meetings, sayGap, saySwept } from './touch-words.ts';

const { document, pieceId } = addPiece(emptySetDocument(), 'table');
const named = { document, bodies: [{ placeId: 'b1:2', name: 'Hetty Vance' }] };
const gap = (over: Partial<SitterGap>): SitterGap => ({
  segment: 'left forearm',
  thing: { kind: 'part', partId: 't/top-1', pieceId, role: 'top' },
  measuredOn: 'skin',
  distanceMm: 0,
  fromMm: [0, 0, 0],
  toMm: [0, 0, 0],
  direction: [0, 1, 0],
  ...over,
});

it('tells what rests from what is in the way', () => {
  expect(isMeant(gap({}))).toBe(true);
  expect(isMeant(gap({ segment: 'left thigh' }))).toBe(false);
  expect(isMeant(gap({ thing: { kind: 'part', partId: 'a', pieceId, role: 'apron' } }))).toBe(false);
  expect(isMeant(gap({ thing: { kind: 'body', placeId: 'b1:2', segment: 'left forearm' } }))).toBe(false);
  expect(
    isMeant(gap({ segment: 'right foot', thing: { kind: 'part', partId: 'a', pieceId, role: 'rail' } })),
  ).toBe(true);
});

it('says a gap with what it lies between and on what it was measured', () => {
  const style = { system: 'millimetres', roundTo: 8 } as const;
  expect(sayGap(gap({ distanceMm: 38 }), named, style)).toBe(
    '38\u202fmm between left forearm and T1 top, on the skin',
  );
  expect(sayGap(gap({ distanceMm: -0.4 }), named, style)).toBe('left forearm and T1 top touch, on the skin');
  const elbows = gap({
    distanceMm: -12,
    measuredOn: 'solids',
    thing: { kind: 'body', placeId: 'b1:2', segment: 'left elbow' },
  });
  expect(sayGap(elbows, named, style)).toBe(
    'left forearm and Hetty Vance’s left elbow overlap by 12\u202fmm, on solids',
  );
});

it('draws a tight line around what a joint sweeps', () => {
  const path = outlineOf([
    { x: 0, y: 0, r: 10 },
    { x: 100, y: 0, r: 10 },
    { x: 50, y: 0, r: 2 },
  ]);
  const points = path
    .slice(1, -1)
    .split('L')
    .map((point) => point.split(' ').map(Number));
  expect(Math.min(...points.map(([x]) => x!))).toBe(-10);
  expect(Math.max(...points.map(([x]) => x!))).toBe(110);
  // The small one in the middle lies inside.
  expect(points.every(([x]) => x! < 20 || x! > 80)).toBe(true);
  expect(outlineOf([])).toBe('');
});

it('names each thing once, with the deepest stretch first and the others behind it', () => {
  const met = meetings([
    gap({ segment: 'left thigh root', distanceMm: -4 }),
    gap({ segment: 'belly', distanceMm: -9 }),
    gap({ segment: 'left thigh', distanceMm: -5 }),
    gap({ thing: { kind: 'body', placeId: 'b1:2', segment: 'left elbow' }, distanceMm: -6 }),
  ]);
  expect(met.map(({ deepest, also }) => [deepest.distanceMm, also])).toEqual([
    [-9, ['left thigh']],
    [-6, []],
  ]);
});

it('says how much room an elbow or knee has while it moves', () => {
  const style = { system: 'millimetres', roundTo: 8 } as const;
  const swept = { joint: 'elbow', side: 'left' } as const;
  const thing = { kind: 'part', partId: 't/top-1', pieceId, role: 'top' } as const;
  const at = (distanceMm: number) => ({ ...gap({}), distanceMm, thing });
  expect(saySwept(swept, at(38), named, style)).toBe('Left elbow: 38\u202fmm to T1 top');
  expect(saySwept(swept, at(-12), named, style)).toBe('Left elbow: T1 top in its way by 12\u202fmm');
  expect(saySwept(swept, undefined, named, style)).toContain('free');
});
