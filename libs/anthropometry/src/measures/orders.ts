import type { TapeMeasureKey } from './measures.ts';

/** Of each pair the first is shorter in every body. */
const SHORTER_THAN: readonly (readonly [TapeMeasureKey, TapeMeasureKey])[] = [
  ['eye_height_sitting', 'sitting_height'],
  ['acromial_height_sitting', 'eye_height_sitting'],
  ['elbow_rest_height', 'acromial_height_sitting'],
  ['popliteal_height', 'knee_height_sitting'],
  ['buttock_popliteal_length', 'buttock_knee_length'],
];

/**
 * Tape measures that contradict each other: an eye above the crown, a knee below its own crook. A slipped digit or
 * a wrong line, never an unusual body.
 *
 * @param measured - millimetres by measure; what was not taken is absent
 * @returns the pairs, in each the one that should be shorter first
 * @source follows from what the measures are (ISO 7250-1)
 */
export function contradictions(
  measured: Readonly<Partial<Record<TapeMeasureKey, number>>>,
): { shorter: TapeMeasureKey; longer: TapeMeasureKey }[] {
  return SHORTER_THAN.flatMap(([shorter, longer]) => {
    const [less, more] = [measured[shorter], measured[longer]];
    return less !== undefined && more !== undefined && less >= more ? [{ shorter, longer }] : [];
  });
}
