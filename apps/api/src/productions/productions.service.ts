import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import { copyName } from '../common/copy-name';
import type { Page } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import type { Workshop } from '../workshops/entities/workshop.entity';
import type { CreateProductionDto, PatchProductionDto, ProductionQuery } from './dto/production.dto';
import { Production } from './entities/production.entity';

export function productionArchived(): Problem {
  return Problem.conflict('production-archived', 'This production is archived. Restore it to change it.');
}

@Injectable()
export class ProductionsService {
  constructor(
    @InjectRepository(Production) private readonly productions: Repository<Production>,
    private readonly audit: AuditService,
  ) {}

  /** The production, if it belongs to the caller's workshop. */
  async forReading(member: MemberInfo, productionId: string): Promise<Production> {
    const production = await this.productions.findOneBy({ id: productionId, workshopId: member.workshopId });
    if (!production) throw Problem.notFound('production');
    return production;
  }

  /** As `forReading`, and the production is not put away. */
  async forChanging(member: MemberInfo, productionId: string): Promise<Production> {
    const production = await this.forReading(member, productionId);
    if (production.archivedAt) throw productionArchived();
    return production;
  }

  /** Whose settings hold in a production. For other modules. */
  async workshopOf(
    productionId: string,
    manager: EntityManager = this.productions.manager,
  ): Promise<Workshop> {
    const { workshop } = await manager.findOneOrFail(Production, {
      where: { id: productionId },
      relations: { workshop: true },
    });
    if (!workshop) throw new Error(`production ${productionId} has no workshop`);
    return workshop;
  }

  /** Keeps other writers who ask for the same from the production's people until the transaction ends. */
  async lockPeople(manager: EntityManager, productionId: string): Promise<void> {
    await manager.query('SELECT 1 FROM productions WHERE id = $1 FOR NO KEY UPDATE', [productionId]);
  }

  list(member: MemberInfo, query: ProductionQuery): Promise<Page<Production>> {
    const select = this.productions
      .createQueryBuilder('production')
      .where('production.workshopId = :workshopId', { workshopId: member.workshopId })
      .andWhere(`production.archivedAt IS ${query.status === 'archived' ? 'NOT ' : ''}NULL`);
    return readPage(select, query, {
      sortable: {
        name: 'production.name',
        createdAt: 'production.createdAt',
        updatedAt: 'production.updatedAt',
      },
      defaultSort: 'name',
      tieBreak: 'production.id',
      searchIn: ['production.name', 'production.summary'],
    });
  }

  create(member: MemberInfo, dto: CreateProductionDto): Promise<Production> {
    return this.productions.save(
      this.productions.create({
        workshopId: member.workshopId,
        name: dto.name,
        summary: dto.summary ?? '',
        units: dto.units ?? 'feet-inches',
        roundTo: dto.roundTo ?? 16,
        archivedAt: null,
      }),
    );
  }

  async patch(member: MemberInfo, productionId: string, dto: PatchProductionDto): Promise<Production> {
    const production = await this.forChanging(member, productionId);
    production.name = dto.name ?? production.name;
    production.summary = dto.summary ?? production.summary;
    production.units = dto.units ?? production.units;
    production.roundTo = dto.roundTo ?? production.roundTo;
    return this.productions.save(production);
  }

  async archive(member: MemberInfo, productionId: string): Promise<Production> {
    const production = await this.forReading(member, productionId);
    return this.putAway(member, production, production.archivedAt ?? new Date());
  }

  async restore(member: MemberInfo, productionId: string): Promise<Production> {
    const production = await this.forReading(member, productionId);
    return this.putAway(member, production, null);
  }

  /** Part of the caller's transaction: the production alone, without what it holds. */
  copy(manager: EntityManager, original: Production): Promise<Production> {
    const { workshopId, name, summary, units, roundTo } = original;
    return manager.save(
      manager.create(Production, {
        workshopId,
        name: copyName(name),
        summary,
        units,
        roundTo,
        archivedAt: null,
      }),
    );
  }

  private putAway(member: MemberInfo, production: Production, archivedAt: Date | null): Promise<Production> {
    return this.productions.manager.transaction(async (manager) => {
      const saved = await manager.save(Object.assign(production, { archivedAt }));
      await this.audit.record(manager, {
        workshopId: member.workshopId,
        userId: member.userId,
        action: archivedAt ? 'production.archived' : 'production.restored',
        subjectType: 'production',
        subjectId: production.id,
      });
      return saved;
    });
  }
}
