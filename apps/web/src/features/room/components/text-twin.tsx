import type { TapeLine } from '@settlewright/geometry';
import { sayTape } from '../overlay/tape-words.ts';
import type { RoomPicture } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { sayPlaces } from './say-places.ts';

interface Props {
  id: string;
  picture: RoomPicture;
  tapes: readonly TapeLine[];
  onOpenCell: (cellId: string) => void;
}

/** What the drawing shows, for those who do not see it: pieces, bodies and every tape by its full name. */
export function TextTwin({ id, picture, tapes, onOpenCell }: Props) {
  const { style, detail } = useSurroundings();
  const { document, bodies } = picture;
  return (
    <div className="sr-only">
      <p id={id}>
        {document.pieces.length === 0
          ? 'The set is empty.'
          : `Shows ${document.pieces.map((piece) => `${piece.mark} ${piece.name}`).join(', ')}.`}{' '}
        {sayPlaces(document, bodies, style, detail)} Arrow keys move the selected piece, comma and full stop
        turn it, Delete removes it; with Shift a press adds to what is chosen, and Ctrl A chooses all. Sizes
        are listed below.
      </p>
      {tapes.length > 0 && (
        <ul aria-label="Tapes of the drawing">
          {tapes.map((tape) => (
            <li key={tape.id}>
              {tape.cellId === undefined ? (
                sayTape(tape, style, detail)
              ) : (
                <button type="button" tabIndex={-1} onClick={() => onOpenCell(tape.cellId ?? '')}>
                  {sayTape(tape, style, detail)}, open the check
                </button>
              )}
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
