import type { MannequinMesh } from '../mannequin/mesh.ts';
import type { MannequinJoints } from '../mannequin/joints.ts';
import type { MannequinPose } from '../mannequin/pose.ts';
import type { Vec3 } from '../parts/part.ts';
import type { BodyPointKey } from './dimension.ts';
import { hitSkin, pointAlong } from './ray-hits.ts';

/** A body at its place, as measuring needs it. */
export interface MeasuredBody {
  pieceId: string;
  place: number;
  name: string;
  pose: Pick<MannequinPose, 'joints' | 'placement' | 'segments'>;
  /** The near mesh. */
  mesh: MannequinMesh;
}

type Way = 'forward' | 'back' | 'left' | 'right' | 'up' | 'down';

/** A point is where the skin is met on the way from a joint, or the joint itself where no way is named. */
interface BodyPoint {
  words: string;
  joint: keyof MannequinJoints;
  way?: Way;
}

const pair = (words: string, joint: string, way?: Way | 'out'): Record<'left' | 'right', BodyPoint> => {
  const one = (side: 'left' | 'right'): BodyPoint => {
    const towards = way === 'out' ? side : way;
    return {
      words: words.replace('%', side),
      joint: `${side}${joint}` as keyof MannequinJoints,
      ...(towards && { way: towards }),
    };
  };
  return { left: one('left'), right: one('right') };
};

const [shoulder, elbow, fingertips, hip, knee, kneeTop, heel, toe] = [
  pair('% shoulder', 'Shoulder', 'out'),
  pair('underside of the % elbow', 'Elbow', 'down'),
  pair('% fingertips', 'Fingertip'),
  pair('side of the % hip', 'Hip', 'out'),
  pair('front of the % knee', 'Knee', 'forward'),
  pair('top of the % knee', 'Knee', 'up'),
  pair('% heel', 'Heel'),
  pair('% toe', 'Toe'),
];

const BODY_POINTS: Record<BodyPointKey, BodyPoint> = {
  crown: { words: 'top of the head', joint: 'crown' },
  eyes: { words: 'eyes', joint: 'eye' },
  'left-shoulder': shoulder.left,
  'right-shoulder': shoulder.right,
  'left-elbow': elbow.left,
  'right-elbow': elbow.right,
  'left-fingertips': fingertips.left,
  'right-fingertips': fingertips.right,
  'left-hip': hip.left,
  'right-hip': hip.right,
  'hips-back': { words: 'back of the hips', joint: 'pelvis', way: 'back' },
  'left-knee': knee.left,
  'right-knee': knee.right,
  'left-knee-top': kneeTop.left,
  'right-knee-top': kneeTop.right,
  'left-heel': heel.left,
  'right-heel': heel.right,
  'left-toe': toe.left,
  'right-toe': toe.right,
};

/**
 * What a point of a body is called; left and right are the sitter's own.
 *
 * @param key - the point
 */
export const bodyPointWords = (key: BodyPointKey): string => BODY_POINTS[key].words;

/** The way in the room; a sitter who looks along +z has the left hand at +x. */
function wayOf(way: Way, facingRad: number): Vec3 {
  const [s, c] = [Math.sin(facingRad), Math.cos(facingRad)];
  const ways: Record<Way, Vec3> = {
    forward: [s, 0, c],
    back: [-s, 0, -c],
    left: [c, 0, -s],
    right: [-c, 0, s],
    up: [0, 1, 0],
    down: [0, -1, 0],
  };
  return ways[way];
}

const kept = new WeakMap<MannequinMesh, Map<BodyPointKey, Vec3>>();

/**
 * Where a named point of a body lies.
 *
 * @param body - at its place
 * @param key - the point
 * @returns room frame, millimetres; on the skin, but for the eyes and the tips of hands and feet
 */
export function bodyPoint({ pose, mesh }: MeasuredBody, key: BodyPointKey): Vec3 {
  const points = kept.get(mesh) ?? new Map<BodyPointKey, Vec3>();
  kept.set(mesh, points);
  const known = points.get(key);
  if (known) return known;
  const { joint, way } = BODY_POINTS[key];
  const origin = pose.joints[joint];
  const line = way && { origin, direction: wayOf(way, pose.placement.facingRad) };
  const out = line && hitSkin(mesh, line);
  const found = line && out !== undefined ? pointAlong(line, out) : origin;
  points.set(key, found);
  return found;
}
