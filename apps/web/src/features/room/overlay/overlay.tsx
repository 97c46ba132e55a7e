import { formatLength, type LengthStyle, type TapeLine } from '@settlewright/geometry';
import { useCallback, useEffect, useLayoutEffect, useRef, useState } from 'react';
import { classNames } from '@/components/class-names.ts';
import { Measure } from '@/components/measure.tsx';
import type { SeatedBody } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import type { ViewController } from '../scene/view-controller.ts';
import { mix } from '../scene/vectors.ts';
import { boxOf, type LabelBoxes } from './box.ts';
import { createLabelLayer } from './label-layer.ts';
import { isEndOn, placeFlags, tapePath, type Blob } from './place-flags.ts';
import { placeNames, placeNamesAtHeads } from './place-names.ts';
import { TapeFlag } from './tape-flag.tsx';
import { tapeTone } from './tape-words.ts';
import { shortName } from '@/lib/short-name.ts';

interface Props {
  controller: ViewController;
  /** Is told where names and flags stand. */
  labels: LabelBoxes;
  /** From above there is no room over the heads: each name stands at its own. */
  namesAtHeads: boolean;
  bodies: readonly SeatedBody[];
  tapes: readonly TapeLine[];
  style: LengthStyle;
  litCellId: string | null;
  selectedPieceId: string | undefined;
  onSelectPiece: (pieceId: string) => void;
  onOpenCell: (cellId: string) => void;
}

const LINE_TONES = {
  chalk: 'stroke-chalk',
  ink: 'stroke-ink',
  fits: 'stroke-fits',
  tight: 'stroke-tight',
  wont: 'stroke-wont',
  unknown: 'stroke-unknown',
};

