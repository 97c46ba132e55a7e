import { ARRANGEMENTS, emptySetDocument, type SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import { copyName } from '../common/copy-name';
import type { Page } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { ProductionsService } from '../productions/productions.service';
import { DraftsService } from './drafts.service';
import type { CreateSetDto, RenameSetDto, SetDto, SetQuery } from './dto/set.dto';
import { DesignedSet } from './entities/designed-set.entity';
import { SetAccess } from './set-access';
import { RevisionsService } from './revisions.service';

@Injectable()
export class SetsService {
  constructor(
    @InjectRepository(DesignedSet) private readonly sets: Repository<DesignedSet>,
    private readonly productions: ProductionsService,
    private readonly access: SetAccess,
    private readonly drafts: DraftsService,
    private readonly revisions: RevisionsService,
  ) {}

  async list(member: MemberInfo, productionId: string, query: SetQuery): Promise<Page<SetDto>> {
    await this.productions.forReading(member, productionId);
    const select = this.sets
      .createQueryBuilder('set')
      .where('set.productionId = :productionId', { productionId })
      .andWhere(`set.archivedAt IS ${query.status === 'archived' ? 'NOT ' : ''}NULL`);
    const page = await readPage(select, query, {
      sortable: { name: 'set.name', createdAt: 'set.createdAt', updatedAt: 'set.updatedAt' },
      defaultSort: 'name',
      tieBreak: 'set.id',
      searchIn: ['set.name'],
    });
    return { ...page, items: await this.describe(productionId, page.items) };
  }

  async get(member: MemberInfo, productionId: string, setId: string): Promise<SetDto> {
    return this.describeOne(await this.access.forReading(member, productionId, setId));
  }

  async create(member: MemberInfo, productionId: string, dto: CreateSetDto): Promise<SetDto> {
    await this.productions.forChanging(member, productionId);
    const document = await this.firstDocument(productionId, dto);
    const set = await this.sets.manager.transaction((manager) =>
      this.begin(manager, member, { productionId, name: dto.name, document }),
    );
    return this.describeOne(set);
  }

  async rename(member: MemberInfo, productionId: string, setId: string, dto: RenameSetDto): Promise<SetDto> {
    const set = await this.access.forChanging(member, productionId, setId);
    set.name = dto.name;
    return this.describeOne(await this.sets.save(set));
  }

  async duplicate(member: MemberInfo, productionId: string, setId: string): Promise<SetDto> {
    await this.productions.forChanging(member, productionId);
    const original = await this.access.forReading(member, productionId, setId);
    const { document } = await this.drafts.inForce(original);
    const name = copyName(original.name);
    const set = await this.sets.manager.transaction((manager) =>
      this.begin(manager, member, { productionId, name, document }),
    );
    return this.describeOne(set);
  }

  async archive(member: MemberInfo, productionId: string, setId: string): Promise<SetDto> {
    await this.productions.forChanging(member, productionId);
    const set = await this.access.forReading(member, productionId, setId);
    set.archivedAt ??= new Date();
    return this.describeOne(await this.sets.save(set));
  }

  async restore(member: MemberInfo, productionId: string, setId: string): Promise<SetDto> {
    await this.productions.forChanging(member, productionId);
    const set = await this.access.forReading(member, productionId, setId);
    set.archivedAt = null;
    return this.describeOne(await this.sets.save(set));
  }

  /** Part of the caller's transaction: a set with its first draft. */
  async begin(
    manager: EntityManager,
    member: MemberInfo,
    given: { productionId: string; name: string; document: SetDocument },
  ): Promise<DesignedSet> {
    const { productionId, name, document } = given;
    const set = await manager.save(
      manager.create(DesignedSet, { productionId, name, draftNumber: 1, archivedAt: null }),
    );
    await this.drafts.keep(manager, member, set, document);
    return set;
  }

  /** The sets of a production that are in use, with their documents in force. For a copy of the whole. */
  async inUse(productionId: string): Promise<{ name: string; document: SetDocument }[]> {
    const all = await this.sets.findBy({ productionId });
    const live = all.filter(({ archivedAt }) => archivedAt === null);
    return Promise.all(
      live.map(async (set) => ({ name: set.name, document: (await this.drafts.inForce(set)).document })),
    );
  }

  private async firstDocument(productionId: string, dto: CreateSetDto): Promise<SetDocument> {
    if (dto.document && dto.arrangement) {
      const message = 'a set begins with an arrangement or with a document, not with both';
      throw Problem.invalid([{ path: 'arrangement', code: 'one-of-two', message }]);
    }
    if (dto.document) return this.drafts.readSent(productionId, dto.document);
    if (!dto.arrangement) return emptySetDocument();
    const found = ARRANGEMENTS.find(({ id }) => id === dto.arrangement);
    if (found) return found.build();
    const accepted = ARRANGEMENTS.map(({ id }) => id).join(', ');
    const message = `arrangement accepts ${accepted}; read ${JSON.stringify(dto.arrangement)}`;
    throw Problem.invalid([{ path: 'arrangement', code: 'is-in', message }]);
  }

  private async describeOne(set: DesignedSet): Promise<SetDto> {
    const [described] = await this.describe(set.productionId, [set]);
    if (!described) throw new Error('a set was not described');
    return described;
  }

  private async describe(productionId: string, sets: DesignedSet[]): Promise<SetDto[]> {
    const ids = sets.map(({ id }) => id);
    const drafts = await this.drafts.withFreshCounts(productionId, ids);
    const revisions = await this.revisions.latestOf(ids);
    return sets.map((set): SetDto => {
      const draft = drafts.get(set.id);
      if (!draft) throw new Error(`set ${set.id} has no draft in force`);
      const lastRevision = revisions.get(set.id);
      return {
        id: set.id,
        name: set.name,
        status: set.archivedAt ? 'archived' : 'active',
        draftNumber: draft.number,
        savedAt: draft.savedAt.toISOString(),
        savedBy: { id: draft.savedById, name: draft.savedByName },
        ...(lastRevision ? { lastRevision } : {}),
        pieceCount: draft.document.pieces.length,
        seatedCount: draft.document.seating.length,
        ...(draft.counts ? { counts: draft.counts } : {}),
        document: draft.document,
      };
    });
  }
}
