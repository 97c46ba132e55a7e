import type { MannequinMesh } from '../mannequin/mesh.ts';
import type { MannequinPose } from '../mannequin/pose.ts';
import type { PartRole } from '../parts/part.ts';
import type { Gap } from './gap.ts';

/** A body in its posture at its place. */
export interface PlacedBody {
  placeId: string;
  /** The piece it sits on. */
  pieceId: string;
  pose: Pick<MannequinPose, 'segments'>;
  /** The near mesh; where it is given, distances are measured on it. */
  mesh?: MannequinMesh;
}

/** What a body comes near to. */
export type Thing =
  | { kind: 'part'; partId: string; pieceId: string; role: PartRole }
  | { kind: 'body'; placeId: string; segment: string };

/** One distance of a sitter. */
export interface SitterGap extends Gap {
  /** The place of the body, such as `left forearm`. */
  segment: string;
  thing: Thing;
  /**
   * Skin is right within 3 mm; solids, where a body has no mesh, within 10 at elbows and shoulders of raised arms, 25 at
   * crossed legs and the arms over them.
   */
  measuredOn: 'skin' | 'solids';
}

/** What a sitter touches and how much room there is beyond that. */
export interface SitterDistances {
  placeId: string;
  /** Further in than 3 mm, deepest first. */
  overlaps: SitterGap[];
  /** Within 3 mm of each other. */
  contacts: SitterGap[];
  /** The smallest gap to anything the sitter does not touch; absent where nothing is within the reach. */
  smallest?: SitterGap;
}

/** Nearer than this, up to as much inside, two things touch: the accuracy of the body. */
export const CONTACT_MM = 3;
