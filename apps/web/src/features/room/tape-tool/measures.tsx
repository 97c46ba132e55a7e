import { measureEnds, pinDimension, unpinDimension } from '@settlewright/geometry';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { announce } from '@/lib/announce.ts';
import { usePicture, useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';
import { EndFields, type ChosenEnd } from './end-fields.tsx';
import { sayDistance, sayShares } from './measured-words.ts';
import { layTape, removeTape } from './tape-store.ts';
import { useMeasures, useMeasuringScene, type ShownMeasure } from './use-measuring.ts';

/** Two ends by name, what lies between them, and what was measured before. */
export default function Measures() {
  const { path, style, canEdit } = useSurroundings();
  const picture = usePicture();
  const store = useRoomStore();
  const scene = useMeasuringScene(picture);
  const { laid, pinned } = useMeasures(picture, scene);
  const [from, setFrom] = useState<ChosenEnd>({});
  const [to, setTo] = useState<ChosenEnd>({});
  const ends = from.end && to.end ? ([from.end, to.end] as [typeof from.end, typeof to.end]) : undefined;
  const between = ends && measureEnds(ends, scene);

  function lay() {
    if (!ends || !between) return;
    layTape(path.setId, ends);
    announce(`${sayDistance(between, style)}; ${sayShares(between, style)}. The tape is laid.`);
  }

  function pin({ id, ends: [one, other], words }: ShownMeasure) {
    const { document } = store.getState();
    const next = pinDimension(document, [one, other]);
    if (next.dimensionId === '') return announce('The set holds as many dimension lines as it may.');
    store.getState().commit(next.document, 'Dimension line pinned');
    removeTape(path.setId, id);
    announce(`Pinned: ${words}.`);
  }

  function unpin({ id, words }: ShownMeasure) {
    store.getState().commit(unpinDimension(store.getState().document, id), 'Dimension line removed');
    announce(`Removed: ${words}.`);
  }

  return (
    <div className="flex flex-col gap-3 text-sm">
      <EndFields label="From" scene={scene} chosen={from} onChange={setFrom} />
      <EndFields label="To" scene={scene} chosen={to} onChange={setTo} />
      {between && (
        <p role="status" data-between>
          <strong className="font-semibold">{sayDistance(between, style)}</strong>
          <span className="block text-ink-2">{sayShares(between, style)}</span>
        </p>
      )}
      <p>
        <Button size="small" disabled={!between} onClick={lay}>
          Lay the tape
        </Button>
      </p>
      <MeasureList
        title="Tapes"
        measures={laid}
        actions={(measure) => (
          <>
            {canEdit && (
              <Button look="word" aria-label={`Pin ${measure.words}`} onClick={() => pin(measure)}>
                Pin
              </Button>
            )}
            <Button
              look="word"
              aria-label={`Remove ${measure.words}`}
              onClick={() => {
                removeTape(path.setId, measure.id);
                announce(`Removed: ${measure.words}.`);
              }}
            >
              Remove
            </Button>
          </>
        )}
      />
      <MeasureList
        title="Pinned dimension lines"
        measures={pinned}
        actions={(measure) =>
          canEdit && (
            <Button look="word" aria-label={`Unpin ${measure.words}`} onClick={() => unpin(measure)}>
              Remove
            </Button>
          )
        }
      />
    </div>
  );
}

interface ListProps {
  title: string;
  measures: readonly ShownMeasure[];
  actions: (measure: ShownMeasure) => React.ReactNode;
}

function MeasureList({ title, measures, actions }: ListProps) {
  const { style } = useSurroundings();
  if (measures.length === 0) return null;
  return (
    <div>
      <h3 className="font-semibold">{title}</h3>
      <ul aria-label={title}>
        {measures.map((measure) => (
          <li key={measure.id} className="border-b border-rule py-1.5">
            <span className="block">{measure.words}</span>
            {measure.line ? (
              <>
                <strong className="block font-semibold">{sayDistance(measure.line, style)}</strong>
                <span className="block text-ink-2">{sayShares(measure.line, style)}</span>
              </>
            ) : (
              <span className="block text-ink-2">Not shown: one end is not there now.</span>
            )}
            <span className="flex gap-x-4">{actions(measure)}</span>
          </li>
        ))}
      </ul>
    </div>
  );
}
