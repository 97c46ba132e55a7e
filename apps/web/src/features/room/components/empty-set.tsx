import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { DashedBay, EmptyState } from '@/components/empty-state.tsx';
import type { PieceActions } from '../hooks/use-piece-actions.ts';
import { useSurroundings } from '../room-context.tsx';

interface Props {
  document: SetDocument;
  actions: PieceActions;
  onSelect: (pieceId: string | undefined) => void;
}

/** A set without pieces: a first bench, or one of the usual arrangements to begin from. */
export function EmptySet({ document, actions, onSelect }: Props) {
  const { canEdit } = useSurroundings();
  const ready = ARRANGEMENTS.filter((arrangement) => arrangement.id !== 'empty');
  return (
    <div className="flex-1 overflow-auto">
      <EmptyState
        title="No benches yet"
        drawing={<DashedBay />}
        actions={
          canEdit && (
            <Button look="main" onClick={() => actions.add('bench')}>
              Add a bench
            </Button>
          )
        }
      >
        {canEdit
          ? 'Begin with one bench, or with an arrangement whose sizes you change afterwards.'
          : 'Nobody has drawn anything here yet.'}
      </EmptyState>
      {canEdit && (
        <ul className="grid gap-x-10 phone:grid-cols-2">
          {ready.map((arrangement) => (
            <li key={arrangement.id} className="ruled py-3">
              <button
                type="button"
                className="link text-left text-lg font-medium"
                onClick={() => {
                  const built = arrangement.build();
                  actions.replace(
                    { ...document, pieces: built.pieces, seating: built.seating },
                    `Began with ${arrangement.title.toLowerCase()}`,
                  );
                  onSelect(built.pieces.find((piece) => piece.kind === 'bench')?.id);
                }}
              >
                {arrangement.title}
              </button>
              <p className="text-sm text-ink-2">{arrangement.words}</p>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
