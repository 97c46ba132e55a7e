import type { LengthStyle, Piece } from '@settlewright/geometry';
import { createContext, useContext } from 'react';
import type { CastMember } from '@/lib/contract.ts';
import type { SetPath } from './api.ts';
import type { FitEngine } from './engine.ts';
import type { PictureMaker, RoomPicture } from './picture.ts';
import type { Autosave } from './save/autosave.ts';
import { shownDocument, useRoom } from './store.ts';

/** What the parts of the room's page share and never change on their own. */
export interface RoomSurroundings {
  path: SetPath;
  setName: string;
  canEdit: boolean;
  /** Readers without measures get verdicts from the server and change nothing. */
  detail: 'full' | 'verdicts';
  style: LengthStyle;
  cast: readonly CastMember[];
  engine: FitEngine;
  maker: PictureMaker;
  /** When the workshop last changed the probability that verdicts ask for, if it ever did. */
  confidenceSetAt?: string | null;
  /** Set where an issued revision is looked at instead of the draft. */
  issued?: { letter: string; issuedAt: string };
}

export const RoomContext = createContext<RoomSurroundings | null>(null);

export function useSurroundings(): RoomSurroundings {
  const room = useContext(RoomContext);
  if (!room) throw new Error('This part of the page stands outside the room.');
  return room;
}

/** Only where a draft is open; an issued revision saves nothing. */
export const AutosaveContext = createContext<Autosave | null>(null);

export function useAutosave(): Autosave {
  const autosave = useContext(AutosaveContext);
  if (!autosave) throw new Error('This part of the page needs an open draft.');
  return autosave;
}

/** Everything that follows from the document on the screen. */
export function usePicture(): RoomPicture {
  const { maker } = useSurroundings();
  return maker.picture(useRoom(shownDocument));
}

export function usePiece(pieceId: string | undefined): Piece | undefined {
  return useRoom((state) => shownDocument(state).pieces.find((piece) => piece.id === pieceId));
}
