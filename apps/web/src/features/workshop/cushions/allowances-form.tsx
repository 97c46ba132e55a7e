import {
  ALLOWANCE_KEYS,
  allowanceLimits,
  CUSHION_SETTINGS,
  type AllowanceKey,
  type WorkshopCushions,
} from '@settlewright/geometry';
import { useState } from 'react';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { Measure } from '@/components/measure.tsx';
import { Notice } from '@/components/notice.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { capital } from '@/lib/capital.ts';
import { useSaveCushionSettings, type KeptCushionSettings } from '@/lib/cushion-settings.ts';
import { useFormat } from '@/lib/format.ts';
import { sayProblem } from '@/lib/problem.ts';

type Entries = Record<AllowanceKey, QuantityEntry>;
type Allowances = WorkshopCushions['allowancesMm'];

const entriesOf = (own: Allowances): Entries =>
  Object.fromEntries(ALLOWANCE_KEYS.map((key) => [key, entryOf(own[key])])) as Entries;

const allowancesOf = (entries: Entries): Allowances =>
  Object.fromEntries(
    ALLOWANCE_KEYS.flatMap((key) => {
      const { value } = entries[key];
      return value === null ? [] : [[key, value]];
    }),
  );

/** What stands where nobody may change it. */
function AllowanceList({ own }: { own: Allowances }) {
  const format = useFormat();
  return (
    <dl className="grid gap-x-8 phone:grid-cols-2">
      {ALLOWANCE_KEYS.map((key) => {
        const { label, valueMm, source } = CUSHION_SETTINGS[key];
        return (
          <div key={key} className="border-b border-rule py-2">
            <dt className="text-sm text-ink-2">{capital(label)}</dt>
            <dd className="text-sm font-medium">
              <Measure text={format.length(own[key] ?? valueMm)} />{' '}
              <span className="font-normal text-ink-3">
                ({own[key] === undefined ? source : 'shop rule'})
              </span>
            </dd>
          </div>
        );
      })}
    </dl>
  );
}

interface AllowancesFormProps {
  workshopId: string;
  kept: KeptCushionSettings;
  canChange: boolean;
}

/** Every allowance with its usual value: a field left empty means that one. */
export function AllowancesForm({ workshopId, kept, canChange }: AllowancesFormProps) {
  const format = useFormat();
  const save = useSaveCushionSettings(workshopId);
  const [entries, setEntries] = useState(() => entriesOf(kept.settings.allowancesMm));
  if (!canChange) return <AllowanceList own={kept.settings.allowancesMm} />;
  const isWrong = ALLOWANCE_KEYS.some((key) => entries[key].problem !== undefined);
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        if (isWrong) return;
        save.mutate(
          {
            baseNumber: kept.number,
            settings: { ...kept.settings, allowancesMm: allowancesOf(entries) },
          },
          { onSuccess: () => toast('Allowances saved. Issued revisions stay as they are.') },
        );
      }}
    >
      {save.isError && <Notice tone="wont">{sayProblem(save.error)}</Notice>}
      <div className="grid items-start gap-x-8 gap-y-4 phone:grid-cols-2">
        {ALLOWANCE_KEYS.map((key) => {
          const { label, valueMm, source } = CUSHION_SETTINGS[key];
          const usual = format.length(valueMm);
          return (
            <LengthField
              key={key}
              label={capital(label)}
              entry={entries[key]}
              onChange={(entry) => setEntries((all) => ({ ...all, [key]: entry }))}
              {...allowanceLimits(key)}
              placeholder={usual}
              description={
                entries[key].value === null
                  ? `As usual, ${usual} (${source}).`
                  : `Shop rule; as usual ${usual} (${source}).`
              }
              error={entries[key].problem}
            />
          );
        })}
      </div>
      <div>
        <Button type="submit" look="main" busy={save.isPending} busyWords="Saving">
          Save the allowances
        </Button>
      </div>
    </form>
  );
}
