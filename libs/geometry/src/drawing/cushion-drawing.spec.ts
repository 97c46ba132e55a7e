import { describe, expect, it } from 'vitest';
import { deriveCushions } from '../cushions/derive-cushions.ts';
import { CONSTRUCTIONS, FRONT_EDGE_WORDS, PLAIN_MAKE } from '../cushions/making/cushion-make.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { chooseCushion, type CushionChange } from '../room/cushion-choices.ts';
import { cushionDrawing } from './cushion-drawing.ts';
import type { Drawing, DrawShape } from './drawing.ts';

const KEY = 'b1/seat-1';
const facing = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();

function drawn(change: CushionChange) {
  const spec = deriveCushions(chooseCushion(facing, KEY, change)).find(({ key }) => key === KEY)!;
  return { spec, drawing: cushionDrawing(spec) };
}

const wordsIn = ({ shapes }: Drawing) =>
  shapes.filter((shape): shape is DrawShape & { kind: 'text' } => shape.kind === 'text');
const wordThat = (drawing: Drawing, part: string) =>
  wordsIn(drawing).find(({ text }) => text.includes(part))!;
const outlineOf = ({ shapes }: Drawing) => shapes.find((shape) => shape.kind === 'polygon')!.points;

describe('the views of a cushion', () => {
  it.each(CONSTRUCTIONS)('say of its front how it is made, %s', (construction) => {
    const { drawing } = drawn({ make: { ...PLAIN_MAKE, construction } });
    expect(wordsIn(drawing.front).map(({ text }) => text)).toEqual([FRONT_EDGE_WORDS[construction]]);
  });

  it('cut a half-round front through as a half circle, and a knife edge as a lens', () => {
    const bullnose = drawn({ make: { ...PLAIN_MAKE, construction: 'bullnose' } });
    const { depthMm: d, thicknessMm: t } = bullnose.spec.finishedMm;
    const round = outlineOf(bullnose.drawing.section).filter(([x]) => x > d - t / 2 + 1e-6);
    expect(round.length).toBeGreaterThan(8);
    for (const [x, y] of round) expect(Math.hypot(x - (d - t / 2), y - t / 2)).toBeCloseTo(t / 2, 6);
    const knife = drawn({ make: { ...PLAIN_MAKE, construction: 'knife-edge' } });
    const ends = outlineOf(knife.drawing.section).filter(([x]) => x < 1e-6 || x > d - 1e-6);
    for (const [, y] of ends) expect(y).toBeCloseTo(t / 2, 6);
  });

  it('name a slanted end within it, and an edge in its middle', () => {
    const { spec, drawing } = drawn({
      shape: {
        frontInMm: { left: 0, right: 200 },
        notches: [{ edge: 'back', fromMm: 0, widthMm: 300, depthMm: 80 }],
      },
    });
    const { widthMm, depthMm } = spec.finishedMm;
    const slanted = wordThat(drawing.plan, 'sitter’s right').at;
    expect(slanted[1]).toBeCloseTo(depthMm / 2, 6);
    expect(slanted[0]).toBeGreaterThan(0.5 * 200);
    expect(wordThat(drawing.plan, 'back edge').at[0]).toBeCloseTo((widthMm - 300) / 2, 6);
  });

  it('name the edges that the camera sees', () => {
    const { drawing } = drawn({ cameraSides: ['front'] });
    expect(wordThat(drawing.plan, 'front edge').text).toBe('front edge, camera side');
    expect(wordThat(drawing.plan, 'back edge').text).not.toContain('camera');
  });

  it('say the corners of a notch, the inset of a taper and each round corner, the whole further out', () => {
    const { spec, drawing } = drawn({
      shape: {
        frontInMm: { left: 0, right: 60 },
        notches: [{ edge: 'back', fromMm: 300, widthMm: 200, depthMm: 150 }],
        cornerRadiusMm: { backLeft: 0, backRight: 0, frontLeft: 50, frontRight: 50 },
      },
    });
    const { widthMm: w, depthMm: d } = spec.finishedMm;
    const said = drawing.plan.shapes.filter((shape) => shape.kind === 'dimension');
    const values = said.map(({ valueMm }) => Math.round(valueMm));
    for (const mm of [200, 60, w - 60, 150, d - 150]) expect(values).toContain(Math.round(mm));
    expect(said.filter(({ label }) => label === 'R').map(({ valueMm }) => valueMm)).toEqual([50, 50]);
    const whole = said.find(({ label }) => label === 'finished, seam to seam')!;
    const taper = said.find(({ valueMm }) => Math.abs(valueMm - 60) < 0.1)!;
    expect(whole.offsetMm).toBeLessThan(taper.offsetMm);
  });

  it('say nothing twice of a rectangle', () => {
    const { drawing } = drawn({ tufting: { kind: 'none' } });
    expect(drawing.plan.shapes.filter((shape) => shape.kind === 'dimension')).toHaveLength(2);
  });

  it.each([25.4 / 8, 1])('has chains whose numbers add up as they are read, in steps of %s mm', (stepMm) => {
    const spec = deriveCushions(facing).find(({ kind }) => kind === 'back')!;
    const { plan } = cushionDrawing(spec, { stepMm });
    const inSteps = (mm: number) => Math.round(mm / stepMm);
    const chains = plan.shapes.filter((shape) => shape.kind === 'dimension' && !shape.quiet && !shape.label);
    const sums = new Map<string, number[]>();
    for (const shape of chains) {
      if (shape.kind !== 'dimension') continue;
      const line = `${shape.from[0] === shape.to[0]} ${shape.offsetMm}`;
      sums.set(line, [...(sums.get(line) ?? []), inSteps(shape.valueMm)]);
    }
    const whole = [spec.finishedMm.widthMm, spec.finishedMm.depthMm].map(inSteps);
    const added = [...sums.values()].map((steps) => steps.reduce((sum, step) => sum + step, 0));
    expect(added).toHaveLength(3);
    for (const sum of added) expect(whole).toContain(sum);
  });
});
