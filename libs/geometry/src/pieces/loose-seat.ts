import { cushionKey } from '../cushions/cushion-key.ts';
import { partList } from '../parts/part-list.ts';
import type { Part } from '../parts/part.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import { addCushion } from './cushion-part.ts';
import { sentenceOf, type ParameterSpec, type PieceDefinition } from './kind.ts';
import { cushionHeightMm } from './foam-situation.ts';
import {
  pressedRiseMm,
  pressedSeatHeightMm,
  unpressedSeatTopMm,
  withPressedSeatHeight,
} from './seat-sink.ts';
import { FIRM_SEAT } from './starting-sizes.ts';

type LooseSeat = PieceOf<'loose-seat'>;

const SEAT_BOARD_MM = 20;
const LEG_MM = 35;
const BACK_BOARD_MM = 20;
const ARM_MM = 30;

const PARAMETERS: readonly ParameterSpec<'loose-seat'>[] = [
  {
    key: 'pressedSeatHeight',
    label: 'Seat height',
    kind: 'length',
    unit: 'mm',
    group: 'main',
    describes:
      'floor to the front edge of the seat, cushion pressed by the reference sitter of 77 kg (170 lb)',
    read: pressedSeatHeightMm,
    write: (seat, value) => withPressedSeatHeight(seat, Number(value)),
    limits: (seat) => {
      const rise = pressedRiseMm(seat);
      return { min: 200 + rise, max: 1000 + rise };
    },
  },
  { key: 'widthMm', label: 'Width', kind: 'length', group: 'main', describes: 'across the seat' },
  {
    key: 'seatDepthMm',
    label: 'Seat depth',
    kind: 'length',
    group: 'main',
    describes: 'face of the back to the front edge of the seat, level',
  },
  {
    key: 'backHeightMm',
    label: 'Back height',
    kind: 'length',
    group: 'main',
    describes: 'pressed seat to the top of the back; 0 for a stool',
  },
  {
    key: 'backLeanDeg',
    label: 'Back lean',
    kind: 'angle',
    group: 'more',
    describes: 'from upright, away from the sitter',
    applies: (seat) => seat.backHeightMm > 0,
  },
  {
    key: 'armHeightMm',
    label: 'Arm height',
    kind: 'length',
    group: 'more',
    describes: 'pressed seat to the top of the arms; 0 for none',
  },
  {
    key: 'seatCushion.thicknessMm',
    label: 'Seat cushion',
    kind: 'length',
    group: 'more',
    describes: 'thickness unpressed; the pressed seat height stays',
    write: (seat, value) =>
      withPressedSeatHeight(
        { ...seat, seatCushion: { ...seat.seatCushion, thicknessMm: Number(value) } },
        pressedSeatHeightMm(seat),
      ),
  },
];

/** Chair or stool: parameters, parts, envelope and sentence. */
export const LOOSE_SEAT: PieceDefinition<'loose-seat'> = {
  kind: 'loose-seat',
  letter: 'L',
  title: 'Loose seat',
  create(common) {
    const seat: LooseSeat = {
      kind: 'loose-seat',
      ...common,
      widthMm: 431.8,
      seatDepthMm: 406.4,
      deckHeightMm: 431.8,
      seatCushion: { ...FIRM_SEAT, thicknessMm: 38.1 },
      backHeightMm: 431.8,
      backLeanDeg: 8,
      armHeightMm: 0,
    };
    return withPressedSeatHeight(seat, 457.2);
  },
  parameters: PARAMETERS,
  parts,
  envelope(seat) {
    const pressed = pressedSeatHeightMm(seat);
    const lean = Math.tan(radians(seat.backLeanDeg));
    const behind = seat.backHeightMm > 0 ? BACK_BOARD_MM / Math.cos(radians(seat.backLeanDeg)) : 0;
    const top = Math.max(unpressedSeatTopMm(seat), pressed + Math.max(seat.backHeightMm, seat.armHeightMm));
    return {
      minMm: [-seat.widthMm / 2, 0, -behind - Math.max(0, top - seat.deckHeightMm) * lean],
      maxMm: [seat.widthMm / 2, top, seat.seatDepthMm],
    };
  },
  sentence: (seat) => ({
    main: sentenceOf(
      `Loose seat ${seat.mark}, seat `,
      ['pressedSeatHeight', 'Seat height'],
      ' off the floor with the cushion pressed, ',
      ['widthMm', 'Width'],
      ' wide, ',
      ['seatDepthMm', 'Seat depth'],
      ' deep.',
    ),
    more: sentenceOf(
      ...(seat.backHeightMm > 0
        ? ([
            'Back ',
            ['backHeightMm', 'Back height'],
            ' high leaning ',
            ['backLeanDeg', 'Back lean'],
            ', ',
          ] as const)
        : (['No back, '] as const)),
      ['seatCushion.thicknessMm', 'Seat cushion'],
      ' cushion.',
    ),
  }),
};

function parts(seat: LooseSeat, document?: SetDocument): Part[] {
  const list = partList(seat);
  const { widthMm, seatDepthMm, deckHeightMm, seatCushion } = seat;
  const board = Math.min(SEAT_BOARD_MM, deckHeightMm / 2);
  const under = deckHeightMm - board;
  const pressed = pressedSeatHeightMm(seat);
  const arms = seat.armHeightMm > ARM_MM;
  const side = arms ? ARM_MM : 0;
  list.box('seat', 'walnut', {
    sizeMm: [widthMm, board, seatDepthMm],
    centreMm: [0, deckHeightMm - board / 2, seatDepthMm / 2],
    grain: 'z',
  });
  const thicknessMm = cushionHeightMm(seatCushion);
  addCushion(list, 'seat', {
    sizeMm: { widthMm: widthMm - 2 * side, depthMm: seatDepthMm, thicknessMm },
    centreMm: [0, deckHeightMm + thicknessMm / 2, seatDepthMm / 2],
    pitchRad: 0,
    shape: document?.cushions?.[cushionKey({ pieceId: seat.id, kind: 'seat', number: 1 })]?.shape,
  });
  for (const [sx, z] of [
    [-1, LEG_MM / 2],
    [1, LEG_MM / 2],
    [-1, seatDepthMm - LEG_MM / 2],
    [1, seatDepthMm - LEG_MM / 2],
  ] as const) {
    list.box('leg', 'walnut', {
      sizeMm: [LEG_MM, under, LEG_MM],
      centreMm: [(sx * (widthMm - LEG_MM)) / 2, under / 2, z],
      grain: 'y',
    });
  }
  if (seat.backHeightMm > 0) {
    const lean = radians(seat.backLeanDeg);
    const [sin, cos] = [Math.sin(lean), Math.cos(lean)];
    const length = Math.max(0, pressed + seat.backHeightMm - deckHeightMm) / cos;
    list.box('back-board', 'walnut', {
      sizeMm: [widthMm, length, BACK_BOARD_MM],
      centreMm: [
        0,
        deckHeightMm + (length / 2) * cos - (BACK_BOARD_MM / 2) * sin,
        -(length / 2) * sin - (BACK_BOARD_MM / 2) * cos,
      ],
      pitchRad: -lean,
      grain: 'x',
    });
  }
  if (arms) {
    const height = pressed + seat.armHeightMm - deckHeightMm;
    for (const sx of [-1, 1]) {
      list.box('arm', 'walnut', {
        sizeMm: [ARM_MM, height, seatDepthMm],
        centreMm: [(sx * (widthMm - ARM_MM)) / 2, deckHeightMm + height / 2, seatDepthMm / 2],
        grain: 'z',
      });
    }
  }
  return list.parts;
}
