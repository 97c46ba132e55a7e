import { loadRuleBook } from '@settlewright/anthropometry';
import { Injectable } from '@nestjs/common';
import { readSeedData } from '../common/seed-data';

/**
 * Raised whenever the same rules would give other numbers than before, or what is stored of a question is read
 * otherwise: parts that were worked out by two versions do not make a whole.
 */
const PROGRAMME = 1;

/** Which work a process takes on: that of servers with the same rules and the same way to work them out. */
@Injectable()
export class WorkVersion {
  readonly own: string = `${loadRuleBook(readSeedData('fit-rules')).version}-${PROGRAMME}`;
}
