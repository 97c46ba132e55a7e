import { ungroupPieces, type PieceGroup, type SetDocument } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { joinWords } from '../choosing-words.ts';
import type { Choosing } from '../hooks/use-choosing.ts';
import { useTakeStep } from '../hooks/use-take-step.ts';

/** The groups of a set: a press on one chooses all its pieces. */
export function GroupsList({ document, choosing }: { document: SetDocument; choosing: Choosing }) {
  const take = useTakeStep();
  const groups = document.groups ?? [];
  if (groups.length === 0) return null;
  const marks = ({ pieceIds }: PieceGroup) =>
    joinWords(document.pieces.filter(({ id }) => pieceIds.includes(id)).map(({ mark }) => mark));
  return (
    <div className="mt-3">
      <h3 className="text-sm font-semibold">Groups</h3>
      <ul className="text-sm">
        {groups.map((group) => (
          <li key={group.id} className="flex items-baseline justify-between gap-3 border-b border-rule py-1">
            <Button
              look="word"
              aria-label={`Choose ${group.name}: ${marks(group)}`}
              onClick={() => choosing.choose(group.pieceIds)}
            >
              {group.name}
            </Button>
            <span className="min-w-0 flex-1 truncate text-xs text-ink-2">{marks(group)}</span>
            <Button
              look="word"
              aria-label={`Let go of the group ${group.name}`}
              onClick={() => take(ungroupPieces(document, group.id), `Group “${group.name}” let go of`)}
            >
              Let go
            </Button>
          </li>
        ))}
      </ul>
    </div>
  );
}
