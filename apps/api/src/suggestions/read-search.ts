import type { Sitter } from '@settlewright/anthropometry';
import { measureSet, type SetDocument } from '@settlewright/geometry';
import { Problem, type ProblemField } from '../common/problem';
import type { CrowdData } from '../populations/crowd-data';
import { readMix } from '../studies/read-mix';
import { seatFaults, strangers } from '../studies/read-question';
import type { StartSuggestionDto } from './dto/start-suggestion.dto';
import { readFree } from './read-free';
import type { SearchQuestion, ToldDimension } from './search-question';

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
  const { mix, faults: mixFaults } = crowd ? readMix(crowd, dto.womenPercent) : mixOfNobody(dto);
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
    ...mixFaults,
  ];
  if (all.length > 0) throw Problem.invalid(all);
  const question: SearchQuestion = {
    workVersion,
    document,
    free,
    sitters: served,
    ...(confidence === null ? {} : { confidence }),
    ...(crowd ? { crowd: { crowd, ...mix } } : {}),
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

function mixOfNobody({ womenPercent }: StartSuggestionDto): ReturnType<typeof readMix> {
  if (womenPercent === undefined || womenPercent === null) return { mix: {}, faults: [] };
  const message = `read ${womenPercent} without a population; accepted: both, or neither`;
  return { mix: {}, faults: [{ path: 'womenPercent', code: 'no-population', message }] };
}
