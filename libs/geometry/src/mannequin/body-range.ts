import { range90, type Body, type MeasureKey } from '@settlewright/anthropometry';
import { FIGURE_KEYS, type FigureMeans } from './figure.ts';
import { mannequinMesh, type MannequinMesh } from './mesh.ts';
import { poseMannequin } from './pose.ts';

/** How small and how large the uncertain measures of one person may be. */
export interface BodyRange {
  /** Every uncertain measure at the 5th of 100 such people, by itself; known ones as they are. */
  smaller: FigureMeans;
  /** The same at the 95th. */
  larger: FigureMeans;
  /** Measures that are not known, in the order of the figure. */
  uncertain: MeasureKey[];
}

/**
 * The band within which each measure of a body lies for 90 of 100 such people.
 *
 * The two ends are outlines to show what is not known, not people: nobody is at the 95th in everything.
 *
 * @param body - belief about a person, from the body model
 * @returns measures in millimetres, weight in kilograms
 */
export function bodyRange(body: Body): BodyRange {
  const smaller: FigureMeans = {};
  const larger: FigureMeans = {};
  const uncertain: MeasureKey[] = [];
  for (const key of FIGURE_KEYS) {
    if (body.isMeasured(key)) {
      smaller[key] = larger[key] = body.mean(key);
      continue;
    }
    const { low, high } = range90(body.estimate(key));
    smaller[key] = low;
    larger[key] = high;
    if (high - low > 0) uncertain.push(key);
  }
  return { smaller, larger, uncertain };
}

type Posed = Omit<Parameters<typeof poseMannequin>[0], 'means'>;

/**
 * The smaller and the larger body at a place, for a ghosted outline around the drawn one.
 *
 * @param range - from `bodyRange`
 * @param at - what `poseMannequin` needs beside the measures
 * @returns far meshes in the room frame, millimetres, cheap to draw and not to be measured on; `undefined` when
 * every measure is known
 */
export function ghostMeshes(
  range: BodyRange,
  at: Posed,
): { smaller: MannequinMesh; larger: MannequinMesh } | undefined {
  if (range.uncertain.length === 0) return undefined;
  const mesh = (means: FigureMeans): MannequinMesh => mannequinMesh(poseMannequin({ ...at, means }), 'far');
  return { smaller: mesh(range.smaller), larger: mesh(range.larger) };
}
