import { useState } from 'react';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { Dialog } from '@/components/dialog.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextArea } from '@/components/text-field.tsx';
import type { ImportPreview } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import { type CastPlace, useImport, usePreviewImport } from '../api.ts';
import { LARGEST_CSV_BYTES, readTextFile } from '@/lib/read-text-file.ts';
import { ImportPreviewTable } from './import-preview-table.tsx';

const EXAMPLE = `name,part,height,weight kg,shoe in
Ines Faro,the conductor,5' 6 1/2",68,1
Bram Oake,,184 cm,,`;

interface ImportDialogProps {
  place: CastPlace;
  open: boolean;
  onClose: () => void;
}

/** People from a table: paste or choose a file, see how every row is read, then add the good ones. */
export function ImportDialog({ place, open, onClose }: ImportDialogProps) {
  const [csv, setCsv] = useState('');
  const [fileProblem, setFileProblem] = useState<string>();
  const preview = usePreviewImport(place);
  const add = useImport(place);
  const read = preview.data;
  const good = read?.rows.filter((row) => row.value).length ?? 0;

  const close = () => {
    preview.reset();
    add.reset();
    setFileProblem(undefined);
    onClose();
  };

  const take = async (file: File | undefined) => {
    if (file === undefined) return;
    if (file.size > LARGEST_CSV_BYTES) {
      setFileProblem(
        `“${file.name}” holds more than 2 MB, the most that is read at once. Take part of the rows.`,
      );
      return;
    }
    setFileProblem(undefined);
    const text = await readTextFile(file);
    if (text.trim() === '') {
      preview.reset();
      setFileProblem(`“${file.name}” is empty. Choose one with a line of names and a line for each person.`);
      return;
    }
    setCsv(text);
    preview.mutate(text);
  };

  const send = () =>
    add.mutate(csv, {
      onSuccess: ({ added, refused }) => {
        toast(`${added} added${refused > 0 ? `, ${refused} left out` : ''}.`);
        setCsv('');
        close();
      },
    });

  return (
    <Dialog
      losesTyping
      wide
      open={open}
      onClose={close}
      title="Add people from a table"
      describe="One person a row, the columns named in the first one. Lengths in any unit; a column name may carry the unit, as in “hips mm”."
    >
      {read === undefined ? (
        <div>
          <TextArea
            label="The table, comma or semicolon separated"
            rows={8}
            value={csv}
            placeholder={EXAMPLE}
            spellCheck={false}
            error={preview.isError ? sayProblem(preview.error) : fileProblem}
            onChange={(event) => setCsv(event.target.value)}
          />
          <label className="mt-4 block text-sm">
            <span className="font-medium">or a file</span>
            <input
              type="file"
              accept=".csv,.txt,text/csv,text/plain"
              onChange={(event) => void take(event.target.files?.[0])}
              className="mt-1 block w-full text-sm text-ink-2 file:mr-4 file:min-h-9 file:cursor-pointer file:rounded-sm file:border-[1.25px] file:border-solid file:border-rule-strong file:bg-transparent file:px-3.5 file:text-sm file:font-medium file:text-ink"
            />
          </label>
          <div className="mt-6 flex flex-wrap gap-3">
            <Button
              look="main"
              disabled={csv.trim() === ''}
              busy={preview.isPending}
              busyWords="Reading"
              onClick={() => preview.mutate(csv)}
            >
              See how it reads
            </Button>
            <Button onClick={close}>Cancel</Button>
          </div>
        </div>
      ) : (
        <Reading
          read={read}
          good={good}
          busy={add.isPending}
          problem={add.isError ? sayProblem(add.error) : null}
          onBack={() => preview.reset()}
          onAdd={send}
        />
      )}
    </Dialog>
  );
}

interface ReadingProps {
  read: ImportPreview;
  good: number;
  busy: boolean;
  problem: string | null;
  onBack: () => void;
  onAdd: () => void;
}

function Reading({ read, good, busy, problem, onBack, onAdd }: ReadingProps) {
  const bad = read.rows.length - good;
  const left = bad > 0 ? `; ${bad} cannot, and ${bad === 1 ? 'is' : 'are'} left out` : '';
  return (
    <div>
      {problem && (
        <Notice tone="wont" className="mb-4">
          {problem}
        </Notice>
      )}
      <p role="status" className="mb-3 text-lg">
        {read.rows.length === 0
          ? 'The table names its columns and has no row under them. Write one row for each person.'
          : `${good} of ${read.rows.length} ${read.rows.length === 1 ? 'row' : 'rows'} can be taken${left}.`}
      </p>
      {read.ignoredColumns.length > 0 && (
        <p className="mb-3 text-sm text-ink-2">
          Not read, as no column goes by that name:{' '}
          {read.ignoredColumns.map((column) => `“${column}”`).join(', ')}.
        </p>
      )}
      <ImportPreviewTable rows={read.rows} />
      <div className="mt-6 flex flex-wrap gap-3">
        <Button look="main" disabled={good === 0} busy={busy} busyWords="Adding" onClick={onAdd}>
          Add {good} {good === 1 ? 'person' : 'people'}
        </Button>
        <Button onClick={onBack}>Change the table</Button>
      </div>
    </div>
  );
}
