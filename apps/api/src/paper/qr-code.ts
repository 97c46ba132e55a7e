import { create } from 'qrcode';
import type { Sheet } from './sheet';

/** White all round, in modules, that a reader asks for. */
const QUIET_MODULES = 4;

/** Modules of a code, row by row, 1 where it is dark. */
export interface QrCode {
  size: number;
  data: Uint8Array;
}

/** The code of an address; takes a few milliseconds, so make it once for all its copies. */
export function qrCode(address: string): QrCode {
  return create(address, { errorCorrectionLevel: 'M' }).modules;
}

/** Draws a code with its quiet border; each row of dark modules is one bar. */
export function drawQrCode(
  sheet: Sheet,
  { size, data }: QrCode,
  at: { x: number; y: number; sizeMm: number },
): void {
  const module = at.sizeMm / (size + 2 * QUIET_MODULES);
  for (let row = 0; row < size; row += 1) {
    let start = -1;
    for (let column = 0; column <= size; column += 1) {
      const dark = column < size && data[row * size + column] === 1;
      if (dark && start < 0) start = column;
      if (dark || start < 0) continue;
      const x = at.x + (QUIET_MODULES + start) * module;
      const y = at.y + (QUIET_MODULES + row) * module;
      // A hair wider and higher than its modules, so that no white line shows between neighbours.
      sheet.rect(x, y, (column - start) * module + 0.02, module + 0.02, { fill: 0, bare: true });
      start = -1;
    }
  }
}
