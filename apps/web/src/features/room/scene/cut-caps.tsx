import { roomCutFaces, type RoomCutFace, type Vec3 } from '@settlewright/geometry';
import { useMemo } from 'react';
import { ShapeUtils, Vector2 } from 'three';
import type { RoomPicture } from '../picture';
import { linesOf } from './ink-lines';
import { useDispose } from './use-dispose';
import type { SceneMaterials } from './shaders';
import { MATERIALS, surfaceOf } from './solids';
import { add, cross, dot, scale } from './vectors';
import type { Cut, SceneView } from './views';
import { visibleParts } from './visible-parts';

/** So far behind the plane, or the cut would take the faces too. */
const BEHIND_MM = 0.5;

function filled(faces: readonly RoomCutFace[], { toward }: Cut) {
  const side: Vec3 = Math.abs(toward[1]) > 0.9 ? [1, 0, 0] : [0, 1, 0];
  const other = cross(toward, side);
  const out = {
    positions: [] as number[],
    normals: [] as number[],
    tones: [] as number[],
    edges: [] as number[],
  };
  for (const { part, corners } of faces) {
    const placed = corners.map((corner) => add(corner, scale(toward, -BEHIND_MM)));
    const flat = placed.map((corner) => new Vector2(dot(corner, side), dot(corner, other)));
    for (const triangle of ShapeUtils.triangulateShape(flat, [])) {
      for (const n of triangle) {
        out.positions.push(...(placed[n] ?? toward));
        // Lit as from above, whichever way it faces: a cut reads paler than what it cuts.
        out.normals.push(0, 1, 0);
        out.tones.push(MATERIALS.indexOf(part.material));
      }
    }
    placed.forEach((corner, n) => out.edges.push(...corner, ...(placed[(n + 1) % placed.length] ?? corner)));
  }
  return out;
}

interface Props {
  picture: RoomPicture;
  letter: SceneView;
  cut: Cut;
  materials: SceneMaterials;
}

/** What the section cuts through, filled and edged with heavy ink. */
export function CutCaps({ picture, letter, cut, materials }: Props) {
  const made = useMemo(() => {
    const parts = visibleParts(picture.document, picture.parts, letter);
    const { positions, normals, tones, edges } = filled(roomCutFaces(parts, cut.pointMm, cut.toward), cut);
    return {
      faces: surfaceOf({
        positions: new Float32Array(positions),
        normals: new Float32Array(normals),
        materials: new Float32Array(tones),
        grains: new Float32Array(tones.length * 4),
      }),
      edges: linesOf(new Float32Array(edges), new Float32Array(edges.length / 6).fill(1)),
    };
  }, [picture, letter, cut]);
  useDispose(made);
  return (
    <>
      <mesh geometry={made.faces} material={materials.surface} frustumCulled={false} />
      <mesh geometry={made.edges} material={materials.cutEdges} renderOrder={3} frustumCulled={false} />
    </>
  );
}
