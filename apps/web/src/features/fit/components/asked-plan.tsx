import { ruleNumber } from '@settlewright/anthropometry';
import { askedShapes, cornerIndex, drawingOf, formatLength, planOf } from '@settlewright/geometry';
import type { SetDocument, Spot } from '@settlewright/geometry';
import { useMemo, useState, type MouseEvent, type PointerEvent } from 'react';
import { commonScale, DrawingSvg, DrawnShapes } from '@/components/drawing-svg.tsx';
import { Measure } from '@/components/measure.tsx';
import { MOST_CORNERS, roundSpot } from '../asked.ts';
import { useFitView } from '../fit-view.ts';
import { SpotHandle } from './spot-handle.tsx';

const ROOM_PX = { width: 560, height: 440 };
const MARGIN_MM = 600;

interface AskedPlanProps {
  document: SetDocument;
  onRoute: (route: Spot[], doing: string) => void;
  onTurning: (spot: Spot, doing: string) => void;
}

/** The plan with route and turning circle to scale. A press adds a corner, a drag moves one; the fields do the same. */
export function AskedPlan({ document, onRoute, onTurning }: AskedPlanProps) {
  const { ruleBook, style } = useFitView();
  const circleMm = ruleNumber(ruleBook.rule('ACC-08'), 'circle');
  /** What a drag is about to say; the corner by its index, or the turning spot. */
  const [drag, setDrag] = useState<{ of: number | 'turning'; spot: Spot } | null>(null);
  const { route, turningAt } = document.asked;
  const plan = useMemo(() => {
    const { shapes } = planOf(document);
    const { boundsMm } = drawingOf([...shapes, ...askedShapes(document.asked, circleMm)], MARGIN_MM);
    return { shapes, boundsMm };
  }, [document, circleMm]);
  const pxPerMm = commonScale([plan], ROOM_PX);

  const spotAt = (event: MouseEvent | PointerEvent): Spot => {
    const frame = event.currentTarget.closest('[data-plan]')?.querySelector('svg')?.getBoundingClientRect();
    if (!frame) throw new Error('The plan is not in the page.');
    const pad = 2 / pxPerMm;
    const { x, y, width, height } = plan.boundsMm;
    return roundSpot(
      {
        xMm: x - pad + ((event.clientX - frame.left) / frame.width) * (width + 2 * pad),
        zMm: y - pad + ((event.clientY - frame.top) / frame.height) * (height + 2 * pad),
      },
      style,
    );
  };
  const press = (event: MouseEvent) => {
    if (!route || route.length >= MOST_CORNERS) return;
    const spot = spotAt(event);
    const index = cornerIndex(route, spot);
    onRoute(route.toSpliced(index, 0, spot), `Route corner ${index + 1} added`);
  };
  const drop = () => {
    if (!drag) return;
    setDrag(null);
    if (drag.of === 'turning') onTurning(drag.spot, 'Turning space moved');
    else if (route) onRoute(route.with(drag.of, drag.spot), `Route corner ${drag.of + 1} moved`);
  };
  const handle = (of: number | 'turning', spot: Spot) => (
    <SpotHandle
      key={of}
      words={of === 'turning' ? '' : String(of + 1)}
      spot={drag?.of === of ? drag.spot : spot}
      pxMm={1 / pxPerMm}
      onMove={(event) => setDrag({ of, spot: spotAt(event) })}
      onDrop={drop}
      onGiveUp={() => setDrag(null)}
    />
  );

  const shown = {
    ...(route && { route: typeof drag?.of === 'number' ? route.with(drag.of, drag.spot) : route }),
    ...(turningAt && { turningAt: drag?.of === 'turning' ? drag.spot : turningAt }),
  };
  return (
    <figure className="self-start desk:sticky desk:top-20">
      {/* Decoration for the keyboard: the fields beside it say and change the same. */}
      <div data-plan="" role="presentation" className={route && 'cursor-crosshair'} onClick={press}>
        <DrawingSvg drawing={plan} pxPerMm={pxPerMm} className="h-auto max-w-full bg-sheet">
          <DrawnShapes shapes={askedShapes(shown, circleMm)} />
          {turningAt && handle('turning', turningAt)}
          {route?.map((spot, i) => handle(i, spot))}
        </DrawingSvg>
      </div>
      <figcaption className="mt-2 max-w-text text-sm text-ink-2">
        {route && 'Press the floor to add a corner; drag a corner to move it. '}
        {turningAt && (
          <>
            The circle is <Measure text={formatLength(circleMm, style)} /> across, to scale; drag its middle
            to move it.
          </>
        )}
        {!route &&
          !turningAt &&
          'The route and the space for turning round are drawn here once they are said.'}
      </figcaption>
    </figure>
  );
}
