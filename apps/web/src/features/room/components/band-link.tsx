import { createContext, useContext, type ReactNode } from 'react';

/** The page that composes the room says where the band of a dimension is shown, if it is. */
export type BandLinkMaker = (pieceId: string, parameterKey: string) => ReactNode;

export const BandLinkContext = createContext<BandLinkMaker | null>(null);

export function BandLink({ pieceId, parameterKey }: { pieceId: string; parameterKey: string }) {
  return useContext(BandLinkContext)?.(pieceId, parameterKey) ?? null;
}
