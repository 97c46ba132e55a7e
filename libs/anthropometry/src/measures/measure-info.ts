import type { MeasureKey } from './measures.ts';

/** How a measure is called, in the standard and in plain words, and how it is taken. */
export interface MeasureInfo {
  /** Name as in ISO 7250-1, or the survey's name where the standard has none. */
  name: string;
  /** Short form on a drawing. */
  abbreviation?: string;
  /** The standard that defines the measure; absent where only the survey does. */
  iso?: string;
  /** What a builder would call it. */
  plain: string;
  /** How to take it with a tape, in one or two sentences. */
  howToTake: string;
  unit: 'mm' | 'kg';
}

const SEATED = 'Sitting upright on a hard seat, thighs level, feet on the floor or a block:';
const STANDING = 'Standing upright without shoes:';

const mm = (
  name: string,
  plain: string,
  howToTake: string,
  extra: { abbreviation?: string; iso?: string } = {},
): MeasureInfo => ({ name, plain, howToTake, unit: 'mm', ...extra });

/**
 * Name, plain words and method of every body measure.
 *
 * @source names and methods in our own words after ISO 7250-1:2017; survey names where the standard has none
 */
export const MEASURE_INFO: Record<MeasureKey, MeasureInfo> = {
  stature: mm(
    'Stature (body height)',
    'height',
    `${STANDING} floor to the top of the head, heels against a wall, looking level.`,
    { abbreviation: 'ST', iso: 'ISO 7250-1' },
  ),
  weight_kg: {
    name: 'Body mass (weight)',
    plain: 'weight',
    howToTake: 'On a scale in light indoor clothing, without shoes.',
    iso: 'ISO 7250-1',
    unit: 'kg',
  },
  sitting_height: mm(
    'Sitting height (erect)',
    'sitting height',
    `${SEATED} seat to the top of the head, looking level.`,
    { abbreviation: 'SH', iso: 'ISO 7250-1' },
  ),
  eye_height_sitting: mm(
    'Eye height, sitting',
    'eye height',
    `${SEATED} seat to the outer corner of the eye.`,
    {
      abbreviation: 'EH',
      iso: 'ISO 7250-1',
    },
  ),
  acromial_height_sitting: mm(
    'Shoulder height, sitting',
    'shoulder height',
    `${SEATED} seat to the bony tip of the shoulder.`,
    { abbreviation: 'SSH', iso: 'ISO 7250-1' },
  ),
  elbow_rest_height: mm(
    'Elbow height, sitting',
    'elbow rest',
    `${SEATED} upper arm hanging, forearm level; seat to the underside of the elbow.`,
    { abbreviation: 'ERH', iso: 'ISO 7250-1' },
  ),
  popliteal_height: mm(
    'Lower leg length (popliteal height)',
    'back of knee',
    `${SEATED} without shoes, knee at a right angle; floor to the underside of the thigh just behind the knee.`,
    { abbreviation: 'PH', iso: 'ISO 7250-1' },
  ),
  knee_height_sitting: mm(
    'Knee height',
    'knee height',
    `${SEATED} without shoes; floor to the top of the knee.`,
    { abbreviation: 'KH', iso: 'ISO 7250-1' },
  ),
  buttock_popliteal_length: mm(
    'Buttock-popliteal length (seat depth)',
    'back to crook of knee',
    `${SEATED} from a board held against the buttocks to the hollow behind the knee, level.`,
    { abbreviation: 'BPL', iso: 'ISO 7250-1' },
  ),
  buttock_knee_length: mm(
    'Buttock-knee length',
    'back to front of knee',
    `${SEATED} from a board held against the buttocks to the front of the knee, level.`,
    { abbreviation: 'BKL', iso: 'ISO 7250-1' },
  ),
  thigh_clearance: mm(
    'Thigh clearance',
    'thigh height',
    `${SEATED} seat to the highest point of the thigh, where it meets the belly.`,
    { abbreviation: 'TC', iso: 'ISO 7250-1' },
  ),
  hip_breadth_sitting: mm(
    'Hip breadth, sitting',
    'hip width',
    `${SEATED} knees together; between two boards that touch the hips without pressing.`,
    { abbreviation: 'HB', iso: 'ISO 7250-1' },
  ),
  hip_breadth: mm('Hip breadth, standing', 'hip width standing', `${STANDING} widest across the hips.`, {
    iso: 'ISO 7250-1',
  }),
  bideltoid_breadth: mm(
    'Shoulder breadth (bideltoid)',
    'shoulder width',
    `${SEATED} upper arms hanging; between two boards that touch the outsides of the upper arms.`,
    { abbreviation: 'BD', iso: 'ISO 7250-1' },
  ),
  forearm_forearm_breadth: mm(
    'Forearm to forearm breadth',
    'elbow to elbow',
    `${SEATED} elbows bent and resting against the sides; widest across the forearms, without pressing.`,
    { abbreviation: 'FFB' },
  ),
  biacromial_breadth: mm(
    'Shoulder (biacromial) breadth',
    'shoulder points',
    `${SEATED} between the bony tips of the shoulders.`,
    { iso: 'ISO 7250-1' },
  ),
  abdominal_extension_depth_sitting: mm(
    'Abdominal depth, sitting',
    'belly depth',
    `${SEATED} from a board held against the back to the foremost point of the belly, breathing easily.`,
    { abbreviation: 'AED', iso: 'ISO 7250-1' },
  ),
  chest_depth: mm(
    'Chest depth, standing',
    'chest depth',
    `${STANDING} back to front of the chest at the nipple.`,
    {
      iso: 'ISO 7250-1',
    },
  ),
  buttock_depth: mm('Buttock depth', 'buttock depth', `${STANDING} back to front at the fullest buttock.`),
  foot_length: mm(
    'Foot length',
    'foot length',
    `${STANDING} back of the heel to the tip of the longest toe.`,
    { iso: 'ISO 7250-1' },
  ),
  foot_breadth: mm('Foot breadth', 'foot width', `${STANDING} widest across the ball of the foot.`, {
    iso: 'ISO 7250-1',
  }),
  acromion_radiale_length: mm(
    'Acromion-radiale length',
    'upper arm',
    `${STANDING} bony tip of the shoulder to the outer elbow joint.`,
  ),
  shoulder_elbow_length: mm(
    'Shoulder-elbow length',
    'shoulder to elbow',
    `${SEATED} elbow at a right angle; bony tip of the shoulder to the underside of the elbow.`,
    { iso: 'ISO 7250-1' },
  ),
  forearm_hand_length: mm(
    'Elbow-fingertip length',
    'elbow to fingertip',
    'Elbow at a right angle: back of the elbow to the tip of the middle finger.',
    { iso: 'ISO 7250-1' },
  ),
  thumbtip_reach: mm(
    'Thumbtip reach',
    'forward reach',
    'Shoulders against a wall, arm level to the front: wall to the tip of the thumb.',
  ),
  functional_leg_length: mm(
    'Functional leg length',
    'leg stretched',
    'Sitting, leg stretched out straight: back of the buttock to the sole, along the leg.',
  ),
  head_breadth: mm('Head breadth', 'head width', 'Widest across the head above the ears.', {
    iso: 'ISO 7250-1',
  }),
  head_length: mm('Head length', 'head depth', 'Between the brows to the back of the head.', {
    iso: 'ISO 7250-1',
  }),
  waist_circumference: mm('Waist circumference', 'waist', `${STANDING} round the waist at the navel.`, {
    iso: 'ISO 7250-1',
  }),
  bicristal_breadth: mm(
    'Bicristal breadth',
    'pelvis width',
    `${STANDING} between the crests of the hip bones.`,
  ),
  overhead_fingertip_reach_sitting: mm(
    'Overhead fingertip reach, sitting',
    'reach overhead',
    `${SEATED} arm straight up; seat to the tip of the middle finger.`,
  ),
  span: mm('Span', 'arm span', `${STANDING} arms stretched sideways; fingertip to fingertip.`),
  waist_depth: mm('Waist depth', 'waist depth', `${STANDING} back to front at the navel.`),
  hand_length: mm('Hand length', 'hand length', 'Crease of the wrist to the tip of the middle finger.', {
    iso: 'ISO 7250-1',
  }),
  lateral_malleolus_height: mm(
    'Lateral malleolus height',
    'ankle height',
    `${STANDING} floor to the outer ankle bone.`,
  ),
  trochanterion_height: mm(
    'Trochanterion height',
    'hip height',
    `${STANDING} floor to the bony knob at the side of the hip.`,
  ),
  acromial_height: mm(
    'Shoulder height',
    'shoulder height standing',
    `${STANDING} floor to the bony tip of the shoulder.`,
    { iso: 'ISO 7250-1' },
  ),
  chest_circumference: mm('Chest circumference', 'chest', `${STANDING} round the chest at the nipple.`, {
    iso: 'ISO 7250-1',
  }),
  buttock_circumference: mm('Buttock circumference', 'seat', `${STANDING} round the fullest buttock.`),
  chest_breadth: mm('Chest breadth', 'chest width', `${STANDING} widest across the chest at the nipple.`, {
    iso: 'ISO 7250-1',
  }),
  waist_breadth: mm('Waist breadth', 'waist width', `${STANDING} widest across the waist at the navel.`),
};
