import type { Spot } from '@settlewright/geometry';
import { FURTHEST_MM } from '../asked.ts';
import { SaidLength } from './said-length.tsx';

interface SpotFieldsProps {
  /** Whose spot it is, in front of each label: "Corner 2". */
  of: string;
  spot: Spot;
  onSay: (spot: Spot) => void;
}

/** A spot on the floor by its two lengths from the room's origin, the form twin of a press on the plan. */
export function SpotFields({ of, spot, onSay }: SpotFieldsProps) {
  const field = (words: string, key: keyof Spot) => (
    <SaidLength
      label={`${of} ${words}`}
      valueMm={spot[key]}
      minMm={-FURTHEST_MM}
      maxMm={FURTHEST_MM}
      onSay={(mm) => mm !== undefined && onSay({ ...spot, [key]: mm })}
    />
  );
  return (
    <div className="grid grid-cols-2 gap-x-5">
      {field('across', 'xMm')}
      {field('along', 'zMm')}
    </div>
  );
}
