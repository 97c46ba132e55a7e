import type { PieceOf } from '../room/document.ts';
import { benchLayout, PANEL_MM } from './bench-layout.ts';
import { BENCH_PARAMETERS } from './bench-parameters.ts';
import { benchParts } from './bench-parts.ts';
import { sentenceOf, type Envelope, type PieceDefinition, type SpecSentence } from './kind.ts';
import { referenceSinkMm, withPressedSeatHeight } from './seat-sink.ts';
import { BACK_PAD, BOARDS, FIRM_SEAT } from './starting-sizes.ts';

/** Bench: parameters, parts, envelope and sentence. */
export const BENCH: PieceDefinition<'bench'> = {
  kind: 'bench',
  letter: 'B',
  title: 'Bench',
  create(common) {
    const bench: PieceOf<'bench'> = {
      kind: 'bench',
      ...common,
      lengthMm: 1219.2,
      deckHeightMm: 381,
      seatDepthMm: 444.5,
      seatTiltDeg: 2,
      backHeightMm: 609.6,
      backLeanDeg: 8,
      backThicknessMm: 63.5,
      seatCushion: FIRM_SEAT,
      backCushion: BACK_PAD,
      base: 'box',
      kick: { depthMm: 63.5, heightMm: 101.6 },
      lipMm: 25.4,
      ends: {
        left: { kind: 'open', thicknessMm: 12.7, heightMm: 0 },
        right: { kind: 'open', thicknessMm: 12.7, heightMm: 0 },
      },
      boards: BOARDS,
      places: { by: 'count', count: 2 },
      upholstery: {
        longestCushionMm: 1219.2,
        buttons: { rows: 2, everyBoards: 3, alignTo: 'joints', on: 'back' },
      },
    };
    return withPressedSeatHeight(bench, 457.2);
  },
  parameters: BENCH_PARAMETERS,
  parts: (bench, document) => benchParts(bench, document?.cushions),
  envelope,
  sentence,
};

function envelope(bench: PieceOf<'bench'>): Envelope {
  const layout = benchLayout(bench);
  const armTops = [bench.ends.left, bench.ends.right].map((end) =>
    end.kind === 'open' ? 0 : layout.pressedTopMm + end.heightMm,
  );
  const top = Math.max(
    layout.hasBack ? layout.backTopMm : 0,
    layout.seatTopFrontMm,
    layout.seatTopRearMm,
    ...armTops,
  );
  // A tilted deck swings the foot of its moulding forward.
  const swing = Math.max(0, Math.sin(layout.tiltRad)) * 3 * PANEL_MM;
  const front = Math.max(layout.frontZMm, layout.deckFrontZMm + swing);
  return { minMm: [-bench.lengthMm / 2, 0, 0], maxMm: [bench.lengthMm / 2, top, front] };
}

type Runs = Parameters<typeof sentenceOf>;

/** What a curved back says of itself, as far as either size is asked. */
function curveRuns(bench: PieceOf<'bench'>): Runs {
  const { apexMm, recessMm } = bench.lumbar ?? { apexMm: 0, recessMm: 0 };
  if (bench.backHeightMm === 0 || (apexMm === 0 && recessMm === 0)) return [];
  const apex: Runs =
    apexMm > 0 ? ['fullest ', ['lumbar.apexMm', 'Back curve'], ' over the pressed seat'] : [];
  const recess: Runs =
    recessMm > 0
      ? ['giving way ', ['lumbar.recessMm', 'Pelvis room'], ` for the pelvis${apexMm > 0 ? ' below it' : ''}`]
      : [];
  return ['back ', ...apex, ...(apexMm > 0 && recessMm > 0 ? [' and '] : []), ...recess, ', '];
}

function sentence(bench: PieceOf<'bench'>): SpecSentence {
  const back =
    bench.backHeightMm > 0
      ? ([
          ' deep, back ',
          ['backHeightMm', 'Back height'],
          ' high leaning ',
          ['backLeanDeg', 'Back lean'],
          '.',
        ] as const)
      : ([' deep, without a back.'] as const);
  const places =
    bench.places.by === 'count'
      ? ([['places.count', 'Places'], bench.places.count === 1 ? ' place' : ' places'] as const)
      : (['places of ', ['places.widthMm', 'Width of a place'], ' each'] as const);
  const cushion =
    bench.seatCushion.thicknessMm > 0
      ? ([
          ['seatCushion.thicknessMm', 'Seat cushion'],
          ' cushion that ',
          {
            kind: 'derived',
            key: 'seatSink',
            text: 'sinks under the reference sitter',
            valueMm: referenceSinkMm(bench),
          },
          ', ',
        ] as const)
      : (['No cushion on the seat, '] as const);
  return {
    main: sentenceOf(
      `Bench ${bench.mark}, `,
      ['lengthMm', 'Length'],
      ' long, seat ',
      ['pressedSeatHeight', 'Seat height'],
      ' off the floor with the cushion pressed, ',
      ['seatDepthMm', 'Seat depth'],
      ...back,
    ),
    more: sentenceOf(
      ...cushion,
      'seat tilted ',
      ['seatTiltDeg', 'Seat tilt'],
      ' front up, ',
      ...curveRuns(bench),
      ...places,
      ...(bench.base === 'box'
        ? ([', heels go ', ['kick.depthMm', 'Kick depth'], ' back under the riser.'] as const)
        : (['; open below.'] as const)),
    ),
  };
}
