import { benchLayout } from '../pieces/bench-layout.ts';
import type { SetDocument } from '../room/document.ts';
import { boardLines } from './board-lines.ts';
import { buttonsOf, rowsOverSeat } from './cushion-buttons.ts';
import { cushionRunsOf, type CushionRun } from './cushion-runs.ts';
import { CUSHION_SETTINGS, type CushionSettings } from './cushion-settings.ts';
import { fittingSize } from './cushion-sizes.ts';
import type { CushionDatum, CushionSpec, EdgeMeets } from './cushion-spec.ts';
import { cushionWarnings } from './cushion-warnings.ts';
import { madeOf } from './made-of.ts';
import { runEnds, type RunEndFound } from './run-ends.ts';

type Ends = Record<'left' | 'right', RunEndFound>;

/**
 * Every cushion of a set, with its finished size, plan, panels, foam and buttons.
 *
 * The finished size, seam to seam, is the place less a fitting gap at each edge; all else follows from it and from what was
 * chosen of the cushion.
 *
 * @param document - the set
 * @param settings - allowances of the workshop
 * @returns C1 …: seats in the order of the pieces, each piece from the left as seen from in front, then backs;
 * cushions 0 thick and those without a place left are not made
 * @source sizes: upholstery trade pages; gaps: see the source word of each setting
 */
export function deriveCushions(
  document: SetDocument,
  settings: CushionSettings = CUSHION_SETTINGS,
): CushionSpec[] {
  return cushionRunsOf(document).map((run, i) => cushionOf(run, `C${i + 1}`, document, settings));
}

function cushionOf(
  run: CushionRun,
  mark: string,
  document: SetDocument,
  settings: CushionSettings,
): CushionSpec {
  const { piece, kind } = run;
  const ends: Ends =
    piece.kind === 'bench'
      ? runEnds(piece, document)
      : { left: { meets: 'free', faceXMm: undefined }, right: { meets: 'free', faceXMm: undefined } };
  const meets = edgesOf(run, ends);
  const gap = gapsOf(meets, settings);
  const { depthMm, thicknessMm, foam } = placeOf(run);
  const placeMm = { widthMm: run.rightMm - run.leftMm, depthMm, thicknessMm };
  const finishedMm = fittingSize({ placeMm, gapsMm: gap });
  // The sitter's left is at the high end of the bench's x axis.
  const seams = { low: run.leftMm + gap.right, high: run.rightMm - gap.left };
  const datumX = datumOf(piece, ends);
  const isHigh = datumX.side === 'left';
  const seamX = isHigh ? seams.high : seams.low;
  const fromDatum = (x: number): number => (isHigh ? datumX.xMm - x : x - datumX.xMm);
  const datum: CushionDatum = {
    side: datumX.side,
    meets: datumX.meets,
    ...(datumX.wallMark === undefined ? {} : { wallMark: datumX.wallMark }),
    toSeamMm: fromDatum(seamX),
  };
  const lines = piece.kind === 'bench' ? boardLines(piece) : undefined;
  const under = (lines?.jointsMm ?? []).filter((x) => x > seams.low + 1e-6 && x < seams.high - 1e-6);
  const choice = document.cushions?.[run.key] ?? {};
  const { tufting, buttons } = buttonsOf(
    run,
    choice.tufting,
    { seams, seamX, lines, finishedMm, fromDatum },
    settings,
  );
  const standing =
    kind === 'back' && piece.kind === 'bench' && piece.seatCushion.thicknessMm > 0 && buttons.count > 0
      ? {
          rowsOverSeat: rowsOverSeat(piece, buttons.rowsMm, finishedMm.depthMm, {
            gapMm: gap.front,
            holdDown: choice.holdDown,
          }),
        }
      : {};
  const made = madeOf(kind, finishedMm, choice, tufting, settings);
  const spec = {
    mark,
    key: run.key,
    benchId: piece.id,
    benchMark: piece.mark,
    kind,
    place: { number: run.index + 1, of: run.count },
    hand: handOf(meets),
    edges: meets,
    placeMm,
    gapsMm: gap,
    ...made,
    foam,
    tufting,
    ...curveOf(run),
    buttons: { ...buttons, ...standing },
    boardLinesMm: under.map((x) => Math.abs(x - seamX)).sort((a, b) => a - b),
    datum,
    cameraSides: choice.cameraSides ?? [],
    ...(choice.holdDown && { holdDown: choice.holdDown }),
    ...(choice.wear?.length && { wear: choice.wear }),
    ...(choice.notes && { notes: choice.notes }),
  };
  const { alignedTo } = buttons;
  const wanted =
    piece.kind === 'bench' && alignedTo === 'field' ? piece.upholstery.buttons.alignTo : alignedTo;
  const onJoints = piece.kind === 'bench' && wanted === 'joints';
  return { ...spec, warnings: cushionWarnings({ ...spec, onJoints, drawn: Boolean(choice.shape?.drawn) }) };
}

