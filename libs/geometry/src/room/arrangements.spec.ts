import { describe, expect, it } from 'vitest';
import { overlapDepth } from '../../test/convex-overlap.ts';
import { deriveParts } from '../pieces/kinds.ts';
import { ARRANGEMENTS } from './arrangements.ts';

describe('arrangements', () => {
  it.each(ARRANGEMENTS.map((one) => [one.id, one] as const))(
    '%s: pieces do not reach into each other',
    (_, { build }) => {
      const parts = deriveParts(build());
      parts.forEach((one, i) => {
        for (const other of parts.slice(i + 1)) {
          if (one.pieceId === other.pieceId) continue;
          const depth = overlapDepth(one, other);
          if (depth > 0.01) throw new Error(`${one.id} and ${other.id} share ${depth} mm`);
        }
      });
      expect(parts.length).toBe(new Set(parts.map(({ id }) => id)).size);
    },
    30_000,
  );
});
