import { layCloth } from '@settlewright/geometry';
import { specPdf } from './spec-pdf';
import type { SpecPackData } from './spec-pack';

/**
 * Lays the cloths of an order on their rolls, then draws its paper. Takes a second or so for a large order: for a thread
 * of its own.
 */
export function laidSpecPdf(data: SpecPackData, tries?: number): Buffer {
  const cloths = data.model.cloths.map((cloth) => {
    const laid = layCloth(cloth, tries);
    return { cloth, ...(laid && { laid }), assumed: data.assumedCloths.includes(cloth.cover.name) };
  });
  return specPdf({ ...data, cloths });
}
