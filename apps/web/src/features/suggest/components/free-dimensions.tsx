import { clashOf, MOST_FREE, type Dimension } from '@settlewright/geometry';
import { Disclosure } from '@/components/disclosure.tsx';
import { Measure } from '@/components/measure.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { dimensionValue, dimensionWords } from '@/lib/dimension-words.ts';
import { startFreedom, type SearchForm } from '../search-form.ts';
import { useSuggestView } from '../suggest-view.ts';
import { FreedomFields } from './freedom-fields.tsx';

interface FreeDimensionsProps {
  dimensions: readonly Dimension[];
  form: SearchForm;
  onChange: (form: SearchForm) => void;
}

const GROUPS = [
  {
    words: 'Seats',
    kinds: [
      'seat-height',
      'seat-and-tables',
      'seat-depth',
      'seat-tilt',
      'seat-firmness',
      'place-width',
      'bench-length',
    ],
  },
  { words: 'Backs', kinds: ['back-lean', 'back-height'] },
  { words: 'Tables', kinds: ['table-height', 'table-apron', 'table-top', 'table-overlap'] },
  { words: 'Sills and overhead', kinds: ['sill-height', 'sill-depth', 'headroom'] },
] as const;

const chosenIds = ({ freedoms }: SearchForm): string[] => freedoms.map(({ dimensionId }) => dimensionId);

const kindOf = ({ id }: Dimension): string => id.split('|')[0] ?? id;

/** Which numbers the search may move, and how far. */
export function FreeDimensions({ dimensions, form, onChange }: FreeDimensionsProps) {
  const chosen = form.freedoms.length;
  return (
    <section aria-labelledby="free-heading">
      <RuleHeading
        id="free-heading"
        aside={
          <span className="text-sm text-ink-2">
            {chosen} of at most {MOST_FREE}
          </span>
        }
      >
        What may move
      </RuleHeading>
      {GROUPS.map(({ words, kinds }) => {
        const own = dimensions.filter((one) => (kinds as readonly string[]).includes(kindOf(one)));
        if (own.length === 0) return null;
        const isAlone = (one: Dimension) => one.id.includes('|') && kindOf(one) !== 'table-overlap';
        const alone = own.filter(isAlone);
        const row = (dimension: Dimension) => (
          <FreeRow key={dimension.id} {...{ dimension, dimensions, form, onChange }} />
        );
        const openAlone = alone.some(({ id }) => form.freedoms.some(({ dimensionId }) => dimensionId === id));
        return (
          <fieldset key={words} className="mb-2 border-b border-rule pb-2">
            <legend className="pt-1 text-sm font-medium text-ink-2">{words}</legend>
            <ul>{own.filter((one) => !isAlone(one)).map(row)}</ul>
            {alone.length > 0 && (
              <Disclosure words={`One piece alone (${alone.length})`} open={openAlone}>
                <ul>{alone.map(row)}</ul>
              </Disclosure>
            )}
          </fieldset>
        );
      })}
    </section>
  );
}

function FreeRow({ dimension, dimensions, form, onChange }: FreeDimensionsProps & { dimension: Dimension }) {
  const { style } = useSuggestView();
  const freedom = form.freedoms.find(({ dimensionId }) => dimensionId === dimension.id);
  const clash = freedom ? undefined : clashOf(dimension, chosenIds(form), dimensions);
  const isFull = !freedom && form.freedoms.length >= MOST_FREE;
  const others = form.freedoms.filter(({ dimensionId }) => dimensionId !== dimension.id);
  return (
    <li>
      <label className="flex min-h-9 items-center gap-3">
        <input
          type="checkbox"
          className="size-4 shrink-0 accent-(--color-chalk)"
          checked={freedom !== undefined}
          disabled={clash !== undefined || isFull}
          onChange={() =>
            onChange({ ...form, freedoms: freedom ? others : [...form.freedoms, startFreedom(dimension)] })
          }
        />
        <span className={clash || isFull ? 'min-w-0 flex-1 text-ink-3' : 'min-w-0 flex-1'}>
          {dimensionWords(dimension)}
          {clash && <span className="block text-xs">moves already with “{dimensionWords(clash)}”</span>}
        </span>
        <span className="text-sm text-ink-2">
          <Measure text={dimensionValue(dimension.value, dimension.unit, style)} />
        </span>
      </label>
      {freedom && (
        <FreedomFields
          dimension={dimension}
          freedom={freedom}
          onChange={(next) =>
            onChange({
              ...form,
              freedoms: form.freedoms.map((one) => (one.dimensionId === dimension.id ? next : one)),
            })
          }
        />
      )}
    </li>
  );
}
