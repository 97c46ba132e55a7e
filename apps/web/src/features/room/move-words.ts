import { formatLength, lengthStep, type LengthStyle, type Piece } from '@settlewright/geometry';

type Place = Piece['at'];

/** "T1 moved 3½″"; a turn alone is a turn, and nothing at all is undefined. */
export function nameMove(mark: string, from: Place, to: Place, style: LengthStyle): string | undefined {
  const byMm = Math.hypot(to.xMm - from.xMm, to.zMm - from.zMm);
  if (byMm >= lengthStep(style) / 2) return `${mark} moved ${formatLength(byMm, style)}`;
  if (Math.abs(to.turnDeg - from.turnDeg) > 1e-6) return `${mark} turned`;
  return byMm > 1e-6 ? `${mark} moved` : undefined;
}

/** "Move 3 pieces 3½″"; undefined where they stand as before. */
export function nameMoves(count: number, from: Place, to: Place, style: LengthStyle): string | undefined {
  const byMm = Math.hypot(to.xMm - from.xMm, to.zMm - from.zMm);
  if (byMm <= 1e-6) return undefined;
  const by = byMm >= lengthStep(style) / 2 ? ` ${formatLength(byMm, style)}` : '';
  return `Move ${count} pieces${by}`;
}

/** What stands near the pointer meanwhile: "x 3½″, z −2″, end of B2". */
export function readOutMove(
  from: Place,
  to: Place,
  snappedTo: string | undefined,
  style: LengthStyle,
): string {
  const along = (axis: string, mm: number) => `${axis} ${formatLength(mm, style)}`;
  return [
    along('x', to.xMm - from.xMm),
    along('z', to.zMm - from.zMm),
    ...(snappedTo === undefined ? [] : [snappedTo]),
  ].join(', ');
}
