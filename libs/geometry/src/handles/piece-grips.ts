import type { Vec3 } from '../parts/part.ts';
import { cushionHeightMm } from '../pieces/foam-situation.ts';
import { pressedSeatHeightMm } from '../pieces/seat-sink.ts';
import type { Piece, PieceOf } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import { benchGrips } from './bench-grips.ts';
import type { Grip } from './handle.ts';

/** How far up its back the lean of a loose seat is taken hold of. */
const UP_THE_BACK = 0.8;

/** Both ends of what is measured about its middle; the other end stays. */
function ends(key: string, halfMm: number, yMm: number, zMm: number): Grip[] {
  return [
    { key, side: 'left', pointMm: [-halfMm, yMm, zMm], along: [-1, 0, 0], farStays: true },
    { key, side: 'right', pointMm: [halfMm, yMm, zMm], along: [1, 0, 0], farStays: true },
  ];
}

/** Both sides, front and back, of what is measured about its middle; the other side stays. */
function sides(key: string, halfMm: number, xMm: number, yMm: number): Grip[] {
  return [
    { key, side: 'front', pointMm: [xMm, yMm, halfMm], along: [0, 0, 1], farStays: true },
    { key, side: 'back', pointMm: [xMm, yMm, -halfMm], along: [0, 0, -1], farStays: true },
  ];
}

const up = (key: string, pointMm: Vec3): Grip => ({ key, pointMm, along: [0, 1, 0] });
const down = (key: string, pointMm: Vec3): Grip => ({ key, pointMm, along: [0, -1, 0] });

function ofTable(table: PieceOf<'table'>): Grip[] {
  const [x, z] = [table.lengthMm / 2, table.widthMm / 2];
  const underside = table.heightMm - table.topThicknessMm;
  const middle = table.heightMm - table.topThicknessMm / 2;
  return [
    ...ends('lengthMm', x, middle, 0),
    ...sides('widthMm', z, 0, middle),
    up('heightMm', [-x / 2, table.heightMm, z]),
    ...(table.apron.heightMm > 0
      ? [down('apron.heightMm', [x / 2, underside - table.apron.heightMm, z - table.apron.insetMm])]
      : []),
    ...(table.edgeLipMm > 0 ? [down('edgeLipMm', [x / 4, underside - table.edgeLipMm, z])] : []),
  ];
}

function ofSill(sill: PieceOf<'sill'>): Grip[] {
  const { heightMm: y, depthMm: z, thicknessMm, opening } = sill;
  const middle = y - Math.min(thicknessMm, y) / 2;
  const half = opening.widthMm / 2;
  const foot = y + opening.frameMm;
  return [
    ...ends('lengthMm', sill.lengthMm / 2, middle, z),
    up('heightMm', [-sill.lengthMm / 4, y, z]),
    { key: 'depthMm', pointMm: [0, middle, z], along: [0, 0, 1] },
    ...(half > 0 && opening.heightMm > 0
      ? ([
          {
            key: 'opening.widthMm',
            pointMm: [half, foot + opening.heightMm / 2, 0],
            along: [1, 0, 0],
            // The window stays over the middle of its sill.
            perMm: 2,
          },
          up('opening.heightMm', [0, foot + opening.heightMm, 0]),
        ] as const)
      : []),
  ];
}

function ofBulkhead(wall: PieceOf<'bulkhead'>): Grip[] {
  const { lengthMm, heightMm, thicknessMm } = wall;
  return [
    ...ends('lengthMm', lengthMm / 2, heightMm / 2, 0),
    up('heightMm', [0, heightMm, 0]),
    { key: 'thicknessMm', pointMm: [lengthMm / 4, heightMm / 2, -thicknessMm], along: [0, 0, -1] },
  ];
}

function ofOverhead(beam: PieceOf<'overhead'>): Grip[] {
  const middle = beam.undersideMm + beam.thicknessMm / 2;
  return [
    ...ends('lengthMm', beam.lengthMm / 2, middle, 0),
    up('undersideMm', [-beam.lengthMm / 4, beam.undersideMm, beam.depthMm / 2]),
    ...sides('depthMm', beam.depthMm / 2, 0, middle),
    up('thicknessMm', [beam.lengthMm / 4, beam.undersideMm + beam.thicknessMm, beam.depthMm / 2]),
  ];
}

function ofLooseSeat(seat: PieceOf<'loose-seat'>): Grip[] {
  const x = seat.widthMm / 2;
  const z = seat.seatDepthMm;
  const { deckHeightMm: deck } = seat;
  const cushion = cushionHeightMm(seat.seatCushion);
  const top = deck + cushion;
  const pressed = pressedSeatHeightMm(seat);
  const lean = radians(seat.backLeanDeg);
  const rise = pressed + seat.backHeightMm - deck;
  const [sin, cos] = [Math.sin(lean), Math.cos(lean)];
  const reach = (UP_THE_BACK * rise) / cos;
  return [
    ...ends('widthMm', x, top - cushion / 2, z),
    up('pressedSeatHeight', [x / 2, top, z]),
    { key: 'seatDepthMm', pointMm: [0, top - cushion / 2, z], along: [0, 0, 1] },
    ...(seat.backHeightMm > 0 && rise > 0
      ? ([
          up('backHeightMm', [0, deck + rise, -rise * Math.tan(lean)]),
          {
            key: 'backLeanDeg',
            pointMm: [x, deck + reach * cos, -reach * sin],
            along: [0, -sin, -cos],
            pivotMm: [x, deck, 0],
          },
        ] as const)
      : []),
    ...(seat.armHeightMm > 0 ? [up('armHeightMm', [-x, pressed + seat.armHeightMm, z / 2])] : []),
    ...(cushion > 0 ? [down('seatCushion.thicknessMm', [-x / 2, deck, z])] : []),
  ];
}

/**
 * Where a piece is taken hold of to change its numbers.
 *
 * @param piece - any piece
 * @returns grips in the piece's own frame, millimetres, in the order of the spec sentence
 */
export function gripsOf(piece: Piece): Grip[] {
  switch (piece.kind) {
    case 'bench':
      return benchGrips(piece);
    case 'table':
      return ofTable(piece);
    case 'sill':
      return ofSill(piece);
    case 'bulkhead':
      return ofBulkhead(piece);
    case 'overhead':
      return ofOverhead(piece);
    case 'loose-seat':
      return ofLooseSeat(piece);
  }
}
