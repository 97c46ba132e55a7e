import type { SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, In, type Repository, type SelectQueryBuilder } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import { castPerson } from '../cast/known-person';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { CushionSettingsService } from '../cushion-settings/cushion-settings.service';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { withoutPerson } from '../fit-checks/without-person';
import { ProductionsService } from '../productions/productions.service';
import { DraftsService } from './drafts.service';
import { type ApproveRevisionDto, type IssueRevisionDto, RevisionDto } from './dto/revision.dto';
import { RevisionApproval } from './entities/revision-approval.entity';
import { SetRevision } from './entities/set-revision.entity';
import { whileErasing } from './erasing';
import { revisionLetter } from './letters';
import { SeatedPeople } from './seated-people.service';
import { SetAccess } from './set-access';

/** What a list says of a revision: neither its document nor its sheet, which are large. */
const LISTED = [
  'id',
  'setId',
  'ordinal',
  'letter',
  'draftNumber',
  'issuedAt',
  'issuedById',
  'note',
  'counts',
] as const satisfies (keyof SetRevision)[];

const LETTERS = /^[A-Z]{1,6}$/i;

@Injectable()
export class RevisionsService {
  constructor(
    @InjectRepository(SetRevision) private readonly revisions: Repository<SetRevision>,
    private readonly access: SetAccess,
    private readonly drafts: DraftsService,
    private readonly productions: ProductionsService,
    private readonly people: SeatedPeople,
    private readonly fit: FitCheckService,
    private readonly cushions: CushionSettingsService,
    private readonly audit: AuditService,
  ) {}

  /** Freezes the draft that the caller has seen; a draft that moved on meanwhile is not issued unseen. */
  async issue(
    member: MemberInfo,
    productionId: string,
    setId: string,
    dto: IssueRevisionDto,
  ): Promise<RevisionDto> {
    await this.access.forChanging(member, productionId, setId);
    const id = await this.revisions.manager.transaction(async (manager) => {
      // Somebody who is being erased must not stand on a sheet that is stored a moment later.
      await this.productions.lockPeople(manager, productionId);
      const set = await this.access.locked(manager, setId);
      if (set.draftNumber !== dto.baseNumber) {
        const detail = `Draft ${dto.baseNumber} was to be issued, but the set is at draft ${set.draftNumber}.`;
        throw Problem.conflict('draft-moved-on', detail, { currentNumber: set.draftNumber });
      }
      const { document } = await this.drafts.inForce(set, manager);
      const people = await this.people.of(productionId, [document], manager);
      const { confidence } = await this.productions.workshopOf(productionId, manager);
      const fitSheet = this.fit.sheetFor(document, people.map(castPerson), confidence);
      const ordinal = (await manager.countBy(SetRevision, { setId })) + 1;
      const revision = await manager.save(
        manager.create(SetRevision, {
          setId,
          ordinal,
          letter: revisionLetter(ordinal),
          draftNumber: set.draftNumber,
          document,
          fitSheet,
          counts: fitSheet.counts,
          cushionRules: await this.cushions.rules(member.workshopId, manager),
          note: dto.note ?? '',
          issuedById: member.userId,
        }),
      );
      await this.record(manager, member, 'revision.issued', revision);
      return revision.id;
    });
    const revision = await this.revisions.findOneOrFail({ where: { id }, relations: { issuedBy: true } });
    return RevisionDto.of(revision, undefined);
  }

  async list(
    member: MemberInfo,
    productionId: string,
    setId: string,
    query: PageQuery,
  ): Promise<Page<RevisionDto>> {
    await this.access.forReading(member, productionId, setId);
    const select = this.listed().where('revision.setId = :setId', { setId });
    const page = await readPage(select, query, {
      sortable: { letter: 'revision.ordinal', issuedAt: 'revision.issuedAt' },
      defaultSort: 'letter',
      tieBreak: 'revision.id',
      searchIn: ['revision.note'],
    });
    return { ...page, items: await this.describe(page.items) };
  }

