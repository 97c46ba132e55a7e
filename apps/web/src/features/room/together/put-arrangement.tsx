import { planOf } from '@settlewright/geometry';
import { useMemo, useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Dialog } from '@/components/dialog.tsx';
import { commonScale, DrawingSvg } from '@/components/drawing-svg.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { announce } from '@/lib/announce.ts';
import { useArrangements, useRemoveArrangement } from '@/lib/arrangements.ts';
import { usePutIn } from '../clipboard/use-put-in.ts';
import { useSurroundings } from '../room-context.tsx';

const THUMB = { width: 190, height: 92 };

interface Props {
  onChoose: (ids: readonly string[]) => void;
  onClose: () => void;
}

/** The arrangements that the workshop keeps, each to be put into the set at hand. */
export default function PutArrangement({ onChoose, onClose }: Props) {
  const { workshopId } = useSurroundings().path;
  const kept = useArrangements(workshopId, true);
  const remove = useRemoveArrangement(workshopId);
  const putIn = usePutIn(onChoose);
  const items = useMemo(
    () => (kept.data ?? []).map((arrangement) => ({ arrangement, plan: planOf(arrangement.document) })),
    [kept.data],
  );
  const pxPerMm = commonScale(
    items.map(({ plan }) => plan),
    THUMB,
  );
  return (
    <Dialog
      wide
      open
      onClose={onClose}
      title="Put in an arrangement"
      describe="Kept by the workshop. It comes to stand beside what is here; marks that are taken change."
    >
      {kept.isPending && <LoadingLine words="Looking through the arrangements" />}
      {kept.isError && (
        <Notice tone="wont">
          The arrangements could not be read.{' '}
          <Button look="word" onClick={() => void kept.refetch()}>
            Try again
          </Button>
        </Notice>
      )}
      {remove.isError && <Notice tone="wont">It could not be taken off the list. Try again.</Notice>}
      {kept.data && items.length === 0 && (
        <p className="max-w-prose text-ink-2">
          None is kept yet. Choose several pieces and press “Keep as an arrangement”: then they stand here for
          every set of the workshop.
        </p>
      )}
      <ul className="grid gap-x-8 phone:grid-cols-2">
        {items.map(({ arrangement, plan }) => (
          <li key={arrangement.id} className="ruled grid gap-2 py-3">
            <span className="flex h-24 items-center" aria-hidden="true">
              <DrawingSvg drawing={plan} pxPerMm={pxPerMm} />
            </span>
            <p className="font-medium">{arrangement.name}</p>
            <p className="text-sm text-ink-2">{countOf(arrangement.document.pieces.length)}</p>
            <div className="flex flex-wrap gap-3">
              <Button
                size="small"
                aria-label={`Put in ${arrangement.name}`}
                onClick={() => {
                  const step = `Put in “${arrangement.name}”`;
                  if (putIn(arrangement.document, { step, withPeople: false })) onClose();
                }}
              >
                Put it in
              </Button>
              <TakeOff
                name={arrangement.name}
                busy={remove.isPending && remove.variables === arrangement.id}
                onTake={() => remove.mutate(arrangement.id)}
              />
            </div>
          </li>
        ))}
      </ul>
    </Dialog>
  );
}

interface TakeOffProps {
  name: string;
  busy: boolean;
  onTake: () => void;
}

/** Takes an arrangement off the list at the second press: it cannot be undone, and is gone for every member. */
function TakeOff({ name, busy, onTake }: TakeOffProps) {
  const [asked, setAsked] = useState(false);
  return (
    <Button
      look="word"
      aria-label={asked ? undefined : `Take ${name} off the list, asks first`}
      busy={busy}
      onBlur={() => setAsked(false)}
      onClick={() => {
        if (asked) return onTake();
        setAsked(true);
        announce(`Press again to take ${name} off for the whole workshop. Sets that hold it keep it.`);
      }}
    >
      {asked ? 'Take it off for the whole workshop' : 'Take off the list'}
    </Button>
  );
}

const countOf = (pieces: number): string => (pieces === 1 ? '1 piece' : `${pieces} pieces`);
