import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { announce } from '@/lib/announce.ts';
import { dayWords } from '@/lib/dates.ts';
import { keepFile } from '@/lib/download.ts';
import { sayProblem } from '@/lib/problem.ts';
import { type Desk, openFile, type OrderFile, useAddFile, useFileUrl, useRemoveFile } from './desk.ts';
import { FileInput } from './file-input.tsx';
import { MarkChoice } from './mark-choice.tsx';

interface FilesProps {
  desk: Desk;
  files: readonly OrderFile[];
  marks: readonly string[];
  open: boolean;
}

/** A photograph as it was drawn anew by the server, at the width of the column. */
export function Photo({ desk, file }: { desk: Desk; file: OrderFile }) {
  const url = useFileUrl(desk, file.id, true);
  const words = `${file.cushionMark ? `${file.cushionMark}, ` : ''}${file.name}, from ${file.byName}`;
  if (url.isError) return <Notice tone="wont">{sayProblem(url.error)}</Notice>;
  return url.data === undefined ? (
    <div className="aspect-[4/3] bg-sunk" />
  ) : (
    <img
      src={url.data}
      alt={words}
      width={file.widthPx ?? undefined}
      height={file.heightPx ?? undefined}
      className="h-auto w-full"
    />
  );
}

function Row({ desk, file }: { desk: Desk; file: OrderFile }) {
  const remove = useRemoveFile(desk);
  const [problem, setProblem] = useState<string | null>(null);
  const get = () => {
    openFile(desk, file.id).then(
      ({ blob }) => keepFile(blob, file.name),
      (error: unknown) => setProblem(sayProblem(error)),
    );
  };
  const fault = problem ?? (remove.error && sayProblem(remove.error));
  return (
    <li className="min-w-0">
      {file.type === 'image/jpeg' && <Photo desk={desk} file={file} />}
      <p className="mt-1 text-sm break-words">
        {file.cushionMark && <b className="font-semibold">{file.cushionMark}: </b>}
        {file.name}
        <span className="block text-ink-2">
          {file.side === desk.side ? 'You' : file.byName}, {dayWords(file.at)}
        </span>
      </p>
      <p className="flex flex-wrap gap-x-4 print:hidden">
        <Button look="word" onClick={get}>
          Save <span className="sr-only">{file.name}</span>
        </Button>
        {file.side === desk.side && (
          <Button look="word" busy={remove.isPending} onClick={() => remove.mutate(file.id)}>
            Remove <span className="sr-only">{file.name}</span>
          </Button>
        )}
      </p>
      {fault && <Notice tone="wont">{fault}</Notice>}
    </li>
  );
}

/** Photographs and papers of both sides; nobody else can open them. */
export function Files({ desk, files, marks, open }: FilesProps) {
  const add = useAddFile(desk);
  const [cushionMark, setMark] = useState<string | null>(null);
  return (
    <section aria-label="Photographs and papers" className="mb-8">
      <RuleHeading>Photographs and papers</RuleHeading>
      {files.length > 0 && (
        <ul className="grid grid-cols-2 gap-3 py-3">
          {files.map((file) => (
            <Row key={file.id} desk={desk} file={file} />
          ))}
        </ul>
      )}
      {open && (
        <div className="grid gap-3 pt-3 print:hidden">
          <MarkChoice label="Of" marks={marks} mark={cushionMark} onChange={setMark} />
          <FileInput
            label="Add a photograph or a PDF"
            accept="image/jpeg,image/png,image/webp,application/pdf"
            about="JPEG, PNG, WebP or PDF, at most 15 MB. Where and when a photograph was taken is cut out of it."
            busy={add.isPending}
            onPick={(file) =>
              add.mutate({ file, cushionMark }, { onSuccess: () => announce(`${file.name} added.`) })
            }
          />
          {add.error && <Notice tone="wont">{sayProblem(add.error)}</Notice>}
        </div>
      )}
    </section>
  );
}