  /** One revision by its letter. */
  async find(member: MemberInfo, productionId: string, setId: string, letter: string): Promise<SetRevision> {
    await this.access.forReading(member, productionId, setId);
    const revision = LETTERS.test(letter)
      ? await this.revisions.findOne({
          where: { setId, letter: letter.toUpperCase() },
          relations: { issuedBy: true },
        })
      : null;
    if (!revision) throw Problem.notFound('revision');
    return revision;
  }

  async approve(
    member: MemberInfo,
    productionId: string,
    setId: string,
    letter: string,
    dto: ApproveRevisionDto,
  ): Promise<SetRevision> {
    await this.access.forChanging(member, productionId, setId);
    const revision = await this.find(member, productionId, setId, letter);
    await this.revisions.manager.transaction(async (manager) => {
      await manager.insert(RevisionApproval, {
        revisionId: revision.id,
        decision: dto.decision,
        comment: dto.comment ?? '',
        decidedById: member.userId,
      });
      await this.record(manager, member, `revision.${dto.decision}`, revision);
    });
    return revision;
  }

  /** What was said of a revision, newest first. */
  approvalsOf(revisionIds: string[]): Promise<RevisionApproval[]> {
    return this.revisions.manager.find(RevisionApproval, {
      where: { revisionId: In(revisionIds) },
      relations: { decidedBy: true },
      order: { decidedAt: 'DESC', id: 'DESC' },
    });
  }

  /** The newest revision of each set that has one, by set. */
  async latestOf(setIds: string[]): Promise<Map<string, RevisionDto>> {
    if (setIds.length === 0) return new Map();
    const newest = await this.listed()
      .distinctOn(['revision.setId'])
      .where('revision.setId IN (:...setIds)', { setIds })
      .orderBy('revision.setId')
      .addOrderBy('revision.ordinal', 'DESC')
      .getMany();
    const described = await this.describe(newest);
    return new Map(newest.map(({ setId }, index) => [setId, described[index]!]));
  }

  async latestDocument(setId: string): Promise<SetDocument | undefined> {
    const newest = await this.revisions.findOne({ where: { setId }, order: { ordinal: 'DESC' } });
    return newest?.document;
  }

  /** Part of the caller's transaction: takes a person out of every sheet of the production. */
  async removePerson(
    manager: EntityManager,
    productionId: string,
    person: { id: string; name: string },
    newName: string,
  ): Promise<void> {
    const ids = await manager
      .createQueryBuilder(SetRevision, 'revision')
      .select('revision.id', 'id')
      .innerJoin('revision.set', 'set')
      .where('set.productionId = :productionId', { productionId })
      .getRawMany<{ id: string }>();
    for (const { id } of ids) {
      const revision = await manager.findOneByOrFail(SetRevision, { id });
      const fitSheet = withoutPerson(revision.fitSheet, person, newName);
      if (fitSheet === revision.fitSheet) continue;
      await whileErasing(manager, () => manager.update(SetRevision, { id }, { fitSheet }));
    }
  }

  private listed(): SelectQueryBuilder<SetRevision> {
    return this.revisions
      .createQueryBuilder('revision')
      .select(LISTED.map((column) => `revision.${column}`))
      .leftJoin('revision.issuedBy', 'issuer')
      .addSelect(['issuer.id', 'issuer.name']);
  }

  private async describe(revisions: SetRevision[]): Promise<RevisionDto[]> {
    if (revisions.length === 0) return [];
    const approvals = await this.approvalsOf(revisions.map(({ id }) => id));
    return revisions.map((revision) =>
      RevisionDto.of(
        revision,
        approvals.find(({ revisionId }) => revisionId === revision.id),
      ),
    );
  }

  private record(
    manager: EntityManager,
    member: MemberInfo,
    action: string,
    revision: SetRevision,
  ): Promise<void> {
    return this.audit.record(manager, {
      workshopId: member.workshopId,
      userId: member.userId,
      action,
      subjectType: 'revision',
      subjectId: revision.id,
      detail: { setId: revision.setId, letter: revision.letter },
    });
  }
}
