/**
 * The body measures the engine knows, in the order of the survey statistics.
 * Names follow ISO 7250-1 where the standard defines the measure.
 * All lengths are millimetres; `weight_kg` is in kilograms.
 */
export const MEASURE_KEYS = [
  'stature',
  'weight_kg',
  'sitting_height',
  'eye_height_sitting',
  'acromial_height_sitting',
  'elbow_rest_height',
  'popliteal_height',
  'knee_height_sitting',
  'buttock_popliteal_length',
  'buttock_knee_length',
  'thigh_clearance',
  'hip_breadth_sitting',
  'hip_breadth',
  'bideltoid_breadth',
  'forearm_forearm_breadth',
  'biacromial_breadth',
  'abdominal_extension_depth_sitting',
  'chest_depth',
  'buttock_depth',
  'foot_length',
  'foot_breadth',
  'acromion_radiale_length',
  'shoulder_elbow_length',
  'forearm_hand_length',
  'thumbtip_reach',
  'functional_leg_length',
  'head_breadth',
  'head_length',
  'waist_circumference',
  'bicristal_breadth',
  'overhead_fingertip_reach_sitting',
  'span',
  'waist_depth',
  'hand_length',
  'lateral_malleolus_height',
  'trochanterion_height',
  'acromial_height',
  'chest_circumference',
  'buttock_circumference',
  'chest_breadth',
  'waist_breadth',
] as const;

/** Key of one body measure; also the column name in CSV files and statistics. */
export type MeasureKey = (typeof MEASURE_KEYS)[number];

/** The seated measures a person with a tape can take and a production may store for a cast member. */
export const TAPE_MEASURE_KEYS = [
  'sitting_height',
  'eye_height_sitting',
  'acromial_height_sitting',
  'elbow_rest_height',
  'popliteal_height',
  'knee_height_sitting',
  'buttock_popliteal_length',
  'buttock_knee_length',
  'thigh_clearance',
  'hip_breadth_sitting',
  'bideltoid_breadth',
  'forearm_forearm_breadth',
  'abdominal_extension_depth_sitting',
] as const satisfies readonly MeasureKey[];

/** Key of a measure that is taken with a tape on a seated person. */
export type TapeMeasureKey = (typeof TAPE_MEASURE_KEYS)[number];
