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

  /** @throws Error when the study was begun with other rules: its blocks would not add up */
  count(question: StudyQuestion, block: number): PartialStudy {
    const otherRules = this.otherRules(question);
    if (otherRules) throw new Error(otherRules);
    return countBlock(question, this.crowdOf(question), this.ruleBook, block);
  }

  /** Says that a study was begun with another version of the rules; nothing when it was this one. */
  otherRules({ ruleVersion }: Pick<StudyQuestion, 'ruleVersion'>): string | undefined {
    const own = this.ruleBook.version;
    if (ruleVersion === own) return undefined;
    return `It was begun with version ${ruleVersion} of the fit rules, and version ${own} is in use now: count it again.`;
  }

  crowdOf(question: Pick<StudyQuestion, 'crowd' | 'womenShare'>): Population {
    const key = `${question.crowd.id} ${question.womenShare ?? ''}`;
    if (this.last?.key !== key) this.last = { key, crowd: studyCrowd(question) };
    return this.last.crowd;
  }
}
