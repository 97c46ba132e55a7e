import type { FitSheet, RuleBook } from '@settlewright/anthropometry';
import { formatLength, type LengthStyle, type SetDocument } from '@settlewright/geometry';
import { useMemo } from 'react';
import { useStore } from 'zustand';
import { useSetInfo } from './api.ts';
import { sayDraft } from './hooks/use-room-cells.ts';
import { useTakeStep } from './hooks/use-take-step.ts';
import { useAutosave, usePicture, useSurroundings } from './room-context.tsx';
import { coloursOf } from './sitters.ts';

/** What the story stick needs of the room; the route hands it on, as features do not know each other. */
export interface RoomForChoices {
  document: SetDocument;
  /** Of the sitters alone: many sets are tried. */
  check: (document: SetDocument) => FitSheet;
  replace?: (document: SetDocument, step: string) => void;
  ruleBook: RuleBook;
  style: LengthStyle;
  detail: 'full' | 'verdicts';
  colourOf: (sitterId: string) => number;
  /** Words behind a name: "5′ 2″", "5′ 10″, est.". */
  aside: (sitterId: string) => string;
  setName: string;
  draft: string;
}

export function useRoomForChoices(): RoomForChoices {
  const { path, engine, style, detail, canEdit, cast, maker, setName } = useSurroundings();
  const { document, sheet, bodies } = usePicture();
  const autosave = useAutosave();
  const number = useStore(autosave.state, (state) => state.base.number);
  const lastRevision = useSetInfo(path).data?.lastRevision;
  const take = useTakeStep();

  return useMemo(() => {
    const placeOf = new Map(sheet.rows.map((row) => [row.sitterId, row.placeId]));
    const colourAt = coloursOf(document, cast);
    const bodyOf = new Map(bodies.map((body) => [body.placeId, body]));
    return {
      document,
      check: maker.tryOut,
      ...(canEdit && { replace: take }),
      ruleBook: engine.ruleBook,
      style,
      detail,
      colourOf: (sitterId) => colourAt(placeOf.get(sitterId)),
      aside: (sitterId) => {
        const body = bodyOf.get(placeOf.get(sitterId) ?? '');
        if (!body || detail === 'verdicts') return '';
        return `${formatLength(body.statureMm, { ...style, feet: true })}${body.estimated ? ', est.' : ''}`;
      },
      setName,
      draft: sayDraft(number, lastRevision),
    };
  }, [
    document,
    sheet,
    bodies,
    maker,
    canEdit,
    take,
    engine,
    style,
    detail,
    cast,
    setName,
    number,
    lastRevision,
  ]);
}
