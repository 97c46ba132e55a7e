import { useMemo, useState } from 'react';
import { useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { PasswordField, TextField } from '@/components/text-field.tsx';
import { chooseTheme, useTheme } from '@/lib/theme.ts';
import { choosePersonalUnits, UNIT_CHOICES, unitChoiceId, useUnitChoice } from '@/lib/unit-choice.ts';
import { Select } from '@/components/select.tsx';
import { applyProblem } from '@/lib/form-problem.ts';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useSession } from '@/lib/session.ts';
import { signOut } from '@/lib/sign-out.ts';
import { type TitleCell, useTitleCells } from '@/lib/title-cells.ts';
import { useAskForReset, useChangeEmail, useRename, useResendConfirmation } from '../api.ts';
import { EMAIL_RULES } from '../rules.ts';
import { WorkshopsPart } from './workshops-part.tsx';

function NameForm({ name }: { name: string }) {
  const rename = useRename();
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm({ values: { name } });
  const submit = form.handleSubmit((values) => {
    setProblem(null);
    rename.mutate(values, {
      onSuccess: () => toast('Name saved.'),
      onError: (error) => setProblem(applyProblem(error, form)),
    });
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="grid max-w-[26rem] gap-4">
      {problem && <Notice tone="wont">{problem}</Notice>}
      <TextField
        label="Your name"
        autoComplete="name"
        description="Stands beside what you save, issue and write."
        error={form.formState.errors.name?.message}
        {...form.register('name', { required: 'Type the name the others know you by.' })}
      />
      <div>
        <Button type="submit" busy={rename.isPending}>
          Save the name
        </Button>
      </div>
    </form>
  );
}

function EmailForm({ email, confirmed }: { email: string; confirmed: boolean }) {
  const change = useChangeEmail();
  const resend = useResendConfirmation();
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm({ defaultValues: { newEmail: '', password: '' } });
  const { errors } = form.formState;
  const submit = form.handleSubmit((values) => {
    setProblem(null);
    change.mutate(values, {
      onSuccess: () => form.reset(),
      onError: (error) => setProblem(applyProblem(error, form)),
    });
  });
  return (
    <>
      {!confirmed && (
        <Notice title={`${email} is not confirmed yet`} className="mb-5">
          <p>Invitations and orders can be sent once it is. The link is in your mail.</p>
          <div className="mt-2">
            {resend.isSuccess ? (
              <p className="font-medium">Sent again.</p>
            ) : (
              <Button look="word" busy={resend.isPending} onClick={() => resend.mutate()}>
                Send the link again
              </Button>
            )}
            {resend.isError && <p className="text-wont">{sayProblem(resend.error)}</p>}
          </div>
        </Notice>
      )}
      {change.isSuccess && (
        <Notice className="mb-5">
          A link has gone to the new address. Until it is opened and confirmed, {email} stays in force.
        </Notice>
      )}
      <form noValidate onSubmit={(event) => void submit(event)} className="grid max-w-[26rem] gap-4">
        {problem && <Notice tone="wont">{problem}</Notice>}
        <TextField
          label="New e-mail address"
          type="email"
          autoComplete="email"
          description={`Now ${email}.`}
          error={errors.newEmail?.message}
          {...form.register('newEmail', EMAIL_RULES)}
        />
        <PasswordField
          label="Your password"
          autoComplete="current-password"
          error={errors.password?.message}
          {...form.register('password', { required: 'Type your password, so that nobody else can do this.' })}
        />
        <div>
          <Button type="submit" busy={change.isPending}>
            Change the address
          </Button>
        </div>
      </form>
    </>
  );
}

function PasswordPart({ email }: { email: string }) {
  const ask = useAskForReset();
  return (
    <div className="max-w-text">
      <p className="text-ink-2">
        A link to choose a new one goes to {email}. It holds for one hour and works once.
      </p>
      <div className="mt-4">
        {ask.isSuccess ? (
          <p className="font-medium" role="status">
            Look in your mail.
          </p>
        ) : (
          <Button busy={ask.isPending} onClick={() => ask.mutate({ email })}>
            Send a password link
          </Button>
        )}
        {ask.isError && <p className="mt-2 text-wont">{sayProblem(ask.error)}</p>}
      </div>
    </div>
  );
}

const THEMES = [
  { value: 'system', words: 'As the system' },
  { value: 'light', words: 'Light' },
  { value: 'dark', words: 'Dark' },
] as const;

const UNITS = [
  { value: 'production', words: 'As each production says' },
  ...UNIT_CHOICES.map(({ id, words }) => ({ value: id, words })),
];

/** Kept on this device; a phone on the shop floor may differ from the desk. */
function ShowPart() {
  const theme = useTheme((state) => state.choice);
  const personal = useUnitChoice((state) => state.personal);
  return (
    <div className="grid max-w-[26rem] gap-4">
      <Select
        label="Units"
        description="How lengths are shown to you on this device, and what a bare number means."
        options={UNITS}
        value={unitChoiceId(personal) ?? 'production'}
        onChange={(id) => choosePersonalUnits(UNIT_CHOICES.find((choice) => choice.id === id)?.style ?? null)}
      />
      <Select label="Sheet" options={THEMES} value={theme} onChange={chooseTheme} />
    </div>
  );
}

function SessionsPart() {
  const navigate = useNavigate();
  const [asking, setAsking] = useState(false);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const leave = async () => {
    setBusy(true);
    try {
      await signOut(true);
      await navigate('/sign-in');
    } catch (error) {
      setProblem(sayProblem(error));
      setBusy(false);
    }
  };
  return (
    <div className="max-w-text">
      <p className="text-ink-2">
        Lost a phone, or left a computer signed in? This ends every session at once, this one too.
      </p>
      <div className="mt-4">
        <Button onClick={() => setAsking(true)}>Sign out everywhere</Button>
      </div>
      <FormDialog
        open={asking}
        onClose={() => setAsking(false)}
        title="Sign out everywhere?"
        describe="Every browser you are signed in with stops at once, this one too. What waits unsent on this computer is wiped."
        verb="Sign out everywhere"
        busy={busy}
        problem={problem}
        onSubmit={(event) => {
          event.preventDefault();
          void leave();
        }}
      >
        {null}
      </FormDialog>
    </div>
  );
}

export function AccountPage() {
  usePageTitle('Your account');
  const cells = useMemo<TitleCell[]>(
    () => [{ id: 'account', side: 'left', order: 10, label: 'Page', value: 'Your account', shortens: true }],
    [],
  );
  useTitleCells(cells);
  const user = useSession((state) => state.user);
  if (user === null) return null;
  return (
    <div className="page">
      <PageHeading title="Your account" above={user.email} />
      <div className="grid gap-x-14 gap-y-10 desk:grid-cols-2">
        <section>
          <RuleHeading className="mb-4">Name</RuleHeading>
          <NameForm name={user.name} />
        </section>
        <section>
          <RuleHeading className="mb-4">E-mail address</RuleHeading>
          <EmailForm email={user.email} confirmed={user.emailConfirmed} />
        </section>
        <section>
          <RuleHeading className="mb-4">Workshops</RuleHeading>
          <WorkshopsPart />
        </section>
        <section>
          <RuleHeading className="mb-4">Units and sheet</RuleHeading>
          <ShowPart />
        </section>
        <section>
          <RuleHeading className="mb-4">Password</RuleHeading>
          <PasswordPart email={user.email} />
        </section>
        <section>
          <RuleHeading className="mb-4">Sessions</RuleHeading>
          <SessionsPart />
        </section>
      </div>
    </div>
  );
}
