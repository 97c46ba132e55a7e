import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import type { TestSit } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { useFormat } from '@/lib/format.ts';
import { useSurroundings } from '../room-context.tsx';
import { builtWords } from './tested-words.ts';
import { useRemoveTestSit } from './test-sits-api.ts';

const HEADS = ['Who', 'Day', 'Foam', 'Weight', 'Estimated', 'Measured'];

/** Sits of the set, those on this cushion first and marked. */
export function TestSitTable({
  sits,
  own,
  canEdit,
}: {
  sits: readonly TestSit[];
  own: readonly TestSit[];
  canEdit: boolean;
}) {
  const { path } = useSurroundings();
  const { length, mass } = useFormat();
  const remove = useRemoveTestSit(path);
  if (sits.length === 0) return <p className="text-sm text-ink-2">No test sits are kept with this set.</p>;
  const others = sits.filter((sit) => !own.includes(sit));
  return (
    <div className="grid gap-2">
      <div className="overflow-x-auto">
        <table className="w-full text-sm">
          <caption className="sr-only">Test sits of this set</caption>
          <thead>
            <tr className="text-left text-ink-2">
              {HEADS.map((head) => (
                <th key={head} scope="col" className="pr-3 font-normal">
                  {head}
                </th>
              ))}
              {canEdit && (
                <th scope="col">
                  <span className="sr-only">Take out</span>
                </th>
              )}
            </tr>
          </thead>
          <tbody>
            {[...own, ...others].map((sit) => (
              <tr key={sit.id} className="border-t border-rule align-top">
                <th scope="row" className="py-1 pr-3 text-left font-normal">
                  {sit.name}
                  {sit.note !== '' && <span className="block text-xs text-ink-2">{sit.note}</span>}
                </th>
                <td className="py-1 pr-3">{dayWords(sit.satOn)}</td>
                <td className="py-1 pr-3">
                  {sit.grade}, {builtWords(sit, length)}
                  {!own.includes(sit) && <span className="block text-xs text-ink-2">not this cushion</span>}
                </td>
                <td className="py-1 pr-3 tabular-nums">{mass(sit.weightKg)}</td>
                <td className="py-1 pr-3 tabular-nums">{length(sit.predictedMm)}</td>
                <td className="py-1 pr-3 font-medium tabular-nums">{length(sit.measuredMm)}</td>
                {canEdit && (
                  <td className="py-1">
                    <Button
                      look="word"
                      aria-label={`Take the sit of ${sit.name} on ${dayWords(sit.satOn)} out`}
                      disabled={remove.isPending}
                      onClick={() => remove.mutate(sit.id)}
                    >
                      Take out
                    </Button>
                  </td>
                )}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {remove.isError && <Notice tone="wont">It was not taken out: {remove.error.message}</Notice>}
    </div>
  );
}
