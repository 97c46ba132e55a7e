import type { CushionShape } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { Select } from '@/components/select.tsx';
import { TakenLength } from './taken-length.tsx';

type Notch = NonNullable<CushionShape['notches']>[number];

const EDGES = [
  { value: 'back', words: 'Back' },
  { value: 'front', words: 'Front' },
  { value: 'left', words: 'Sitter’s left' },
  { value: 'right', words: 'Sitter’s right' },
] as const;
const MOST = 8;
const FIRST: Notch = { edge: 'back', fromMm: 0, widthMm: 100, depthMm: 50 };

interface NotchFieldsProps {
  notches: readonly Notch[];
  onChange: (notches: Notch[], words: string) => void;
}

/** What is cut out for a column, a sill or the short leg of an L. */
export function NotchFields({ notches, onChange }: NotchFieldsProps) {
  const change = (index: number, part: Partial<Notch>) =>
    onChange(
      notches.map((notch, i) => (i === index ? { ...notch, ...part } : notch)),
      `notch ${index + 1} changed`,
    );
  return (
    <div className="grid gap-3">
      {notches.map(({ edge, fromMm, widthMm, depthMm, fromEnd }, index) => {
        const along = edge === 'back' || edge === 'front';
        return (
          <fieldset
            key={index}
            className="grid items-start gap-x-6 gap-y-3 border-t border-rule pt-2 phone:grid-cols-2"
          >
            <legend className="text-sm font-medium">Notch {index + 1}</legend>
            <Select
              label="In the edge"
              value={edge}
              options={EDGES}
              onChange={(to) => change(index, { edge: to })}
            />
            {along ? (
              <Select
                label="Measured from the sitter’s"
                value={fromEnd ?? 'left'}
                options={[
                  { value: 'left', words: 'left' },
                  { value: 'right', words: 'right' },
                ]}
                onChange={(end) => change(index, { fromEnd: end })}
              />
            ) : (
              <p className="self-center text-sm text-ink-2">Measured from the back.</p>
            )}
            <TakenLength
              label="Starts at"
              valueMm={fromMm}
              minMm={0}
              maxMm={12000}
              onTake={(mm) => change(index, { fromMm: mm })}
            />
            <TakenLength
              label="Long along the edge"
              valueMm={widthMm}
              minMm={5}
              maxMm={12000}
              onTake={(mm) => change(index, { widthMm: mm })}
            />
            <TakenLength
              label="Deep"
              valueMm={depthMm}
              minMm={5}
              maxMm={2000}
              onTake={(mm) => change(index, { depthMm: mm })}
            />
            <p className="self-end">
              <Button
                look="word"
                onClick={() =>
                  onChange(
                    notches.filter((_, i) => i !== index),
                    `notch ${index + 1} taken out`,
                  )
                }
              >
                Take notch {index + 1} out
              </Button>
            </p>
          </fieldset>
        );
      })}
      {notches.length < MOST && (
        <p>
          <Button
            look="word"
            onClick={() => onChange([...notches, FIRST], `notch ${notches.length + 1} cut`)}
          >
            {notches.length === 0 ? 'Cut a notch' : 'Cut another notch'}
          </Button>
        </p>
      )}
    </div>
  );
}
