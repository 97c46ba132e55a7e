/**
 * Advance width in ems of every character of a TrueType file (its `cmap` of format 4, with `hmtx`). Characters
 * beyond the basic plane are left out: jsPDF draws none of them.
 */
export function readAdvances(ttf: Buffer): Map<number, number> {
  const unitsPerEm = ttf.readUInt16BE(tableOffset(ttf, 'head') + 18);
  const metrics = ttf.readUInt16BE(tableOffset(ttf, 'hhea') + 34);
  const hmtx = tableOffset(ttf, 'hmtx');
  const advance = (glyph: number) => ttf.readUInt16BE(hmtx + Math.min(glyph, metrics - 1) * 4) / unitsPerEm;
  const found = new Map<number, number>();
  for (const [code, glyph] of readGlyphs(ttf)) found.set(code, advance(glyph));
  return found;
}

function* readGlyphs(ttf: Buffer): Generator<[code: number, glyph: number]> {
  const cmap = tableOffset(ttf, 'cmap');
  const count = ttf.readUInt16BE(cmap + 2);
  for (let i = 0; i < count; i++) {
    const platform = ttf.readUInt16BE(cmap + 4 + i * 8);
    const table = cmap + ttf.readUInt32BE(cmap + 8 + i * 8);
    if (platform !== MACINTOSH && ttf.readUInt16BE(table) === 4) yield* readFormat4(ttf, table);
  }
}

const MACINTOSH = 1;

/** The file without the names of its glyphs (`post` of version 3), which a PDF has no use for and would carry. */
export function withoutGlyphNames(ttf: Buffer): Buffer {
  const slim = Buffer.from(ttf);
  const entry = tableEntry(slim, 'post');
  slim.writeUInt32BE(0x00030000, slim.readUInt32BE(entry + 8));
  slim.writeUInt32BE(32, entry + 12);
  return slim;
}

function tableOffset(ttf: Buffer, tag: string): number {
  return ttf.readUInt32BE(tableEntry(ttf, tag) + 8);
}

function tableEntry(ttf: Buffer, tag: string): number {
  const tables = ttf.readUInt16BE(4);
  for (let i = 0; i < tables; i++) {
    const entry = 12 + i * 16;
    if (ttf.toString('latin1', entry, entry + 4) === tag) return entry;
  }
  throw new Error(`The font file has no "${tag}" table`);
}

function* readFormat4(ttf: Buffer, table: number): Generator<[code: number, glyph: number]> {
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
      const glyph = mapped === 0 ? 0 : (mapped + delta) & 0xffff;
      if (glyph !== 0) yield [code, glyph];
    }
  }
}
