import { describe, expect, it } from 'vitest';
import { dot } from '../mannequin/vector.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { pictureFromAbove, slantedFrame } from './picture-from-above.ts';

const built = (id: string) => ARRANGEMENTS.find((a) => a.id === id)!.build();

describe('a picture from above', () => {
  it('looks down by the angle it is asked for, square in itself and not mirrored', () => {
    const { right, down, toward } = slantedFrame(0.4, 0.6);
    for (const [a, b] of [
      [right, down],
      [down, toward],
      [right, toward],
    ] as const)
      expect(dot(a, b)).toBeCloseTo(0, 12);
    expect(toward[1]).toBeCloseTo(Math.sin(0.6), 12);
    // right × up = toward
    const up = down.map((n) => -n);
    expect(right[1] * up[2]! - right[2] * up[1]!).toBeCloseTo(toward[0], 12);
    expect(right[2] * up[0]! - right[0] * up[2]!).toBeCloseTo(toward[1], 12);
  });

  it('shows the pieces that are asked for, each with its mark, and turns their fronts to the reader', () => {
    const document = built('u-booth');
    const benches = document.pieces.filter(({ kind }) => kind === 'bench');
    const all = pictureFromAbove(document, new Set(benches.map(({ id }) => id)));
    const marks = all.shapes.flatMap((shape) => (shape.kind === 'text' ? [shape.text] : []));
    expect(marks.sort()).toEqual(benches.map(({ mark }) => mark).sort());
    const drawn = new Set(all.shapes.map(({ pieceId }) => pieceId).filter(Boolean));
    expect([...drawn].sort()).toEqual(benches.map(({ id }) => id).sort());
    const one = built('bench-window');
    const bench = one.pieces.find(({ kind }) => kind === 'bench')!;
    const lengthSeen = (turnDeg: number) => {
      const turned = structuredClone(one);
      turned.pieces.find(({ id }) => id === bench.id)!.at.turnDeg = turnDeg;
      return pictureFromAbove(turned, new Set([bench.id])).shapes.length;
    };
    // Seen from behind only the back would show: far fewer lines.
    expect(lengthSeen(bench.at.turnDeg + 180)).toBeGreaterThan(0.8 * lengthSeen(bench.at.turnDeg));
  });

  it('shows a long bench from the front, though more chairs stand opposite', () => {
    const document = built('banquette');
    const seats = document.pieces.filter(({ kind }) => kind === 'bench' || kind === 'loose-seat');
    const { shapes } = pictureFromAbove(document, new Set(seats.map(({ id }) => id)));
    const downThePage = (mark: string) =>
      shapes.flatMap((shape) => (shape.kind === 'text' && shape.text === mark ? [shape.at[1]] : []))[0]!;
    // Whoever looks at the front of the bench has the chairs before it.
    expect(downThePage('L1')).toBeGreaterThan(downThePage('B1'));
  });

  it('is empty where nothing is asked for', () => {
    expect(pictureFromAbove(built('bench-window'), new Set()).shapes).toEqual([]);
  });
});
