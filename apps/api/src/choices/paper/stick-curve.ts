import type { ValueShare } from '../crowd-shares.service';
import { paragraph } from '../../paper/paragraph';
import { leading, PEN, type Point, type Sheet } from '../../paper/sheet';
import type { ShownStick } from '../shown-stick';
import type { Across } from './stick-paper';

export const CURVE_MM = 30;
const LINES = [25, 50, 75, 100];
const LINE = leading(9);

type Shares = NonNullable<ShownStick['shares']>;

/** "Adults, 50 in 100 women". */
const crowdWords = ({ told: { name, womenPercent } }: Shares): string =>
  womenPercent === undefined ? name : `${name}, ${Math.round(womenPercent)} in 100 women`;

/** How many of a hundred fit along the tape: by what is shown, and by every check at once. `foot` is the zero line. */
export function drawCurve(sheet: Sheet, at: Across, foot: number, shares: Shares): void {
  const y = (share: number) => foot - share * CURVE_MM;
  for (const line of LINES) {
    sheet.line(at.from, y(line / 100), at.to, y(line / 100), { pen: PEN.hair, grey: 150 });
    sheet.text(`${line} in 100`, at.to + 1.6, y(line / 100) + 1.1);
  }
  sheet.line(at.from, foot, at.to, foot, { pen: PEN.edge });
  for (const run of runs(shares.joint)) {
    sheet.path(
      run.map(({ value, fits }): Point => [at.x(value), y(fits)]),
      { pen: PEN.edge, dash: [1.6, 1] },
    );
  }
  for (const run of runs(shares.points)) {
    sheet.path(
      run.map(({ value, fits }): Point => [at.x(value), y(fits)]),
      { pen: PEN.cut },
    );
  }
  const width = at.namesRight - at.left;
  let baseline = foot - CURVE_MM + 1;
  sheet.text('Share who fit', at.left, baseline, { weight: 600 });
  baseline = paragraph(sheet, crowdWords(shares), at.left, baseline + LINE, width);
  baseline = paragraph(sheet, 'thick: by what is shown below', at.left, baseline, width);
  paragraph(sheet, 'dashed: every check of a person at once', at.left, baseline, width);
}

/** Parts of a curve between shares that are not known. */
function runs(points: readonly ValueShare[]): { value: number; fits: number }[][] {
  const found: { value: number; fits: number }[][] = [];
  let open: { value: number; fits: number }[] | undefined;
  for (const { value, fits } of points) {
    if (fits === undefined) {
      open = undefined;
      continue;
    }
    if (!open) found.push((open = []));
    open.push({ value, fits });
  }
  return found;
}
