import { useId } from 'react';
import { CROWDS, DEFAULT_CROWD, onlySex, type CrowdChoice, type CrowdOption } from '@/lib/crowd/crowds.ts';
import { Combobox } from './combobox.tsx';

interface PopulationFieldsProps {
  crowd: CrowdChoice;
  /** The workshop's own surveys; they stand first. */
  own?: readonly CrowdOption[];
  onChange: (crowd: CrowdChoice) => void;
}

/** Whom a share is about: a population, and how many of 100 are women where it holds both. */
export function PopulationFields({ crowd, own = [], onChange }: PopulationFieldsProps) {
  const { populationId, women } = crowd;
  const options = [...own, ...CROWDS];
  return (
    <div className="grid gap-4 phone:grid-cols-2">
      <Combobox
        label="Population"
        value={populationId}
        choices={options.map((one) => ({ id: one.id, words: one.words, detail: one.kind }))}
        onChange={(chosen) => onChange({ women, populationId: chosen ?? DEFAULT_CROWD.populationId })}
      />
      {onlySex(populationId, options) === undefined && (
        <MixField women={women} onChange={(mix) => onChange({ populationId, women: mix })} />
      )}
    </div>
  );
}

function MixField({ women, onChange }: { women: number; onChange: (women: number) => void }) {
  const id = useId();
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="mb-1 block text-sm font-medium">
        Women of 100 people
      </label>
      <div className="flex h-12 items-center gap-4">
        <input
          id={id}
          type="range"
          min={0}
          max={100}
          step={5}
          value={women}
          aria-valuetext={mixWords(women)}
          onChange={(event) => onChange(Number(event.target.value))}
          className="h-6 min-w-0 flex-1 accent-(--color-chalk)"
        />
        <output htmlFor={id} className="w-9 text-right font-semibold">
          {women}
        </output>
      </div>
    </div>
  );
}

function mixWords(women: number): string {
  if (women === 0) return 'men only';
  return women === 100 ? 'women only' : `${women} women and ${100 - women} men`;
}
