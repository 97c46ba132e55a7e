import { readFileSync } from 'node:fs';
import type { jsPDF } from 'jspdf';

export type Weight = 300 | 400 | 600;

const FAMILY = 'Work Sans';
const FILES: Record<Weight, string> = {
  300: '300Light/WorkSans_300Light.ttf',
  400: '400Regular/WorkSans_400Regular.ttf',
  600: '600SemiBold/WorkSans_600SemiBold.ttf',
};
const WEIGHTS: readonly Weight[] = [300, 400, 600];

interface LoadedFace {
  weight: Weight;
  base64: string;
}
let loaded: { faces: LoadedFace[]; codePoints: ReadonlySet<number> } | undefined;

function load() {
  if (loaded) return loaded;
  const files = WEIGHTS.map((weight) => ({
    weight,
    bytes: readFileSync(require.resolve(`@expo-google-fonts/work-sans/${FILES[weight]}`)),
  }));
  const sets = files.map(({ bytes }) => readCodePoints(bytes));
  const inEvery = [...(sets[0] ?? [])].filter((code) => sets.every((set) => set.has(code)));
  loaded = {
    faces: files.map(({ weight, bytes }) => ({ weight, base64: bytes.toString('base64') })),
    codePoints: new Set(inEvery),
  };
  return loaded;
}

/** Makes the three weights known to the document; jsPDF embeds only the glyphs that get used. */
export function registerWorkSans(doc: jsPDF): void {
  for (const { weight, base64 } of load().faces) {
    doc.addFileToVFS(`work-sans-${weight}.ttf`, base64);
    doc.addFont(`work-sans-${weight}.ttf`, FAMILY, 'normal', weight);
  }
}

export function useWorkSans(doc: jsPDF, weight: Weight): void {
  doc.setFont(FAMILY, 'normal', weight);
}

/** Whether every weight can draw the character. */
export function hasGlyph(codePoint: number): boolean {
  return load().codePoints.has(codePoint);
}

/** Reads the characters a TrueType file maps to a glyph (its `cmap`, formats 4 and 12). */
export function readCodePoints(ttf: Buffer): Set<number> {
  const cmap = tableOffset(ttf, 'cmap');
  const found = new Set<number>();
  const count = ttf.readUInt16BE(cmap + 2);
  for (let i = 0; i < count; i++) {
    const table = cmap + ttf.readUInt32BE(cmap + 8 + i * 8);
    const format = ttf.readUInt16BE(table);
    if (format === 4) readFormat4(ttf, table, found);
    if (format === 12) readFormat12(ttf, table, found);
  }
  return found;
}

function tableOffset(ttf: Buffer, tag: string): number {
  const tables = ttf.readUInt16BE(4);
  for (let i = 0; i < tables; i++) {
    const entry = 12 + i * 16;
    if (ttf.toString('latin1', entry, entry + 4) === tag) return ttf.readUInt32BE(entry + 8);
  }
  throw new Error(`The font file has no "${tag}" table`);
}

function readFormat4(ttf: Buffer, table: number, found: Set<number>): void {
  const segX2 = ttf.readUInt16BE(table + 6);
  const ends = table + 14;
  const starts = ends + segX2 + 2;
  const deltas = starts + segX2;
  const offsets = deltas + segX2;
  for (let s = 0; s < segX2; s += 2) {
    const end = ttf.readUInt16BE(ends + s);
    const start = ttf.readUInt16BE(starts + s);
    const delta = ttf.readUInt16BE(deltas + s);
    const rangeOffset = ttf.readUInt16BE(offsets + s);
    for (let code = start; code <= end && code < 0xffff; code++) {
      const mapped =
        rangeOffset === 0 ? code : ttf.readUInt16BE(offsets + s + rangeOffset + (code - start) * 2);
      if (mapped !== 0 && ((mapped + delta) & 0xffff) !== 0) found.add(code);
    }
  }
}

function readFormat12(ttf: Buffer, table: number, found: Set<number>): void {
  const groups = ttf.readUInt32BE(table + 12);
  for (let g = 0; g < groups; g++) {
    const group = table + 16 + g * 12;
    const end = ttf.readUInt32BE(group + 4);
    for (let code = ttf.readUInt32BE(group); code <= end; code++) found.add(code);
  }
}
