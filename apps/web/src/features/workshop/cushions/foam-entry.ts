import type { FoamGrade } from '@settlewright/geometry';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';

/** A layer as it is typed. */
export interface LayerEntry {
  name: string;
  thicknessMm: QuantityEntry;
  densityKgM3: QuantityEntry;
  ifd25N: QuantityEntry;
}

/** A foam as it is typed. */
export interface FoamEntry extends LayerEntry {
  use: FoamGrade['use'];
  supportFactor: QuantityEntry;
  wrapMm: QuantityEntry;
  layers: LayerEntry[];
}

const layerEntry = ({ name, thicknessMm, densityKgM3, ifd25N }: FoamGrade['layers'][number]): LayerEntry => ({
  name,
  thicknessMm: entryOf(thicknessMm),
  densityKgM3: entryOf(densityKgM3),
  ifd25N: entryOf(ifd25N),
});

export const entryOfFoam = (foam: FoamGrade): FoamEntry => ({
  ...layerEntry(foam),
  use: foam.use,
  supportFactor: entryOf(foam.supportFactor),
  wrapMm: entryOf(foam.wrapMm),
  layers: foam.layers.map(layerEntry),
});

/** What cannot be read is NaN, which no field takes. */
const read = ({ value, problem }: QuantityEntry): number => (problem ? NaN : (value ?? NaN));

const layerOf = (entry: LayerEntry): FoamGrade['layers'][number] => ({
  name: entry.name.trim(),
  thicknessMm: read(entry.thicknessMm),
  densityKgM3: read(entry.densityKgM3),
  ifd25N: read(entry.ifd25N),
});

export const foamOfEntry = (entry: FoamEntry): FoamGrade => ({
  ...layerOf(entry),
  use: entry.use,
  supportFactor: read(entry.supportFactor),
  wrapMm: entry.wrapMm.value === null && !entry.wrapMm.problem ? 0 : read(entry.wrapMm),
  layers: entry.layers.map(layerOf),
});
