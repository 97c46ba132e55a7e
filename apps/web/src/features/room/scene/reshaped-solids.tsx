import type { Part } from '@settlewright/geometry';
import { useEffect, useLayoutEffect, useState } from 'react';
import { createHeldSolids, type PrintsOn } from './held-solids';
import type { SceneMaterials } from './shaders';
import type { SceneView } from './views';

interface Props {
  pieces: readonly (readonly Part[])[];
  printsOn: PrintsOn;
  letter: SceneView;
  chosen: boolean;
  materials: SceneMaterials;
}

/** Pieces that change their shape in each frame: written into the same memory again and again. */
export function ReshapedSolids({ pieces, printsOn, letter, chosen, materials }: Props) {
  const [held] = useState(createHeldSolids);
  const { surface, rounds, edges } = held;
  useLayoutEffect(() => held.write(pieces, printsOn), [held, pieces, printsOn]);
  useEffect(() => held.dispose, [held]);
  const look = chosen ? materials.chosenSurface : materials.surface;
  return (
    <>
      {letter !== 'C' && (
        <mesh geometry={surface} material={materials.shadow} renderOrder={-1} frustumCulled={false} />
      )}
      <mesh geometry={surface} material={look} frustumCulled={false} />
      <mesh geometry={rounds} material={materials.hull} frustumCulled={false} />
      <mesh geometry={edges} material={materials.edges} renderOrder={2} frustumCulled={false} />
      {chosen && <mesh geometry={edges} material={materials.outline} renderOrder={3} frustumCulled={false} />}
    </>
  );
}
