import { clothPhrase, phraseText, type OrderCover } from '@settlewright/geometry';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { useFormat } from '@/lib/format.ts';

/** What the workshop said of its cloths, as whoever sews with them reads it: everything but the price. */
export function ClothWords({ covers }: { covers: readonly OrderCover[] }) {
  const { style } = useFormat();
  if (covers.length === 0) return null;
  return (
    <section aria-label="Cloths" className="mb-8 max-w-text">
      <RuleHeading>Cloths</RuleHeading>
      <ul className="text-sm">
        {covers.map((cover) => (
          <li key={cover.name} className="border-b border-rule py-2 break-words">
            {phraseText(clothPhrase(cover), style)}.
          </li>
        ))}
      </ul>
    </section>
  );
}
