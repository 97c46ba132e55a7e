import { describe, expect, it } from 'vitest';
import { outlineExtent } from '../outlines/outline.ts';
import { referenceSinkMm } from '../pieces/seat-sink.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { chooseCushion, type CushionChange } from '../room/cushion-choices.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { boardLines } from './board-lines.ts';
import { buttonSpots, cushionWarningWords } from './cushion-warnings.ts';
import { deriveCushions } from './derive-cushions.ts';
import { groupCushions } from './group-cushions.ts';
import { PLAIN_MAKE } from './making/cushion-make.ts';
import { divideAt, divideOnBoards } from './run-joints.ts';

const inch = (value: number): number => value * 25.4;
const INCHES = { system: 'feet-inches', roundTo: 16 } as const;
const built = (id: string): SetDocument => ARRANGEMENTS.find((a) => a.id === id)!.build();
const benchOf = (document: SetDocument, id: string) =>
  document.pieces.find((piece) => piece.id === id) as PieceOf<'bench'>;

/** The cushion of a key in a set where something was chosen of it. */
function chosen(id: string, kind: 'seat' | 'back', change: CushionChange) {
  const plain = built(id);
  const { key } = deriveCushions(plain).find((spec) => spec.kind === kind)!;
  const document = chooseCushion(plain, key, change);
  return { document, spec: deriveCushions(document).find((one) => one.key === key)! };
}

describe('what was chosen of a cushion', () => {
  it('is nothing at first: boxed, closed out of sight, a plain rectangle', () => {
    for (const spec of deriveCushions(built('u-booth'))) {
      expect(spec.make).toEqual({ ...PLAIN_MAKE, closureEdge: spec.kind === 'seat' ? 'back' : 'front' });
      expect(outlineExtent(spec.outline).widthMm).toBeCloseTo(spec.finishedMm.widthMm, 9);
      expect(spec.faults).toEqual([]);
      expect(spec.making!.panels.map(({ name }) => name)).toEqual(['plate', 'boxing', 'zip half']);
    }
  });

  it('changes its plan and panels', () => {
    const { spec } = chosen('facing-benches', 'seat', {
      shape: { notches: [{ edge: 'back', fromMm: 0, widthMm: 90, depthMm: 60 }] },
      make: { ...PLAIN_MAKE, construction: 'knife-edge', welt: 'none' },
    });
    expect(spec.outline).toHaveLength(6);
    expect(spec.making!.panels.map(({ name }) => name)).toEqual(['plate']);
    expect(spec.making!.welt.lengthMm).toBe(0);
  });

  it('is never made in another way than was asked: a fault leaves no panels', () => {
    const wrong = chosen('facing-benches', 'seat', {
      shape: { cornerRadiusMm: { backLeft: 900, backRight: 0, frontLeft: 0, frontRight: 0 } },
    }).spec;
    expect(wrong.making).toBeUndefined();
    expect(wrong.faults[0]).toMatch(/rounded by more than it is long/);
    expect(wrong.outline).toHaveLength(4);
    const unwrapped = chosen('facing-benches', 'seat', {
      shape: { frontInMm: { left: 40, right: 0 } },
      make: { ...PLAIN_MAKE, construction: 'waterfall' },
    }).spec;
    expect(unwrapped.making).toBeUndefined();
    expect(unwrapped.faults).toEqual(['a waterfall front wraps a plain rectangle only']);
  });

  it('is as large as it is drawn', () => {
    const corner = (xMm: number, yMm: number, edge: 'front' | 'left' | 'back' | 'right') => ({
      ...{ xMm, yMm, radiusMm: 0, edge },
    });
    const drawn = [
      corner(0, 0, 'front'),
      corner(700, 0, 'left'),
      corner(500, 410, 'back'),
      corner(0, 410, 'right'),
    ];
    const { spec } = chosen('facing-benches', 'seat', { shape: { drawn } });
    expect(spec.finishedMm).toMatchObject({ widthMm: 700, depthMm: 410 });
  });

  it('makes those apart that a maker would make apart, and pairs mirror images', () => {
    const shape = { notches: [{ edge: 'back', fromMm: 0, widthMm: 90, depthMm: 60 } as const] };
    const mirrored = {
      notches: [{ edge: 'back', fromMm: 0, widthMm: 90, depthMm: 60, fromEnd: 'right' } as const],
    };
    const plain = built('facing-benches');
    const seats = deriveCushions(plain).filter(({ kind }) => kind === 'seat');
    const one = chooseCushion(plain, seats[0]!.key, { shape });
    expect(groupCushions(deriveCushions(one))[0]!.mirroredMarks).toEqual([]);
    const both = chooseCushion(one, seats[1]!.key, { shape: mirrored });
    expect(groupCushions(deriveCushions(both))[0]).toMatchObject({ marks: ['C1'], mirroredMarks: ['C2'] });
  });

  it('says when the camera sees the closure', () => {
    const { spec } = chosen('facing-benches', 'seat', { cameraSides: ['back'] });
    expect(spec.warnings).toContainEqual({ code: 'closure-on-camera-side', edge: 'back' });
    const sewn = chosen('facing-benches', 'seat', {
      cameraSides: ['front'],
      make: { ...PLAIN_MAKE, closureEdge: 'back' },
    }).spec;
    expect(sewn.warnings).toEqual([]);
  });
});

