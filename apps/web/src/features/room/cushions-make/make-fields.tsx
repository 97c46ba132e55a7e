import {
  CLOSURE_WORDS,
  CONSTRUCTION_WORDS,
  CUSHION_EDGES,
  edgeWords,
  HOLD_DOWN_WORDS,
  HOLD_DOWNS,
  makeWords,
  WELT_WORDS,
  type CushionMake,
  type HoldDown,
} from '@settlewright/geometry';
import { Select } from '@/components/select.tsx';
import { TextArea } from '@/components/text-field.tsx';
import type { Making } from './use-make.ts';

const optionsOf = <T extends string>(words: Record<T, string>) =>
  (Object.entries(words) as [T, string][]).map(([value, text]) => ({ value, words: text }));

const UNSAID = 'not-said';

/** Construction, closure, welt, hold-down, camera sides and notes. */
export function MakeFields({ spec, choice, canEdit, choose }: Making) {
  const { make, kind } = spec;
  const edges = edgeWords(kind);
  const change = (part: Partial<CushionMake>) => {
    const next = { ...make, ...part };
    choose({ make: next }, `made ${makeWords(next, kind)}`);
  };
  const sides = choice.cameraSides ?? [];
  return (
    <div className="grid items-start gap-x-6 gap-y-4 phone:grid-cols-2">
      <Select
        label="Construction"
        value={make.construction}
        options={optionsOf(CONSTRUCTION_WORDS)}
        onChange={(construction) => change({ construction })}
        disabled={!canEdit}
      />
      <Select
        label="Welt"
        value={make.welt}
        options={optionsOf(WELT_WORDS)}
        onChange={(welt) => change({ welt })}
        disabled={!canEdit}
      />
      <Select
        label="Closure"
        value={make.closure}
        options={optionsOf(CLOSURE_WORDS)}
        onChange={(closure) => change({ closure })}
        disabled={!canEdit}
      />
      <Select
        label="Closed at the edge"
        value={make.closureEdge}
        options={optionsOf(edges)}
        onChange={(closureEdge) => change({ closureEdge })}
        disabled={!canEdit}
      />
      <Select<HoldDown | typeof UNSAID>
        label="Held by"
        value={choice.holdDown ?? UNSAID}
        options={[
          { value: UNSAID, words: 'not said' },
          ...HOLD_DOWNS.map((value) => ({ value, words: HOLD_DOWN_WORDS[value] })),
        ]}
        onChange={(held) =>
          choose(
            { holdDown: held === UNSAID ? undefined : held },
            held === UNSAID ? 'hold-down not said' : `held by ${HOLD_DOWN_WORDS[held]}`,
          )
        }
        disabled={!canEdit}
      />
      <fieldset className="text-sm" disabled={!canEdit}>
        <legend className="mb-1.5 font-medium">The camera sees</legend>
        <div className="flex flex-wrap gap-x-4">
          {CUSHION_EDGES.map((edge) => (
            <label key={edge} className="flex min-h-10 items-center gap-2">
              <input
                type="checkbox"
                className="size-4 accent-chalk"
                checked={sides.includes(edge)}
                onChange={({ target }) => {
                  const next = CUSHION_EDGES.filter((one) =>
                    one === edge ? target.checked : sides.includes(one),
                  );
                  choose(
                    { cameraSides: next.length === 0 ? undefined : next },
                    `${edges[edge]} edge ${target.checked ? 'seen' : 'not seen'} by the camera`,
                  );
                }}
              />
              {edges[edge]}
            </label>
          ))}
        </div>
      </fieldset>
      <TextArea
        key={choice.notes}
        label="Notes to the maker"
        className="phone:col-span-2"
        defaultValue={choice.notes ?? ''}
        maxLength={1000}
        disabled={!canEdit}
        onBlur={({ target }) => {
          const notes = target.value.trim();
          if (notes !== (choice.notes ?? '')) choose({ notes: notes || undefined }, 'notes changed');
        }}
      />
    </div>
  );
}
