import { boardRun } from '../parts/boards.ts';
import { partList } from '../parts/part-list.ts';
import type { Part } from '../parts/part.ts';
import { cutOut, type Rectangle } from '../parts/rectangles.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { sentenceOf, type PieceDefinition } from './kind.ts';
import { BOARDS } from './starting-sizes.ts';
import { holeInWall } from './wall-window.ts';

type Bulkhead = PieceOf<'bulkhead'>;

const BOARD_MM = 18;
/** Slivers of board beside an opening that nobody would cut. */
const SMALLEST_OFFCUT_MM = 3;

/** Wall of boards: parameters, parts, envelope and sentence. */
export const BULKHEAD: PieceDefinition<'bulkhead'> = {
  kind: 'bulkhead',
  letter: 'W',
  title: 'Bulkhead',
  create: (common) => ({
    kind: 'bulkhead',
    ...common,
    lengthMm: 2473.325,
    heightMm: 2286,
    thicknessMm: 88.9,
    boards: BOARDS,
    boardDirection: 'vertical',
  }),
  parameters: [
    { key: 'lengthMm', label: 'Length', kind: 'length', group: 'main', describes: 'end to end of the wall' },
    {
      key: 'heightMm',
      label: 'Height',
      kind: 'length',
      group: 'main',
      describes: 'floor to the top of the wall',
    },
    {
      key: 'thicknessMm',
      label: 'Thickness',
      kind: 'length',
      group: 'more',
      describes: 'face of the boards to the rear of the wall',
    },
    {
      key: 'boards.faceMm',
      label: 'Board face',
      kind: 'length',
      group: 'more',
      describes: 'visible width of one board',
    },
    {
      key: 'boards.revealMm',
      label: 'Reveal',
      kind: 'length',
      group: 'more',
      describes: 'gap or groove between two boards',
    },
    {
      key: 'boardDirection',
      label: 'Boards run',
      kind: 'choice',
      group: 'more',
      describes: 'direction of the boards',
      choices: [
        { value: 'vertical', label: 'upright' },
        { value: 'horizontal', label: 'level' },
      ],
    },
  ],
  parts,
  envelope: (wall) => ({
    minMm: [-wall.lengthMm / 2, 0, -wall.thicknessMm],
    maxMm: [wall.lengthMm / 2, wall.heightMm, 0],
  }),
  sentence: (wall) => ({
    main: sentenceOf(
      `Bulkhead ${wall.mark}, `,
      ['lengthMm', 'Length'],
      ' long, ',
      ['heightMm', 'Height'],
      ' high.',
    ),
    more: sentenceOf(
      wall.boardDirection === 'vertical' ? 'Upright boards ' : 'Level boards ',
      ['boards.faceMm', 'Board face'],
      ' wide with ',
      ['boards.revealMm', 'Reveal'],
      ' between them, ',
      ['thicknessMm', 'Thickness'],
      ' thick in all.',
    ),
  }),
};

function parts(wall: Bulkhead, document?: SetDocument): Part[] {
  const list = partList(wall);
  const holes = document === undefined ? [] : holesIn(wall, document);
  const board = Math.min(BOARD_MM, wall.thicknessMm * 0.5);
  const upright = wall.boardDirection === 'vertical';
  const run = boardRun(upright ? wall.lengthMm : wall.heightMm, wall.boards);
  for (const { centreMm, widthMm } of run) {
    const [low, high] = [centreMm - widthMm / 2, centreMm + widthMm / 2];
    const whole: Rectangle = upright
      ? { x0: low, x1: high, y0: 0, y1: wall.heightMm }
      : {
          x0: -wall.lengthMm / 2,
          x1: wall.lengthMm / 2,
          y0: low + wall.heightMm / 2,
          y1: high + wall.heightMm / 2,
        };
    for (const left of cutOut(whole, holes, SMALLEST_OFFCUT_MM)) {
      list.box('wall-board', 'wall', { ...slab(left, -board, 0), grain: upright ? 'y' : 'x' });
    }
  }
  const whole = { x0: -wall.lengthMm / 2, x1: wall.lengthMm / 2, y0: 0, y1: wall.heightMm };
  for (const left of cutOut(whole, holes, SMALLEST_OFFCUT_MM)) {
    list.box('wall-panel', 'ply', slab(left, -wall.thicknessMm, -board));
  }
  return list.parts;
}

function slab(area: Rectangle, z0: number, z1: number) {
  return {
    sizeMm: [area.x1 - area.x0, area.y1 - area.y0, z1 - z0],
    centreMm: [(area.x0 + area.x1) / 2, (area.y0 + area.y1) / 2, (z0 + z1) / 2],
  } as const;
}

/** Openings of the windows whose sills stand against this wall, in the wall's frame. */
function holesIn(wall: Bulkhead, document: SetDocument): Rectangle[] {
  return document.pieces.flatMap((piece) => (piece.kind === 'sill' ? (holeInWall(wall, piece) ?? []) : []));
}
