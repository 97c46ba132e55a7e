import { useId } from 'react';
import { Disclosure } from '@/components/disclosure.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import type { NamedPlace } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import type { useNamedPlaces } from '../api.ts';

const placesWords = (count: number) => (count === 1 ? '1 place' : `${count} places`);

/** What people typed with the name in it, before it is taken out. */
export function NamedPlaces({ found }: { found: ReturnType<typeof useNamedPlaces> }) {
  if (found.isError) {
    return (
      <Notice tone="wont" title="The places could not be listed">
        {sayProblem(found.error)} Erasing takes the name out of notes and letters all the same.
      </Notice>
    );
  }
  if (!found.data) return <LoadingLine words="Looking for the name in notes and letters" />;
  const { places, placeCount, parts, partCount } = found.data;
  const sent = places.filter(({ alreadySent }) => alreadySent);
  const kept = places.filter(({ alreadySent }) => !alreadySent);
  return (
    <div className="grid gap-5 text-sm">
      {placeCount === 0 && <p className="text-ink-2">Nobody typed the whole name into a note or letter.</p>}
      {kept.length > 0 && <Places title="“a person erased” takes the place of the name here" places={kept} />}
      {sent.length > 0 && (
        <Places
          title="Already sent, cannot be called back"
          about="The upholsterer has these. The copy kept here is changed too."
          places={sent}
        />
      )}
      {placeCount > places.length && (
        <p className="text-ink-2">
          {placesWords(placeCount)} in all; the first {places.length} are shown.
        </p>
      )}
      {partCount > 0 && (
        <Disclosure words={`Parts of the name in ${placesWords(partCount)}, to look at yourself`}>
          <Places
            title="Left as they are"
            about="These may mean somebody else. Change them by hand where they mean this person."
            places={parts}
          />
        </Disclosure>
      )}
    </div>
  );
}

function Places({ title, about, places }: { title: string; about?: string; places: readonly NamedPlace[] }) {
  const id = useId();
  return (
    <section aria-labelledby={id}>
      <h3 id={id} className="font-semibold">
        {title}
      </h3>
      {about && <p className="text-ink-2">{about}</p>}
      <ul className="mt-1 max-h-56 overflow-y-auto border-y border-rule" tabIndex={0} aria-labelledby={id}>
        {places.map(({ where, before, name, after, copies }) => (
          <li
            key={`${where}|${before}|${name}|${after}`}
            className="border-b border-rule py-1.5 last:border-b-0"
          >
            <span className="block text-xs text-ink-2">
              {where}
              {copies > 1 && `, ${copies} times`}
            </span>
            <span className="wrap-anywhere">
              {before}
              <mark className="bg-chalk-wash font-medium text-ink">{name}</mark>
              {after}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
