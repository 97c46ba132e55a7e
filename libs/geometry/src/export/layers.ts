import type { Layer } from '../drawing/drawn.ts';

/** The layers of a drawing in painting order: what is strongest comes last. */
export const LAYERS: readonly Layer[] = [
  'hidden',
  'above',
  'seam',
  'edge',
  'cut',
  'dimension',
  'mark',
  'title',
];

/** Line widths and dashes on paper, millimetres. */
export const LAYER_PENS: Record<Layer, { widthMm: number; dashMm?: readonly [number, number] }> = {
  hidden: { widthMm: 0.13, dashMm: [1.6, 1] },
  above: { widthMm: 0.18, dashMm: [3, 1.2] },
  seam: { widthMm: 0.1 },
  edge: { widthMm: 0.25 },
  cut: { widthMm: 0.5 },
  dimension: { widthMm: 0.13 },
  mark: { widthMm: 0.13 },
  title: { widthMm: 0.18 },
};
