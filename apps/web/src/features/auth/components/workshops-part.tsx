import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { TextField } from '@/components/text-field.tsx';
import { applyProblem } from '@/lib/form-problem.ts';
import { useSession } from '@/lib/session.ts';
import { useStartWorkshop } from '../api.ts';

/** The workshops somebody belongs to, and the way to another one. */
export function WorkshopsPart() {
  const workshops = useSession((state) => state.workshops);
  const navigate = useNavigate();
  const start = useStartWorkshop();
  const [asking, setAsking] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm({ defaultValues: { name: '' } });
  const submit = form.handleSubmit((values) => {
    setProblem(null);
    start.mutate(values, {
      onSuccess: ({ id }) => void navigate(`/w/${id}`),
      onError: (error) => setProblem(applyProblem(error, form)),
    });
  });
  return (
    <div className="max-w-text">
      {workshops.length === 0 && (
        <p className="text-ink-2">
          You belong to none just now. An invitation brings you into one, or start your own.
        </p>
      )}
      <ul>
        {workshops.map((workshop) => (
          <li
            key={workshop.id}
            className="flex items-baseline justify-between gap-4 border-b border-rule py-2.5"
          >
            <Link to={`/w/${workshop.id}`} className="link min-w-0 font-medium">
              {workshop.name}
            </Link>
            <span className="text-sm text-ink-2">{workshop.role}</span>
          </li>
        ))}
      </ul>
      <div className="mt-4">
        <Button onClick={() => setAsking(true)}>Start another workshop</Button>
      </div>
      <FormDialog
        open={asking}
        onClose={() => setAsking(false)}
        title="Start a workshop"
        describe="It has its own members, productions and upholsterers; nothing is shared with the others."
        verb="Start the workshop"
        busy={start.isPending}
        problem={problem}
        onSubmit={(event) => void submit(event)}
      >
        <TextField
          label="Name"
          error={form.formState.errors.name?.message}
          {...form.register('name', { required: 'Name the workshop; it can be changed later.' })}
        />
      </FormDialog>
    </div>
  );
}
