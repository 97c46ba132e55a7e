import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { FormDialog } from '@/components/dialog.tsx';
import { Select } from '@/components/select.tsx';
import { TextField } from '@/components/text-field.tsx';
import { sayProblem } from '@/lib/problem.ts';
import { useCreateOrder, useIssuedSets, type IssuedSet } from '../api.ts';

/** Begins an order from the last issued revision of a set. */
export function NewOrderButton({ workshopId, productionId }: { workshopId: string; productionId: string }) {
  const [open, setOpen] = useState(false);
  const sets = useIssuedSets(workshopId, productionId);
  const issued = (sets.data?.items ?? []).filter((set) => set.lastRevision);
  if (issued.length === 0) {
    return <span className="text-sm text-ink-2">Issue a revision of a set first</span>;
  }
  return (
    <>
      <button type="button" className="link min-h-8 text-sm" onClick={() => setOpen(true)}>
        New order
      </button>
      {open && (
        <NewOrderDialog
          workshopId={workshopId}
          productionId={productionId}
          issued={issued}
          onClose={() => setOpen(false)}
        />
      )}
    </>
  );
}

interface DialogProps {
  workshopId: string;
  productionId: string;
  issued: readonly IssuedSet[];
  onClose: () => void;
}

function NewOrderDialog({ workshopId, productionId, issued, onClose }: DialogProps) {
  const navigate = useNavigate();
  const create = useCreateOrder(workshopId, productionId);
  const [setId, setSetId] = useState(issued[0]?.id ?? '');
  const chosen = issued.find(({ id }) => id === setId);
  const [title, setTitle] = useState<string | undefined>();
  const [neededBy, setNeededBy] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const shownTitle = title ?? `${chosen?.name ?? ''}, cushions`;
  return (
    <FormDialog
      open
      onClose={onClose}
      title="Begin an order"
      describe="An order cites an issued revision, so that what is sewn is what was drawn."
      verb="Begin the order"
      busy={create.isPending}
      problem={problem}
      onSubmit={(event) => {
        event.preventDefault();
        setProblem(null);
        create
          .mutateAsync({
            setId,
            revisionLetter: chosen?.lastRevision?.letter ?? '',
            title: shownTitle,
            neededBy: neededBy === '' ? null : neededBy,
          })
          .then(
            (order) => navigate(`/w/${workshopId}/p/${productionId}/orders/${order.id}`),
            (error: unknown) => setProblem(sayProblem(error)),
          );
      }}
    >
      <div className="grid gap-4">
        <Select
          label="Set"
          value={setId}
          options={issued.map(({ id, name, lastRevision }) => ({
            value: id,
            words: name,
            detail: `revision ${lastRevision?.letter ?? ''}`,
          }))}
          onChange={setSetId}
        />
        <TextField
          label="Title"
          value={shownTitle}
          maxLength={160}
          onChange={(event) => setTitle(event.target.value)}
        />
        <TextField
          label="Needed by"
          optional
          type="date"
          value={neededBy}
          onChange={(event) => setNeededBy(event.target.value)}
        />
      </div>
    </FormDialog>
  );
}
