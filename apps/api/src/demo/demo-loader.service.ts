import { Injectable, Logger, type OnApplicationBootstrap } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import { PasswordsService } from '../auth/passwords.service';
import { CastService } from '../cast/cast.service';
import type { CreateCastMemberDto } from '../cast/dto/save-cast-member.dto';
import type { MemberInfo, Role } from '../common/access.decorator';
import { InjectSettings, type Settings } from '../config/settings';
import { withAdvisoryLock } from '../database/run-migrations';
import { LinkService } from '../cushion-orders/link.service';
import { OrderCorrespondence } from '../cushion-orders/order-correspondence.service';
import { OrdersService } from '../cushion-orders/orders.service';
import { OutboxMail } from '../mail/entities/outbox-mail.entity';
import { ProductionsService } from '../productions/productions.service';
import { DraftsService } from '../sets/drafts.service';
import { RevisionsService } from '../sets/revisions.service';
import { SetsService } from '../sets/sets.service';
import { UpholsterersService } from '../upholsterers/upholsterers.service';
import { UsersService } from '../users/users.service';
import { Workshop } from '../workshops/entities/workshop.entity';
import { WorkshopsService } from '../workshops/workshops.service';
import { afterChanges, demoDocument, SCENARIO } from './scenario';

/** Any number that no other advisory lock of the product uses. */
const DEMO_LOCK = 7_031_946;

/** Loads the demonstration workshop once, with the same services that people use. */
@Injectable()
export class DemoLoader implements OnApplicationBootstrap {
  private readonly logger = new Logger(DemoLoader.name);

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly settings: Settings,
    private readonly passwords: PasswordsService,
    private readonly users: UsersService,
    private readonly workshops: WorkshopsService,
    private readonly productions: ProductionsService,
    private readonly cast: CastService,
    private readonly sets: SetsService,
    private readonly drafts: DraftsService,
    private readonly revisions: RevisionsService,
    private readonly upholsterers: UpholsterersService,
    private readonly orders: OrdersService,
    private readonly correspondence: OrderCorrespondence,
    private readonly links: LinkService,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    if (!this.settings.demo) return;
    await withAdvisoryLock(this.dataSource, DEMO_LOCK, async () => {
      if (await this.dataSource.manager.existsBy(Workshop, { isDemo: true })) return;
      await this.clearUnfinished();
      await this.load();
      this.logger.log('The demonstration workshop is loaded.');
    });
  }

  private async load(): Promise<void> {
    const member = await this.openWorkshop();
    const { production: wanted } = SCENARIO;
    const production = await this.productions.create(member, {
      name: wanted.name,
      summary: wanted.summary,
      units: 'feet-inches',
      roundTo: 8,
    });
    const castIds = new Map<string, string>();
    for (const person of SCENARIO.cast) {
      const created = await this.cast.create(member, production.id, person as CreateCastMemberDto);
      castIds.set(created.name, created.id);
    }
    const setIds = new Map<string, string>();
    for (const set of SCENARIO.sets) {
      setIds.set(set.name, await this.designSet(member, production.id, set, castIds));
    }
    await this.orderCushions(member, production.id, setIds);
    // Said last, so that a load that was cut short is seen and begun again.
    await this.dataSource.manager.update(Workshop, { id: member.workshopId }, { isDemo: true });
  }

  /** What a load that was cut short left behind; orders go before the address book that they cite. */
  private async clearUnfinished(): Promise<void> {
    const emails = SCENARIO.people.map(({ email }) => email);
    const workshops = `SELECT workshop_id FROM memberships JOIN users ON users.id = user_id WHERE email = ANY($1)`;
    await this.dataSource.transaction(async (manager) => {
      await manager.query(`DELETE FROM productions WHERE workshop_id IN (${workshops})`, [emails]);
      await manager.query(`DELETE FROM workshops WHERE id IN (${workshops})`, [emails]);
      await manager.query('DELETE FROM users WHERE email = ANY($1)', [emails]);
    });
  }

  private async openWorkshop(): Promise<MemberInfo> {
    const passwordHash = await this.passwords.hash(SCENARIO.password);
    return this.dataSource.transaction(async (manager) => {
      let owner: MemberInfo | undefined;
      for (const { name, email, role } of SCENARIO.people) {
        const user = await this.users.create(manager, { name, email, passwordHash, emailConfirmed: true });
        if (owner === undefined) {
          const { name: workshopName, telephone, timeZone } = SCENARIO.workshop;
          const details = { name: workshopName, telephone, timeZone, paper: 'letter' as const };
          const { id } = await this.workshops.create(manager, user.id, details);
          owner = { workshopId: id, userId: user.id, role: 'owner' };
        } else {
          await this.workshops.addMember(manager, owner.workshopId, user.id, role as Role);
        }
      }
      if (owner === undefined) throw new Error('The demo scenario names nobody.');
      return owner;
    });
  }

  private async designSet(
    member: MemberInfo,
    productionId: string,
    set: (typeof SCENARIO.sets)[number],
    castIds: ReadonlyMap<string, string>,
  ): Promise<string> {
    let document = demoDocument(set, castIds);
    const created = await this.sets.create(member, productionId, {
      name: set.name,
      document: { ...document },
    });
    let number = created.draftNumber;
    for (const step of set.history) {
      document = afterChanges(document, step.changes);
      const draft = await this.drafts.save(member, productionId, created.id, {
        baseNumber: number,
        document: { ...document },
      });
      number = draft.number;
      if (step.issue !== undefined) {
        await this.revisions.issue(member, productionId, created.id, {
          baseNumber: number,
          note: step.issue,
        });
      }
    }
    return created.id;
  }

  /** The order is sent, and answered through the link in its own mail, as the upholsterer would. */
  private async orderCushions(
    member: MemberInfo,
    productionId: string,
    setIds: ReadonlyMap<string, string>,
  ): Promise<void> {
    const { order: wanted, upholsterer: contact } = SCENARIO;
    const upholsterer = await this.upholsterers.create(member, contact);
    const order = await this.orders.create(member, productionId, {
      setId: setIds.get(wanted.set) ?? '',
      revisionLetter: wanted.revision,
      title: wanted.title,
      neededBy: wanted.neededBy,
      cushionMarks: wanted.cushionMarks,
      covers: wanted.covers,
      spec: wanted.spec,
    });
    const place = { workshopId: member.workshopId, productionId, orderId: order.id };
    await this.correspondence.send(member, place, { upholstererId: upholsterer.id, message: wanted.message });
    const mail = await this.dataSource.manager.findOneByOrFail(OutboxMail, { relatedId: order.id });
    const token = /\/order\/([\w-]+)/.exec(mail.text ?? '')?.[1];
    if (token === undefined) throw new Error('The demo order’s mail carries no link.');
    await this.links.acknowledge(token, wanted.acknowledgedBy);
    await this.links.reply(token, wanted.reply);
  }
}
