import { create } from 'zustand';

interface Connection {
  /** False from the first request that got no answer until one does. */
  reachable: boolean;
}

/** Whether the server answers; the bar under the title block follows it. */
export const useConnection = create<Connection>(() => ({ reachable: true }));

export function noteReachable(reachable: boolean): void {
  if (useConnection.getState().reachable !== reachable) useConnection.setState({ reachable });
}
