import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { jsPDF } from 'jspdf';
import { curveWords, scaleFor, spacesBetween } from '@settlewright/geometry';
import { CHECK_BAR_MM, drawCheckBar } from './check-bar';
import { drawClothWay } from './cloth-way';
import { type Chain, chainDepth, drawChain } from './dimension-chain';
import { breakLines } from './paragraph';
import { Sheet, type TextStyle } from './sheet';
import { runWords } from './spec-words';
import { TakenSpace } from './taken-space';

interface Label {
  text: string;
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** A sheet that remembers what is written and ruled on it. */
class RememberingSheet extends Sheet {
  readonly labels: Label[] = [];
  readonly lines: [number, number, number, number][] = [];

  override flag(text: string, x: number, y: number, style: TextStyle = {}): void {
    const half = this.textWidth(text, style) / 2;
    this.labels.push({ text, left: x - half, right: x + half, top: y - 2.3, bottom: y });
  }

  override line(x1: number, y1: number, x2: number, y2: number): void {
    this.lines.push([x1, y1, x2, y2]);
  }
}

const doc = new jsPDF({ unit: 'mm', putOnlyUsedFonts: true });
const newSheet = () => new RememberingSheet(doc, 297, 210);

const overlap = (a: Label, b: Label) =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

describe('words on a sheet', () => {
  it('say a long run in the next larger unit as well', () => {
    expect(runWords(6249.4, { system: 'millimetres', roundTo: 16 })).toBe('6249\u202fmm (6.25\u00a0m)');
    expect(runWords(6096, { system: 'feet-inches', roundTo: 16 })).toBe('240″ (20′\u00a00″)');
  });

  it('go to the next place where one is taken', () => {
    const sheet = newSheet();
    const taken = new TakenSpace();
    taken.take({ x: 94, y: 44, width: 12, height: 12 });
    const places = [0, 22].map((off) => ({ x: 100 + off, y: 51 }));
    expect(taken.write(sheet, 'joins B1', places, { align: 'center' })).toBe(true);
    expect(sheet.labels.map(({ left, right }) => (left + right) / 2)).toEqual([122]);
  });
});

describe('the way of the cloth', () => {
  const cloth = { direction: 'up-roll', nap: 'down', words: '' } as const;
  const figure = { x: 20, y: 20, width: 90, height: 36 };
  /** Buttons every 20.6 by 12.2 mm, as on a seat at 1 : 12. */
  const dense = () => {
    const taken = new TakenSpace();
    for (const x of [31, 51.6, 72.2, 92.8]) {
      for (const y of [32.2, 44.4]) taken.take({ x: x - 2.6, y: y - 1.8, width: 5.2, height: 3.6 });
    }
    return taken;
  };

  it('is shown between buttons too, by smaller arrows', () => {
    const arrows = (taken: TakenSpace) => {
      const sheet = newSheet();
      drawClothWay(sheet, cloth, figure, taken);
      return sheet.lines.map(([x1, y1, x2, y2]) => Math.hypot(x2 - x1, y2 - y1));
    };
    const [open, between] = [arrows(new TakenSpace()), arrows(dense())];
    expect(open).toHaveLength(2);
    expect(between).toHaveLength(2);
    expect(between[0]).toBeLessThan(open[0]!);
  });
});

describe('a chain of dimensions', () => {
  const lengths = fc.array(fc.integer({ min: 1, max: 40 }), { minLength: 1, maxLength: 25 });
  const chainOf = (parts: number[], direction: Chain['direction']): Chain => {
    const stops = parts.reduce<number[]>((at, part) => [...at, (at.at(-1) ?? 0) + part], [10]);
    return { stops, labels: parts.map((part) => `${part}¾`), at: 60, direction, outwards: -1 };
  };

  it('never writes one label over another, however narrow the spaces', () => {
    fc.assert(
      fc.property(lengths, fc.constantFrom('level' as const, 'upright' as const), (parts, direction) => {
        const sheet = newSheet();
        drawChain(sheet, chainOf(parts, direction));
        const met = sheet.labels.flatMap((a, i) => sheet.labels.slice(i + 1).filter((b) => overlap(a, b)));
        expect(met).toEqual([]);
      }),
      { numRuns: 60 },
    );
  });

  it('keeps within the depth it asks for', () => {
    fc.assert(
      fc.property(lengths, (parts) => {
        const sheet = newSheet();
        const chain = chainOf(parts, 'level');
        drawChain(sheet, chain);
        expect(Math.min(...sheet.labels.map(({ top }) => top))).toBeGreaterThanOrEqual(
          60 - chainDepth(sheet, chain) - 0.1,
        );
      }),
      { numRuns: 30 },
    );
  });

  it('says equal neighbours that have no room once, with their number', () => {
    const sheet = newSheet();
    drawChain(sheet, chainOf([2, 2, 2, 20], 'level'));
    expect(sheet.labels.map(({ text }) => text)).toEqual(['3 × 2¾', '20¾']);
    expect(sheet.lines.length).toBeGreaterThanOrEqual(6);
  });

  it('closes: the spaces that are shown add up to the length that is shown', () => {
    const step = 25.4 / 16;
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 1, max: 400, noNaN: true }), { minLength: 1, maxLength: 20 }),
        (parts) => {
          const stops = parts.reduce<number[]>((at, part) => [...at, (at.at(-1) ?? 0) + part], [0]);
          const shown = spacesBetween(stops, step).reduce((sum, space) => sum + space, 0);
          expect(shown).toBeCloseTo(Math.round((stops.at(-1) ?? 0) / step) * step, 6);
        },
      ),
    );
  });
});

