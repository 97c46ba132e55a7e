import { cushionRuns } from '../cushions/cushion-runs.ts';
import { boardRun } from '../parts/boards.ts';
import { partList, type PartList } from '../parts/part-list.ts';
import type { Part } from '../parts/part.ts';
import { positionsAlong } from '../parts/spacing.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { benchBaseParts } from './bench-base.ts';
import { curvedPad } from './back-curve.ts';
import { cushionHeightMm } from './foam-situation.ts';
import { benchLayout, PANEL_MM, type BenchLayout } from './bench-layout.ts';
import { addCushion } from './cushion-part.ts';

const POST_MM = 30;
const POST_PITCH_MM = 800;
const ARM_RAIL_MM = 35;

/**
 * Parts of a bench: base, deck, boards of the back, cushions and ends.
 *
 * @param bench - the bench
 * @param choices - what was chosen of the cushions of its set
 * @returns its parts, placed in the room
 */
export function benchParts(bench: PieceOf<'bench'>, choices: SetDocument['cushions'] = {}): Part[] {
  const list = partList(bench);
  const layout = benchLayout(bench);
  benchBaseParts(list, bench, layout);
  if (layout.hasBack) back(list, bench, layout);
  cushions(list, bench, layout, choices);
  end(list, bench, layout, 'left');
  end(list, bench, layout, 'right');
  return list.parts;
}

function back(list: PartList, bench: PieceOf<'bench'>, layout: BenchLayout): void {
  const { leanRad, backTopMm, rearPanelMm, backBoardMm, innerLeftMm, innerRightMm } = layout;
  const [sin, cos] = [Math.sin(leanRad), Math.cos(leanRad)];
  const tilt = Math.tan(layout.tiltRad);
  const middle = (innerLeftMm + innerRightMm) / 2;
  const inner = innerRightMm - innerLeftMm;
  const panelBottom = bench.base === 'box' ? 0 : Math.max(0, layout.deckUndersideAt(rearPanelMm));
  list.box('back-frame', 'ply', {
    sizeMm: [inner, backTopMm - panelBottom, rearPanelMm],
    centreMm: [middle, (backTopMm + panelBottom) / 2, rearPanelMm / 2],
  });

  // Distance down a line of the lean, from a point at the top, to the deck.
  const downToDeck = (topY: number, topZ: number) => (topY - layout.deckTopAt(topZ)) / (cos + sin * tilt);
  const faceTopZ = bench.backThicknessMm;
  const rearTopY = backTopMm - backBoardMm * sin;
  const rearTopZ = faceTopZ - backBoardMm * cos;
  // Below the seat a leaning back comes forward: boards and posts stop short of the seat cushion.
  const cushionRearZ =
    layout.faceZMm -
    Math.min(
      cushionHeightMm(bench.seatCushion) * Math.max(0, -Math.sin(layout.tiltRad)),
      cushionHeightMm(bench.backCushion) / cos,
    );
  const downToCushion = sin > 1e-9 ? (cushionRearZ - faceTopZ) / sin : Infinity;
  const boardLength = Math.min(
    downToDeck(backTopMm, faceTopZ),
    downToDeck(rearTopY, rearTopZ),
    downToCushion,
  );
  for (const board of boardRun(inner, bench.boards)) {
    list.box('back-board', 'oak', {
      sizeMm: [board.widthMm, boardLength, backBoardMm],
      centreMm: [
        middle + board.centreMm,
        backTopMm - (boardLength / 2) * cos - (backBoardMm / 2) * sin,
        faceTopZ + (boardLength / 2) * sin - (backBoardMm / 2) * cos,
      ],
      pitchRad: -leanRad,
      grain: 'y',
    });
  }

  const postTopZ = faceTopZ - backBoardMm / cos;
  const reach = downToDeck(backTopMm, postTopZ);
  const footZ = postTopZ + reach * sin;
  const front: [number, number][] =
    footZ <= cushionRearZ
      ? [[footZ, backTopMm - reach * cos]]
      : [
          [cushionRearZ, layout.deckTopAt(cushionRearZ)],
          [cushionRearZ, backTopMm - ((cushionRearZ - postTopZ) / sin) * cos],
        ];
  const outlineMm = [
    [rearPanelMm, layout.deckTopAt(rearPanelMm)],
    ...front,
    [postTopZ, backTopMm],
    [rearPanelMm, backTopMm],
  ] as const;
  if (postTopZ - rearPanelMm < 1) return;
  for (const x of positionsAlong(innerLeftMm + POST_MM / 2, innerRightMm - POST_MM / 2, POST_PITCH_MM)) {
    list.crossPanel('back-frame', 'ply', { xMm: x, thicknessMm: POST_MM, outlineMm });
  }
}

