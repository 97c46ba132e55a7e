import { Unreachable } from '@/lib/problem';
import type { Autosave, AutosaveState } from './autosave';

/** Why a paper of the draft cannot be made now. */
export class DraftNotSaved extends Error {
  override readonly name = 'DraftNotSaved';
}

/** Saves what waits on this device and answers the number of the draft that then holds it all. */
export async function savedDraft({ state, flush }: Pick<Autosave, 'state' | 'flush'>): Promise<number> {
  await flush();
  const { save, base } = await atRest(state);
  switch (save.kind) {
    case 'saved':
      return base.number;
    case 'kept':
      throw new Unreachable();
    case 'refused':
      throw new DraftNotSaved(`The draft was not taken: ${save.message}`);
    default:
      throw new DraftNotSaved('Somebody else changed the draft meanwhile. Settle that first.');
  }
}

const isMoving = ({ save }: AutosaveState): boolean => save.kind === 'waiting' || save.kind === 'saving';

function atRest(state: Autosave['state']): Promise<AutosaveState> {
  return new Promise((resolve) => {
    if (!isMoving(state.getState())) {
      resolve(state.getState());
      return;
    }
    const stop = state.subscribe((now) => {
      if (isMoving(now)) return;
      stop();
      resolve(now);
    });
  });
}
