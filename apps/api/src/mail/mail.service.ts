import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { type EntityManager, In } from 'typeorm';
import { InjectSettings, type Settings } from '../config/settings';
import { OutboxAttachment } from './entities/outbox-attachment.entity';
import { OutboxMail } from './entities/outbox-mail.entity';

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

  private newMessageId(): string {
    return `<${randomUUID()}@${new URL(this.config.publicUrl).hostname}>`;
  }
}
