import { memo } from 'react';
import { Combobox } from '@/components/combobox.tsx';
import { Select } from '@/components/select.tsx';
import { DEFAULT_CROWD, type CrowdChoice, type CrowdOption } from '@/lib/crowd/crowds.ts';

const MIXES = [
  { value: 50, words: 'men and women equally' },
  { value: 100, words: 'women only' },
  { value: 75, words: '75 in 100 women' },
  { value: 60, words: '60 in 100 women' },
  { value: 40, words: '40 in 100 women' },
  { value: 25, words: '25 in 100 women' },
  { value: 0, words: 'men only' },
];

interface CrowdChooserProps {
  crowd: CrowdChoice;
  options: readonly CrowdOption[];
  onChange: (crowd: CrowdChoice) => void;
}

/** Whom a share is about. */
export const CrowdChooser = memo(function CrowdChooser({
  crowd,
  options: crowds,
  onChange,
}: CrowdChooserProps) {
  const { populationId, women } = crowd;
  const mixes = MIXES.some(({ value }) => value === women)
    ? MIXES
    : [...MIXES, { value: women, words: `${women} in 100 women` }];
  return (
    <div className="grid gap-4 phone:grid-cols-2">
      <Combobox
        label="The public"
        value={populationId}
        choices={crowds.map(({ id, words, kind }) => ({ id, words, detail: kind }))}
        onChange={(id) => onChange({ women, populationId: id ?? DEFAULT_CROWD.populationId })}
      />
      <Select
        label="Men and women"
        value={women}
        options={mixes}
        onChange={(of) => onChange({ populationId, women: of })}
      />
    </div>
  );
});
