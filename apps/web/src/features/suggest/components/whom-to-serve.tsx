import { PopulationFields } from '@/components/population-fields.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { SitterDot } from '@/components/sitter-dot.tsx';
import { DEFAULT_CROWD, type CrowdOption } from '@/lib/crowd/crowds.ts';
import { noBodyWords } from '@/lib/no-body-words.ts';
import type { SearchForm } from '../search-form.ts';
import { useSuggestView } from '../suggest-view.ts';

interface WhomToServeProps {
  form: SearchForm;
  own: readonly CrowdOption[];
  onChange: (form: SearchForm) => void;
}

const TICK = 'size-4 shrink-0 accent-(--color-chalk)';

/** Everyone named comes first, then as many as can be of a population. */
export function WhomToServe({ form, own, onChange }: WhomToServeProps) {
  const { sitters, placesWithoutBody, colourOf } = useSuggestView();
  const { leftOut, crowd } = form;
  return (
    <section aria-labelledby="serve-heading">
      <RuleHeading id="serve-heading">Whom to serve</RuleHeading>
      <fieldset className="border-b border-rule pb-3">
        <legend className="text-sm font-medium text-ink-2">First, everyone named here</legend>
        {sitters.length === 0 && <p className="text-ink-2">Nobody is seated.</p>}
        <ul className="grid phone:grid-cols-2">
          {sitters.map(({ id, name }) => (
            <li key={id}>
              <label className="flex min-h-9 items-center gap-3">
                <input
                  type="checkbox"
                  className={TICK}
                  checked={!leftOut.includes(id)}
                  onChange={(event) =>
                    onChange({
                      ...form,
                      leftOut: event.target.checked ? leftOut.filter((one) => one !== id) : [...leftOut, id],
                    })
                  }
                />
                <SitterDot colour={colourOf(id)} />
                <span className="min-w-0 truncate">{name}</span>
              </label>
            </li>
          ))}
        </ul>
        {placesWithoutBody > 0 && <p className="mt-1 text-sm text-ink-2">{noBodyWords(placesWithoutBody)}</p>}
      </fieldset>
      <label className="flex min-h-11 items-center gap-3">
        <input
          type="checkbox"
          className={TICK}
          checked={crowd !== null}
          onChange={(event) => onChange({ ...form, crowd: event.target.checked ? DEFAULT_CROWD : null })}
        />
        Then as many as can be of a population
      </label>
      {crowd && (
        <PopulationFields crowd={crowd} own={own} onChange={(next) => onChange({ ...form, crowd: next })} />
      )}
    </section>
  );
}
