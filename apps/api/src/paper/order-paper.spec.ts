import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from '@jest/globals';
import { formatLength, layCloth, type LengthStyle, type SetDocument } from '@settlewright/geometry';
import {
  arrangement,
  chosen,
  fourWays,
  INCHES,
  orderPack,
  ORDER_PAGE,
  patterned,
} from '../../test/factories/order-packs';
import { paperText, paperWords, type PlacedWord } from '../../test/factories/papers';
import { laidSpecPdf } from './laid-pack';
import { Sheet } from './sheet';
import type { SpecPackData } from './spec-pack';
import { SpecPress } from './spec-press';
import { tileSpace } from './template-sheets';
import { templateLines, templateTiles } from './template-tiles';

const TRIES = 40;
const METRIC: LengthStyle = { system: 'millimetres', roundTo: 16 };
const inches = (mm: number) => formatLength(mm, INCHES);
const bare = (mm: number) => inches(mm).replace('″', '');

/** Fifty corners along a wavy front: three sheets of A4, and more corners than a chain carries. */
function wavy(): SetDocument {
  const drawn = [
    ...Array.from({ length: 47 }, (_, i) => ({
      xMm: i * 15,
      yMm: i % 2 === 0 ? 0 : 12,
      radiusMm: 2,
      edge: 'front' as const,
    })),
    { xMm: 705, yMm: 0, radiusMm: 0, edge: 'left' as const },
    { xMm: 705, yMm: 120, radiusMm: 20, edge: 'back' as const },
    { xMm: 0, yMm: 120, radiusMm: 20, edge: 'right' as const },
  ];
  return chosen(arrangement('facing-benches'), 'C1', { shape: { drawn } });
}

/** A back with fourteen buttons to a row. */
function fourteenButtons(): SetDocument {
  const document = arrangement('facing-benches');
  for (const piece of document.pieces) {
    if (piece.kind !== 'bench') continue;
    piece.upholstery.buttons = { rows: 3, everyBoards: 1, alignTo: 'joints', on: 'back' };
    piece.lengthMm = 16.5 * (piece.boards.faceMm + piece.boards.revealMm);
    piece.upholstery.longestCushionMm = 3000;
  }
  return document;
}

/** Words that stand on each other, page by page; the boxes of a reader are a little larger than the ink. */
function overlaps(words: readonly PlacedWord[]): string[] {
  const met: string[] = [];
  words.forEach((a, i) => {
    for (const b of words.slice(i + 1)) {
      if (b.page !== a.page) break;
      const across = Math.min(a.xMax, b.xMax) - Math.max(a.xMin, b.xMin);
      const down = Math.min(a.yMax, b.yMax) - Math.max(a.yMin, b.yMin);
      if (across > 0.4 && down > 1.2) met.push(`sheet ${a.page}: "${a.text}" on "${b.text}"`);
    }
  });
  return met;
}

