import { useEffect, useMemo } from 'react';
import type { BufferGeometry } from 'three';
import type { RoomPicture } from '../picture';
import { linesOf } from './ink-lines';
import type { SceneMaterials } from './shaders';
import { printsByPiece } from './seat-print';
import { mergeParts, surfaceOf } from './solids';
import { visibleParts } from './visible-parts';
import type { SceneView } from './views';

/** Frees what a memo made when it is made again. */
export function useDispose(geometries: Record<string, BufferGeometry>) {
  useEffect(() => () => Object.values(geometries).forEach((geometry) => geometry.dispose()), [geometries]);
}

interface Props {
  picture: RoomPicture;
  letter: SceneView;
  chosenIds: readonly string[];
  /** Cushions are pressed in by bodies that are shown. */
  showBodies: boolean;
  materials: SceneMaterials;
}

/** All pieces in a handful of draw calls; the chosen ones are drawn apart for their outline. */
export function PieceSolids({ picture, letter, chosenIds, showBodies, materials }: Props) {
  const made = useMemo(() => {
    const parts = visibleParts(picture.document, picture.parts, letter);
    const printsOn = printsByPiece(showBodies ? picture.bodies : []);
    const others = mergeParts(
      parts.filter((part) => !chosenIds.includes(part.pieceId)),
      printsOn,
    );
    const chosen = mergeParts(
      parts.filter((part) => chosenIds.includes(part.pieceId)),
      printsOn,
    );
    return {
      others: surfaceOf(others.positions, others.normals, others.materials),
      chosen: surfaceOf(chosen.positions, chosen.normals, chosen.materials),
      edges: linesOf([...others.edges, ...chosen.edges], [...others.edgeWeights, ...chosen.edgeWeights]),
      outline: linesOf(
        chosen.edges,
        chosen.edgeWeights.map(() => 1),
      ),
      rounds: surfaceOf(
        [...others.roundPositions, ...chosen.roundPositions],
        [...others.roundNormals, ...chosen.roundNormals],
      ),
    };
  }, [picture, letter, chosenIds, showBodies]);
  useDispose(made);

  return (
    <>
      {letter !== 'C' && (
        <>
          <mesh geometry={made.others} material={materials.shadow} renderOrder={-1} frustumCulled={false} />
          <mesh geometry={made.chosen} material={materials.shadow} renderOrder={-1} frustumCulled={false} />
        </>
      )}
      <mesh geometry={made.others} material={materials.surface} frustumCulled={false} />
      <mesh geometry={made.chosen} material={materials.chosenSurface} frustumCulled={false} />
      <mesh geometry={made.rounds} material={materials.hull} frustumCulled={false} />
      <mesh geometry={made.edges} material={materials.edges} renderOrder={2} frustumCulled={false} />
      <mesh geometry={made.outline} material={materials.outline} renderOrder={3} frustumCulled={false} />
    </>
  );
}