function cushions(
  list: PartList,
  bench: PieceOf<'bench'>,
  layout: BenchLayout,
  choices: NonNullable<SetDocument['cushions']>,
): void {
  const { tiltRad, leanRad, faceZMm } = layout;
  const seat = cushionHeightMm(bench.seatCushion);
  const pad = cushionHeightMm(bench.backCushion);
  const [sinLean, cosLean] = [Math.sin(leanRad), Math.cos(leanRad)];
  // Tilted forward, the lower rear edge of a seat cushion leans back; without a pad it is cut short there.
  const cutMm = Math.max(0, -seat * Math.sin(tiltRad) - (layout.hasBack ? pad / cosLean : 0));
  const slope = (bench.seatDepthMm - cutMm) / Math.cos(tiltRad);
  // On a thin seat the lower rear edge of the pad would dip into the deck: it starts higher up the lean.
  const padRearMm = layout.seatTopRearMm - pad * sinLean - layout.deckTopAt(faceZMm - pad * cosLean);
  const start = Math.max(0, -padRearMm / (cosLean + sinLean * Math.tan(tiltRad)));
  const rise = (layout.backTopMm - layout.seatTopRearMm) / cosLean - start;
  const middle = start + rise / 2;
  for (const { key, kind, leftMm, rightMm } of cushionRuns(bench)) {
    const width = rightMm - leftMm;
    const shape = choices[key]?.shape;
    const x = (leftMm + rightMm) / 2;
    if (kind === 'back') {
      const foot: [number, number] = [
        layout.faceZMm - start * sinLean,
        layout.seatTopRearMm + start * cosLean,
      ];
      const outlineMm = curvedPad(bench, [
        [foot[0] - pad * cosLean, foot[1] - pad * sinLean],
        foot,
        [foot[0] - rise * sinLean, foot[1] + rise * cosLean],
        [foot[0] - rise * sinLean - pad * cosLean, foot[1] + rise * cosLean - pad * sinLean],
      ]);
      if (outlineMm) {
        list.crossPanel('back-cushion', 'cloth', { xMm: x, thicknessMm: width, outlineMm });
        continue;
      }
      addCushion(list, kind, {
        sizeMm: { widthMm: width, depthMm: rise, thicknessMm: pad },
        centreMm: [
          x,
          layout.seatTopRearMm + middle * cosLean - (pad / 2) * sinLean,
          faceZMm - middle * sinLean - (pad / 2) * cosLean,
        ],
        pitchRad: -leanRad,
        shape,
      });
      continue;
    }
    addCushion(list, kind, {
      sizeMm: { widthMm: width, depthMm: slope, thicknessMm: seat },
      centreMm: [
        x,
        layout.seatTopFrontMm - (slope / 2) * Math.sin(tiltRad) - (seat / 2) * Math.cos(tiltRad),
        layout.frontZMm - (slope / 2) * Math.cos(tiltRad) + (seat / 2) * Math.sin(tiltRad),
      ],
      pitchRad: -tiltRad,
      shape,
    });
  }
}

function end(list: PartList, bench: PieceOf<'bench'>, layout: BenchLayout, side: 'left' | 'right'): void {
  const { kind, thicknessMm, heightMm } = bench.ends[side];
  if (kind === 'open') return;
  const sign = side === 'left' ? -1 : 1;
  const x = sign * (bench.lengthMm / 2 - thicknessMm / 2);
  const front = layout.deckFrontZMm;
  const top = layout.pressedTopMm + heightMm;
  const armed = kind === 'arm' && heightMm > 2 * ARM_RAIL_MM;
  const panelTop = armed ? layout.pressedTopMm : top;
  list.box('end-wall', 'oak', {
    sizeMm: [thicknessMm, panelTop, front],
    centreMm: [x, panelTop / 2, front / 2],
    grain: 'y',
  });
  if (!armed) return;
  list.box('arm', 'oak', {
    sizeMm: [thicknessMm, ARM_RAIL_MM, front],
    centreMm: [x, top - ARM_RAIL_MM / 2, front / 2],
    grain: 'z',
  });
  const post = heightMm - ARM_RAIL_MM;
  for (const z of [PANEL_MM, front - 3 * PANEL_MM]) {
    list.box('arm', 'oak', {
      sizeMm: [thicknessMm, post, 2 * PANEL_MM],
      centreMm: [x, panelTop + post / 2, z],
      grain: 'y',
    });
  }
}
