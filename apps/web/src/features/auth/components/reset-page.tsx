import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { TextField } from '@/components/text-field.tsx';
import { applyProblem } from '@/lib/form-problem.ts';
import { useAskForReset } from '../api.ts';
import { EMAIL_RULES } from '../rules.ts';
import { EntranceHeading } from './entrance-heading.tsx';

export function ResetPage() {
  const [problem, setProblem] = useState<string | null>(null);
  const ask = useAskForReset();
  const form = useForm({ defaultValues: { email: '' } });
  const submit = form.handleSubmit((values) => {
    setProblem(null);
    ask.mutate(values, { onError: (error) => setProblem(applyProblem(error, form)) });
  });

  if (ask.isSuccess) {
    return (
      <EntranceHeading title="Look in your mail" tab="Link sent">
        <p>
          If <b className="font-medium text-ink">{form.getValues('email')}</b> belongs to an account, a link
          is on its way. It holds for one hour and works once.
        </p>
        <p className="mt-5">
          <Link to="/sign-in" className="link">
            Back to sign in
          </Link>
        </p>
      </EntranceHeading>
    );
  }
  return (
    <>
      <EntranceHeading title="Choose a new password" tab="New password">
        A link to do so goes to your e-mail address.
      </EntranceHeading>
      <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
        {problem && <Notice tone="wont">{problem}</Notice>}
        <TextField
          label="E-mail"
          type="email"
          autoComplete="username"
          error={form.formState.errors.email?.message}
          {...form.register('email', EMAIL_RULES)}
        />
        <div className="mt-2 flex flex-wrap items-center gap-6">
          <Button type="submit" look="main" busy={ask.isPending} busyWords="Sending">
            Send the link
          </Button>
          <Link to="/sign-in" className="link">
            Back to sign in
          </Link>
        </div>
      </form>
    </>
  );
}
