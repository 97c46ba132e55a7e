import {
  bestPairs,
  castMap,
  type CastMap,
  type Dimension,
  dimensionOf,
  type LengthStyle,
  type MapRegion,
  type SetDocument,
} from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { seesMeasures } from '../cast/sees-measures';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { ProductionsService } from '../productions/productions.service';
import { RateLimits } from '../rate-limits/rate-limits.service';
import { answerFields } from './answer-fields';
import { CrowdShares } from './crowd-shares.service';
import type { AskMapDto } from './dto/asked.dto';
import type { DimensionMapDto } from './dto/dimension-map.dto';
import { DimensionDto } from './dto/story-stick.dto';
import { COARSE, fine, type Fineness, readDimension } from './tried-dimension';
import { inTurns, refuseTooMuch } from './trying';
import { type Version, type VersionPlace, VersionsService } from './versions.service';

/** Two numbers of a set tried against each other, by the functions that the browser uses. */
@Injectable()
export class DimensionMaps {
  constructor(
    private readonly versions: VersionsService,
    private readonly fit: FitCheckService,
    private readonly crowds: CrowdShares,
    private readonly productions: ProductionsService,
    private readonly limits: RateLimits,
  ) {}

  async of(member: MemberInfo, place: VersionPlace, asked: AskMapDto): Promise<DimensionMapDto> {
    const version = await this.versions.find(member, { ...place, draftNumber: asked.draftNumber });
    const { units, roundTo } = await this.productions.forReading(member, place.productionId);
    const style: LengthStyle = { system: asked.units ?? units, roundTo: asked.roundTo ?? roundTo };
    const fineness = seesMeasures(member) ? fine(style) : COARSE;
    const { document } = version;
    const { across, up } = readBoth(document, asked);
    if (fineness === COARSE) refuseUnlikeUnits(across, up);
    const crowd = await this.crowds.crowd(member, asked);
    refuseTooMuch(document, fineness.gridValues(across).length * fineness.gridValues(up).length, 'up');
    await this.limits.take('tried-sets', member.userId);
    const map = await this.map(version, { across, up, everyCheck: asked.everyCheck ?? false, fineness });
    const shares = crowd && (await this.crowds.over(crowd, document, map));
    const present = { across: across.value, up: up.value };
    return {
      detail: fineness === COARSE ? 'verdicts' : 'full',
      ...answerFields(version, this.fit.ruleBook, map.ruleIds),
      across: DimensionDto.of(across),
      up: DimensionDto.of(up),
      acrossValues: map.across,
      upValues: map.up,
      ruleIds: map.ruleIds,
      regions: map.regions.map((region) => shownRegion(region, fineness)),
      ...(shares ? { shares: { population: shares.told, fits: shares.fits } } : {}),
      best: bestPairs(map, shares?.fits, present).map(({ share, ...pair }) => ({
        ...pair,
        ...(share === undefined ? {} : { share }),
      })),
    };
  }

  private map(
    { people, confidence }: Version,
    asked: { across: Dimension; up: Dimension; everyCheck: boolean; fineness: Fineness },
  ): Promise<CastMap> {
    const { across, up, everyCheck, fineness } = asked;
    const own = [across.ruleId, up.ruleId].filter((id) => this.fit.ruleBook.rule(id).scope === 'person');
    return inTurns(
      castMap({
        across: fineness.gridValues(across),
        up: fineness.gridValues(up),
        documentAt: (first, second) => {
          const moved = across.at(first);
          return moved && up.at(second, moved);
        },
        check: (set) => this.fit.sheetFor(set, people, confidence, { sittersOnly: true }),
        shown: everyCheck || own.length === 0 ? undefined : new Set(own),
      }),
    );
  }
}

function readBoth(document: SetDocument, asked: AskMapDto): { across: Dimension; up: Dimension } {
  const across = readDimension(document, { dimension: asked.across }, 'across');
  if (asked.up === asked.across) {
    const message = `read "${asked.up}", as across; accepted: another number of the set`;
    throw Problem.invalid([{ path: 'up', code: 'same-dimension', message }]);
  }
  const up = readDimension(document, { dimension: asked.up }, 'up');
  // From the same set as the first number, as the browser does.
  const base = across.at(across.value) ?? document;
  return { across, up: dimensionOf(base, asked.up) ?? up };
}

/**
 * Lengths that move in the same step move a body from place to place in that step. With an angle or a firmness between
 * them the steps of the two interlock as those of a vernier, and a body could be read off much more finely.
 */
function refuseUnlikeUnits(across: Dimension, up: Dimension): void {
  const path = across.unit === 'mm' ? 'up' : 'across';
  const { id, unit } = path === 'up' ? up : across;
  if (unit === 'mm') return;
  const message = `read "${id}", which is no length; accepted of who sees no measures: two lengths`;
  throw Problem.invalid([{ path, code: 'two-lengths', message }]);
}

/** How much room a body has is for who sees measures. */
function shownRegion(region: MapRegion, fineness: Fineness): Omit<MapRegion, 'rooms'> & Partial<MapRegion> {
  if (fineness !== COARSE) return region;
  const { sitterId, placeId, name, states, blockedBy } = region;
  return { sitterId, placeId, name, states, ...(blockedBy === undefined ? {} : { blockedBy }) };
}
