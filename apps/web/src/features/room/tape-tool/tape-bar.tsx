import { endWords, type MeasuringScene } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { Toggle } from '../components/toggle.tsx';
import { chooseWhole, holdFirst, takeTape, useTapeTool } from './tape-store.ts';

/** The switch that takes the tape into the hand. */
export function TapeToggle() {
  const on = useTapeTool((state) => state.on);
  return (
    <Toggle on={on} onChange={takeTape}>
      Tape measure
    </Toggle>
  );
}

/** What the tape in the hand waits for, and how it measures. */
export function TapeBar({ scene }: { scene: MeasuringScene }) {
  const { on, whole, first } = useTapeTool();
  if (!on) return null;
  const thing = whole ? 'part or body' : 'point';
  return (
    <div className="flex flex-wrap items-center gap-x-5 gap-y-1 border-t border-rule py-1.5 text-sm">
      <p role="status" className="flex-1 basis-64">
        {first
          ? `From ${endWords(first, scene)}. Press the second ${thing}.`
          : `Press the first ${thing}. Under Measure, points can be chosen by name.`}
      </p>
      <Toggle on={whole} onChange={chooseWhole}>
        Shortest way
      </Toggle>
      {first && (
        <Button look="word" onClick={() => holdFirst(undefined)}>
          Start again
        </Button>
      )}
    </div>
  );
}
