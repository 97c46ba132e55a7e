import type { Piece } from '@settlewright/geometry';
import { lazy, Suspense, useMemo, useState, type ReactNode } from 'react';
import { useStore } from 'zustand';
import { Button } from '@/components/button.tsx';
import type { SetInfo } from '../api.ts';
import { useClipboard } from '../clipboard/use-clipboard.ts';
import { SaveDrawingButton } from '../export/save-drawing-button.tsx';
import { useRoomAddress } from '../hooks/use-address.ts';
import { useChoosing } from '../hooks/use-choosing.ts';
import { useGroupActions } from '../hooks/use-group-actions.ts';
import { usePieceActions } from '../hooks/use-piece-actions.ts';
import { useRoomCells } from '../hooks/use-room-cells.ts';
import { useSavedCell } from '../hooks/use-saved-cell.ts';
import { useFetchedParts } from '../hooks/use-fetched-parts.ts';
import { useShortcuts, type ShortcutActions } from '../hooks/use-shortcuts.ts';
import { RoomContext, useAutosave, usePicture, useSurroundings } from '../room-context.tsx';
import { useRoomStore, useUndo } from '../store.ts';
import { useHandForm } from '../together/hand-form.ts';
import { PosturePanel } from '../posture/posture-panel.tsx';
import { MeasurePanel } from '../tape-tool/measure-panel.tsx';
import { WaysPanel } from '../ways/ways-panel.tsx';
import { ChosenPieces } from './chosen-pieces.tsx';
import { Counted } from './counted.tsx';
import { Conflict } from './conflict.tsx';
import { DraftRefused } from './draft-refused.tsx';
import { EmptySet } from './empty-set.tsx';
import { IssueRevision } from './issue-revision.tsx';
import { KeyPlan } from './key-plan.tsx';
import { KnownDifferences } from './known-differences.tsx';
import { NotesPanel } from './notes-panel.tsx';
import { PiecesPanel } from './pieces-panel.tsx';
import { SceneStage } from './scene-stage.tsx';
import { SpecSentence } from './spec-sentence.tsx';

const KeysDialog = lazy(() => import('./keys-dialog.tsx'));
const HandFormPanel = lazy(() => import('../together/hand-form-panel.tsx'));

interface Props {
  lastRevision: SetInfo['lastRevision'];
  foot: ReactNode;
  aboutPiece?: (piece: Piece) => ReactNode;
}

