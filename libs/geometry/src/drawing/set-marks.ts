import { wordsWidth, type DrawnBeside, type PieceParts, type SheetOf } from './drawn.ts';
import type { PagePoint } from './drawing.ts';
import type { Box } from './page-box.ts';
import { extentOf } from './piece-extents.ts';
import { pageFrame } from './set-view.ts';

const overlap = (a: Box, b: Box): boolean =>
  a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;

/** Where a mark may stand about the middle of its piece, in steps of its own size. */
const MOVES: readonly PagePoint[] = [
  [0, 0],
  [0, 1.4],
  [0, -1.4],
  [1.2, 0],
  [-1.2, 0],
  [1.2, 1.4],
  [-1.2, 1.4],
  [1.2, -1.4],
  [-1.2, -1.4],
  [0, 2.8],
  [0, -2.8],
];

function onPlan(pieces: readonly PieceParts[], { view, letterMm }: SheetOf): DrawnBeside {
  const frame = pageFrame(view.direction);
  const taken: Box[] = [];
  const drawn: DrawnBeside = { lines: [], words: [] };
  for (const { piece, parts } of pieces) {
    const extent = extentOf(parts, frame);
    const middle: PagePoint = [extent.x + extent.width / 2, extent.y + extent.height / 2];
    const [width, height] = [wordsWidth(piece.mark, letterMm) + letterMm * 0.3, letterMm * 1.1];
    const boxAt = ([x, y]: PagePoint): Box => ({ x: x - width / 2, y: y - height / 2, width, height });
    const places = MOVES.map(([dx, dy]): PagePoint => [middle[0] + dx * width, middle[1] + dy * height]);
    const found = places.find((place) => !taken.some((other) => overlap(boxAt(place), other))) ?? middle;
    taken.push(boxAt(found));
    if (found !== places[0]) {
      drawn.lines.push({ from: middle, to: found, layer: 'mark', pieceId: piece.id });
    }
    drawn.words.push({ at: found, text: piece.mark, heightMm: letterMm, anchor: 'middle', layer: 'mark' });
  }
  return drawn;
}

/** Marks in one row under the floor, each under the middle of its piece or moved to the next free place. */
function underFloor(pieces: readonly PieceParts[], { view, letterMm }: SheetOf): DrawnBeside {
  const frame = pageFrame(view.direction);
  const drawn: DrawnBeside = { lines: [], words: [] };
  const inOrder = pieces
    .filter(({ piece }) => piece.kind !== 'bulkhead')
    .map(({ piece, parts }) => {
      const { x, width } = extentOf(parts, frame);
      return { piece, middle: x + width / 2 };
    })
    .sort((a, b) => a.middle - b.middle);
  let free = -Infinity;
  for (const { piece, middle } of inOrder) {
    const width = wordsWidth(piece.mark, letterMm);
    const x = Math.max(middle, free + width / 2);
    free = x + width / 2 + letterMm * 0.5;
    drawn.lines.push({ from: [middle, 0], to: [x, letterMm * 0.9], layer: 'mark', pieceId: piece.id });
    drawn.words.push({
      at: [x, letterMm * 1.6],
      text: piece.mark,
      heightMm: letterMm,
      anchor: 'middle',
      layer: 'mark',
    });
  }
  return drawn;
}

/**
 * The marks of the pieces that a view shows.
 *
 * @param pieces - with the parts that the view shows
 * @param sheet - what they are laid out by
 * @returns in a plan on the pieces, else in a row under the floor
 */
export function pieceMarks(pieces: readonly PieceParts[], sheet: SheetOf): DrawnBeside {
  return sheet.view.direction === 'above' ? onPlan(pieces, sheet) : underFloor(pieces, sheet);
}
