import { tapeLines, type Piece } from '@settlewright/geometry';
import { lazy, Suspense, useId, useMemo, useRef, useState } from 'react';
import { LoadingLine } from '@/components/loading.tsx';
import { useTheme } from '@/lib/theme.ts';
import { useDoubtKey } from '../bodies/doubt-toggle.tsx';
import { useDoubt } from '../bodies/doubt.ts';
import type { Clipboard } from '../clipboard/use-clipboard.ts';
import { joinWords } from '../choosing-words.ts';
import type { Choosing } from '../hooks/use-choosing.ts';
import type { GroupActions } from '../hooks/use-group-actions.ts';
import type { PieceActions } from '../hooks/use-piece-actions.ts';
import { useSceneHand } from '../hooks/use-scene-hand.ts';
import { useStill } from '../hooks/use-still.ts';
import { useStageKeys } from '../hooks/use-stage-keys.ts';
import { useView } from '../hooks/use-view.ts';
import type { RoomAddress } from '../hooks/use-address.ts';
import { createLabelBoxes } from '../overlay/box.ts';
import { Overlay } from '../overlay/overlay.tsx';
import { tapesAtRest } from '../overlay/tape-words.ts';
import type { RoomPicture } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { isBehind, isBodyLeft, isToScale } from '../scene/views.ts';
import { SectionBar } from '../section/section-bar.tsx';
import { settledDocument, useIsMoving, useRoom } from '../store.ts';
import { useOfferPresentView, useSeen } from '../views/use-seen.ts';
import { viewTitle } from '../views/view-title.ts';
import { useHandForm } from '../together/hand-form.ts';
import { HiddenNote } from '../together/hidden-note.tsx';
import { TapeBar } from '../tape-tool/tape-bar.tsx';
import { linesOnScene, useMeasures, useMeasuringScene } from '../tape-tool/use-measuring.ts';
import { useTapeHand } from '../tape-tool/use-tape-hand.ts';
import { EyeMark } from './eye-mark.tsx';
import { SceneErrorBoundary } from './scene-error-boundary.tsx';
import { ScaleBar } from './scale-bar.tsx';
import { StageTools } from './stage-tools.tsx';
import { TextTwin } from './text-twin.tsx';

/** The drawing has no frame: it fades into the paper at the edges of the sheet. */
const FADE = {
  maskImage:
    'linear-gradient(90deg, transparent, #000 4%, #000 96%, transparent), linear-gradient(transparent, #000 8%, #000 93%, transparent)',
  maskComposite: 'intersect',
};

const NOTHING: readonly string[] = [];
const NOBODY: RoomPicture['bodies'] = [];

const SceneCanvas = lazy(() => import('../scene/scene-canvas.tsx'));
const HandleLayer = lazy(() => import('../handles/handle-layer.tsx'));
const SceneLayers = lazy(() => import('./scene-layers.tsx'));

interface Props {
  picture: RoomPicture;
  piece: Piece | undefined;
  address: RoomAddress;
  actions: PieceActions;
  /** Left out where only one piece can be looked at. */
  several?: { choosing: Choosing; actions: GroupActions; clipboard?: Clipboard };
  onOpenCell: (cellId: string) => void;
}

