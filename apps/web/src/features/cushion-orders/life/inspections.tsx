import { Measure } from '@/components/measure.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { dayWords } from '@/lib/dates.ts';
import { useFormat } from '@/lib/format.ts';
import type { Desk, Inspection, OrderFile } from './desk.ts';
import { Photo } from './files.tsx';

const KIND_WORDS: Record<Inspection['kind'], string> = {
  'first-article': 'First article',
  received: 'Delivery',
};
const SIZE_WORDS = { widthMm: 'width', depthMm: 'depth', thicknessMm: 'thickness' } as const;
const VERDICT_WORDS = { within: 'within', out: 'out', 'not-measured': 'not measured' } as const;
const VERDICT_LOOKS = { within: 'text-fits', out: 'text-wont', 'not-measured': 'text-ink-2' } as const;

interface SheetProps {
  desk: Desk;
  inspection: Inspection;
  files: readonly OrderFile[];
}

function Sheet({ desk, inspection, files }: SheetProps) {
  const format = useFormat();
  const { kind, outcome, byName, at, note, cushions, toleranceMm, revisionLetter, photoIds } = inspection;
  const photos = files.filter(({ id, type }) => photoIds.includes(id) && type === 'image/jpeg');
  return (
    <li className="border-b border-rule py-3">
      <p className="font-medium">
        {KIND_WORDS[kind]} of revision {revisionLetter}:{' '}
        <b className={outcome === 'accepted' ? 'text-fits' : 'text-wont'}>{outcome}</b>
      </p>
      <p className="text-sm text-ink-2">
        {byName}, {dayWords(at)}. Finished sizes, <Measure text={format.length(toleranceMm)} /> either way.
      </p>
      {note !== '' && <p className="mt-1 break-words whitespace-pre-line">{note}</p>}
      <ul className="mt-2 text-sm">
        {cushions.map(({ mark, sizes, verdict, note: words }) => (
          <li key={mark} className="py-1">
            <b className="font-semibold">{mark}</b>{' '}
            <b className={VERDICT_LOOKS[verdict]}>{VERDICT_WORDS[verdict]}</b>
            {sizes.map(({ size, askedMm, measuredMm, verdict: one }) => (
              <span key={size} className="block pl-4">
                {SIZE_WORDS[size]} <Measure text={format.length(askedMm)} />
                {measuredMm !== null && (
                  <>
                    , measured <Measure text={format.length(measuredMm)} />
                  </>
                )}
                : <span className={VERDICT_LOOKS[one]}>{VERDICT_WORDS[one]}</span>
              </span>
            ))}
            {words !== '' && <span className="block pl-4 break-words">{words}</span>}
          </li>
        ))}
      </ul>
      {photos.length > 0 && (
        <div className="mt-2 grid grid-cols-2 gap-3">
          {photos.map((file) => (
            <Photo key={file.id} desk={desk} file={file} />
          ))}
        </div>
      )}
    </li>
  );
}

/** Sheets of what was measured when something arrived. */
export function Inspections({
  desk,
  inspections,
  files,
}: {
  desk: Desk;
  inspections: readonly Inspection[];
  files: readonly OrderFile[];
}) {
  if (inspections.length === 0) return null;
  return (
    <section aria-label="Inspections" className="mb-8">
      <RuleHeading>Inspected</RuleHeading>
      <ol>
        {inspections.map((inspection) => (
          <Sheet key={inspection.id} {...{ desk, inspection, files }} />
        ))}
      </ol>
    </section>
  );
}
