import type { Part } from '@settlewright/geometry';
import {
  BufferAttribute,
  BufferGeometry,
  DynamicDrawUsage,
  Sphere,
  Vector3,
  type InterleavedBuffer,
} from 'three';
import { emptyLines, setLines } from './ink-lines.ts';
import type { SeatPrint } from './seat-print.ts';
import { createSink, listsOf, type SolidSink } from './solid-arrays.ts';
import { addParts } from './solids.ts';

export type PrintsOn = (pieceId: string) => readonly SeatPrint[];

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
export function createHeldSolids() {
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
    write: (pieces: readonly (readonly Part[])[], printsOn: PrintsOn) => {
      for (const list of listsOf(sink)) list.clear();
      for (const parts of pieces) addParts(sink, parts, printsOn);
      takeMemory();
      for (const renewal of renewals) renewal();
    },
  };
}
