import type { SetDocument } from '@settlewright/geometry';
import { Injectable, Logger } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { type CastPerson, castPerson } from '../cast/known-person';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { ProductionsService } from '../productions/productions.service';
import { DraftDto, type SaveDraftDto } from './dto/draft.dto';
import { DesignedSet } from './entities/designed-set.entity';
import { type Counts, SetDraft } from './entities/set-draft.entity';
import { readSentDocument } from './sent-document';
import { type DraftInForce, draftsInForce } from './drafts-in-force';
import { type SavedDraft, saveDraft } from './save-draft';
import { castIdsOf, SeatedPeople } from './seated-people.service';
import { SetAccess } from './set-access';

@Injectable()
export class DraftsService {
  private readonly logger = new Logger(DraftsService.name);

  constructor(
    @InjectRepository(SetDraft) private readonly drafts: Repository<SetDraft>,
    private readonly access: SetAccess,
    private readonly people: SeatedPeople,
    private readonly fit: FitCheckService,
    private readonly productions: ProductionsService,
  ) {}

  async get(member: MemberInfo, productionId: string, setId: string): Promise<SetDraft> {
    return this.inForce(await this.access.forReading(member, productionId, setId));
  }

  async save(
    member: MemberInfo,
    productionId: string,
    setId: string,
    { baseNumber, document: sent }: SaveDraftDto,
  ): Promise<SavedDraft> {
    const document = readSentDocument(sent);
    const place = { productionId, setId, baseNumber };
    const saved = await saveDraft(this.drafts.manager.dataSource, member, place, document);
    if (saved) return saved;
    await this.access.forChanging(member, productionId, setId);
    await this.refuseStrangers(productionId, document);
    throw await this.drafts.manager.transaction(async (manager) =>
      this.conflict(manager, await this.access.locked(manager, setId), baseNumber),
    );
  }

  /** The draft that a set stands at. */
  inForce(set: DesignedSet, manager = this.drafts.manager): Promise<SetDraft> {
    return find(manager, set.id, set.draftNumber);
  }

  /** Part of the caller's transaction: stores the document under the set's number. */
  async keep(
    manager: EntityManager,
    member: MemberInfo,
    set: Pick<DesignedSet, 'id' | 'productionId' | 'draftNumber'>,
    document: SetDocument,
  ): Promise<void> {
    await manager.insert(SetDraft, {
      setId: set.id,
      number: set.draftNumber,
      document,
      // Counted when somebody looks at the list: far fewer look than save.
      counts: null,
      countedAt: new Date(0),
      savedById: member.userId,
    });
  }

  /** A document somebody sent: read, and everyone at its places belongs to the production. */
  async readSent(productionId: string, sent: unknown): Promise<SetDocument> {
    const document = readSentDocument(sent);
    await this.refuseStrangers(productionId, document);
    return document;
  }

  private async refuseStrangers(productionId: string, document: SetDocument): Promise<void> {
    const known = new Set((await this.people.of(productionId, [document])).map(({ id }) => id));
    const strangers = document.seating.flatMap(({ sitter }, index) =>
      sitter.kind === 'cast' && !known.has(sitter.castId)
        ? [
            {
              path: `document.seating.${index}.sitter.castId`,
              code: 'unknown-cast-member',
              message: `nobody in this production has the id ${sitter.castId}`,
            },
          ]
        : [],
    );
    if (strangers.length > 0) throw Problem.invalid(strangers);
  }

  /** The drafts in force of several sets; counts older than what they rest on are made again. */
  async withFreshCounts(productionId: string, setIds: string[]): Promise<Map<string, DraftInForce>> {
    if (setIds.length === 0) return new Map();
    const found = await draftsInForce(this.drafts.manager.dataSource, setIds);
    const people = await this.people.of(
      productionId,
      found.map(({ document }) => document),
    );
    const { confidence, confidenceSetAt } = await this.productions.workshopOf(productionId);
    const setAt = confidenceSetAt?.getTime() ?? 0;
    for (const draft of found) {
      const ids = new Set(castIdsOf(draft.document));
      const changes = people.filter(({ id }) => ids.has(id)).map(({ updatedAt }) => updatedAt.getTime());
      const changedAt = Math.max(draft.savedAt.getTime(), setAt, ...changes);
      if (draft.countedAt.getTime() >= changedAt) continue;
      draft.counts = this.countsOf(draft.document, people.map(castPerson), confidence);
      draft.countedAt = new Date(changedAt);
      const { setId, number, counts, countedAt } = draft;
      await this.drafts.update({ setId, number }, { counts, countedAt });
    }
    return new Map(found.map((draft) => [draft.setId, draft]));
  }

  /** A list is never lost because the checks of one set could not be made. */
  private countsOf(document: SetDocument, people: CastPerson[], confidence: number | null): Counts | null {
    try {
      return this.fit.sheetFor(document, people, confidence).counts;
    } catch (fault) {
      this.logger.error(fault instanceof Error ? fault.stack : fault);
      return null;
    }
  }

  private async conflict(manager: EntityManager, set: DesignedSet, baseNumber: number): Promise<Problem> {
    const current = await this.inForce(set, manager);
    const base = await manager.findOneBy(SetDraft, { setId: set.id, number: baseNumber });
    return Problem.conflict(
      'draft-conflict',
      `Draft ${baseNumber} is no longer the newest: ${current.savedBy?.name ?? 'somebody'} saved draft ${set.draftNumber}.`,
      { current: DraftDto.of(current), base: base && { number: base.number, document: base.document } },
    );
  }
}

function find(manager: EntityManager, setId: string, number: number): Promise<SetDraft> {
  return manager.findOneOrFail(SetDraft, { where: { setId, number }, relations: { savedBy: true } });
}
