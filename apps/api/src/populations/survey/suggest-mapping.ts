import { MEASURE_INFO, MEASURE_KEYS, type MeasureKey, SURVEY_UNITS } from '@settlewright/anthropometry';
import { referenceSurvey } from '../built-in';
import { ALL_UNITS, type OpenMapping, type SuggestedMapping, type SurveyUnit } from './mapping';
import { columnOf, type SurveyFile } from './survey-file';

const SEX_WORDS = new Set(['sex', 'gender', 'group', 'body', 'women_men']);
const AGE_WORDS = new Set(['age', 'age_years', 'years']);

/** What people call a measure, besides its name, its plain words and its short form. */
const FURTHER_WORDS: Partial<Record<MeasureKey, string[]>> = {
  stature: ['standing_height', 'body_height'],
  weight_kg: ['weight', 'mass', 'body_weight', 'body_mass'],
  sitting_height: ['seated_height'],
  popliteal_height: ['back_of_knee_height', 'lower_leg_length'],
  elbow_rest_height: ['elbow_height_sitting'],
  acromial_height_sitting: ['shoulder_height_sitting'],
  hip_breadth_sitting: ['hip_width'],
  bideltoid_breadth: ['shoulder_width', 'shoulder_breadth'],
};

const UNIT_WORDS: Record<string, SurveyUnit> = {
  ...Object.fromEntries(ALL_UNITS.map((unit) => [unit, unit])),
  inch: 'in',
  inches: 'in',
  lbs: 'lb',
  pounds: 'lb',
};

const KEY_BY_WORDS = new Map<string, MeasureKey>();
for (const key of MEASURE_KEYS) {
  const { name, plain, abbreviation } = MEASURE_INFO[key];
  const words = [
    key,
    name,
    name.replace(/\(.*\)/, ''),
    plain,
    abbreviation ?? key,
    ...(FURTHER_WORDS[key] ?? []),
  ];
  for (const one of words.map(wordsOf)) if (!KEY_BY_WORDS.has(one)) KEY_BY_WORDS.set(one, key);
}

/**
 * What the columns seem to hold: known by their headings, units by the heading or else by which unit brings the
 * middle value nearest to a body. A person confirms it.
 */
export function suggestMapping(file: SurveyFile): SuggestedMapping {
  const decimalComma = file.commaIsFree && file.rows.some((cells) => cells.some(hasDecimalComma));
  const measures: SuggestedMapping['measures'] = [];
  let sex: SuggestedMapping['sex'];
  let age: string | undefined;
  for (const column of file.headings) {
    const words = wordsOf(column);
    if (SEX_WORDS.has(words)) sex ??= { column };
    else if (AGE_WORDS.has(words)) age ??= column;
    const found = measureIn(words);
    if (!found || measures.some(({ key }) => key === found.key)) continue;
    const unit = found.unit ?? nearestUnit(found.key, columnOf(file, column) ?? [], decimalComma);
    measures.push({ key: found.key, column, unit });
  }
  return { ...(sex ? { sex } : {}), ...(age ? { age } : {}), measures, decimalComma };
}

/** Every column with its unit: the one given, or else the one that brings the middle value nearest to a body. */
export function withUnits(file: SurveyFile, mapping: OpenMapping): SuggestedMapping {
  const { decimalComma } = mapping;
  const measures = mapping.measures.map(({ key, column, unit }) => ({
    key,
    column,
    unit: unit ?? nearestUnit(key, columnOf(file, column) ?? [], decimalComma),
  }));
  return { ...mapping, measures };
}

function wordsOf(heading: string): string {
  return heading
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '_')
    .replace(/^_+|_+$/g, '');
}

function measureIn(words: string): { key: MeasureKey; unit?: SurveyUnit } | undefined {
  const whole = KEY_BY_WORDS.get(words);
  const cut = words.lastIndexOf('_');
  const unit = UNIT_WORDS[words.slice(cut + 1)];
  const base = cut > 0 ? KEY_BY_WORDS.get(words.slice(0, cut)) : undefined;
  const key = base && unit && unit in SURVEY_UNITS[MEASURE_INFO[base].unit] ? base : undefined;
  if (key && unit) return { key, unit };
  return whole ? { key: whole } : undefined;
}

function nearestUnit(key: MeasureKey, texts: readonly string[], decimalComma: boolean): SurveyUnit {
  const units = Object.entries(SURVEY_UNITS[MEASURE_INFO[key].unit]) as [SurveyUnit, number][];
  const values = texts
    .map((text) => Number(decimalComma ? text.replace(',', '.') : text))
    .filter((value) => value > 0)
    .sort((a, b) => a - b);
  const middle = values[Math.floor(values.length / 2)];
  if (middle === undefined) return MEASURE_INFO[key].unit;
  const { women, men } = referenceSurvey().stats;
  const usual = (women[key].mean + men[key].mean) / 2;
  const apart = (factor: number) => Math.abs(Math.log((middle * factor) / usual));
  return units.reduce((best, one) => (apart(one[1]) < apart(best[1]) ? one : best))[0];
}

const hasDecimalComma = (cell: string): boolean => /^\s*\d+,\d+\s*$/.test(cell);