describe('the paper of an order', () => {
  const folder = mkdtempSync(join(tmpdir(), 'order-paper-'));
  afterAll(() => rmSync(folder, { recursive: true }));
  const info = (tool: 'pdfinfo' | 'pdffonts', pdf: Buffer) => {
    const file = join(folder, 'order.pdf');
    writeFileSync(file, pdf);
    return execFileSync(tool, [file], { encoding: 'utf8' });
  };
  const sets: [string, () => SetDocument][] = [
    ['of four makes', fourWays],
    ['of an outline on three sheets', wavy],
    ['of a back with fourteen buttons to a row', fourteenButtons],
  ];

  const sheets = [
    { paper: 'a4', units: INCHES },
    { paper: 'letter', units: INCHES },
    { paper: 'a4', units: METRIC },
    { paper: 'letter', units: METRIC },
  ] as const;
  for (const { paper, units } of sheets) {
    it.each(sets)(`%s has no word on another, on ${paper} in ${units.system}`, async (_, document) => {
      const data = orderPack(document(), { paper, units });
      const words = await paperWords(laidSpecPdf(data, TRIES));
      expect(words.length).toBeGreaterThan(300);
      expect(overlaps(words)).toEqual([]);
    });
  }

  it('hatches what is to look used, and says it by its number', async () => {
    const [worn] = orderPack(fourWays()).model.schedule;
    const words = await paperWords(laidSpecPdf(orderPack(fourWays()), TRIES));
    const page = words.find(({ text }) => text === 'A2')!.page;
    const here = words.filter((word) => word.page === page).map(({ text }) => text);
    expect(here.filter((text) => text === 'A2')).toHaveLength(2);
    expect(here.join(' ')).toMatch(/A1 front edge: worn through; A2 .* tea, an old ring/);
    const plain = orderPack(chosen(fourWays(), worn!.marks[0]!, { wear: undefined }));
    const lines = (data: SpecPackData) => {
      let count = 0;
      const { line } = Sheet.prototype;
      Sheet.prototype.line = function (this: Sheet, ...drawn: Parameters<Sheet['line']>) {
        if (drawn[4]?.grey === 120) count += 1;
        line.apply(this, drawn);
      };
      try {
        laidSpecPdf(data, TRIES);
      } finally {
        Sheet.prototype.line = line;
      }
      return count;
    };
    expect(lines(orderPack(fourWays()))).toBeGreaterThan(lines(plain) + 20);
  });

  it('has the sets that it is looked at with', () => {
    expect(orderPack(fourteenButtons()).model.buttons[0]!.columns).toHaveLength(14);
    const outline = orderPack(wavy()).model.schedule[0]!.spec;
    const lines = templateLines(outline.outline, outline.making!.panels[0]!.cut, []);
    expect(templateTiles(lines, tileSpace({ widthMm: 297, heightMm: 210 }))).toHaveLength(3);
  });

  it('reads back as the model has it: sizes, buttons, corners, cloth', async () => {
    const data = orderPack(fourWays());
    const text = (await paperText(laidSpecPdf(data, TRIES))).replace(/[ \u00a0]+/g, ' ');
    for (const { spec } of data.model.schedule) {
      const xs = spec.outline.map(({ at }) => at[0]);
      const ys = spec.outline.map(({ at }) => at[1]);
      const [w, d] = [Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys)];
      expect(text).toContain(`${bare(w)} × ${bare(d)} × ${inches(spec.finishedMm.thicknessMm)}`);
    }
    for (const sheet of data.model.buttons) {
      sheet.columns.forEach(({ fromDatumMm, fromSeamMm, beyond }, i) => {
        expect(beyond).toBe(false);
        expect(text).toContain(`${i + 1} ${bare(fromDatumMm)} ${bare(fromSeamMm)} on it`);
      });
      for (const { fromSeamMm, overSeatMm } of sheet.rows) {
        expect(text).toContain(
          overSeatMm === undefined ? bare(fromSeamMm) : `${bare(fromSeamMm)} ${bare(overSeatMm)}`,
        );
      }
    }
    const outline = data.model.schedule[0]!.spec.outline;
    const [x0, y0] = [
      Math.min(...outline.map(({ at }) => at[0])),
      Math.min(...outline.map(({ at }) => at[1])),
    ];
    outline.forEach(({ at, radiusMm }, i) => {
      const radius = radiusMm > 0 ? bare(radiusMm) : 'sharp';
      expect(text).toContain(`${i + 1} ${bare(at[0] - x0)} ${bare(at[1] - y0)} ${radius}`);
    });
    const laid = layCloth(data.model.cloths[0]!, TRIES)!;
    expect(text).toContain(`Buy ${(laid.buyMm / 914.4).toFixed(2)} yd (${inches(laid.buyMm)})`);
    for (const words of [
      'FINISHED, seam to seam',
      'LH, left hand as sat in',
      '4 of 4',
      'camera side',
      'hook-and-loop, hook on the wood',
      'Recorded here, not certified',
      'half round',
      'cover pulled round',
      'knife edge: one seam',
      'cloth railroaded, nap runs to the front edge',
    ])
      expect(text).toContain(words);
    expect(text).not.toMatch(/\bcompliant\b|\bsafe\b/i);
  });

  it('says which columns stand too far off their joints', async () => {
    const tufted = chosen(arrangement('facing-benches'), 'C3', {
      tufting: {
        kind: 'diamond',
        tuftMm: { widthMm: 150, heightMm: 200 },
        borderMm: 90,
        fullness: 'foam-thickness',
      },
    });
    const data = orderPack(tufted);
    const off = data.model.buttons[0]!.columns.filter(({ beyond }) => beyond);
    expect(off.length).toBeGreaterThan(0);
    const text = await paperText(laidSpecPdf(data, TRIES));
    expect(text.match(/CHECK \S+ (towards the datum|away from it)/g)).toHaveLength(off.length);
    expect(text).toContain('staggered');
  });

  it('says of a cloth that is not described that it is assumed, and of one that is short by how much', async () => {
    const assumed = await paperText(
      laidSpecPdf(
        orderPack(arrangement('facing-benches'), { covers: [patterned()], assumedCloths: ['plum moquette'] }),
        TRIES,
      ),
    );
    expect(assumed).toContain('Nothing was said of this cloth');
    const com = { sampleKept: true, dyeLot: '77-B', receivedMm: 2000, flaws: '' };
    const short = await paperText(
      laidSpecPdf(orderPack(arrangement('facing-benches'), { covers: [patterned({ com })] }), TRIES),
    );
    expect(short).toMatch(/dye lot 77-B; received 2\.19.yd \(.*\); SHORT by/);
  });

  it('is the same bytes each time, with its fonts in it, its title and nobody’s link', () => {
    const data = orderPack(fourWays());
    const pdf = laidSpecPdf(data, TRIES);
    expect(laidSpecPdf(orderPack(fourWays()), TRIES).equals(pdf)).toBe(true);
    expect(info('pdfinfo', pdf)).toMatch(/Title: +Cushion order 14, Dining car cushions, revision C/);
    const fonts = info('pdffonts', pdf).trim().split('\n').slice(2);
    expect(fonts.length).toBeGreaterThan(1);
    for (const font of fonts) expect(font).toMatch(/yes (yes|no ) yes/);
    expect(ORDER_PAGE).not.toContain('/order/');
  });

  it('is drawn in a thread as it is here, and a drawing that fails ends no other', async () => {
    const press = new SpecPress();
    try {
      const data = orderPack(arrangement('bench-window'));
      const broken = { ...data, cushions: null } as unknown as SpecPackData;
      const drawn = press.draw(data);
      await expect(press.draw(broken)).rejects.toThrow('an order was not drawn');
      expect((await drawn).equals(laidSpecPdf(data))).toBe(true);
    } finally {
      await press.onModuleDestroy();
    }
  }, 60_000);
});
