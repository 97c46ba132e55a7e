import type { PieceOf } from '../room/document.ts';
import type { ParameterSpec } from './kind.ts';
import { pressedSeatHeightMm, referenceSinkMm, withPressedSeatHeight } from './seat-sink.ts';

type Bench = PieceOf<'bench'>;
type BenchParameter = ParameterSpec<'bench'>;

const NARROWEST_PLACE_MM = 300;
const THINNEST_INNER_MM = 250;

const hasBack = (bench: Bench) => bench.backHeightMm > 0;
const isBox = (bench: Bench) => bench.base === 'box';

const ON_OFF_BASE = [
  { value: 'box', label: 'closed box' },
  { value: 'open', label: 'open legs' },
] as const;
const END_KINDS = [
  { value: 'open', label: 'open' },
  { value: 'arm', label: 'arm' },
  { value: 'wall', label: 'end wall' },
] as const;

/** Dimensions and choices of a bench, in the order of the form. */
export const BENCH_PARAMETERS: readonly BenchParameter[] = [
  {
    key: 'lengthMm',
    label: 'Length',
    kind: 'length',
    group: 'main',
    describes: 'end to end, arms and end walls included',
    limits: (bench) => ({
      min: Math.max(
        THINNEST_INNER_MM + endsMm(bench),
        bench.places.by === 'count' ? bench.places.count * NARROWEST_PLACE_MM + endsMm(bench) : 0,
      ),
    }),
  },
  {
    key: 'pressedSeatHeight',
    label: 'Seat height',
    kind: 'length',
    unit: 'mm',
    group: 'main',
    describes:
      'floor to the front edge of the seat, cushion pressed by the reference sitter of 77 kg (170 lb)',
    read: pressedSeatHeightMm,
    write: (bench, value) => withPressedSeatHeight(bench, Number(value)),
    limits: (bench) => {
      const rise = bench.seatCushion.thicknessMm - referenceSinkMm(bench);
      return { min: 100 + rise, max: 1000 + rise };
    },
  },
  {
    key: 'seatDepthMm',
    label: 'Seat depth',
    kind: 'length',
    group: 'main',
    describes: 'face of the unpressed back to the front edge of the seat, level',
  },
  {
    key: 'backHeightMm',
    label: 'Back height',
    kind: 'length',
    group: 'main',
    describes: 'pressed seat to the top of the back; 0 for a bench without a back',
  },
  {
    key: 'backLeanDeg',
    label: 'Back lean',
    kind: 'angle',
    group: 'main',
    describes: 'from upright, away from the sitter',
    applies: hasBack,
  },
  {
    key: 'seatTiltDeg',
    label: 'Seat tilt',
    kind: 'angle',
    group: 'more',
    describes: 'from level, front edge up',
  },
  {
    key: 'seatCushion.thicknessMm',
    label: 'Seat cushion',
    kind: 'length',
    group: 'more',
    describes: 'thickness unpressed; the pressed seat height stays',
    write: (bench, value) =>
      withPressedSeatHeight(
        { ...bench, seatCushion: { ...bench.seatCushion, thicknessMm: Number(value) } },
        pressedSeatHeightMm(bench),
      ),
  },
  {
    key: 'seatCushion.foam.ifd25N',
    label: 'Seat foam firmness',
    kind: 'count',
    unit: 'N',
    group: 'more',
    describes: 'force that presses the foam by a quarter; the pressed seat height stays',
    write: (bench, value) => {
      const foam = { ...bench.seatCushion.foam, ifd25N: Number(value) };
      const seatCushion = { ...bench.seatCushion, foam };
      return withPressedSeatHeight({ ...bench, seatCushion }, pressedSeatHeightMm(bench));
    },
  },
  {
    key: 'backCushion.thicknessMm',
    label: 'Back cushion',
    kind: 'length',
    group: 'more',
    describes: 'thickness unpressed, square to the back',
    applies: hasBack,
  },
  {
    key: 'lumbar.apexMm',
    label: 'Back curve',
    kind: 'length',
    group: 'more',
    describes: 'pressed seat to where the back stands out most; 0 for a flat back',
    applies: hasBack,
    read: (bench) => bench.lumbar?.apexMm ?? 0,
    write: (bench, value) => withLumbar(bench, { apexMm: Number(value) }),
    limits: () => ({ min: 0, max: 400 }),
  },
  {
    key: 'lumbar.recessMm',
    label: 'Pelvis room',
    kind: 'length',
    group: 'more',
    describes: 'how far the back gives way between 100 and 200 mm above the pressed seat; 0 for none',
    applies: hasBack,
    read: (bench) => bench.lumbar?.recessMm ?? 0,
    write: (bench, value) => withLumbar(bench, { recessMm: Number(value) }),
    limits: () => ({ min: 0, max: 150 }),
  },
  {
    key: 'places.count',
    label: 'Places',
    kind: 'count',
    group: 'more',
    describes: 'people side by side',
    applies: (bench) => bench.places.by === 'count',
    read: (bench) => (bench.places.by === 'count' ? bench.places.count : 0),
    write: (bench, value) => ({ ...bench, places: { by: 'count', count: Number(value) } }),
    limits: (bench) => ({
      min: 1,
      max: Math.min(40, Math.max(1, Math.floor((bench.lengthMm - endsMm(bench)) / NARROWEST_PLACE_MM))),
    }),
  },
  {
    key: 'places.widthMm',
    label: 'Width of a place',
    kind: 'length',
    group: 'more',
    describes: 'width each person gets; as many as the bench holds',
    applies: (bench) => bench.places.by === 'width',
    read: (bench) => (bench.places.by === 'width' ? bench.places.widthMm : 0),
    write: (bench, value) => ({ ...bench, places: { by: 'width', widthMm: Number(value) } }),
    limits: () => ({ min: NARROWEST_PLACE_MM, max: 1500 }),
  },
  {
    key: 'places.by',
    label: 'Places are set by',
    kind: 'choice',
    group: 'more',
    describes: 'a number of places, or a width for each',
    choices: [
      { value: 'count', label: 'number of places' },
      { value: 'width', label: 'width of a place' },
    ],
    write: (bench, value) => {
      if (value === bench.places.by) return bench;
      const inner = bench.lengthMm - endsMm(bench);
      if (bench.places.by === 'count') {
        const widthMm = Math.min(1500, Math.max(NARROWEST_PLACE_MM, inner / bench.places.count));
        return { ...bench, places: { by: 'width', widthMm } };
      }
      const count = Math.min(40, Math.max(1, Math.floor(inner / bench.places.widthMm + 1e-6)));
      return { ...bench, places: { by: 'count', count } };
    },
  },
  {
    key: 'base',
    label: 'Base',
    kind: 'choice',
    group: 'more',
    describes: 'what carries the seat',
    choices: ON_OFF_BASE,
  },
  {
    key: 'kick.depthMm',
    label: 'Kick depth',
    kind: 'length',
    group: 'more',
    describes: 'riser set back at the floor, for the heels',
    applies: isBox,
  },
  {
    key: 'kick.heightMm',
    label: 'Kick height',
    kind: 'length',
    group: 'more',
    describes: 'floor to the top of the set-back',
    applies: isBox,
  },
  {
    key: 'lipMm',
    label: 'Lip',
    kind: 'length',
    group: 'more',
    describes: 'seat front before the riser',
  },
  {
    key: 'backThicknessMm',
    label: 'Back thickness',
    kind: 'length',
    group: 'more',
    describes: 'rear face to the face of the boards, at the top',
    applies: hasBack,
  },
  ...endParameters('left'),
  ...endParameters('right'),
  {
    key: 'boards.faceMm',
    label: 'Board face',
    kind: 'length',
    group: 'more',
    describes: 'visible width of one board',
    applies: hasBack,
  },
  {
    key: 'boards.revealMm',
    label: 'Reveal',
    kind: 'length',
    group: 'more',
    describes: 'gap or groove between two boards',
    applies: hasBack,
  },
  {
    key: 'upholstery.longestCushionMm',
    label: 'Longest cushion',
    kind: 'length',
    group: 'more',
    describes: 'a longer run is split into equal cushions',
  },
];

