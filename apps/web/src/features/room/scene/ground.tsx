import { useMemo } from 'react';
import type { RoomPicture } from '../picture';
import { boundsOf } from './bounds';
import type { SceneMaterials } from './shaders';
import type { SceneView } from './views';

const MARGIN_MM = 900;

interface Props {
  picture: RoomPicture;
  letter: SceneView;
  materials: SceneMaterials;
}

/** Floor and wall as a wash that fades into the paper: the room has no frame. */
export function Ground({ picture, letter, materials }: Props) {
  const bounds = useMemo(
    () => boundsOf(picture.parts) ?? { min: [-1500, 0, -1000] as const, max: [1500, 1500, 1000] as const },
    [picture.parts],
  );
  const { min, max } = bounds;
  const [width, depth] = [max[0] - min[0] + MARGIN_MM * 2, max[2] - min[2] + MARGIN_MM * 1.6];
  const [x, z] = [(min[0] + max[0]) / 2, (min[2] + max[2]) / 2];
  const height = Math.max(2200, max[1] + 500);
  const flat = letter === 'B' || letter === 'C';
  return (
    <>
      {!flat && (
        <mesh
          position={[x, -1, z + (letter === 'A' ? MARGIN_MM * 0.3 : 0)]}
          rotation={[-Math.PI / 2, 0, 0]}
          scale={[width, depth, 1]}
          material={materials.floor}
          renderOrder={-3}
        >
          <planeGeometry />
        </mesh>
      )}
      {letter === 'A' && (
        <mesh
          position={[x, height / 2 - 250, min[2] - 4]}
          scale={[width, height + 500, 1]}
          material={materials.wall}
          renderOrder={-4}
        >
          <planeGeometry />
        </mesh>
      )}
    </>
  );
}
