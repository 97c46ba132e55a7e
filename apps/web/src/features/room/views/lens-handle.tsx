import { aimAt, changeView, lengthStep, type LengthStyle, type LensCamera } from '@settlewright/geometry';
import { useRef, type KeyboardEvent, type PointerEvent, type Ref } from 'react';
import { announce } from '@/lib/announce.ts';
import { useSurroundings } from '../room-context.tsx';
import { onLevel } from '../scene/pick.ts';
import type { ViewController } from '../scene/view-controller.ts';
import { rayThrough } from '../scene/view-frame.ts';
import { useRoomStore } from '../store.ts';

const STEPS_PER_PRESS = 8;
const TURN_DEG = 1;
const FAR = 8;
const WAYS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};
const SAID = {
  lens: { name: 'Lens on the plan; arrow keys move it', step: 'Lens moved', look: 'bg-sheet' },
  aim: { name: 'Aim of the lens; left and right turn it', step: 'Lens turned', look: 'bg-chalk' },
};

interface Props {
  which: keyof typeof SAID;
  id: string;
  camera: LensCamera;
  controller: ViewController;
  style: LengthStyle;
  ref: Ref<HTMLButtonElement>;
}

/** What a hand takes hold of on the plan: the lens itself, or the point it is aimed at. */
export function LensHandle({ which, id, camera, controller, style, ref }: Props) {
  const { canEdit } = useSurroundings();
  const store = useRoomStore();
  const held = useRef<LensCamera | null>(null);
  const { name, step, look } = SAID[which];

  const changed = (to: { xMm: number; zMm: number }): LensCamera =>
    which === 'lens'
      ? { ...camera, at: { xMm: Math.round(to.xMm), zMm: Math.round(to.zMm) } }
      : { ...camera, turnDeg: aimAt(camera, [to.xMm, camera.heightMm, to.zMm]).turnDeg };

  function commit(next: LensCamera) {
    const { document, commit: keep } = store.getState();
    keep(changeView(document, id, { camera: next }), step);
    announce(step);
  }

  function move(event: PointerEvent<HTMLButtonElement>) {
    const box = event.currentTarget.parentElement?.getBoundingClientRect();
    const frame = controller.frame();
    if (!held.current || !box || !frame) return;
    event.stopPropagation();
    const ray = rayThrough(frame, controller.viewport(), event.clientX - box.left, event.clientY - box.top);
    const floor = onLevel(ray, 0);
    if (!floor) return;
    held.current = changed(floor);
    store.getState().showPreview(changeView(store.getState().document, id, { camera: held.current }));
  }

  function press(event: KeyboardEvent<HTMLButtonElement>) {
    const way = WAYS[event.key];
    if (!way) return;
    event.preventDefault();
    event.stopPropagation();
    const far = event.shiftKey ? FAR : 1;
    if (which === 'aim') {
      const turned = camera.turnDeg - way[0] * TURN_DEG * far;
      if (way[0] !== 0) commit({ ...camera, turnDeg: ((turned + 540) % 360) - 180 });
      return;
    }
    const by = lengthStep(style) * STEPS_PER_PRESS * far;
    commit({ ...camera, at: { xMm: camera.at.xMm + way[0] * by, zMm: camera.at.zMm + way[1] * by } });
  }

  return (
    <button
      ref={ref}
      type="button"
      disabled={!canEdit}
      aria-label={name}
      className={`pointer-events-auto absolute top-0 left-0 size-6 touch-none rounded-full border-2 border-chalk ${look} before:absolute before:-inset-2.5`}
      onPointerDown={(event) => {
        if (event.button !== 0) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        held.current = camera;
      }}
      onPointerMove={move}
      onPointerUp={() => {
        const last = held.current;
        held.current = null;
        if (last && store.getState().preview) commit(last);
      }}
      onPointerCancel={() => {
        held.current = null;
        store.getState().showPreview(null);
      }}
      onKeyDown={press}
    />
  );
}
