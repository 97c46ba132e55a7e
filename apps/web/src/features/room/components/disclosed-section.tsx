import type { ReactNode } from 'react';
import { Button } from '@/components/button.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';

interface Props {
  /** Of the heading that names the section. */
  id: string;
  title: string;
  open: boolean;
  onToggle: () => void;
  /** What the button says while the section is closed, and while it is open. */
  words: { closed: string; open: string };
  children: ReactNode;
}

/** A section beside the drawing that is opened when somebody wants it. */
export function DisclosedSection({ id, title, open, onToggle, words, children }: Props) {
  return (
    <section aria-labelledby={id}>
      <RuleHeading
        id={id}
        aside={
          <Button look="word" aria-expanded={open} onClick={onToggle}>
            {open ? words.open : words.closed}
          </Button>
        }
      >
        {title}
      </RuleHeading>
      {open && children}
    </section>
  );
}
