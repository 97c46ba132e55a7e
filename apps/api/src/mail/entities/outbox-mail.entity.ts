import { Column, CreateDateColumn, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/**
 * `perhaps-sent`: a process ended between handing the mail over and noting it, or the line broke after the
 * text had gone out. Such a mail is never sent again by itself.
 * `bounced`: it came back, as a person says who saw it come back.
 */
export const MAIL_STATES = ['queued', 'sending', 'sent', 'failed', 'perhaps-sent', 'bounced'] as const;
export type MailState = (typeof MAIL_STATES)[number];

@Entity('outbox_mails')
@Index(['state', 'nextAttemptAt'])
@Index(['relatedId'])
export class OutboxMail {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  kind: string;

  @Column({ type: 'uuid', nullable: true })
  workshopId: string | null;

  /** what the mail is about, as a cushion order */
  @Column({ type: 'uuid', nullable: true })
  relatedId: string | null;

  @Column('text', { unique: true })
  messageId: string;

  @Column('text')
  to: string;

  @Column({ type: 'text', nullable: true })
  replyTo: string | null;

  @Column('text')
  subject: string;

  /** emptied once the mail is sent: it may hold a private link */
  @Column({ type: 'text', nullable: true })
  text: string | null;

  @Column({ type: 'text', nullable: true })
  html: string | null;

  @Column('text', { default: 'queued' })
  state: MailState;

  @Column('integer', { default: 0 })
  attempts: number;

  @CreateDateColumn({ type: 'timestamptz' })
  queuedAt: Date;

  @Column({ type: 'timestamptz', default: () => 'now()' })
  nextAttemptAt: Date;

  @Column({ type: 'timestamptz', nullable: true })
  sendingAt: Date | null;

  @Column({ type: 'timestamptz', nullable: true })
  sentAt: Date | null;

  @Column({ type: 'timestamptz', nullable: true })
  failedAt: Date | null;

  @Column({ type: 'timestamptz', nullable: true })
  perhapsSentAt: Date | null;

  @Column({ type: 'text', nullable: true })
  lastFault: string | null;
}
