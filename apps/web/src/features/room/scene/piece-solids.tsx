import { derivePieceParts, type Piece } from '@settlewright/geometry';
import { memo, useMemo } from 'react';
import type { Carried, DrawnPicture } from '../drawn-picture';
import { linesOf } from './ink-lines';
import { joinSolids, solidsOf } from './packed-solids';
import { ReshapedSolids } from './reshaped-solids';
import { printsByPiece } from './seat-print';
import type { SceneMaterials } from './shaders';
import type { PackedSolids } from './solid-arrays';
import { someOf, surfaceOf } from './solids';
import { useDispose } from './use-dispose';
import { visiblePieces } from './visible-parts';
import type { SceneView } from './views';

/** Where a group of the scene is set down when it is carried. */
export const setDown = (carried: Carried | undefined) => ({
  position: [carried?.xMm ?? 0, 0, carried?.zMm ?? 0] as const,
  'rotation-y': carried?.turnRad ?? 0,
});

interface SolidsProps {
  pieces: readonly PackedSolids[];
  letter: SceneView;
  chosen: boolean;
  materials: SceneMaterials;
}

/** Several pieces in a handful of draw calls; made again only when one of them is another. */
const Solids = memo(
  function Solids({ pieces, letter, chosen, materials }: SolidsProps) {
    const made = useMemo(() => {
      const all = joinSolids(pieces);
      const surface = surfaceOf(all);
      return {
        surface,
        edges: linesOf(all.edges, all.edgeWeights),
        ...(all.roundIndices.length > 0 && { rounds: someOf(surface, all.roundIndices) }),
      };
    }, [pieces]);
    useDispose(made);
    const { surface, edges, rounds } = made;
    const look = chosen ? materials.chosenSurface : materials.surface;
    return (
      <>
        {letter !== 'C' && (
          <mesh geometry={surface} material={materials.shadow} renderOrder={-1} frustumCulled={false} />
        )}
        <mesh geometry={surface} material={look} frustumCulled={false} />
        {rounds && <mesh geometry={rounds} material={materials.hull} frustumCulled={false} />}
        <mesh geometry={edges} material={materials.edges} renderOrder={2} frustumCulled={false} />
        {chosen && (
          <mesh geometry={edges} material={materials.outline} renderOrder={3} frustumCulled={false} />
        )}
      </>
    );
  },
  (a, b) =>
    a.letter === b.letter &&
    a.materials === b.materials &&
    a.chosen === b.chosen &&
    a.pieces.length === b.pieces.length &&
    a.pieces.every((piece, n) => piece === b.pieces[n]),
);

interface Props {
  picture: DrawnPicture;
  letter: SceneView;
  chosenIds: readonly string[];
  /** Cushions are pressed in by bodies that are shown. */
  showBodies: boolean;
  materials: SceneMaterials;
}

/** All pieces; the chosen ones are drawn apart, for their outline and as they change most. */
export function PieceSolids({ picture, letter, chosenIds, showBodies, materials }: Props) {
  const { document, carried, reshaped } = picture;
  const visible = visiblePieces(document, letter);
  const printsOn = printsByPiece(showBodies ? picture.bodies : []);
  const drawn = (piece: Piece) => solidsOf(derivePieceParts(piece, document), printsOn(piece.id));
  return [false, true].flatMap((chosen) => {
    const all = visible.filter(({ id }) => chosenIds.includes(id) === chosen);
    const still = all.filter(({ id }) => !carried?.before.has(id) && !reshaped?.has(id)).map(drawn);
    // Carried pieces are the solids of before, set down elsewhere.
    const along = all.flatMap(({ id }) => carried?.before.get(id) ?? []).map(drawn);
    const anew = all.filter(({ id }) => reshaped?.has(id)).map((piece) => derivePieceParts(piece, document));
    const kept = [
      { pieces: still, by: undefined },
      { pieces: along, by: carried },
    ].filter(({ pieces }) => pieces.length > 0);
    const look = { letter, chosen, materials };
    return [
      ...kept.map(({ pieces, by }, n) => (
        <group key={`${chosen} ${n}`} {...setDown(by)}>
          <Solids pieces={pieces} {...look} />
        </group>
      )),
      anew.length > 0 && (
        <ReshapedSolids key={`${chosen} anew`} pieces={anew} printsOn={printsOn} {...look} />
      ),
    ];
  });
}