function placeOf({ piece, kind }: CushionRun) {
  const cushion = kind === 'back' && piece.kind === 'bench' ? piece.backCushion : piece.seatCushion;
  const { thicknessMm, foam } = cushion;
  if (piece.kind === 'loose-seat') return { depthMm: piece.seatDepthMm, thicknessMm, foam };
  const layout = benchLayout(piece);
  const depthMm =
    kind === 'seat'
      ? piece.seatDepthMm / Math.cos(layout.tiltRad)
      : (layout.backTopMm - layout.seatTopRearMm) / Math.cos(layout.leanRad);
  return { depthMm, thicknessMm, foam };
}

function curveOf({ piece, kind }: CushionRun): Pick<CushionSpec, 'curve'> {
  if (kind !== 'back' || piece.kind !== 'bench' || !piece.lumbar) return {};
  const { apexMm, recessMm } = piece.lumbar;
  return apexMm === 0 && recessMm === 0 ? {} : { curve: { apexMm, recessMm } };
}

function edgesOf(run: CushionRun, ends: Ends): CushionSpec['edges'] {
  const endMeets = (end: RunEndFound): EdgeMeets => (end.meets === 'corner' ? 'corner-cushion' : end.meets);
  const low = run.index === 0 ? endMeets(ends.left) : 'neighbour';
  const high = run.index === run.count - 1 ? endMeets(ends.right) : 'neighbour';
  const backed = run.piece.backHeightMm > 0;
  return run.kind === 'seat'
    ? { back: backed ? 'back-pad' : 'free', front: 'front', left: high, right: low }
    : { back: 'top', front: 'seat-cushion', left: high, right: low };
}

function gapsOf(edges: CushionSpec['edges'], settings: CushionSettings): CushionSpec['gapsMm'] {
  const gap = (meets: EdgeMeets): number => {
    switch (meets) {
      case 'wall':
      case 'end-wall':
      case 'arm':
        return settings.wallGap.valueMm;
      case 'neighbour':
      case 'corner-cushion':
      case 'seat-cushion':
        return settings.neighbourGap.valueMm;
      case 'free':
        return settings.freeGap.valueMm;
      case 'back-pad':
        return settings.backGap.valueMm;
      case 'front':
      case 'top':
        return settings.frontGap.valueMm;
    }
  };
  return { back: gap(edges.back), front: gap(edges.front), left: gap(edges.left), right: gap(edges.right) };
}

const isFixed = (meets: EdgeMeets): boolean => meets === 'wall' || meets === 'end-wall' || meets === 'arm';

function handOf({ left, right }: CushionSpec['edges']): CushionSpec['hand'] {
  if (isFixed(left) === isFixed(right)) return 'either';
  return isFixed(left) ? 'left' : 'right';
}

/** The line a bench's buttons are measured from: a wall before an end wall, that before the bench's own end. */
function datumOf(
  piece: CushionRun['piece'],
  ends: Ends,
): { side: 'left' | 'right'; meets: CushionDatum['meets']; xMm: number; wallMark?: string } {
  for (const wanted of ['wall', 'end-wall', 'arm'] as const) {
    for (const end of ['left', 'right'] as const) {
      const { meets, faceXMm, wallMark } = ends[end];
      if (meets !== wanted || faceXMm === undefined) continue;
      return {
        side: end === 'left' ? 'right' : 'left',
        meets: wanted,
        xMm: faceXMm,
        ...(wallMark ? { wallMark } : {}),
      };
    }
  }
  const length = piece.kind === 'bench' ? piece.lengthMm : piece.widthMm;
  return { side: 'right', meets: 'bench-end', xMm: -length / 2 };
}
