import { Button } from '@/components/button.tsx';
import { ChoiceLines } from './choice-lines.tsx';

/** One sitter's rail: how high it just does, and how high it does well. */
export interface RailWords {
  name: string;
  says: string;
}

interface RailOfferProps {
  rails: readonly RailWords[];
  /** The known difference is said with the rails. */
  isNoted: boolean;
  onNote: ((noted: boolean) => void) | undefined;
}

/** Where feet hang, a rail under them is another way than a lower seat. */
export function RailOffer({ rails, isNoted, onNote }: RailOfferProps) {
  return (
    <section aria-labelledby="rail-heading" className="border-t border-rule pt-3 pb-4">
      <h2 id="rail-heading" className="mb-1 text-lg font-semibold">
        Or a foot rail
      </h2>
      <ChoiceLines lines={rails.map(({ name, says }) => [name, [says]] as const)} />
      <p className="text-sm text-ink-2">
        The seat stays, and the feet rest on a rail instead of hanging. No check reads a rail and none is
        drawn here: try it, and leave room for it under the table.
      </p>
      {onNote && (
        <p className="mt-1">
          <Button look="word" aria-pressed={isNoted} onClick={() => onNote(!isNoted)}>
            {isNoted ? 'Leave the rail out of the note' : 'Put the rail in the note below'}
          </Button>
        </p>
      )}
    </section>
  );
}
