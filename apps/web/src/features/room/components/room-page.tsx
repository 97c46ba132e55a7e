import type { Piece } from '@settlewright/geometry';
import type { ReactNode } from 'react';
import { useSetInfo, type SetPath } from '../api.ts';
import { BandLinkContext, type BandLinkMaker } from './band-link.tsx';
import { OpenRoom } from './open-room.tsx';
import { RoomDesk } from './room-desk.tsx';

export interface RoomSlots {
  /** Stands at the foot of the page, within the room: the fit strip and its drawer. */
  foot?: ReactNode;
  /** A link to where the band of a dimension is shown. */
  bandLink?: BandLinkMaker;
  /** Stands in the row of the selected piece. */
  aboutPiece?: (piece: Piece) => ReactNode;
}

/** The room of a set. */
export function RoomPage({ path, foot, bandLink, aboutPiece }: RoomSlots & { path: SetPath }) {
  const info = useSetInfo(path);
  return (
    <OpenRoom path={path}>
      <BandLinkContext value={bandLink ?? null}>
        <RoomDesk lastRevision={info.data?.lastRevision} foot={foot} aboutPiece={aboutPiece} />
      </BandLinkContext>
    </OpenRoom>
  );
}
