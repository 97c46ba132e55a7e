import {
  checkSet,
  createStudy,
  unlikePlaces,
  type BodyModel,
  type CheckSettings,
  type Draws,
  type FitSheet,
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
import { movingRules } from './moving-rules.ts';

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
  /** Rules that the free dimensions move and the population has no measure for; with one there is no share. */
  unknown: string[];
  /** Rules that nobody meets, in the set as it is or anywhere in the ranges that was looked at; no share counts them. */
  metByNobody: string[];
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
    const situation = measured.get(document) ?? measureSet(document, ruleBook);
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
  const probeSheet = (document: SetDocument): FitSheet =>
    checkSet({
      situation: situationOf(document),
      sitters: placesOf(document).map(({ placeId }) => ({
        id: placeId,
        name: placeId,
        kind: 'mannequin',
        placeId,
        person: model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 50 }),
      })),
      ruleBook,
      model,
      settings: document.asked,
      sittersOnly: true,
    });
  if (!crowd) return { check, counted: [], unknown: [], metByNobody: [] };

  const { draws, wear } = crowd;
  const { lensHeightMm } = input.document.asked;
  const study = createStudy(draws, {
    places: placesOf(input.document),
    ruleBook,
    wear: { women: wear, men: wear },
    ...(lensHeightMm === undefined ? {} : { lensHeightMm }),
  });
  const probes = probesOf(input);
  const told = publicRules(study, probes.map(placesOf), draws.count);
  const moved =
    told.unknown.length > 0
      ? movingRules(probeSheet(input.document), probes.map(probeSheet))
      : new Set<string>();
  const { counted, metByNobody } = told;
  const unknown = told.unknown.filter((ruleId) => moved.has(ruleId));
  study.tick({ ruleIds: counted });
  const judging = { check, counted, unknown, metByNobody };
  if (counted.length === 0 || unknown.length > 0) return judging;
  return { ...judging, share: (document) => shareOf(study.countAllAt(placesOf(document)), draws.count) };
}

const shareOf = ({ atLeastTight }: FitTally, people: number): number =>
  (atLeastTight.women + atLeastTight.men) / people;

/** The set as it is, and with each free dimension at either end and in the middle. */
function probesOf(input: Pick<SuggestInput, 'document' | 'dimensions' | 'free'>): SetDocument[] {
  const now = input.free.map(
    ({ dimensionId }) => input.dimensions.find(({ id }) => id === dimensionId)?.value ?? 0,
  );
  const ends = input.free.flatMap(({ min, max }, i) =>
    [min, (min + max) / 2, max].flatMap((end) => documentAt(input, now.with(i, end)) ?? []),
  );
  return [input.document, ...ends];
}

function publicRules(
  study: Study,
  probes: readonly Parameters<Study['countAt']>[0][],
  people: number,
): Pick<Judging, 'counted' | 'unknown' | 'metByNobody'> {
  const found = new Map<string, { least: number; most: number }>();
  const unknown = new Set<string>();
  for (const places of probes) {
    for (const { ruleId, ...tally } of study.countAt(places).checks) {
      if (tally.unknown) {
        unknown.add(ruleId);
        continue;
      }
      const share = shareOf(tally, people);
      const { least, most } = found.get(ruleId) ?? { least: share, most: share };
      found.set(ruleId, { least: Math.min(least, share), most: Math.max(most, share) });
    }
  }
  const known = [...found].filter(([ruleId]) => !unknown.has(ruleId));
  return {
    counted: known.flatMap(([ruleId, { least, most }]) => (most - least > SAME_SHARE ? [ruleId] : [])),
    unknown: [...unknown],
    metByNobody: known.flatMap(([ruleId, { most }]) => (most <= SAME_SHARE ? [ruleId] : [])),
  };
}
