import { partList, type PartList } from '../parts/part-list.ts';
import type { MaterialKey, Part, PartRole } from '../parts/part.ts';
import type { PieceOf } from '../room/document.ts';
import { leavesOfTable, type LeafEdge } from './table-leaves.ts';

type Table = PieceOf<'table'>;

const EDGE_MM = 18;
const APRON_MM = 18;

/**
 * Parts of a table: top, leaves raised or hanging, edge lip where no leaf is hinged, apron and base.
 *
 * @param table - the table
 * @returns its parts, placed in the room
 */
export function tableParts(table: Table): Part[] {
  const list = partList(table);
  const underside = table.heightMm - table.topThicknessMm;
  list.box('top', 'walnut', {
    sizeMm: [table.lengthMm, table.topThicknessMm, table.widthMm],
    centreMm: [0, table.heightMm - table.topThicknessMm / 2, 0],
    grain: 'x',
  });
  leaves(list, table);
  const hinged = leavesOfTable(table).map(({ edge }) => edge);
  const lip = table.edgeLipMm > 0 ? EDGE_MM : 0;
  if (lip > 0)
    frame(
      list,
      'edge-lip',
      'walnut',
      table,
      { inset: 0, board: lip, drop: table.edgeLipMm, underside },
      hinged,
    );
  const inset = Math.max(table.apron.insetMm, lip);
  const apron = hasApron(table, inset);
  if (apron) {
    frame(list, 'apron', 'oak', table, { inset, board: APRON_MM, drop: table.apron.heightMm, underside });
  }
  base(list, table, apron ? inset + APRON_MM : lip, underside);
  return list.parts;
}

/** A raised leaf lies level with the top; a hanging one stands outside the edge it is hinged to. */
function leaves(list: PartList, table: Table): void {
  const thick = table.topThicknessMm;
  for (const { edge, widthMm, down } of leavesOfTable(table)) {
    const out = down ? thick : widthMm;
    const high = down ? widthMm : thick;
    const y = table.heightMm - high / 2;
    const sign = edge === 'left' || edge === 'back' ? -1 : 1;
    if (edge === 'left' || edge === 'right') {
      const x = sign * (table.lengthMm / 2 + out / 2);
      list.box('leaf', 'walnut', {
        sizeMm: [out, high, table.widthMm],
        centreMm: [x, y, 0],
        grain: down ? 'z' : 'x',
      });
    } else {
      const z = sign * (table.widthMm / 2 + out / 2);
      list.box('leaf', 'walnut', { sizeMm: [table.lengthMm, high, out], centreMm: [0, y, z], grain: 'x' });
    }
  }
}

function hasApron(table: Table, insetMm: number): boolean {
  const narrow = Math.min(table.lengthMm, table.widthMm);
  return table.apron.heightMm > 0 && narrow > 2 * (insetMm + APRON_MM) + 10;
}

/** Boards under the edges of the top, the long ones running through. */
function frame(
  list: PartList,
  role: PartRole,
  material: MaterialKey,
  table: Table,
  { inset, board, drop, underside }: { inset: number; board: number; drop: number; underside: number },
  without: readonly LeafEdge[] = [],
): void {
  const height = Math.min(drop, underside);
  const y = underside - height / 2;
  const long = table.lengthMm - 2 * inset;
  const short = table.widthMm - 2 * inset - 2 * board;
  for (const [sign, along, across] of [
    [-1, 'back', 'left'],
    [1, 'front', 'right'],
  ] as const) {
    if (!without.includes(along)) {
      list.box(role, material, {
        sizeMm: [long, height, board],
        centreMm: [0, y, sign * (table.widthMm / 2 - inset - board / 2)],
        grain: 'x',
      });
    }
    if (!without.includes(across)) {
      list.box(role, material, {
        sizeMm: [board, height, short],
        centreMm: [sign * (table.lengthMm / 2 - inset - board / 2), y, 0],
        grain: 'z',
      });
    }
  }
}

/**
 * Middle of a leg from the middle of the table: inset as far as asked, clear of apron and lip, and never so far
 * that it would meet the leg opposite.
 */
function legCentre(half: number, wantedInset: number, clear: number, size: number): number {
  const inset = Math.min(Math.max(wantedInset, clear), half - size - 1);
  return half - inset - size / 2;
}

/** Legs, trestles or columns; they stand inside apron and lip. */
function base(list: PartList, table: Table, clear: number, underside: number): void {
  const { base: kind } = table;
  const halfLength = table.lengthMm / 2;
  const halfWidth = table.widthMm / 2;
  const roomX = halfLength - clear - 1;
  const roomZ = halfWidth - clear - 1;
  if (kind.kind === 'legs') {
    const size = Math.min(kind.sizeMm, roomX, roomZ);
    const x = legCentre(halfLength, kind.insetMm, clear, size);
    const z = legCentre(halfWidth, kind.insetMm, clear, size);
    for (const [sx, sz] of [
      [-1, -1],
      [1, -1],
      [-1, 1],
      [1, 1],
    ] as const) {
      list.box('leg', 'oak', {
        sizeMm: [size, underside, size],
        centreMm: [sx * x, underside / 2, sz * z],
        grain: 'y',
      });
    }
    return;
  }
  if (kind.kind === 'trestles') {
    const thickness = Math.min(kind.thicknessMm, roomX);
    const x = legCentre(halfLength, kind.insetMm, clear, thickness);
    const depth = 2 * (halfWidth - Math.max(clear, table.widthMm * 0.1));
    for (const sign of [-1, 1]) {
      list.box('leg', 'oak', {
        sizeMm: [thickness, underside, depth],
        centreMm: [sign * x, underside / 2, 0],
        grain: 'y',
      });
    }
    return;
  }
  columns(list, table, kind, { roomX, roomZ, underside });
}

function columns(
  list: PartList,
  table: Table,
  kind: Extract<Table['base'], { kind: 'columns' }>,
  { roomX, roomZ, underside }: { roomX: number; roomZ: number; underside: number },
): void {
  const radius = Math.min(kind.diameterMm / 2, roomZ, kind.count === 1 ? roomX : roomX / 2);
  const footHeight = Math.min(kind.footHeightMm, underside / 2);
  const apart = Math.min(table.lengthMm / 4, roomX - radius);
  // A leaf that hangs down to the feet keeps them in.
  const low = leavesOfTable(table).some(
    ({ edge, down, widthMm }) =>
      down && (edge === 'front' || edge === 'back') && table.heightMm - widthMm < footHeight,
  );
  const footLength = low ? Math.min(kind.footLengthMm, table.widthMm) : kind.footLengthMm;
  for (const x of kind.count === 1 ? [0] : [-apart, apart]) {
    list.cylinder('column', 'walnut', {
      xMm: x,
      zMm: 0,
      radiusMm: radius,
      bottomMm: footHeight,
      topMm: underside,
    });
    list.box('foot', 'walnut', {
      sizeMm: [radius * 1.6, footHeight, footLength],
      centreMm: [x, footHeight / 2, 0],
      grain: 'z',
    });
  }
}
