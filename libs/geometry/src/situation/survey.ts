import type { Part } from '../parts/part.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { derivePieceParts } from '../pieces/kinds.ts';
import { placeFrames, type PlaceFrame } from '../pieces/place-frames.ts';
import type { Piece, PieceOf, SetDocument } from '../room/document.ts';
import {
  inFrame,
  planSolids,
  rectangleIn,
  type PlanFrame,
  type PlanOutline,
  type PlanSolid,
} from './plan.ts';

/** A piece with its parts as clearances see them. */
interface SurveyedPiece {
  piece: Piece;
  solids: PlanSolid[];
  /** Circle around the outlines of all parts. */
  circle: PlanSolid['circle'];
}

/** A place as clearances see it: origin at the seat front, second axis ahead of the sitter. */
export interface SurveyedPlace {
  frame: PlaceFrame;
  piece: PieceOf<'bench'> | PieceOf<'loose-seat'>;
  plan: PlanFrame;
  effectiveDepthMm: number;
  /** Seat front to the hip point, backwards. */
  hipBehindFrontMm: number;
}

/** Everything of a set that measuring reads, derived once. */
export interface Survey {
  document: SetDocument;
  pieces: SurveyedPiece[];
  places: SurveyedPlace[];
}

const surveys = new WeakMap<SetDocument, Survey>();

/**
 * Derives the parts and places of a set once, for all measurements: it is kept as long as the document is.
 *
 * @param document - the set; it is not changed afterwards
 * @returns pieces with their solids, and places with their frames
 */
export function survey(document: SetDocument): Survey {
  const found = surveys.get(document) ?? surveyed(document);
  surveys.set(document, found);
  return found;
}

const surveyedPieces = new WeakMap<readonly Part[], SurveyedPiece>();

/** Kept with the parts, which are the same as long as the piece is. */
function surveyedPiece(piece: Piece, document: SetDocument): SurveyedPiece {
  const parts = derivePieceParts(piece, document);
  const known = surveyedPieces.get(parts);
  if (known) return known;
  const solids = parts.flatMap(planSolids);
  const found = { piece, solids, circle: circleAround(solids, piece) };
  surveyedPieces.set(parts, found);
  return found;
}

function surveyed(document: SetDocument): Survey {
  const pieces = document.pieces.map((piece) => surveyedPiece(piece, document));
  const places = document.pieces.flatMap((piece) =>
    piece.kind === 'bench' || piece.kind === 'loose-seat'
      ? placeFrames(piece, document).map((frame) => surveyedPlace(frame, piece))
      : [],
  );
  return { document, pieces, places };
}

/**
 * @param found - the survey
 * @returns benches of the set, in the order of its pieces
 */
export function benchesOf(found: Survey): PieceOf<'bench'>[] {
  return found.document.pieces.filter((piece): piece is PieceOf<'bench'> => piece.kind === 'bench');
}

/**
 * @param found - the survey
 * @param bench - a bench of it
 * @returns places of the bench, from the left as seen from in front
 */
export function placesOf(found: Survey, bench: PieceOf<'bench'>): SurveyedPlace[] {
  return found.places.filter((place) => place.piece.id === bench.id);
}

/**
 * Solids near a frame, in that frame.
 *
 * @param found - the survey
 * @param plan - the frame
 * @param reachMm - what lies wholly further from the frame's origin is left out
 * @param wanted - which pieces to look at
 * @param kept - which of their solids to look at
 * @returns solids with their outline in the frame
 */
export function solidsNear(
  found: Survey,
  plan: PlanFrame,
  reachMm: number,
  wanted: (piece: Piece) => boolean,
  kept: (solid: PlanSolid) => boolean = () => true,
): PlanSolid[] {
  const near: PlanSolid[] = [];
  const isNear = ([x, z, radius]: PlanSolid['circle']) =>
    Math.hypot(x - plan.xMm, z - plan.zMm) <= reachMm + radius;
  for (const { piece, solids, circle } of found.pieces) {
    if (!wanted(piece) || !isNear(circle)) continue;
    for (const solid of solids) {
      if (kept(solid) && isNear(solid.circle)) near.push({ ...solid, outline: inFrame(solid.outline, plan) });
    }
  }
  return near;
}

/**
 * The level frame of a piece: origin where the piece stands, looking the way the piece faces.
 *
 * @param piece - any piece
 * @returns its frame
 */
export function planOfPiece(piece: Piece): PlanFrame {
  return { xMm: piece.at.xMm, zMm: piece.at.zMm, facingRad: (piece.at.turnDeg * Math.PI) / 180 };
}

/**
 * Outline of a table's top, or of any rectangle of a piece, in the room.
 *
 * @param piece - the piece
 * @param xs - limits along its own x axis
 * @param zs - limits along its own z axis
 * @returns the rectangle in the room's x and z
 */
export function rectangleOf(
  piece: Piece,
  xs: readonly [number, number],
  zs: readonly [number, number],
): PlanOutline {
  return rectangleIn(planOfPiece(piece), xs, zs);
}

function surveyedPlace(frame: PlaceFrame, piece: SurveyedPlace['piece']): SurveyedPlace {
  const [xMm, , zMm] = frame.frontMm;
  const plan = { xMm, zMm, facingRad: frame.facingRad };
  const hipBehindFrontMm = Math.hypot(frame.hipMm[0] - xMm, frame.hipMm[2] - zMm);
  const effectiveDepthMm =
    piece.kind === 'bench' ? benchLayout(piece).frontZMm - benchLayout(piece).faceZMm : piece.seatDepthMm;
  return { frame, piece, plan, effectiveDepthMm, hipBehindFrontMm };
}

function circleAround(solids: PlanSolid[], piece: Piece): PlanSolid['circle'] {
  let [x0, x1, z0, z1] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const { circle } of solids) {
    const [x, z, radius] = circle;
    x0 = Math.min(x0, x - radius);
    x1 = Math.max(x1, x + radius);
    z0 = Math.min(z0, z - radius);
    z1 = Math.max(z1, z + radius);
  }
  if (x1 < x0) return [piece.at.xMm, piece.at.zMm, 0];
  return [(x0 + x1) / 2, (z0 + z1) / 2, Math.hypot(x1 - x0, z1 - z0) / 2];
}
