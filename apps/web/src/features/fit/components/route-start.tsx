import { type Piece, routeBetween, routeThrough, type Spot } from '@settlewright/geometry';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Select } from '@/components/select.tsx';

interface RouteStartProps {
  pieces: readonly Piece[];
  onSay: (route: Spot[], doing: string) => void;
}

/** A route to begin with: through the plan from end to end, or between two pieces. */
export function RouteStart({ pieces, onSay }: RouteStartProps) {
  const [ids, setIds] = useState<readonly [string, string]>(['', '']);
  const through = routeThrough(pieces);
  if (through === undefined) return <p className="text-ink-2">Nothing stands in this set yet.</p>;
  const options = pieces.map(({ id, mark }) => ({ value: id, words: mark }));
  const [one, other] = [0, 1].map((n) => pieces.find(({ id }) => id === ids[n]) ?? pieces[n]);
  const between = one && other && one !== other ? ([one, other] as const) : undefined;
  return (
    <div className="grid gap-4">
      <p className="max-w-text text-sm text-ink-2">
        No route is said. Begin with a straight one; its corners can be moved afterwards.
      </p>
      <div>
        <Button size="small" onClick={() => onSay(through, 'Route from end to end')}>
          From end to end of the plan
        </Button>
      </div>
      {one && other && (
        <div className="flex flex-wrap items-end gap-x-6 gap-y-3">
          <Select
            label="Between"
            className="w-32"
            value={one.id}
            options={options}
            onChange={(id) => setIds([id, other.id])}
          />
          <Select
            label="and"
            className="w-32"
            value={other.id}
            options={options}
            onChange={(id) => setIds([one.id, id])}
          />
          <Button
            size="small"
            disabled={!between}
            onClick={() =>
              between &&
              onSay(routeBetween(...between), `Route between ${between[0].mark} and ${between[1].mark}`)
            }
          >
            Between these two
          </Button>
        </div>
      )}
    </div>
  );
}
