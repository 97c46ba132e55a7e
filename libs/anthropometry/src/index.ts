export * from './measures/measures.ts';
export * from './measures/measure-info.ts';
export { contradictions } from './measures/orders.ts';
export * from './people/person.ts';
export { normalCdf, normalQuantile, Z90 } from './people/normal.ts';
export { bivariateNormalCdf } from './people/bivariate.ts';
export * from './people/estimate.ts';
export type { Body, JointComponent } from './people/body.ts';
export * from './people/body-model.ts';
export * from './checks/situation.ts';
export * from './checks/fit-sheet.ts';
export { CONFIDENCE_LIMITS } from './checks/confidence-limits.ts';
export * from './checks/rule-book.ts';
export * from './checks/confidence.ts';
export * from './checks/rule-conflicts.ts';
export * from './checks/seat-sink.ts';
export { calibrateSink, cushionDrop, SINK_ERROR, sinkBand, type TestSit } from './checks/sink-band.ts';
export { isSureOfShort } from './checks/sure-of-short.ts';
export { dropSourceWords } from './checks/cushion-drops.ts';
export type { CheckInput } from './checks/check-input.ts';
export { checkSet, checkSitter } from './checks/check-set.ts';
export { standInPlaces, unlikePlaces } from './checks/unlike-places.ts';
export type { CheckSettings } from './checks/piece-check.ts';
export { PERSON_CHECKS } from './checks/person-checks.ts';
export { codeLoad } from './checks/bench-length-checks.ts';
export { kneeDepthNeededMm } from './checks/clause-checks.ts';
export { fullLegStretchMm } from './checks/table-depth-checks.ts';
export { readSurvey, type Survey, type SurveyGroup } from './populations/survey.ts';
export * from './populations/survey-rows.ts';
export { LEAST_PEOPLE, summarise, type SurveySummary } from './populations/summarise.ts';
export { completeSummary, type WholeSummary } from './populations/complete-summary.ts';
export { fillGaps, type Filled } from './populations/fill-gaps.ts';
export { isLogged, momentsOf, workedOf, type Moments, type Worked } from './populations/worked.ts';
export {
  isUncertainCell,
  nextMeasures,
  type NextMeasure,
  type NextMeasures,
  type NextMeasureKey,
} from './checks/next-measure.ts';
export { standIn, type PartDifference, type StandInAnswer, type StandInCheck } from './checks/stand-in.ts';
export { createStudy, type Study, type StudySetup, type Ticked } from './studies/study.ts';
export { mergePartials, type FitTally, type Group, type PartialStudy, type Tally } from './studies/counts.ts';
export type { Wear } from './studies/symbols.ts';
export { CROWD_WEAR } from './studies/crowd-wear.ts';
export * from './studies/shares.ts';
export type { GroupShares, Share } from './studies/group-shares.ts';
export type { Lost, LostTrait } from './studies/lost.ts';
export { SURVEY_CAUTION, type Caution } from './studies/caution.ts';
export * from './studies/curve.ts';
export type { Draws, Population, PopulationKind } from './populations/population.ts';
export { mixOf, mixPopulations } from './populations/mix.ts';
export { builtInPopulations } from './populations/built-in.ts';
export { civilians2015 } from './populations/civilian.ts';
export { nationalPopulations } from './populations/nations.ts';
export { ownPopulation, soldiers2012, type OwnSurvey } from './populations/survey-population.ts';
export {
  childSizeMarks,
  readChildren,
  type Children,
  type ChildSizeMark,
} from './populations/children-file.ts';
export { childrenOfMark } from './populations/children.ts';
