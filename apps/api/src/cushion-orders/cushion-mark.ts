import type { CushionSpec } from '@settlewright/geometry';
import { Matches, type ValidationOptions } from 'class-validator';
import { Problem } from '../common/problem';

/** C1, C2 and so on. */
export const CushionMark = (options: ValidationOptions = {}): PropertyDecorator =>
  Matches(/^C[1-9]\d{0,3}$/, { message: '$property accepts marks as C1', ...options });

/** Refuses a mark that the order, as it was sent, does not have. */
export function requireMark(
  cushions: readonly CushionSpec[],
  mark: string | null | undefined,
  path: string,
): void {
  if (mark === null || mark === undefined || cushions.some((cushion) => cushion.mark === mark)) return;
  const known = cushions.map((cushion) => cushion.mark).join(', ');
  throw Problem.invalid([{ path, code: 'unknown-mark', message: `the order has ${known}; read ${mark}` }]);
}
