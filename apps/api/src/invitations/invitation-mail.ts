import type { Role } from '../common/access.decorator';
import type { MailToSend } from '../mail/mail.service';

export interface InvitationWords {
  to: string;
  workshopId: string;
  workshopName: string;
  invitedByName: string;
  role: Role;
  expiresAt: Date;
  link: string;
}

export function invitationMail(words: InvitationWords): MailToSend {
  const until = words.expiresAt.toISOString().slice(0, 10);
  return {
    to: words.to,
    kind: 'invitation',
    workshopId: words.workshopId,
    subject: `Join ${words.workshopName} on Settlewright`,
    text: `${[
      `${words.invitedByName} invites you to the workshop ${words.workshopName} as ${words.role}.`,
      'Open this page to accept:',
      words.link,
      `The link is good until ${until} and for one use.`,
    ].join('\n\n')}\n`,
  };
}
