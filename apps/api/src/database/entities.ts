import { KeptArrangement } from '../arrangements/kept-arrangement.entity';
import { AuditEntry } from '../audit/entities/audit-entry.entity';
import { MailedToken } from '../auth/entities/mailed-token.entity';
import { RefreshToken } from '../auth/entities/refresh-token.entity';
import { Session } from '../auth/entities/session.entity';
import { CastMember } from '../cast/entities/cast-member.entity';
import { OrderPayment } from '../cushion-orders/deposits/order-payment.entity';
import { PaymentEvent } from '../cushion-orders/deposits/payment-event.entity';
import { CushionOrder } from '../cushion-orders/entities/cushion-order.entity';
import { OrderEvent } from '../cushion-orders/entities/order-event.entity';
import { OrderLink } from '../cushion-orders/entities/order-link.entity';
import { OrderMessage } from '../cushion-orders/entities/order-message.entity';
import { OrderFile } from '../cushion-orders/files/order-file.entity';
import { OrderInspection } from '../cushion-orders/inspections/order-inspection.entity';
import { OrderQuestion } from '../cushion-orders/questions/order-question.entity';
import { OrderQuote } from '../cushion-orders/quotes/order-quote.entity';
import { CushionSettingsRow } from '../cushion-settings/cushion-settings.entity';
import { Invitation } from '../invitations/entities/invitation.entity';
import { OutboxAttachment } from '../mail/entities/outbox-attachment.entity';
import { OutboxMail } from '../mail/entities/outbox-mail.entity';
import { OwnPopulation } from '../populations/entities/own-population.entity';
import { PopulationRows } from '../populations/entities/population-rows.entity';
import { Production } from '../productions/entities/production.entity';
import { BuiltPart } from '../sets/entities/built-part.entity';
import { DesignedSet } from '../sets/entities/designed-set.entity';
import { RevisionApproval } from '../sets/entities/revision-approval.entity';
import { SetDraft } from '../sets/entities/set-draft.entity';
import { SetNote } from '../sets/entities/set-note.entity';
import { SetRevision } from '../sets/entities/set-revision.entity';
import { Study } from '../studies/entities/study.entity';
import { StudyBlock } from '../studies/entities/study-block.entity';
import { DimensionSearch } from '../suggestions/entities/dimension-search.entity';
import { SearchTries } from '../suggestions/entities/search-tries.entity';
import { TestSitRow } from '../test-sits/test-sit.entity';
import { Upholsterer } from '../upholsterers/entities/upholsterer.entity';
import { User } from '../users/entities/user.entity';
import { Membership } from '../workshops/entities/membership.entity';
import { Workshop } from '../workshops/entities/workshop.entity';

/** Listed one by one: what is not here has no table. */
export const ENTITIES = [
  AuditEntry,
  BuiltPart,
  CastMember,
  CushionOrder,
  CushionSettingsRow,
  DesignedSet,
  DimensionSearch,
  Invitation,
  KeptArrangement,
  MailedToken,
  Membership,
  OrderEvent,
  OrderFile,
  OrderInspection,
  OrderLink,
  OrderMessage,
  OrderPayment,
  OrderQuestion,
  OrderQuote,
  OutboxAttachment,
  OutboxMail,
  OwnPopulation,
  PaymentEvent,
  PopulationRows,
  Production,
  RefreshToken,
  RevisionApproval,
  SearchTries,
  Session,
  SetDraft,
  SetNote,
  SetRevision,
  TestSitRow,
  Study,
  StudyBlock,
  Upholsterer,
  User,
  Workshop,
];
