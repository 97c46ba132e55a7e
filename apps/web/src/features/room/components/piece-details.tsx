import {
  formatLength,
  LEAF_WORDS,
  leavesOfTable,
  placeFrames,
  setParameter,
  snapToBoards,
  type LengthStyle,
  type Piece,
  type SetDocument,
} from '@settlewright/geometry';
import { lazy, Suspense, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Menu } from '@/components/menu.tsx';
import { CushionsButton } from '../cushions-make/cushions-button.tsx';
import type { PieceActions } from '../hooks/use-piece-actions.ts';
import { useSurroundings } from '../room-context.tsx';
import { sitterName } from '../sitters.ts';
import { openHandForm } from '../together/hand-form.ts';
import { PlacesDialog } from './places-dialog.tsx';
import { shortName } from '@/lib/short-name.ts';

const NumbersDialog = lazy(() => import('./numbers-dialog.tsx'));

interface Props {
  piece: Piece;
  document: SetDocument;
  actions: PieceActions;
  /** Chooses several pieces, the first of which stays; left out where nothing can be changed. */
  onChoose?: (pieceIds: readonly string[]) => void;
  onCopy?: (pieces: readonly Piece[]) => void;
}

/** What the row of the selected piece opens: who sits there, and what can be done. */
export function PieceDetails({ piece, document, actions, onChoose, onCopy }: Props) {
  const { cast, canEdit, style } = useSurroundings();
  const [open, setOpen] = useState<'numbers' | 'places' | null>(null);
  const frames = placeFrames(piece, document);
  const seated = document.seating
    .filter((seat) => seat.pieceId === piece.id)
    .sort((a, b) => a.place - b.place)
    .map((seat) => `${seat.place} ${shortName(sitterName(seat.sitter, cast))}`);
  return (
    <div className="text-xs leading-5 text-ink-2">
      {frames.length > 0 && (
        <p>
          {frames.length === 1 ? 'Place ' : 'Places '}
          {seated.length > 0 ? seated.join(', ') : 'all empty'}
          {canEdit && (
            <>
              {' '}
              <Button look="word" className="text-xs!" onClick={() => setOpen('places')}>
                Seat people
              </Button>
            </>
          )}
        </p>
      )}
      <p className="flex flex-wrap items-center gap-x-3">
        <Button look="word" className="text-xs!" onClick={() => setOpen('numbers')}>
          All numbers
        </Button>
        <CushionsButton piece={piece} actions={actions} />
        {canEdit && (
          <Menu
            name={`More of ${piece.mark}, menu`}
            button="More"
            buttonClassName="link reach min-h-6"
            entries={moreEntries({ piece, document, actions, onChoose, onCopy }, style)}
          />
        )}
      </p>
      {open === 'numbers' && (
        <Suspense fallback={null}>
          <NumbersDialog piece={piece} actions={actions} onClose={() => setOpen(null)} />
        </Suspense>
      )}
      <PlacesDialog
        piece={piece}
        document={document}
        actions={actions}
        open={open === 'places'}
        onClose={() => setOpen(null)}
      />
    </div>
  );
}

/** The nearest length of whole boards, for a piece that is built of them and is not that long already. */
function boardEntries(piece: Piece, document: SetDocument, actions: PieceActions, style: LengthStyle) {
  if (piece.kind !== 'bench' && piece.kind !== 'bulkhead') return [];
  const { lengthMm, boards } = snapToBoards(piece.lengthMm, piece.boards);
  if (Math.abs(lengthMm - piece.lengthMm) < 0.05) return [];
  const words = `${boards} boards long`;
  return [
    {
      id: 'boards',
      words: `Make it ${words}`,
      detail: formatLength(lengthMm, { ...style, feet: true }),
      disabled: piece.locked,
      onPress: () => {
        const changed = setParameter(document, piece.id, 'lengthMm', lengthMm);
        if (changed.ok) actions.replace(changed.value, `${piece.mark} ${words}`);
      },
    },
  ];
}

/** Lifts and drops the leaves of a table. */
function leafEntries(piece: Piece, document: SetDocument, actions: PieceActions) {
  if (piece.kind !== 'table') return [];
  return leavesOfTable(piece).map(({ edge, down }) => {
    const words = LEAF_WORDS[edge];
    return {
      id: `leaf-${edge}`,
      words: `${down ? 'Lift' : 'Drop'} the ${words}`,
      disabled: piece.locked,
      onPress: () => {
        const changed = setParameter(document, piece.id, `leaves.${edge}.state`, down ? 'up' : 'down');
        if (changed.ok)
          actions.replace(changed.value, `${piece.mark} ${words} ${down ? 'lifted' : 'dropped'}`);
      },
    };
  });
}

function moreEntries({ piece, document, actions, onChoose, onCopy }: Props, style: LengthStyle) {
  const like = document.pieces.filter((other) => other.kind === piece.kind).map((other) => other.id);
  const ids = [piece.id, ...like.filter((id) => id !== piece.id)];
  return [
    { id: 'copy', words: 'Copy', onPress: () => actions.duplicate(piece) },
    { id: 'left', words: 'Turn 15° left', disabled: piece.locked, onPress: () => actions.turn(piece, 15) },
    { id: 'right', words: 'Turn 15° right', disabled: piece.locked, onPress: () => actions.turn(piece, -15) },
    ...boardEntries(piece, document, actions, style),
    {
      id: 'kind',
      words: 'Choose all of its kind',
      detail: 'to line them up',
      disabled: ids.length < 2,
      onPress: () => onChoose?.(ids),
    },
    { id: 'mirror', words: 'Mirror', onPress: () => openHandForm('mirror', [piece.id]) },
    { id: 'row', words: 'Repeat in a row', onPress: () => openHandForm('row', [piece.id]) },
    { id: 'carry', words: 'Copy for another set', onPress: () => onCopy?.([piece]) },
    ...leafEntries(piece, document, actions),
    {
      id: 'hide',
      words: piece.hidden ? 'Show' : 'Hide',
      detail: piece.hidden ? undefined : 'still measured',
      onPress: () => actions.setFlag(piece, 'hidden', !piece.hidden),
    },
    {
      id: 'lock',
      words: piece.locked ? 'Unlock' : 'Lock',
      detail: piece.locked ? undefined : 'no moving, shaping, removing',
      onPress: () => actions.setFlag(piece, 'locked', !piece.locked),
    },
    {
      id: 'accessible',
      words: piece.accessible ? 'No longer accessible' : 'Mark as accessible',
      detail: piece.accessible ? undefined : 'asks the clauses',
      onPress: () => actions.setFlag(piece, 'accessible', !piece.accessible),
    },
    {
      id: 'remove',
      words: `Remove ${piece.mark}`,
      disabled: piece.locked,
      onPress: () => actions.remove(piece),
    },
  ];
}
