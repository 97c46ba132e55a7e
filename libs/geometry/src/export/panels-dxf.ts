import { LineTypes, LWPolylineFlags, point2d, point3d } from '@tarikjabiri/dxf';
import type { CutPanel } from '../cushions/making/cut-panels.ts';
import {
  outlineBox,
  outlineExtent,
  outlineStretches,
  type OutlineCorner,
  type Point2,
} from '../outlines/outline.ts';
import { MM_PER_INCH } from '../units/length-style.ts';
import { plainText } from './plain-text.ts';
import { newDxf } from './new-dxf.ts';

/** Layers of cut panels, from the knife to the words. */
const LAYERS = { cut: 'CUT', seam: 'SEAMS', mark: 'MARKS', title: 'TITLE' } as const;
/** Between panels on the sheet, millimetres. */
const GAP_MM = 50;
const TITLE_MM = 12;
/** A mark is cut in from the edge by this. */
const MARK_MM = 6;

/** A panel or slab with the words that stand in it. */
export interface TitledPanel {
  title: string;
  panel: CutPanel;
}

/**
 * Writes panels for cutting, at full size: the line to cut, the seam within it, marks where corners are met, and words.
 *
 * @param panels - side by side in this order
 * @param units - of the file, said in its header
 * @returns an ASCII DXF; round corners are true arcs
 */
export function panelsDxf(panels: readonly TitledPanel[], units: 'millimetres' | 'inches'): string {
  const per = units === 'inches' ? MM_PER_INCH : 1;
  const dxf = newDxf(units);
  for (const name of Object.values(LAYERS)) dxf.addLayer(name, 7, LineTypes.Continuous);
  let right = 0;
  for (const { title, panel } of panels) {
    const least = outlineBox(panel.cut).x0;
    const shift = right - least;
    const at = ([x, y]: Point2) => point3d((x + shift) / per, y / per, 0);
    const closed = (corners: readonly OutlineCorner[], layerName: string) => {
      const vertices = outlineStretches(corners).map((stretch) => ({
        point: point2d((stretch.from[0] + shift) / per, stretch.from[1] / per),
        ...(stretch.kind === 'arc' && { bulge: Math.tan(stretch.sweepRad / 4) }),
      }));
      dxf.addLWPolyline(vertices, { flags: LWPolylineFlags.Closed, layerName });
    };
    closed(panel.cut, LAYERS.cut);
    closed(panel.finished, LAYERS.seam);
    const { widthMm } = outlineExtent(panel.cut);
    const foot = Math.min(...panel.cut.map(({ at }) => at[1]));
    for (const mark of panel.marksMm)
      dxf.addLine(at([mark, foot]), at([mark, foot + MARK_MM]), { layerName: LAYERS.mark });
    dxf.addText(
      at([least + 2 * TITLE_MM, TITLE_MM]),
      TITLE_MM / per,
      plainText(`${title}, ${panel.count} off`),
      {
        layerName: LAYERS.title,
      },
    );
    right += widthMm + GAP_MM;
  }
  return dxf.stringify();
}
