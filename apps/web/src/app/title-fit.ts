/** How a cell of the title block may give way. */
export interface FittedCell {
  id: string;
  /** The narrowest it can stand: all its words, or what is left of a name; pixels. */
  leastPx: number;
  /** The highest goes into the menu first; a cell without it always stands. */
  yields?: number;
}

/**
 * Cells that have no room in the title block. Names are shortened before any cell leaves, and the
 * menu that takes the others needs room of its own.
 */
export function cellsInMenu(cells: readonly FittedCell[], roomPx: number, menuPx: number): string[] {
  const leaving = cells
    .filter((cell) => cell.yields !== undefined)
    .sort((a, b) => (b.yields ?? 0) - (a.yields ?? 0));
  let needed = cells.reduce((sum, cell) => sum + cell.leastPx, 0);
  const gone: string[] = [];
  for (const cell of leaving) {
    if (needed + (gone.length > 0 ? menuPx : 0) <= roomPx) break;
    needed -= cell.leastPx;
    gone.push(cell.id);
  }
  return gone;
}
