export { hiddenWords } from '../drawing/hidden-words.ts';
export { setDrawing, type SetDrawing } from '../drawing/set-drawing.ts';
export type { DrawnArc, DrawnLine, DrawnWords, Layer } from '../drawing/drawn.ts';
export { dxfOf } from './dxf.ts';
export { panelsDxf, type TitledPanel } from './panels-dxf.ts';
export { LAYER_PENS, LAYERS } from './layers.ts';
export { svgOf } from './svg.ts';
export { TILE_OVERLAP_MM, tilesOf, type Tile } from './tiles.ts';