/** Names and tapes over the picture, in screen pixels. React makes them; the view moves them. */
export function Overlay(props: Props) {
  const { controller, labels, namesAtHeads, bodies, tapes, style, litCellId, onSelectPiece } = props;
  // Whoever sees verdicts alone reads no heights either, though the body is drawn.
  const { detail } = useSurroundings();
  const root = useRef<HTMLDivElement>(null);
  const [layer] = useState(createLabelLayer);
  const someLit = tapes.some((tape) => tape.cellId !== undefined && tape.cellId === litCellId);

  const layOut = useCallback(() => {
    const frame = controller.frame();
    if (!frame) return;
    const viewport = controller.viewport();
    const { find, sizeOf } = layer;
    const headsMm = bodies.map((body) => body.crownMm);
    const names = (namesAtHeads ? placeNamesAtHeads : placeNames)(
      frame,
      viewport,
      bodies.map((body) => ({
        id: body.placeId,
        headMm: body.crownMm,
        ...sizeOf('name', body.placeId),
      })),
    );
    const visible = new Set(names.map((name) => name.id));
    for (const body of bodies) {
      const hidden = !visible.has(body.placeId);
      find<HTMLElement>('name', body.placeId)?.style.setProperty('visibility', hidden ? 'hidden' : 'visible');
      if (hidden) find<SVGPathElement>('leader', body.placeId)?.setAttribute('d', '');
    }
    for (const name of names) {
      const element = find<HTMLElement>('name', name.id);
      element?.style.setProperty('transform', `translate(${name.x}px, ${name.y}px) translate(-50%, -50%)`);
      find<SVGPathElement>('leader', name.id)?.setAttribute(
        'd',
        namesAtHeads
          ? ''
          : `M${name.x.toFixed(1)} ${(name.y + 11).toFixed(1)}L${name.head.x.toFixed(1)} ${(name.head.y - 2).toFixed(1)}`,
      );
    }
    const readable = tapes.filter((tape) => !isEndOn(frame, viewport, tape.fromMm, tape.toMm));
    for (const tape of tapes) {
      const hidden = !readable.includes(tape);
      find<HTMLElement>('flag', tape.id)?.style.setProperty('visibility', hidden ? 'hidden' : 'visible');
      if (!hidden) continue;
      find<SVGPathElement>('tape', tape.id)?.setAttribute('d', '');
      find<SVGPathElement>('tape-leader', tape.id)?.setAttribute('d', '');
    }
    const placed = placeFlags(
      frame,
      viewport,
      readable.map((tape) => ({
        id: tape.id,
        fromMm: tape.fromMm,
        toMm: tape.toMm,
        ...sizeOf('flag', tape.id),
      })),
      headsMm,
      names,
      bodies.flatMap(blobsOf),
    );
    for (const flag of placed) {
      const tape = tapes.find((candidate) => candidate.id === flag.id);
      find<HTMLElement>('flag', flag.id)?.style.setProperty(
        'transform',
        `translate(${flag.x}px, ${flag.y}px) translate(-50%, -50%)`,
      );
      const tickMm = style.system === 'millimetres' ? 20 : 25.4;
      const path = tapePath(flag, Math.abs(tape?.valueMm ?? 0), tickMm);
      find<SVGPathElement>('tape', flag.id)?.setAttribute('d', path);
      const leader = flag.leader
        ? `M${flag.leader.x.toFixed(1)} ${flag.leader.y.toFixed(1)}L${flag.x.toFixed(1)} ${flag.y.toFixed(1)}`
        : '';
      find<SVGPathElement>('tape-leader', flag.id)?.setAttribute('d', leader);
    }
    labels.tell([...names, ...placed].map(boxOf));
  }, [controller, layer, labels, namesAtHeads, bodies, tapes, style]);
  const layOutAnew = useCallback(() => {
    layer.renew(root.current);
    layOut();
  }, [layer, layOut]);

  useLayoutEffect(layOutAnew);
  useEffect(() => controller.subscribe(layOut), [controller, layOut]);
  useEffect(() => {
    // The first layout may have measured words in the fallback font.
    void document.fonts?.ready.then(layOutAnew);
  }, [layOutAnew]);

  return (
    <div ref={root} data-overlay className="pointer-events-none absolute inset-0 overflow-hidden">
      <svg className="tape absolute inset-0 size-full" aria-hidden="true" fill="none">
        {bodies.map((body) => (
          <path key={body.placeId} data-leader={body.placeId} className="stroke-ink-2" strokeWidth="0.9" />
        ))}
        {tapes.map((tape) => {
          const lit = tape.cellId !== undefined && tape.cellId === litCellId;
          return (
            <g
              key={tape.id}
              className={LINE_TONES[tapeTone(tape)]}
              opacity={someLit && !lit ? 0.5 : 1}
              strokeWidth={lit ? 3 : 1.5}
            >
              <path data-tape={tape.id} />
              <path data-tape-leader={tape.id} strokeWidth="1" />
            </g>
          );
        })}
      </svg>
      {bodies.map((body) => (
        <button
          key={body.placeId}
          type="button"
          tabIndex={-1}
          data-name={body.placeId}
          onClick={() => onSelectPiece(body.pieceId)}
          className={classNames(
            'pointer-events-auto absolute top-0 left-0 rounded-sm px-1 text-[0.84rem] leading-5 whitespace-nowrap',
            namesAtHeads
              ? 'bg-sheet/85'
              : '[text-shadow:0_0_3px_var(--color-paper),0_0_6px_var(--color-paper)]',
          )}
        >
          <strong className="font-semibold">{shortName(body.name)}</strong>
          {!namesAtHeads && detail === 'full' && (
            <span className="text-ink-2 max-phone:hidden">
              {' '}
              <Measure text={formatLength(body.statureMm, { ...style, feet: true })} />
              {body.estimated && ', est.'}
            </span>
          )}
        </button>
      ))}
      {tapes.map((tape) => (
        <div
          key={tape.id}
          data-flag={tape.id}
          className={classNames(
            'pointer-events-auto absolute top-0 left-0 focus-within:z-20',
            someLit && tape.cellId !== litCellId && 'opacity-50',
          )}
        >
          <TapeFlag {...props} tape={tape} onLayout={layOutAnew} />
        </div>
      ))}
    </div>
  );
}

/** A body as a string of round spots, for labels that keep clear of it. */
function blobsOf(body: SeatedBody): Blob[] {
  return body.pose.segments.flatMap((segment): Blob[] => {
    if (segment.kind === 'ellipsoid') return [{ atMm: segment.centreMm, radiusMm: segment.radiiMm[0] }];
    const radiusMm = (segment.fromRadiusMm + segment.toRadiusMm) / 2;
    return [0.2, 0.5, 0.8].map((t) => ({ atMm: mix(segment.fromMm, segment.toMm, t), radiusMm }));
  });
}
