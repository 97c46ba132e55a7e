import {
  Menu as HeadlessMenu,
  MenuButton,
  MenuHeading,
  MenuItem,
  MenuItems,
  MenuSection,
} from '@headlessui/react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { classNames } from './class-names.ts';
import { TickIcon } from './icons.tsx';
import { OPTION, OPTIONS_SLIP } from './option-styles.ts';

export interface MenuEntry {
  id: string;
  words: ReactNode;
  detail?: string;
  to?: string;
  onPress?: () => void;
  /** Ticked when it is the one in force; entries without it carry no tick column. */
  chosen?: boolean;
  disabled?: boolean;
}

/** Entries under a heading of their own. */
export interface MenuGroup {
  id: string;
  heading: string;
  entries: readonly MenuEntry[];
}

interface MenuProps {
  /** Full name of the button for a screen reader. */
  name: string;
  button: ReactNode;
  buttonClassName?: string;
  entries: readonly (MenuEntry | MenuGroup)[];
  side?: 'start' | 'end';
}

/** A menu under its button, at least as wide. */
export function Menu({ name, button, buttonClassName, entries, side = 'start' }: MenuProps) {
  return (
    <HeadlessMenu>
      <MenuButton aria-label={name} className={buttonClassName}>
        {button}
      </MenuButton>
      <MenuItems
        anchor={{ to: side === 'end' ? 'bottom end' : 'bottom start', gap: 2, padding: 8 }}
        className={classNames(OPTIONS_SLIP, 'min-w-[max(12rem,var(--button-width))]')}
      >
        {entries.map((entry) =>
          'heading' in entry ? (
            <MenuSection key={entry.id} className="border-t border-rule pt-1 first:border-0">
              <MenuHeading className="px-3 pt-1 text-xs text-ink-3">{entry.heading}</MenuHeading>
              {entry.entries.map((one) => (
                <Entry key={one.id} entry={one} ticked={isTicked(entry.entries)} />
              ))}
            </MenuSection>
          ) : (
            <Entry key={entry.id} entry={entry} ticked={isTicked(entries)} />
          ),
        )}
      </MenuItems>
    </HeadlessMenu>
  );
}

const isTicked = (entries: readonly (MenuEntry | MenuGroup)[]): boolean =>
  entries.some((entry) => !('heading' in entry) && entry.chosen !== undefined);

function Entry({ entry, ticked }: { entry: MenuEntry; ticked: boolean }) {
  return (
    <MenuItem disabled={entry.disabled}>
      {entry.to === undefined ? (
        <button type="button" className={classNames(OPTION, 'w-full text-left')} onClick={entry.onPress}>
          <Face entry={entry} ticked={ticked} />
        </button>
      ) : (
        <Link to={entry.to} className={classNames(OPTION, 'no-underline')} onClick={entry.onPress}>
          <Face entry={entry} ticked={ticked} />
        </Link>
      )}
    </MenuItem>
  );
}

function Face({ entry, ticked }: { entry: MenuEntry; ticked: boolean }) {
  return (
    <>
      {ticked && <span className="flex w-5 shrink-0 text-chalk">{entry.chosen && <TickIcon />}</span>}
      <span className="flex-1">
        {entry.words}
        {entry.chosen && <span className="sr-only">, in use</span>}
      </span>
      {entry.detail && <span className="pl-6 text-sm text-ink-3">{entry.detail}</span>}
    </>
  );
}
