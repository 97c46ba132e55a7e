import { partList } from '../parts/part-list.ts';
import type { Part } from '../parts/part.ts';
import type { Rectangle } from '../parts/rectangles.ts';
import type { PieceOf } from '../room/document.ts';
import { sentenceOf, type ParameterSpec, type PieceDefinition } from './kind.ts';

type Sill = PieceOf<'sill'>;

const FRAME_DEPTH_MM = 40;
const GLASS_MM = 6;

const hasOpening = (sill: Sill) => sill.opening.widthMm > 0 && sill.opening.heightMm > 0;

const PARAMETERS: readonly ParameterSpec<'sill'>[] = [
  { key: 'lengthMm', label: 'Length', kind: 'length', group: 'main', describes: 'end to end of the sill' },
  {
    key: 'heightMm',
    label: 'Sill height',
    kind: 'length',
    group: 'main',
    describes: 'floor to the top of the sill',
  },
  {
    key: 'depthMm',
    label: 'Sill depth',
    kind: 'length',
    group: 'main',
    describes: 'wall face to the near edge of the sill',
  },
  {
    key: 'thicknessMm',
    label: 'Thickness',
    kind: 'length',
    group: 'more',
    describes: 'thickness of the sill board',
  },
  {
    key: 'opening.widthMm',
    label: 'Window width',
    kind: 'length',
    group: 'more',
    describes: 'clear width of the glass; 0 for no window',
  },
  {
    key: 'opening.heightMm',
    label: 'Window height',
    kind: 'length',
    group: 'more',
    describes: 'clear height of the glass; 0 for no window',
  },
  {
    key: 'opening.frameMm',
    label: 'Window frame',
    kind: 'length',
    group: 'more',
    describes: 'width of the frame round the glass',
    applies: hasOpening,
  },
];

/**
 * The hole a sill's window needs in the wall behind it, frame included.
 *
 * @param sill - the sill
 * @returns x along the sill from its middle, y above the floor; undefined without a window
 */
export function windowHole(sill: Sill): Rectangle | undefined {
  if (!hasOpening(sill)) return undefined;
  const { widthMm, heightMm, frameMm } = sill.opening;
  const half = widthMm / 2 + frameMm;
  return { x0: -half, x1: half, y0: sill.heightMm, y1: sill.heightMm + heightMm + 2 * frameMm };
}

/** Window sill: parameters, parts, envelope and sentence. */
export const SILL: PieceDefinition<'sill'> = {
  kind: 'sill',
  letter: 'S',
  title: 'Sill',
  create: (common) => ({
    kind: 'sill',
    ...common,
    lengthMm: 1219.2,
    heightMm: 698.5,
    depthMm: 101.6,
    thicknessMm: 31.75,
    opening: { widthMm: 914.4, heightMm: 762, frameMm: 50.8 },
  }),
  parameters: PARAMETERS,
  parts,
  envelope(sill) {
    const hole = windowHole(sill);
    const half = Math.max(sill.lengthMm / 2, hole?.x1 ?? 0);
    return {
      minMm: [-half, 0, hole === undefined ? 0 : -FRAME_DEPTH_MM],
      maxMm: [half, Math.max(sill.heightMm, hole?.y1 ?? 0), sill.depthMm],
    };
  },
  sentence: (sill) => ({
    main: sentenceOf(
      `Sill ${sill.mark}, `,
      ['lengthMm', 'Length'],
      ' long, top ',
      ['heightMm', 'Sill height'],
      ' off the floor, ',
      ['depthMm', 'Sill depth'],
      ' deep.',
    ),
    more: sentenceOf(
      'Board ',
      ['thicknessMm', 'Thickness'],
      ' thick, ',
      ...(hasOpening(sill)
        ? ([
            'window ',
            ['opening.widthMm', 'Window width'],
            ' by ',
            ['opening.heightMm', 'Window height'],
            ' above it.',
          ] as const)
        : (['no window above it.'] as const)),
    ),
  }),
};

function parts(sill: Sill): Part[] {
  const list = partList(sill);
  list.box('sill-board', 'oak', {
    sizeMm: [sill.lengthMm, Math.min(sill.thicknessMm, sill.heightMm), sill.depthMm],
    centreMm: [0, sill.heightMm - Math.min(sill.thicknessMm, sill.heightMm) / 2, sill.depthMm / 2],
    grain: 'x',
  });
  const hole = windowHole(sill);
  if (hole === undefined) return list.parts;
  const { widthMm, heightMm, frameMm } = sill.opening;
  const z = -FRAME_DEPTH_MM / 2;
  const middle = (hole.y0 + hole.y1) / 2;
  for (const y of [hole.y0 + frameMm / 2, hole.y1 - frameMm / 2]) {
    list.box('frame', 'oak', {
      sizeMm: [widthMm + 2 * frameMm, frameMm, FRAME_DEPTH_MM],
      centreMm: [0, y, z],
      grain: 'x',
    });
  }
  for (const sign of [-1, 1]) {
    list.box('frame', 'oak', {
      sizeMm: [frameMm, heightMm, FRAME_DEPTH_MM],
      centreMm: [(sign * (widthMm + frameMm)) / 2, middle, z],
      grain: 'y',
    });
  }
  list.box('glass', 'glass', { sizeMm: [widthMm, heightMm, GLASS_MM], centreMm: [0, middle, z] });
  return list.parts;
}
