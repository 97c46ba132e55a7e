import { Button } from '@/components/button.tsx';
import type { SearchRun } from '../use-search.ts';
import { timeLeftWords } from '../words.ts';
import { SawBoard } from '@/components/saw-board.tsx';

/** The board sawn so far, what was tried, the time left, and the way to stop. */
export function SearchProgress({ run, onStop }: { run: SearchRun; onStop: () => void }) {
  const { told, seconds, knownAtStart } = run;
  const { done, of } = told?.suggestion ?? { done: 0, of: 1 };
  const words = told ? `${done} choices tried, of at most ${of}` : 'drawing the people';
  return (
    <div className="mb-6">
      <SawBoard share={done / of} label="Search for dimensions" words={words} />
      <div className="mt-2 flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
        <p className="text-sm text-ink-2">
          <span className="first-letter:uppercase">{words}</span>
          {told && <span> · {timeLeftWords({ done, of }, seconds, knownAtStart) || 'just begun'}</span>}
        </p>
        <Button size="small" onClick={onStop}>
          Stop and keep {done > 0 ? `these ${done}` : 'what is found'}
        </Button>
      </div>
    </div>
  );
}
