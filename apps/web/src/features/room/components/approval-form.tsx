import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { TextArea } from '@/components/text-field.tsx';
import { announce } from '@/lib/announce.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop } from '@/lib/workshop.ts';
import { useApprove, type FullRevision, type SetPath } from '../api.ts';
import { momentWords } from '@/lib/dates.ts';
import { sayApproval } from './revision-words.ts';

/** What reviewers said of a revision, and the form with which one more says it. */
export function ApprovalForm({ path, revision }: { path: SetPath; revision: FullRevision }) {
  const { role } = useWorkshop();
  const approve = useApprove(path);
  const [comment, setComment] = useState('');
  const [missing, setMissing] = useState(false);
  const maySign = role === 'reviewer' || role === 'owner';

  function decide(decision: 'approved' | 'changes-wanted') {
    if (decision === 'changes-wanted' && comment.trim() === '') {
      setMissing(true);
      return;
    }
    setMissing(false);
    approve.mutate(
      { letter: revision.letter, decision, comment: comment.trim() },
      {
        onSuccess: () => {
          setComment('');
          announce(
            `Revision ${revision.letter}: ${decision === 'approved' ? 'approved' : 'changes wanted'}.`,
          );
        },
      },
    );
  }

  const error = missing ? 'Say what should change.' : approve.error ? sayProblem(approve.error) : undefined;
  return (
    <div className="mt-3 grid gap-3 text-sm">
      <ul className="grid gap-1">
        {revision.approvals.length === 0 && <li className="text-ink-3">{sayApproval(undefined)}</li>}
        {revision.approvals.map((approval) => (
          <li key={approval.decidedAt}>
            <strong className="font-medium">{sayApproval(approval)}</strong>,{' '}
            {momentWords(approval.decidedAt)}
            {approval.comment && <span className="block max-w-text text-ink-2">{approval.comment}</span>}
          </li>
        ))}
      </ul>
      {maySign && (
        <div className="grid max-w-text gap-3">
          <TextArea
            label="Your word on it"
            description="Needed when something should change."
            value={comment}
            rows={2}
            maxLength={4000}
            error={error}
            onChange={(event) => setComment(event.target.value)}
          />
          <div className="flex flex-wrap gap-3">
            <Button size="small" busy={approve.isPending} onClick={() => decide('approved')}>
              Approve revision {revision.letter}
            </Button>
            <Button size="small" busy={approve.isPending} onClick={() => decide('changes-wanted')}>
              Changes wanted
            </Button>
          </div>
        </div>
      )}
    </div>
  );
}
