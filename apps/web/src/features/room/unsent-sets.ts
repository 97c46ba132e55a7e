import { useEffect } from 'react';
import { registerUnsentWork } from '@/lib/unsent-work.ts';
import { wipeClip } from './clipboard/clip.ts';
import { countUnsent, wipeUnsent } from './save/outbox.ts';

/** Signing out asks about every set of this person whose changes only this device has. */
export function useUnsentSets(userId: string): void {
  useEffect(
    () =>
      registerUnsentWork({
        pending: async () => (await countUnsent(userId)) > 0,
        describe: async () => {
          const sets = await countUnsent(userId);
          return sets === 1 ? 'changes to one set' : `changes to ${sets} sets`;
        },
        wipe: () => {
          wipeClip();
          return wipeUnsent(userId);
        },
      }),
    [userId],
  );
}
