import { endWords, measureEnds, snapEnd, type MeasureEnd, type MeasuringScene } from '@settlewright/geometry';
import { useEffect, useRef, type PointerEvent, type RefObject } from 'react';
import { announce } from '@/lib/announce.ts';
import { isTaken, useSingleKeys } from '../hooks/use-shortcuts.ts';
import type { View } from '../hooks/use-view.ts';
import { showReadOut } from '../components/read-out.ts';
import type { RoomPicture } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { dot } from '../scene/vectors.ts';
import { pixelsPerMm, project, rayThrough } from '../scene/view-frame.ts';
import type { SceneView } from '../scene/views.ts';
import { visibleParts } from '../scene/visible-parts.ts';
import { sayDistance, sayShares } from './measured-words.ts';
import { holdFirst, layTape, takeTape, useTapeTool } from './tape-store.ts';

/** How near a corner counts as pressed: about the width of a finger, less for a mouse. */
const REACH_PX = { touch: 20, mouse: 11 };
const DRAG_STARTS_PX = 5;

/** Takes points of the drawing while the tape is in the hand; a drag still moves the sheet. */
export function useTapeHand(options: {
  picture: RoomPicture;
  scene: MeasuringScene;
  view: View;
  letter: SceneView;
  showBodies: boolean;
  /** Says beside the pointer what a press would take. */
  readOut: RefObject<HTMLDivElement | null>;
}) {
  const { picture, scene, view, letter, showBodies, readOut } = options;
  const { on, whole, first } = useTapeTool();
  const { path, style } = useSurroundings();
  const singleKeys = useSingleKeys((state) => state.on);
  const pressed = useRef<{ x: number; y: number; lastX: number; lastY: number; moved: boolean } | null>(null);
  const request = useRef(0);

  useEffect(() => () => cancelAnimationFrame(request.current), []);
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      if (isTaken(event) || event.altKey || event.ctrlKey || event.metaKey) return;
      if (event.key === 'Escape' && on) {
        if (first) holdFirst(undefined);
        else takeTape(false);
        // The drawing would let go of the selected piece as well.
        event.stopPropagation();
      } else if (event.key.toLowerCase() === 't' && singleKeys) takeTape(!on);
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', listen, { capture: true });
    return () => window.removeEventListener('keydown', listen, { capture: true });
  }, [on, first, singleKeys]);

  function under(x: number, y: number, pointer: string) {
    const frame = view.controller.frame();
    if (!frame) return undefined;
    const viewport = view.controller.viewport();
    const line = rayThrough(frame, viewport, x, y);
    const px = (pointer === 'touch' ? REACH_PX.touch : REACH_PX.mouse) / pixelsPerMm(frame, viewport);
    const { cut } = view;
    const steep = cut ? dot(line.direction, cut.toward) : 0;
    const fromMm =
      cut && steep < 0 ? (dot(cut.pointMm, cut.toward) - dot(line.origin, cut.toward)) / steep : 0;
    return snapEnd(showBodies ? scene : { ...scene, bodies: [] }, {
      line,
      reachMm: (along) => (frame.perspective < 1e-9 ? px : px * along * frame.perspective),
      fromMm: Math.max(0, fromMm),
      whole,
      parts: visibleParts(picture.document, picture.parts, letter),
    });
  }

  function take(end: MeasureEnd) {
    if (!first) {
      holdFirst(end);
      announce(`From ${endWords(end, scene)}. Press the second point.`);
      return;
    }
    const line = measureEnds([first, end], scene);
    layTape(path.setId, [first, end]);
    if (line) announce(`${sayDistance(line, style)}; ${sayShares(line, style)}.`);
  }

  function at(event: PointerEvent<HTMLElement>) {
    const box = event.currentTarget.getBoundingClientRect();
    return { x: event.clientX - box.left, y: event.clientY - box.top };
  }

  function down(event: PointerEvent<HTMLElement>) {
    if (event.button !== 0 || event.target instanceof HTMLButtonElement) return;
    const { x, y } = at(event);
    pressed.current = { x, y, lastX: x, lastY: y, moved: false };
    event.currentTarget.setPointerCapture(event.pointerId);
  }

  function move(event: PointerEvent<HTMLElement>) {
    const { x, y } = at(event);
    const { pointerType } = event;
    const press = pressed.current;
    if (press) {
      press.moved ||= Math.hypot(x - press.x, y - press.y) >= DRAG_STARTS_PX;
      if (press.moved && letter === 'E') view.turnBy(-(x - press.lastX) * 0.008, (y - press.lastY) * 0.006);
      else if (press.moved) view.panBy(x - press.lastX, y - press.lastY);
      [press.lastX, press.lastY] = [x, y];
      return;
    }
    cancelAnimationFrame(request.current);
    request.current = requestAnimationFrame(() => {
      const snap = under(x, y, pointerType);
      const frame = view.controller.frame();
      const point = snap && frame && project(frame, view.controller.viewport(), snap.pointMm);
      showReadOut(readOut.current, snap && endWords(snap.end, scene), point?.x ?? x, point?.y ?? y);
    });
  }

  function up(event: PointerEvent<HTMLElement>) {
    const press = pressed.current;
    pressed.current = null;
    if (!press || press.moved) return;
    const { x, y } = at(event);
    const snap = under(x, y, event.pointerType);
    if (snap) take(snap.end);
    else announce('Nothing stands there.');
    showReadOut(readOut.current, snap && endWords(snap.end, scene), x, y);
  }

  function leave() {
    pressed.current = null;
    cancelAnimationFrame(request.current);
    showReadOut(readOut.current, undefined, 0, 0);
  }

  return on
    ? {
        onPointerDown: down,
        onPointerMove: move,
        onPointerUp: up,
        onPointerCancel: leave,
        onPointerLeave: leave,
      }
    : undefined;
}
