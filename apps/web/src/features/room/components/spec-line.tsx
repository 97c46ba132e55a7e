import { specSentence } from '@settlewright/geometry';
import { useId } from 'react';
import { useRoomAddress } from '../hooks/use-address.ts';
import { usePiece } from '../room-context.tsx';
import { SpecTokens } from './spec-sentence.tsx';

/** One line of the sentence of the selected piece, for the open fit drawer. */
export function SpecLine() {
  const { pieceId } = useRoomAddress();
  const piece = usePiece(pieceId);
  const slipId = useId();
  if (!piece) return null;
  return (
    <p className="truncate text-lg leading-9">
      <SpecTokens
        tokens={specSentence(piece).main}
        piece={piece}
        look="quiet"
        slipId={slipId}
        onHand={() => undefined}
        onNext={() => false}
      />
    </p>
  );
}
