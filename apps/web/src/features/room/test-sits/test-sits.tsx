import {
  foamBuild,
  isSame,
  sitsOn,
  testedBySits,
  testedOf,
  withTested,
  type Foam,
} from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { capital } from '@/lib/capital.ts';
import { useFormat } from '@/lib/format.ts';
import type { Making } from '../cushions-make/use-make.ts';
import { useSurroundings } from '../room-context.tsx';
import { TestSitForm } from './test-sit-form.tsx';
import { TestSitTable } from './test-sit-table.tsx';
import { useTestSits } from './test-sits-api.ts';
import { builtWords, takenWords, testedWords } from './tested-words.ts';

/** What the set counts with now. */
function InTheSet({ tested }: { tested: Foam['tested'] }) {
  return (
    <p className="text-sm">
      {tested
        ? `The set counts with it: ${testedWords(tested)}.`
        : 'The set counts with the estimate: nobody’s sit on such a cushion is taken into it.'}
    </p>
  );
}

/** Sits on foams of this set, and what they say of this cushion. Readers without measures learn the factor alone. */
export function TestSits({ making }: { making: Making }) {
  const { detail } = useSurroundings();
  const tested = testedOf(making.piece.seatCushion);
  return (
    <div className="grid gap-4">
      <InTheSet tested={tested} />
      {detail === 'full' && <KeptSits making={making} tested={tested} />}
    </div>
  );
}

function KeptSits({ making, tested }: { making: Making; tested: Foam['tested'] }) {
  const { path } = useSurroundings();
  const { length } = useFormat();
  const { piece, canEdit, changePiece } = making;
  const { seatCushion } = piece;
  const sits = useTestSits(path);
  if (sits.isPending) return <LoadingLine words="Fetching the test sits" />;
  if (sits.isError)
    return <Notice tone="wont">The test sits could not be fetched: {sits.error.message}</Notice>;
  const found = testedBySits(seatCushion, sits.data);
  const differs = !isSame(found, tested);
  const take = (next: Foam['tested']) =>
    changePiece((one) => {
      const { foam } = one.seatCushion;
      return { ...one, seatCushion: { ...one.seatCushion, foam: withTested(foam, next) } };
    }, takenWords(next));
  return (
    <>
      {found && differs && (
        <p className="text-sm" aria-live="polite">
          {capital(testedWords(found))}.
        </p>
      )}
      {canEdit && (
        <p className="flex flex-wrap gap-3">
          {found && differs && (
            <Button look="main" onClick={() => take(found)}>
              Count with it
            </Button>
          )}
          {tested && <Button onClick={() => take(undefined)}>Count with the estimate</Button>}
        </p>
      )}
      <TestSitTable sits={sits.data} own={sitsOn(seatCushion, sits.data)} canEdit={canEdit} />
      {canEdit && (
        <>
          <p className="text-sm text-ink-2">
            A sit on {seatCushion.foam.grade}, {builtWords(foamBuild(seatCushion), length)}, as {piece.mark}{' '}
            has now:
          </p>
          <TestSitForm piece={piece} />
        </>
      )}
    </>
  );
}
