import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { inflateSync } from 'node:zlib';
import { ARRANGEMENTS, type PieceOf, type SetView } from '@settlewright/geometry';
import { setDrawing } from '@settlewright/geometry/export';
import { describe, expect, it } from 'vitest';
import { pdfOf, sheetsOf } from './pdf-sheets.ts';
import { printable, unprinted } from './sheet-frame.ts';

const style = { system: 'feet-inches', roundTo: 16 } as const;
const { resolve } = createRequire(import.meta.url);
const font = (name: string) =>
  readFileSync(resolve(`@expo-google-fonts/work-sans/${name}.ttf`)).toString('base64');
const fonts = {
  regular: font('400Regular/WorkSans_400Regular'),
  semibold: font('600SemiBold/WorkSans_600SemiBold'),
};
const words = { setName: 'Dining car', version: 'Draft', style };
const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const table = document.pieces.find((piece): piece is PieceOf<'table'> => piece.kind === 'table')!;
const plan = (scale: number): SetView => ({ direction: 'above', hidden: 'left-out', scale });

/** Drawing commands of every page, unpacked. */
function commandsOf(pdf: ArrayBuffer): string[] {
  const bytes = Buffer.from(pdf);
  const text = bytes.toString('latin1');
  return [...text.matchAll(/\/Filter \/FlateDecode[^]*?stream\r?\n/g)].flatMap((match) => {
    const from = match.index + match[0].length;
    const unpacked = inflateSync(bytes.subarray(from, text.indexOf('endstream', from))).toString('latin1');
    return / (l|re)\n/.test(unpacked) ? [unpacked] : [];
  });
}

const POINTS_PER_MM = 72 / 25.4;

/** Lengths of the straight strokes of a page, millimetres of paper. */
function strokes(page: string): number[] {
  return [...page.matchAll(/(-?[\d.]+) (-?[\d.]+) m\n(-?[\d.]+) (-?[\d.]+) l\n/g)].map(([, ...ends]) => {
    const [x0 = 0, y0 = 0, x1 = 0, y1 = 0] = ends.map(Number);
    return Math.hypot(x1 - x0, y1 - y0) / POINTS_PER_MM;
  });
}

describe('printed sheets', () => {
  it.each([10, 24])('at 1 : %i hold the table at that scale, and a bar of true three inches', (scale) => {
    const drawing = setDrawing({ ...document, pieces: [table] }, plan(scale), style);
    const lengths = commandsOf(pdfOf(drawing, words, 'a4', fonts)).flatMap(strokes);
    for (const mm of [table.lengthMm / scale, table.widthMm / scale, 76.2]) {
      expect(lengths.some((length) => Math.abs(length - mm) < 0.02)).toBe(true);
    }
  });

  it('are one for each tile, never a smaller drawing', () => {
    const drawing = setDrawing(document, plan(4), style);
    const sheets = sheetsOf(drawing, 'letter').length;
    expect(sheets).toBeGreaterThan(4);
    expect(commandsOf(pdfOf(drawing, words, 'letter', fonts))).toHaveLength(sheets);
  });

  it('keep letters that the font has and mark those it lacks', () => {
    expect(printable('Café 17½″, 1¹¹⁄₁₆″ − 457\u202fmm')).toBe('Café 17½″, 1¹¹⁄₁₆″ − 457\u00a0mm');
    expect(printable('食堂車')).toBe('···');
    expect(unprinted(['Вагон', 'Café 3′\u202f8″'])).toEqual(['В', 'а', 'г', 'о', 'н']);
  });
});
