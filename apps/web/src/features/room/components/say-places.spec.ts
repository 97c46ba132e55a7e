import { addPiece, emptySetDocument } from '@settlewright/geometry';
import { expect, it } from 'vitest';
import { sayPlaces } from './say-places.ts';

it('says how somebody sits in the units of the reader', () => {
  const { document, pieceId } = addPiece(emptySetDocument(), 'bench');
  const body = {
    pieceId,
    placeId: `${pieceId}:1`,
    name: 'Ottilie Brandt',
    pose: { notes: [{ kind: 'feet-hang', valueMm: 38.1 } as const, { kind: 'hands-on-lap' } as const] },
  };
  expect(sayPlaces(document, [body], { system: 'feet-inches', roundTo: 8 }, 'full')).toBe(
    'Ottilie Brandt sits on B1, place 1: feet hang 1½″, hands on the lap.',
  );
  expect(sayPlaces(document, [body], { system: 'millimetres', roundTo: 8 }, 'full')).toContain(
    'feet hang 38\u202fmm',
  );
  expect(sayPlaces(document, [], { system: 'millimetres', roundTo: 8 }, 'full')).toBe('Nobody is seated.');
  const rough = sayPlaces(document, [body], { system: 'feet-inches', roundTo: 8 }, 'verdicts');
  expect(rough).toMatch(/^Ottilie Brandt sits on B1, place 1\. Bodies are drawn in round sizes/);
  expect(rough).not.toMatch(/hang|lap|″/);
});
