import type { Vec3 } from '../parts/part.ts';
import { toRoom } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { parametersOf } from '../pieces/parameters.ts';
import { pressedSeatHeightMm, unpressedSeatTopMm } from '../pieces/seat-sink.ts';
import type { Piece, PieceOf } from '../room/document.ts';
import type { TapeLine } from './tape-line.ts';

/** Where one parameter of a piece is measured, in the piece's own frame. */
interface Measured {
  key: string;
  name: string;
  from: Vec3;
  to: Vec3;
}

/** How far a tape stands off the piece. */
const OFF_MM = 45;

function ofBench(bench: PieceOf<'bench'>): Measured[] {
  const { pressedTopMm, backTopMm, faceZMm, frontZMm, seatTopFrontMm, hasBack } = benchLayout(bench);
  const half = bench.lengthMm / 2;
  const beside = -half - OFF_MM;
  const before = frontZMm + OFF_MM;
  const top = seatTopFrontMm;
  return [
    { key: 'lengthMm', name: 'length', from: [-half, 0, before], to: [half, 0, before] },
    {
      key: 'pressedSeatHeight',
      name: 'seat',
      from: [beside, 0, frontZMm],
      to: [beside, pressedTopMm, frontZMm],
    },
    { key: 'seatDepthMm', name: 'depth', from: [beside, top, faceZMm], to: [beside, top, frontZMm] },
    ...(hasBack
      ? [
          {
            key: 'backHeightMm',
            name: 'back',
            from: [beside, pressedTopMm, 0],
            to: [beside, backTopMm, 0],
          } as const,
        ]
      : []),
    {
      key: 'seatCushion.thicknessMm',
      name: 'cushion',
      from: [half + OFF_MM, bench.deckHeightMm, frontZMm],
      to: [half + OFF_MM, bench.deckHeightMm + bench.seatCushion.thicknessMm, frontZMm],
    },
    ...(bench.places.by === 'width'
      ? [
          {
            key: 'places.widthMm',
            name: 'place',
            from: [-bench.places.widthMm / 2, top + OFF_MM, frontZMm],
            to: [bench.places.widthMm / 2, top + OFF_MM, frontZMm],
          } as const,
        ]
      : []),
  ];
}

function ofTable(table: PieceOf<'table'>): Measured[] {
  const [x, z] = [table.lengthMm / 2, table.widthMm / 2];
  const y = table.heightMm;
  return [
    { key: 'lengthMm', name: 'length', from: [-x, y, z + OFF_MM], to: [x, y, z + OFF_MM] },
    { key: 'widthMm', name: 'width', from: [x + OFF_MM, y, -z], to: [x + OFF_MM, y, z] },
    { key: 'heightMm', name: 'top', from: [-x - OFF_MM, 0, z], to: [-x - OFF_MM, y, z] },
    {
      key: 'topThicknessMm',
      name: 'thick',
      from: [x + OFF_MM, y - table.topThicknessMm, z],
      to: [x + OFF_MM, y, z],
    },
  ];
}

function ofSill(sill: PieceOf<'sill'>): Measured[] {
  const x = sill.lengthMm / 2;
  const { heightMm: y, depthMm: z, opening } = sill;
  const measured: Measured[] = [
    { key: 'lengthMm', name: 'length', from: [-x, y + OFF_MM, z], to: [x, y + OFF_MM, z] },
    { key: 'heightMm', name: 'sill', from: [-x - OFF_MM, 0, z], to: [-x - OFF_MM, y, z] },
    { key: 'depthMm', name: 'depth', from: [x + OFF_MM, y, 0], to: [x + OFF_MM, y, z] },
  ];
  if (opening.widthMm > 0 && opening.heightMm > 0) {
    const half = opening.widthMm / 2;
    const top = y + opening.heightMm;
    measured.push(
      { key: 'opening.widthMm', name: 'window', from: [-half, top, 0], to: [half, top, 0] },
      { key: 'opening.heightMm', name: 'window', from: [half, y, 0], to: [half, top, 0] },
    );
  }
  return measured;
}

function ofLooseSeat(seat: PieceOf<'loose-seat'>): Measured[] {
  const x = seat.widthMm / 2;
  const z = seat.seatDepthMm;
  const pressed = pressedSeatHeightMm(seat);
  const top = unpressedSeatTopMm(seat);
  const side = -x - OFF_MM;
  return [
    { key: 'pressedSeatHeight', name: 'seat', from: [side, 0, z], to: [side, pressed, z] },
    { key: 'widthMm', name: 'width', from: [-x, top, z + OFF_MM], to: [x, top, z + OFF_MM] },
    { key: 'seatDepthMm', name: 'depth', from: [side, top, 0], to: [side, top, z] },
    ...(seat.backHeightMm > 0
      ? [
          {
            key: 'backHeightMm',
            name: 'back',
            from: [side, pressed, 0],
            to: [side, pressed + seat.backHeightMm, 0],
          } as const,
        ]
      : []),
  ];
}

function measuredOn(piece: Piece): Measured[] {
  switch (piece.kind) {
    case 'bench':
      return ofBench(piece);
    case 'table':
      return ofTable(piece);
    case 'sill':
      return ofSill(piece);
    case 'loose-seat':
      return ofLooseSeat(piece);
    case 'bulkhead': {
      const x = piece.lengthMm / 2;
      return [
        { key: 'lengthMm', name: 'length', from: [-x, 0, OFF_MM], to: [x, 0, OFF_MM] },
        { key: 'heightMm', name: 'height', from: [-x - OFF_MM, 0, 0], to: [-x - OFF_MM, piece.heightMm, 0] },
      ];
    }
    case 'overhead': {
      const x = piece.lengthMm / 2;
      const y = piece.undersideMm;
      return [
        { key: 'undersideMm', name: 'underside', from: [-x - OFF_MM, 0, 0], to: [-x - OFF_MM, y, 0] },
        { key: 'lengthMm', name: 'length', from: [-x, y - OFF_MM, 0], to: [x, y - OFF_MM, 0] },
      ];
    }
  }
}

/**
 * The dimensions of a piece as tapes beside it.
 *
 * @param piece - the piece
 * @returns one tape for each length that can be shown, in the order of importance; fixed when the piece is locked
 */
export function pieceTapes(piece: Piece): TapeLine[] {
  const parameters = new Map(parametersOf(piece).map((parameter) => [parameter.key, parameter]));
  return measuredOn(piece).flatMap(({ key, name, from, to }): TapeLine[] => {
    const parameter = parameters.get(key);
    if (!parameter || typeof parameter.value !== 'number') return [];
    return [
      {
        id: `${piece.id}/${key}`,
        kind: piece.locked ? 'fixed' : 'dimension',
        fromMm: toRoom(piece.at, from),
        toMm: toRoom(piece.at, to),
        name,
        valueMm: parameter.value,
        ...(piece.locked ? {} : { parameterKey: key }),
        pieceId: piece.id,
        describes: `${piece.mark}, ${parameter.label.toLowerCase()}: ${parameter.describes}`,
      },
    ];
  });
}
