import { AuditEntry } from '../audit/entities/audit-entry.entity';
import { MailedToken } from '../auth/entities/mailed-token.entity';
import { RefreshToken } from '../auth/entities/refresh-token.entity';
import { Session } from '../auth/entities/session.entity';
import { Invitation } from '../invitations/entities/invitation.entity';
import { OutboxAttachment } from '../mail/entities/outbox-attachment.entity';
import { OutboxMail } from '../mail/entities/outbox-mail.entity';
import { User } from '../users/entities/user.entity';
import { Membership } from '../workshops/entities/membership.entity';
import { Workshop } from '../workshops/entities/workshop.entity';

/** Listed one by one: what is not here has no table. */
export const ENTITIES = [
  AuditEntry,
  Invitation,
  MailedToken,
  Membership,
  OutboxAttachment,
  OutboxMail,
  RefreshToken,
  Session,
  User,
  Workshop,
];
