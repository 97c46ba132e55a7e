import { lensStand, wedgeOf, type LensCamera, type LengthStyle } from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useRef } from 'react';
import type { ViewController } from '../scene/view-controller.ts';
import { project } from '../scene/view-frame.ts';
import { LensHandle } from './lens-handle.tsx';

const REACH_MM = 3000;

interface Props {
  controller: ViewController;
  lens: { id: string; camera: LensCamera };
  style: LengthStyle;
}

/** A lens on the plan: its place, the wedge of its frame, and two handles to move and to aim it. */
export function LensOnPlan({ controller, lens: { id, camera }, style }: Props) {
  const wedge = useRef<SVGPathElement>(null);
  const lensHandle = useRef<HTMLButtonElement>(null);
  const aimHandle = useRef<HTMLButtonElement>(null);

  const layOut = useCallback(() => {
    const frame = controller.frame();
    if (!frame) return;
    const at = (x: number, z: number) => project(frame, controller.viewport(), [x, 0, z]);
    const { left, right } = wedgeOf(camera, REACH_MM);
    const { toward } = lensStand({ ...camera, tiltDeg: 0 });
    const eye = at(camera.at.xMm, camera.at.zMm);
    const aim = at(camera.at.xMm - toward[0] * REACH_MM, camera.at.zMm - toward[2] * REACH_MM);
    const [a, b] = [at(...left), at(...right)];
    wedge.current?.setAttribute(
      'd',
      `M${a.x.toFixed(1)} ${a.y.toFixed(1)}L${eye.x.toFixed(1)} ${eye.y.toFixed(1)}L${b.x.toFixed(1)} ${b.y.toFixed(1)}Z`,
    );
    const put = (button: HTMLButtonElement | null, { x, y }: { x: number; y: number }) =>
      button?.style.setProperty('transform', `translate(${x}px, ${y}px) translate(-50%, -50%)`);
    put(lensHandle.current, eye);
    put(aimHandle.current, aim);
  }, [controller, camera, lensHandle, aimHandle]);
  useLayoutEffect(layOut);
  // The view goes to the plan after this is laid out first, and before it listens.
  useEffect(() => {
    layOut();
    return controller.subscribe(layOut);
  }, [controller, layOut]);

  return (
    <div className="pointer-events-none absolute inset-0 overflow-hidden" data-lens-on-plan>
      <svg aria-hidden="true" className="absolute inset-0 size-full">
        <path ref={wedge} className="fill-chalk/12 stroke-chalk" strokeWidth="1.5" strokeLinejoin="round" />
      </svg>
      <LensHandle
        ref={lensHandle}
        which="lens"
        id={id}
        camera={camera}
        controller={controller}
        style={style}
      />
      <LensHandle ref={aimHandle} which="aim" id={id} camera={camera} controller={controller} style={style} />
    </div>
  );
}
