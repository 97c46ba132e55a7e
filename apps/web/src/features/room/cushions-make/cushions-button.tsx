import { cushionRuns, type Piece } from '@settlewright/geometry';
import { lazy, Suspense, useState } from 'react';
import { Button } from '@/components/button.tsx';
import type { PieceActions } from '../hooks/use-piece-actions.ts';
import { useSurroundings } from '../room-context.tsx';

const MakeDialog = lazy(() => import('./make-dialog.tsx'));

/**
 * Opens what is chosen of the cushions of a piece; nothing where it has none. An issued revision shows its cushions on the
 * orders, made with the allowances of its day.
 */
export function CushionsButton({ piece, actions }: { piece: Piece; actions: PieceActions }) {
  const { issued } = useSurroundings();
  const [open, setOpen] = useState(false);
  if (issued) return null;
  if ((piece.kind !== 'bench' && piece.kind !== 'loose-seat') || cushionRuns(piece).length === 0) return null;
  return (
    <>
      <Button look="word" className="text-xs!" onClick={() => setOpen(true)}>
        Cushions
      </Button>
      {open && (
        <Suspense fallback={null}>
          <MakeDialog piece={piece} actions={actions} onClose={() => setOpen(false)} />
        </Suspense>
      )}
    </>
  );
}