describe('tufting', () => {
  const field = {
    tuftMm: { widthMm: inch(8.5), heightMm: inch(11.5) },
    borderMm: inch(4),
    fullness: 'foam-thickness',
  } as const;

  it('gives the face its cloth by the rule that is named', () => {
    const { spec } = chosen('bench-window', 'back', {
      tufting: { kind: 'diamond', pullMm: inch(2), ...field },
    });
    const { across, high } = spec.tufting.field!;
    const face = spec.making!.panels.find(({ name }) => name === 'tufted face')!;
    const { widthMm, depthMm } = outlineExtent(face.cut);
    // A foam thickness at each end of every diamond, and a seam of 1/2 in all round.
    expect(widthMm).toBeCloseTo(spec.finishedMm.widthMm + across * inch(4) + inch(1), 6);
    expect(depthMm).toBeCloseTo(spec.finishedMm.depthMm + high * inch(4) + inch(1), 6);
    expect(spec.making!.panels.find(({ name }) => name === 'plate')!.count).toBe(1);
  });

  it('by half again is 1 1/2 of the panel with 1 in all round, seams in it', () => {
    const { spec } = chosen('bench-window', 'back', {
      tufting: { kind: 'biscuit', ...field, fullness: 'half-again' },
    });
    const face = spec.making!.panels.find(({ name }) => name === 'tufted face')!;
    expect(outlineExtent(face.cut).widthMm).toBeCloseTo(1.5 * spec.finishedMm.widthMm + inch(2), 6);
  });

  it('sets diamonds over by half in every other row', () => {
    const { spec } = chosen('bench-window', 'back', { tufting: { kind: 'diamond', ...field } });
    const spots = buttonSpots(spec);
    const { across, high, widthMm } = spec.tufting.field!;
    expect(spots).toHaveLength((across + 1) * (high + 1) + across * high);
    expect(spec.buttons.count).toBe(spots.length);
    const rows = [...new Set(spots.map(([, y]) => y.toFixed(3)))];
    expect(rows).toHaveLength(2 * high + 1);
    const [first, second] = rows.map((row) => spots.filter(([, y]) => y.toFixed(3) === row).map(([x]) => x));
    expect(Math.min(...second!) - Math.min(...first!)).toBeCloseTo(widthMm / 2, 6);
    const square = chosen('bench-window', 'back', { tufting: { kind: 'biscuit', ...field } }).spec;
    expect(square.buttons.count).toBe((square.tufting.field!.across + 1) * (square.tufting.field!.high + 1));
  });

  it('leaves buttons away where none is chosen, and asks for room', () => {
    expect(chosen('bench-window', 'back', { tufting: { kind: 'none' } }).spec.buttons.count).toBe(0);
    const { spec } = chosen('bench-window', 'back', {
      tufting: { kind: 'diamond', ...field, borderMm: 500 },
    });
    expect(spec.faults).toEqual(['the border leaves no room for tufts']);
    expect(spec.making).toBeUndefined();
  });

  it('is measured against the nearest board joint, with a warning above 1/8 in', () => {
    const { document, spec } = chosen('bench-window', 'back', { tufting: { kind: 'biscuit', ...field } });
    const { jointsMm } = boardLines(benchOf(document, spec.benchId));
    for (const { offJointMm } of spec.buttons.columns) {
      const half = (jointsMm[1]! - jointsMm[0]!) / 2;
      expect(Math.abs(offJointMm)).toBeLessThanOrEqual(half + 1e-6);
    }
    const far = spec.buttons.columns
      .map(({ offJointMm }) => Math.abs(offJointMm))
      .filter((mm) => mm > inch(1 / 8));
    expect(far.length).toBeGreaterThan(0);
    const warning = spec.warnings.find(({ code }) => code === 'off-joint')!;
    expect(warning).toEqual({ code: 'off-joint', columns: far.length, furthestMm: Math.max(...far) });
    expect(cushionWarningWords(warning, INCHES)).toMatch(/more than ⅛″ off a board joint/);
    expect(chosen('bench-window', 'back', {}).spec.warnings).toEqual([]);
  });

  it('stands on the joints or centres of the boards where that is chosen, and is not warned of', () => {
    for (const kind of ['biscuit', 'diamond'] as const) {
      const on = (columnsOn: 'joints' | 'board-centres') =>
        chosen('bench-window', 'back', { tufting: { kind, ...field, columnsOn } });
      const { document, spec } = on('joints');
      const { moduleMm } = boardLines(benchOf(document, spec.benchId));
      expect(spec.buttons.columns.length).toBeGreaterThan(2);
      for (const { offJointMm } of spec.buttons.columns) expect(offJointMm).toBeCloseTo(0, 9);
      expect(spec.warnings).toEqual([]);
      expect(spec.faults).toEqual([]);
      // Whole boards to a tuft, both columns of a diamond on a joint.
      const columnsOfOne = kind === 'diamond' ? 2 : 1;
      const boards = spec.tufting.field!.widthMm / columnsOfOne / moduleMm;
      expect(boards).toBeCloseTo(Math.round(boards), 9);
      const centres = on('board-centres').spec;
      for (const { offJointMm } of centres.buttons.columns) {
        expect(Math.abs(offJointMm)).toBeCloseTo(moduleMm / 2, 6);
      }
      expect(centres.warnings).toEqual([]);
    }
    const none = chosen('bench-window', 'back', {
      tufting: { kind: 'diamond', ...field, borderMm: 500, columnsOn: 'joints' },
    }).spec;
    expect(none.faults).toEqual(['the border leaves no room for tufts on board lines']);
  });

  it('stays inside the outline, or says how many buttons do not', () => {
    const { spec } = chosen('bench-window', 'back', {
      shape: { notches: [{ edge: 'back', fromMm: 0, widthMm: 300, depthMm: 300 }] },
    });
    const outside = spec.warnings.find(({ code }) => code === 'buttons-outside');
    expect(outside).toMatchObject({ count: expect.any(Number) as number });
  });

  it('says of a board that it stands over the thickness, or before the back', () => {
    const make = { ...PLAIN_MAKE, construction: 'plywood-backed', closure: 'stapled', welt: 'none' } as const;
    const [seat, back] = (['seat', 'back'] as const).map((kind) =>
      chosen('bench-window', kind, { make }).spec.warnings.map((one) => cushionWarningWords(one, INCHES)),
    );
    expect(seat).toContain('The board under it, ⅜″, is not in the seat height: set the deck lower by it.');
    expect(back).toContain('The board behind it, ⅜″, is not in the thickness: it brings the back forward.');
  });

  it('keeps buttons on their boards whatever outline is drawn round them', () => {
    const plain = chosen('bench-window', 'back', {}).spec;
    const { widthMm, depthMm } = plain.finishedMm;
    const drawn = [
      { xMm: 0, yMm: 0, radiusMm: 0, edge: 'front' as const },
      { xMm: widthMm - 40, yMm: 0, radiusMm: 0, edge: 'left' as const },
      { xMm: widthMm - 40, yMm: depthMm - 30, radiusMm: 0, edge: 'back' as const },
      { xMm: 0, yMm: depthMm - 30, radiusMm: 0, edge: 'right' as const },
    ];
    const { spec } = chosen('bench-window', 'back', { shape: { drawn } });
    expect(spec.finishedMm.widthMm).toBeCloseTo(widthMm - 40, 9);
    expect(buttonSpots(spec)).toEqual(buttonSpots(plain));
  });

  it('keeps a drawn outline within its place, or says where and how far it does not', () => {
    const { widthMm, depthMm } = chosen('bench-window', 'seat', {}).spec.finishedMm;
    const drawn = (wide: number) =>
      chosen('bench-window', 'seat', {
        shape: {
          drawn: [
            { xMm: 0, yMm: 0, radiusMm: 0, edge: 'front' },
            { xMm: wide, yMm: 0, radiusMm: 0, edge: 'left' },
            { xMm: wide, yMm: depthMm, radiusMm: 0, edge: 'back' },
            { xMm: 0, yMm: depthMm, radiusMm: 0, edge: 'right' },
          ],
        },
      }).spec.warnings;
    expect(drawn(widthMm)).toEqual([]);
    const [warning] = drawn(widthMm + inch(3 / 8));
    expect(warning).toMatchObject({ code: 'beyond-place', edges: ['left'] });
    expect(cushionWarningWords(warning!, INCHES)).toBe(
      'The drawn outline goes ⅜″ beyond its place at the left.',
    );
  });
});

