import type { PostureChoice } from '@settlewright/geometry';
import { useState } from 'react';
import { LengthField } from '@/components/length-field.tsx';
import { entryOf } from '@/components/quantity-entry.ts';

const MOST_MM = 300;
type Nudge = NonNullable<PostureChoice['nudge']>;
const NONE: Nudge = { leftMm: 0, aheadMm: 0 };

interface Props {
  nudge: Nudge | undefined;
  onChange: (nudge: Nudge) => void;
}

/** How far the sitter is moved from the middle of the place and from where the seat puts them; taken on leaving a field. */
export function NudgeFields({ nudge = NONE, onChange }: Props) {
  return (
    <div className="grid grid-cols-2 gap-3">
      <NudgeField
        key={`ahead ${nudge.aheadMm}`}
        label="Moved forward"
        value={nudge.aheadMm}
        onChange={(aheadMm) => onChange({ ...nudge, aheadMm })}
      />
      <NudgeField
        key={`left ${nudge.leftMm}`}
        label="Moved to their left"
        value={nudge.leftMm}
        onChange={(leftMm) => onChange({ ...nudge, leftMm })}
      />
    </div>
  );
}

function NudgeField({
  label,
  value,
  onChange,
}: {
  label: string;
  value: number;
  onChange: (mm: number) => void;
}) {
  const [entry, setEntry] = useState(entryOf(value));
  const takeIt = () => {
    if (entry.problem === undefined && (entry.value ?? 0) !== value) onChange(entry.value ?? 0);
  };
  return (
    <div
      onKeyDown={(event) => {
        if (event.key === 'Enter') takeIt();
      }}
    >
      <LengthField
        label={label}
        entry={entry}
        onChange={setEntry}
        onBlur={takeIt}
        minMm={-MOST_MM}
        maxMm={MOST_MM}
      />
    </div>
  );
}
