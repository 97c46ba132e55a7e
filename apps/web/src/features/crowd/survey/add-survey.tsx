import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Dialog } from '@/components/dialog.tsx';
import { LARGEST_CSV_BYTES, readTextFile } from '@/lib/read-text-file.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { usePreviewSurvey } from './api.ts';
import { SurveyForm } from './survey-form.tsx';

/** A table of measured people as a population of the workshop's own. */
export function AddSurvey({ onAdded }: { onAdded: (id: string) => void }) {
  const { id } = useWorkshop();
  const [open, setOpen] = useState(false);
  const [csv, setCsv] = useState('');
  const [problem, setProblem] = useState<string>();
  const preview = usePreviewSurvey(id);
  const close = () => {
    setOpen(false);
    setCsv('');
    setProblem(undefined);
    preview.reset();
  };
  const take = async (file: File | undefined) => {
    if (!file) return;
    if (file.size > LARGEST_CSV_BYTES) {
      setProblem(
        `“${file.name}” holds more than 2 MB, the most that is read at once. Take part of the rows.`,
      );
      return;
    }
    setProblem(undefined);
    const text = await readTextFile(file);
    setCsv(text);
    preview.mutate({ csv: text });
  };
  const fault = problem ?? (preview.isError ? sayProblem(preview.error) : undefined);
  return (
    <>
      <Button look="word" onClick={() => setOpen(true)}>
        Add your own survey
      </Button>
      <Dialog
        wide
        open={open}
        onClose={close}
        title="Add your own survey"
        describe="A table, one person a row, with sex, height, weight and whatever else was measured. Only statistics are kept, unless you say otherwise."
      >
        {preview.data ? (
          <SurveyForm
            csv={csv}
            read={preview.data}
            isReading={preview.isPending}
            onRead={(mapping) => preview.mutate({ csv, mapping })}
            onAdded={(added) => {
              close();
              onAdded(added);
            }}
          />
        ) : (
          <label className="block text-sm">
            <span className="font-medium">The table as a CSV file</span>
            <input
              type="file"
              accept=".csv,.txt,text/csv,text/plain"
              onChange={(event) => void take(event.target.files?.[0])}
              className="mt-1 block w-full text-sm text-ink-2 file:mr-4 file:min-h-9 file:cursor-pointer file:rounded-sm file:border-[1.25px] file:border-solid file:border-rule-strong file:bg-transparent file:px-3.5 file:text-sm file:font-medium file:text-ink"
            />
            {fault && <span className="mt-2 block font-medium text-wont">{fault}</span>}
            {preview.isPending && <span className="mt-2 block text-ink-2">Reading</span>}
          </label>
        )}
      </Dialog>
    </>
  );
}
