import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { Button, LinkButton } from '@/components/button.tsx';
import { LoadingLine } from '@/components/loading.tsx';
import { Notice } from '@/components/notice.tsx';
import { PasswordField, TextField } from '@/components/text-field.tsx';
import type { InvitationOffer } from '@/lib/contract.ts';
import { applyProblem } from '@/lib/form-problem.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useSession } from '@/lib/session.ts';
import { useAcceptInvitation, useInvitation } from '../api.ts';
import { NEW_PASSWORD_RULES } from '../rules.ts';
import { EntranceHeading } from './entrance-heading.tsx';

const MAY: Record<InvitationOffer['role'], string> = {
  owner: 'An owner decides everything and keeps the members.',
  designer: 'A designer keeps productions, cast, sets and orders, and issues revisions.',
  carpenter: 'A carpenter reads sets, fit sheets and papers, ticks off what is built and leaves marks.',
  reviewer: 'A reviewer reads, comments and approves revisions.',
};

export function InvitationPage() {
  const { token = '' } = useParams();
  const offer = useInvitation(token);
  if (offer.isPending) return <LoadingLine words="Opening the invitation" />;
  if (offer.isError) {
    return (
      <>
        <EntranceHeading title="This invitation no longer opens" tab="Invitation">
          {sayProblem(offer.error)} Ask for a new one in the workshop that invited you.
        </EntranceHeading>
        <LinkButton to="/sign-in">Sign in</LinkButton>
      </>
    );
  }
  return <Acceptance token={token} offer={offer.data} />;
}

function Acceptance({ token, offer }: { token: string; offer: InvitationOffer }) {
  const user = useSession((state) => state.user);
  const navigate = useNavigate();
  const [problem, setProblem] = useState<string | null>(null);
  const accept = useAcceptInvitation(token);
  const form = useForm({ defaultValues: { name: '', password: '' } });
  const { errors } = form.formState;
  const itsMe = user !== null && user.email.toLowerCase() === offer.email.toLowerCase();
  const isNew = !itsMe && !offer.accountExists;

  const send = (input: { name?: string; password?: string }) => {
    setProblem(null);
    accept.mutate(input, {
      onSuccess: () => void navigate('/'),
      onError: (error) => setProblem(applyProblem(error, form)),
    });
  };
  const submit = form.handleSubmit(({ name, password }) =>
    send(itsMe ? {} : isNew ? { name, password } : { password }),
  );

  return (
    <>
      <EntranceHeading title={`Join ${offer.workshopName}`} tab="Invitation">
        {offer.invitedByName} invites <b className="font-medium text-ink">{offer.email}</b> as {offer.role}.{' '}
        {MAY[offer.role]}
      </EntranceHeading>
      {problem && (
        <Notice tone="wont" className="mb-5">
          {problem}
        </Notice>
      )}
      <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
        {isNew && (
          <TextField
            label="Your name"
            autoComplete="name"
            error={errors.name?.message}
            {...form.register('name', { required: 'Type the name the others know you by.' })}
          />
        )}
        {!itsMe && (
          <PasswordField
            label="Password"
            autoComplete={isNew ? 'new-password' : 'current-password'}
            description={
              isNew ? 'At least 10 characters.' : 'This address has an account; its password is asked.'
            }
            error={errors.password?.message}
            {...form.register('password', isNew ? NEW_PASSWORD_RULES : { required: 'Type your password.' })}
          />
        )}
        <div className="mt-2 flex flex-wrap items-center gap-6">
          <Button type="submit" look="main" busy={accept.isPending} busyWords="Joining">
            Join the workshop
          </Button>
          <Link to="/" className="link">
            Not now
          </Link>
        </div>
      </form>
    </>
  );
}
