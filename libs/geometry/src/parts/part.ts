/** Three numbers: x right, y up, z towards the viewer; millimetres unless said otherwise. */
export type Vec3 = readonly [number, number, number];

/** What a part is in the built piece. */
export type PartRole =
  | 'deck'
  | 'riser'
  | 'kick'
  | 'bearer'
  | 'lip'
  | 'seat-cushion'
  | 'back-board'
  | 'back-frame'
  | 'back-cushion'
  | 'end-wall'
  | 'arm'
  | 'top'
  | 'leaf'
  | 'edge-lip'
  | 'apron'
  | 'leg'
  | 'rail'
  | 'column'
  | 'foot'
  | 'sill-board'
  | 'frame'
  | 'glass'
  | 'wall-board'
  | 'wall-panel'
  | 'beam'
  | 'seat';

/** What a part is made of; colours live with the viewer. */
export type MaterialKey = 'oak' | 'walnut' | 'cloth' | 'wall' | 'glass' | 'ply';

/**
 * A solid in its own frame, centred on the origin.
 * `box` is width x height x depth along x, y, z. `cylinder` stands along y.
 * `prism` is a counter-clockwise outline in x-y, extruded along z, centred in z only; it may be hollow, as a notched
 * seat or the face of a curved back.
 */
export type Solid =
  | { shape: 'box'; sizeMm: Vec3 }
  | { shape: 'cylinder'; radiusMm: number; heightMm: number }
  | {
      shape: 'prism';
      outlineMm: readonly (readonly [number, number])[];
      depthMm: number;
      /** The outline is the plan of a cushion, whose panel looks along z; otherwise it is a section across the part. */
      isPanel?: true;
    };

/**
 * One board, panel or cushion of a piece, placed in the room.
 * The scene, clearances, cushions, drawings and lists all read parts.
 */
export interface Part {
  /** `${pieceId}/${role}-${n}`; stable while the piece keeps its make-up. */
  id: string;
  pieceId: string;
  role: PartRole;
  material: MaterialKey;
  solid: Solid;
  /** Centre in the room frame. */
  positionMm: Vec3;
  /** Turned about y first, then x, then z (three.js order 'YXZ'), radians. */
  rotationRad: Vec3;
  /** Axis of the part's own frame the grain runs along. */
  grain?: 'x' | 'y' | 'z';
}
