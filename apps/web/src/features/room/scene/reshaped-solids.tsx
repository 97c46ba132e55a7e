import type { Part } from '@settlewright/geometry';
import { useEffect, useLayoutEffect, useMemo, useState } from 'react';
import { BufferAttribute, BufferGeometry, DynamicDrawUsage, Sphere, Vector3 } from 'three';
import { Floats } from './floats';
import { linesOf } from './ink-lines';
import { useDispose } from './use-dispose';
import type { SeatPrint } from './seat-print';
import type { SceneMaterials } from './shaders';
import { eachSolidList, SOLID_LISTS } from './solid-arrays';
import { addParts } from './solids';
import type { SceneView } from './views';

/** Hands numbers that are written anew to the card; takes other memory only where they have outgrown it. */
function write(geometry: BufferGeometry, name: string, { memory, length }: Floats, size: number) {
  let held = geometry.getAttribute(name) as BufferAttribute | undefined;
  if (held?.array !== memory) {
    // What the card holds under the old memory goes with the geometry; it is made again in the next frame.
    geometry.dispose();
    held = new BufferAttribute(memory, size).setUsage(DynamicDrawUsage);
    geometry.setAttribute(name, held);
  }
  held.clearUpdateRanges();
  held.addUpdateRange(0, length);
  held.needsUpdate = true;
}

/** Behind what is drawn stand numbers of former frames: nothing may be reckoned from all of them. */
function boundless(): BufferGeometry {
  const geometry = new BufferGeometry();
  geometry.boundingSphere = new Sphere(new Vector3(), Infinity);
  return geometry;
}

interface Props {
  pieces: readonly (readonly Part[])[];
  printsOn: (pieceId: string) => readonly SeatPrint[];
  letter: SceneView;
  chosen: boolean;
  materials: SceneMaterials;
}

/** Pieces that change their shape in each frame: written into the same memory again and again. */
export function ReshapedSolids({ pieces, printsOn, letter, chosen, materials }: Props) {
  const [held] = useState(() => ({
    lists: eachSolidList(() => new Floats()),
    surface: boundless(),
    rounds: boundless(),
  }));
  const { lists, surface, rounds } = held;
  const lines = useMemo(() => {
    for (const list of SOLID_LISTS) lists[list].clear();
    for (const parts of pieces) addParts(lists, parts, printsOn);
    const edges = lists.edges.slice(0);
    return {
      edges: linesOf(edges, lists.edgeWeights.slice(0)),
      ...(chosen && { outline: linesOf(edges, new Float32Array(lists.edgeWeights.length).fill(1)) }),
    };
  }, [lists, pieces, printsOn, chosen]);
  useDispose(lines);
  useLayoutEffect(() => {
    write(surface, 'position', lists.positions, 3);
    write(surface, 'normal', lists.normals, 3);
    write(surface, 'tone', lists.materials, 1);
    write(surface, 'grain', lists.grains, 4);
    surface.setDrawRange(0, lists.materials.length);
    write(rounds, 'position', lists.roundPositions, 3);
    write(rounds, 'normal', lists.roundNormals, 3);
    rounds.setDrawRange(0, lists.roundPositions.length / 3);
  });
  useEffect(
    () => () => {
      surface.dispose();
      rounds.dispose();
    },
    [surface, rounds],
  );
  const look = chosen ? materials.chosenSurface : materials.surface;
  return (
    <>
      {letter !== 'C' && (
        <mesh geometry={surface} material={materials.shadow} renderOrder={-1} frustumCulled={false} />
      )}
      <mesh geometry={surface} material={look} frustumCulled={false} />
      <mesh geometry={rounds} material={materials.hull} frustumCulled={false} />
      <mesh geometry={lines.edges} material={materials.edges} renderOrder={2} frustumCulled={false} />
      {lines.outline && (
        <mesh geometry={lines.outline} material={materials.outline} renderOrder={3} frustumCulled={false} />
      )}
    </>
  );
}
