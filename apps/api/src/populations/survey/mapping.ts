import { type LengthUnit, type MeasureKey, SURVEY_UNITS, type WeightUnit } from '@settlewright/anthropometry';

export type SurveyUnit = LengthUnit | WeightUnit;

export const LENGTH_UNITS = Object.keys(SURVEY_UNITS.mm) as LengthUnit[];
export const WEIGHT_UNITS = Object.keys(SURVEY_UNITS.kg) as WeightUnit[];
export const ALL_UNITS: SurveyUnit[] = [...LENGTH_UNITS, ...WEIGHT_UNITS];

/** Which column of a file holds what. Columns go by their headings. */
export interface Mapping {
  /** Without words of its own a column is read by "f", "w", "female", "m", "male" and the like. */
  sex: { column: string; women?: string[]; men?: string[] };
  age?: string;
  measures: { key: MeasureKey; column: string; unit: SurveyUnit }[];
  /** A comma stands before the decimals. */
  decimalComma: boolean;
}

/** The same, as far as it could be guessed. */
export type SuggestedMapping = Partial<Pick<Mapping, 'sex' | 'age'>> & Omit<Mapping, 'sex' | 'age'>;

/** The same while a person makes it: the unit of a column may be left to its values. */
export type OpenMapping = Omit<SuggestedMapping, 'measures'> & {
  measures: (Omit<Mapping['measures'][number], 'unit'> & { unit?: SurveyUnit })[];
};
