import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { Problem, sayProblem } from '@/lib/problem.ts';

interface StartFaultProps {
  error: Error;
  /** The draft that this page shows. */
  shown: number;
}

/** Why nothing is counted, and what can be done about it. */
export function StartFault({ error, shown }: StartFaultProps) {
  if (!(error instanceof Problem)) {
    return (
      <Notice tone="wont" className="my-3">
        {sayProblem(error)}
      </Notice>
    );
  }
  const { code, body, fields } = error;
  if (code === 'draft-moved-on') {
    const now = typeof body['currentNumber'] === 'number' ? body['currentNumber'] : undefined;
    return (
      <Notice tone="wont" title="The set was changed meanwhile" className="my-3">
        <p>
          This page shows draft {shown}
          {now !== undefined && `, and the set is at draft ${now}`}: somebody else changed it, or another
          window did. Nothing was counted. Load the set as it stands now, look at the shares again, then
          count.
        </p>
        <Button size="small" className="mt-2" onClick={() => window.location.reload()}>
          {now === undefined ? 'Load the set again' : `Load draft ${now}`}
        </Button>
      </Notice>
    );
  }
  const isGone = fields.some((field) => field.code === 'unknown-population');
  return (
    <Notice tone="wont" className="my-3">
      {isGone
        ? 'This survey was removed from the workshop meanwhile. Choose other people, then count.'
        : sayProblem(error)}
    </Notice>
  );
}
