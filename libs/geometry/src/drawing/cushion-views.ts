import type { CushionSpec } from '../cushions/cushion-spec.ts';
import { outlineExtent } from '../outlines/outline.ts';
import { drawingOf, type Drawing, type DrawShape, type PagePoint } from './drawing.ts';

/** Sizes of what is drawn but not measured, millimetres of the real thing. */
export const WELT_MM = 8;
const CROWN_MM = 6.35;
const BOARD_MM = 9.5;
const DECK_MM = 18;

/** A rectangle by two opposite corners. */
export const rectangle = (x0: number, y0: number, x1: number, y1: number): PagePoint[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

/** A face of a stuffed cushion: straight ends that bow a little, crowned top. */
function stuffed(length: number, thickness: number): DrawShape[] {
  const bow = CROWN_MM / 2;
  const crown = Array.from({ length: 13 }, (_, i): PagePoint => {
    const t = i / 12;
    return [t * length, -Math.sin(Math.PI * t) * CROWN_MM];
  });
  return [
    {
      kind: 'polygon',
      points: [
        [0, 0],
        [length, 0],
        [length + bow, thickness / 2],
        [length, thickness],
        [0, thickness],
        [-bow, thickness / 2],
      ],
      pen: 'edge',
      fill: 'none',
    },
    { kind: 'polyline', points: crown, pen: 'fine' },
  ];
}

/** The front edge of a cushion, level. */
export function cushionFront(spec: CushionSpec): Drawing {
  const { widthMm: w, thicknessMm: t } = spec.finishedMm;
  return drawingOf(
    [
      ...stuffed(w, t),
      {
        kind: 'text',
        at: [w / 2, t / 2],
        text: 'boxing between welt seams; the crown may add',
        anchor: 'middle',
      },
      { kind: 'dimension', from: [0, t], to: [0, 0], offsetMm: t / 2, valueMm: t, labelLane: 0 },
    ],
    t / 3,
  );
}

/** A cushion cut from back to front at a button row. */
export function cushionSection(spec: CushionSpec): Drawing {
  const { depthMm: d, thicknessMm: t } = spec.finishedMm;
  const board = spec.making?.board;
  const inset = board ? (d - outlineExtent(board.outline).depthMm) / 2 : 0;
  const boardMm = board ? BOARD_MM : 0;
  const under = spec.kind === 'seat' ? 'deck' : 'back boards';
  const leader = (y: number, text: string): DrawShape[] => [
    {
      kind: 'polyline',
      points: [
        [d - 12, y],
        [d + t / 3, y],
      ],
      pen: 'hair',
    },
    { kind: 'text', at: [d + t / 3 + 8, y], text, anchor: 'start' },
  ];
  const shapes: DrawShape[] = [
    ...stuffed(d, t),
    {
      kind: 'polygon',
      points: rectangle(WELT_MM, WELT_MM, d - WELT_MM, t - WELT_MM),
      pen: 'hair',
      fill: 'cloth',
    },
    ...(board
      ? [
          {
            kind: 'polygon' as const,
            points: rectangle(inset, t, d - inset, t + boardMm),
            pen: 'cut' as const,
            fill: 'ply' as const,
          },
        ]
      : []),
    {
      kind: 'polygon',
      points: rectangle(-20, t + boardMm, d + 20, t + boardMm + DECK_MM),
      pen: 'cut',
      fill: 'none',
    },
    ...spec.buttons.rowsMm.map((row): DrawShape => ({
      kind: 'polyline',
      points: [
        [row, 0],
        [row, t + boardMm],
      ],
      pen: 'fine',
      dashed: true,
    })),
    { kind: 'dimension', from: [0, t], to: [0, 0], offsetMm: t / 2, valueMm: t, labelLane: 0 },
    ...leader(t / 2, 'foam'),
    ...(board ? leader(t + boardMm / 2, 'board') : []),
    ...leader(t + boardMm + DECK_MM / 2, under),
  ];
  return drawingOf(shapes, t);
}
