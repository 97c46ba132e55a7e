import {
  buildPhrase,
  CLOSURE_WORDS,
  CONSTRUCTION_WORDS,
  type CutPanel,
  foamNumber,
  foamUnit,
  HANDEDNESS_WORDS,
  handednessOf,
  HOLD_DOWN_WORDS,
  type LengthStyle,
  ORDER_SITTERS,
  orderDrop,
  type OrderSitter,
  outlineExtent,
  phraseText,
  type ScheduleRow,
  shownDropMm,
  TUFTING_WORDS,
  WELT_WORDS,
} from '@settlewright/geometry';
import { dropSourceWords } from '@settlewright/anthropometry';
import { panelsDxf, type TitledPanel } from '@settlewright/geometry/export';
import { type Cell, csvText } from '../common/spreadsheet-cell';
import type { SpecPackData } from '../paper/spec-pack';

const MM_PER_INCH = 25.4;

const isMetric = ({ system }: LengthStyle): boolean => system === 'millimetres';

/** One line a cushion, lengths as plain numbers in the unit that its heading names. */
export function scheduleCsv({ model, labels, units, revision }: SpecPackData): string {
  const unit = isMetric(units) ? 'mm' : 'in';
  const size = (mm: number | undefined): Cell =>
    mm === undefined
      ? null
      : Number((isMetric(units) ? mm : mm / MM_PER_INCH).toFixed(isMetric(units) ? 1 : 4));
  const rows = new Map(model.schedule.flatMap((row) => row.marks.map((mark) => [mark, row] as const)));
  const columns = columnsOf(size, unit);
  const lines = labels.flatMap(({ mark, place }): Cell[][] => {
    const row = rows.get(mark);
    if (!row) return [];
    return [[mark, place, revision.letter, ...columns.map(({ of }) => of(row))]];
  });
  return csvText([['cushion', 'place', 'revision', ...columns.map(({ head }) => head)], ...lines]);
}

function columnsOf(
  size: (mm: number | undefined) => Cell,
  unit: string,
): { head: string; of: (row: ScheduleRow) => Cell }[] {
  return [
    { head: 'kind', of: ({ spec }) => spec.kind },
    { head: 'hand', of: ({ spec }) => HANDEDNESS_WORDS[handednessOf(spec)] },
    { head: 'made alike', of: ({ marks }) => marks.join(' ') },
    { head: 'mirror image', of: ({ mirroredMarks }) => mirroredMarks.join(' ') },
    { head: `finished width ${unit}`, of: ({ spec }) => size(outlineExtent(spec.outline).widthMm) },
    { head: `finished depth ${unit}`, of: ({ spec }) => size(outlineExtent(spec.outline).depthMm) },
    { head: `finished thickness ${unit}`, of: ({ spec }) => size(spec.finishedMm.thicknessMm) },
    { head: `foam width ${unit}`, of: ({ sawnMm }) => size(sawnMm?.widthMm) },
    { head: `foam depth ${unit}`, of: ({ sawnMm }) => size(sawnMm?.depthMm) },
    { head: `foam thickness ${unit}`, of: ({ sawnMm }) => size(sawnMm?.thicknessMm) },
    { head: 'foam', of: ({ spec }) => spec.foam.grade },
    ...foamColumns(unit === 'mm' ? 'millimetres' : 'feet-inches'),
    ...dropColumns(size, unit),
    { head: 'construction', of: ({ spec }) => CONSTRUCTION_WORDS[spec.make.construction] },
    { head: 'closure', of: ({ spec }) => CLOSURE_WORDS[spec.make.closure] },
    { head: 'closure edge', of: ({ spec }) => spec.make.closureEdge },
    { head: `closure length ${unit}`, of: ({ spec }) => size(spec.making?.closure.lengthMm) },
    { head: 'welt', of: ({ spec }) => WELT_WORDS[spec.make.welt] },
    { head: `welt length ${unit}`, of: ({ spec }) => size(spec.making?.welt.lengthMm) },
    { head: 'buttons', of: ({ spec }) => spec.buttons.count },
    { head: 'tufting', of: ({ spec }) => TUFTING_WORDS[spec.tufting.kind] },
    { head: 'covers', of: ({ covers }) => covers.join('; ') },
    { head: 'hold-down', of: ({ spec }) => spec.holdDown && HOLD_DOWN_WORDS[spec.holdDown] },
    { head: 'camera sides', of: ({ spec }) => spec.cameraSides.join(' ') },
    { head: 'template', of: ({ needsTemplate }) => needsTemplate },
    { head: 'notes', of: ({ spec }) => spec.notes },
    { head: 'not as asked', of: ({ spec }) => spec.faults.join('; ') },
  ];
}

