import { PERSON_CHECKS, unlikePlaces, type PlaceSituation } from '@settlewright/anthropometry';
import { measureSet, type SetDocument } from '@settlewright/geometry';
import { Problem, type ProblemField } from '../common/problem';
import type { CrowdData } from '../populations/crowd-data';
import type { StartStudyDto } from './dto/start-study.dto';
import { readMix } from './read-mix';
import type { StudyQuestion } from './study-question';

/** Places alike are counted once; of so many unlike ones a block of people still takes seconds. */
const MOST_UNLIKE_PLACES = 200;

/** What is to be counted, or everything in the request that keeps it from being counted. */
export function readQuestion(
  dto: StartStudyDto,
  document: SetDocument,
  crowd: CrowdData,
  { blockPeople, workVersion }: Pick<StudyQuestion, 'blockPeople' | 'workVersion'>,
): StudyQuestion {
  const { places } = measureSet(document);
  const { mix, faults: mixFaults } = readMix(crowd, dto.womenPercent);
  const faults = [
    ...placeFaults(dto.placeIds, places),
    ...strangers('ruleIds', dto.ruleIds, [...RULES], 'no rule asked of one sitter has the id'),
    ...mixFaults,
  ];
  if (faults.length > 0) throw Problem.invalid(faults);
  const { people, ruleIds, placeIds } = dto;
  const { lensHeightMm } = document.asked;
  return {
    workVersion,
    crowd,
    ...mix,
    people,
    seed: dto.seed ?? 1,
    blockPeople,
    places,
    ...(lensHeightMm === undefined ? {} : { lensHeightMm }),
    ticked: { ...(ruleIds ? { ruleIds } : {}), ...(placeIds ? { placeIds } : {}) },
  };
}

const RULES = PERSON_CHECKS.map(({ id }) => id);

function placeFaults(asked: string[] | undefined, places: PlaceSituation[]): ProblemField[] {
  const none = seatFaults('placeIds', places);
  if (none.length > 0) return none;
  const ids = places.map(({ placeId }) => placeId);
  return strangers('placeIds', asked, ids, 'no place of the set has the id');
}

/** A set without a place, or with more kinds of them than are counted. */
export function seatFaults(path: string, places: PlaceSituation[]): ProblemField[] {
  if (places.length === 0) {
    const message = 'the set has no place to sit at; accepted: a set with a bench or a loose seat';
    return [{ path, code: 'no-places', message }];
  }
  const unlike = unlikePlaces(places).length;
  if (unlike <= MOST_UNLIKE_PLACES) return [];
  const message = `the set has ${unlike} kinds of places; accepted: up to ${MOST_UNLIKE_PLACES}`;
  return [{ path, code: 'too-many-places', message }];
}

/** Ids that name nothing. */
export function strangers(
  path: string,
  asked: readonly string[] | undefined,
  known: readonly string[],
  words: string,
): ProblemField[] {
  return (asked ?? []).flatMap((id, at) =>
    known.includes(id)
      ? []
      : [
          {
            path: `${path}.${at}`,
            code: 'unknown',
            message: `${words} "${id}"; accepted: ${known.slice(0, 60).join(', ')}`,
          },
        ],
  );
}
