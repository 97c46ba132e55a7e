import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { AuditService } from '../../audit/audit.service';
import type { MemberInfo } from '../../common/access.decorator';
import { HeldPapers } from '../../cushion-orders/held-papers.service';
import { RevisionsService } from '../../sets/revisions.service';
import { removeFromSearches } from '../../suggestions/search-erasure';
import { removeTestSits } from '../../test-sits/test-sit-erasure';
import { CastService } from '../cast.service';
import { ErasedNames } from './erased-names.service';

/** Takes a person out of everything that is kept: cast, sheets of issued revisions, and what people typed. */
@Injectable()
export class CastErasureService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly cast: CastService,
    private readonly revisions: RevisionsService,
    private readonly names: ErasedNames,
    private readonly papers: HeldPapers,
    private readonly audit: AuditService,
  ) {}

  async erase(member: MemberInfo, productionId: string, castId: string): Promise<void> {
    await this.cast.find(member, productionId, castId);
    await this.dataSource.transaction(async (manager) => {
      const { name, newName } = await this.cast.removePersonalData(manager, productionId, castId);
      await this.revisions.removePerson(manager, productionId, { id: castId, name }, newName);
      await removeTestSits(manager, productionId, { id: castId, name });
      await removeFromSearches(manager, member.workshopId, castId);
      const found = await this.names.remove(manager, member, productionId, { id: castId, name });
      await this.papers.hold(manager, productionId);
      await this.audit.record(manager, {
        workshopId: member.workshopId,
        userId: member.userId,
        action: 'cast.erased',
        subjectType: 'cast-member',
        subjectId: castId,
        detail: { ...found },
      });
    });
    await this.papers.redraw();
  }
}
