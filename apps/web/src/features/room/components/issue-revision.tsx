import type { FitSheet } from '@settlewright/anthropometry';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { useStore } from 'zustand';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { VerdictCounts } from '@/components/verdict.tsx';
import { announce } from '@/lib/announce.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useIssueRevision } from '../api.ts';
import { useAutosave, useSurroundings } from '../room-context.tsx';
import { nextLetter } from './next-letter.ts';

interface Props {
  sheet: FitSheet;
  lastLetter: string | undefined;
}

/** Freezes the draft with its fit sheet under the next letter. */
export function IssueRevision({ sheet, lastLetter }: Props) {
  const { path } = useSurroundings();
  const autosave = useAutosave();
  const { save, base } = useStore(autosave.state);
  const issue = useIssueRevision(path);
  const navigate = useNavigate();
  const [open, setOpen] = useState(false);
  const [note, setNote] = useState('');
  const letter = nextLetter(lastLetter);
  const { wontFit, notKnown } = sheet.counts;
  const bad = [wontFit > 0 && `${wontFit} won’t fit`, notKnown > 0 && `${notKnown} not known`].filter(
    Boolean,
  );
  const waiting = save.kind !== 'saved';

  return (
    <div>
      <Button size="small" className="w-full" onClick={() => setOpen(true)}>
        Issue revision {letter}
      </Button>
      <p className="mt-1 text-xs text-ink-3">
        stores the fit sheet with it{bad.length > 0 && `: ${bad.join(', ')}`}
      </p>
      <FormDialog
        open={open}
        onClose={() => setOpen(false)}
        title={`Issue revision ${letter}`}
        verb={`Issue revision ${letter}`}
        busy={issue.isPending}
        busyWords="Issuing"
        problem={
          issue.error
            ? sayProblem(issue.error)
            : waiting
              ? 'The last changes are not saved yet. They must be before the draft can be issued.'
              : null
        }
        describe={`Draft ${base.number} is frozen as it stands. Orders, papers and approvals cite it; it cannot be changed afterwards.`}
        onSubmit={(event) => {
          event.preventDefault();
          void (async () => {
            await autosave.flush();
            const now = autosave.state.getState();
            if (now.save.kind !== 'saved') return;
            await issue.mutateAsync({ baseNumber: now.base.number, note: note.trim() }).then(
              (revision) => {
                setOpen(false);
                announce(`Revision ${revision.letter} is issued.`);
                void navigate(
                  `/w/${path.workshopId}/p/${path.productionId}/sets/${path.setId}/revisions?letter=${revision.letter}`,
                );
              },
              () => undefined,
            );
          })();
        }}
      >
        <VerdictCounts counts={sheet.counts} className="mb-5" />
        <TextArea
          label="What changed"
          description="Printed with the revision."
          optional
          value={note}
          maxLength={2000}
          onChange={(event) => setNote(event.target.value)}
        />
      </FormDialog>
    </div>
  );
}
