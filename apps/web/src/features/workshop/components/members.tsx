import { useState } from 'react';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { Menu } from '@/components/menu.tsx';
import { MoreIcon, OpenIcon } from '@/components/icons.tsx';
import { Notice } from '@/components/notice.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import type { Member } from '@/lib/contract.ts';
import { dayWords } from '@/lib/dates.ts';
import { sayProblem } from '@/lib/problem.ts';
import { ROLES } from '@/lib/roles.ts';
import { useSession } from '@/lib/session.ts';
import type { WorkshopAtHand } from '@/lib/workshop.ts';
import { useChangeRole, useInvitations, useMembers, useRemoveMember, useWithdrawInvitation } from '../api.ts';
import { InviteDialog } from './invite-dialog.tsx';

const ROW = 'flex items-center gap-x-4 border-b border-rule py-2.5';
const ROLE_BUTTON =
  'quick inline-flex min-h-9 items-center gap-1 rounded-sm px-2 text-sm hover:bg-sunk data-open:bg-chalk-wash';

function MemberRow({ workshop, member, only }: { workshop: WorkshopAtHand; member: Member; only: boolean }) {
  const me = useSession((state) => state.user?.id === member.userId);
  const changeRole = useChangeRole(workshop.id);
  const remove = useRemoveMember(workshop.id);
  const [leaving, setLeaving] = useState(false);
  const roleWords = ROLES.find((role) => role.value === member.role)?.words ?? member.role;
  return (
    <li className={ROW}>
      <div className="min-w-0 flex-1">
        <div className="truncate font-medium">
          {member.name}
          {me && <span className="font-normal text-ink-3"> (you)</span>}
        </div>
        <div className="truncate text-sm text-ink-2">{member.email}</div>
      </div>
      {workshop.isOwner && !only ? (
        <Menu
          name={`Role of ${member.name}: ${roleWords}, menu`}
          button={
            <>
              {roleWords} <OpenIcon />
            </>
          }
          buttonClassName={ROLE_BUTTON}
          side="end"
          entries={ROLES.map((role) => ({
            id: role.value,
            words: role.words,
            detail: role.describe,
            chosen: role.value === member.role,
            onPress: () =>
              changeRole.mutate(
                { userId: member.userId, role: role.value },
                { onError: (error) => toast(sayProblem(error)) },
              ),
          }))}
        />
      ) : (
        <span className="px-2 text-sm">{roleWords}</span>
      )}
      {(workshop.isOwner || me) && !only && (
        <Menu
          name={`More for ${member.name}`}
          button={<MoreIcon />}
          buttonClassName="quick flex size-9 items-center justify-center rounded-sm hover:bg-sunk data-open:bg-chalk-wash"
          side="end"
          entries={[
            {
              id: 'remove',
              words: me ? 'Leave the workshop' : 'Remove from the workshop',
              onPress: () => setLeaving(true),
            },
          ]}
        />
      )}
      <FormDialog
        open={leaving}
        onClose={() => setLeaving(false)}
        title={me ? `Leave ${workshop.name}?` : `Remove ${member.name}?`}
        describe={
          me
            ? 'You can come back only by a new invitation. What you saved and issued stays.'
            : `${member.name} can open nothing of this workshop any more, from this moment. What they saved and issued stays with their name.`
        }
        verb={me ? 'Leave the workshop' : `Remove ${member.name}`}
        busy={remove.isPending}
        problem={remove.isError ? sayProblem(remove.error) : null}
        onSubmit={(event) => {
          event.preventDefault();
          remove.mutate(member.userId, { onSuccess: () => setLeaving(false) });
        }}
      >
        {null}
      </FormDialog>
    </li>
  );
}

function OpenInvitations({ workshop }: { workshop: WorkshopAtHand }) {
  const invitations = useInvitations(workshop.id, workshop.isOwner);
  const withdraw = useWithdrawInvitation(workshop.id);
  const items = invitations.data?.items ?? [];
  if (items.length === 0) return null;
  return (
    <>
      <h3 className="mt-6 border-b border-rule pb-1.5 text-sm font-semibold">Invited, not here yet</h3>
      <ul>
        {items.map((invitation) => (
          <li key={invitation.id} className={ROW}>
            <div className="min-w-0 flex-1">
              <div className="truncate">{invitation.email}</div>
              <div className="text-sm text-ink-2">
                as {invitation.role}; the link holds until {dayWords(invitation.expiresAt)}
              </div>
            </div>
            <Button
              look="word"
              onClick={() => withdraw.mutate(invitation.id, { onError: (error) => toast(sayProblem(error)) })}
            >
              Withdraw <span className="sr-only">the invitation of {invitation.email}</span>
            </Button>
          </li>
        ))}
      </ul>
    </>
  );
}

export function Members({ workshop }: { workshop: WorkshopAtHand }) {
  const members = useMembers(workshop.id);
  const confirmed = useSession((state) => state.user?.emailConfirmed ?? false);
  const [inviting, setInviting] = useState(false);
  return (
    <section>
      <RuleHeading
        aside={
          workshop.isOwner &&
          confirmed && (
            <Button look="word" onClick={() => setInviting(true)}>
              Invite somebody
            </Button>
          )
        }
      >
        Members
      </RuleHeading>
      {workshop.isOwner && !confirmed && (
        <Notice className="mb-3">
          Confirm your e-mail address before you invite others; the link is in your mail.
        </Notice>
      )}
      {members.isPending && <PaleBars words="Loading members" rows={3} />}
      {members.isError && <Notice tone="wont">{sayProblem(members.error)}</Notice>}
      <ul>
        {members.data?.items.map((member) => (
          <MemberRow
            key={member.userId}
            workshop={workshop}
            member={member}
            only={
              member.role === 'owner' &&
              members.data.items.filter((other) => other.role === 'owner').length === 1
            }
          />
        ))}
      </ul>
      <OpenInvitations workshop={workshop} />
      <p className="mt-3 text-xs text-ink-3">
        Owner and designers see the measurements of the cast. Carpenters and reviewers see verdicts and
        margins; the upholsterer never sees people.
      </p>
      <InviteDialog workshopId={workshop.id} open={inviting} onClose={() => setInviting(false)} />
    </section>
  );
}
