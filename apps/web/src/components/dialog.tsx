import {
  Description,
  Dialog as HeadlessDialog,
  DialogBackdrop,
  DialogPanel,
  DialogTitle,
} from '@headlessui/react';
import { useState, type FormEvent, type ReactNode } from 'react';
import { Button } from './button.tsx';
import { classNames } from './class-names.ts';
import { CloseIcon } from './icons.tsx';
import { Notice } from './notice.tsx';
import { useTyped } from './use-typed.ts';

interface DialogProps {
  open: boolean;
  onClose: () => void;
  title: string;
  /** What will happen, in a sentence. */
  describe?: ReactNode;
  wide?: boolean;
  /** What is typed here is lost by closing: Escape, a press outside and the cross ask first. */
  losesTyping?: boolean;
  children: ReactNode;
}

/** A slip over the page that holds the focus until it is answered. */
export function Dialog({
  open,
  onClose,
  title,
  describe,
  wide = false,
  losesTyping = false,
  children,
}: DialogProps) {
  const { onFocus, isTyped } = useTyped(open);
  const [asking, setAsking] = useState(false);
  const leave = () => (losesTyping && isTyped() ? setAsking(true) : onClose());
  return (
    <HeadlessDialog open={open} onClose={leave} className="relative z-40">
      <DialogBackdrop className="fixed inset-0 bg-[rgb(35_29_22/0.4)]" />
      <div className="fixed inset-0 overflow-y-auto">
        <div className="flex min-h-full items-start justify-center p-4 max-phone:items-end max-phone:p-0 tablet:pt-[10vh]">
          <DialogPanel
            onFocus={onFocus}
            className={classNames(
              'relative w-full rounded-md bg-sheet p-6 shadow-slip tablet:p-8',
              wide ? 'max-w-[60rem]' : 'max-w-[34rem]',
            )}
          >
            <div className="flex items-start justify-between gap-4">
              <DialogTitle className="text-xl font-light tracking-hero text-balance">{title}</DialogTitle>
              <button
                type="button"
                onClick={leave}
                aria-label="Close"
                className="quick -mt-1 -mr-2 flex size-9 items-center justify-center rounded-sm text-ink-2 hover:bg-sunk hover:text-ink"
              >
                <CloseIcon />
              </button>
            </div>
            {describe && (
              <Description as="div" className="mt-2 text-ink-2">
                {describe}
              </Description>
            )}
            <div className="mt-5">{children}</div>
          </DialogPanel>
        </div>
      </div>
      {asking && (
        <AskFirst
          onKeep={() => setAsking(false)}
          onDiscard={() => {
            setAsking(false);
            onClose();
          }}
        />
      )}
    </HeadlessDialog>
  );
}

/** Stands over a dialog that is about to be closed with something typed in it. */
function AskFirst({ onKeep, onDiscard }: { onKeep: () => void; onDiscard: () => void }) {
  return (
    <Dialog open onClose={onKeep} title="Discard what you typed?" describe="It has not been saved.">
      <div className="flex flex-wrap gap-3">
        <Button look="main" onClick={onDiscard}>
          Discard
        </Button>
        <Button data-autofocus onClick={onKeep}>
          Keep typing
        </Button>
      </div>
    </Dialog>
  );
}

interface FormDialogProps extends DialogProps {
  /** The verb of the filled button; the title says the same. */
  verb: string;
  busyWords?: string;
  busy?: boolean;
  /** What was refused and has no field of its own. */
  problem?: string | null;
  onSubmit: (event: FormEvent<HTMLFormElement>) => void;
  cancelWords?: string;
}

/** A dialog whose filled button repeats the verb. */
export function FormDialog({
  verb,
  busyWords,
  busy,
  problem,
  onSubmit,
  cancelWords = 'Cancel',
  children,
  ...dialog
}: FormDialogProps) {
  return (
    <Dialog losesTyping {...dialog}>
      <form noValidate onSubmit={onSubmit}>
        {problem && (
          <Notice tone="wont" className="mb-5">
            {problem}
          </Notice>
        )}
        {children}
        <div className="mt-6 flex flex-wrap gap-3">
          <Button type="submit" look="main" busy={busy} busyWords={busyWords}>
            {verb}
          </Button>
          <Button onClick={dialog.onClose}>{cancelWords}</Button>
        </div>
      </form>
    </Dialog>
  );
}
