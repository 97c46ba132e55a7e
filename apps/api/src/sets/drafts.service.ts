import type { SetDocument } from '@settlewright/geometry';
import { Injectable, Logger } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, LessThanOrEqual, type Repository } from 'typeorm';
import { type CastPerson, castPerson } from '../cast/known-person';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { ProductionsService } from '../productions/productions.service';
import { DraftDto, type SaveDraftDto } from './dto/draft.dto';
import { DesignedSet } from './entities/designed-set.entity';
import { type Counts, SetDraft } from './entities/set-draft.entity';
import { readSentDocument } from './sent-document';
import { castIdsOf, SeatedPeople } from './seated-people.service';
import { SetAccess } from './set-access';

/** Drafts of a set that stay, so that a stale save can be compared with what it began from. */
const KEPT_DRAFTS = 50;

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
  ): Promise<SetDraft> {
    await this.access.forChanging(member, productionId, setId);
    const document = await this.readSent(productionId, sent);
    return this.drafts.manager.transaction(async (manager) => {
      // One statement compares, counts on and keeps other writers off until the transaction ends.
      const { affected } = await manager
        .createQueryBuilder()
        .update(DesignedSet)
        .set({ draftNumber: () => 'draft_number + 1' })
        .where('id = :setId AND draft_number = :baseNumber', { setId, baseNumber })
        .execute();
      if (affected !== 1)
        throw await this.conflict(manager, await this.access.locked(manager, setId), baseNumber);
      const number = baseNumber + 1;
      await this.keep(manager, member, { id: setId, productionId, draftNumber: number }, document);
      await manager.delete(SetDraft, { setId, number: LessThanOrEqual(number - KEPT_DRAFTS) });
      const saved = await manager.findOneOrFail(SetDraft, {
        where: { setId, number },
        relations: { savedBy: true },
        select: {
          setId: true,
          number: true,
          savedAt: true,
          savedById: true,
          savedBy: { id: true, name: true },
        },
      });
      return { ...saved, document };
    });
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
    return document;
  }

  /** The drafts in force of several sets; counts older than what they rest on are made again. */
  async withFreshCounts(productionId: string, sets: DesignedSet[]): Promise<Map<string, SetDraft>> {
    if (sets.length === 0) return new Map();
    const found = await this.drafts.find({
      where: sets.map(({ id, draftNumber }) => ({ setId: id, number: draftNumber })),
      relations: { savedBy: true },
    });
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
