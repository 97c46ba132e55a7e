import { lengthStep } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, In, type Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import { CastService } from '../cast/cast.service';
import { castPerson } from '../cast/known-person';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { digest } from '../fit-checks/recent-answers';
import { lastJobs, oneJob } from '../jobs/document-jobs';
import { UNFINISHED } from '../jobs/job-states';
import { WorkVersion } from '../jobs/work-version';
import { PopulationsService } from '../populations/populations.service';
import { ProductionsService } from '../productions/productions.service';
import { DraftsService } from '../sets/drafts.service';
import { RevisionsService } from '../sets/revisions.service';
import { castIdsOf } from '../sets/seated-people.service';
import { SetAccess } from '../sets/set-access';
import { askedDocument } from '../studies/asked-document';
import type { StartSuggestionDto } from './dto/start-suggestion.dto';
import { ListedSuggestionDto, SuggestionDto } from './dto/suggestion.dto';
import { DimensionSearch } from './entities/dimension-search.entity';
import { readSearch } from './read-search';
import { begunSearch, endSearch, locked, makeRoom } from './search-rows';
import { SearchQueue } from './search-queue';

@Injectable()
export class SuggestionsService {
  constructor(
    @InjectRepository(DimensionSearch) private readonly searches: Repository<DimensionSearch>,
    private readonly access: SetAccess,
    readonly drafts: DraftsService,
    readonly revisions: RevisionsService,
    private readonly productions: ProductionsService,
    private readonly populations: PopulationsService,
    private readonly cast: CastService,
    private readonly fit: FitCheckService,
    private readonly queue: SearchQueue,
    private readonly version: WorkVersion,
    private readonly audit: AuditService,
  ) {}

  /** Puts the search in the queue; the same one, while it is not done, is answered and not begun again. */
  async start(
    member: MemberInfo,
    productionId: string,
    setId: string,
    dto: StartSuggestionDto,
  ): Promise<SuggestionDto> {
    const { production } = await this.access.forChanging(member, productionId, setId);
    if (!production) throw new Error(`set ${setId} has no production`);
    const document = await askedDocument(this, member, productionId, setId, dto);
    const crowd = dto.populationId
      ? await this.populations.crowd(member.workshopId, dto.populationId)
      : undefined;
    const { confidence } = await this.productions.workshopOf(productionId);
    const id = await this.searches.manager.transaction(async (manager) => {
      // Somebody who is being erased must not be searched for a moment later.
      await this.productions.lockPeople(manager, productionId);
      const people = await this.cast.among(productionId, castIdsOf(document), manager);
      const there = people.filter(({ removedAt }) => removedAt === null).map(castPerson);
      const { question, told } = readSearch(dto, {
        workVersion: this.version.own,
        document,
        sitters: this.fit.sitters(document, there),
        crowd,
        confidence,
        lengthStepMm: lengthStep({ system: production.units, roundTo: production.roundTo }),
      });
      const same = { setId, digest: digest(question), state: In([...UNFINISHED]) };
      await manager.query('SELECT 1 FROM workshops WHERE id = $1 FOR NO KEY UPDATE', [member.workshopId]);
      const running = await manager.findOne(DimensionSearch, { where: same, select: { id: true } });
      if (running) return running.id;
      await makeRoom(manager, member.workshopId, setId);
      const row = begunSearch(member, setId, dto, { question, told, digest: same.digest });
      const begun = await manager.save(
        manager.create(DimensionSearch, { ...row, ruleVersion: this.fit.ruleBook.version }),
      );
      await this.queue.add(manager, [{ searchId: begun.id, part: 0 }]);
      await this.record(manager, member, 'suggestion.started', begun.id);
      return begun.id;
    });
    return this.get(member, productionId, setId, id);
  }

  async list(member: MemberInfo, productionId: string, setId: string): Promise<ListedSuggestionDto[]> {
    await this.access.forReading(member, productionId, setId);
    const found = await lastJobs(this.searches, setId, ['question', 'found']);
    const names = await this.names(productionId, found);
    return found.map((search) => ListedSuggestionDto.of(search, names));
  }

  async get(member: MemberInfo, productionId: string, setId: string, id: string): Promise<SuggestionDto> {
    await this.access.forReading(member, productionId, setId);
    const search = await oneJob(this.searches, { setId, id }, ['question']);
    if (!search) throw Problem.notFound('search for dimensions');
    return SuggestionDto.for(member, search, await this.names(productionId, [search]));
  }

  /** The worker notices at the end of the part it is at; what was found by then stays. */
  async cancel(member: MemberInfo, productionId: string, setId: string, id: string): Promise<SuggestionDto> {
    await this.get(member, productionId, setId, id);
    await this.searches.manager.transaction(async (manager) => {
      const search = await locked(manager, id);
      if (!search) throw Problem.notFound('search for dimensions');
      if (search.state === 'cancelled') return;
      if (!UNFINISHED.includes(search.state)) {
        const detail = `This search is ${search.state}; accepted: one that is queued or running.`;
        throw Problem.conflict('search-ended', detail, { state: search.state });
      }
      await endSearch(manager, id, { state: 'cancelled' });
      await this.record(manager, member, 'suggestion.cancelled', id);
    });
    return this.get(member, productionId, setId, id);
  }

  async remove(member: MemberInfo, productionId: string, setId: string, id: string): Promise<void> {
    await this.get(member, productionId, setId, id);
    await this.searches.manager.transaction(async (manager) => {
      await manager.delete(DimensionSearch, { id });
      await this.record(manager, member, 'suggestion.removed', id);
    });
  }

  /** As the cast has them now: an erased person is no longer named. */
  private async names(productionId: string, searches: DimensionSearch[]): Promise<Map<string, string>> {
    const served = searches.flatMap((search) => search.served);
    const ids = served.flatMap(({ kind, id }) => (kind === 'cast' ? [id] : []));
    const people = await this.cast.among(productionId, [...new Set(ids)]);
    return new Map(people.map(({ id, name }) => [id, name]));
  }

  private record(
    manager: EntityManager,
    { workshopId, userId }: MemberInfo,
    action: string,
    subjectId: string,
  ): Promise<void> {
    return this.audit.record(manager, { workshopId, userId, action, subjectType: 'suggestion', subjectId });
  }
}
