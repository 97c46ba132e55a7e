import {
  createBodyModel,
  loadRuleBook,
  type BodyModel,
  type Draws,
  type RuleBook,
  type Sitter,
} from '@settlewright/anthropometry';
import {
  dimensionsOf,
  judgeChoices,
  SEARCH_PEOPLE,
  SEARCH_SEED,
  suggestDimensions,
  type FreeDimension,
  type SetDocument,
  type Suggestion,
  type Tried,
} from '@settlewright/geometry';
import type { CrowdTold } from '@/lib/crowd/crowd-tasks.ts';
import { peopleOf, type CrowdRequest } from '@/lib/crowd/crowd-people.ts';
import { CROWD_WEAR } from '@/lib/crowd/crowds.ts';

/** What a search is asked; plain JSON, for it goes to a worker. */
export interface SearchAsked {
  document: SetDocument;
  free: FreeDimension[];
  /** Everyone who must be served. */
  sitters: Sitter[];
  /** Probability from which verdicts are given. */
  confidence: number;
  /** After them, as many as can be of these people; absent where nobody else is asked about. */
  crowd?: CrowdRequest;
  /** What an earlier run of the same search tried. */
  known: Tried[];
}

/** What a search says now and then. */
export interface SearchTold {
  suggestion: Suggestion;
  /** Choices that were tried since it last spoke. */
  tried: Tried[];
  /** Rules that the share counts at once, that its people are not known by, and that nobody meets. */
  counted: string[];
  unknown: string[];
  metByNobody: string[];
  people?: CrowdTold;
  ended: boolean;
}

/** How long it works before it speaks again, milliseconds. */
const SPEAK_EVERY_MS = 250;

interface Ground {
  model: BodyModel;
  ruleBook: RuleBook;
}

/** Body statistics and rules: data with their sources, fetched when the first search starts. */
async function fetchGround(): Promise<Ground> {
  const [summary, rules] = await Promise.all([
    import('@settlewright/seed-data/populations/ansur2.json'),
    import('@settlewright/seed-data/fit-rules.json'),
  ]);
  return { model: createBodyModel(summary.default), ruleBook: loadRuleBook(rules.default) };
}

async function drawn(request: CrowdRequest): Promise<{ draws: Draws; told: CrowdTold }> {
  const people = await peopleOf(request);
  const { name, source, cautions } = people;
  return { draws: people.draw(SEARCH_PEOPLE, SEARCH_SEED), told: { name, source, cautions: [...cautions] } };
}

/**
 * Searches for dimensions and speaks of what it has found now and then.
 *
 * @param asked - the set, what may move, and whom to serve
 * @param speak - hears of the first choice at once, then of the state several times a second, and of the end
 * @param now - clock, milliseconds
 * @throws Error when there is no such population or the rules cannot be read
 */
export async function search(
  asked: SearchAsked,
  speak: (told: SearchTold) => void,
  now: () => number = () => performance.now(),
): Promise<void> {
  const { document, free, sitters, confidence, crowd, known } = asked;
  const [ground, people] = await Promise.all([fetchGround(), crowd ? drawn(crowd) : undefined]);
  const input = { document, dimensions: dimensionsOf(document), free };
  const { counted, unknown, metByNobody, ...judging } = judgeChoices(input, {
    ...ground,
    sitters,
    settings: { confidence },
    ...(people ? { crowd: { draws: people.draws, wear: CROWD_WEAR } } : {}),
  });
  let tried: Tried[] = [];
  const tell = (suggestion: Suggestion, ended: boolean): void => {
    const rules = { counted, unknown, metByNobody };
    speak({ suggestion, tried, ...rules, ...(people ? { people: people.told } : {}), ended });
    tried = [];
  };
  const steps = suggestDimensions({ ...input, ...judging, known, onTried: (one) => tried.push(one) });
  let spoken = -Infinity;
  for (let step = steps.next(); ; step = steps.next()) {
    if (step.done) {
      tell(step.value, true);
      return;
    }
    if (now() - spoken >= SPEAK_EVERY_MS) {
      tell(step.value, false);
      spoken = now();
    }
  }
}
