import { describe, expect, it } from '@jest/globals';
import { outlineExtent, outlinePerimeter } from '@settlewright/geometry';
import DxfParser, { type ILwpolylineEntity, type ITextEntity } from 'dxf-parser';
import { fourWays, INCHES, orderPack } from '../../test/factories/order-packs';
import { readCsvRows } from '../common/csv-rows';
import { orderDxf, scheduleCsv } from './order-lists';

const data = orderPack(fourWays());
const metric = orderPack(fourWays(), { units: { system: 'millimetres', roundTo: 16 } });

describe('the schedule as a list', () => {
  const { rows } = readCsvRows(scheduleCsv(data));
  const [head, ...lines] = rows.map(({ cells }) => cells);
  const cell = (line: string[], name: string) => line[head!.indexOf(name)];

  it('has a line for each cushion with the numbers of the model, in the unit that its heading names', () => {
    expect(lines.map(([mark]) => mark)).toEqual(['C1', 'C2', 'C3', 'C4']);
    data.model.schedule.forEach((row, i) => {
      const { widthMm, depthMm } = outlineExtent(row.spec.outline);
      expect(Number(cell(lines[i]!, 'finished width in'))).toBeCloseTo(widthMm / 25.4, 4);
      expect(Number(cell(lines[i]!, 'finished depth in'))).toBeCloseTo(depthMm / 25.4, 4);
      expect(Number(cell(lines[i]!, 'foam width in'))).toBeCloseTo(row.sawnMm!.widthMm / 25.4, 4);
      expect(Number(cell(lines[i]!, 'buttons'))).toBe(row.spec.buttons.count);
    });
    const { densityKgM3, ifd25N } = data.model.schedule[0]!.spec.foam;
    expect(Number(cell(lines[0]!, 'foam density lb/ft3'))).toBeCloseTo(densityKgM3 / 16.018463, 2);
    expect(Number(cell(lines[0]!, 'foam 25 % IFD lb'))).toBeCloseTo(ifd25N / 4.4482216, 2);
    expect(cell(lines[0]!, 'template')).toBe('yes');
    const inMm = readCsvRows(scheduleCsv(metric)).rows.map(({ cells }) => cells);
    expect(Number(inMm[1]![inMm[0]!.indexOf('finished depth mm')])).toBeCloseTo(
      outlineExtent(data.model.schedule[0]!.spec.outline).depthMm,
      1,
    );
  });

  it('runs nothing in a spreadsheet', () => {
    expect(cell(lines[0]!, 'notes')).toBe("'=Rub the front edge.");
  });
});

describe('panels for a cutting machine', () => {
  it.each([
    ['inches', 25.4, data],
    ['millimetres', 1, metric],
  ] as const)('are every outline, foam and panel at full size, in %s', (_, per, pack) => {
    const file = new DxfParser().parseSync(orderDxf(pack))!;
    const words = file.entities.filter((e) => e.type === 'TEXT').map((e) => (e as ITextEntity).text);
    const { schedule } = pack.model;
    const asked = schedule.flatMap(({ spec }) => [
      spec.making!.foam.outline,
      ...(spec.making!.board ? [spec.making!.board.outline] : []),
      ...spec.making!.panels.map(({ cut }) => cut),
    ]);
    const cut = file.entities.filter(
      (e): e is ILwpolylineEntity => e.type === 'LWPOLYLINE' && e.layer === 'CUT',
    );
    expect(cut).toHaveLength(asked.length);
    cut.forEach((entity, i) => expect(roundMm(entity) * per).toBeCloseTo(outlinePerimeter(asked[i]!), 2));
    expect(words).toHaveLength(asked.length);
    expect(words[0]).toContain('C1 foam');
    expect(words).toContain('C3 board, 1 off');
    expect(words).toContain('C4 plate, 2 off');
    expect(file.header.$INSUNITS).toBe(pack.units.system === INCHES.system ? 1 : 4);
  });
});

/** Length all round a closed polyline with bulges, from the file alone. */
function roundMm({ vertices }: ILwpolylineEntity): number {
  return vertices.reduce((sum, a, i) => {
    const b = vertices[(i + 1) % vertices.length]!;
    const chord = Math.hypot(b.x - a.x, b.y - a.y);
    const sweep = 4 * Math.atan(a.bulge ?? 0);
    return sum + (sweep === 0 ? chord : (chord / (2 * Math.sin(sweep / 2))) * sweep);
  }, 0);
}
