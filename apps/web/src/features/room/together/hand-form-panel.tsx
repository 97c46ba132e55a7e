import { useEffect, useMemo } from 'react';
import { joinWords } from '../choosing-words.ts';
import { useRoom } from '../store.ts';
import { closeHandForm, useHandForm } from './hand-form.ts';
import { MirrorForm } from './mirror-form.tsx';
import { RowForm } from './row-form.tsx';

/** The form that is open for the chosen pieces; what it would do is seen in the drawing. */
export default function HandFormPanel({ choose }: { choose: (ids: readonly string[]) => void }) {
  const open = useHandForm((state) => state.open);
  // What was taken: the form looks at the set as it was before its own preview.
  const document = useRoom((state) => state.document);
  const pieces = useMemo(
    () => document.pieces.filter(({ id }) => open?.pieceIds.includes(id)),
    [document, open],
  );
  useEffect(() => closeHandForm, []);
  if (!open || pieces.length === 0) return null;
  const marks = pieces.length > 4 ? `${pieces.length} pieces` : joinWords(pieces.map(({ mark }) => mark));
  const shared = { document, pieces, marks, choose };
  return open.kind === 'mirror' ? <MirrorForm {...shared} /> : <RowForm {...shared} />;
}
