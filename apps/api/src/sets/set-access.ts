import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { productionArchived, ProductionsService } from '../productions/productions.service';
import { DesignedSet } from './entities/designed-set.entity';

/** Finds a set by its whole path: workshop, production, set. Anything else does not exist for the caller. */
@Injectable()
export class SetAccess {
  constructor(
    @InjectRepository(DesignedSet) private readonly sets: Repository<DesignedSet>,
    private readonly productions: ProductionsService,
  ) {}

  async forReading(member: MemberInfo, productionId: string, setId: string): Promise<DesignedSet> {
    return this.found(await this.withProduction(member, productionId, setId), member, productionId);
  }

  async forChanging(member: MemberInfo, productionId: string, setId: string): Promise<DesignedSet> {
    const set = await this.forReading(member, productionId, setId);
    if (set.production?.archivedAt) throw productionArchived();
    if (set.archivedAt) {
      throw Problem.conflict('set-archived', 'This set is archived. Restore it to change it.');
    }
    return set;
  }

  private withProduction(
    member: MemberInfo,
    productionId: string,
    setId: string,
  ): Promise<DesignedSet | null> {
    return this.sets.findOne({
      where: { id: setId, productionId, production: { workshopId: member.workshopId } },
      relations: { production: true },
    });
  }

  /** Says which part of the path leads nowhere. */
  private async found(
    set: DesignedSet | null,
    member: MemberInfo,
    productionId: string,
  ): Promise<DesignedSet> {
    if (set) return set;
    await this.productions.forReading(member, productionId);
    throw Problem.notFound('set');
  }

  /** The set as it is now, kept from other writers until the transaction ends. */
  async locked(manager: EntityManager, setId: string): Promise<DesignedSet> {
    return manager.findOneOrFail(DesignedSet, { where: { id: setId }, lock: { mode: 'pessimistic_write' } });
  }
}
