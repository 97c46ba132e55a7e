import {
  type BodyModel,
  createBodyModel,
  type FitSheet,
  loadRuleBook,
  type RuleBook,
} from '@settlewright/anthropometry';
import {
  compareSheets,
  type ComparedCell,
  dimensionsOf,
  documentAt,
  judgeChoices,
  type Judging,
  SEARCH_PEOPLE,
  SEARCH_SEED,
  suggestDimensions,
  type SuggestInput,
  type Suggestion,
  type Tried,
} from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { readSeedData } from '../common/seed-data';
import { RecentAnswers } from '../fit-checks/recent-answers';
import { STUDY_WEAR, studyCrowd } from '../studies/study-question';
import type { CheckChange, Found, FoundAnswer, SearchQuestion } from './search-question';

/** A part of a search: what was tried anew, and what is found by then. */
export interface SearchPart {
  tried: Tried[];
  done: number;
  of: number;
  found: Found;
  ended: boolean;
}

type Ground = Pick<SuggestInput, 'document' | 'dimensions' | 'free'> & Judging & { before: FitSheet };

/** Searches whose people stay drawn between two parts. */
const PREPARED = 4;

/** Searches for dimensions part by part, with the library that the browser searches with. */
@Injectable()
export class Searcher {
  readonly ruleBook: RuleBook = loadRuleBook(readSeedData('fit-rules'));
  private readonly model: BodyModel = createBodyModel(readSeedData('populations/ansur2'));
  private readonly prepared = new RecentAnswers<Ground>(PREPARED);

  /**
   * Goes on from what is known for so many milliseconds after the first new choice, or to the end. However it is cut
   * into parts, and whoever works them out, the answers are those of one search in one go.
   */
  searchOn(id: string, question: SearchQuestion, known: readonly Tried[], partMs: number): SearchPart {
    const ground = this.prepared.get(id) ?? this.prepare(question);
    this.prepared.set(id, ground);
    const tried: Tried[] = [];
    const steps = suggestDimensions({ ...ground, known, onTried: (one) => tried.push(one) });
    let until = Infinity;
    let step = steps.next();
    while (!step.done && performance.now() < until) {
      if (tried.length > 0 && until === Infinity) until = performance.now() + partMs;
      step = steps.next();
    }
    const { done, of } = step.value;
    return { tried, done, of, found: foundOf(ground, step.value), ended: step.done === true };
  }

  private prepare({ document, free, sitters, confidence, crowd }: SearchQuestion): Ground {
    const input = { document, dimensions: dimensionsOf(document), free };
    const judging = judgeChoices(input, {
      sitters,
      ruleBook: this.ruleBook,
      model: this.model,
      settings: confidence === undefined ? {} : { confidence },
      ...(crowd
        ? { crowd: { draws: studyCrowd(crowd).draw(SEARCH_PEOPLE, SEARCH_SEED), wear: STUDY_WEAR.women } }
        : {}),
    });
    return { ...input, ...judging, before: judging.check(document) };
  }
}

function foundOf(ground: Ground, { present, answers, blame }: Suggestion): Found {
  const { counted, unknown, metByNobody } = ground;
  return {
    ...(present ? { present } : {}),
    answers: answers.map(({ kind, tried }) => ({ kind, tried, ...effectsOf(ground, tried) })),
    ...(blame ? { blame } : {}),
    counted,
    unknown,
    metByNobody,
  };
}

/** Who gains and who loses by a choice. */
function effectsOf(ground: Ground, { values }: Tried): Pick<FoundAnswer, 'sitters' | 'pieces'> {
  const document = documentAt(ground, values);
  if (!document) throw new Error('a choice that was tried cannot be made');
  const { sitters, pieces } = compareSheets(ground.before, ground.check(document));
  const withMarks = (cell: ComparedCell) => ({ ...change(cell), marks: cell.marks });
  return {
    sitters: sitters
      .map(({ sitterId, gains, losses }) => ({
        sitterId,
        gains: gains.map(change),
        losses: losses.map(change),
      }))
      .filter(({ gains, losses }) => gains.length + losses.length > 0),
    pieces: { gains: pieces.gains.map(withMarks), losses: pieces.losses.map(withMarks) },
  };
}

const change = ({ ruleId, from, to }: ComparedCell): CheckChange => ({ ruleId, from, to });
