import type { SetDocument } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { joinWords } from '../choosing-words.ts';
import type { GroupActions } from '../hooks/use-group-actions.ts';

interface Props {
  document: SetDocument;
  /** Left out where nothing can be changed. */
  actions: GroupActions | undefined;
}

/** Says what is not drawn, and that it counts all the same. */
export function HiddenNote({ document, actions }: Props) {
  const hidden = document.pieces.filter((piece) => piece.hidden);
  if (hidden.length === 0) return null;
  const marks = joinWords(hidden.map(({ mark }) => mark));
  return (
    <p className="pb-2 text-sm text-ink-2" data-hidden-note>
      {hidden.length === 1 ? '1 piece' : `${hidden.length} pieces`} hidden, still measured: {marks}.{' '}
      {actions && (
        <Button look="word" onClick={() => actions.mark(hidden, 'hidden', false)}>
          {hidden.length === 1 ? `Show ${marks}` : 'Show them'}
        </Button>
      )}
    </p>
  );
}
