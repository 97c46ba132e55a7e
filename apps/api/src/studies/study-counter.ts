import { loadRuleBook, type PartialStudy, type RuleBook } from '@settlewright/anthropometry';
import { Injectable } from '@nestjs/common';
import { readSeedData } from '../common/seed-data';
import type { Crowd } from '../populations/crowd';
import { countBlock } from './count-block';
import { studyCrowd, type StudyQuestion } from './study-question';

/** Counts blocks with the rules of this version. It keeps the crowd of the last question. */
@Injectable()
export class StudyCounter {
  readonly ruleBook: RuleBook = loadRuleBook(readSeedData('fit-rules'));
  private last: { key: string; crowd: Crowd } | undefined;

  count(question: StudyQuestion, block: number): PartialStudy {
    return countBlock(question, this.crowdOf(question), this.ruleBook, block);
  }

  crowdOf(question: Pick<StudyQuestion, 'crowd' | 'womenShare'>): Crowd {
    const key = `${question.crowd.id} ${question.womenShare ?? ''}`;
    if (this.last?.key !== key) this.last = { key, crowd: studyCrowd(question) };
    return this.last.crowd;
  }
}
