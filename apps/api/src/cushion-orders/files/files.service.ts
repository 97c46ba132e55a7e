import { randomUUID } from 'node:crypto';
import { Injectable, Logger } from '@nestjs/common';
import { Cron } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager, In, LessThan } from 'typeorm';
import type { MemberInfo } from '../../common/access.decorator';
import { Problem } from '../../common/problem';
import { isStorableText } from '../../common/text-field';
import { InjectSettings, type Settings } from '../../config/settings';
import { ObjectStore } from '../../object-store/object-store.service';
import { requireMark } from '../cushion-mark';
import type { CushionOrder } from '../entities/cushion-order.entity';
import { OrderInspection } from '../inspections/order-inspection.entity';
import { LinkService } from '../link.service';
import { findOrder, type OrderPlace } from '../order-access';
import { OrderActs, type OrderAct, ownedBy } from '../order-acts.service';
import { SentCushions } from '../sent-cushions.service';
import { cleanFile, ORDER_LIMITS } from './clean-file';
import { OrderFile } from './order-file.entity';
import type { ReceivedFile } from './receive-file';

/** After so long nobody is still bringing or taking a file: its process has ended. */
const ABANDONED_MS = 15 * 60_000;

/**
 * Photographs and papers of an order. A row comes before its bytes and is shown only after them; it is hidden before they go
 * and removed after. What is cut short in between is never seen, and the sweep ends it.
 */
@Injectable()
export class OrderFiles {
  private readonly logger = new Logger(OrderFiles.name);

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
    private readonly acts: OrderActs,
    private readonly links: LinkService,
    private readonly cushions: SentCushions,
    private readonly store: ObjectStore,
  ) {}

  add(member: MemberInfo, place: OrderPlace, received: ReceivedFile | undefined, mark?: string) {
    return this.keep(received, mark, (work) => this.acts.byMember(member, place, work));
  }

  addByLink(token: string, received: ReceivedFile | undefined, mark?: string) {
    return this.keep(received, mark, (work) => this.acts.byUpholsterer(token, null, work));
  }

  async read(place: OrderPlace, fileId: string): Promise<{ file: OrderFile; content: Buffer }> {
    const order = await findOrder(this.dataSource.manager, place);
    return this.fetch({ id: fileId, orderId: order.id });
  }

  /** What was exchanged with whoever had the order before is not for the holder of this link. */
  async readByLink(token: string, fileId: string): Promise<{ file: OrderFile; content: Buffer }> {
    const { order } = await this.links.open(token);
    const upholstererId = order.upholstererId ?? '';
    return this.fetch({ id: fileId, orderId: order.id, upholstererId });
  }

  remove(member: MemberInfo, place: OrderPlace, fileId: string): Promise<void> {
    return this.drop((work) => this.acts.byMember(member, place, work, { evenOver: true }), fileId);
  }

  removeByLink(token: string, fileId: string): Promise<void> {
    return this.drop((work) => this.acts.byUpholsterer(token, null, work), fileId);
  }

  @Cron('0 */5 * * * *')
  async sweepInTime(): Promise<void> {
    if (this.config.mailPollMs > 0 && this.store.isSetUp) await this.sweep(new Date());
  }

  /** Ends what was on its way in or out when its process ended. Returns how many. */
  async sweep(now: Date): Promise<number> {
    const before = new Date(now.getTime() - ABANDONED_MS);
    const left = await this.dataSource.manager.findBy(OrderFile, {
      state: In(['arriving', 'leaving']),
      at: LessThan(before),
    });
    for (const { id, objectKey } of left) {
      try {
        await this.erase(id, objectKey);
      } catch (fault) {
        this.logger.error(`file ${id}: ${fault instanceof Error ? fault.message : String(fault)}`);
      }
    }
    return left.length;
  }

  private async keep(
    received: ReceivedFile | undefined,
    mark: string | undefined,
    acting: <T>(work: (act: OrderAct) => Promise<T>) => Promise<T>,
  ): Promise<void> {
    if (!received) {
      throw Problem.invalid([{ path: 'file', code: 'file-missing', message: 'no file was sent' }]);
    }
    if (!this.store.isSetUp) {
      throw new Problem(503, 'files-not-set-up', 'No store for files is set up here. Send it by mail.');
    }
    const clean = await cleanFile(received.buffer);
    const { id, objectKey } = await acting(async (act) => {
      const { manager, order } = act;
      requireMark(await this.cushions.of(order), mark, 'cushionMark');
      await requireRoom(manager, order, clean.content.length);
      const { type, widthPx, heightPx } = clean;
      return manager.save(
        manager.create(OrderFile, {
          ...ownedBy(act),
          ...{ type, widthPx, heightPx, bytes: clean.content.length, state: 'arriving' },
          cushionMark: mark ?? null,
          name: fileName(received.originalname, type),
          objectKey: `orders/${order.id}/${randomUUID()}`,
        }),
      );
    });
    try {
      await this.store.put(objectKey, clean.content, clean.type);
    } catch (fault) {
      // It may have arrived there all the same: the sweep takes both.
      await this.dataSource.manager.update(OrderFile, { id, state: 'arriving' }, { state: 'leaving' });
      throw fault;
    }
    await acting(async (act) => {
      const shown = await act.manager.update(OrderFile, { id, state: 'arriving' }, { state: 'kept' });
      if (shown.affected === 0)
        throw Problem.conflict('file-lost', 'That took too long. Send the file again.');
      await act.audit('file-added');
    });
  }

  private async drop(
    acting: <T>(work: (act: OrderAct) => Promise<T>) => Promise<T>,
    fileId: string,
  ): Promise<void> {
    const file = await acting(async (act) => {
      const { manager, order, side } = act;
      const { upholstererId } = order;
      const found = await manager.findOneBy(OrderFile, {
        ...{ id: fileId, orderId: order.id, upholstererId, side, state: 'kept' as const },
      });
      if (!found) throw Problem.notFound('file of your own');
      await requireUncited(manager, found);
      await manager.update(OrderFile, { id: fileId }, { state: 'leaving' });
      await act.audit('file-removed');
      return found;
    });
    await this.erase(file.id, file.objectKey);
  }

  private async erase(id: string, objectKey: string): Promise<void> {
    await this.store.remove(objectKey);
    await this.dataSource.manager.delete(OrderFile, { id, state: In(['arriving', 'leaving']) });
  }

  private async fetch(
    where: Partial<Pick<OrderFile, 'id' | 'orderId' | 'upholstererId'>>,
  ): Promise<{ file: OrderFile; content: Buffer }> {
    const file = await this.dataSource.manager.findOneBy(OrderFile, { ...where, state: 'kept' });
    if (!file) throw Problem.notFound('file');
    return { file, content: await this.store.get(file.objectKey) };
  }
}

