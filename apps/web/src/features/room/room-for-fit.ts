import type {
  BodyModel,
  CheckSettings,
  FitCell,
  FitSheet,
  KnownPerson,
  RuleBook,
  SetSituation,
  Sitter,
} from '@settlewright/anthropometry';
import {
  suggestFixes,
  formatLength,
  type Fix,
  type LengthStyle,
  type SetDocument,
} from '@settlewright/geometry';
import { useMemo } from 'react';
import { useRoomAddress } from './hooks/use-address.ts';
import { usePieceActions } from './hooks/use-piece-actions.ts';
import { sayMeasuredAs } from './posture/choice-words.ts';
import { usePicture, useSurroundings } from './room-context.tsx';
import { coloursOf, personOf, sittersOf } from './sitters.ts';
import { useRoom, useRoomStore } from './store.ts';

/** What the fit sheet needs of the room; the route hands it on, as features do not know each other. */
export interface RoomForFit {
  document: SetDocument;
  sheet: FitSheet;
  ruleBook: RuleBook;
  confidenceSetAt?: string | null;
  style: LengthStyle;
  detail: 'full' | 'verdicts';
  colourOf: (sitterId: string) => number;
  /** Words behind a name: "5′ 2″", "5′ 10″, est.". */
  aside: (sitterId: string) => string;
  /** Says that somebody is drawn in another posture than the one measured; empty where they are not. */
  measuredAs: (sitterId: string) => string;
  litCellId: string | null;
  light: (cellId: string | null) => void;
  openCellId: string | null;
  open: (cellId: string | null) => void;
  fixesFor?: (cell: FitCell) => Fix[];
  take?: (fix: Fix) => void;
  /** What the rows are made from, for readers who may see measures. */
  basis?: {
    situation: SetSituation;
    sitters: readonly Sitter[];
    people: readonly { id: string; name: string; person: KnownPerson }[];
    model: BodyModel;
    settings: CheckSettings;
  };
  personTo?: (castId: string, key: string) => string;
  asked: SetDocument['asked'];
  ask?: (asked: SetDocument['asked'], doing?: string) => void;
  clientView: boolean;
  drawerOpen: boolean;
  openDrawer: (open: boolean) => void;
}

export function useRoomForFit(): RoomForFit {
  const { engine, style, detail, canEdit, cast, maker, confidenceSetAt, path } = useSurroundings();
  const picture = usePicture();
  const store = useRoomStore();
  const litCellId = useRoom((state) => state.litCellId);
  const openCellId = useRoom((state) => state.openCellId);
  const { fitOpen, clientView, openFit, select } = useRoomAddress();
  const actions = usePieceActions(select);

  return useMemo(() => {
    const placeOf = new Map(picture.sheet.rows.map((row) => [row.sitterId, row.placeId]));
    const colourAt = coloursOf(picture.document, cast);
    const bodyOf = new Map(picture.bodies.map((body) => [body.placeId, body]));
    return {
      document: picture.document,
      sheet: picture.sheet,
      ruleBook: engine.ruleBook,
      confidenceSetAt: confidenceSetAt ?? null,
      style,
      detail,
      colourOf: (sitterId) => colourAt(placeOf.get(sitterId)),
      aside: (sitterId) => {
        const body = bodyOf.get(placeOf.get(sitterId) ?? '');
        if (!body || detail === 'verdicts') return '';
        return `${formatLength(body.statureMm, { ...style, feet: true })}${body.estimated ? ', est.' : ''}`;
      },
      measuredAs: (sitterId) => sayMeasuredAs(bodyOf.get(placeOf.get(sitterId) ?? ''), style),
      litCellId,
      light: (cellId) => store.getState().light(cellId),
      openCellId,
      open: (cellId) => store.getState().openCell(cellId),
      ...(detail === 'full' && {
        basis: {
          situation: picture.situation,
          sitters: sittersOf(picture.document, cast, engine.model),
          people: cast.flatMap((member) => {
            const person = member.removed ? undefined : personOf(member);
            return person ? [{ id: member.id, name: member.name, person }] : [];
          }),
          model: engine.model,
          settings: { ...picture.document.asked, confidence: picture.sheet.confidence },
        },
      }),
      asked: picture.document.asked,
      ...(canEdit && {
        personTo: (castId: string, key: string) =>
          `/w/${path.workshopId}/p/${path.productionId}/people?${new URLSearchParams({ edit: castId, field: key })}`,
        ask: (asked: SetDocument['asked'], doing = 'What this set asks') =>
          actions.replace({ ...picture.document, asked }, doing),
        fixesFor: (cell: FitCell) => suggestFixes({ document: picture.document, cell, check: maker.check }),
        take: (fix: Fix) => {
          const show = (mm: number) => formatLength(mm, style);
          const label = fix.label.toLowerCase();
          actions.replace(
            fix.document,
            `${fix.mark} ${label} ${show(fix.fromValue)} to ${show(fix.toValue)}`,
          );
        },
      }),
      clientView,
      drawerOpen: fitOpen,
      openDrawer: openFit,
    };
  }, [
    picture,
    engine,
    style,
    detail,
    cast,
    litCellId,
    openCellId,
    store,
    canEdit,
    maker,
    confidenceSetAt,
    path,
    actions,
    clientView,
    fitOpen,
    openFit,
  ]);
}
