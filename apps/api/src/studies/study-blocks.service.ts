import type { PartialStudy } from '@settlewright/anthropometry';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { ABANDONED, abandonedIds } from '../jobs/abandoned';
import { UNFINISHED } from '../jobs/job-states';
import { WorkVersion } from '../jobs/work-version';
import { studyCrowd, type StudyQuestion } from './study-question';
import { resultOf } from './count-block';
import { StudyBlock } from './entities/study-block.entity';
import { Study } from './entities/study.entity';

/** Keeps what was counted, each block once, and puts the study together when the last one is in. */
@Injectable()
export class StudyBlocks {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly version: WorkVersion,
  ) {}

  /** What is to be counted; nothing when the study is gone, ended, or has this block already. */
  async question(studyId: string, block: number): Promise<StudyQuestion | undefined> {
    const { manager } = this.dataSource;
    const study = await manager.findOneBy(Study, { id: studyId });
    if (!study?.question || !UNFINISHED.includes(study.state)) return undefined;
    return (await manager.existsBy(StudyBlock, { studyId, block })) ? undefined : study.question;
  }

  async keep(studyId: string, block: number, counts: PartialStudy): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      const study = await locked(manager, studyId);
      if (!study?.question || !UNFINISHED.includes(study.state)) return;
      const added: unknown[] = await manager.query(
        `INSERT INTO study_blocks (study_id, block, counts) VALUES ($1, $2, $3)
         ON CONFLICT DO NOTHING RETURNING block`,
        [studyId, block, counts],
      );
      if (added.length === 0) return;
      const blocksDone = study.blocksDone + 1;
      if (blocksDone < study.blocks) {
        await manager.update(Study, { id: studyId }, { blocksDone, state: 'running' });
        return;
      }
      const all = await manager.findBy(StudyBlock, { studyId });
      const result = resultOf(
        all.map((one) => one.counts),
        study.question,
        studyCrowd(study.question),
      );
      const ended = { state: 'done', blocksDone, result, outcome: result.all } as const;
      await this.end(manager, studyId, ended);
    });
  }

  /** A block cannot be counted, so there is no whole. */
  async fail(studyId: string, fault: string): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      const study = await locked(manager, studyId);
      if (study && UNFINISHED.includes(study.state)) {
        await this.end(manager, studyId, { state: 'failed', fault });
      }
    });
  }

  /** Studies that no worker of their version came for. */
  async failAbandoned(): Promise<void> {
    for (const id of await abandonedIds(this.dataSource.manager, Study, this.version.own)) {
      await this.fail(id, ABANDONED);
    }
  }

  /** Part of the caller's transaction: the study is over, and what was only needed to count it goes. */
  async end(manager: EntityManager, studyId: string, changes: Partial<Study>): Promise<void> {
    await manager.delete(StudyBlock, { studyId });
    const ended = { ...changes, question: null, endedAt: new Date() };
    await manager.save(Study, { id: studyId, ...ended });
  }
}

/** The study, kept from other writers until the transaction ends. */
export function locked(manager: EntityManager, id: string): Promise<Study | null> {
  return manager.findOne(Study, { where: { id }, lock: { mode: 'pessimistic_write' } });
}
