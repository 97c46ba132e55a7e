import {
  Combobox as HeadlessCombobox,
  ComboboxButton,
  ComboboxInput,
  ComboboxOption,
  ComboboxOptions,
} from '@headlessui/react';
import { useState, type ComponentPropsWithRef } from 'react';
import { classNames } from './class-names.ts';
import { FIELD_LINE, FieldFrame, type FieldWords } from './field-frame.tsx';
import { AddIcon, OpenIcon } from './icons.tsx';
import { OPTION, OPTIONS_SLIP } from './option-styles.ts';
import { scrollInList } from './scroll-in-list.ts';

export interface ComboboxChoice {
  id: string;
  words: string;
  detail?: string;
}

interface ComboboxProps extends FieldWords {
  value: string | null;
  choices: readonly ComboboxChoice[];
  onChange: (id: string | null) => void;
  /** Offers "Add …" as the last option, with what was typed. */
  onAdd?: (typed: string) => void;
  addWords?: (typed: string) => string;
  placeholder?: string;
}

const ADD: ComboboxChoice = { id: '\u0000add', words: '' };

/** The library takes `aria-describedby` for itself, so the field's own comes by another name. */
function DescribedInput({
  describedBy,
  ...input
}: ComponentPropsWithRef<'input'> & { describedBy?: string }) {
  return <input {...input} aria-describedby={describedBy} />;
}

/** One of many; typing narrows the list. */
export function Combobox({
  value,
  choices,
  onChange,
  onAdd,
  addWords,
  placeholder,
  ...words
}: ComboboxProps) {
  const [typed, setTyped] = useState('');
  const wanted = typed.trim().toLocaleLowerCase();
  const shown = choices.filter((choice) => choice.words.toLocaleLowerCase().includes(wanted));
  const chosen = choices.find((choice) => choice.id === value) ?? null;
  return (
    <FieldFrame {...words}>
      {(control) => (
        <HeadlessCombobox<ComboboxChoice | null>
          value={chosen}
          immediate
          onClose={() => setTyped('')}
          onChange={(choice) => {
            if (choice?.id === ADD.id) onAdd?.(typed.trim());
            else onChange(choice?.id ?? null);
          }}
        >
          <div className="relative">
            <ComboboxInput
              as={DescribedInput}
              {...control}
              describedBy={control['aria-describedby']}
              placeholder={placeholder}
              displayValue={(choice: ComboboxChoice | null) => choice?.words ?? ''}
              onChange={(event) => setTyped(event.target.value)}
              className={classNames(FIELD_LINE, 'h-12 pr-10')}
            />
            <ComboboxButton
              className="absolute inset-y-0 right-0 px-3"
              aria-label={`Show all: ${words.label}`}
            >
              <OpenIcon />
            </ComboboxButton>
          </div>
          <ComboboxOptions
            anchor={{ to: 'bottom start', gap: 4 }}
            className={classNames(OPTIONS_SLIP, 'w-(--input-width) empty:invisible')}
          >
            {shown.map((choice) => (
              <ComboboxOption key={choice.id} ref={scrollInList} value={choice} className={OPTION}>
                <span className="flex-1">{choice.words}</span>
                {choice.detail && <span className="text-sm text-ink-3">{choice.detail}</span>}
              </ComboboxOption>
            ))}
            {onAdd && (
              <ComboboxOption ref={scrollInList} value={ADD} className={classNames(OPTION, 'text-chalk')}>
                <AddIcon /> {addWords?.(typed.trim()) ?? `Add ${typed.trim()}`}
              </ComboboxOption>
            )}
          </ComboboxOptions>
        </HeadlessCombobox>
      )}
    </FieldFrame>
  );
}
