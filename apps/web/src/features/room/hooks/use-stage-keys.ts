import type { Piece } from '@settlewright/geometry';
import type { KeyboardEvent } from 'react';
import type { Clipboard } from '../clipboard/use-clipboard.ts';
import { useSurroundings } from '../room-context.tsx';
import type { RoomAddress } from './use-address.ts';
import type { Choosing } from './use-choosing.ts';
import type { GroupActions } from './use-group-actions.ts';
import type { PieceActions } from './use-piece-actions.ts';
import type { SceneHand } from './use-scene-hand.ts';

const SHIFT_STEPS = 8;
const TURN_DEG = 15;

/** Keys of the drawing itself: letting go, choosing all, moving, turning and removing what is chosen. */
export function useStageKeys(options: {
  piece: Piece | undefined;
  address: RoomAddress;
  hand: SceneHand;
  actions: PieceActions;
  choosing: Choosing | undefined;
  /** What is done to several; left out while at most one is chosen. */
  group: { choosing: Choosing; actions: GroupActions } | undefined;
  clipboard: Clipboard | undefined;
}) {
  const { piece, address, hand, actions, choosing, group, clipboard } = options;
  const { canEdit } = useSurroundings();

  return (event: KeyboardEvent<HTMLElement>) => {
    if (event.target !== event.currentTarget) return;
    if (event.key === 'Escape') {
      hand.cancel();
      if (!hand.isDragging()) address.select(undefined);
      return;
    }
    if (event.key === 'a' && (event.ctrlKey || event.metaKey) && choosing) {
      choosing.chooseAll();
      event.preventDefault();
      return;
    }
    if ((event.ctrlKey || event.metaKey) && choosing && clipboard) {
      const chosen = group ? group.choosing.pieces : piece ? [piece] : [];
      // Words that are marked on the page are copied as words.
      if (event.key === 'c' && chosen.length > 0 && getSelection()?.isCollapsed !== false)
        clipboard.copy(chosen);
      else if (event.key === 'v') clipboard.paste();
      else return;
      event.preventDefault();
      return;
    }
    if (event.ctrlKey || event.metaKey || !piece || !canEdit) return;
    const size = event.shiftKey ? SHIFT_STEPS : 1;
    const moves: Record<string, [number, number]> = {
      ArrowLeft: [-size, 0],
      ArrowRight: [size, 0],
      ArrowUp: [0, -size],
      ArrowDown: [0, size],
    };
    const move = moves[event.key];
    if (group) {
      const { pieces } = group.choosing;
      if (move) group.actions.nudge(pieces, ...move);
      else if (event.key === ',') group.actions.turn(pieces, TURN_DEG);
      else if (event.key === '.') group.actions.turn(pieces, -TURN_DEG);
      else if (event.key === 'Delete' || event.key === 'Backspace') group.actions.remove(pieces);
      else return;
    } else if (move) actions.nudge(piece, ...move);
    else if (event.key === ',') actions.turn(piece, TURN_DEG);
    else if (event.key === '.') actions.turn(piece, -TURN_DEG);
    else if (event.key === 'Delete' || event.key === 'Backspace') actions.remove(piece);
    else return;
    event.preventDefault();
  };
}
