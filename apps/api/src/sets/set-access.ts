import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { ProductionsService } from '../productions/productions.service';
import { DesignedSet } from './entities/designed-set.entity';

/** Finds a set by its whole path: workshop, production, set. Anything else does not exist for the caller. */
@Injectable()
export class SetAccess {
  constructor(
    @InjectRepository(DesignedSet) private readonly sets: Repository<DesignedSet>,
    private readonly productions: ProductionsService,
  ) {}

  async forReading(member: MemberInfo, productionId: string, setId: string): Promise<DesignedSet> {
    await this.productions.forReading(member, productionId);
    const set = await this.sets.findOneBy({ id: setId, productionId });
    if (!set) throw Problem.notFound('set');
    return set;
  }

  async forChanging(member: MemberInfo, productionId: string, setId: string): Promise<DesignedSet> {
    await this.productions.forChanging(member, productionId);
    const set = await this.forReading(member, productionId, setId);
    if (set.archivedAt)
      throw Problem.conflict('set-archived', 'This set is archived. Restore it to change it.');
    return set;
  }

  /** The set as it is now, kept from other writers until the transaction ends. */
  async locked(manager: EntityManager, setId: string): Promise<DesignedSet> {
    return manager.findOneOrFail(DesignedSet, { where: { id: setId }, lock: { mode: 'pessimistic_write' } });
  }
}
