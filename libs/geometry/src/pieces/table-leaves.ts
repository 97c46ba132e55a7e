import type { PieceOf } from '../room/document.ts';
import type { ParameterSpec } from './kind.ts';

type Table = PieceOf<'table'>;

/** Edge of the fixed top that a leaf is hinged to; left as seen from in front. */
export type LeafEdge = 'left' | 'right' | 'front' | 'back';

/** A leaf with the edge it is hinged to. */
export interface TableLeaf {
  edge: LeafEdge;
  widthMm: number;
  down: boolean;
}

/** Limits of a table's top in its own frame. */
export interface TopLimits {
  x0: number;
  x1: number;
  z0: number;
  z1: number;
}

/** What a hanging leaf leaves free above the floor at the least, millimetres. */
export const LEAF_OFF_FLOOR_MM = 50;
const WIDEST_MM = 900;
const NARROWEST_MM = 50;
const STARTING_MM = 254;
const EDGES: readonly LeafEdge[] = ['left', 'right', 'front', 'back'];

const ARRANGED: Record<string, readonly LeafEdge[]> = {
  none: [],
  ends: ['left', 'right'],
  left: ['left'],
  right: ['right'],
  sides: ['front', 'back'],
  front: ['front'],
  back: ['back'],
};

/**
 * The leaves of a table.
 *
 * @param table - the table
 * @returns leaves with their edges: left, right, front, back
 */
export function leavesOfTable({ leaves }: Table): TableLeaf[] {
  return EDGES.flatMap((edge) => {
    const leaf = leaves?.[edge];
    return leaf === undefined ? [] : [{ edge, ...leaf }];
  });
}

/**
 * The top with its leaves as they are: a raised leaf makes it larger, a hanging one by its thickness.
 *
 * @param table - the table
 * @returns limits in the table's own frame, millimetres
 */
export function tableTop(table: Table): TopLimits {
  const [x, z] = [table.lengthMm / 2, table.widthMm / 2];
  const out = (edge: LeafEdge) => {
    const leaf = table.leaves?.[edge];
    if (leaf === undefined) return 0;
    return leaf.down ? table.topThicknessMm : leaf.widthMm;
  };
  return { x0: -x - out('left'), x1: x + out('right'), z0: -z - out('back'), z1: z + out('front') };
}

/**
 * A table with one leaf lifted or dropped.
 *
 * @param table - the table
 * @param edge - where the leaf is hinged; an edge without one changes nothing
 * @param down - true to let it hang
 * @returns the table
 */
export function withLeaf(table: Table, edge: LeafEdge, down: boolean): Table {
  const leaf = table.leaves?.[edge];
  return leaf === undefined ? table : { ...table, leaves: { ...table.leaves, [edge]: { ...leaf, down } } };
}

/**
 * Whether the leaves of a table can be built: at its ends or along its sides, not both, and clear of the floor.
 *
 * @param table - the table
 * @returns what is wrong in words; undefined when nothing is
 */
export function leafFault(table: Table): string | undefined {
  const leaves = leavesOfTable(table);
  const atEnds = leaves.some(({ edge }) => edge === 'left' || edge === 'right');
  if (atEnds && leaves.some(({ edge }) => edge === 'front' || edge === 'back')) {
    return `${table.mark} has leaves at its ends and along its sides; one or the other can be hinged`;
  }
  const widest = widestLeafMm(table);
  const most = table.heightMm - LEAF_OFF_FLOOR_MM;
  if (widest <= most) return undefined;
  return `A leaf of ${table.mark} is ${Math.round(widest)} mm wide; hanging, at most ${Math.round(most)} mm clear the floor`;
}

/**
 * @param table - the table
 * @returns the width of its widest leaf; 0 without leaves
 */
export const widestLeafMm = (table: Table): number =>
  Math.max(0, ...leavesOfTable(table).map(({ widthMm }) => widthMm));

function arranged(table: Table): string {
  const edges = leavesOfTable(table).map(({ edge }) => edge);
  return Object.entries(ARRANGED).find(([, of]) => of.join() === edges.join())?.[0] ?? 'none';
}

function withLeavesAt({ leaves, ...table }: Table, where: string): Table {
  const edges = ARRANGED[where] ?? [];
  if (edges.length === 0) return table;
  const widthMm = Math.min(STARTING_MM, table.heightMm - LEAF_OFF_FLOOR_MM);
  const like = leavesOfTable({ ...table, leaves })[0]?.widthMm ?? widthMm;
  const made = edges.map((edge) => [edge, leaves?.[edge] ?? { widthMm: like, down: false }]);
  return { ...table, leaves: Object.fromEntries(made) as Table['leaves'] };
}

/** How a leaf is called by its edge. */
export const LEAF_WORDS: Record<LeafEdge, string> = {
  left: 'left leaf',
  right: 'right leaf',
  front: 'front leaf',
  back: 'back leaf',
};

const titled = (edge: LeafEdge) => LEAF_WORDS[edge].replace(/^./, (letter) => letter.toUpperCase());

/** Dimensions and choices of a table's leaves, in the order of the form. What holds a raised leaf up is not drawn. */
export const LEAF_PARAMETERS: readonly ParameterSpec<'table'>[] = [
  {
    key: 'leaves.at',
    label: 'Leaves',
    kind: 'choice',
    group: 'more',
    describes: 'hinged to the top; what holds them up is not drawn',
    choices: [
      { value: 'none', label: 'none' },
      { value: 'ends', label: 'both ends' },
      { value: 'left', label: 'left end' },
      { value: 'right', label: 'right end' },
      { value: 'sides', label: 'both sides' },
      { value: 'front', label: 'front' },
      { value: 'back', label: 'back' },
    ],
    read: arranged,
    write: (table, value) => withLeavesAt(table, String(value)),
  },
  ...EDGES.flatMap((edge): ParameterSpec<'table'>[] => {
    const applies = (table: Table) => table.leaves?.[edge] !== undefined;
    return [
      {
        key: `leaves.${edge}.widthMm`,
        label: `${titled(edge)} width`,
        kind: 'length',
        group: 'more',
        describes: 'hinge to the outer edge of the leaf',
        applies,
        read: (table) => table.leaves?.[edge]?.widthMm ?? 0,
        write: (table, value) => {
          const leaf = { widthMm: Number(value), down: table.leaves?.[edge]?.down ?? false };
          return { ...table, leaves: { ...table.leaves, [edge]: leaf } };
        },
        limits: ({ heightMm }) => ({
          min: NARROWEST_MM,
          max: Math.min(WIDEST_MM, heightMm - LEAF_OFF_FLOOR_MM),
        }),
      },
      {
        key: `leaves.${edge}.state`,
        label: titled(edge),
        kind: 'choice',
        group: 'more',
        describes: 'as it is drawn and measured',
        choices: [
          { value: 'up', label: 'up' },
          { value: 'down', label: 'hanging' },
        ],
        applies,
        read: (table) => (table.leaves?.[edge]?.down === true ? 'down' : 'up'),
        write: (table, value) => withLeaf(table, edge, value === 'down'),
      },
    ];
  }),
];
