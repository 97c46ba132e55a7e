import type { CushionSpec } from '../cushions/cushion-spec.ts';
import { FRONT_EDGE_WORDS, type Construction } from '../cushions/making/cushion-make.ts';
import { outlineExtent } from '../outlines/outline.ts';
import { drawingOf, type Drawing, type DrawShape, type PagePoint } from './drawing.ts';

/** Sizes of what is drawn but not measured, millimetres of the real thing. */
export const WELT_MM = 8;
const CROWN_MM = 6.35;
const DECK_MM = 18;

/** A rectangle by two opposite corners. */
export const rectangle = (x0: number, y0: number, x1: number, y1: number): PagePoint[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

const arc = ([cx, cy]: PagePoint, radius: number, from: number, to: number): PagePoint[] =>
  Array.from({ length: 9 }, (_, i): PagePoint => {
    const angle = from + ((to - from) * i) / 8;
    return [cx + radius * Math.cos(angle), cy + radius * Math.sin(angle)];
  });

/** Two faces that meet in one seam at half the height. */
function lens(length: number, thickness: number): PagePoint[] {
  const reach = Math.min(length / 4, 1.5 * thickness);
  const rise = Array.from({ length: 9 }, (_, i): PagePoint => {
    const t = i / 8;
    return [t * reach, (thickness / 2) * (1 - Math.sin((Math.PI / 2) * t))];
  });
  const top = [...rise, ...rise.map(([x, y]): PagePoint => [length - x, y]).reverse()];
  return [...top, ...top.map(([x, y]): PagePoint => [x, thickness - y]).reverse()];
}

/** Straight ends that bow a little. */
function box(length: number, thickness: number): PagePoint[] {
  const bow = CROWN_MM / 2;
  return [
    [0, 0],
    [length, 0],
    [length + bow, thickness / 2],
    [length, thickness],
    [0, thickness],
    [-bow, thickness / 2],
  ];
}

/** The same with its front, at the right, rounded. */
function roundFront(length: number, thickness: number, radius: number): PagePoint[] {
  const x = length - radius;
  return [
    [0, 0],
    ...arc([x, radius], radius, -Math.PI / 2, 0),
    ...arc([x, thickness - radius], radius, 0, Math.PI / 2),
    [0, thickness],
    [-CROWN_MM / 2, thickness / 2],
  ];
}

/** A cushion cut from back to front by its make, front at the right. */
function cutOutline(construction: Construction, length: number, thickness: number): PagePoint[] {
  switch (construction) {
    case 'knife-edge':
      return lens(length, thickness);
    case 'bullnose':
      return roundFront(length, thickness, thickness / 2);
    case 'waterfall':
      return roundFront(length, thickness, thickness / 4);
    case 'boxed':
    case 'tight-boxed':
    case 'plywood-backed':
      return box(length, thickness);
  }
}

/** A stuffed cushion: its outline and, but for a lens, the crown over it. */
function stuffed(outline: PagePoint[], length: number, construction: Construction): DrawShape[] {
  const crown = Array.from({ length: 13 }, (_, i): PagePoint => {
    const t = i / 12;
    return [t * length, -Math.sin(Math.PI * t) * CROWN_MM];
  });
  return [
    { kind: 'polygon', points: outline, pen: 'edge', fill: 'none' },
    ...(construction === 'knife-edge'
      ? []
      : [{ kind: 'polyline' as const, points: crown, pen: 'fine' as const }]),
  ];
}

/** The foam within its cover. */
function foamWithin(outline: readonly PagePoint[], length: number, thickness: number): PagePoint[] {
  const toward = (value: number, whole: number) =>
    whole / 2 + (value - whole / 2) * (1 - (2 * WELT_MM) / whole);
  return outline.map(([x, y]): PagePoint => [toward(x, length), toward(y, thickness)]);
}

/** The front edge of a cushion, level. */
export function cushionFront(spec: CushionSpec): Drawing {
  const { widthMm: w, thicknessMm: t } = spec.finishedMm;
  const { construction } = spec.make;
  const outline = construction === 'knife-edge' ? lens(w, t) : box(w, t);
  return drawingOf(
    [
      ...stuffed(outline, w, construction),
      { kind: 'text', at: [w / 2, t / 2], text: FRONT_EDGE_WORDS[construction], anchor: 'middle' },
      { kind: 'dimension', from: [0, t], to: [0, 0], offsetMm: t / 2, valueMm: t, labelLane: 0 },
    ],
    t / 3,
  );
}

/** A cushion cut from back to front at a button row. */
export function cushionSection(spec: CushionSpec): Drawing {
  const { depthMm: d, thicknessMm: t } = spec.finishedMm;
  const { construction } = spec.make;
  const outline = cutOutline(construction, d, t);
  const board = spec.making?.board;
  const inset = board ? (d - outlineExtent(board.outline).depthMm) / 2 : 0;
  const boardMm = board?.thicknessMm ?? 0;
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
    ...stuffed(outline, d, construction),
    { kind: 'polygon', points: foamWithin(outline, d, t), pen: 'hair', fill: 'cloth' },
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
