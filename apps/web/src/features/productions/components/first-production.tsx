import { Button } from '@/components/button.tsx';
import { DashedBay, EmptyState } from '@/components/empty-state.tsx';

const STEPS = [
  ['Start a production', 'one job for a client'],
  ['Say who sits there', 'a name and a height are enough to begin'],
  ['Add a set', 'an arrangement to change, or an empty floor'],
  ['Read the fit sheet', 'who fits, who does not, and what would help'],
] as const;

/** An empty workshop: what comes first, and what after it. */
export function FirstProduction({ canEdit, onStart }: { canEdit: boolean; onStart: () => void }) {
  return (
    <div className="grid gap-x-14 gap-y-2 desk:grid-cols-[1fr_26rem]">
      <EmptyState
        title="No productions yet"
        drawing={<DashedBay />}
        actions={
          canEdit && (
            <Button look="main" onClick={onStart}>
              Start a production
            </Button>
          )
        }
      >
        {canEdit
          ? 'Name the job; its sets, people and cushion orders will stand under it.'
          : 'The owner or a designer of this workshop starts one; it will stand here.'}
      </EmptyState>
      <section aria-labelledby="first-steps-here" className="pt-6">
        <h2 id="first-steps-here" className="pb-2 text-sm font-semibold">
          The way to a first fit sheet
        </h2>
        <ol>
          {STEPS.map(([lead, rest], index) => (
            <li key={lead} className="flex gap-4 border-t border-rule py-2.5">
              <span aria-hidden="true" className="w-3 shrink-0 font-semibold">
                {index + 1}
              </span>
              <span>
                <b className="font-medium">{lead}</b> <span className="text-ink-2">{rest}</span>
              </span>
            </li>
          ))}
        </ol>
      </section>
    </div>
  );
}
