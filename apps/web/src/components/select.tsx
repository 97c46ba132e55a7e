import { Listbox, ListboxButton, ListboxOption, ListboxOptions } from '@headlessui/react';
import { classNames } from './class-names.ts';
import { FIELD_LINE, FieldFrame, type FieldWords } from './field-frame.tsx';
import { OpenIcon, TickIcon } from './icons.tsx';
import { OPTION, OPTIONS_SLIP } from './option-styles.ts';
import { scrollInList } from './scroll-in-list.ts';

export interface SelectOption<T extends string | number> {
  value: T;
  words: string;
  /** Stands at the right, for example a size. */
  detail?: string;
}

interface SelectProps<T extends string | number> extends FieldWords {
  value: T;
  options: readonly SelectOption<T>[];
  onChange: (value: T) => void;
  disabled?: boolean;
}

/** One of a few, as words. */
export function Select<T extends string | number>({
  value,
  options,
  onChange,
  disabled,
  ...words
}: SelectProps<T>) {
  const chosen = options.find((option) => option.value === value);
  return (
    <FieldFrame {...words}>
      {(control) => (
        <Listbox value={value} onChange={onChange} disabled={disabled}>
          <ListboxButton
            {...control}
            aria-label={`${words.label}, ${chosen?.words ?? 'nothing chosen'}`}
            className={classNames(
              FIELD_LINE,
              'flex h-12 items-center justify-between gap-3 text-left data-open:border-chalk',
            )}
          >
            <span className="truncate">{chosen?.words ?? 'Choose'}</span>
            <OpenIcon />
          </ListboxButton>
          {/* Not modal: a list that stays open for any reason never leaves the rest of the page inert. */}
          <ListboxOptions
            modal={false}
            anchor={{ to: 'bottom start', gap: 4 }}
            className={classNames(OPTIONS_SLIP, 'min-w-(--button-width)')}
          >
            {options.map((option) => (
              <ListboxOption key={option.value} ref={scrollInList} value={option.value} className={OPTION}>
                <span className="flex w-5 shrink-0 text-chalk">{option.value === value && <TickIcon />}</span>
                <span className="flex-1">{option.words}</span>
                {option.detail && <span className="pl-6 text-sm text-ink-3">{option.detail}</span>}
              </ListboxOption>
            ))}
          </ListboxOptions>
        </Listbox>
      )}
    </FieldFrame>
  );
}
