import { useState } from 'react';
import type { OpenSurveyMapping, SurveyPreview } from '@/lib/contract.ts';
import { sayProblem } from '@/lib/problem.ts';
import { LARGEST_CSV_BYTES, readTextFile } from '@/lib/read-text-file.ts';
import { usePreviewSurvey } from './api.ts';

/** A table of measured people as it reads now. */
export interface SurveyTable {
  fileName: string;
  csv: string;
  read: SurveyPreview;
  /** What is asked for; `read` follows. */
  mapping: OpenSurveyMapping;
}

/** Takes a file and reads it on the server, again after each change of what its columns are. Nothing is kept there. */
export function useSurveyTable(workshopId: string) {
  const preview = usePreviewSurvey(workshopId);
  const [table, setTable] = useState<SurveyTable>();
  const [fault, setFault] = useState<string>();
  const say = (error: unknown) => setFault(sayProblem(error));

  async function take(file: File): Promise<void> {
    if (file.size > LARGEST_CSV_BYTES) {
      setFault(`“${file.name}” holds more than 2 MB, the most that is read at once. Take part of the rows.`);
      return;
    }
    setFault(undefined);
    const csv = await readTextFile(file);
    preview.mutate(
      { csv },
      {
        onSuccess: (read) => setTable({ fileName: file.name, csv, read, mapping: read.mapping }),
        onError: say,
      },
    );
  }

  function change(mapping: OpenSurveyMapping): void {
    if (!table) return;
    setFault(undefined);
    setTable({ ...table, mapping });
    preview.mutate(
      { csv: table.csv, mapping },
      { onSuccess: (read) => setTable({ ...table, read, mapping: read.mapping }), onError: say },
    );
  }

  const forget = () => {
    setTable(undefined);
    setFault(undefined);
  };
  return { table, fault, isReading: preview.isPending, take, change, forget };
}
