import {
  chooseCushion,
  type CushionChange,
  type CushionChoice,
  type CushionSpec,
  type PieceOf,
  refastenDimensions,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { toast } from 'sonner';
import type { PieceActions } from '../hooks/use-piece-actions.ts';
import { useRoomStore } from '../store.ts';

export type CushionedPiece = PieceOf<'bench'> | PieceOf<'loose-seat'>;

/** What a part of the form needs of the cushion it speaks of. */
export interface Making {
  piece: CushionedPiece;
  spec: CushionSpec;
  choice: CushionChoice;
  canEdit: boolean;
  /** One undoable step, by name. */
  choose: (change: CushionChange, words: string) => void;
  /** The same for the piece itself. */
  changePiece: (change: (piece: CushionedPiece) => CushionedPiece, words: string) => void;
}

interface Asked {
  piece: CushionedPiece;
  spec: CushionSpec | undefined;
  choice: CushionChoice;
  canEdit: boolean;
  actions: PieceActions;
}

export function useMaking({ piece, spec, choice, canEdit, actions }: Asked): Making | undefined {
  const store = useRoomStore();
  return useMemo(() => {
    if (!spec) return undefined;
    const now = () => store.getState().document;
    const mayChange = (): boolean => {
      const { locked } = now().pieces.find(({ id }) => id === piece.id) ?? { locked: false };
      if (locked) toast(`${piece.mark} is locked; unlock it to change it.`);
      return !locked;
    };
    return {
      piece,
      spec,
      choice,
      canEdit,
      choose: (change, words) => {
        if (!mayChange()) return;
        const chosen = chooseCushion(now(), spec.key, change);
        actions.replace(refastenDimensions(now(), chosen), `${spec.mark} ${words}`);
      },
      changePiece: (change, words) => {
        if (!mayChange()) return;
        const pieces = now().pieces.map((one) =>
          one.id === piece.id && (one.kind === 'bench' || one.kind === 'loose-seat') ? change(one) : one,
        );
        actions.replace({ ...now(), pieces }, `${piece.mark} ${words}`);
      },
    };
  }, [store, piece, spec, choice, canEdit, actions]);
}
