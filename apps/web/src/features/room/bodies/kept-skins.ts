import type { MannequinDetail, MannequinMesh, MannequinPose } from '@settlewright/geometry';

export type Posed = Pick<MannequinPose, 'means' | 'stance' | 'placement'>;
type Placement = Posed['placement'];

/** A near skin takes about half a megabyte. */
const MOST_SKINS = 48;
/** Finer differences are what reckoning in another place of the room leaves. */
const PER_UNIT = 1e6;

const rounded = (_key: string, value: unknown): unknown =>
  typeof value === 'number' ? Math.round(value * PER_UNIT) : value;

const keys = new WeakMap<object, string>();

/** The same for bodies of one shape in one posture, wherever in the room they sit. */
function shapeOf(pose: Posed): string {
  const known = keys.get(pose);
  if (known) return known;
  const { means, stance, placement } = pose;
  const key = JSON.stringify([means, stance, placement.tiltRad], rounded);
  keys.set(pose, key);
  return key;
}

interface Kept {
  placement: Placement;
  mesh: MannequinMesh;
}

/**
 * A skin that was made at one place, set down at another.
 *
 * @param kept - the skin and where it is
 * @param to - where it shall be; tilted as much as there
 */
export function movedSkin({ placement, mesh }: Kept, to: Placement): MannequinMesh {
  const turn = to.facingRad - placement.facingRad;
  const [s, c] = [Math.sin(turn), Math.cos(turn)];
  const turned = (
    from: Float32Array,
    [ox, oy, oz]: Placement['originMm'],
    [tx, ty, tz]: Placement['originMm'],
  ) => {
    const out = new Float32Array(from.length);
    for (let v = 0; v < from.length; v += 3) {
      const [x, y, z] = [(from[v] ?? 0) - ox, (from[v + 1] ?? 0) - oy, (from[v + 2] ?? 0) - oz];
      out[v] = tx + c * x + s * z;
      out[v + 1] = ty + y;
      out[v + 2] = tz - s * x + c * z;
    }
    return out;
  };
  return {
    ...mesh,
    positions: turned(mesh.positions, placement.originMm, to.originMm),
    normals: turned(mesh.normals, [0, 0, 0], [0, 0, 0]),
  };
}

/** Skins by shape and posture, the ones used last. */
export function createSkins() {
  const skins = new Map<string, Kept>();
  const at = new WeakMap<Posed, Partial<Record<MannequinDetail, MannequinMesh>>>();

  function take(pose: Posed, detail: MannequinDetail, mesh: MannequinMesh): MannequinMesh {
    at.set(pose, { ...at.get(pose), [detail]: mesh });
    return mesh;
  }

  return {
    keep(pose: Posed, detail: MannequinDetail, mesh: MannequinMesh): MannequinMesh {
      const key = `${detail} ${shapeOf(pose)}`;
      skins.delete(key);
      skins.set(key, { placement: pose.placement, mesh });
      const oldest = skins.keys().next();
      if (skins.size > MOST_SKINS && !oldest.done) skins.delete(oldest.value);
      return take(pose, detail, mesh);
    },
    /** The skin of a pose, if one of that shape and posture was made anywhere in the room. */
    known(pose: Posed, detail: MannequinDetail): MannequinMesh | undefined {
      const here = at.get(pose)?.[detail];
      if (here) return here;
      const key = `${detail} ${shapeOf(pose)}`;
      const kept = skins.get(key);
      if (!kept) return undefined;
      skins.delete(key);
      skins.set(key, kept);
      return take(pose, detail, movedSkin(kept, pose.placement));
    },
  };
}
