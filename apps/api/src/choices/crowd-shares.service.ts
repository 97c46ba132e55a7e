import { setImmediate } from 'node:timers/promises';
import {
  createStudy,
  curveOf,
  type FitTally,
  mapOf,
  type PlaceSituation,
  type Population,
  type Study,
  type Tally,
} from '@settlewright/anthropometry';
import { changingPlaces, type SetDocument } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { crowdFrom } from '../populations/crowd-data';
import { PopulationsService } from '../populations/populations.service';
import { readMix, womenPercentOf } from '../studies/read-mix';
import { STUDY_WEAR, studyCrowd } from '../studies/study-question';

/** Whom a share is about; no shares are asked for when no population is named. */
interface AskedCrowd {
  populationId?: string | undefined;
  womenPercent?: number | undefined;
}

/** A share of all counted rules at once, 0 to 1; absent where a measure that is read is not known of the people. */
export interface Share {
  fits?: number;
  atLeastTight?: number;
}

export interface CrowdTold {
  id: string;
  name: string;
  source: string;
  cautions: string[];
  /** Absent for a population of one sex. */
  womenPercent?: number;
  people: number;
  /** Places that move; a person counts who fits at all of them. */
  placeIds: string[];
}

/** As many as the browser asks, and the same ones. */
const CURVE_PEOPLE = 10_000;
const MAP_PEOPLE = 4000;
const SEED = 1;
const MOST_PLACES = 100;

/** Counts who of a population fits, along one dimension and over two, as the browser does. */
@Injectable()
export class CrowdShares {
  constructor(
    private readonly populations: PopulationsService,
    private readonly fit: FitCheckService,
  ) {}

  /** The people that are meant, or what is wrong with the request. */
  async crowd(
    member: MemberInfo,
    { populationId, womenPercent }: AskedCrowd,
  ): Promise<NamedCrowd | undefined> {
    if (populationId === undefined) return undefined;
    const data = await this.populations.crowd(member.workshopId, populationId);
    const { mix, faults } = readMix(data, womenPercent);
    if (faults.length > 0) throw Problem.invalid(faults);
    const percent = womenPercentOf(mix, womenPercent);
    return {
      id: populationId,
      name: crowdFrom(data).name,
      crowd: studyCrowd({ crowd: data, ...mix }),
      ...(percent === null ? {} : { womenPercent: percent }),
    };
  }

  /** Shares along a dimension: of the shown rules, and of every rule of a person at once. */
  async along(
    named: NamedCrowd,
    document: SetDocument,
    tried: { values: readonly number[]; placesAt: readonly PlaceSituation[][]; ruleIds: readonly string[] },
  ): Promise<{ told: CrowdTold; points: ValueShare[]; joint: ValueShare[] }> {
    const placeIds = this.placesToCount(tried.placesAt);
    const told = toldOf(named, CURVE_PEOPLE, placeIds);
    const known = tried.values.flatMap((value, n) => {
      const places = tried.placesAt[n] ?? [];
      return places.length > 0 ? [{ value, places }] : [];
    });
    if (known.length === 0 || placeIds.length === 0) return { told, points: [], joint: [] };
    const study = this.study(named, CURVE_PEOPLE, document, known[0]?.places ?? []);
    const curve = async (ruleIds?: readonly string[]): Promise<ValueShare[]> => {
      study.tick({ placeIds, ...(ruleIds ? { ruleIds } : {}) });
      const points: ValueShare[] = [];
      for (const { value, places } of known) {
        for (const point of curveOf(study, [value], () => places)) {
          points.push({ value, ...shareOf(point.all, CURVE_PEOPLE) });
        }
        await setImmediate();
      }
      return points;
    };
    return { told, points: await curve(tried.ruleIds), joint: await curve() };
  }

  /** Shares over two dimensions, row by row of the second; null where not known. */
  async over(
    named: NamedCrowd,
    document: SetDocument,
    tried: {
      across: readonly number[];
      up: readonly number[];
      placesAt: readonly PlaceSituation[][][];
      ruleIds: readonly string[];
    },
  ): Promise<{ told: CrowdTold; fits: (number | null)[][] }> {
    const placeIds = this.placesToCount(tried.placesAt.flat());
    const told = toldOf(named, MAP_PEOPLE, placeIds);
    const first = tried.placesAt.flat().find((places) => places.length > 0);
    if (!first || placeIds.length === 0) return { told, fits: [] };
    const study = this.study(named, MAP_PEOPLE, document, first);
    study.tick({ placeIds, ruleIds: tried.ruleIds });
    const fits: (number | null)[][] = [];
    for (const [n, second] of tried.up.entries()) {
      const placesAt = (value: number) => tried.placesAt[n]?.[tried.across.indexOf(value)] ?? [];
      for (const row of mapOf(study, tried.across, [second], placesAt).all) {
        fits.push(row.map((tally) => shareOf(tally, MAP_PEOPLE).fits ?? null));
      }
      await setImmediate();
    }
    return { told, fits };
  }

  private placesToCount(along: readonly PlaceSituation[][]): string[] {
    if (along.every((places) => places.length === 0)) return [];
    const placeIds = changingPlaces(along);
    if (placeIds.length <= MOST_PLACES) return placeIds;
    const message = `${placeIds.length} places move along; accepted: a number that moves up to ${MOST_PLACES}, or no population`;
    throw Problem.invalid([{ path: 'populationId', code: 'too-many-places', message }]);
  }

  private study(
    { crowd }: NamedCrowd,
    people: number,
    { asked: { lensHeightMm } }: SetDocument,
    places: readonly PlaceSituation[],
  ): Study {
    const { surveyed = {} } = crowd;
    return createStudy(crowd.draw(people, SEED), {
      places,
      ruleBook: this.fit.ruleBook,
      wear: STUDY_WEAR,
      surveyed,
      ...(lensHeightMm === undefined ? {} : { lensHeightMm }),
    });
  }
}

export interface NamedCrowd {
  id: string;
  /** Of the population that is mixed. */
  name: string;
  crowd: Population;
  womenPercent?: number;
}

export type ValueShare = Share & { value: number };

function toldOf(
  { id, name, crowd, womenPercent }: NamedCrowd,
  people: number,
  placeIds: string[],
): CrowdTold {
  const { source, cautions } = crowd;
  const mix = womenPercent === undefined ? {} : { womenPercent };
  return { id, name, source, cautions: [...cautions], ...mix, people, placeIds };
}

const sum = ({ women, men }: Tally): number => women + men;

function shareOf({ fits, atLeastTight, unknown, silent }: FitTally, people: number): Share {
  return unknown || silent !== undefined
    ? {}
    : { fits: sum(fits) / people, atLeastTight: sum(atLeastTight) / people };
}
