import type { Part } from '@settlewright/geometry';
import { useEffect, useLayoutEffect, useState } from 'react';
import {
  BufferAttribute,
  BufferGeometry,
  DynamicDrawUsage,
  Sphere,
  Vector3,
  type InterleavedBuffer,
} from 'three';
import { emptyLines, setLines } from './ink-lines';
import type { SeatPrint } from './seat-print';
import type { SceneMaterials } from './shaders';
import { createSink, listsOf, type SolidSink } from './solid-arrays';
import { addParts } from './solids';
import type { SceneView } from './views';

/** Says that of memory the card knows the first `length` numbers are written anew. */
function renew(held: BufferAttribute | InterleavedBuffer, length: number) {
  held.clearUpdateRanges();
  held.addUpdateRange(0, length);
  held.needsUpdate = true;
}

const dynamic = (memory: Float32Array | Uint32Array, size: number) =>
  new BufferAttribute(memory, size).setUsage(DynamicDrawUsage);

/** Behind what is drawn stand numbers of former frames: nothing may be reckoned from all of them. */
function boundless(): BufferGeometry {
  const geometry = new BufferGeometry();
  geometry.boundingSphere = new Sphere(new Vector3(), Infinity);
  return geometry;
}

/** Points of a surface, the triangles on them and the edges, all drawn from the memory that solids are written into. */
function createHeld() {
  const sink = createSink();
  const [surface, rounds, edges] = [boundless(), boundless(), emptyLines()];
  const dispose = () => [surface, rounds, edges].forEach((geometry) => geometry.dispose());
  let memories: unknown[] = [];
  let renewals: (() => void)[] = [];

  /** Where memory was outgrown, what the card holds goes with the geometries; it is made again in the next frame. */
  function takeMemory() {
    const now = listsOf(sink).map(({ memory }) => memory);
    if (memories.length > 0 && now.every((memory, n) => memory === memories[n])) return;
    memories = now;
    dispose();
    const point = (name: string, list: Exclude<keyof SolidSink, 'edges' | 'edgeWeights'>, size: number) => {
      const held = dynamic(sink[list].memory, size);
      surface.setAttribute(name, held);
      return () => renew(held, sink[list].length);
    };
    const index = (geometry: BufferGeometry, list: 'indices' | 'roundIndices') => {
      const held = dynamic(sink[list].memory, 1);
      geometry.setIndex(held);
      return () => {
        renew(held, sink[list].length);
        geometry.setDrawRange(0, sink[list].length);
      };
    };
    const lines = setLines(edges, sink.edges.memory, sink.edgeWeights.memory);
    lines.ends.setUsage(DynamicDrawUsage);
    lines.weights.setUsage(DynamicDrawUsage);
    renewals = [
      point('position', 'positions', 3),
      point('normal', 'normals', 3),
      point('tone', 'materials', 1),
      point('grain', 'grains', 4),
      index(surface, 'indices'),
      index(rounds, 'roundIndices'),
      () => {
        renew(lines.ends, sink.edges.length);
        renew(lines.weights, sink.edgeWeights.length);
        edges.instanceCount = sink.edgeWeights.length;
      },
    ];
    for (const name of ['position', 'normal']) rounds.setAttribute(name, surface.getAttribute(name));
  }

  return {
    surface,
    rounds,
    edges,
    dispose,
    write: (pieces: Props['pieces'], printsOn: Props['printsOn']) => {
      for (const list of listsOf(sink)) list.clear();
      for (const parts of pieces) addParts(sink, parts, printsOn);
      takeMemory();
      for (const renewal of renewals) renewal();
    },
  };
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
  const [held] = useState(createHeld);
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
