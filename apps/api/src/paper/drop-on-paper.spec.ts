import { describe, expect, it } from '@jest/globals';
import { seatSinkMm } from '@settlewright/anthropometry';
import {
  formatLength,
  type Foam,
  type LengthStyle,
  measureSet,
  ORDER_SITTERS,
  type SetDocument,
  shownDropMm,
} from '@settlewright/geometry';
import { arrangement, INCHES, orderPack } from '../../test/factories/order-packs';
import { paperWords } from '../../test/factories/papers';
import { readCsvRows } from '../common/csv-rows';
import { scheduleCsv } from '../cushion-orders/order-lists';
import { laidSpecPdf } from './laid-pack';

const TRIES = 40;
const DECIMAL: LengthStyle = { system: 'decimal-inches', roundTo: 16 };
const base = { grade: 'own seat', densityKgM3: 42, ifd25N: 160, supportFactor: 2 };
const of = { thicknessMm: 101.6, ifd25N: 160, supportFactor: 2 };
const tried: Foam = { ...base, tested: { factor: 1.4, error: 0.13, sits: 2, on: '2027-01-14', of } };
const layered: Foam = {
  ...base,
  layers: [
    { share: 0.25, times: 0.6 },
    { share: 0.75, times: 1.6 },
  ],
  wrap: { thicknessMm: 12.7, lostMm: 6.35 },
};

/** Two facing benches, each on its own foam. */
function onFoams(foams: readonly Foam[]): SetDocument {
  const document = arrangement('facing-benches');
  const benches = document.pieces.filter((piece) => piece.kind === 'bench');
  benches.forEach((bench, i) => (bench.seatCushion = { foam: foams[i % foams.length]!, thicknessMm: 101.6 }));
  return document;
}

/** How far the room has the seat of a piece go down under a sitter of the order. */
function inTheRoom(document: SetDocument, pieceId: string, sitter: keyof typeof ORDER_SITTERS): number {
  const place = measureSet(document).places.find((one) => one.pieceId === pieceId)!;
  return seatSinkMm(place.foam!, ORDER_SITTERS[sitter].weightKg).sinkMm;
}

describe('how far a seat goes down, on paper', () => {
  const document = onFoams([tried, layered]);
  const data = orderPack(document);
  const seats = data.model.schedule.filter(({ spec }) => spec.kind === 'seat');

  it('is the number of the room, read back from the PDF, with where it comes from', async () => {
    const words = await paperWords(laidSpecPdf(data, TRIES));
    const text = words.map((word) => word.text).join(' ');
    const shown = (mm: number) => formatLength(shownDropMm(mm, INCHES), { ...INCHES, feet: false });
    expect(seats).toHaveLength(2);
    const said = [
      ...text.matchAll(/Sinks (\S+) \(\S+ to \S+\) under 110 lb, (\S+) \(\S+ to \S+\) under 220 lb/g),
    ];
    expect(said.map(([, light, heavy]) => [light, heavy])).toEqual(
      seats.map(({ spec }) =>
        (['light', 'heavy'] as const).map((sitter) => shown(inTheRoom(document, spec.benchId, sitter))),
      ),
    );
    expect(text).toMatch(/from the top 1″ of 22.lb on 3″ of 58.lb; ½″ of wrap over it, both faces together/);
    expect(text.match(/crown up to \S+ more/g)).toEqual(
      expect.arrayContaining(['crown up to ¼″ more', 'crown up to ¾″ more']),
    );
    expect(text).toContain('(by 2 test sits, give or take 13 %)');
    expect(text).toContain('(estimate, give or take 30 %, from memory)');
  });

  it('is the same in the list', () => {
    const { rows } = readCsvRows(scheduleCsv(data));
    const [head, ...lines] = rows.map(({ cells }) => cells);
    const cell = (mark: string, name: string) =>
      lines.find(([first]) => first === mark)![head!.indexOf(name)];
    for (const { spec } of seats) {
      const light = shownDropMm(inTheRoom(document, spec.benchId, 'light'), DECIMAL);
      const heavy = shownDropMm(inTheRoom(document, spec.benchId, 'heavy'), DECIMAL);
      expect(Number(cell(spec.mark, 'goes down under 110 lb in'))).toBeCloseTo(light / 25.4, 9);
      expect(Number(cell(spec.mark, 'goes down under 220 lb in'))).toBeCloseTo(heavy / 25.4, 9);
    }
    expect(seats.map(({ spec }) => cell(spec.mark, 'goes down by'))).toEqual([
      'by 2 test sits, give or take 13 %',
      'estimate, give or take 30 %, from memory',
    ]);
    const back = data.model.schedule.find(({ spec }) => spec.kind === 'back')!;
    expect(cell(back.spec.mark, 'goes down by')).toBe('');
  });
});
