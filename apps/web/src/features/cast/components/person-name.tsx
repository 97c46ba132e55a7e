import { SitterDot } from '@/components/sitter-dot.tsx';
import type { CastMember } from '@/lib/contract.ts';

/** Dot, name and part of a person in one line. */
export function PersonName({ person }: { person: CastMember }) {
  return (
    <span className="flex items-center gap-2.5">
      <SitterDot colour={person.colour} />
      <span className="min-w-0">
        <span className={person.removed ? 'text-ink-3' : 'font-medium'}>{person.name}</span>
        {person.role && <span className="block text-sm text-ink-2">{person.role}</span>}
      </span>
    </span>
  );
}
