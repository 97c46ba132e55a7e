import { ARRANGEMENTS, deriveParts } from '@settlewright/geometry';
import { describe, expect, it, vi } from 'vitest';
import { createHeldSolids } from './held-solids.ts';
import { mergeParts } from './solids.ts';

const parts = deriveParts(ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build());
const [bench, table] = ['b1', 't1'].map((id) => parts.filter(({ pieceId }) => pieceId === id));
const nobody = () => [];
/** So many that the first memory does not hold them. */
const many = Array.from({ length: 12 }, () => bench!);

describe('solids that are written into the same memory again', () => {
  it('are drawn as far as they were written last', () => {
    const held = createHeldSolids();
    held.write([bench!, table!], nobody);
    held.write([table!], nobody);
    const alone = mergeParts(table!);
    expect(held.surface.drawRange.count).toBe(alone.indices.length);
    expect(held.rounds.drawRange.count).toBe(alone.roundIndices.length);
    expect(held.edges.instanceCount).toBe(alone.edgeWeights.length);
    const drawn = [...held.surface.index!.array.slice(0, alone.indices.length)];
    expect(drawn).toEqual([...alone.indices]);
    expect([...held.surface.getAttribute('position').array.slice(0, alone.positions.length)]).toEqual([
      ...alone.positions,
    ]);
  });

  it('keep what the card holds while there is room, and give it back where memory is outgrown', () => {
    const held = createHeldSolids();
    held.write([table!], nobody);
    const before = held.surface.getAttribute('position');
    const freed = vi.fn<() => void>();
    for (const geometry of [held.surface, held.rounds, held.edges]) {
      geometry.addEventListener('dispose', freed);
    }
    held.write([table!], nobody);
    expect(held.surface.getAttribute('position')).toBe(before);
    expect(freed).not.toHaveBeenCalled();
    held.write(many, nobody);
    expect(freed).toHaveBeenCalledTimes(3);
    const after = held.surface.getAttribute('position');
    expect(after).not.toBe(before);
    expect(held.rounds.getAttribute('position')).toBe(after);
    expect(after.array.length).toBeGreaterThanOrEqual(many.length * mergeParts(bench!).positions.length);
  });

  it('send to the card what was written, and no more', () => {
    const held = createHeldSolids();
    held.write([bench!, table!], nobody);
    held.write([table!], nobody);
    const { normals } = mergeParts(table!);
    const attribute = held.surface.getAttribute('normal');
    expect('updateRanges' in attribute && attribute.updateRanges).toEqual([
      { start: 0, count: normals.length },
    ]);
  });
});
