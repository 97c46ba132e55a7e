import type { CushionSpec } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import type { CushionOrder } from './entities/cushion-order.entity';
import { IssuedSets } from './issued-sets.service';
import type { SentContent } from './order-content';

/** The cushions of an order as the upholsterer has them. */
@Injectable()
export class SentCushions {
  constructor(private readonly issued: IssuedSets) {}

  async of(order: CushionOrder, sent: SentContent | null = order.sent): Promise<CushionSpec[]> {
    if (sent === null) return [];
    const { workshopId, productionId, setId } = order;
    const member = { workshopId, userId: sent.byUserId, role: 'designer' as const };
    const issued = await this.issued.read({ member, productionId, setId, letter: sent.revisionLetter });
    return this.issued.select(issued, sent.cushionMarks);
  }
}
