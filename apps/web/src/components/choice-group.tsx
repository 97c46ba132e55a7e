import { Description, Label, Radio, RadioGroup } from '@headlessui/react';
import type { ReactNode } from 'react';

export interface Choice<T extends string | number> {
  value: T;
  words: string;
  describe?: ReactNode;
  drawing?: ReactNode;
}

interface ChoiceGroupProps<T extends string | number> {
  label: string;
  value: T;
  choices: readonly Choice<T>[];
  onChange: (value: T) => void;
  /** How many stand side by side where there is room. */
  columns?: 1 | 2 | 3;
}

const COLUMNS = { 1: '', 2: 'phone:grid-cols-2', 3: 'phone:grid-cols-2 tablet:grid-cols-3' };

/** One of a few that deserve to be seen at once. */
export function ChoiceGroup<T extends string | number>({
  label,
  value,
  choices,
  onChange,
  columns = 1,
}: ChoiceGroupProps<T>) {
  return (
    <RadioGroup value={value} onChange={onChange}>
      <Label className="mb-1.5 block text-sm font-medium">{label}</Label>
      <div className={`grid gap-2 ${COLUMNS[columns]}`}>
        {choices.map((choice) => (
          <Radio
            key={choice.value}
            value={choice.value}
            className="quick group flex cursor-pointer items-start gap-3 rounded-sm border-b-[1.5px] border-rule-strong bg-paper px-3 py-2.5 hover:border-ink data-checked:border-chalk data-checked:bg-chalk-wash data-checked:shadow-[inset_0_-1.5px_0_var(--color-chalk)] data-focus:shadow-(--focus-ring)"
          >
            <span
              className="mt-1 flex size-4 shrink-0 items-center justify-center rounded-full border-[1.5px] border-rule-strong bg-sheet group-data-checked:border-[5px] group-data-checked:border-chalk"
              style={{ borderRadius: '50%' }}
            />
            <span className="min-w-0 flex-1">
              {choice.drawing}
              <Label as="span" className="block cursor-pointer font-medium group-data-checked:text-ink">
                {choice.words}
              </Label>
              {choice.describe && (
                <Description as="span" className="block text-sm text-ink-2">
                  {choice.describe}
                </Description>
              )}
            </span>
          </Radio>
        ))}
      </div>
    </RadioGroup>
  );
}
