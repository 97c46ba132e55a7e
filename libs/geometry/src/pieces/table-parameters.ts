import type { PieceOf } from '../room/document.ts';
import type { ParameterSpec } from './kind.ts';
import { LEAF_OFF_FLOOR_MM, LEAF_PARAMETERS, widestLeafMm } from './table-leaves.ts';

type Table = PieceOf<'table'>;
type BaseKind = Table['base']['kind'];

const STARTING_BASES: Record<BaseKind, Table['base']> = {
  legs: { kind: 'legs', sizeMm: 57.15, insetMm: 38.1 },
  trestles: { kind: 'trestles', insetMm: 203.2, thicknessMm: 57.15 },
  columns: { kind: 'columns', count: 1, diameterMm: 88.9, footLengthMm: 508, footHeightMm: 38.1 },
};

/** A dimension of the base, which only one kind of base has. */
function ofBase<K extends BaseKind>(
  kind: K,
  field: string & keyof Extract<Table['base'], { kind: K }>,
  limits: { min: number; max: number },
  words: { label: string; describes: string },
): ParameterSpec<'table'> {
  return {
    key: `base.${field}`,
    ...words,
    kind: 'length',
    group: 'more',
    applies: (table) => table.base.kind === kind,
    read: (table) => (table.base as unknown as Record<string, number>)[field] ?? 0,
    write: (table, value) => ({ ...table, base: { ...table.base, [field]: Number(value) } }),
    limits: () => limits,
  };
}

/** Dimensions and choices of a table, in the order of the form. */
export const TABLE_PARAMETERS: readonly ParameterSpec<'table'>[] = [
  { key: 'lengthMm', label: 'Length', kind: 'length', group: 'main', describes: 'end to end of the top' },
  {
    key: 'widthMm',
    label: 'Width',
    kind: 'length',
    group: 'main',
    describes: 'across the top, from diner to diner',
  },
  {
    key: 'heightMm',
    label: 'Table height',
    kind: 'length',
    group: 'main',
    describes: 'floor to the top of the table',
    limits: (table) => (table.leaves ? { min: widestLeafMm(table) + LEAF_OFF_FLOOR_MM } : {}),
  },
  {
    key: 'topThicknessMm',
    label: 'Top thickness',
    kind: 'length',
    group: 'more',
    describes: 'thickness of the top',
  },
  {
    key: 'edgeLipMm',
    label: 'Edge lip',
    kind: 'length',
    group: 'more',
    describes: 'edge hanging below the underside; 0 for none',
  },
  {
    key: 'apron.heightMm',
    label: 'Apron height',
    kind: 'length',
    group: 'more',
    describes: 'apron below the underside; 0 for none',
  },
  {
    key: 'apron.insetMm',
    label: 'Apron inset',
    kind: 'length',
    group: 'more',
    describes: 'edge of the top to the face of the apron',
    applies: (table) => table.apron.heightMm > 0,
  },
  {
    key: 'base.kind',
    label: 'Base',
    kind: 'choice',
    group: 'more',
    describes: 'what carries the top',
    choices: [
      { value: 'legs', label: 'four legs' },
      { value: 'trestles', label: 'two trestles' },
      { value: 'columns', label: 'columns' },
    ],
    write: (table, value) =>
      value === table.base.kind ? table : { ...table, base: STARTING_BASES[value as BaseKind] },
  },
  ofBase('legs', 'sizeMm', { min: 20, max: 200 }, { label: 'Leg size', describes: 'side of a square leg' }),
  ofBase(
    'legs',
    'insetMm',
    { min: 0, max: 500 },
    { label: 'Leg inset', describes: 'edge of the top to the face of a leg' },
  ),
  ofBase(
    'trestles',
    'insetMm',
    { min: 0, max: 1000 },
    { label: 'Trestle inset', describes: 'end of the top to the face of a trestle' },
  ),
  ofBase(
    'trestles',
    'thicknessMm',
    { min: 20, max: 200 },
    { label: 'Trestle thickness', describes: 'along the table' },
  ),
  {
    key: 'base.count',
    label: 'Columns',
    kind: 'count',
    group: 'more',
    describes: 'one in the middle, or two at the quarters',
    applies: (table) => table.base.kind === 'columns',
    read: (table) => (table.base.kind === 'columns' ? table.base.count : 1),
    write: (table, value) =>
      table.base.kind === 'columns'
        ? { ...table, base: { ...table.base, count: Number(value) === 2 ? 2 : 1 } }
        : table,
    limits: () => ({ min: 1, max: 2 }),
  },
  ofBase(
    'columns',
    'diameterMm',
    { min: 40, max: 500 },
    { label: 'Column diameter', describes: 'across the column' },
  ),
  ofBase(
    'columns',
    'footLengthMm',
    { min: 100, max: 1500 },
    { label: 'Foot length', describes: 'tip to tip of a foot, across the table' },
  ),
  ofBase(
    'columns',
    'footHeightMm',
    { min: 10, max: 200 },
    { label: 'Foot height', describes: 'floor to the top of the foot' },
  ),
  ...LEAF_PARAMETERS,
];
