import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, Navigate } from 'react-router-dom';
import { Button } from '@/components/button.tsx';
import { Notice } from '@/components/notice.tsx';
import { PasswordField, TextField } from '@/components/text-field.tsx';
import { applyProblem } from '@/lib/form-problem.ts';
import { useSession } from '@/lib/session.ts';
import { useSignUp } from '../api.ts';
import { EMAIL_RULES, NEW_PASSWORD_RULES } from '../rules.ts';
import { EntranceHeading } from './entrance-heading.tsx';

export function SignUpPage() {
  const signedIn = useSession((state) => state.status === 'signed-in');
  const [problem, setProblem] = useState<string | null>(null);
  const signUp = useSignUp();
  const form = useForm({ defaultValues: { name: '', workshopName: '', email: '', password: '' } });
  const { errors } = form.formState;

  if (signedIn) return <Navigate to="/" replace />;

  const submit = form.handleSubmit((values) => {
    setProblem(null);
    signUp.mutate(values, { onError: (error) => setProblem(applyProblem(error, form)) });
  });

  return (
    <>
      <EntranceHeading title="Start a workshop" tab="Start a workshop">
        You become its owner and can invite the others from inside. Invited yourself? Open the link in your
        mail instead.
      </EntranceHeading>
      <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
        {problem && <Notice tone="wont">{problem}</Notice>}
        <TextField
          label="Your name"
          autoComplete="name"
          error={errors.name?.message}
          {...form.register('name', { required: 'Type the name the others know you by.' })}
        />
        <TextField
          label="Workshop"
          autoComplete="organization"
          description="Stands in the title block of every sheet."
          error={errors.workshopName?.message}
          {...form.register('workshopName', { required: 'Name the workshop; it can be changed later.' })}
        />
        <TextField
          label="E-mail"
          type="email"
          autoComplete="username"
          error={errors.email?.message}
          {...form.register('email', EMAIL_RULES)}
        />
        <PasswordField
          label="Password"
          autoComplete="new-password"
          description="At least 10 characters."
          error={errors.password?.message}
          {...form.register('password', NEW_PASSWORD_RULES)}
        />
        <div className="mt-2 flex flex-wrap items-center gap-6">
          <Button type="submit" look="main" busy={signUp.isPending} busyWords="Starting the workshop">
            Start the workshop
          </Button>
          <Link to="/sign-in" className="link">
            Sign in
          </Link>
        </div>
      </form>
    </>
  );
}
