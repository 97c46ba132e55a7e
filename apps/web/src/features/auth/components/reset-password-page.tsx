import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, useParams } from 'react-router-dom';
import { Button, LinkButton } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { PasswordField } from '@/components/text-field.tsx';
import { applyProblem } from '@/lib/form-problem.ts';
import { useResetPassword } from '../api.ts';
import { NEW_PASSWORD_RULES } from '../rules.ts';
import { EntranceHeading } from './entrance-heading.tsx';

export function ResetPasswordPage() {
  const { token = '' } = useParams();
  const [problem, setProblem] = useState<string | null>(null);
  const reset = useResetPassword();
  const form = useForm({ defaultValues: { password: '' } });
  const submit = form.handleSubmit(({ password }) => {
    setProblem(null);
    reset.mutate({ token, password }, { onError: (error) => setProblem(applyProblem(error, form)) });
  });

  if (reset.isSuccess) {
    return (
      <>
        <EntranceHeading title="The new password holds" tab="Password changed">
          Every other place where you were signed in has been signed out.
        </EntranceHeading>
        <LinkButton to="/sign-in" look="main">
          Sign in
        </LinkButton>
      </>
    );
  }
  return (
    <>
      <EntranceHeading title="Your new password" tab="New password" />
      <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
        {problem && (
          <Notice tone="wont">
            {problem}{' '}
            <Link to="/reset" className="link">
              Have another link sent
            </Link>
          </Notice>
        )}
        <PasswordField
          label="Password"
          autoComplete="new-password"
          description="At least 10 characters."
          error={form.formState.errors.password?.message}
          {...form.register('password', NEW_PASSWORD_RULES)}
        />
        <div className="mt-2">
          <Button type="submit" look="main" busy={reset.isPending} busyWords="Saving">
            Save the password
          </Button>
        </div>
      </form>
    </>
  );
}
