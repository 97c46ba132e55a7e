import { BufferAttribute, InstancedBufferAttribute, InstancedBufferGeometry, Sphere, Vector3 } from 'three';

/** Straight edges of constant width on the screen: two triangles a segment, drawn in one call. */
export function linesOf(edges: ArrayLike<number>, weights: ArrayLike<number>): InstancedBufferGeometry {
  const geometry = new InstancedBufferGeometry();
  const corners = new Float32Array([-1, 0, 0, 1, 0, 0, 1, 1, 0, -1, 1, 0]);
  geometry.setAttribute('position', new BufferAttribute(corners, 3));
  geometry.setIndex([0, 1, 2, 0, 2, 3]);
  const count = weights.length;
  const [starts, ends] = [new Float32Array(count * 3), new Float32Array(count * 3)];
  for (let n = 0; n < count; n++) {
    for (let axis = 0; axis < 3; axis++) {
      starts[n * 3 + axis] = edges[n * 6 + axis] ?? 0;
      ends[n * 3 + axis] = edges[n * 6 + 3 + axis] ?? 0;
    }
  }
  geometry.setAttribute('lineStart', new InstancedBufferAttribute(starts, 3));
  geometry.setAttribute('lineEnd', new InstancedBufferAttribute(ends, 3));
  geometry.setAttribute('lineWeight', new InstancedBufferAttribute(new Float32Array(weights), 1));
  geometry.instanceCount = count;
  // The corners say nothing about where the lines are; culling is left to the card.
  geometry.boundingSphere = new Sphere(new Vector3(), Infinity);
  return geometry;
}
