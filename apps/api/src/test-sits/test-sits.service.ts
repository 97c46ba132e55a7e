import { seatSinkMm } from '@settlewright/anthropometry';
import { type FoamBuild, untestedSituation } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { Repository } from 'typeorm';
import { CastService } from '../cast/cast.service';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { SetAccess } from '../sets/set-access';
import type { AddTestSitDto } from './test-sit.dto';
import { TestSitRow } from './test-sit.entity';

@Injectable()
export class TestSitsService {
  constructor(
    @InjectRepository(TestSitRow) private readonly sits: Repository<TestSitRow>,
    private readonly access: SetAccess,
    private readonly cast: CastService,
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
      const { id } = await manager.save(
        manager.create(TestSitRow, {
          ...{ setId, castId, name, satOn, grade, ...build, weightKg, measuredMm, note },
          predictedMm: seatSinkMm(foam, weightKg).sinkMm,
          createdById: member.userId,
        }),
      );
      return manager.findOneOrFail(TestSitRow, { where: { id }, relations: { cast: true } });
    });
  }

  async remove(member: MemberInfo, productionId: string, setId: string, sitId: string): Promise<void> {
    await this.access.forChanging(member, productionId, setId);
    const { affected } = await this.sits.delete({ id: sitId, setId });
    if (!affected) throw Problem.notFound('test sit');
  }
}

const invalid = (path: string, code: string, message: string): Problem =>
  Problem.invalid([{ path, code, message }]);
