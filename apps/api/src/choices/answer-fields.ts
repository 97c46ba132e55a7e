import type { RuleBook } from '@settlewright/anthropometry';
import { CAUTION } from '../fit-checks/shown-sheet';
import type { ChoiceAnswerDto, VersionStateDto } from './dto/choice-answer.dto';
import { shownRules } from './shown-rules';
import type { Version } from './versions.service';

/** Which version an answer is about. */
export const versionState = ({ state }: Pick<Version, 'state'>): VersionStateDto =>
  state.kind === 'draft' ? { draftNumber: state.number } : { revisionLetter: state.letter };

/** What every answer about one version says of itself; `ruleIds` are the rules that it was given by. */
export const answerFields = (
  version: Pick<Version, 'state' | 'confidence'>,
  ruleBook: RuleBook,
  ruleIds: Iterable<string>,
): ChoiceAnswerDto & { confidence: number } => ({
  version: versionState(version),
  rules: shownRules(ruleBook, ruleIds),
  confidence: version.confidence ?? ruleBook.confidence,
  ruleVersion: ruleBook.version,
  caution: CAUTION,
});
