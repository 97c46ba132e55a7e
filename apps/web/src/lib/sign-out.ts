import { api } from './api-client.ts';
import { queryClient } from './query-client.ts';
import { setSavedState } from './saved-state.ts';
import { dropSession } from './session.ts';
import { wipeUnsentWork } from './unsent-work.ts';

/** Ends the session and leaves nothing of this person on the device. */
export async function signOut(everywhere = false): Promise<void> {
  try {
    await api.post(everywhere ? '/auth/sign-out-everywhere' : '/auth/sign-out');
  } catch (error) {
    // Without the server the device is still wiped; everywhere else needs the server's word.
    if (everywhere) throw error;
  }
  await wipeUnsentWork();
  setSavedState({ kind: 'nothing' });
  dropSession();
  queryClient.clear();
}
