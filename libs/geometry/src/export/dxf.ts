import { Colors, LineTypes, point3d, TextHorizontalAlignment, TextVerticalAlignment } from '@tarikjabiri/dxf';
import type { Layer } from '../drawing/drawn.ts';
import type { PagePoint } from '../drawing/drawing.ts';
import type { SetDrawing } from '../drawing/set-drawing.ts';
import { degrees } from '../units/angle.ts';
import { MM_PER_INCH } from '../units/length-style.ts';
import { isCircle } from './arc-outline.ts';
import { LAYERS } from './layers.ts';
import { plainText } from './plain-text.ts';
import { newDxf } from './new-dxf.ts';

/** Names and pen colours of the layers; colour 7 is black on paper and white on a dark screen. */
const LAYER_LOOKS: Record<Layer, { name: string; colour: number }> = {
  cut: { name: 'CUT', colour: Colors.White },
  edge: { name: 'EDGES', colour: Colors.White },
  seam: { name: 'SEAMS', colour: 8 },
  hidden: { name: 'HIDDEN', colour: 8 },
  above: { name: 'ABOVE', colour: 8 },
  dimension: { name: 'DIMENSIONS', colour: Colors.Blue },
  mark: { name: 'MARKS', colour: Colors.Red },
  title: { name: 'TITLE', colour: Colors.White },
};

const DASHED = 'DASHED';
const ANCHORS = {
  start: TextHorizontalAlignment.Left,
  middle: TextHorizontalAlignment.Center,
  end: TextHorizontalAlignment.Right,
} as const;

/**
 * Writes a drawing for drawing programs, at full size: lines, arcs, circles and plain words on a layer for each role.
 *
 * @param drawing - a view of a set
 * @param units - of the file, said in its header
 * @returns an ASCII DXF (AC1021); y runs up, the floor of an elevation is at 0
 */
export function dxfOf(drawing: SetDrawing, units: 'millimetres' | 'inches'): string {
  const per = units === 'inches' ? MM_PER_INCH : 1;
  const size = (mm: number): number => mm / per;
  const at = ([x, y]: PagePoint) => point3d(size(x), size(-y), 0);
  const dxf = newDxf(units);
  const { scale } = drawing.view;
  dxf.addLType(DASHED, '_ _ _', [size(1.6 * scale), -size(scale)]);
  for (const layer of LAYERS) {
    const { name, colour } = LAYER_LOOKS[layer];
    dxf.addLayer(name, colour, layer === 'hidden' || layer === 'above' ? DASHED : LineTypes.Continuous);
  }
  const on = (layer: Layer) => ({ layerName: LAYER_LOOKS[layer].name });
  for (const { from, to, layer } of drawing.lines) dxf.addLine(at(from), at(to), on(layer));
  for (const arc of drawing.arcs) {
    const centre = at(arc.centre);
    if (isCircle(arc)) dxf.addCircle(centre, size(arc.radiusMm), on(arc.layer));
    else {
      // The page turns the other way round: y runs down on it.
      const [from, to] = [arc.toRad, arc.fromRad].map((angle) => ((degrees(-angle) % 360) + 360) % 360);
      dxf.addArc(centre, size(arc.radiusMm), from!, to!, on(arc.layer));
    }
  }
  for (const { at: place, text, heightMm, anchor, layer } of drawing.words) {
    const where = at(place);
    dxf.addText(where, size(heightMm * 0.75), plainText(text), {
      ...on(layer),
      horizontalAlignment: ANCHORS[anchor],
      verticalAlignment: TextVerticalAlignment.Middle,
      secondAlignmentPoint: where,
    });
  }
  return dxf.stringify();
}
