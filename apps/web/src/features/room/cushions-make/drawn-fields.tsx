import type { CushionShape } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { Select } from '@/components/select.tsx';
import { TakenLength } from './taken-length.tsx';

type Corner = NonNullable<CushionShape['drawn']>[number];

const EDGES = [
  { value: 'front', words: 'front' },
  { value: 'left', words: 'sitter’s left' },
  { value: 'back', words: 'back' },
  { value: 'right', words: 'sitter’s right' },
] as const;
const LEAST = 3;
const MOST = 60;

interface DrawnFieldsProps {
  corners: readonly Corner[];
  /** Undefined: back to the rectangle. */
  onChange: (corners: Corner[] | undefined, words: string) => void;
}

/** Corners of an outline, anticlockwise from the lower left of the plan, each with the edge that starts there. */
export function DrawnFields({ corners, onChange }: DrawnFieldsProps) {
  const change = (index: number, part: Partial<Corner>) =>
    onChange(
      corners.map((corner, i) => (i === index ? { ...corner, ...part } : corner)),
      `corner ${index + 1} moved`,
    );
  const split = (index: number) => {
    const [a, b] = [corners[index]!, corners[(index + 1) % corners.length]!];
    const middle: Corner = { ...a, xMm: (a.xMm + b.xMm) / 2, yMm: (a.yMm + b.yMm) / 2, radiusMm: 0 };
    onChange([...corners.slice(0, index + 1), middle, ...corners.slice(index + 1)], 'corner added');
  };
  return (
    <div className="grid gap-3">
      <p className="text-sm text-ink-2">
        Corners anticlockwise from the lower left of the plan: across from the left, up from the front.
      </p>
      {corners.map((corner, index) => (
        <fieldset
          key={index}
          className="grid items-start gap-x-4 gap-y-2 border-t border-rule pt-2 phone:grid-cols-4"
        >
          <legend className="text-sm font-medium">Corner {index + 1}</legend>
          <TakenLength
            label="Across"
            valueMm={corner.xMm}
            minMm={-100}
            maxMm={12000}
            onTake={(xMm) => change(index, { xMm })}
          />
          <TakenLength
            label="Up"
            valueMm={corner.yMm}
            minMm={-100}
            maxMm={2500}
            onTake={(yMm) => change(index, { yMm })}
          />
          <TakenLength
            label="Radius"
            valueMm={corner.radiusMm}
            minMm={0}
            maxMm={1000}
            onTake={(radiusMm) => change(index, { radiusMm })}
          />
          <Select
            label="Edge from here"
            value={corner.edge}
            options={EDGES}
            onChange={(edge) => change(index, { edge })}
          />
          <p className="flex flex-wrap gap-x-4 phone:col-span-4">
            {corners.length < MOST && (
              <Button look="word" onClick={() => split(index)}>
                Add a corner after {index + 1}
              </Button>
            )}
            {corners.length > LEAST && (
              <Button
                look="word"
                onClick={() =>
                  onChange(
                    corners.filter((_, i) => i !== index),
                    `corner ${index + 1} taken out`,
                  )
                }
              >
                Take corner {index + 1} out
              </Button>
            )}
          </p>
        </fieldset>
      ))}
      <p>
        <Button look="word" onClick={() => onChange(undefined, 'a plain rectangle again')}>
          Back to the plain rectangle
        </Button>
      </p>
    </div>
  );
}
