import type { PieceOf } from '../room/document.ts';
import type { ParameterSpec } from './kind.ts';
import { pressedSeatHeightMm, withPressedSeatHeight } from './seat-sink.ts';

type Bench = PieceOf<'bench'>;

/** Whether a bench has a back. */
export const hasBack = (bench: Bench) => bench.backHeightMm > 0;

const FLAT = { apexMm: 0, recessMm: 0 };

const withLumbar = (bench: Bench, change: Partial<typeof FLAT>): Bench => ({
  ...bench,
  lumbar: { ...FLAT, ...bench.lumbar, ...change },
});

/** Cushions of a bench and the curve of its back, in the order of the form. */
export const PADDING_PARAMETERS: readonly ParameterSpec<'bench'>[] = [
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
];