/** The drawing, what stands over it and what can be done to it. */
export function SceneStage({ picture, piece, address, actions, several, onOpenCell }: Props) {
  const { style, canEdit, detail, maker } = useSurroundings();
  const theme = useTheme((state) => state.choice);
  const lit = useRoom((state) => state.litCellId);
  const sheet = useRef<HTMLDivElement>(null);
  const readOut = useRef<HTMLDivElement>(null);
  const [labels] = useState(createLabelBoxes);
  const about = useId();
  const { clientView } = address;
  const isMoving = useIsMoving();
  const seen = useSeen(picture.document, address);
  const { letter } = seen;
  const [showBodies, showTapes] = [seen.bodies.shown, seen.tapes.shown];
  const settled = maker.picture(useRoom(settledDocument));
  // What a form proposes is seen whole before it is taken.
  const proposed = useHandForm((state) => state.open !== undefined);
  const view = useView(proposed ? picture : settled, letter, address.pieceId, sheet, seen);
  useOfferPresentView(seen, view, clientView);
  const title = viewTitle(seen, style);
  const hand = useSceneHand({
    picture,
    view,
    letter,
    showBodies,
    selectedPieceId: address.pieceId,
    onSelect: address.select,
    choosing: several?.choosing,
    readOut,
  });

  const group = several && several.choosing.pieces.length > 1 ? several : undefined;
  const chosenIds = clientView ? NOTHING : address.chosenIds;
  // Several pieces have too many sizes to show: the tapes are those of one.
  const tapedId = group ? undefined : address.pieceId;
  const tapes = useMemo(
    () => tapeLines(picture.document, picture.sheet, tapedId, picture.bodies),
    [picture, tapedId],
  );
  const shown =
    showTapes && !clientView && !isMoving
      ? tapesAtRest(tapes, picture.sheet, tapedId, lit, view.narrow ? 2 : 5).filter(
          // A gap under somebody who was cut away would hang on nothing.
          ({ kind, fromMm }) => kind !== 'gap' || isBehind(fromMm, view.cut),
        )
      : [];
  const showDoubt = useDoubt((state) => state.shown);
  const inDoubt = showBodies && detail === 'full' && !clientView ? picture.bodies : NOBODY;
  useDoubtKey(inDoubt);
  const seated = showBodies ? picture.bodies.filter((body) => isBodyLeft(body.crownMm, view.cut)) : [];
  const bodies = useStill(seated, picture);

  const measuring = useMeasuringScene(picture);
  const measures = useMeasures(picture, measuring);
  const tapeHand = useTapeHand({ picture, scene: measuring, view, letter, showBodies, readOut });
  const measured = showTapes && !clientView && !isMoving ? linesOnScene(measures) : [];

  const keys = useStageKeys({
    piece,
    address,
    hand,
    actions,
    choosing: several?.choosing,
    group,
    clipboard: several?.clipboard,
  });

  return (
    <section aria-label="Drawing of the set" className="flex min-h-0 flex-1 flex-col">
      <div className="flex min-h-9 items-center gap-3">
        <EyeMark letter={letter === 'lens' ? 'L' : letter} chosen />
        <div>
          <p className="text-sm leading-4 font-medium">{title.name}</p>
          <p className="text-xs text-ink-3">{title.about}</p>
        </div>
      </div>
      {picture.undrawn.length > 0 && (
        <p className="mb-1 text-sm text-wont">
          No body can be drawn from the measures of {joinWords(picture.undrawn)}: one of them has slipped.
          Look at the entry under People.
        </p>
      )}
      <HiddenNote document={picture.document} actions={several?.actions} />
      <div
        ref={sheet}
        role="application"
        aria-roledescription="drawing"
        aria-label={`${title.name}. ${
          group
            ? `${joinWords(group.choosing.pieces.map(({ mark }) => mark))} chosen.`
            : piece
              ? `${piece.mark} selected.`
              : 'Nothing selected.'
        }`}
        aria-describedby={about}
        tabIndex={0}
        data-scene={letter}
        data-scene-pieces={picture.document.pieces.length}
        data-scene-sitters={seated.length}
        data-scene-parts={picture.parts.length}
        onKeyDown={keys}
        onWheel={(event) => {
          if (event.ctrlKey) view.zoomBy(event.deltaY < 0 ? 1.1 : 1 / 1.1);
        }}
        {...(clientView ? hand.handlers : (tapeHand ?? hand.handlers))}
        className="@container relative min-h-0 flex-1 touch-pan-y overflow-hidden outline-offset-[-2px] select-none max-tablet:h-[21rem] max-tablet:flex-none"
      >
        <SceneErrorBoundary>
          <div className="absolute inset-0" style={FADE}>
            <Suspense fallback={<LoadingLine words="Drawing the set" />}>
              <SceneCanvas
                following
                picture={picture}
                controller={view.controller}
                letter={letter}
                cut={view.cut}
                chosenIds={chosenIds}
                showBodies={showBodies}
                showDoubt={showDoubt && inDoubt.length > 0}
                theme={theme}
                report={({ calls, triangles, geometries }) => {
                  sheet.current?.setAttribute('data-scene-calls', String(calls));
                  sheet.current?.setAttribute('data-scene-triangles', String(triangles));
                  sheet.current?.setAttribute('data-scene-geometries', String(geometries));
                }}
              />
            </Suspense>
          </div>
        </SceneErrorBoundary>
        <Overlay
          controller={view.controller}
          labels={labels}
          namesAtHeads={letter === 'D'}
          bodies={bodies}
          tapes={[...shown, ...measured]}
          style={style}
          litCellId={lit}
          selectedPieceId={tapedId}
          onSelectPiece={address.select}
          onOpenCell={onOpenCell}
        />
        {canEdit && !clientView && piece && !group && (
          <Suspense fallback={null}>
            <HandleLayer
              key={piece.id}
              piece={piece}
              controller={view.controller}
              labels={labels}
              cut={view.cut}
              narrow={view.narrow}
            />
          </Suspense>
        )}
        <Suspense fallback={null}>
          <SceneLayers picture={picture} view={view} seen={seen} labels={labels} clientView={clientView} />
        </Suspense>
        <div
          ref={readOut}
          hidden
          aria-hidden="true"
          className="pointer-events-none absolute top-0 left-0 z-20 rounded-sm bg-ink px-2 text-sm leading-6 whitespace-nowrap text-paper"
        />
        {isToScale(letter) && <ScaleBar controller={view.controller} style={style} />}
      </div>
      <StageTools
        address={address}
        view={view}
        letter={letter}
        choosing={several?.choosing}
        bodies={seen.bodies}
        doubtOf={inDoubt}
        // Whoever sees verdicts alone may have none to show.
        tapes={tapes.length > 0 && !clientView ? seen.tapes : undefined}
      />
      <SectionBar picture={picture} />
      {!clientView && <TapeBar scene={measuring} />}
      <TextTwin
        id={about}
        picture={picture}
        tapes={clientView ? [] : [...tapes, ...measured]}
        onOpenCell={onOpenCell}
      />
    </section>
  );
}