describe('rows over the pressed seat', () => {
  it('keep their height where the back stands on the seat and goes down with it', () => {
    const { spec } = chosen('bench-window', 'back', {});
    const { overMm, goesDown } = spec.buttons.rowsOverSeat!;
    expect(goesDown).toBe(true);
    overMm.forEach((mm, i) => expect(mm + spec.buttons.rowsMm[i]!).toBeCloseTo(spec.finishedMm.depthMm, 9));
  });

  it('stand higher by what the seat goes down where a cleat holds the back', () => {
    const loose = chosen('bench-window', 'back', {}).spec;
    const { document, spec } = chosen('bench-window', 'back', { holdDown: 'french-cleat' });
    const bench = benchOf(document, spec.benchId);
    const lean = (bench.backLeanDeg * Math.PI) / 180;
    spec.buttons.rowsOverSeat!.overMm.forEach((mm, i) => {
      const higher = mm - loose.buttons.rowsOverSeat!.overMm[i]!;
      expect(higher).toBeCloseTo(spec.gapsMm.front + referenceSinkMm(bench) / Math.cos(lean), 6);
    });
    expect(chosen('bench-window', 'seat', {}).spec.buttons.rowsOverSeat).toBeUndefined();
  });
});

describe('joints of a run', () => {
  const long = (joints: PieceOf<'bench'>['upholstery']['joints']) => {
    const document = structuredClone(built('bench-window'));
    const bench = document.pieces.find((piece): piece is PieceOf<'bench'> => piece.kind === 'bench')!;
    bench.lengthMm = 3000;
    bench.upholstery.joints = joints;
    return { bench, specs: deriveCushions(document) };
  };

  it('are where they were chosen, seats and backs each their own', () => {
    const { specs } = long({
      seat: { by: 'positions', atMm: [800, 2000] },
      back: { by: 'positions', atMm: [] },
    });
    const seats = specs.filter(({ kind }) => kind === 'seat');
    expect(seats.map(({ placeMm }) => placeMm.widthMm).slice(0, 2)).toEqual([
      expect.closeTo(800, 6),
      expect.closeTo(1200, 6),
    ]);
    expect(specs.filter(({ kind }) => kind === 'back')).toHaveLength(1);
  });

  it('are all on boards where that was chosen, and no cushion is too long', () => {
    const { bench, specs } = long({ seat: { by: 'board-lines' } });
    const { jointsMm } = boardLines(bench);
    const cuts = divideOnBoards(-1500, 1500, bench.upholstery.longestCushionMm, jointsMm).slice(1, -1);
    expect(cuts.length).toBeGreaterThan(1);
    for (const cut of cuts) expect(jointsMm).toContain(cut);
    for (const { kind, placeMm } of specs) {
      if (kind === 'seat')
        expect(placeMm.widthMm).toBeLessThanOrEqual(bench.upholstery.longestCushionMm + 1e-6);
    }
    expect(divideOnBoards(0, 3000, 1000, [])).toEqual([0, 3000]);
  });

  it('pass over what leaves no cushion', () => {
    expect(divideAt(0, 1000, [20, 500, 520, 980, 1400])).toEqual([0, 500, 1000]);
  });
});
