import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Dialog } from '@/components/dialog.tsx';
import { useWorkshop } from '@/lib/workshop.ts';
import { NO_WORDS, SurveyForm } from './survey-form.tsx';
import { useSurveyTable } from './use-survey-table.ts';

const PICKER =
  'mt-1 block w-full text-sm text-ink-2 file:mr-4 file:min-h-9 file:cursor-pointer file:rounded-sm file:border-[1.25px] file:border-solid file:border-rule-strong file:bg-transparent file:px-3.5 file:text-sm file:font-medium file:text-ink';

/** A table of measured people as a population of the workshop's own. What was typed stays when the slip is closed. */
export function AddSurvey({ onAdded }: { onAdded: (id: string) => void }) {
  const { id } = useWorkshop();
  const [open, setOpen] = useState(false);
  const [words, setWords] = useState(NO_WORDS);
  const { table, fault, isReading, take, change, forget } = useSurveyTable(id);
  return (
    <>
      <Button look="word" onClick={() => setOpen(true)}>
        {table ? `Go on with ${table.fileName}` : 'Add your own survey'}
      </Button>
      <Dialog
        wide
        open={open}
        onClose={() => setOpen(false)}
        title="Add your own survey"
        describe="A table, one person a row, with sex, height, weight and whatever else was measured. Only statistics are kept, unless you say otherwise."
      >
        <label className="mb-5 block text-sm">
          <span className="font-medium">{table ? 'Another table instead' : 'The table as a CSV file'}</span>
          <input
            type="file"
            accept=".csv,.txt,text/csv,text/plain"
            // So that the same file can be taken again once it was put right.
            onClick={(event) => {
              event.currentTarget.value = '';
            }}
            onChange={(event) => {
              const [file] = event.target.files ?? [];
              if (file) void take(file);
            }}
            className={PICKER}
          />
          <span aria-live="polite">
            {fault && <span className="mt-2 block font-medium text-wont">{fault}</span>}
            {isReading && !table && <span className="mt-2 block text-ink-2">Reading</span>}
          </span>
        </label>
        {table && (
          <SurveyForm
            table={table}
            words={words}
            isReading={isReading}
            onMapping={change}
            onWords={setWords}
            onAdded={(added) => {
              setOpen(false);
              setWords(NO_WORDS);
              forget();
              onAdded(added);
            }}
          />
        )}
      </Dialog>
    </>
  );
}
