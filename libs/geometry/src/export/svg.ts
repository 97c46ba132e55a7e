import type { PagePoint } from '../drawing/drawing.ts';
import { arcOutline } from './arc-outline.ts';
import type { Layer } from '../drawing/drawn.ts';
import type { SetDrawing } from '../drawing/set-drawing.ts';
import type { MaterialKey } from '../parts/part.ts';
import { LAYERS, LAYER_PENS } from './layers.ts';

const FACE_FILLS: Record<MaterialKey, string> = {
  oak: '#e9e2d3',
  walnut: '#dcd2c3',
  cloth: '#ececec',
  wall: '#c9c9c9',
  glass: '#ffffff',
  ply: '#f1ede4',
};

const escaped = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');

/** To a thousandth of a millimetre, without trailing noughts. */
const figure = (mm: number): string => String(Number(mm.toFixed(3)));
const point = ([x, y]: PagePoint): string => `${figure(x)} ${figure(y)}`;

/** Room between the drawing and the edge of the picture, on paper. */
const MARGIN_MM = 5;
const ANCHORS = { start: 'start', middle: 'middle', end: 'end' } as const;

/**
 * Writes a drawing as a picture to scale: its user unit is a millimetre of the real thing, its printed size follows
 * from the scale. Black on white.
 *
 * @param drawing - a view of a set
 * @param title - of the picture, for readers that show one
 * @returns an SVG document
 */
export function svgOf(drawing: SetDrawing, title: string): string {
  const { scale } = drawing.view;
  const margin = MARGIN_MM * scale;
  const [x, y] = [drawing.boundsMm.x - margin, drawing.boundsMm.y - margin];
  const [width, height] = [drawing.boundsMm.width + 2 * margin, drawing.boundsMm.height + 2 * margin];
  const group = (layer: Layer): string => {
    const { widthMm, dashMm } = LAYER_PENS[layer];
    const dash = dashMm ? ` stroke-dasharray="${dashMm.map((mm) => figure(mm * scale)).join(' ')}"` : '';
    const inside = [
      ...drawing.lines
        .filter((line) => line.layer === layer)
        .map(({ from, to }) => `<path d="M${point(from)}L${point(to)}"/>`),
      ...drawing.arcs
        .filter((arc) => arc.layer === layer)
        .map((arc) => `<path d="${arcOutline(arc, point)}"/>`),
    ];
    if (inside.length === 0) return '';
    return `<g id="${layer}" stroke-width="${figure(widthMm * scale)}"${dash}>${inside.join('')}</g>`;
  };
  const faces = drawing.faces.map(
    ({ points, material }) => `<path d="M${points.map(point).join('L')}Z" fill="${FACE_FILLS[material]}"/>`,
  );
  const words = drawing.words.map(
    ({ at, text, heightMm, anchor, layer }) =>
      `<text x="${figure(at[0])}" y="${figure(at[1] + heightMm * 0.36)}" font-size="${figure(heightMm)}" text-anchor="${ANCHORS[anchor]}"${layer === 'mark' ? ' font-weight="600"' : ''}>${escaped(text)}</text>`,
  );
  const halo = figure(0.8 * scale);
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${figure(width / scale)}mm" height="${figure(height / scale)}mm" viewBox="${figure(x)} ${figure(y)} ${figure(width)} ${figure(height)}">`,
    `<title>${escaped(title)}</title>`,
    `<rect x="${figure(x)}" y="${figure(y)}" width="${figure(width)}" height="${figure(height)}" fill="#fff"/>`,
    `<g id="faces" stroke="none">${faces.join('')}</g>`,
    `<g fill="none" stroke="#000" stroke-linecap="round" stroke-linejoin="round">${LAYERS.map(group).join('')}</g>`,
    `<g id="words" fill="#000" stroke="#fff" stroke-width="${halo}" stroke-linejoin="round" paint-order="stroke" font-family="'Work Sans', 'Helvetica', 'Arial', sans-serif">${words.join('')}</g>`,
    '</svg>',
    '',
  ].join('\n');
}
