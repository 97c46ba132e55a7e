import { outlineArea } from '../outlines/outline.ts';
import type { CushionSpec } from './cushion-spec.ts';

/**
 * Foam of one cushion as it is sawn.
 *
 * @param spec - the cushion
 * @returns cubic metres and kilograms; `undefined` where it cannot be made as asked
 */
export function foamOfCushion(
  spec: Pick<CushionSpec, 'making' | 'foam'>,
): { volumeM3: number; massKg: number } | undefined {
  if (!spec.making) return undefined;
  const { outline, thicknessMm } = spec.making.foam;
  const volumeM3 = (outlineArea(outline) * thicknessMm) / 1e9;
  return { volumeM3, massKg: volumeM3 * spec.foam.densityKgM3 };
}
