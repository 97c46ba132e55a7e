import type { NamedView } from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useMemo, useRef, useState, type RefObject } from 'react';
import { flushSync } from 'react-dom';
import type { RoomPicture } from '../picture.ts';
import { union } from '../scene/bounds.ts';
import { boundsToShow, cutThrough } from '../scene/focus.ts';
import { createViewController, type ViewController } from '../scene/view-controller.ts';
import { frameFor, type Cut, type Insets, type SceneView } from '../scene/views.ts';
import { frameBox, lensFrame, type FrameBox } from '../views/lens-frame.ts';
import { createMovingHand, handOf, START, type Hand } from './moving-hand.ts';

const WIDE: Insets = { top: 74, right: 40, bottom: 56, left: 96 };
const NARROW: Insets = { top: 62, right: 14, bottom: 30, left: 14 };
/** Below, the paper fades over a fourteenth of the sheet: feet stand above that. */
const low = (height: number): Insets => ({ top: 54, right: 40, bottom: height * 0.08 + 4, left: 90 });
const NARROW_PX = 560;
const LOW_PX = 430;

const insetsOf = ({ width, height }: { width: number; height: number }): Insets =>
  width < NARROW_PX ? NARROW : height < LOW_PX ? low(height) : WIDE;

export interface View {
  controller: ViewController;
  cut: Cut | undefined;
  narrow: boolean;
  hand: Hand;
  /** Where the frame of a lens lies on the sheet, when the room is seen through one. */
  lensBox: FrameBox | undefined;
  zoomBy: (factor: number) => void;
  panBy: (dxPx: number, dyPx: number) => void;
  turnBy: (azimuth: number, elevation: number) => void;
  fit: () => void;
}

/** The frame of the present view: letter, size of the sheet, zoom and pan put together. */
export function useView(
  /** Of the committed document: the frame holds still while something is typed or dragged. */
  picture: RoomPicture,
  letter: SceneView,
  selectedPieceId: string | undefined,
  sheet: RefObject<HTMLElement | null>,
  /** The named view that is looked through, the lens that has to be seen on the plan, and the cut of the set. */
  {
    named,
    lens,
    section,
  }: { named: NamedView | undefined; lens: { id: string } | undefined; section: Cut | undefined },
): View {
  const [controller] = useState(createViewController);
  const [size, setSize] = useState({ width: 0, height: 0 });
  const [hand, setHand] = useState(START);
  const camera = named?.camera;
  const narrow = size.width > 0 && size.width < NARROW_PX;
  const { document, parts } = picture;
  const piece = document.pieces.find((candidate) => candidate.id === selectedPieceId);

  const onPlan = letter === 'D' ? document.views?.find(({ id }) => id === lens?.id)?.camera : undefined;
  const bounds = useMemo(() => {
    const shown = boundsToShow(picture, selectedPieceId, narrow);
    if (onPlan?.kind !== 'lens') return shown;
    const at = [onPlan.at.xMm, 0, onPlan.at.zMm] as const;
    return union(shown, { min: at, max: at });
  }, [picture, selectedPieceId, narrow, onPlan]);
  const cut = useMemo(
    () => section ?? (letter === 'C' ? cutThrough(piece ?? document.pieces[0], parts) : undefined),
    [section, letter, piece, document, parts],
  );

  useLayoutEffect(() => {
    const element = sheet.current;
    if (!element) return undefined;
    const measure = () => {
      const { width, height } = element.getBoundingClientRect();
      setSize((before) => (before.width === width && before.height === height ? before : { width, height }));
    };
    measure();
    // Before the page is painted: a picture of the former size would be seen cut off.
    const observer = new ResizeObserver(() => flushSync(measure));
    observer.observe(element);
    return () => observer.disconnect();
  }, [sheet]);

  const last = useRef<{ letter: SceneView; hand: Hand } | null>(null);
  const [moving] = useState(() => createMovingHand(setHand));
  const show = useCallback(
    (by: Hand, move: boolean) => {
      if (size.width === 0) return;
      const insets = insetsOf(size);
      if (letter !== 'lens')
        controller.show(frameFor({ letter, bounds, viewport: size, insets, cut, ...by }), move);
      else if (camera?.kind === 'lens') controller.show(lensFrame(camera, size, insets), move);
    },
    [controller, letter, bounds, size, cut, camera],
  );
  useLayoutEffect(() => {
    if (size.width === 0) return;
    controller.resize(size);
    const before = last.current;
    last.current = { letter, hand };
    const move = before !== null && (before.letter !== letter || before.hand.zoom !== hand.zoom);
    // Drawn anew for another reason, the sheet stays where the hand has it.
    if (before?.hand !== hand) moving.stand(hand);
    show(moving.now(), move);
  }, [controller, letter, size, hand, moving, show]);

  useEffect(
    () => () => {
      controller.stop();
      moving.stop();
    },
    [controller, moving],
  );

  const [shownLetter, setShownLetter] = useState(letter);
  if (shownLetter !== letter) {
    setShownLetter(letter);
    setHand((before) => ({ ...before, zoom: 1, panMm: [0, 0] }));
  }
  const [shownCamera, setShownCamera] = useState<NamedView['camera']>();
  if (shownCamera !== camera) {
    setShownCamera(camera);
    if (camera?.kind === 'letter') setHand(handOf(camera));
  }

  /** Moves the sheet, frame by frame, without a new page for each. */
  function moveTo(next: Hand) {
    moving.move(next);
    show(next, false);
  }

  /** Goes there by a new page. The next step counts from it at once, as pages may come slower than steps. */
  function goTo(next: Hand) {
    moving.stand(next);
    setHand(next);
  }

  return {
    controller,
    cut,
    narrow,
    hand,
    lensBox: camera?.kind === 'lens' && size.width > 0 ? frameBox(camera, size, insetsOf(size)) : undefined,
    zoomBy: (factor) => {
      const hand = moving.now();
      goTo({ ...hand, zoom: Math.min(12, Math.max(0.4, hand.zoom * factor)) });
    },
    panBy: (dxPx, dyPx) => {
      const frame = controller.frame();
      if (!frame) return;
      const mm = (2 * frame.halfHeightMm) / Math.max(1, controller.viewport().height);
      const hand = moving.now();
      const [across, up] = hand.panMm;
      moveTo({ ...hand, panMm: [across - dxPx * mm, up + dyPx * mm] });
    },
    turnBy: (azimuth, elevation) => {
      const hand = moving.now();
      moveTo({
        ...hand,
        azimuth: hand.azimuth + azimuth,
        elevation: Math.min(1.45, Math.max(0.05, hand.elevation + elevation)),
      });
    },
    fit: () => goTo({ ...moving.now(), zoom: 1, panMm: [0, 0] }),
  };
}
