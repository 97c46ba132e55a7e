import { readFileSync } from 'node:fs';
import { basename } from 'node:path';
import { jsPDF } from 'jspdf';
import { readAdvances, withoutGlyphNames } from './true-type';

export type Weight = 300 | 400 | 600;

/** In the order in which they are asked for a character. */
const FACES = ['Work Sans', 'DejaVu Sans'] as const;
export type Face = (typeof FACES)[number];

const DEJAVU = require.resolve('dejavu-fonts-ttf/ttf/DejaVuSans.ttf');
const FILES: Record<Face, Record<Weight, string>> = {
  'Work Sans': {
    300: require.resolve('@expo-google-fonts/work-sans/300Light/WorkSans_300Light.ttf'),
    400: require.resolve('@expo-google-fonts/work-sans/400Regular/WorkSans_400Regular.ttf'),
    600: require.resolve('@expo-google-fonts/work-sans/600SemiBold/WorkSans_600SemiBold.ttf'),
  },
  'DejaVu Sans': {
    300: DEJAVU,
    400: DEJAVU,
    600: require.resolve('dejavu-fonts-ttf/ttf/DejaVuSans-Bold.ttf'),
  },
};

/** DejaVu is drawn smaller, so that its capitals (0.729 em) stand as high as those of Work Sans (0.66 em). */
const SCALE: Record<Face, number> = { 'Work Sans': 1, 'DejaVu Sans': 0.905 };

interface FontFile {
  base64: string;
  advances: ReadonlyMap<number, number>;
}
const files = new Map<string, FontFile>();

function readFile(name: string): FontFile {
  let file = files.get(name);
  if (!file) {
    const bytes = readFileSync(name);
    file = { base64: withoutGlyphNames(bytes).toString('base64'), advances: readAdvances(bytes) };
    files.set(name, file);
  }
  return file;
}

const coverage = new Map<Face, ReadonlySet<number>>();

/** Code points that a face draws in every weight. Work Sans does not set loose marks over their letters. */
function coverageOf(face: Face): ReadonlySet<number> {
  let covered = coverage.get(face);
  if (!covered) {
    const [first, ...rest] = Object.values(FILES[face]).map((name) => readFile(name).advances);
    const inEvery = [...(first?.keys() ?? [])].filter((code) => rest.every((other) => other.has(code)));
    const whole = (code: number) => face === 'DejaVu Sans' || !/\p{M}/u.test(String.fromCodePoint(code));
    covered = new Set(inEvery.filter(whole));
    coverage.set(face, covered);
  }
  return covered;
}

/** The first face that draws a character and its marks; none when no face does. */
export function faceOf(cluster: string): Face | undefined {
  return FACES.find((face) => holdsAll(face, cluster));
}

export function holdsAll(face: Face, text: string): boolean {
  const covered = coverageOf(face);
  for (const character of text) if (!covered.has(character.codePointAt(0) ?? 0)) return false;
  return true;
}

/** Advance of a character at a size of one point, in points. */
export function advance(face: Face, weight: Weight, codePoint: number): number {
  return (readFile(FILES[face][weight]).advances.get(codePoint) ?? 0) * SCALE[face];
}

// Text comes joined and in drawing order; jsPDF would join Arabic once more, from the wrong end.
const { events, processArabic } = jsPDF.API as { events: [string, unknown][]; processArabic: unknown };
jsPDF.API.events = events.filter(([, hook]) => hook !== processArabic);

/** The files that a document uses so far. */
const registered = new WeakMap<jsPDF, Set<string>>();

/**
 * Sets the face for what is drawn next. A file becomes part of the document when it first draws, never when it
 * is measured: so the same drawing gives the same bytes, and a paper in Latin letters carries Work Sans alone.
 */
export function useFace(doc: jsPDF, face: Face, weight: Weight, size: number): void {
  const file = FILES[face][weight];
  const name = basename(file, '.ttf');
  const known = registered.get(doc) ?? new Set();
  if (!known.has(name)) {
    doc.addFileToVFS(name, readFile(file).base64);
    doc.addFont(name, name, 'normal');
    registered.set(doc, known.add(name));
  }
  doc.setFont(name, 'normal');
  doc.setFontSize(size * SCALE[face]);
}

interface FontInUse {
  metadata: { toUnicode: Record<string, number> };
}

/** Names the letters themselves in the file, not the forms they are drawn in, so that a search finds them. */
export function findableLetters(doc: jsPDF): void {
  const { getFont } = doc.internal as unknown as { getFont: (name: string, style: string) => FontInUse };
  for (const name of registered.get(doc) ?? []) {
    const { toUnicode } = getFont(name, 'normal').metadata;
    for (const [glyph, code] of Object.entries(toUnicode)) {
      const letters = String.fromCharCode(code).normalize('NFKC');
      if (isArabicForm(code) && letters.length === 1) toUnicode[glyph] = letters.charCodeAt(0);
    }
  }
}

const isArabicForm = (code: number) =>
  (code >= 0xfb50 && code <= 0xfdff) || (code >= 0xfe70 && code <= 0xfefc);
