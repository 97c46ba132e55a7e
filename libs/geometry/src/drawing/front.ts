import type { Part, PartRole, Vec3 } from '../parts/part.ts';
import { deriveParts } from '../pieces/kinds.ts';
import type { SetDocument } from '../room/document.ts';
import { drawingOf, type Drawing, type DrawShape, type PagePoint, type Pen } from './drawing.ts';
import { convexOutline, partEdges } from './solid-outline.ts';

const PEN_OF_ROLE: Partial<Record<PartRole, Pen>> = {
  'wall-board': 'hair',
  'wall-panel': 'hair',
  'back-board': 'hair',
  glass: 'hair',
};

const onWall = ([x, y]: Vec3): PagePoint => [x, -y];

/** What a part fills on the page; of a shaped cushion that looks at the eye its panel, notches left open. */
function outlineOf({ solid }: Part, corners: readonly Vec3[]): PagePoint[] {
  const half = corners.length / 2;
  const [rear, face] = [corners[0]!, corners[half]!];
  const looksHere = solid.shape === 'prism' && solid.isPanel && face[2] - rear[2] > solid.depthMm / 2;
  return looksHere ? corners.slice(half).map(onWall) : convexOutline(corners.map(onWall));
}

/**
 * The set seen square from the front, as the viewer's side of the room sees it.
 *
 * @param document - the set
 * @param marginMm - room left around
 * @returns page x is the room's x, page y is minus the height, so the floor is at 0; what is further
 * away is painted first
 */
export function frontOf(document: SetDocument, marginMm = 0): Drawing {
  const seen = deriveParts(document).map((part) => {
    const { corners } = partEdges(part);
    const nearest = corners.reduce((z, corner) => Math.max(z, corner[2]), -Infinity);
    return { part, nearest, outline: outlineOf(part, corners) };
  });
  const shapes = seen
    .sort((a, b) => a.nearest - b.nearest)
    .map(({ part, outline }): DrawShape => ({
      kind: 'polygon',
      points: outline,
      pen: PEN_OF_ROLE[part.role] ?? 'fine',
      fill: part.material,
      pieceId: part.pieceId,
    }));
  const bounds = drawingOf(shapes, 0).boundsMm;
  const floor: DrawShape = {
    kind: 'polyline',
    points: [
      [bounds.x - 150, 0],
      [bounds.x + bounds.width + 150, 0],
    ],
    pen: 'edge',
  };
  return drawingOf([...shapes, floor], marginMm);
}
