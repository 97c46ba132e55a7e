import { outlinePerimeter } from '../outlines/outline.ts';
import type { FoamGrade } from '../cushions/foam-grades.ts';
import { foamOfCushion } from '../cushions/foam-of-cushion.ts';
import type { CushionSpec } from '../cushions/cushion-spec.ts';
import type { Foam } from '../room/document.ts';

/** Thread through a seam of a lockstitch for every length of seam, needle and bobbin together. */
export const THREAD_PER_SEAM = { ratio: 3, source: 'from memory' } as const;

/** Foam of one grade and thickness. */
export interface FoamTotal {
  foam: Foam;
  /** The grade of that name as the workshop buys it, with its layers and wrap. */
  grade?: FoamGrade;
  thicknessMm: number;
  marks: string[];
  volumeM3: number;
  massKg: number;
}

/** What an order takes besides its cloth. */
export interface OrderTotals {
  cushions: number;
  foam: FoamTotal[];
  foamVolumeM3: number;
  foamMassKg: number;
  /** Welt made, joins included; cord is as long. */
  weltMm: number;
  /** Zips by length, longest first. */
  zips: { lengthMm: number; count: number }[];
  hookAndLoopMm: number;
  /** Seams sewn, and thread for them. */
  seamsMm: number;
  threadMm: number;
  buttons: number;
}

/** Zips are bought by length: those within a millimetre are one. */
const ZIP_GRID_MM = 1;

/**
 * Totals of an order.
 *
 * @param cushions - of the order; what cannot be made as asked counts nothing but itself
 * @param grades - the workshop's own foams
 */
export function orderTotals(
  cushions: readonly CushionSpec[],
  grades: readonly FoamGrade[] = [],
): OrderTotals {
  const sum = (of: (spec: CushionSpec) => number) => cushions.reduce((total, spec) => total + of(spec), 0);
  const foam = foamTotals(cushions, grades);
  const seamsMm = sum(sewnMm);
  return {
    cushions: cushions.length,
    foam,
    foamVolumeM3: foam.reduce((total, { volumeM3 }) => total + volumeM3, 0),
    foamMassKg: foam.reduce((total, { massKg }) => total + massKg, 0),
    weltMm: sum(({ making }) => making?.welt.lengthMm ?? 0),
    zips: zipsOf(cushions),
    hookAndLoopMm: sum(({ make, making }) =>
      make.closure === 'hook-and-loop' ? (making?.closure.lengthMm ?? 0) : 0,
    ),
    seamsMm,
    threadMm: seamsMm * THREAD_PER_SEAM.ratio,
    buttons: sum(({ buttons }) => buttons.count),
  };
}

/** Every seam joins two edges of panels; a welt is sewn once more round its cord. A pulled cover is stapled. */
function sewnMm({ make, making }: CushionSpec): number {
  if (!making || make.construction === 'plywood-backed') return 0;
  const edges = making.panels.reduce(
    (total, { count, finished }) => total + count * outlinePerimeter(finished),
    0,
  );
  return edges / 2 + making.welt.lengthMm;
}

function foamTotals(cushions: readonly CushionSpec[], grades: readonly FoamGrade[]): FoamTotal[] {
  const totals = new Map<string, FoamTotal>();
  for (const spec of cushions) {
    const sawn = foamOfCushion(spec);
    if (!sawn || !spec.making) continue;
    const { thicknessMm } = spec.making.foam;
    // What was found of a foam by sitting on it is not bought.
    const { tested: _, ...bought } = spec.foam;
    const key = JSON.stringify([bought, Math.round(thicknessMm * 64)]);
    const grade = grades.find(({ name }) => name === spec.foam.grade);
    const total = totals.get(key) ?? {
      foam: spec.foam,
      ...(grade && { grade }),
      thicknessMm,
      marks: [],
      volumeM3: 0,
      massKg: 0,
    };
    totals.set(key, {
      ...total,
      marks: [...total.marks, spec.mark],
      volumeM3: total.volumeM3 + sawn.volumeM3,
      massKg: total.massKg + sawn.massKg,
    });
  }
  return [...totals.values()];
}

function zipsOf(cushions: readonly CushionSpec[]): OrderTotals['zips'] {
  const counts = new Map<number, number>();
  for (const { make, making } of cushions) {
    const lengthMm = making?.closure.lengthMm ?? 0;
    if (make.closure !== 'zip' || lengthMm === 0) continue;
    const key = Math.round(lengthMm / ZIP_GRID_MM) * ZIP_GRID_MM;
    counts.set(key, (counts.get(key) ?? 0) + 1);
  }
  return [...counts]
    .map(([lengthMm, count]) => ({ lengthMm, count }))
    .sort((a, b) => b.lengthMm - a.lengthMm);
}
