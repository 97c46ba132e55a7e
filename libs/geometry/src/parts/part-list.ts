import type { Piece } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import type { MaterialKey, Part, PartRole, Solid, Vec3 } from './part.ts';
import { placer } from './placement.ts';

/** A box before it is placed: its size and centre in the piece's frame. */
interface BoxInPiece {
  sizeMm: Vec3;
  centreMm: Vec3;
  /** About the piece's x axis; negative lifts the front. */
  pitchRad?: number;
  /** About the piece's y axis. */
  yawRad?: number;
  grain?: 'x' | 'y' | 'z';
}

/** A shaped cushion before it is placed. */
interface PanelInPiece {
  /** Counter-clockwise as its face is seen, x along the piece. */
  outlineMm: readonly (readonly [number, number])[];
  thicknessMm: number;
  centreMm: Vec3;
  /** About the piece's x axis; a quarter turn back lays it face up. */
  pitchRad: number;
}

/** Collects the parts of one piece and places them in the room. */
export interface PartList {
  parts: Part[];
  /** Adds a box; one without thickness is left out. */
  box(role: PartRole, material: MaterialKey, box: BoxInPiece): void;
  /** Adds a standing cylinder from `bottomMm` to `topMm`. */
  cylinder(
    role: PartRole,
    material: MaterialKey,
    at: { xMm: number; zMm: number; radiusMm: number; bottomMm: number; topMm: number },
  ): void;
  /** Adds a panel cut to an outline of (z, y) points, counter-clockwise, standing across the piece at `xMm`. */
  crossPanel(
    role: PartRole,
    material: MaterialKey,
    panel: { xMm: number; thicknessMm: number; outlineMm: readonly (readonly [number, number])[] },
  ): void;
  /** Adds the panel of a cushion: an outline about its centre that looks along its own z axis. */
  panel(role: PartRole, material: MaterialKey, panel: PanelInPiece): void;
}

const THINNEST_MM = 0.5;

/**
 * Starts the list of parts of a piece.
 *
 * @param piece - the piece whose frame the parts are given in
 * @returns a list that numbers parts within their role and places them in the room
 */
export function partList(piece: Piece): PartList {
  const parts: Part[] = [];
  const counted = new Map<PartRole, number>();
  const turnRad = radians(piece.at.turnDeg);
  const place = placer(piece.at);
  const add = (
    role: PartRole,
    material: MaterialKey,
    solid: Solid,
    centre: Vec3,
    rotationRad: Vec3,
    grain?: Part['grain'],
  ) => {
    const n = (counted.get(role) ?? 0) + 1;
    counted.set(role, n);
    parts.push({
      id: `${piece.id}/${role}-${n}`,
      pieceId: piece.id,
      role,
      material,
      solid,
      positionMm: place(centre),
      rotationRad,
      ...(grain === undefined ? {} : { grain }),
    });
  };
  return {
    parts,
    box(role, material, { sizeMm, centreMm, pitchRad = 0, yawRad = 0, grain }) {
      if (sizeMm[0] < THINNEST_MM || sizeMm[1] < THINNEST_MM || sizeMm[2] < THINNEST_MM) return;
      add(role, material, { shape: 'box', sizeMm }, centreMm, [pitchRad, turnRad + yawRad, 0], grain);
    },
    cylinder(role, material, { xMm, zMm, radiusMm, bottomMm, topMm }) {
      const heightMm = topMm - bottomMm;
      if (heightMm < THINNEST_MM) return;
      const centre: Vec3 = [xMm, bottomMm + heightMm / 2, zMm];
      add(role, material, { shape: 'cylinder', radiusMm, heightMm }, centre, [0, turnRad, 0], 'y');
    },
    crossPanel(role, material, { xMm, thicknessMm, outlineMm }) {
      const solid: Solid = { shape: 'prism', outlineMm, depthMm: thicknessMm };
      add(role, material, solid, [xMm, 0, 0], [0, turnRad - Math.PI / 2, 0], 'y');
    },
    panel(role, material, { outlineMm, thicknessMm, centreMm, pitchRad }) {
      if (thicknessMm < THINNEST_MM) return;
      const solid: Solid = { shape: 'prism', outlineMm, depthMm: thicknessMm, isPanel: true };
      add(role, material, solid, centreMm, [pitchRad, turnRad, 0]);
    },
  };
}
