import { deriveParts } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { Repository } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { DraftsService } from './drafts.service';
import type { SetBuiltDto } from './dto/built.dto';
import { BuiltPart } from './entities/built-part.entity';
import { RevisionsService } from './revisions.service';
import { SetAccess } from './set-access';

@Injectable()
export class BuiltPartsService {
  constructor(
    @InjectRepository(BuiltPart) private readonly built: Repository<BuiltPart>,
    private readonly access: SetAccess,
    private readonly drafts: DraftsService,
    private readonly revisions: RevisionsService,
  ) {}

  async list(member: MemberInfo, productionId: string, setId: string): Promise<BuiltPart[]> {
    await this.access.forReading(member, productionId, setId);
    return this.all(setId);
  }

  /** Ticks a part or takes the tick off; said twice, it stays as it is. */
  async tick(
    member: MemberInfo,
    productionId: string,
    setId: string,
    { partId, built }: SetBuiltDto,
  ): Promise<BuiltPart[]> {
    const set = await this.access.forChanging(member, productionId, setId);
    if (!built) {
      await this.built.delete({ setId, partId });
      return this.all(setId);
    }
    const { document } = await this.drafts.inForce(set);
    const issued = await this.revisions.latestDocument(setId);
    const known = [document, ...(issued ? [issued] : [])].some((one) =>
      deriveParts(one).some(({ id }) => id === partId),
    );
    if (!known) {
      const message = `neither the draft nor the latest revision has a part ${JSON.stringify(partId)}`;
      throw Problem.invalid([{ path: 'partId', code: 'unknown-part', message }]);
    }
    await this.built
      .createQueryBuilder()
      .insert()
      .values({ setId, partId, builtById: member.userId })
      .orIgnore()
      .execute();
    return this.all(setId);
  }

  private all(setId: string): Promise<BuiltPart[]> {
    return this.built.find({ where: { setId }, relations: { builtBy: true }, order: { partId: 'ASC' } });
  }
}
