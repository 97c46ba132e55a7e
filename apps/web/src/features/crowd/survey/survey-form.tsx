import { MEASURE_INFO } from '@settlewright/anthropometry';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import type { SurveyMapping, SurveyPreview } from '@/lib/contract.ts';
import { joinWords } from '@/lib/dimension-words.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useAddSurvey } from './api.ts';
import { ColumnTable } from './column-table.tsx';
import { wholeMapping } from './mapping.ts';
import { RowFaults } from './row-faults.tsx';

interface SurveyFormProps {
  csv: string;
  read: SurveyPreview;
  isReading: boolean;
  onRead: (mapping: SurveyMapping) => void;
  onAdded: (id: string) => void;
}

/** How the table reads, what to call it, and who stands behind it. */
export function SurveyForm({ csv, read, isReading, onRead, onAdded }: SurveyFormProps) {
  const { id, isOwner } = useWorkshop();
  const add = useAddSurvey(id);
  const [mapping, setMapping] = useState(read.mapping);
  const [name, setName] = useState('');
  const [source, setSource] = useState('');
  const [keepRows, setKeepRows] = useState(false);
  const whole = wholeMapping(mapping);
  const people = read.women + read.men;
  const isRead = JSON.stringify(mapping) === JSON.stringify(read.mapping);
  const isReady = isRead && whole && people > 0 && read.problems.length === 0;
  const plain = (keys: SurveyPreview['read']) => joinWords(keys.map((key) => MEASURE_INFO[key].plain));
  return (
    <form
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        if (!isReady || name.trim() === '' || source.trim() === '') return;
        add.mutate(
          { name: name.trim(), source: source.trim(), csv, mapping: whole, keepRows },
          { onSuccess: (added) => onAdded(added.id) },
        );
      }}
    >
      <ColumnTable columns={read.columns} mapping={mapping} onChange={setMapping} />
      <label className="flex items-center gap-3">
        <input
          type="checkbox"
          className="size-4 accent-(--color-chalk)"
          checked={mapping.decimalComma}
          onChange={(event) => setMapping({ ...mapping, decimalComma: event.target.checked })}
        />
        A comma stands before the decimals
      </label>
      {!isRead && (
        <div>
          <Button
            disabled={!whole}
            busy={isReading}
            busyWords="Reading"
            onClick={() => whole && onRead(whole)}
          >
            Read it so
          </Button>
          {!whole && <span className="ml-4 text-sm text-ink-2">Say which column tells women from men.</span>}
        </div>
      )}
      {isRead && (
        <div role="status">
          <p className="text-lg">
            {read.women} women and {read.men} men can be read
            {read.leftOut > 0 && `; ${read.leftOut} of ${read.rows} rows have a fault and are left out`}.
          </p>
          {read.problems.map(({ path, message }) => (
            <Notice key={path + message} tone="wont" className="mt-2">
              {message}
            </Notice>
          ))}
          {read.estimated.length > 0 && (
            <p className="mt-1 text-sm text-ink-2">
              Not in the table and estimated from the rest: {plain(read.estimated)}.
            </p>
          )}
          <RowFaults faults={read.faults} count={read.faultCount} />
        </div>
      )}
      <TextField
        label="Name"
        value={name}
        maxLength={120}
        onChange={(event) => setName(event.target.value)}
      />
      <TextArea
        label="Source"
        description="Who was measured, by whom and when. It stands beside every share."
        value={source}
        maxLength={500}
        rows={2}
        onChange={(event) => setSource(event.target.value)}
      />
      {isOwner && (
        <label className="flex items-center gap-3">
          <input
            type="checkbox"
            className="size-4 accent-(--color-chalk)"
            checked={keepRows}
            onChange={(event) => setKeepRows(event.target.checked)}
          />
          Keep the measured rows, too; otherwise only statistics
        </label>
      )}
      {add.isError && <Notice tone="wont">{sayProblem(add.error)}</Notice>}
      <div>
        <Button
          type="submit"
          look="main"
          disabled={!isReady || name.trim() === '' || source.trim() === ''}
          busy={add.isPending}
          busyWords="Adding"
        >
          Add these {people} people
        </Button>
      </div>
    </form>
  );
}
