import { Switch } from '@headlessui/react';
import type { ReactNode } from 'react';
import { TickIcon } from '@/components/icons.tsx';

interface Props {
  on: boolean;
  onChange: (on: boolean) => void;
  children: ReactNode;
}

/** A switch in words: a chalk tick stands before what is on. */
export function Toggle({ on, onChange, children }: Props) {
  return (
    <Switch
      checked={on}
      onChange={onChange}
      className="quick flex min-h-8 items-center max-tablet:min-h-10 gap-1 rounded-sm px-1 font-medium hover:text-ink data-checked:text-ink"
    >
      <span aria-hidden="true" className="flex w-4 justify-center text-chalk">
        {on && <TickIcon />}
      </span>
      {children}
    </Switch>
  );
}
