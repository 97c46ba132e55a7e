import type { Part, Piece } from '@settlewright/geometry';
import { useEffect, useMemo, useState } from 'react';
import { dayWords } from '@/lib/dates.ts';
import { Button } from '@/components/button.tsx';
import { Disclosure } from '@/components/disclosure.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { sayProblem } from '@/lib/problem.ts';
import { useSession } from '@/lib/session.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useAddNote, useBuilt, useMarkBuilt, useNotes, useResolveNote, type Note } from '../api.ts';
import { useSurroundings } from '../room-context.tsx';
import { createNoteDraft } from '../save/outbox.ts';

interface Props {
  piece: Piece | undefined;
  pieces: readonly Piece[];
  parts: readonly Part[];
}

/** Remarks from the floor and from reviewers; the carpenter ticks off what is built. */
export function NotesPanel({ piece, pieces, parts }: Props) {
  const { path } = useSurroundings();
  const { role } = useWorkshop();
  const notes = useNotes(path);
  const open = (notes.data ?? []).filter((note) => !note.resolved);
  const done = (notes.data ?? []).filter((note) => note.resolved);
  const marks = new Map(pieces.map((one) => [one.id, one.mark]));
  return (
    <section aria-labelledby="notes-heading" className="grid gap-3">
      <RuleHeading id="notes-heading" aside={<span className="text-sm text-ink-3">{open.length}</span>}>
        Notes
      </RuleHeading>
      {notes.isError && <p className="text-sm text-wont">{sayProblem(notes.error)}</p>}
      <ul className="grid gap-3">
        {open.map((note) => (
          <NoteRow key={note.id} note={note} mark={note.pieceId ? marks.get(note.pieceId) : undefined} />
        ))}
      </ul>
      {done.length > 0 && (
        <Disclosure words={`${done.length} settled`}>
          <ul className="grid gap-3">
            {done.map((note) => (
              <NoteRow key={note.id} note={note} mark={note.pieceId ? marks.get(note.pieceId) : undefined} />
            ))}
          </ul>
        </Disclosure>
      )}
      <AddNote piece={piece} kind={role === 'carpenter' ? 'mark' : 'comment'} />
      {role !== 'reviewer' && <BuiltParts piece={piece} parts={parts} />}
    </section>
  );
}

function NoteRow({ note, mark }: { note: Note; mark: string | undefined }) {
  const { path } = useSurroundings();
  const resolve = useResolveNote(path);
  const on = dayWords(note.createdAt);
  return (
    <li className="border-b border-rule pb-2 text-sm">
      <p>
        {mark && <strong className="font-semibold">{mark} </strong>}
        {note.text}
      </p>
      <p className="flex justify-between gap-3 text-xs text-ink-3">
        <span>
          {note.createdBy.name}, {on}
        </span>
        <Button
          look="word"
          className="text-xs!"
          onClick={() => resolve.mutate({ id: note.id, resolved: !note.resolved })}
        >
          {note.resolved ? 'Open again' : 'Settle'}
        </Button>
      </p>
    </li>
  );
}

function AddNote({ piece, kind }: { piece: Piece | undefined; kind: Note['kind'] }) {
  const { path } = useSurroundings();
  const add = useAddNote(path);
  const userId = useSession((state) => state.user?.id ?? '');
  const draft = useMemo(() => createNoteDraft(userId, path.setId), [userId, path.setId]);
  const [text, setText] = useState('');

  useEffect(() => {
    // Storage may be closed to the page; then a note lasts as long as the page does.
    draft.read().then(
      (kept) => kept !== undefined && setText((typed) => typed || kept),
      () => undefined,
    );
  }, [draft]);

  function type(next: string) {
    setText(next);
    draft.write(next).catch(() => undefined);
  }

  return (
    <form
      className="grid gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        if (text.trim() === '') return;
        add.mutate({ text: text.trim(), pieceId: piece?.id, kind }, { onSuccess: () => type('') });
      }}
    >
      <TextArea
        label={piece ? `A note on ${piece.mark}` : 'A note on the set'}
        value={text}
        rows={2}
        maxLength={4000}
        error={add.error ? sayProblem(add.error) : undefined}
        onChange={(event) => type(event.target.value)}
      />
      <div>
        <Button type="submit" size="small" busy={add.isPending} busyWords="Sending">
          Leave the note
        </Button>
      </div>
    </form>
  );
}

const words = (text: string) => text.replaceAll('-', ' ');

function BuiltParts({ piece, parts }: { piece: Piece | undefined; parts: readonly Part[] }) {
  const { path } = useSurroundings();
  const built = useBuilt(path);
  const mark = useMarkBuilt(path);
  if (!piece) return <p className="text-sm text-ink-3">Select a piece to tick off its parts.</p>;
  const own = parts.filter((part) => part.pieceId === piece.id);
  const done = new Set((built.data ?? []).map((entry) => entry.partId));
  const count = own.filter((part) => done.has(part.id)).length;
  return (
    <Disclosure words={`Parts of ${piece.mark} built: ${count} of ${own.length}`}>
      <ul className="grid max-h-64 gap-1 overflow-auto text-sm">
        {own.map((part) => (
          <li key={part.id}>
            <label className="flex min-h-7 items-center gap-2">
              <input
                type="checkbox"
                checked={done.has(part.id)}
                onChange={(event) => mark.mutate({ partId: part.id, built: event.target.checked })}
                className="size-4 accent-(--color-chalk)"
              />
              {words(part.id.split('/').at(-1) ?? part.id)}
            </label>
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}
