import type { NamedView } from '@settlewright/geometry';
import { lazy, Suspense, useCallback, useLayoutEffect, useState } from 'react';
import { onGround, type Taker } from '../export/still.ts';
import type { RoomPicture } from '../picture.ts';
import { boundsToShow } from '../scene/focus.ts';
import { createViewController } from '../scene/view-controller.ts';
import { frameFor } from '../scene/views.ts';
import { lensFrame, NO_INSETS } from './lens-frame.ts';

const SceneCanvas = lazy(() => import('../scene/scene-canvas.tsx'));
const NOTHING: readonly string[] = [];
const DEG = Math.PI / 180;
/** Of a lettered view, whose sheet has no ratio of its own. */
const SHEET_RATIO = 1.5;

export interface Shot {
  view: NamedView;
  /** Pixels across; as many up as the frame of the view asks for. */
  width: number;
  ground: string;
  forPaper: boolean;
}

/** Pixels of a picture of a view. */
export function shotSize({ camera }: NamedView, width: number): { width: number; height: number } {
  return { width, height: Math.round(width / (camera.kind === 'lens' ? camera.aspect : SHEET_RATIO)) };
}

function frameOf(
  { camera, section }: NamedView,
  picture: RoomPicture,
  size: { width: number; height: number },
) {
  if (camera.kind === 'lens') return lensFrame(camera, size, NO_INSETS);
  const margin = size.width * 0.05;
  return frameFor({
    letter: camera.letter,
    bounds: boundsToShow(picture, undefined, false),
    viewport: size,
    insets: { top: margin, right: margin, bottom: margin, left: margin },
    zoom: camera.zoom,
    panMm: camera.panMm,
    azimuth: camera.azimuthDeg * DEG,
    elevation: camera.elevationDeg * DEG,
    cut: section,
  });
}

interface Props extends Shot {
  picture: RoomPicture;
  onTaken: (picture: HTMLCanvasElement | null) => void;
}

/** Draws a named view beside the screen, in the size that is asked for, and hands the picture over. */
export function ViewShot({ view, width, ground, forPaper, picture, onTaken }: Props) {
  const [controller] = useState(createViewController);
  const size = shotSize(view, width);
  useLayoutEffect(() => {
    controller.resize(size);
    controller.show(frameOf(view, picture, size), false);
  });
  const offer = useCallback(
    (take: Taker) => {
      onTaken(onGround(take(), ground));
      return () => undefined;
    },
    [onTaken, ground],
  );
  return (
    <div aria-hidden="true" className="pointer-events-none fixed top-0 -left-[20000px]" style={size}>
      <Suspense fallback={null}>
        <SceneCanvas
          picture={picture}
          controller={controller}
          letter={view.camera.kind === 'lens' ? 'lens' : view.camera.letter}
          cut={view.section}
          chosenIds={NOTHING}
          showBodies={view.shown.bodies}
          theme=""
          report={() => undefined}
          offer={offer}
          forPaper={forPaper}
          pixelRatio={1}
        />
      </Suspense>
    </div>
  );
}
