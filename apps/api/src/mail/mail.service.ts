import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { type EntityManager, In } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import { InjectSettings, type Settings } from '../config/settings';
import { OutboxAttachment } from './entities/outbox-attachment.entity';
import { type MailState, OutboxMail } from './entities/outbox-mail.entity';

/** SQL for an attachment called `paper` that waits to be drawn again. */
export const HELD = 'octet_length(paper.content) = 0';

/** Somebody may have read these. */
const WENT_OUT: readonly MailState[] = ['sending', 'sent', 'perhaps-sent'];

export interface MailToSend {
  to: string;
  subject: string;
  text: string;
  html?: string;
  attachments?: { filename: string; contentType: string; content: Buffer }[];
  replyTo?: string;
  kind: string;
  workshopId?: string;
  relatedId?: string;
}

@Injectable()
export class MailService {
  constructor(@InjectSettings() private readonly config: Settings) {}

  /** Queues a mail in the caller's transaction, so that it goes out if and only if the event happened. */
  async enqueue(manager: EntityManager, mail: MailToSend): Promise<OutboxMail> {
    const { attachments = [], ...rest } = mail;
    const queued = await manager.save(
      OutboxMail,
      manager.create(OutboxMail, { ...rest, messageId: this.newMessageId() }),
    );
    for (const attachment of attachments) {
      await manager.insert(OutboxAttachment, { ...attachment, mailId: queued.id });
    }
    return queued;
  }

  /** A person decided to send a failed or perhaps-sent mail again; it keeps its Message-ID. */
  async sendAgain(manager: EntityManager, mailId: string): Promise<boolean> {
    const changed = await manager
      .createQueryBuilder()
      .update(OutboxMail)
      .set({
        state: 'queued',
        attempts: 0,
        nextAttemptAt: () => 'now()',
        failedAt: null,
        perhapsSentAt: null,
      })
      .where('id = :mailId AND state IN (:...again)', { mailId, again: ['failed', 'perhaps-sent'] })
      .execute();
    return changed.affected === 1;
  }

  /** The last mail about something, for whoever asks whether it went out. */
  async latestAbout(
    manager: EntityManager,
    relatedId: string,
    kinds: readonly string[],
  ): Promise<OutboxMail | null> {
    return manager.findOne(OutboxMail, {
      where: { relatedId, kind: In([...kinds]) },
      order: { queuedAt: 'DESC', id: 'DESC' },
    });
  }

  /** The last mails about something, newest first. */
  async allAbout(manager: EntityManager, relatedId: string, kinds: readonly string[]): Promise<OutboxMail[]> {
    return manager.find(OutboxMail, {
      where: { relatedId, kind: In([...kinds]) },
      order: { queuedAt: 'DESC', id: 'DESC' },
      take: 30,
    });
  }

  /** A person saw it come back. Only of one that went out, or perhaps did; its text is gone, so it is not sent again. */
  async bounced(manager: EntityManager, mailId: string, note: string): Promise<boolean> {
    const changed = await manager
      .createQueryBuilder()
      .update(OutboxMail)
      .set({ state: 'bounced', lastFault: note })
      .where('id = :mailId AND state IN (:...out)', { mailId, out: ['sent', 'perhaps-sent'] })
      .execute();
    return changed.affected === 1;
  }

  /** What people typed into mails about something. The text of a mail that went out is no longer kept. */
  async textsAbout(manager: EntityManager, relatedId: string, where: string): Promise<KeptRow[]> {
    const mails = await manager.find(OutboxMail, { where: { relatedId }, order: { queuedAt: 'ASC' } });
    return mails.map(({ id, state, subject, text, html }) => ({
      texts: [subject, text ?? '', html ?? ''].map((written) => ({
        where: state === 'sent' ? `${where}, letter` : `${where}, letter not sent yet`,
        text: written,
        alreadySent: WENT_OUT.includes(state),
      })),
      rewrite: (change) =>
        manager.update(
          OutboxMail,
          { id },
          {
            subject: change(subject),
            text: text === null ? null : change(text),
            html: html === null ? null : change(html),
          },
        ),
    }));
  }

  /** Empties the papers of mails that have not gone out for certain; until they are replaced, none of these is sent. */
  async holdPapers(manager: EntityManager, relatedIds: readonly string[]): Promise<void> {
    await manager.query(
      `UPDATE outbox_attachments SET content = '' FROM outbox_mails mail
       WHERE mail.id = mail_id AND mail.related_id = ANY ($1)`,
      [relatedIds],
    );
  }

  /** What the mails with emptied papers are about. */
  async withHeldPapers(manager: EntityManager): Promise<string[]> {
    const rows: { id: string }[] = await manager.query(
      `SELECT DISTINCT mail.related_id AS id FROM outbox_mails mail
       JOIN outbox_attachments paper ON paper.mail_id = mail.id AND ${HELD}`,
    );
    return rows.map(({ id }) => id);
  }

  /** Mails about something with an emptied paper; nobody else changes it until the transaction ends. */
  async lockHeldPapers(manager: EntityManager, relatedId: string): Promise<string[]> {
    const rows: { id: string }[] = await manager.query(
      `SELECT mail.id FROM outbox_mails mail
       JOIN outbox_attachments paper ON paper.mail_id = mail.id AND ${HELD}
       WHERE mail.related_id = $1 FOR UPDATE OF paper`,
      [relatedId],
    );
    return rows.map(({ id }) => id);
  }

  async replacePaper(manager: EntityManager, mailIds: readonly string[], content: Buffer): Promise<void> {
    await manager.update(OutboxAttachment, { mailId: In([...mailIds]) }, { content });
  }

  private newMessageId(): string {
    return `<${randomUUID()}@${new URL(this.config.publicUrl).hostname}>`;
  }
}
