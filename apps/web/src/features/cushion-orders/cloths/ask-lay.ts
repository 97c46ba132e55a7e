import type { ClothOfOrder, LaidCloth } from '@settlewright/geometry';
import { createAsker } from '@/lib/ask-worker.ts';
import type { NumberedCloth } from './lay-cloth.worker.ts';

const ask = createAsker(
  () => new Worker(new URL('./lay-cloth.worker.ts', import.meta.url), { type: 'module', name: 'lay-cloth' }),
  'The worker stopped.',
);

/** Has a worker lay the panels of a cloth; null where it cannot be laid. */
export const askLay = (cloth: ClothOfOrder): Promise<LaidCloth | null> =>
  ask((id): NumberedCloth => ({ id, cloth }));
