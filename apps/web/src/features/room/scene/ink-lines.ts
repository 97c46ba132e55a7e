import {
  BufferAttribute,
  InstancedBufferAttribute,
  InstancedBufferGeometry,
  InstancedInterleavedBuffer,
  InterleavedBufferAttribute,
  Sphere,
  Vector3,
} from 'three';

/** Sets what the lines of a geometry are drawn from: ends of edges, six numbers a segment, and their weights. */
export function setLines(
  geometry: InstancedBufferGeometry,
  edges: Float32Array,
  weights: Float32Array,
): { ends: InstancedInterleavedBuffer; weights: InstancedBufferAttribute } {
  const ends = new InstancedInterleavedBuffer(edges, 6);
  const strengths = new InstancedBufferAttribute(weights, 1);
  geometry.setAttribute('lineStart', new InterleavedBufferAttribute(ends, 3, 0));
  geometry.setAttribute('lineEnd', new InterleavedBufferAttribute(ends, 3, 3));
  geometry.setAttribute('lineWeight', strengths);
  return { ends, weights: strengths };
}

/** Straight edges of constant width on the screen, none yet: two triangles a segment, drawn in one call. */
export function emptyLines(): InstancedBufferGeometry {
  const geometry = new InstancedBufferGeometry();
  const corners = new Float32Array([-1, 0, 0, 1, 0, 0, 1, 1, 0, -1, 1, 0]);
  geometry.setAttribute('position', new BufferAttribute(corners, 3));
  geometry.setIndex([0, 1, 2, 0, 2, 3]);
  geometry.instanceCount = 0;
  // The corners say nothing about where the lines are; culling is left to the card.
  geometry.boundingSphere = new Sphere(new Vector3(), Infinity);
  return geometry;
}

export function linesOf(edges: Float32Array, weights: Float32Array): InstancedBufferGeometry {
  const geometry = emptyLines();
  setLines(geometry, edges, weights);
  geometry.instanceCount = weights.length;
  return geometry;
}