const FLAT = { apexMm: 0, recessMm: 0 };

const withLumbar = (bench: Bench, change: Partial<typeof FLAT>): Bench => ({
  ...bench,
  lumbar: { ...FLAT, ...bench.lumbar, ...change },
});

function endsMm(bench: Bench): number {
  return bench.ends.left.thicknessMm + bench.ends.right.thicknessMm;
}

function endParameters(side: 'left' | 'right'): BenchParameter[] {
  const hand = `${side === 'left' ? 'Left' : 'Right'} end`;
  return [
    {
      key: `ends.${side}.kind`,
      label: hand,
      kind: 'choice',
      group: 'more',
      describes: `what closes the ${side} end, as seen from in front`,
      choices: END_KINDS,
    },
    {
      key: `ends.${side}.thicknessMm`,
      label: `${hand} thickness`,
      kind: 'length',
      group: 'more',
      describes: 'thickness of the arm, wall or moulding',
      limits: (bench) => ({
        max: Math.max(
          0,
          Math.min(200, bench.lengthMm - THINNEST_INNER_MM - endsMm(bench) + bench.ends[side].thicknessMm),
        ),
      }),
    },
    {
      key: `ends.${side}.heightMm`,
      label: `${hand} height`,
      kind: 'length',
      group: 'more',
      describes: 'pressed seat to the top of the arm or wall',
      applies: (bench) => bench.ends[side].kind !== 'open',
    },
  ];
}
