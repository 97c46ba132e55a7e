import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import type { OpenSurveyMapping } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useAddSurvey } from './api.ts';
import { ColumnTable } from './column-table.tsx';
import { wholeMapping } from './mapping.ts';
import { ReadPeople } from './read-people.tsx';
import type { SurveyTable } from './use-survey-table.ts';

/** What a person says of the survey. */
export interface SurveyWords {
  name: string;
  source: string;
  keepRows: boolean;
}

export const NO_WORDS: SurveyWords = { name: '', source: '', keepRows: false };
const TICK = 'size-4 shrink-0 accent-(--color-chalk)';

interface SurveyFormProps {
  table: SurveyTable;
  words: SurveyWords;
  isReading: boolean;
  onMapping: (mapping: OpenSurveyMapping) => void;
  onWords: (words: SurveyWords) => void;
  onAdded: (id: string) => void;
}

/** How the table reads, what to call it, and who stands behind it. */
export function SurveyForm({ table, words, isReading, onMapping, onWords, onAdded }: SurveyFormProps) {
  const { id, isOwner } = useWorkshop();
  const add = useAddSurvey(id);
  const { csv, read, mapping } = table;
  const whole = wholeMapping(mapping);
  const people = read.women + read.men;
  const isReady = !isReading && whole !== undefined && people > 0 && read.problems.length === 0;
  const name = words.name.trim();
  const source = words.source.trim();
  return (
    <form
      className="grid grid-cols-[minmax(0,1fr)] gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        if (!isReady || name === '' || source === '') return;
        add.mutate(
          { name, source, csv, mapping: whole, keepRows: words.keepRows },
          { onSuccess: (added) => onAdded(added.id) },
        );
      }}
    >
      <ColumnTable columns={read.columns} mapping={mapping} onChange={onMapping} />
      <label className="flex min-h-8 items-center gap-3">
        <input
          type="checkbox"
          className={TICK}
          checked={mapping.decimalComma}
          onChange={(event) => onMapping({ ...mapping, decimalComma: event.target.checked })}
        />
        A comma stands before the decimals
      </label>
      <ReadPeople read={read} isReading={isReading} />
      <TextField
        label="Name"
        value={words.name}
        maxLength={120}
        onChange={(event) => onWords({ ...words, name: event.target.value })}
      />
      <TextArea
        label="Source"
        description="Who was measured, by whom and when. It stands beside every share."
        value={words.source}
        maxLength={500}
        rows={2}
        onChange={(event) => onWords({ ...words, source: event.target.value })}
      />
      {isOwner && (
        <label className="flex min-h-8 items-center gap-3">
          <input
            type="checkbox"
            className={TICK}
            checked={words.keepRows}
            onChange={(event) => onWords({ ...words, keepRows: event.target.checked })}
          />
          Keep the measured rows, too; otherwise only statistics
        </label>
      )}
      {add.isError && <Notice tone="wont">{sayProblem(add.error)}</Notice>}
      <div className="flex flex-wrap items-center gap-4">
        <Button
          type="submit"
          look="main"
          disabled={!isReady || name === '' || source === ''}
          busy={add.isPending}
          busyWords="Adding"
        >
          {people > 0 ? `Add these ${people} people` : 'Add these people'}
        </Button>
        {isReady && (name === '' || source === '') && (
          <p className="text-sm text-ink-2">Give it a name and a source first.</p>
        )}
      </div>
    </form>
  );
}