/** The room itself, once everything is there. */
export function RoomDesk({ lastRevision, foot, aboutPiece }: Props) {
  const surroundings = useSurroundings();
  const { canEdit, setName } = surroundings;
  const autosave = useAutosave();
  const { save } = useStore(autosave.state);
  const picture = usePicture();
  const store = useRoomStore();
  const address = useRoomAddress();
  const actions = usePieceActions(address.select);
  const choosing = useChoosing(picture.document, address);
  const groupActions = useGroupActions(address.choose);
  const clipboard = useClipboard(address.choose);
  const handForm = useHandForm((state) => state.open);
  const { undoStep, redoStep } = useUndo();
  const [helpOpen, setHelpOpen] = useState(false);
  const { clientView } = address;
  // Shown to a client, the room can be looked at and not changed.
  const mayChange = canEdit && !clientView;
  useRoomCells(lastRevision, mayChange);
  useSavedCell(autosave);
  useFetchedParts();

  const keys = useMemo<ShortcutActions>(
    () => ({
      undo: () => mayChange && undoStep(),
      redo: () => mayChange && redoStep(),
      toggleFit: () => address.openFit(!address.fitOpen),
      show: address.show,
      help: () => setHelpOpen(true),
    }),
    // The undo steps act on the store, whatever render made them.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [address, mayChange],
  );
  useShortcuts(keys);

  if (save.kind === 'conflict') return <Conflict conflict={save.conflict} />;

  const { document } = picture;
  const piece = document.pieces.find((candidate) => candidate.id === address.pieceId);
  const openCell = (cellId: string) => {
    store.getState().light(cellId);
    store.getState().openCell(cellId);
    address.openFit(true);
  };
  const empty = document.pieces.length === 0;
  const shown = clientView ? { ...surroundings, canEdit: false } : surroundings;

  return (
    <RoomContext value={shown}>
      <div className="flex min-h-0 flex-1 flex-col tablet:h-[calc(100dvh-3.5rem)] tablet:flex-none">
        <h1 className="sr-only" tabIndex={-1} data-page-heading>
          {setName}
        </h1>
        <div className="mx-auto grid min-h-0 w-full max-w-[90rem] flex-1 gap-x-9 px-8 pt-4 max-tablet:px-4 max-tablet:pt-2 tablet:grid-cols-[16.25rem_minmax(0,1fr)]">
          <div className="flex min-h-0 min-w-0 flex-col gap-2 max-tablet:order-1 tablet:order-2">
            {save.kind === 'refused' && <DraftRefused message={save.message} />}
            {empty ? (
              <EmptySet document={document} actions={actions} onSelect={address.select} />
            ) : (
              <>
                <SceneStage
                  picture={picture}
                  piece={piece}
                  address={address}
                  actions={actions}
                  several={mayChange ? { choosing, actions: groupActions, clipboard } : undefined}
                  onOpenCell={openCell}
                />
                {!address.fitOpen &&
                  (mayChange && handForm ? (
                    <Suspense fallback={null}>
                      <HandFormPanel choose={address.choose} />
                    </Suspense>
                  ) : mayChange && choosing.pieces.length > 1 ? (
                    <ChosenPieces
                      document={document}
                      choosing={choosing}
                      actions={groupActions}
                      onCopy={clipboard.copy}
                    />
                  ) : piece ? (
                    <Counted>
                      <div className="pb-4">
                        <SpecSentence key={piece.id} piece={piece} />
                      </div>
                    </Counted>
                  ) : (
                    <p className="ruled pt-3 pb-5 text-lg text-ink-2">
                      Select a piece in the drawing or in the list to read and change its sizes.
                    </p>
                  ))}
              </>
            )}
          </div>
          <Counted>
            <aside
              aria-label="Pieces, plan and notes"
              className="flex min-h-0 flex-col gap-5 pb-6 max-tablet:order-2 max-tablet:pt-6 tablet:order-1 tablet:overflow-x-hidden tablet:overflow-y-auto tablet:pr-1 tablet:[scrollbar-gutter:stable] tablet:[scrollbar-width:thin]"
            >
              <PiecesPanel
                document={document}
                selectedPieceId={address.pieceId}
                onSelect={address.select}
                actions={actions}
                several={mayChange ? { choosing, clipboard } : undefined}
                aboutPiece={aboutPiece}
              />
              {!empty && <KeyPlan picture={picture} address={address} />}
              {!empty && !clientView && <PosturePanel />}
              {!empty && !clientView && <MeasurePanel />}
              {!empty && !clientView && <WaysPanel />}
              <KnownDifferences document={document} onReplace={actions.replace} />
              {mayChange && !empty && (
                <IssueRevision sheet={picture.sheet} lastLetter={lastRevision?.letter} />
              )}
              {!clientView && <NotesPanel piece={piece} pieces={document.pieces} parts={picture.parts} />}
              <p className="flex flex-wrap gap-x-5">
                {!empty && <SaveDrawingButton />}
                <Button look="word" onClick={() => setHelpOpen(true)}>
                  Keys
                </Button>
              </p>
            </aside>
          </Counted>
        </div>
        {!clientView && <Counted>{foot}</Counted>}
        {helpOpen && (
          <Suspense fallback={null}>
            <KeysDialog open onClose={() => setHelpOpen(false)} />
          </Suspense>
        )}
      </div>
    </RoomContext>
  );
}
