import { pieceHandles, type Piece } from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useMemo, useRef } from 'react';
import type { LabelBoxes } from '../overlay/box.ts';
import type { ViewController } from '../scene/view-controller.ts';
import { isBehind, type Cut } from '../scene/views.ts';
import { drawnDocument, useRoom } from '../store.ts';
import { HandleGrip } from './handle-grip.tsx';
import { placeHandles } from './handle-layout.ts';

interface Props {
  /** The selected piece. */
  piece: Piece;
  controller: ViewController;
  /** Where names and flags stand just now. */
  labels: LabelBoxes;
  cut: Cut | undefined;
  /** On a narrow sheet only the numbers of the first sentence have room. */
  narrow: boolean;
}

/** Handles of the selected piece over the picture. React makes them; the view moves them. */
export default function HandleLayer({ piece, controller, labels, cut, narrow }: Props) {
  const layer = useRef<HTMLDivElement>(null);
  const inHand = useRef<string>(undefined);
  const committed = useRoom((state) => state.document.pieces.find(({ id }) => id === piece.id));
  const handles = useMemo(
    () => (committed ? pieceHandles(committed).filter(({ main }) => main || !narrow) : []),
    [committed, narrow],
  );
  const drawn = useRoom((state) => drawnDocument(state).pieces.find(({ id }) => id === piece.id));
  const shown = useMemo(
    () => (drawn ? pieceHandles(drawn).filter(({ atMm }) => isBehind(atMm, cut)) : []),
    [drawn, cut],
  );

  const layOut = useCallback(() => {
    const frame = controller.frame();
    const root = layer.current;
    if (!frame || !root) return;
    const elements = [...root.querySelectorAll<HTMLElement>('[data-handle]')];
    const known = new Set(elements.map(({ dataset }) => dataset.handle));
    const placed = placeHandles(
      frame,
      controller.viewport(),
      shown.filter(({ id }) => known.has(id)),
      labels.now(),
      inHand.current,
    );
    for (const element of elements) {
      const at = placed.get(element.dataset.handle ?? '');
      element.style.setProperty('visibility', at ? 'visible' : 'hidden');
      if (!at) continue;
      element.style.setProperty('transform', `translate(${at.x}px, ${at.y}px) translate(-50%, -50%)`);
      element
        .querySelector('[data-arrow]')
        ?.setAttribute('transform', `rotate(${((at.angleRad * 180) / Math.PI).toFixed(1)})`);
    }
  }, [controller, labels, shown]);

  useLayoutEffect(layOut);
  // Anew after each render, as the labels do: handles keep clear of where those have just gone.
  useEffect(() => controller.subscribe(layOut));

  const onHand = useCallback((handleId: string | undefined) => {
    inHand.current = handleId;
  }, []);

  if (!committed) return null;
  return (
    <div ref={layer} data-handles className="pointer-events-none absolute inset-0">
      {handles.map((handle) => (
        <HandleGrip
          key={handle.id}
          piece={committed}
          handle={handle}
          controller={controller}
          onHand={onHand}
        />
      ))}
    </div>
  );
}