describe('scale and check bar', () => {
  it('takes the largest scale of a shop rule at which the thing fits', () => {
    const space = { widthMm: 136, heightMm: 78 };
    // 42 3/4 in at 1½″ to the foot is 135.7 mm of paper.
    expect(scaleFor('feet-inches', { widthMm: 1085.85, heightMm: 500 }, space)).toEqual({
      factor: 1 / 8,
      words: '1½″ = 1′\u00a00″, 1 : 8',
    });
    expect(scaleFor('millimetres', { widthMm: 1085.85, heightMm: 500 }, space).words).toBe('1 : 10');
    expect(scaleFor('feet-inches', { widthMm: 1e7, heightMm: 1 }, space).factor).toBeLessThanOrEqual(
      136 / 1e7,
    );
  });

  it('rules exactly three inches', () => {
    const sheet = newSheet();
    drawCheckBar(sheet, 20, 50);
    const [x1, , x2] = sheet.lines[0]!;
    expect(x2 - x1).toBeCloseTo(3 * 25.4, 9);
    expect(CHECK_BAR_MM).toBe(76.2);
  });
});

describe('words', () => {
  it('break at spaces, never between a number and its unit, and never run over the column', () => {
    const sheet = newSheet();
    const words = (width: number, text: string) =>
      breakLines(sheet, text, width).map((line) => line.map(({ text: word }) => word).join(' '));
    expect(words(20, 'boxing of 457 mm or so')).toEqual(['boxing of', '457\u00a0mm or', 'so']);
    const long = words(20, 'x'.repeat(60));
    expect(long.join('')).toBe('x'.repeat(60));
    for (const line of long) expect(sheet.textWidth(line)).toBeLessThanOrEqual(20);
  });

  it('state the two sizes of a curved back, and only what is asked', () => {
    const inches = { system: 'feet-inches', roundTo: 16 } as const;
    expect(curveWords({ apexMm: 177.8, recessMm: 25.4 }, inches)).toBe(
      'fullest 7″ over the pressed seat; gives way 1″ for the pelvis below it',
    );
    expect(curveWords({ apexMm: 0, recessMm: 25.4 }, inches)).toBe('gives way 1″ for the pelvis');
    expect(curveWords({ apexMm: 177.8, recessMm: 0 }, inches)).toBe('fullest 7″ over the pressed seat');
  });
});
