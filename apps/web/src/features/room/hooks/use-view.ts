import { useEffect, useLayoutEffect, useMemo, useRef, useState, type RefObject } from 'react';
import { flushSync } from 'react-dom';
import type { RoomPicture } from '../picture.ts';
import { boundsToShow, cutThrough } from '../scene/focus.ts';
import { createViewController, type ViewController } from '../scene/view-controller.ts';
import { frameFor, type Cut, type Insets, type ViewLetter } from '../scene/views.ts';

const WIDE: Insets = { top: 74, right: 40, bottom: 56, left: 96 };
const NARROW: Insets = { top: 62, right: 14, bottom: 30, left: 14 };
/** Below, the paper fades over a fourteenth of the sheet: feet stand above that. */
const low = (height: number): Insets => ({ top: 54, right: 40, bottom: height * 0.08 + 4, left: 90 });
const NARROW_PX = 560;
const LOW_PX = 430;

export interface View {
  controller: ViewController;
  cut: Cut | undefined;
  narrow: boolean;
  zoomBy: (factor: number) => void;
  panBy: (dxPx: number, dyPx: number) => void;
  turnBy: (azimuth: number, elevation: number) => void;
  fit: () => void;
}

interface Hand {
  zoom: number;
  panMm: readonly [number, number];
  azimuth: number;
  elevation: number;
}

const START: Hand = { zoom: 1, panMm: [0, 0], azimuth: 0.62, elevation: 0.38 };

/** The frame of the present view: letter, size of the sheet, zoom and pan put together. */
export function useView(
  /** Of the committed document: the frame holds still while something is typed or dragged. */
  picture: RoomPicture,
  letter: ViewLetter,
  selectedPieceId: string | undefined,
  sheet: RefObject<HTMLElement | null>,
): View {
  const [controller] = useState(createViewController);
  const [size, setSize] = useState({ width: 0, height: 0 });
  const [hand, setHand] = useState(START);
  const narrow = size.width > 0 && size.width < NARROW_PX;
  const { document, parts } = picture;
  const piece = document.pieces.find((candidate) => candidate.id === selectedPieceId);

  const bounds = useMemo(
    () => boundsToShow(picture, selectedPieceId, narrow),
    [picture, selectedPieceId, narrow],
  );
  const cut = useMemo(
    () => (letter === 'C' ? cutThrough(piece ?? document.pieces[0], parts) : undefined),
    [letter, piece, document, parts],
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

  const last = useRef<{ letter: ViewLetter; zoom: number } | null>(null);
  useLayoutEffect(() => {
    if (size.width === 0) return;
    controller.resize(size);
    const move = last.current !== null && (last.current.letter !== letter || last.current.zoom !== hand.zoom);
    last.current = { letter, zoom: hand.zoom };
    controller.show(
      frameFor({
        letter,
        bounds,
        viewport: size,
        insets: narrow ? NARROW : size.height < LOW_PX ? low(size.height) : WIDE,
        cut,
        ...hand,
      }),
      move,
    );
  }, [controller, letter, bounds, size, narrow, cut, hand]);

  useEffect(() => () => controller.stop(), [controller]);

  const [shownLetter, setShownLetter] = useState(letter);
  if (shownLetter !== letter) {
    setShownLetter(letter);
    setHand((before) => ({ ...before, zoom: 1, panMm: [0, 0] }));
  }

  return {
    controller,
    cut,
    narrow,
    zoomBy: (factor) =>
      setHand((before) => ({ ...before, zoom: Math.min(12, Math.max(0.4, before.zoom * factor)) })),
    panBy: (dxPx, dyPx) => {
      const frame = controller.frame();
      if (!frame) return;
      const mm = (2 * frame.halfHeightMm) / Math.max(1, controller.viewport().height);
      setHand((before) => ({
        ...before,
        panMm: [before.panMm[0] - dxPx * mm, before.panMm[1] + dyPx * mm],
      }));
    },
    turnBy: (azimuth, elevation) =>
      setHand((before) => ({
        ...before,
        azimuth: before.azimuth + azimuth,
        elevation: Math.min(1.45, Math.max(0.05, before.elevation + elevation)),
      })),
    fit: () => setHand((before) => ({ ...before, zoom: 1, panMm: [0, 0] })),
  };
}
