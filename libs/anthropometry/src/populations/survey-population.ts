import type { MeasureKey } from '../measures/measures.ts';
import { drawOrder, factorRows, linearBodies } from './linear-bodies.ts';
import { populationOf } from './mix.ts';
import type { GroupBodies, Population, PopulationDetails } from './population.ts';
import type { Survey, SurveyGroup } from './survey.ts';
import { isLogged, type Worked } from './worked.ts';

/** Least and greatest value by measure: millimetres, kilograms for weight. */
export type Ranges = Readonly<Partial<Record<MeasureKey, { min: number; max: number }>>>;

/**
 * People of one sex from a worked normal.
 *
 * @param group - women or men
 * @param worked - means and covariances in worked form
 * @param ranges - of the measures; drawn values beyond are set to its end
 */
export function workedBodies(group: SurveyGroup, worked: Worked, ranges: Ranges): GroupBodies {
  const keys = drawOrder(worked.keys);
  const size = keys.length;
  const places = keys.map((key) => worked.keys.indexOf(key));
  const covariance = new Float64Array(size * size);
  places.forEach((from, i) => {
    places.forEach((to, j) => {
      covariance[i * size + j] = worked.covariance[from * size + to] as number;
    });
  });
  const factors = factorRows(covariance, size);
  return linearBodies(
    group,
    keys.map((key, i) => ({
      key,
      mean: worked.mean[places[i] as number] as number,
      factors: factors[i] as Float64Array,
      logged: isLogged(key),
      low: ranges[key]?.min ?? -Infinity,
      high: ranges[key]?.max ?? Infinity,
    })),
  );
}

const SOLDIERS = {
  id: 'us-soldiers-2012',
  name: 'US soldiers 2012',
  kind: 'survey',
  source: 'ANSUR II, 2012 Anthropometric Survey of US Army Personnel, public data set',
  licence:
    'US government work, cleared for public release (from memory; no licence text came with the files)',
  cautions: [
    'Soldiers are leaner than the public: bellies, hips and weights run small.',
    'Elbow rest height shifts by 10 to 14 mm between two surveys of one army, so shares that hang on it are rough.',
  ],
} as const;

/**
 * US soldiers of 2012, as many women as men.
 *
 * @param survey - statistics of `seed-data/populations/ansur2.json`
 */
export function soldiers2012(survey: Survey): Population {
  return surveyPopulation(survey, SOLDIERS);
}

/** How a workshop calls the people it measured. */
export type OwnSurvey = Pick<PopulationDetails, 'id' | 'name' | 'source' | 'licence'>;

/**
 * People whom a workshop measured itself, as many women as men.
 *
 * @param survey - statistics of the completed summary of its table
 * @param named - the workshop's words
 */
export function ownPopulation(survey: Survey, named: OwnSurvey): Population {
  const cautions = ['A survey of few people says little of the smallest and the largest.'];
  if (survey.read.size < survey.measures.length) {
    cautions.push(
      'Measures that were not taken are estimated from the rest, as they hang together in US soldiers of 2012.',
    );
  }
  return surveyPopulation(survey, { ...named, kind: 'own', cautions });
}

function surveyPopulation(survey: Survey, details: Omit<PopulationDetails, 'read' | 'surveyed'>): Population {
  return populationOf(
    { ...details, read: survey.read, ...(survey.surveyed ? { surveyed: survey.surveyed } : {}) },
    (['women', 'men'] as const).map((group) => ({
      share: 0.5,
      bodies: workedBodies(group, survey.worked[group], survey.stats[group]),
    })),
  );
}
