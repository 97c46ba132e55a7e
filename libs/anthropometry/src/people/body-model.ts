import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { surveyPercentile } from '../populations/percentiles.ts';
import { readChildren } from '../populations/children-file.ts';
import { middleChild } from '../populations/middle-child.ts';
import { readSurvey, type Survey, type SurveyGroup } from '../populations/survey.ts';
import { bodyFrom, type Body } from './body.ts';
import { childBody } from './child-body.ts';
import { momentsOfBody, type WeightedPosterior } from './body-moments.ts';
import { createGroupModel, type GroupModel, type Observation, type Posterior } from './group-model.ts';
import type { BodyData, KnownPerson, PercentileMannequin } from './person.ts';

/** Predicts bodies from what is known of people. */
export interface BodyModel {
  /**
   * What is believed of a person's body.
   *
   * @param person - known values in millimetres and kilograms; finite, > 0
   * @returns the body; the same object for the same person object
   * @throws RangeError naming the field when a known value is not a positive number
   */
  predict(person: KnownPerson): Body;
  /**
   * The person that a percentile mannequin stands for: that value of its measure, the conditional mean of the rest.
   *
   * @param mannequin - group, measure and percentile
   * @returns an exact person
   */
  mannequin(mannequin: PercentileMannequin): KnownPerson;
  /**
   * The middle child of a size mark, to be drawn for scale: only height, weight and lower leg are children's.
   *
   * @param sizeMark - number of the mark
   * @returns an exact person
   * @throws RangeError when the model knows no such mark
   */
  child(sizeMark: number): KnownPerson;
  /**
   * A percentile of one measure in the surveyed group.
   *
   * @param bodyData - women, men, or `mixed` for as many of each
   * @param key - body measure
   * @param p - strictly between 0 and 100
   * @returns millimetres (kilograms for weight)
   */
  percentile(bodyData: BodyData, key: MeasureKey, p: number): number;
}

/**
 * Builds the body model of one surveyed population.
 *
 * @param summary - parsed JSON of the survey statistics, for example `seed-data/populations/ansur2.json`
 * @param childrenFile - parsed `seed-data/populations/children.json`, where children are to sit as well
 * @returns the model; it keeps its factorisations and predictions, and is otherwise pure
 * @throws Error naming the field when the statistics do not hold together
 * @source each sex a multivariate normal in logs (elbow rest height plain), the spread of what is left over growing
 *   with weight as fitted to the survey
 */
export function createBodyModel(summary: unknown, childrenFile?: unknown): BodyModel {
  const survey = readSurvey(summary);
  const groups = { women: createGroupModel(survey, 'women'), men: createGroupModel(survey, 'men') };
  const bodies = new WeakMap<KnownPerson, Body>();
  const mannequins = new Map<string, KnownPerson>();
  const children = childrenFile === undefined ? undefined : readChildren(childrenFile);
  const childPeople = new Map<number, KnownPerson>();

  const partOf = (name: SurveyGroup, person: KnownPerson): WeightedPosterior => {
    const group = groups[name];
    const posterior = group.condition(observationsOf(person, survey.selfReportedStature[name]));
    const shift = shiftByAge(survey, name, person, group, posterior);
    return {
      weight: 1,
      name,
      group,
      posterior,
      shift,
      moments: momentsOfBody(group, posterior, shift),
    };
  };

  function partsOf(person: KnownPerson): WeightedPosterior[] {
    if (person.bodyData !== 'mixed') return [partOf(person.bodyData, person)];
    const women = partOf('women', person);
    const men = partOf('men', person);
    const shareOfMen = 1 / (1 + Math.exp(women.posterior.logLikelihood - men.posterior.logLikelihood));
    return [
      { ...women, weight: 1 - shareOfMen },
      { ...men, weight: shareOfMen },
    ];
  }

  const model: BodyModel = {
    predict(person) {
      const known = bodies.get(person);
      if (known) return known;
      const body = person.child
        ? childBody(person, model.predict(GROWN_UP))
        : bodyFrom(person, partsOf(person));
      bodies.set(person, body);
      return body;
    },
    mannequin({ bodyData, measure, percentile }) {
      const name = `${bodyData}|${measure}|${percentile}`;
      const known = mannequins.get(name);
      if (known) return known;
      const value = surveyPercentile(survey, bodyData, measure, percentile);
      const person: KnownPerson = {
        bodyData,
        ...(measure === 'stature' ? { stature: { mm: value, source: 'measured' as const } } : {}),
        ...(measure === 'weight_kg' ? { weightKg: value } : {}),
        measured: measure === 'stature' || measure === 'weight_kg' ? {} : { [measure]: value },
        ...survey.mannequin,
        exact: true,
      };
      mannequins.set(name, person);
      return person;
    },
    child(sizeMark) {
      const known = childPeople.get(sizeMark);
      if (known) return known;
      const mark = children?.marks.find((each) => each.mark === sizeMark);
      if (!children || !mark) {
        const marks = children?.marks.map((each) => each.mark).join(', ') ?? 'none';
        throw new RangeError(`sizeMark is ${sizeMark}; accepted: ${marks}`);
      }
      const person = middleChild(children, mark);
      childPeople.set(sizeMark, person);
      return person;
    },
    percentile: (bodyData, key, p) => surveyPercentile(survey, bodyData, key, p),
  };
  return model;
}

/** Whose shares of stature a child is drawn with. */
const GROWN_UP: KnownPerson = { bodyData: 'mixed', measured: {}, shoeMm: 0, clothing: 'light' };

const NO_SHIFT: ReadonlyMap<number, number> = new Map();

/** Millimetres that age adds, by place; nothing where stature or weight is not known or the measure was taken. */
function shiftByAge(
  { ageShift }: Survey,
  group: SurveyGroup,
  { age, stature, weightKg, measured }: KnownPerson,
  { keys }: GroupModel,
  { taken }: Posterior,
): ReadonlyMap<number, number> {
  if (age === undefined || !ageShift) return NO_SHIFT;
  if (!Number.isFinite(age) || age <= 0) throw new RangeError(`age is ${age}; accepted: a number above 0`);
  const sized = (stature ?? measured.stature) !== undefined && (weightKg ?? measured.weight_kg) !== undefined;
  const years = Math.min(age, ageShift.toYears) - ageShift.fromYears;
  if (!sized || years <= 0) return NO_SHIFT;
  const shift = new Map<number, number>();
  keys.forEach((key, place) => {
    const perYear = ageShift.perYear[group][key];
    if (perYear !== undefined && !taken.has(place)) shift.set(place, perYear * years);
  });
  return shift;
}

/** Known values in a fixed order, so that people known by the same measures share one factorisation. */
function observationsOf(person: KnownPerson, told: { overMm: number; sdMm: number }): Observation[] {
  const observations: Observation[] = [];
  const add = (field: string, key: MeasureKey, value: number, noiseSd = 0) => {
    if (!Number.isFinite(value) || value <= 0) {
      throw new RangeError(`${field} is ${value}; accepted: a number above 0`);
    }
    observations.push({ key, value, noiseSd });
  };
  for (const key of MEASURE_KEYS) {
    const taken = person.measured[key];
    if (taken !== undefined) add(`measured.${key}`, key, taken);
    else if (key === 'weight_kg' && person.weightKg !== undefined) add('weightKg', key, person.weightKg);
    else if (key === 'stature' && person.stature) {
      const { mm, source } = person.stature;
      if (source === 'measured') add('stature.mm', key, mm);
      else add('stature.mm', key, mm - told.overMm, told.sdMm);
    }
  }
  return observations;
}
