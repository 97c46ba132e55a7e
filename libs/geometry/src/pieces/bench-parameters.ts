import type { PieceOf } from '../room/document.ts';
import { endParameters, endsMm, THINNEST_INNER_MM } from './bench-end-parameters.ts';
import { hasBack, PADDING_PARAMETERS } from './bench-padding-parameters.ts';
import type { ParameterSpec } from './kind.ts';
import { pressedRiseMm, pressedSeatHeightMm, withPressedSeatHeight } from './seat-sink.ts';

type Bench = PieceOf<'bench'>;
type BenchParameter = ParameterSpec<'bench'>;

const NARROWEST_PLACE_MM = 300;

const isBox = (bench: Bench) => bench.base === 'box';

const ON_OFF_BASE = [
  { value: 'box', label: 'closed box' },
  { value: 'open', label: 'open legs' },
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
      const rise = pressedRiseMm(bench);
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
  ...PADDING_PARAMETERS,
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
