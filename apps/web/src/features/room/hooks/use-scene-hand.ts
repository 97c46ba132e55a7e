import {
  movePiece,
  movePieces,
  snapPiece,
  type Piece,
  type SetDocument,
  type Snapped,
} from '@settlewright/geometry';
import { useEffect, useRef, type PointerEvent, type RefObject } from 'react';
import { announce } from '@/lib/announce.ts';
import { showReadOut } from '../components/read-out.ts';
import type { RoomPicture } from '../picture.ts';
import { nameMove, nameMoves, readOutMove } from '../move-words.ts';
import { useSurroundings } from '../room-context.tsx';
import { choosePlace } from '../posture/chosen-place.ts';
import { bodyUnder } from '../posture/pick-body.ts';
import { firstUnder, onLevel, pieceUnder } from '../scene/pick.ts';
import { turn } from '../scene/vectors.ts';
import { pixelsPerMm, rayThrough } from '../scene/view-frame.ts';
import { isBodyLeft, type SceneView } from '../scene/views.ts';
import { visibleParts } from '../scene/visible-parts.ts';
import { useRoomStore } from '../store.ts';
import { adds, type Choosing } from './use-choosing.ts';
import type { View } from './use-view.ts';

const DRAG_STARTS_PX = 5;

interface Drag {
  pointerId: number;
  startX: number;
  startY: number;
  lastX: number;
  lastY: number;
  moving: boolean;
  /** The piece in the hand; without one the sheet itself is moved. */
  piece: Piece | undefined;
  /** What goes with it; itself alone unless several are chosen. */
  pieces: readonly Piece[];
  /** What was pressed, if anything was. */
  pressedId: string | undefined;
  /** The press adds to what is chosen instead of choosing anew. */
  adding: boolean;
  /** True when nothing was hit: a click there lets go of the selection. */
  onPaper: boolean;
  /** The press lies on one of several chosen pieces: a click alone then chooses that one. */
  onGroup: boolean;
  base: SetDocument;
  floor: { xMm: number; zMm: number } | undefined;
  snapped?: Snapped;
}

/** Snaps the piece in the hand to what does not go with it; several keep their turns. */
function snapTogether(base: SetDocument, piece: Piece, pieces: readonly Piece[], to: Piece['at']): Snapped {
  if (pieces.length < 2) return snapPiece(base, piece.id, to);
  const along = new Set(pieces.map(({ id }) => id));
  const rest = base.pieces.filter(({ id }) => id === piece.id || !along.has(id));
  const snapped = snapPiece({ ...base, pieces: rest }, piece.id, to);
  return Math.abs(snapped.at.turnDeg - to.turnDeg) < 1e-9 ? snapped : { at: to };
}

export type SceneHand = ReturnType<typeof useSceneHand>;

