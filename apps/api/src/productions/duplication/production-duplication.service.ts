import type { SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { AuditService } from '../../audit/audit.service';
import { CastService } from '../../cast/cast.service';
import type { MemberInfo } from '../../common/access.decorator';
import { SetsService } from '../../sets/sets.service';
import type { Production } from '../entities/production.entity';
import { ProductionsService } from '../productions.service';

/** Copies a production with its cast and the sets in use. Issued revisions, notes and orders stay behind. */
@Injectable()
export class ProductionDuplicationService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly productions: ProductionsService,
    private readonly cast: CastService,
    private readonly sets: SetsService,
    private readonly audit: AuditService,
  ) {}

  async duplicate(member: MemberInfo, productionId: string): Promise<Production> {
    const original = await this.productions.forReading(member, productionId);
    const sets = await this.sets.inUse(productionId);
    return this.dataSource.transaction(async (manager) => {
      const copy = await this.productions.copy(manager, original);
      const idOf = await this.cast.copyAll(manager, productionId, copy.id);
      for (const { name, document } of sets) {
        await this.sets.begin(manager, member, {
          productionId: copy.id,
          name,
          document: withCast(document, idOf),
        });
      }
      await this.audit.record(manager, {
        workshopId: member.workshopId,
        userId: member.userId,
        action: 'production.duplicated',
        subjectType: 'production',
        subjectId: copy.id,
        detail: { from: productionId },
      });
      return copy;
    });
  }
}

function withCast(document: SetDocument, idOf: Map<string, string>): SetDocument {
  const seating = document.seating.flatMap((seat) => {
    if (seat.sitter.kind !== 'cast') return [seat];
    const castId = idOf.get(seat.sitter.castId);
    return castId ? [{ ...seat, sitter: { ...seat.sitter, castId } }] : [];
  });
  return { ...document, seating };
}
