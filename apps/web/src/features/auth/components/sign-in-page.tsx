import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, Navigate, useSearchParams } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { PasswordField, TextField } from '@/components/text-field.tsx';
import { applyProblem } from '@/lib/form-problem.ts';
import { Problem } from '@/lib/problem.ts';
import { useSession } from '@/lib/session.ts';
import { useSignIn } from '../api.ts';
import { EMAIL_RULES } from '../rules.ts';
import { useAfterSignIn } from '../use-after-sign-in.ts';
import { EntranceHeading } from './entrance-heading.tsx';
import { FirstSteps } from './first-steps.tsx';

export function SignInPage() {
  const signedIn = useSession((state) => state.status === 'signed-in');
  const next = useAfterSignIn();
  const [search] = useSearchParams();
  const [problem, setProblem] = useState<string | null>(null);
  const signIn = useSignIn();
  const form = useForm({ defaultValues: { email: search.get('email') ?? '', password: '' } });
  const { errors } = form.formState;

  if (signedIn) return <Navigate to={next} replace />;

  const submit = form.handleSubmit((values) => {
    setProblem(null);
    signIn.mutate(values, {
      onError: (error) => {
        const refused = error instanceof Problem && error.status === 401;
        setProblem(
          refused
            ? 'E-mail address and password do not belong together. Check both, or have a link sent.'
            : applyProblem(error, form),
        );
        form.setFocus('password');
      },
    });
  });

  return (
    <>
      <EntranceHeading title="Know who fits before the first cut." tab="Sign in" />
      <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
        {problem && <Notice tone="wont">{problem}</Notice>}
        <TextField
          label="E-mail"
          type="email"
          autoComplete="username"
          error={errors.email?.message}
          {...form.register('email', EMAIL_RULES)}
        />
        <PasswordField
          label="Password"
          autoComplete="current-password"
          error={errors.password?.message}
          description={
            <>
              Forgotten it?{' '}
              <Link to="/reset" className="link text-ink-2">
                Have a link sent
              </Link>
            </>
          }
          {...form.register('password', { required: 'Type your password.' })}
        />
        <div className="mt-2 flex flex-wrap items-center gap-6">
          <Button type="submit" look="main" busy={signIn.isPending} busyWords="Signing in">
            Sign in
          </Button>
          <Link to="/sign-up" className="link">
            Start a workshop
          </Link>
        </div>
      </form>
      <FirstSteps />
    </>
  );
}
