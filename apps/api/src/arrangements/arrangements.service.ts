import { carriedPieces, type SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { readSentDocument } from '../sets/sent-document';
import { WorkshopsService } from '../workshops/workshops.service';
import type { KeepArrangementDto } from './arrangement.dto';
import { KeptArrangement } from './kept-arrangement.entity';

/** As many as one list shows. */
const MOST = 200;

@Injectable()
export class ArrangementsService {
  constructor(
    @InjectRepository(KeptArrangement) private readonly arrangements: Repository<KeptArrangement>,
    private readonly workshops: WorkshopsService,
    private readonly audit: AuditService,
  ) {}

  list(workshopId: string, page: PageQuery): Promise<Page<KeptArrangement>> {
    const query = this.arrangements
      .createQueryBuilder('arrangement')
      .where('arrangement.workshopId = :workshopId', { workshopId });
    return readPage(query, page, {
      sortable: { name: 'arrangement.name', keptAt: 'arrangement.keptAt' },
      defaultSort: 'name',
      tieBreak: 'arrangement.id',
      searchIn: ['arrangement.name'],
    });
  }

  async keep(member: MemberInfo, { name, document }: KeepArrangementDto): Promise<KeptArrangement> {
    const pieces = piecesAlone(readSentDocument(document));
    const { workshopId } = member;
    return this.arrangements.manager.transaction(async (manager) => {
      // Two who keep one at once are counted one after the other.
      await this.workshops.lock(manager, workshopId);
      if ((await manager.countBy(KeptArrangement, { workshopId })) >= MOST) {
        const message = `a workshop keeps at most ${MOST} arrangements; take one off the list first`;
        throw Problem.invalid([{ path: 'name', code: 'too-many', message }]);
      }
      const kept = await manager.save(
        manager.create(KeptArrangement, { workshopId, name, document: pieces, keptById: member.userId }),
      );
      await this.record(manager, member, 'arrangement.kept', kept.id);
      return kept;
    });
  }

  async remove(member: MemberInfo, id: string): Promise<void> {
    await this.arrangements.manager.transaction(async (manager) => {
      const { affected } = await manager.delete(KeptArrangement, { id, workshopId: member.workshopId });
      if (!affected) throw Problem.notFound('arrangement');
      await this.record(manager, member, 'arrangement.removed', id);
    });
  }

  private record(manager: EntityManager, member: MemberInfo, action: string, id: string): Promise<void> {
    const { workshopId, userId } = member;
    return this.audit.record(manager, {
      workshopId,
      userId,
      action,
      subjectType: 'arrangement',
      subjectId: id,
    });
  }
}

/** The pieces of a document and what was chosen of their cushions; people, views and tapes stay behind. */
function piecesAlone(sent: SetDocument): SetDocument {
  if (sent.pieces.length === 0) {
    const message = 'an arrangement has at least one piece';
    throw Problem.invalid([{ path: 'document.pieces', code: 'empty', message }]);
  }
  const carried = carriedPieces(
    sent,
    sent.pieces.map(({ id }) => id),
  );
  return { ...carried, seating: [] };
}
