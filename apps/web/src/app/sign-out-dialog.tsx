import { useEffect, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { FormDialog } from '@/components/dialog.tsx';
import { listUnsentWork } from '@/lib/unsent-work.ts';
import { signOut } from '@/lib/sign-out.ts';

interface SignOutDialogProps {
  open: boolean;
  onClose: () => void;
}

/** Asks only when something would be lost; otherwise signs out at once. */
export function SignOutDialog({ open, onClose }: SignOutDialogProps) {
  const navigate = useNavigate();
  const [unsent, setUnsent] = useState<string[]>([]);
  const [busy, setBusy] = useState(false);

  const leave = async () => {
    setBusy(true);
    await signOut();
    setBusy(false);
    onClose();
    await navigate('/sign-in');
  };

  useEffect(() => {
    if (!open) return;
    let current = true;
    void listUnsentWork().then((lines) => {
      if (!current) return;
      if (lines.length === 0) void leave();
      else setUnsent(lines);
    });
    return () => {
      current = false;
    };
    // `leave` changes with every render and must not start the question again.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [open]);

  return (
    <FormDialog
      open={open && unsent.length > 0}
      onClose={() => {
        setUnsent([]);
        onClose();
      }}
      title="Sign out and lose what is not sent?"
      describe={
        <>
          <p>This waits on this computer for the server and would be wiped:</p>
          <ul className="mt-2 list-disc pl-5">
            {unsent.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        </>
      }
      verb="Sign out and wipe it"
      cancelWords="Stay signed in"
      busy={busy}
      onSubmit={(event) => {
        event.preventDefault();
        void leave();
      }}
    >
      <p className="text-sm text-ink-3">Stay signed in until the line is back and it is saved by itself.</p>
    </FormDialog>
  );
}