/** Clicking, dragging pieces over the floor, and moving the sheet: kept out of React until let go. */
export function useSceneHand(options: {
  picture: RoomPicture;
  view: View;
  letter: SceneView;
  showBodies: boolean;
  selectedPieceId: string | undefined;
  onSelect: (pieceId: string | undefined) => void;
  choosing: Choosing | undefined;
  /** Stands near the pointer while a piece is dragged. */
  readOut: RefObject<HTMLDivElement | null>;
}) {
  const { picture, view, letter, showBodies, selectedPieceId, onSelect, choosing, readOut } = options;
  const store = useRoomStore();
  const { canEdit, style } = useSurroundings();
  const drag = useRef<Drag | null>(null);
  const wanted = useRef<SetDocument | null>(null);
  const request = useRef(0);

  useEffect(() => () => cancelAnimationFrame(request.current), []);

  function at(event: PointerEvent<HTMLElement>) {
    const box = event.currentTarget.getBoundingClientRect();
    return { x: event.clientX - box.left, y: event.clientY - box.top };
  }

  function rayAt(x: number, y: number) {
    const frame = view.controller.frame();
    return frame && rayThrough(frame, view.controller.viewport(), x, y);
  }

  /** A finger that scrolls must not carry furniture along: it moves only what was selected before. */
  function mayMove(piece: Piece, pointerType: string, chosen: boolean): boolean {
    if (!canEdit || piece.locked || piece.kind === 'bulkhead') return false;
    return pointerType !== 'touch' || chosen || piece.id === selectedPieceId;
  }

  function down(event: PointerEvent<HTMLElement>) {
    if (event.button !== 0 || event.target instanceof HTMLButtonElement) return;
    const { x, y } = at(event);
    const ray = rayAt(x, y);
    if (!ray) return;
    const parts = visibleParts(picture.document, picture.parts, letter);
    const pieceId = pieceUnder(parts, ray, view.cut);
    const piece = picture.document.pieces.find((candidate) => candidate.id === pieceId);
    const adding = choosing !== undefined && (choosing.several || adds(event));
    const group = choosing && choosing.pieces.length > 1 ? choosing.pieces : [];
    const onGroup = group.some((one) => one.id === pieceId);
    const movable = piece && (onGroup || !adding) && mayMove(piece, event.pointerType, onGroup);
    drag.current = {
      pointerId: event.pointerId,
      startX: x,
      startY: y,
      lastX: x,
      lastY: y,
      moving: false,
      piece: movable ? piece : undefined,
      pieces: onGroup ? group : piece ? [piece] : [],
      pressedId: pieceId,
      adding,
      onGroup,
      onPaper: pieceId === undefined,
      base: store.getState().document,
      floor: onLevel(ray, 0),
    };
    event.currentTarget.setPointerCapture(event.pointerId);
    if (pieceId !== undefined && !adding && !onGroup) onSelect(pieceId);
  }

  /** Where the piece would stand: over the floor where it is seen from above, else along the sheet. */
  function shift(hand: Drag, x: number, y: number) {
    const frame = view.controller.frame();
    const ray = rayAt(x, y);
    if (!frame || !ray) return undefined;
    const floor = onLevel(ray, 0);
    if (hand.floor && floor && letter !== 'B' && letter !== 'C') {
      return { x: floor.xMm - hand.floor.xMm, z: floor.zMm - hand.floor.zMm };
    }
    const along = (x - hand.startX) / pixelsPerMm(frame, view.controller.viewport());
    const right = turn(frame.orientation, [1, 0, 0]);
    return { x: right[0] * along, z: right[2] * along };
  }

  function move(event: PointerEvent<HTMLElement>) {
    const hand = drag.current;
    if (!hand || hand.pointerId !== event.pointerId) return;
    const { x, y } = at(event);
    if (!hand.moving && Math.hypot(x - hand.startX, y - hand.startY) < DRAG_STARTS_PX) return;
    hand.moving = true;
    if (hand.piece) {
      const by = shift(hand, x, y);
      if (!by) return;
      const { piece, pieces, base } = hand;
      const to = { xMm: piece.at.xMm + by.x, zMm: piece.at.zMm + by.z, turnDeg: piece.at.turnDeg };
      const snapped: Snapped = event.altKey ? { at: to } : snapTogether(base, piece, pieces, to);
      const way = { xMm: snapped.at.xMm - piece.at.xMm, zMm: snapped.at.zMm - piece.at.zMm };
      wanted.current =
        pieces.length > 1
          ? movePieces(
              base,
              pieces.map(({ id }) => id),
              way,
            )
          : movePiece(base, piece.id, snapped.at);
      hand.snapped = snapped;
      const words = readOutMove(piece.at, snapped.at, snapped.snappedTo, style);
      showReadOut(readOut.current, words, x, y);
      cancelAnimationFrame(request.current);
      request.current = requestAnimationFrame(() => {
        if (wanted.current) store.getState().showMoving(wanted.current);
      });
    } else if (letter === 'E') {
      view.turnBy(-(x - hand.lastX) * 0.008, (y - hand.lastY) * 0.006);
    } else {
      view.panBy(x - hand.lastX, y - hand.lastY);
    }
    hand.lastX = x;
    hand.lastY = y;
  }

  function end() {
    cancelAnimationFrame(request.current);
    const hand = drag.current;
    drag.current = null;
    showReadOut(readOut.current, undefined);
    if (hand?.piece && hand.moving && hand.snapped && wanted.current) {
      const { piece, pieces, snapped } = hand;
      const step =
        pieces.length > 1
          ? nameMoves(pieces.length, piece.at, snapped.at, style)
          : nameMove(piece.mark, piece.at, snapped.at, style);
      if (step === undefined) store.getState().showPreview(null);
      else {
        store.getState().commit(wanted.current, step);
        announce(snapped.snappedTo ? `${step}, ${snapped.snappedTo}` : step);
      }
    }
    if (hand && !hand.moving && !chooseBody(hand)) letGo(hand);
    wanted.current = null;
  }

  /** A press on a body chooses who sits there, and what they sit on. */
  function chooseBody({ startX, startY, adding, onGroup }: Drag): boolean {
    const ray = rayAt(startX, startY);
    if (!ray || !showBodies || adding || onGroup) return false;
    const before = firstUnder(
      visibleParts(picture.document, picture.parts, letter),
      ray,
      view.cut,
    )?.distanceMm;
    const left = picture.bodies.filter(({ crownMm }) => isBodyLeft(crownMm, view.cut));
    const body = bodyUnder(left, ray, before);
    if (!body) return false;
    choosePlace(body.placeId);
    onSelect(body.pieceId);
    return true;
  }

  /** A press without a way: chooses one, adds one, or lets go of all. */
  function letGo({ pressedId, adding, onGroup, onPaper }: Drag) {
    if (adding) {
      if (pressedId !== undefined) choosing?.toggle(pressedId);
    } else if (onPaper) onSelect(undefined);
    else if (onGroup) onSelect(pressedId);
  }

  function cancel() {
    cancelAnimationFrame(request.current);
    showReadOut(readOut.current, undefined);
    if (drag.current?.piece) store.getState().showPreview(null);
    drag.current = null;
    wanted.current = null;
  }

  return {
    isDragging: () => drag.current?.moving === true,
    cancel,
    handlers: { onPointerDown: down, onPointerMove: move, onPointerUp: end, onPointerCancel: cancel },
  };
}
