import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { toast } from 'sonner';
import { ChoiceGroup } from '@/components/choice-group.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { TextField } from '@/components/text-field.tsx';
import type { Role } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { ROLES } from '@/lib/roles.ts';
import { useInvite } from '../api.ts';

interface InviteDialogProps {
  workshopId: string;
  open: boolean;
  onClose: () => void;
}

export function InviteDialog({ workshopId, open, onClose }: InviteDialogProps) {
  const invite = useInvite(workshopId);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<{ email: string; role: Role }>({ defaultValues: { email: '', role: 'carpenter' } });
  const close = () => {
    form.reset();
    setProblem(null);
    onClose();
  };
  const submit = form.handleSubmit((values) => {
    setProblem(null);
    invite.mutate(values, {
      onSuccess: () => {
        toast(`Invitation sent to ${values.email}.`);
        close();
      },
      onError: (error) => setProblem(applyProblem(error, form)),
    });
  });
  return (
    <FormDialog
      open={open}
      onClose={close}
      title="Invite somebody"
      describe="They get a link by e-mail that lets them join this workshop and no other."
      verb="Invite"
      busyWords="Sending the invitation"
      busy={invite.isPending}
      problem={problem}
      onSubmit={(event) => void submit(event)}
    >
      <div className="grid gap-5">
        <TextField
          label="E-mail"
          type="email"
          error={form.formState.errors.email?.message}
          {...form.register('email', {
            required: 'Type the e-mail address the invitation goes to.',
            pattern: {
              value: /^[^\s@]+@[^\s@]+\.[^\s@]+$/,
              message: 'An e-mail address looks like name@workshop.example.',
            },
          })}
        />
        <Controller
          control={form.control}
          name="role"
          render={({ field }) => (
            <ChoiceGroup
              label="As"
              columns={2}
              value={field.value}
              onChange={field.onChange}
              choices={ROLES}
            />
          )}
        />
      </div>
    </FormDialog>
  );
}
