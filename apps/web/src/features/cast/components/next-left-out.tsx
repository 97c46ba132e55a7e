import { Button } from '@/components/button.tsx';
import { type CastPlace, useMeasureNext } from '../api.ts';

/** Said where “measure next” is not complete, with the way to the rest. */
export function NextLeftOut({ place }: { place: CastPlace }) {
  const { data, isFetching, refetch } = useMeasureNext(place, true);
  const left = data?.leftOut ?? 0;
  if (left === 0) return null;
  const places = left === 1 ? '1 taken place was' : `${left} taken places were`;
  return (
    <p className="mt-3 flex flex-wrap items-center gap-x-4 gap-y-1 text-sm text-ink-2">
      <span>
        “Measure next” is not complete: {places} not looked at yet, as there are too many for one answer.
      </span>
      <Button look="word" busy={isFetching} busyWords="Looking" onClick={() => void refetch()}>
        Look at the rest
      </Button>
    </p>
  );
}
