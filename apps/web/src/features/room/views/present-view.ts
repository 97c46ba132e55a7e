import type { NamedView } from '@settlewright/geometry';

/** How the room is seen now, ready to get a name. */
export type PresentView = Omit<NamedView, 'id'>;
type Reader = () => PresentView;

let reader: Reader | null = null;

/** Called by the drawing while it is on the screen; the answer takes the offer back. */
export function offerPresentView(next: Reader): () => void {
  reader = next;
  return () => {
    if (reader === next) reader = null;
  };
}

/** What stands on the screen; nothing while no set is drawn. */
export const presentView = (): PresentView | null => reader?.() ?? null;
