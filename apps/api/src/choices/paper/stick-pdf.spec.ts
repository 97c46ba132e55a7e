import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ARRANGEMENTS, dimensionOf, type LengthStyle, type SetDocument } from '@settlewright/geometry';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { paperWords, type PlacedWord } from '../../../test/factories/papers';
import type { Paper } from '../../paper/pack';
import type { ShownStick } from '../shown-stick';
import { stickPdf } from './stick-pdf';

const NAMES = [
  'Wilhelmina Featherstonehaugh-Cholmondeley of Upper Marchwood',
  'Дарья Ёлкина-Воробьёва Александровна Константинопольская',
  'Maximilian Bartholomew Throckmorton-Ravensworth the Younger, understudy',
  'Ελένη Παπαδοπούλου-Χατζηδημητρίου',
];
const SITTERS = 12;
const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const dimension = dimensionOf(document, 'seat-height')!;
const { value, min, max } = dimension;
const values = [min, value - 50, value, value + 50, max];
const INCHES: LengthStyle = { system: 'feet-inches', roundTo: 8 };
const METRIC: LengthStyle = { system: 'millimetres', roundTo: 8 };

const rows = [...Array(SITTERS).keys()].map((n): ShownStick['rows'][number] => ({
  sitterId: String(n),
  placeId: `bench:${n}`,
  name: NAMES[n % NAMES.length]!,
  estimated: n % 3 === 0,
  fits: [{ from: value - 30 + n, to: value + 20 }],
  tight: [{ from: value - 50, to: value + 50 }],
  perhapsTight: [{ from: value - 70, to: value + 60 }],
  surelyTight: [],
  states: ['wontFit', 'tight', 'fits', 'tight', 'notKnown'],
}));

function paper(size: Paper, style: LengthStyle, tried = value + 6): Buffer {
  const told = {
    id: 'people',
    name: 'People of a long and winding description',
    source: 'A survey',
    cautions: ['Nobody counted these'],
    womenPercent: 50,
    people: 10_000,
    placeIds: [],
  };
  const points = values.map((at, n) => ({ value: at, fits: [0, 0.4, 0.8, 0.5, 0][n]! }));
  const stick: ShownStick = {
    detail: 'full',
    dimension,
    step: 1,
    values,
    shownRule: 'SEAT-02',
    ruleIds: ['SEAT-02'],
    rows,
    allFit: [],
    allTight: [{ from: value - 50, to: value + 50 }],
    clauses: [],
    bands: [
      { name: 'usual', words: 'Usual: here to there.', stretches: [{ from: value - 20, to: value + 20 }] },
      { name: 'clause 903.5, B1', words: 'Inside clause 903.5.', stretches: [{ from: min, to: value }] },
    ],
    value: tried,
    atValue: rows.map(({ placeId }) => ({ placeId, state: 'notKnown' })),
    shares: { told, points, joint: points },
  };
  const rule = { id: 'SEAT-02', name: 'Seat height', why: '', sourceWord: 'from memory', sources: [] };
  return stickPdf({
    stick,
    rules: [{ ...rule, sources: [{ cite: 'A review', read: 'from memory' }] }],
    style,
    paper: size,
    timeZone: 'UTC',
    workshop: { name: 'Bench and Sill', telephone: '555' },
    productionName: 'The night train',
    setName: 'Dining car',
    state: { kind: 'draft', number: 3 },
    at: new Date('2026-03-01T12:00:00Z'),
    by: 'Olive Owner',
    confidence: 'Verdicts from 0.90.',
  });
}

describe.each([
  ['a4', METRIC, '841.89 x 595.27', 'mm'],
  ['letter', INCHES, '792 x 612', '″'],
] as const)('a story stick on %s', (size, style, points, unit) => {
  const folder = mkdtempSync(join(tmpdir(), 'stick-'));
  const file = join(folder, 'stick.pdf');
  const run = (tool: string, ...given: string[]) => execFileSync(tool, given, { encoding: 'utf8' });
  beforeAll(() => writeFileSync(file, paper(size, style)));
  afterAll(() => rmSync(folder, { recursive: true }));

  it('overprints nothing, with twelve long names', async () => {
    const found = await paperWords(paper(size, style));
    // Boxes hold the whole height of a face, so that lines close to each other touch by a little.
    const middleOf = ({ yMin, yMax }: PlacedWord) => (yMin + yMax) / 2;
    const clashes = found.flatMap((a, i) =>
      found
        .slice(i + 1)
        .filter(
          (b) =>
            a.page === b.page &&
            a.xMin < b.xMax - 0.5 &&
            b.xMin < a.xMax - 0.5 &&
            Math.abs(middleOf(a) - middleOf(b)) < 7,
        )
        .map((b) => `${a.text} / ${b.text}`),
    );
    expect(found.length).toBeGreaterThan(100);
    expect(clashes).toEqual([]);
  });

  it('names everybody, the values, the ranges, the source and the caution, in its units', () => {
    const text = run('pdftotext', file, '-').normalize('NFC').replace(/\s+/g, ' ');
    expect(text).toContain('Story stick: seat height, pressed');
    for (const word of NAMES.map((name) => name.split(' ')[0] as string)) expect(text).toContain(word);
    for (const words of ['now', 'tried', 'usual', 'clause 903.5, B1', 'A review (from memory)', 'Dining car'])
      expect(text).toContain(words);
    expect(text).toContain('Guidance, not certification.');
    expect(text).toMatch(new RegExp(`now \\S+( mm)?`));
    expect(text).toContain(unit);
  });

  it('is a drawing in the size of the sheet, with its faces in it', () => {
    expect(run('pdfinfo', file)).toContain(points);
    expect(run('pdfimages', '-list', file).trim().split('\n')).toHaveLength(2);
    const faces = run('pdffonts', file).trim().split('\n').slice(2);
    expect(faces.length).toBeGreaterThan(1);
    for (const face of faces) expect(face).toMatch(/ yes +(yes|no) +yes /);
  });
});

it('is the same bytes for the same stick, and says nothing of a tried value where none was asked for', () => {
  expect(paper('a4', METRIC).equals(paper('a4', METRIC))).toBe(true);
  const folder = mkdtempSync(join(tmpdir(), 'stick-'));
  const file = join(folder, 'present.pdf');
  writeFileSync(file, paper('a4', METRIC, value));
  const text = execFileSync('pdftotext', [file, '-'], { encoding: 'utf8' });
  rmSync(folder, { recursive: true });
  expect(text).not.toContain('tried 4');
});
