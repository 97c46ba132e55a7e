import type { MannequinPose } from '@settlewright/geometry';
import { useThree } from '@react-three/fiber';
import { useEffect, useMemo } from 'react';
import { BufferAttribute, BufferGeometry } from 'three';
import type { SeatedBody } from '../picture.ts';
import { useChosenPlace } from '../posture/chosen-place.ts';
import type { Palette } from '../scene/palette.ts';
import type { SharedUniforms } from '../scene/shaders.ts';
import { doubted, ghostsOf } from './doubt.ts';
import { createGhostMaterial } from './ghost-material.ts';
import { useBodyMesh } from './use-body-mesh.ts';

interface Props {
  bodies: readonly SeatedBody[];
  palette: Palette;
  shared: SharedUniforms;
}

/** How small and how large the bodies may be whose measures are not all known: two shells round each. */
export default function GhostFigures({ bodies, ...rest }: Props) {
  const placeId = useChosenPlace((state) => state.placeId);
  return doubted(bodies, placeId).flatMap((body) => {
    const ghosts = ghostsOf(body);
    return ghosts
      ? (['larger', 'smaller'] as const).map((which) => (
          <Shell
            key={`${body.placeId} ${which}`}
            pose={ghosts[which]}
            which={which}
            colour={body.colour}
            {...rest}
          />
        ))
      : [];
  });
}

interface ShellProps extends Omit<Props, 'bodies'> {
  pose: MannequinPose;
  which: 'smaller' | 'larger';
  colour: number;
}

function Shell({ pose, which, colour, palette, shared }: ShellProps) {
  const mesh = useBodyMesh(pose, 'far');
  const pixelRatio = useThree(({ gl }) => gl.getPixelRatio());
  const invalidate = useThree((state) => state.invalidate);
  const geometry = useMemo(() => {
    if (!mesh) return undefined;
    const made = new BufferGeometry();
    made.setAttribute('position', new BufferAttribute(mesh.positions, 3));
    made.setAttribute('normal', new BufferAttribute(mesh.normals, 3));
    made.setIndex(new BufferAttribute(mesh.indices, 1));
    return made;
  }, [mesh]);
  const material = useMemo(() => {
    const fill = (palette.sitters[colour - 1] ?? palette.pen).clone();
    // The larger one is seen against the room, the smaller one against the body.
    const ink = which === 'larger' ? palette.chosen : palette.pen;
    return createGhostMaterial(shared, fill, ink.clone(), which, pixelRatio);
  }, [shared, palette, colour, which, pixelRatio]);
  useEffect(() => () => geometry?.dispose(), [geometry]);
  useEffect(() => () => material.dispose(), [material]);
  useEffect(() => invalidate(), [geometry, material, invalidate]);
  return geometry && <mesh geometry={geometry} material={material} renderOrder={3} frustumCulled={false} />;
}
