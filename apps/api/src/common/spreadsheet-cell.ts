const FORMULA_START = /^[=+\-−@\t\r]/;

export type Cell = string | number | boolean | null | undefined;

/** Text that a spreadsheet shows instead of running: a leading = + − @ gets an apostrophe before it. */
function neutralised(text: string): string {
  return FORMULA_START.test(text) ? `'${text}` : text;
}

/** Takes off the apostrophe that `neutralised` put on. */
export function withoutGuard(text: string): string {
  return text.startsWith("'") && FORMULA_START.test(text.slice(1)) ? text.slice(1) : text;
}

/** Rows as CSV with a byte-order mark, so that a spreadsheet reads the letters right. Numbers stay numbers. */
export function csvText(rows: readonly (readonly Cell[])[]): string {
  return '\ufeff' + rows.map((row) => row.map(cellText).join(',')).join('\r\n') + '\r\n';
}

function cellText(cell: Cell): string {
  if (cell === null || cell === undefined) return '';
  if (typeof cell === 'number') return Number.isFinite(cell) ? String(cell) : '';
  if (typeof cell === 'boolean') return cell ? 'yes' : 'no';
  const text = neutralised(cell);
  return /[",;\n\r]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
