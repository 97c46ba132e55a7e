import { loadRuleBook, type PartialStudy, type Population, type RuleBook } from '@settlewright/anthropometry';
import { Injectable } from '@nestjs/common';
import { readSeedData } from '../common/seed-data';
import { countBlock } from './count-block';
import { studyCrowd, type StudyQuestion } from './study-question';

/** Counts blocks with the rules of this version. It keeps the crowd of the last question. */
@Injectable()
export class StudyCounter {
  readonly ruleBook: RuleBook = loadRuleBook(readSeedData('fit-rules'));
  private last: { key: string; crowd: Population } | undefined;

  count(question: StudyQuestion, block: number): PartialStudy {
    return countBlock(question, this.crowdOf(question), this.ruleBook, block);
  }

  crowdOf(question: Pick<StudyQuestion, 'crowd' | 'womenShare'>): Population {
    const key = `${question.crowd.id} ${question.womenShare ?? ''}`;
    if (this.last?.key !== key) this.last = { key, crowd: studyCrowd(question) };
    return this.last.crowd;
  }
}
