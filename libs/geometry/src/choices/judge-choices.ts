import {
  checkSet,
  createStudy,
  unlikePlaces,
  type BodyModel,
  type CheckSettings,
  type Draws,
  type FitTally,
  type RuleBook,
  type SetSituation,
  type Sitter,
  type Study,
  type Wear,
} from '@settlewright/anthropometry';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';
import { documentAt, type SuggestInput } from './candidates.ts';

/** Whom a choice of dimensions has to serve. */
export interface Served {
  /** Everyone who is named. */
  sitters: readonly Sitter[];
  ruleBook: RuleBook;
  model: BodyModel;
  /** Settings of the checks besides what the set itself asks. */
  settings?: Pick<CheckSettings, 'confidence'>;
  /** After everyone named, as many as can be of these people. */
  crowd?: { draws: Draws; wear: Wear };
}

/** How choices are judged. */
export interface Judging extends Pick<SuggestInput, 'check' | 'share'> {
  /** Rules that a share counts at once: those that the free dimensions move, and that somebody meets. */
  counted: string[];
}

/** Shares closer than this are the same, and a rule met by fewer is met by nobody. */
const SAME_SHARE = 0.005;

/**
 * Judges sets by the sheet of everyone named, and by the share of a population that is at least tight, too.
 *
 * @param input - the set, its dimensions and the free ones
 * @param served - whom the choice has to serve
 * @returns the check of a set, and with a crowd the share of it that is at least tight, 0 to 1
 * @throws RangeError when a sitter's known values are not positive numbers
 */
export function judgeChoices(
  input: Pick<SuggestInput, 'document' | 'dimensions' | 'free'>,
  { sitters, ruleBook, model, settings, crowd }: Served,
): Judging {
  const measured = new WeakMap<SetDocument, SetSituation>();
  const situationOf = (document: SetDocument): SetSituation => {
    const situation = measured.get(document) ?? measureSet(document);
    measured.set(document, situation);
    return situation;
  };
  const placesOf = (document: SetDocument) => unlikePlaces(situationOf(document).places);
  const check: SuggestInput['check'] = (document) =>
    checkSet({
      situation: situationOf(document),
      sitters,
      ruleBook,
      model,
      settings: { ...document.asked, ...settings },
      sittersOnly: true,
    });
  if (!crowd) return { check, counted: [] };

  const { draws, wear } = crowd;
  const { lensHeightMm } = input.document.asked;
  const study = createStudy(draws, {
    places: placesOf(input.document),
    ruleBook,
    wear: { women: wear, men: wear },
    ...(lensHeightMm === undefined ? {} : { lensHeightMm }),
  });
  const counted = countedRules(study, probesOf(input).map(placesOf), draws.count);
  study.tick({ ruleIds: counted });
  if (counted.length === 0) return { check, counted };
  return { check, counted, share: (document) => shareOf(study.countAllAt(placesOf(document)), draws.count) };
}

const shareOf = ({ atLeastTight }: FitTally, people: number): number =>
  (atLeastTight.women + atLeastTight.men) / people;

/** The set as it is, and with each free dimension at either end. */
function probesOf(input: Pick<SuggestInput, 'document' | 'dimensions' | 'free'>): SetDocument[] {
  const now = input.free.map(
    ({ dimensionId }) => input.dimensions.find(({ id }) => id === dimensionId)?.value ?? 0,
  );
  const ends = input.free.flatMap(({ min, max }, i) =>
    [min, max].flatMap((end) => documentAt(input, now.with(i, end)) ?? []),
  );
  return [input.document, ...ends];
}

function countedRules(
  study: Study,
  probes: readonly Parameters<Study['countAt']>[0][],
  people: number,
): string[] {
  const found = new Map<string, { least: number; most: number }>();
  for (const places of probes) {
    for (const { ruleId, ...tally } of study.countAt(places).checks) {
      if (tally.unknown) continue;
      const share = shareOf(tally, people);
      const { least, most } = found.get(ruleId) ?? { least: share, most: share };
      found.set(ruleId, { least: Math.min(least, share), most: Math.max(most, share) });
    }
  }
  return [...found].flatMap(([ruleId, { least, most }]) => (most - least > SAME_SHARE ? [ruleId] : []));
}
