import type { ClothWay } from './plan-place';
import { PEN, type Point, type Sheet } from './sheet';
import type { SheetBox, TakenSpace } from './taken-space';

/** Lengths of an arrow, the largest that finds room. */
const ARROWS_MM = [9, 7, 5.5] as const;
const HEAD_MM = 2;

/** An arrow along which the cloth runs and one for its pile, where the figure leaves room for them. */
export function drawClothWay(
  sheet: Sheet,
  cloth: ClothWay | null,
  figure: SheetBox,
  taken: TakenSpace,
): void {
  if (!cloth || (cloth.direction === 'either' && cloth.nap === 'none')) return;
  for (const long of ARROWS_MM) {
    const size = { width: cloth.nap === 'none' ? long + 2 : 2 * long, height: long + 2 };
    const place = placesIn(figure, size).find((box) => taken.isFree(box));
    if (!place) continue;
    taken.take(place);
    const middle: Point = [place.x + long / 2 + 1, place.y + long / 2 + 1];
    if (cloth.direction === 'up-roll') arrow(sheet, middle, [0, -1], 'single', long);
    if (cloth.direction === 'railroad') arrow(sheet, middle, [1, 0], 'double', long);
    if (cloth.nap !== 'none') arrow(sheet, [middle[0] + long, middle[1]], NAP[cloth.nap], 'pile', long);
    return;
  }
}

const NAP = { up: [0, -1], down: [0, 1], left: [-1, 0], right: [1, 0] } as const;

function placesIn(figure: SheetBox, { width, height }: { width: number; height: number }): SheetBox[] {
  const shares = [0.2, 0.5, 0.8, 0.35, 0.65, 0.05, 0.95, 0.1, 0.3, 0.4, 0.6, 0.7, 0.9];
  return shares
    .flatMap((down) =>
      shares.map((across) => ({
        x: figure.x + 7 + across * Math.max(0, figure.width - 14 - width),
        y: figure.y + 5 + down * Math.max(0, figure.height - 10 - height),
        width,
        height,
      })),
    )
    .filter(
      (box) => box.x + box.width < figure.x + figure.width && box.y + box.height < figure.y + figure.height,
    );
}

function arrow(
  sheet: Sheet,
  [x, y]: Point,
  [dx, dy]: readonly [number, number],
  kind: 'single' | 'double' | 'pile',
  long: number,
): void {
  const half = kind === 'pile' ? long / 3 : long / 2;
  const tip = (sign: 1 | -1): Point => [x + sign * dx * half, y + sign * dy * half];
  sheet.line(...tip(-1), ...tip(1), { pen: PEN.edge, ...(kind === 'pile' && { dash: [1, 0.7] }) });
  for (const sign of kind === 'double' ? ([1, -1] as const) : ([1] as const)) {
    const [hx, hy] = tip(sign);
    const back = (side: number): Point => [
      hx - sign * dx * HEAD_MM + side * dy * HEAD_MM * 0.55,
      hy - sign * dy * HEAD_MM - side * dx * HEAD_MM * 0.55,
    ];
    sheet.path([[hx, hy], back(1), back(-1)], {
      pen: PEN.hair,
      fill: kind === 'pile' ? 255 : 0,
      closed: true,
    });
  }
}
