import { deriveParts, type Piece, type SetDocument } from '@settlewright/geometry';
import type { RoomPicture } from './picture.ts';

/** How pieces were carried over the floor: turned about the middle of the room, then shifted. */
export interface Motion {
  turnRad: number;
  xMm: number;
  zMm: number;
}

/** Pieces that are as they were counted and only stand elsewhere; whoever sits at them goes along. */
export interface Carried extends Motion {
  /** The pieces as they were counted, by id. */
  before: ReadonlyMap<string, Piece>;
}

/** A picture for drawing alone: situation, sheet and bodies are those that were counted last. */
export interface DrawnPicture extends RoomPicture {
  carried?: Carried | undefined;
  /** Pieces that are of another shape than when they were counted, by id. */
  reshaped?: ReadonlySet<string>;
}

const SAME_MM = 1e-6;
const RAD = Math.PI / 180;

function motionOf({ at: from }: Piece, { at: to }: Piece): Motion {
  const turnRad = (to.turnDeg - from.turnDeg) * RAD;
  const [sin, cos] = [Math.sin(turnRad), Math.cos(turnRad)];
  return {
    turnRad,
    xMm: to.xMm - (cos * from.xMm + sin * from.zMm),
    zMm: to.zMm - (cos * from.zMm - sin * from.xMm),
  };
}

const isSameMotion = (a: Motion, b: Motion): boolean =>
  Math.abs(Math.sin((a.turnRad - b.turnRad) / 2)) < SAME_MM &&
  Math.hypot(a.xMm - b.xMm, a.zMm - b.zMm) < SAME_MM;

/** A bulkhead that moves leaves its windows behind: its boards are cut anew. */
function isCarried(before: Piece, piece: Piece): boolean {
  if (piece.kind === 'bulkhead') return false;
  const was: Partial<Record<string, unknown>> = { ...before };
  const others = Object.entries(piece).filter(([key]) => key !== 'at');
  return (
    others.length + 1 === Object.keys(was).length &&
    others.every(([key, value]) => Object.is(value, was[key]))
  );
}

/** What was carried since a set was counted; the first carried piece tells the way. */
export function carriedIn(document: SetDocument, counted: SetDocument): Carried | undefined {
  const known = new Map(counted.pieces.map((piece) => [piece.id, piece]));
  const before = new Map<string, Piece>();
  let motion: Motion | undefined;
  for (const piece of document.pieces) {
    const was = known.get(piece.id);
    if (!was || was === piece || !isCarried(was, piece)) continue;
    const own = motionOf(was, piece);
    motion ??= own;
    if (isSameMotion(own, motion)) before.set(piece.id, was);
  }
  return motion && { ...motion, before };
}

/** Draws a set in the hand over what was counted last. */
export function drawnPicture(document: SetDocument, counted: RoomPicture): DrawnPicture {
  if (document === counted.document) return counted;
  const carried = carriedIn(document, counted.document);
  const before = new Set(counted.document.pieces);
  const anew = document.pieces.filter((piece) => !before.has(piece) && !carried?.before.has(piece.id));
  return {
    ...counted,
    document,
    /** Asked for where a section cuts them; else the pieces alone are drawn. */
    get parts() {
      return deriveParts(document);
    },
    carried,
    reshaped: new Set(anew.map(({ id }) => id)),
  };
}