async function requireRoom(manager: EntityManager, { id }: CushionOrder, more: number): Promise<void> {
  const [count, bytes] = await Promise.all([
    manager.countBy(OrderFile, { orderId: id }),
    manager.sum(OrderFile, 'bytes', { orderId: id }),
  ]);
  if (count < ORDER_LIMITS.files && Number(bytes ?? 0) + more <= ORDER_LIMITS.bytes) return;
  throw Problem.conflict(
    'order-full',
    `An order holds at most ${ORDER_LIMITS.files} files and ${ORDER_LIMITS.bytesWords}. Remove some first.`,
  );
}

async function requireUncited(manager: EntityManager, { id, orderId }: OrderFile): Promise<void> {
  const sheets = await manager.findBy(OrderInspection, { orderId });
  if (sheets.some(({ photoIds }) => photoIds.includes(id))) {
    throw Problem.conflict('file-on-sheet', 'An inspection sheet shows this photograph, so it stays.');
  }
}

/** The sender's name for it without what no system takes, and with the ending of what it is. */
function fileName(given: string, type: OrderFile['type']): string {
  // Multer reads the name as Latin-1; browsers send UTF-8.
  const utf8 = Buffer.from(given, 'latin1').toString('utf8');
  const name = (utf8.includes('\ufffd') ? given : utf8).split(/[/\\]/).at(-1) ?? '';
  const stem = name
    .replace(/\.[^.]*$/, '')
    .slice(0, 100)
    .trim();
  const safe = isStorableText(stem) && stem !== '' ? stem : 'file';
  return `${safe}.${type === 'image/jpeg' ? 'jpg' : 'pdf'}`;
}
