import type { SetDocument } from '@settlewright/geometry';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Dialog } from '@/components/dialog.tsx';
import { ReasonField } from '@/components/reason-field.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { dayWords } from '@/lib/dates.ts';
import { withKnownDifference } from '@/lib/known-difference.ts';
import { useSession } from '@/lib/session.ts';
import { useSurroundings } from '../room-context.tsx';

interface Props {
  document: SetDocument;
  onReplace: (document: SetDocument, step: string) => void;
}

const SHOWN = 4;

/** The honest list of where the build departs from what it copies. */
export function KnownDifferences({ document, onReplace }: Props) {
  const { canEdit } = useSurroundings();
  const [open, setOpen] = useState(false);
  const list = document.knownDifferences;
  return (
    <section aria-labelledby="differences-heading">
      <RuleHeading
        id="differences-heading"
        aside={
          <Button look="word" onClick={() => setOpen(true)}>
            {list.length > 0 || !canEdit ? list.length : 'Add'}
            <span className="sr-only"> known differences, open the list</span>
          </Button>
        }
      >
        Known differences
      </RuleHeading>
      <p className="text-sm text-ink-2">
        {list.length === 0
          ? 'None written down.'
          : list
              .slice(0, SHOWN)
              .map(({ text }) => text.replace(/[.\s]*$/, '.'))
              .join(' ')}
        {list.length > SHOWN && ` And ${list.length - SHOWN} more.`}
      </p>
      <Dialog
        losesTyping
        open={open}
        onClose={() => setOpen(false)}
        title="Known differences"
        describe="Where the build departs from the reference, knowingly. Issued with every revision."
      >
        <ol className="grid gap-4">
          {list.map((difference, n) => (
            <li key={difference.id} className="flex flex-wrap items-end gap-x-3">
              <TextArea
                // What is taken on leaving the field is a new field: nothing of it can be lost.
                key={difference.text}
                className="min-w-0 flex-1"
                label={`Difference ${n + 1}`}
                defaultValue={difference.text}
                maxLength={1000}
                rows={2}
                disabled={!canEdit}
                onBlur={(event) => {
                  const text = event.target.value.trim();
                  if (text === difference.text || text === '') return;
                  onReplace(
                    {
                      ...document,
                      knownDifferences: list.map((old) =>
                        old.id === difference.id ? { ...old, text } : old,
                      ),
                    },
                    `Known difference ${n + 1} reworded`,
                  );
                }}
              />
              {canEdit && (
                <Button
                  look="word"
                  onClick={() =>
                    onReplace(
                      { ...document, knownDifferences: list.filter((old) => old.id !== difference.id) },
                      `Known difference ${n + 1} removed`,
                    )
                  }
                >
                  Remove<span className="sr-only"> difference {n + 1}</span>
                </Button>
              )}
              <Kept difference={difference} />
            </li>
          ))}
        </ol>
        {canEdit && <AddDifference document={document} onReplace={onReplace} />}
      </Dialog>
    </section>
  );
}

/** Why a difference is kept, who said so, and when. */
function Kept({ difference: { reason, by, on } }: { difference: SetDocument['knownDifferences'][number] }) {
  const who = [by, on && dayWords(on)].filter(Boolean).join(', ');
  if (!reason && !who) return null;
  return (
    <p className="mt-1 w-full text-sm text-ink-2">
      {reason && <span className="block whitespace-pre-line">Because: {reason}</span>}
      {who && <span className="text-ink-3">{who}</span>}
    </p>
  );
}

function AddDifference({ document, onReplace }: Props) {
  const [text, setText] = useState('');
  const [reason, setReason] = useState('');
  const by = useSession((state) => state.user?.name);
  return (
    <form
      className="mt-5 grid gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        if (text.trim() === '') return;
        onReplace(
          withKnownDifference(document, { text: text.trim(), reason: reason.trim(), by }),
          'Known difference added',
        );
        setText('');
        setReason('');
      }}
    >
      <TextArea
        label="Another one"
        description="For example: the sill is 1″ higher than in the photograph."
        value={text}
        maxLength={1000}
        rows={2}
        onChange={(event) => setText(event.target.value)}
      />
      <ReasonField optional value={reason} onChange={setReason} />
      <div>
        <Button type="submit" size="small">
          Add it
        </Button>
      </div>
    </form>
  );
}
