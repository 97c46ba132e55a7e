import { seatSinkMm } from '@settlewright/anthropometry';
import { type FoamBuild, untestedSituation } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import { CastService } from '../cast/cast.service';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { SetAccess } from '../sets/set-access';
import type { AddTestSitDto } from './test-sit.dto';
import { TestSitRow } from './test-sit.entity';

/** A set holds a factor between a tenth and ten: a drop further off the estimate than that was read or typed wrong. */
const TIMES_OFF = 10;

@Injectable()
export class TestSitsService {
  constructor(
    @InjectRepository(TestSitRow) private readonly sits: Repository<TestSitRow>,
    private readonly access: SetAccess,
    private readonly cast: CastService,
    private readonly audit: AuditService,
  ) {}

  async list(
    member: MemberInfo,
    productionId: string,
    setId: string,
    query: PageQuery,
  ): Promise<Page<TestSitRow>> {
    await this.access.forReading(member, productionId, setId);
    const select = this.sits
      .createQueryBuilder('sit')
      .leftJoinAndSelect('sit.cast', 'cast')
      .where('sit.setId = :setId', { setId });
    return readPage(select, query, {
      sortable: { satOn: 'sit.satOn', createdAt: 'sit.createdAt' },
      defaultSort: 'satOn',
      tieBreak: 'sit.id',
      searchIn: ['sit.name', 'cast.name', 'sit.grade', 'sit.note'],
    });
  }

  async add(
    member: MemberInfo,
    productionId: string,
    setId: string,
    dto: AddTestSitDto,
  ): Promise<TestSitRow> {
    await this.access.forChanging(member, productionId, setId);
    const { castId = null, name = null, satOn, grade, measuredMm, note = '' } = dto;
    const { ifd25N, supportFactor, thicknessMm, layers, wrap } = dto;
    const build: FoamBuild = { ifd25N, supportFactor, thicknessMm, layers, wrap };
    if ((castId === null) === (name === null)) {
      throw invalid('name', 'who-sat', 'either somebody of the cast or a name says who sat');
    }
    // Whoever is being erased meanwhile must not come back with a weight that was read before.
    return this.sits.manager.transaction(async (manager) => {
      const person =
        castId === null ? null : await this.cast.lockedMember(manager, member, productionId, castId);
      const weightKg = dto.weightKg ?? person?.weightKg ?? null;
      if (weightKg === null) throw invalid('weightKg', 'not-known', 'the weight is not in the cast: say it');
      const foam = untestedSituation(build);
      if (!foam) throw new RangeError('A hard seat has no drop.');
      const predictedMm = seatSinkMm(foam, weightKg).sinkMm;
      if (measuredMm > thicknessMm) {
        throw invalid('measuredMm', 'beyond-thickness', 'a cushion goes down no further than it is thick');
      }
      if (measuredMm > TIMES_OFF * predictedMm || predictedMm > TIMES_OFF * measuredMm) {
        const message = `more than ${TIMES_OFF} times off the estimate: see drop, weight and foam again`;
        throw invalid('measuredMm', 'far-off-estimate', message);
      }
      const { id } = await manager.save(
        manager.create(TestSitRow, {
          ...{ setId, castId, name, satOn, grade, ...build, weightKg, measuredMm, note },
          predictedMm,
          createdById: member.userId,
        }),
      );
      await this.record(manager, member, 'test-sit.kept', id);
      return manager.findOneOrFail(TestSitRow, { where: { id }, relations: { cast: true } });
    });
  }

  async remove(member: MemberInfo, productionId: string, setId: string, sitId: string): Promise<void> {
    await this.access.forChanging(member, productionId, setId);
    await this.sits.manager.transaction(async (manager) => {
      const { affected } = await manager.delete(TestSitRow, { id: sitId, setId });
      if (!affected) throw Problem.notFound('test sit');
      await this.record(manager, member, 'test-sit.removed', sitId);
    });
  }

  private record(manager: EntityManager, member: MemberInfo, action: string, id: string): Promise<void> {
    const { workshopId, userId } = member;
    return this.audit.record(manager, { workshopId, userId, action, subjectType: 'test-sit', subjectId: id });
  }
}

const invalid = (path: string, code: string, message: string): Problem =>
  Problem.invalid([{ path, code, message }]);
