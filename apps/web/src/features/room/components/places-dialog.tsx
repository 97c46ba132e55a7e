import { placeFrames, type Piece, type SetDocument, type SitterRef } from '@settlewright/geometry';
import { Combobox, type ComboboxChoice } from '@/components/combobox.tsx';
import { Dialog } from '@/components/dialog.tsx';
import type { PieceActions } from '../hooks/use-piece-actions.ts';
import { useSurroundings } from '../room-context.tsx';
import { CHILDREN, mannequinName, MANNEQUINS, sitterKey, sitterName } from '../sitters.ts';

const NOBODY = 'nobody';

interface Props {
  piece: Piece;
  document: SetDocument;
  actions: PieceActions;
  open: boolean;
  onClose: () => void;
}

/** Who sits where on one piece, counted from the left as seen from in front. */
export function PlacesDialog({ piece, document, actions, open, onClose }: Props) {
  const { cast } = useSurroundings();
  const seats = new Map(
    document.seating.filter((seat) => seat.pieceId === piece.id).map((seat) => [seat.place, seat.sitter]),
  );
  const elsewhere = new Map(
    document.seating.flatMap((seat) => {
      const mark = document.pieces.find((other) => other.id === seat.pieceId)?.mark ?? '';
      return seat.sitter.kind === 'cast' ? [[seat.sitter.castId, `${mark}, place ${seat.place}`]] : [];
    }),
  );
  const choices: ComboboxChoice[] = [
    { id: NOBODY, words: 'Nobody' },
    ...cast.map((member) => ({
      id: member.id,
      words: member.name,
      detail: elsewhere.get(member.id) ?? member.role,
    })),
    ...MANNEQUINS.map((ref) => ({ id: sitterKey(ref), words: mannequinName(ref), detail: 'mannequin' })),
    ...CHILDREN.map((ref) => ({
      id: sitterKey(ref),
      words: sitterName(ref, cast),
      detail: 'for scale, not checked',
    })),
  ];
  const refOf = (id: string | null): SitterRef | null =>
    [...MANNEQUINS, ...CHILDREN].find((ref) => sitterKey(ref) === id) ??
    (cast.some((member) => member.id === id) && id ? { kind: 'cast', castId: id } : null);

  return (
    <Dialog
      open={open}
      onClose={onClose}
      title={`Who sits on ${piece.mark}`}
      describe="Places are counted from the left as seen from in front. Somebody who sits elsewhere moves here."
    >
      <div className="grid gap-5">
        {placeFrames(piece, document).map(({ place }) => {
          const sitter = seats.get(place);
          return (
            <Combobox
              key={place}
              label={`Place ${place}`}
              value={sitter ? sitterKey(sitter) : NOBODY}
              choices={choices}
              onChange={(id) => actions.seat(piece, place, id === NOBODY ? null : refOf(id))}
            />
          );
        })}
      </div>
    </Dialog>
  );
}