/** Density and firmness in the units that go with the lengths. */
function foamColumns(system: LengthStyle['system']): ReturnType<typeof columnsOf> {
  const style = { system };
  const plain = (what: 'density' | 'firmness', value: number): Cell =>
    Number(foamNumber(what, value, style).toFixed(2));
  const densityUnit = foamUnit('density', style).replace('³', '3');
  return [
    { head: `foam density ${densityUnit}`, of: ({ spec }) => plain('density', spec.foam.densityKgM3) },
    {
      head: `foam 25 % IFD ${foamUnit('firmness', style)}`,
      of: ({ spec }) => plain('firmness', spec.foam.ifd25N),
    },
    {
      head: 'foam layers and wrap',
      of: ({ spec: { foam, finishedMm } }) =>
        phraseText(buildPhrase(foam, finishedMm.thicknessMm), { system, roundTo: 16 }).replace(/\s/g, ' '),
    },
  ];
}

/** How far a seat goes down under two sitters who are nobody of the cast, and where that comes from. */
function dropColumns(size: (mm: number | undefined) => Cell, unit: string): ReturnType<typeof columnsOf> {
  const style: LengthStyle = { system: unit === 'mm' ? 'millimetres' : 'decimal-inches', roundTo: 16 };
  const column = (sitter: OrderSitter, end: 'bestMm' | 'lowMm' | 'highMm', words: string) => {
    const { pounds, kilograms } = ORDER_SITTERS[sitter];
    const who = (unit === 'mm' ? kilograms : pounds).replace('\u00a0', ' ');
    return {
      head: `goes down under ${who}${words} ${unit}`,
      of: ({ spec }: ScheduleRow) => {
        const drop = orderDrop(spec);
        return size(drop && shownDropMm(drop[sitter][end], style));
      },
    };
  };
  return [
    ...(['light', 'heavy'] as const).flatMap((sitter) => [
      column(sitter, 'bestMm', ''),
      column(sitter, 'lowMm', ', least'),
      column(sitter, 'highMm', ', most'),
    ]),
    {
      head: 'goes down by',
      of: ({ spec }) => {
        const drop = orderDrop(spec);
        return drop && dropSourceWords(drop.heavy).replace('\u00a0', ' ');
      },
    },
  ];
}

/** Outlines, foam, board and every panel of each make of cushion, at full size, for a cutting machine. */
export function orderDxf({ model, units }: SpecPackData): string {
  return panelsDxf(
    model.schedule.flatMap((row) => panelsOf(row)),
    isMetric(units) ? 'millimetres' : 'inches',
  );
}

function panelsOf({ marks, spec }: ScheduleRow): TitledPanel[] {
  const { making, outline } = spec;
  const titled = (panel: CutPanel): TitledPanel => ({
    title: `${marks.join(' ')} ${panel.name}`,
    panel: { ...panel, count: panel.count * marks.length },
  });
  const slab = (name: string, finished: CutPanel['finished'], cut: CutPanel['cut']): TitledPanel =>
    titled({ name, count: 1, finished, cut, marksMm: [] });
  if (!making) return [slab('outline as asked', outline, outline)];
  return [
    slab('foam, seam line of the cushion within', outline, making.foam.outline),
    ...(making.board ? [slab('board', making.board.outline, making.board.outline)] : []),
    ...making.panels.map(titled),
  ];
}
