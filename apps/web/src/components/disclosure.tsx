import { Disclosure as HeadlessDisclosure, DisclosureButton, DisclosurePanel } from '@headlessui/react';
import type { ReactNode } from 'react';
import { OpenIcon } from './icons.tsx';

interface DisclosureProps {
  words: ReactNode;
  children: ReactNode;
  open?: boolean;
}

/** More of the same thing, folded away. */
export function Disclosure({ words, children, open = false }: DisclosureProps) {
  return (
    <HeadlessDisclosure defaultOpen={open}>
      <DisclosureButton className="group flex min-h-9 items-center gap-1.5 text-sm font-medium">
        <span className="settle transition-transform group-data-open:rotate-180">
          <OpenIcon />
        </span>
        <span className="link">{words}</span>
      </DisclosureButton>
      <DisclosurePanel className="pt-2">{children}</DisclosurePanel>
    </HeadlessDisclosure>
  );
}
