import type { FitSheet, RuleBook, Sitter } from '@settlewright/anthropometry';
import type { LengthStyle, SetDocument } from '@settlewright/geometry';
import { useMemo } from 'react';
import { useStore } from 'zustand';
import { setAddress } from './api.ts';
import { useTakeStep } from './hooks/use-take-step.ts';
import { useAutosave, usePicture, useSurroundings } from './room-context.tsx';
import { coloursOf, sittersOf } from './sitters.ts';

/** What the pages about suggestions and shares need of the room; the route hands it on. */
export interface RoomForSuggest {
  setId: string;
  /** Address of the set on the server, and the draft that the server has. */
  setAt: string;
  draftNumber: number;
  setName: string;
  document: SetDocument;
  sheet: FitSheet;
  check: (document: SetDocument) => FitSheet;
  /** Takes a document as one named step; absent when it cannot be changed here. */
  replace?: (document: SetDocument, step: string) => void;
  /** Every grown-up whose body is known here; nobody for readers without measures. */
  sitters: Sitter[];
  /** Places that name somebody who was removed. */
  placesWithoutBody: number;
  ruleBook: RuleBook;
  style: LengthStyle;
  colourOf: (sitterId: string) => number;
}

export function useRoomForSuggest(): RoomForSuggest {
  const { path, engine, style, canEdit, cast, maker, setName } = useSurroundings();
  const { document, sheet } = usePicture();
  const take = useTakeStep();
  const draftNumber = useStore(useAutosave().state, (state) => state.base.number);
  return useMemo(() => {
    const colourAt = coloursOf(document, cast);
    const seated = sittersOf(document, cast, engine.model);
    // A child cannot be served: most of what would be asked is not known.
    const sitters = seated.filter(({ noBody, person }) => !noBody && !person.child);
    const placeOf = new Map(sheet.rows.map((row) => [row.sitterId, row.placeId]));
    return {
      setId: path.setId,
      setAt: setAddress(path),
      draftNumber,
      setName,
      document,
      sheet,
      check: maker.check,
      ...(canEdit && { replace: take }),
      sitters,
      placesWithoutBody: seated.filter(({ noBody }) => noBody).length,
      ruleBook: engine.ruleBook,
      style,
      colourOf: (sitterId) => colourAt(placeOf.get(sitterId)),
    };
  }, [path, draftNumber, setName, document, sheet, maker, canEdit, take, cast, engine, style]);
}
