import { Injectable, Logger } from '@nestjs/common';
import { Cron } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager, In } from 'typeorm';
import { InjectSettings, type Settings } from '../config/settings';
import { MailService } from '../mail/mail.service';
import { CushionOrder } from './entities/cushion-order.entity';
import { OrderPaper } from './order-paper.service';

/** Papers in the outbox that say what was erased: emptied with the erasure, drawn again after it. */
@Injectable()
export class HeldPapers {
  private readonly logger = new Logger(HeldPapers.name);

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
    private readonly mail: MailService,
    private readonly paper: OrderPaper,
  ) {}

  /** Part of the caller's transaction: no mail of these orders goes out before its paper is drawn again. */
  async hold(manager: EntityManager, productionId: string): Promise<void> {
    const orders = await manager.find(CushionOrder, { where: { productionId }, select: { id: true } });
    await this.mail.holdPapers(
      manager,
      orders.map(({ id }) => id),
    );
  }

  /** Draws every held paper; what cannot be drawn stays held, and is tried again. */
  async redraw(): Promise<void> {
    const { manager } = this.dataSource;
    const orders = await manager.find(CushionOrder, {
      where: { id: In(await this.mail.withHeldPapers(manager)) },
      select: { id: true },
    });
    for (const { id } of orders) {
      try {
        await this.redrawOf(id);
      } catch (fault) {
        this.logger.error(`paper of order ${id}: ${fault instanceof Error ? fault.message : String(fault)}`);
      }
    }
  }

  /** For a process that ended between an erasure and the drawing. */
  @Cron('* * * * *')
  async redrawLeftOver(): Promise<void> {
    if (this.config.mailPollMs > 0) await this.redraw();
  }

  private async redrawOf(id: string): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      const mailIds = await this.mail.lockHeldPapers(manager, id);
      if (mailIds.length === 0) return;
      // Read once the papers are locked: an erasure meanwhile waits, and then holds them again.
      const order = await manager.findOne(CushionOrder, {
        where: { id },
        relations: { set: true, upholsterer: true },
      });
      if (!order?.sent) return;
      await this.mail.replacePaper(manager, mailIds, await this.paper.pack(order, order.sent));
    });
  }
}
