import type { Spot } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { MOST_CORNERS, onwards } from '../asked.ts';
import { SpotFields } from './spot-fields.tsx';

interface RouteCornersProps {
  route: readonly Spot[];
  onSay: (route: Spot[] | undefined, doing: string) => void;
}

/** Corners of the route from its start to its end. */
export function RouteCorners({ route, onSay }: RouteCornersProps) {
  return (
    <>
      <p className="mb-3 max-w-text text-sm text-ink-2">
        Across is to the right and along towards the viewer, from the room’s origin.
      </p>
      <ol className="grid gap-3">
        {route.map((spot, i) => {
          const name = `Corner ${i + 1}`;
          return (
            <li key={i} className="border-b border-rule pb-2">
              <SpotFields
                of={name}
                spot={spot}
                onSay={(moved) => onSay(route.with(i, moved), `Route corner ${i + 1} moved`)}
              />
              <div className="mt-1 flex gap-5">
                <Button
                  look="word"
                  aria-label={`Move corner ${i + 1} up`}
                  disabled={i === 0}
                  onClick={() =>
                    onSay(route.with(i - 1, spot).with(i, route[i - 1] ?? spot), `Route corner ${i + 1} up`)
                  }
                >
                  Move up
                </Button>
                <Button
                  look="word"
                  aria-label={`Remove corner ${i + 1}`}
                  disabled={route.length <= 2}
                  onClick={() => onSay(route.toSpliced(i, 1), `Route corner ${i + 1} removed`)}
                >
                  Remove
                </Button>
              </div>
            </li>
          );
        })}
      </ol>
      <div className="mt-3 flex flex-wrap gap-3">
        <Button
          size="small"
          disabled={route.length >= MOST_CORNERS}
          onClick={() => onSay([...route, onwards(route)], `Route corner ${route.length + 1} added`)}
        >
          Add a corner
        </Button>
        <Button size="small" onClick={() => onSay(undefined, 'Route taken away')}>
          Take the route away
        </Button>
      </div>
    </>
  );
}
