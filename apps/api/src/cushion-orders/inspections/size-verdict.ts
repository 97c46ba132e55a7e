import { type InspectedCushion, MEASURED_SIZES, type MeasuredSize } from './order-inspection.entity';

export const SIZE_VERDICTS = ['within', 'out', 'not-measured'] as const;
export type SizeVerdict = (typeof SIZE_VERDICTS)[number];

export const VERDICT_WORDS: Record<SizeVerdict, string> = {
  within: 'within',
  out: 'out',
  'not-measured': 'not measured',
};

/** Readings are taken to a tenth of a millimetre; equality belongs to the better side. */
const READ_TO_MM = 0.1;

export interface JudgedSize {
  size: MeasuredSize;
  askedMm: number;
  measuredMm: number | null;
  verdict: SizeVerdict;
}

/** Each size of a cushion against what was asked, give or take the tolerance. */
export function judgeSizes({ asked, measured }: InspectedCushion, toleranceMm: number): JudgedSize[] {
  return MEASURED_SIZES.map((size) => {
    const askedMm = asked[size];
    const measuredMm = measured[size];
    const verdict =
      measuredMm === null
        ? 'not-measured'
        : Math.abs(measuredMm - askedMm) <= toleranceMm + READ_TO_MM
          ? 'within'
          : 'out';
    return { size, askedMm, measuredMm, verdict };
  });
}

/** Out when one size is; within only when every size was measured and is. */
export function judgeCushion(sizes: readonly JudgedSize[]): SizeVerdict {
  if (sizes.some(({ verdict }) => verdict === 'out')) return 'out';
  return sizes.every(({ verdict }) => verdict === 'within') ? 'within' : 'not-measured';
}
