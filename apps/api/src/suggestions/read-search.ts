import type { Sitter } from '@settlewright/anthropometry';
import { measureSet, type SetDocument } from '@settlewright/geometry';
import { Problem, type ProblemField } from '../common/problem';
import { crowdFrom, type CrowdData } from '../populations/crowd-data';
import { mixFaults, seatFaults, strangers } from '../studies/read-question';
import type { StartSuggestionDto } from './dto/start-suggestion.dto';
import { readFree } from './read-free';
import type { SearchQuestion, ToldDimension } from './search-question';

const EVENLY = 50;
const WHOLE = 100;
const MOST_SITTERS = 100;

/** What a search is made of besides the request. */
export interface SearchGround {
  workVersion: string;
  document: SetDocument;
  /** Everybody who sits in the document and is still there. */
  sitters: Sitter[];
  crowd: CrowdData | undefined;
  confidence: number | null;
  /** Rounding step of lengths. */
  lengthStepMm: number;
}

/** What is to be searched, or everything in the request that keeps it from being searched. */
export function readSearch(
  dto: StartSuggestionDto,
  { workVersion, document, sitters, crowd, confidence, lengthStepMm }: SearchGround,
): { question: SearchQuestion; told: ToldDimension[] } {
  const { free, told, faults } = readFree(dto.free, document, lengthStepMm);
  const wanted = dto.sitterIds ?? undefined;
  const served = wanted ? sitters.filter(({ id }) => wanted.includes(id)) : sitters;
  const groups = crowd ? crowdFrom(crowd).groups.map(({ group }) => group) : [];
  const all = [
    ...faults,
    ...seatFaults('free', measureSet(document).places),
    ...strangers(
      'sitterIds',
      wanted,
      [...new Set(sitters.map(({ id }) => id))],
      'nobody who sits here has the id',
    ),
    ...sitterFaults(served, crowd),
    ...(crowd ? mixFaults(dto.womenPercent ?? undefined, groups) : mixOfNobody(dto)),
  ];
  if (all.length > 0) throw Problem.invalid(all);
  const womenShare = groups.length > 1 ? (dto.womenPercent ?? EVENLY) / WHOLE : undefined;
  const question: SearchQuestion = {
    workVersion,
    document,
    free,
    sitters: served,
    ...(confidence === null ? {} : { confidence }),
    ...(crowd ? { crowd: { crowd, ...(womenShare === undefined ? {} : { womenShare }) } } : {}),
  };
  return { question, told };
}

function sitterFaults(served: readonly Sitter[], crowd: CrowdData | undefined): ProblemField[] {
  if (served.length > MOST_SITTERS) {
    const message = `${served.length} people sit here; accepted: up to ${MOST_SITTERS} of them`;
    return [{ path: 'sitterIds', code: 'too-many-sitters', message }];
  }
  if (served.length > 0 || crowd) return [];
  const message = 'nobody is to be served; accepted: somebody who sits here, or a population';
  return [{ path: 'sitterIds', code: 'nobody-to-serve', message }];
}

function mixOfNobody({ womenPercent }: StartSuggestionDto): ProblemField[] {
  if (womenPercent === undefined || womenPercent === null) return [];
  const message = `read ${womenPercent} without a population; accepted: both, or neither`;
  return [{ path: 'womenPercent', code: 'no-population', message }];
}
