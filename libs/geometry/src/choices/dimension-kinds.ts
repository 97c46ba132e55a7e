import type { PieceKind } from '../room/document.ts';
import { MM_PER_INCH } from '../units/length-style.ts';

/** A kind of number that pieces have. */
export interface DimensionKind {
  id: string;
  label: string;
  of: readonly (readonly [kind: PieceKind, key: string])[];
  unit: 'mm' | 'deg' | 'N';
  ruleId: string;
  /** How far from the present value to look, in the unit. */
  reach: number;
}

/** How far from a present length to look, where nothing else is said. */
export const HAND_MM = 6 * MM_PER_INCH;

/** Numbers that decide how people sit, in the order they are offered. */
export const DIMENSION_KINDS: readonly DimensionKind[] = [
  {
    id: 'seat-height',
    label: 'Seat height, pressed',
    of: [
      ['bench', 'pressedSeatHeight'],
      ['loose-seat', 'pressedSeatHeight'],
    ],
    unit: 'mm',
    ruleId: 'SEAT-02',
    reach: HAND_MM,
  },
  {
    id: 'seat-depth',
    label: 'Seat depth',
    of: [
      ['bench', 'seatDepthMm'],
      ['loose-seat', 'seatDepthMm'],
    ],
    unit: 'mm',
    ruleId: 'SEAT-04',
    reach: HAND_MM,
  },
  {
    id: 'seat-tilt',
    label: 'Seat tilt',
    of: [['bench', 'seatTiltDeg']],
    unit: 'deg',
    ruleId: 'SEAT-06',
    reach: 6,
  },
  {
    id: 'back-lean',
    label: 'Back lean',
    of: [
      ['bench', 'backLeanDeg'],
      ['loose-seat', 'backLeanDeg'],
    ],
    unit: 'deg',
    ruleId: 'BACK-01',
    reach: 12,
  },
  {
    id: 'back-height',
    label: 'Back height',
    of: [
      ['bench', 'backHeightMm'],
      ['loose-seat', 'backHeightMm'],
    ],
    unit: 'mm',
    ruleId: 'BACK-03',
    reach: 1.5 * HAND_MM,
  },
  {
    id: 'seat-firmness',
    label: 'Seat foam firmness',
    of: [['bench', 'seatCushion.foam.ifd25N']],
    unit: 'N',
    ruleId: 'SEAT-02',
    reach: 100,
  },
  {
    id: 'place-width',
    label: 'Width of a place',
    of: [['bench', 'places.widthMm']],
    unit: 'mm',
    ruleId: 'SEAT-05',
    reach: HAND_MM,
  },
  {
    id: 'bench-length',
    label: 'Bench length',
    of: [['bench', 'lengthMm']],
    unit: 'mm',
    ruleId: 'SEAT-05',
    reach: 2 * HAND_MM,
  },
  {
    id: 'table-height',
    label: 'Table height',
    of: [['table', 'heightMm']],
    unit: 'mm',
    ruleId: 'TABLE-05',
    reach: HAND_MM,
  },
  {
    id: 'table-apron',
    label: 'Apron height',
    of: [['table', 'apron.heightMm']],
    unit: 'mm',
    ruleId: 'TABLE-01',
    reach: HAND_MM,
  },
  {
    id: 'table-top',
    label: 'Top thickness',
    of: [['table', 'topThicknessMm']],
    unit: 'mm',
    ruleId: 'TABLE-01',
    reach: 40,
  },
  {
    id: 'sill-height',
    label: 'Sill height',
    of: [['sill', 'heightMm']],
    unit: 'mm',
    ruleId: 'SILL-01',
    reach: HAND_MM,
  },
  {
    id: 'sill-depth',
    label: 'Sill depth',
    of: [['sill', 'depthMm']],
    unit: 'mm',
    ruleId: 'SILL-03',
    reach: HAND_MM,
  },
  {
    id: 'headroom',
    label: 'Underside overhead',
    of: [['overhead', 'undersideMm']],
    unit: 'mm',
    ruleId: 'HEAD-02',
    reach: 2 * HAND_MM,
  },
];
