import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { InjectSettings, type Settings } from '../config/settings';
import { countUnfinished, lastJobs, oneJob } from '../jobs/document-jobs';
import { UNFINISHED } from '../jobs/job-states';
import { WorkVersion } from '../jobs/work-version';
import { PopulationsService } from '../populations/populations.service';
import { DraftsService } from '../sets/drafts.service';
import { RevisionsService } from '../sets/revisions.service';
import { SetAccess } from '../sets/set-access';
import { askedDocument } from './asked-document';
import { resultOf } from './count-block';
import type { StartStudyDto } from './dto/start-study.dto';
import { Study } from './entities/study.entity';
import { womenPercentOf } from './read-mix';
import { readQuestion } from './read-question';
import { locked, StudyBlocks } from './study-blocks.service';
import { StudyCounter } from './study-counter';
import { blocksOf, type StudyQuestion } from './study-question';
import { StudyQueue } from './study-queue';
import { toldPopulation } from './told-population';

/** So that one workshop does not keep the others waiting. */
const MOST_UNFINISHED = 5;

/** Drawing a person, and asking all rules of one at one place: milliseconds, on a slow machine. */
const MS_PER_PERSON = 0.005;
const MS_PER_SEAT = 0.0008;

const estimatedMs = ({ people, places }: StudyQuestion): number =>
  people * (MS_PER_PERSON + MS_PER_SEAT * places.length);

@Injectable()
export class StudiesService {
  constructor(
    @InjectRepository(Study) private readonly studies: Repository<Study>,
    @InjectSettings() private readonly config: Settings,
    private readonly access: SetAccess,
    readonly drafts: DraftsService,
    readonly revisions: RevisionsService,
    private readonly populations: PopulationsService,
    private readonly counter: StudyCounter,
    private readonly blocks: StudyBlocks,
    private readonly queue: StudyQueue,
    private readonly version: WorkVersion,
    private readonly audit: AuditService,
  ) {}

  /** A short study is counted here and now, a long one by the workers. */
  async start(member: MemberInfo, productionId: string, setId: string, dto: StartStudyDto): Promise<Study> {
    await this.access.forChanging(member, productionId, setId);
    const document = await askedDocument(this, member, productionId, setId, dto);
    const crowd = await this.populations.crowd(member.workshopId, dto.populationId);
    const question = readQuestion(dto, document, crowd, {
      blockPeople: this.config.studyBlockPeople,
      workVersion: this.version.own,
    });
    const study = this.begun(member, setId, dto, question);
    const atOnce = study.blocks === 1 && estimatedMs(question) <= this.config.studyAtOnceMs;
    const id = atOnce
      ? await this.countNow(member, study, question)
      : await this.enqueue(member, study, question);
    return this.find(member, productionId, setId, id);
  }

  async list(member: MemberInfo, productionId: string, setId: string): Promise<Study[]> {
    await this.access.forReading(member, productionId, setId);
    return lastJobs(this.studies, setId, ['question', 'result']);
  }

  async find(member: MemberInfo, productionId: string, setId: string, id: string): Promise<Study> {
    await this.access.forReading(member, productionId, setId);
    const study = await oneJob(this.studies, { setId, id }, ['question']);
    if (!study) throw Problem.notFound('study');
    return study;
  }

  async cancel(member: MemberInfo, productionId: string, setId: string, id: string): Promise<Study> {
    await this.find(member, productionId, setId, id);
    await this.studies.manager.transaction(async (manager) => {
      const study = await locked(manager, id);
      if (!study) throw Problem.notFound('study');
      if (study.state === 'cancelled') return;
      if (!UNFINISHED.includes(study.state)) {
        const detail = `This study is ${study.state}; accepted: one that is queued or running.`;
        throw Problem.conflict('study-ended', detail, { state: study.state });
      }
      await this.blocks.end(manager, id, { state: 'cancelled' });
      await this.record(manager, member, 'study.cancelled', id);
    });
    return this.find(member, productionId, setId, id);
  }

  /** What is not counted yet is not counted any more. */
  async remove(member: MemberInfo, productionId: string, setId: string, id: string): Promise<void> {
    await this.find(member, productionId, setId, id);
    await this.studies.manager.transaction(async (manager) => {
      await manager.delete(Study, { id });
      await this.record(manager, member, 'study.removed', id);
    });
  }

  private begun(member: MemberInfo, setId: string, dto: StartStudyDto, question: StudyQuestion): Study {
    const { people, seed } = question;
    return this.studies.create({
      setId,
      draftNumber: dto.draftNumber ?? null,
      revisionLetter: dto.revisionLetter?.toUpperCase() ?? null,
      population: toldPopulation(question.crowd),
      womenPercent: womenPercentOf(question, dto.womenPercent),
      people,
      seed,
      ruleIds: dto.ruleIds ?? null,
      placeIds: dto.placeIds ?? null,
      ruleVersion: this.counter.ruleBook.version,
      state: 'queued',
      blocks: blocksOf(question),
      blocksDone: 0,
      question,
      result: null,
      outcome: null,
      fault: null,
      startedById: member.userId,
      endedAt: null,
    });
  }

  private async countNow(member: MemberInfo, study: Study, question: StudyQuestion): Promise<string> {
    const result = resultOf([this.counter.count(question, 0)], question, this.counter.crowdOf(question));
    const done = { state: 'done', blocksDone: 1, question: null, result, outcome: result.all } as const;
    return this.studies.manager.transaction(async (manager) => {
      const { id } = await manager.save(Object.assign(study, done, { endedAt: new Date() }));
      await this.record(manager, member, 'study.started', id);
      return id;
    });
  }

  private async enqueue(member: MemberInfo, study: Study, question: StudyQuestion): Promise<string> {
    return this.studies.manager.transaction(async (manager) => {
      await refuseTooMany(manager, member.workshopId);
      const { id, blocks } = await manager.save(study);
      await this.queue.add(
        manager,
        Array.from({ length: blocks }, (_, block) => ({ studyId: id, block })),
      );
      await this.record(manager, member, 'study.started', id, { people: question.people });
      return id;
    });
  }

  private record(
    manager: EntityManager,
    { workshopId, userId }: MemberInfo,
    action: string,
    subjectId: string,
    detail?: Record<string, unknown>,
  ): Promise<void> {
    const subject = { subjectType: 'study', subjectId, ...(detail ? { detail } : {}) };
    return this.audit.record(manager, { workshopId, userId, action, ...subject });
  }
}

/** Part of the caller's transaction. Who starts a study keeps the workshop, so that two at once are counted one by one. */
async function refuseTooMany(manager: EntityManager, workshopId: string): Promise<void> {
  await manager.query('SELECT 1 FROM workshops WHERE id = $1 FOR NO KEY UPDATE', [workshopId]);
  const unfinished = await countUnfinished(manager, Study, workshopId);
  if (unfinished < MOST_UNFINISHED) return;
  const detail = `${unfinished} studies of this workshop are not done yet; accepted: up to ${MOST_UNFINISHED} at a time.`;
  throw Problem.conflict('too-many-studies', detail);
}
