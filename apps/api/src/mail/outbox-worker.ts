import { Injectable, Logger, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { SchedulerRegistry } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, In } from 'typeorm';
import { InjectSettings, type Settings } from '../config/settings';
import { OutboxAttachment } from './entities/outbox-attachment.entity';
import { OutboxMail } from './entities/outbox-mail.entity';
import { HELD } from './mail.service';
import { type HandOver, MailTransport } from './mail-transport';

const BATCH = 10;
const MOST_ATTEMPTS = 8;
const FIRST_WAIT_SECONDS = 30;
/** longer than every timeout of a hand-over together: who holds a mail longer has ended */
const ABANDONED_AFTER = '10 minutes';
const POLL_NAME = 'outbox';

/** Sends what is queued. Several processes may run it at once. */
@Injectable()
export class OutboxWorker implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly logger = new Logger(OutboxWorker.name);
  private running: Promise<void> | null = null;
  private stopping = false;

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
    private readonly transport: MailTransport,
    private readonly scheduler: SchedulerRegistry,
  ) {}

  onApplicationBootstrap(): void {
    if (this.config.mailPollMs === 0) return;
    this.scheduler.addInterval(
      POLL_NAME,
      setInterval(() => this.poll(), this.config.mailPollMs),
    );
  }

  async onModuleDestroy(): Promise<void> {
    this.stopping = true;
    if (this.scheduler.doesExist('interval', POLL_NAME)) this.scheduler.deleteInterval(POLL_NAME);
    await this.running;
  }

  /** One round: set aside what was abandoned, then send what is due. Returns how many were tried. */
  async sendDue(): Promise<number> {
    await this.setAsideAbandoned();
    const claimed = await this.claim();
    for (const [index, mail] of claimed.entries()) {
      if (this.stopping) {
        await this.release(claimed.slice(index));
        break;
      }
      await this.send(mail);
    }
    return claimed.length;
  }

  private poll(): void {
    this.running ??= this.sendDue()
      .then(() => undefined)
      .catch((fault: unknown) => this.logger.error(fault instanceof Error ? fault.message : fault))
      .finally(() => (this.running = null));
  }

  private async setAsideAbandoned(): Promise<void> {
    await this.dataSource
      .createQueryBuilder()
      .update(OutboxMail)
      .set({
        state: 'perhaps-sent',
        perhapsSentAt: () => 'now()',
        lastFault: 'the process that was sending it ended',
      })
      .where(`state = 'sending' AND sending_at < now() - interval '${ABANDONED_AFTER}'`)
      .execute();
  }

  private async claim(): Promise<OutboxMail[]> {
    return this.dataSource.transaction(async (manager) => {
      const due = await manager
        .createQueryBuilder(OutboxMail, 'mail')
        .where(`mail.state = 'queued' AND mail.nextAttemptAt <= now()`)
        .andWhere(
          `NOT EXISTS (SELECT 1 FROM outbox_attachments paper WHERE paper.mail_id = mail.id AND ${HELD})`,
        )
        .orderBy('mail.nextAttemptAt')
        .limit(BATCH)
        .setLock('pessimistic_write')
        .setOnLocked('skip_locked')
        .getMany();
      if (due.length === 0) return [];
      await manager
        .createQueryBuilder()
        .update(OutboxMail)
        .set({ state: 'sending', sendingAt: () => 'now()', attempts: () => 'attempts + 1' })
        .whereInIds(due.map((mail) => mail.id))
        .execute();
      return due.map((mail) => ({ ...mail, attempts: mail.attempts + 1 }));
    });
  }

  private async release(mails: OutboxMail[]): Promise<void> {
    await this.dataSource.manager.update(
      OutboxMail,
      { id: In(mails.map((mail) => mail.id)), state: 'sending' },
      { state: 'queued', sendingAt: null },
    );
  }

  private async send(mail: OutboxMail): Promise<void> {
    const attachments = await this.dataSource.manager.findBy(OutboxAttachment, { mailId: mail.id });
    // Emptied since the mail was claimed.
    if (attachments.some(({ content }) => content.length === 0)) {
      await this.release([mail]);
      return;
    }
    const result = await this.transport.handOver({
      to: mail.to,
      subject: mail.subject,
      text: mail.text ?? undefined,
      html: mail.html ?? undefined,
      replyTo: mail.replyTo ?? undefined,
      messageId: mail.messageId,
      attachments: attachments.map(({ filename, contentType, content }) => ({
        filename,
        contentType,
        content,
      })),
    });
    await this.note(mail, result);
  }

  private async note(mail: OutboxMail, result: HandOver): Promise<void> {
    const { manager } = this.dataSource;
    const row = { id: mail.id, state: 'sending' as const };
    if (result.outcome === 'sent') {
      await manager.update(OutboxMail, row, {
        state: 'sent',
        sentAt: () => 'now()',
        text: null,
        html: null,
        lastFault: null,
      });
      await manager.delete(OutboxAttachment, { mailId: mail.id });
      return;
    }
    const lastFault = result.fault.slice(0, 500);
    this.logger.warn(`mail ${mail.id} (${mail.kind}): ${result.outcome}`);
    if (result.outcome === 'unclear') {
      await manager.update(OutboxMail, row, {
        state: 'perhaps-sent',
        perhapsSentAt: () => 'now()',
        lastFault,
      });
    } else if (result.lasting || mail.attempts >= MOST_ATTEMPTS) {
      await manager.update(OutboxMail, row, { state: 'failed', failedAt: () => 'now()', lastFault });
    } else {
      const waitSeconds = FIRST_WAIT_SECONDS * 2 ** (mail.attempts - 1);
      await manager.update(OutboxMail, row, {
        state: 'queued',
        nextAttemptAt: () => `now() + interval '${waitSeconds} seconds'`,
        lastFault,
      });
    }
  }
}
