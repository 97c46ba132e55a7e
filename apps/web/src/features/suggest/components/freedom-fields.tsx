import { lengthStep, formatAngle, parseAngle, type Dimension } from '@settlewright/geometry';
import { LengthField } from '@/components/length-field.tsx';
import { Measure } from '@/components/measure.tsx';
import type { QuantityEntry } from '@/components/quantity-entry.ts';
import { QuantityField, type Reading } from '@/components/quantity-field.tsx';
import { Select } from '@/components/select.tsx';
import { dimensionValue, dimensionStep } from '@/lib/dimension-words.ts';
import { useState } from 'react';
import { startFreedom, type Freedom } from '../search-form.ts';
import { useSuggestView } from '../suggest-view.ts';

interface FreedomFieldsProps {
  dimension: Dimension;
  freedom: Freedom;
  onChange: (freedom: Freedom) => void;
}

const KINDS = [
  { value: 'range', words: 'may move' },
  { value: 'near', words: 'stays, give or take' },
] as const;

/** How far one dimension may go: from a number to a number, or a little about what the look demands. */
export function FreedomFields({ dimension, freedom, onChange }: FreedomFieldsProps) {
  const { style } = useSuggestView();
  const { unit, value, min, max, label } = dimension;
  const change = (ends: Partial<Freedom>) => onChange({ ...freedom, ...ends });
  const tolerance = Math.max(value - freedom.min, freedom.max - value);
  return (
    <div className="grid grid-cols-2 items-start gap-x-3 gap-y-2 pb-3 pl-7 tablet:grid-cols-[minmax(0,1.3fr)_1fr_1fr] max-phone:pl-0">
      <Select
        className="col-span-2 tablet:col-span-1"
        label={`${label}, now ${dimensionValue(value, unit, style)}`}
        value={freedom.kind}
        options={KINDS}
        onChange={(kind) => onChange(startFreedom(dimension, kind))}
      />
      {freedom.kind === 'range' ? (
        <>
          <End
            label="from"
            unit={unit}
            value={freedom.min}
            min={min}
            max={value}
            onChange={(to) => change({ min: to })}
          />
          <End
            label="to"
            unit={unit}
            value={freedom.max}
            min={value}
            max={max}
            onChange={(to) => change({ max: to })}
          />
        </>
      ) : (
        <End
          label="by"
          unit={unit}
          value={tolerance}
          min={0}
          max={Math.max(value - min, max - value)}
          onChange={(by) => change({ min: Math.max(min, value - by), max: Math.min(max, value + by) })}
        />
      )}
    </div>
  );
}

interface EndProps {
  label: string;
  unit: Dimension['unit'];
  value: number;
  min: number;
  max: number;
  onChange: (value: number) => void;
}

/** One end of a range, typed as any number of the product. */
function End({ label, unit, value, min, max, onChange }: EndProps) {
  const { style } = useSuggestView();
  const [problem, setProblem] = useState<string>();
  const take = (entry: QuantityEntry) => {
    const { value: typed } = entry;
    const outside = typed !== null && (typed < min - 1e-6 || typed > max + 1e-6);
    const fault =
      entry.problem ??
      (typed === null || outside
        ? `${dimensionValue(min, unit, style)} to ${dimensionValue(max, unit, style)} is taken.`
        : undefined);
    setProblem(fault);
    if (fault === undefined && typed !== null) onChange(typed);
  };
  const field = { label, entry: { value, ...(problem ? { problem } : {}) }, onChange: take, error: problem };
  if (unit === 'mm') return <LengthField {...field} minMm={min} maxMm={max} />;
  const read = unit === 'deg' ? readAngle : readNewtons;
  return (
    <QuantityField
      {...field}
      show={(of) => dimensionValue(of, unit, style)}
      read={read}
      step={dimensionStep(unit, lengthStep(style))}
      description={
        <Measure text={`${dimensionValue(min, unit, style)} to ${dimensionValue(max, unit, style)}`} />
      }
    />
  );
}

function readAngle(text: string): Reading {
  const reading = parseAngle(text);
  return reading.ok
    ? reading
    : { ok: false, message: `“${text.trim()}” is no angle; ${formatAngle(8)} is one.` };
}

function readNewtons(text: string): Reading {
  const value = Number(text.replace(/N\s*$/i, '').trim());
  return Number.isFinite(value) && text.trim() !== ''
    ? { ok: true, value }
    : { ok: false, message: `“${text.trim()}” is no number of newtons; 220 is one.` };
}
