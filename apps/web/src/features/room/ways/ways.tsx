import {
  formatLength,
  leavesOfTable,
  wheelchairFloor,
  type MayMove,
  type SetDocument,
} from '@settlewright/geometry';
import { useEffect, useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Select } from '@/components/select.tsx';
import { Toggle } from '../components/toggle.tsx';
import { useTakeStep } from '../hooks/use-take-step.ts';
import { useSurroundings } from '../room-context.tsx';
import { EntranceFields, withEntrance } from './entrance-fields.tsx';
import { sayFloor, sayFloorSources } from './floor-words.ts';
import { showWay } from './shown-way.ts';
import { useWalk } from './use-walk.ts';
import { useWaysIn } from './use-ways-in.ts';
import { WayPlan } from './way-plan.tsx';
import { sayChildren, sayHelp, sayLeftOut, sayWay } from './way-words.ts';

const NO_POSES: never[] = [];

/** The ways in of everybody who sits, and the floor of wheelchairs. */
export default function Ways({ document }: { document: SetDocument }) {
  const { engine, style, canEdit } = useSurroundings();
  const take = useTakeStep();
  const [mayMove, setMayMove] = useState<MayMove>({ chairs: true, leaves: true });
  const { comers, leftOut, children, heightsMm, found, fault } = useWaysIn(document, mayMove);
  const [chosen, setChosen] = useState<string>();
  const [narrow, setNarrow] = useState(false);
  const widest = found?.ways.find(({ placeId }) => placeId === chosen) ?? found?.ways[0];
  const way = useMemo(
    () => (narrow && widest?.freer ? { ...widest, ...widest.freer, past: [] } : widest),
    [narrow, widest],
  );
  const comer = comers.find(({ placeId }) => placeId === way?.placeId);
  const poses = useMemo(() => way?.steps.flatMap((step) => step.poses) ?? NO_POSES, [way]);
  const walk = useWalk(poses);
  const still = matchMedia('(prefers-reduced-motion: reduce)').matches;
  const floor = useMemo(() => wheelchairFloor(document, engine.ruleBook), [document, engine]);
  useEffect(() => {
    showWay(way, floor);
    return () => showWay(undefined);
  }, [way, floor]);
  const length = (mm: number) => formatLength(mm, style);
  const naming = {
    length,
    name: (placeId: string) => comers.find((one) => one.placeId === placeId)?.name ?? 'whoever sits there',
  };
  const kinds = new Set(document.pieces.map(({ kind }) => kind));
  const hasLeaves = document.pieces.some(
    (piece) => piece.kind === 'table' && leavesOfTable(piece).length > 0,
  );
  const stuck = found?.ways.filter(({ passes }) => !passes) ?? [];

  return (
    <div className="flex flex-col gap-3 text-sm">
      {comers.length === 0 && <p>Seat somebody whose measures are known to see how they get in.</p>}
      {leftOut.length > 0 && <p>{sayLeftOut(leftOut)}</p>}
      {children.length > 0 && <p>{sayChildren(children)}</p>}
      {fault && <p className="text-wont">{fault} Change the set or open this again.</p>}
      {comers.length > 0 && !found && !fault && <p role="status">Looking for the ways in.</p>}
      {way && found && (
        <Select
          label="Way in of"
          value={way.placeId}
          options={found.ways.map(({ placeId, passes }) => ({
            value: placeId,
            words: naming.name(placeId),
            ...(passes ? {} : { detail: 'stuck' }),
          }))}
          onChange={setChosen}
        />
      )}
      <WayPlan
        document={document}
        way={way}
        comer={comer}
        heightsMm={heightsMm}
        floor={floor}
        walker={walk.pose}
        {...(canEdit && {
          onEntrance: (spot) =>
            take(withEntrance(document, spot), document.asked.entrance ? 'Entrance moved' : 'Entrance set'),
        })}
      />
      {way && (
        <>
          <div aria-live="polite">
            <p>{sayWay(way, naming)}</p>
            {widest && sayHelp(widest, naming).map((words) => <p key={words}>{words}</p>)}
          </div>
          {widest?.freer && (
            <Toggle on={narrow} onChange={setNarrow}>
              Draw the way past {widest.freer.past.length === 0 ? 'nobody' : 'fewer people'}
            </Toggle>
          )}
          {!still && poses.length > 1 && (
            <Button size="small" onClick={walk.pose ? walk.stop : walk.start}>
              {walk.pose ? 'Stop the walk' : 'Walk the way'}
            </Button>
          )}
          <p className="text-ink-3">
            Bodies as broad and deep as measured or estimated, in their clothes. Guidance: no check reads it.
          </p>
        </>
      )}
      <EntranceFields document={document} />
      {(kinds.has('loose-seat') || hasLeaves) && (
        <div role="group" aria-label="What may be moved for somebody who is stuck">
          {kinds.has('loose-seat') && (
            <Toggle on={mayMove.chairs} onChange={(chairs) => setMayMove({ ...mayMove, chairs })}>
              Chairs may be taken out
            </Toggle>
          )}
          {hasLeaves && (
            <Toggle on={mayMove.leaves} onChange={(leaves) => setMayMove({ ...mayMove, leaves })}>
              Leaves may be lifted or dropped
            </Toggle>
          )}
        </div>
      )}
      {stuck.length > 0 && (
        <div>
          <h3 className="font-semibold">Who is stuck</h3>
          <ul>
            {stuck.map((one) => (
              <li key={one.placeId}>{sayWay(one, naming)}</li>
            ))}
          </ul>
        </div>
      )}
      {found && found.order.placeIds.length > 1 && (
        <div>
          <h3 className="font-semibold">In which order to sit</h3>
          <ol className="list-decimal pl-5">
            {found.order.placeIds.map((placeId) => (
              <li key={placeId}>
                {naming.name(placeId)}
                {found.order.knotted.includes(placeId) && ', past somebody who makes room again'}
              </li>
            ))}
          </ol>
        </div>
      )}
      {floor.length > 0 && (
        <div>
          <h3 className="font-semibold">Floor for a wheelchair</h3>
          <ul>
            {floor.map((shape, n) => (
              <li key={`${shape.kind}-${n}`}>{sayFloor(shape, length)}</li>
            ))}
          </ul>
          <p className="text-ink-3">Sizes: {sayFloorSources(floor, engine.ruleBook).join('; ')}.</p>
        </div>
      )}
    </div>
  );
}
