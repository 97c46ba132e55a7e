import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { Repository } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import { PopulationsService } from '../populations/populations.service';
import type { PopulationUseDto } from './dto/population-use.dto';
import { Study } from './entities/study.entity';

/** Which studies drew from a workshop's own population; they outlive it. */
@Injectable()
export class PopulationUses {
  constructor(
    @InjectRepository(Study) private readonly studies: Repository<Study>,
    private readonly populations: PopulationsService,
  ) {}

  async list(member: MemberInfo, populationId: string): Promise<PopulationUseDto[]> {
    await this.populations.get(member, populationId);
    return this.studies
      .createQueryBuilder('study')
      .innerJoin('study.set', 'set')
      .innerJoin('set.production', 'production')
      .select('production.id', 'productionId')
      .addSelect('production.name', 'productionName')
      .addSelect('set.id', 'setId')
      .addSelect('set.name', 'setName')
      .addSelect('count(*)::int', 'studies')
      .addSelect('(count(*) FILTER (WHERE study.endedAt IS NULL))::int', 'unfinished')
      .where('production.workshopId = :workshopId', { workshopId: member.workshopId })
      .andWhere(`study.population ->> 'id' = :populationId`, { populationId })
      .groupBy('production.id')
      .addGroupBy('set.id')
      .orderBy('production.name')
      .addOrderBy('set.name')
      .addOrderBy('set.id')
      .getRawMany<PopulationUseDto>();
  }
}
