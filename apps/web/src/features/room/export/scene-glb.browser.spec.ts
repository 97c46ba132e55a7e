import { ARRANGEMENTS, deriveParts, MM_PER_INCH } from '@settlewright/geometry';
import { validateBytes } from 'gltf-validator';
import { Vector3 } from 'three';
import { describe, expect, it } from 'vitest';
import { MATERIALS } from '../scene/solids.ts';
import { glbOf } from './scene-glb.ts';

const tones = MATERIALS.flatMap(() => [0.9, 0.6, 0.3].map((n) => new Vector3(n, n, n)));

interface Gltf {
  nodes: { name?: string }[];
  accessors: { min?: number[]; max?: number[]; type: string }[];
}

/** The JSON part of a binary glTF: after the header of 12 bytes, a length, a type and the text. */
function jsonOf(glb: ArrayBuffer): Gltf {
  const length = new DataView(glb).getUint32(12, true);
  return JSON.parse(new TextDecoder().decode(new Uint8Array(glb, 20, length))) as Gltf;
}

describe('glTF model of a set', () => {
  it.each(ARRANGEMENTS.filter(({ id }) => id !== 'empty').map(({ id }) => id))(
    'of %s has no error and no warning by the validator of the format',
    async (id) => {
      const document = ARRANGEMENTS.find((one) => one.id === id)!.build();
      const glb = await glbOf(document, deriveParts(document), tones, 'A set');
      const { issues } = await validateBytes(new Uint8Array(glb));
      expect(issues.messages.filter(({ severity }) => severity < 2)).toEqual([]);
      const { nodes } = jsonOf(glb);
      for (const { mark } of document.pieces) expect(nodes.some(({ name }) => name === mark)).toBe(true);
    },
  );

  it('leaves out what is hidden', async () => {
    const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
    const pieces = document.pieces.map((piece) => ({ ...piece, hidden: piece.mark === 'T1' }));
    const glb = await glbOf({ ...document, pieces }, deriveParts(document), tones, 'A set');
    const names = jsonOf(glb).nodes.map(({ name }) => name);
    expect(names).toContain('B1');
    expect(names).not.toContain('T1');
  });

  it('is in metres: a table of 29″ ends 0.7366 m over the floor', async () => {
    const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
    const pieces = document.pieces.filter(({ kind }) => kind === 'table');
    const glb = await glbOf({ ...document, pieces }, deriveParts({ ...document, pieces }), tones, 'A table');
    const tops = jsonOf(glb).accessors.flatMap(({ min, max }) => (min?.[1] === 0 && max ? [max[1]] : []));
    const heights = jsonOf(glb).accessors.flatMap(({ max }) => (max ? [max[1] ?? 0] : []));
    expect(tops.length).toBeGreaterThan(0);
    expect(heights.some((metres) => Math.abs(metres - (29 * MM_PER_INCH) / 1000) < 1e-5)).toBe(true);
  });
});
