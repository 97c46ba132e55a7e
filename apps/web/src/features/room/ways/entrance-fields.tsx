import type { SetDocument, Spot } from '@settlewright/geometry';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { entryOf } from '@/components/quantity-entry.ts';
import { useTakeStep } from '../hooks/use-take-step.ts';
import { useSurroundings } from '../room-context.tsx';

const FARTHEST_MM = 50_000;

/** A set whose people come in at a spot; without one, from its route or from open floor. */
export function withEntrance(document: SetDocument, entrance: Spot | undefined): SetDocument {
  const { entrance: _, ...asked } = document.asked;
  return { ...document, asked: entrance ? { ...asked, entrance } : asked };
}

/** Where people come in: by numbers here, or by a press on the plan. */
export function EntranceFields({ document }: { document: SetDocument }) {
  const { canEdit } = useSurroundings();
  const { entrance, route } = document.asked;
  const where = entrance
    ? 'At the spot marked on the plan.'
    : route
      ? 'At the start of the route that is kept clear.'
      : 'From open floor beside the set; no entrance is set.';
  return (
    <div role="group" aria-labelledby="entrance-heading">
      <h3 id="entrance-heading" className="font-semibold">
        Where do people come in?
      </h3>
      <p>{where}</p>
      {canEdit && <EntranceSpot key={`${entrance?.xMm} ${entrance?.zMm}`} document={document} />}
    </div>
  );
}

function EntranceSpot({ document }: { document: SetDocument }) {
  const take = useTakeStep();
  const { entrance } = document.asked;
  const [across, setAcross] = useState(() => entryOf(entrance?.xMm));
  const [along, setAlong] = useState(() => entryOf(entrance?.zMm));
  const limits = { minMm: -FARTHEST_MM, maxMm: FARTHEST_MM, feet: true };
  const { value: xMm, problem } = across;
  const { value: zMm, problem: alongProblem } = along;
  const spot = xMm === null || zMm === null || problem || alongProblem ? undefined : { xMm, zMm };
  return (
    <form
      className="mt-1 grid gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        if (spot) take(withEntrance(document, spot), entrance ? 'Entrance moved' : 'Entrance set');
      }}
    >
      <p className="text-ink-2">Press the plan, or type where, from the origin of the room.</p>
      <div className="grid grid-cols-2 gap-3">
        <LengthField label="To the right" entry={across} onChange={setAcross} {...limits} />
        <LengthField label="To the front" entry={along} onChange={setAlong} {...limits} />
      </div>
      <p className="flex flex-wrap gap-x-4 gap-y-1">
        <Button type="submit" size="small" disabled={!spot}>
          {entrance ? 'Move the entrance' : 'Set the entrance'}
        </Button>
        {entrance && (
          <Button look="word" onClick={() => take(withEntrance(document, undefined), 'Entrance taken away')}>
            No entrance
          </Button>
        )}
      </p>
    </form>
  );
}
