import { feetOutOfTheWay, formatLength, type LengthStyle, type PostureChoice } from '@settlewright/geometry';
import type { SeatedBody } from '../picture.ts';
import { choiceHad } from './try-posture.ts';

export const TRUNK_WORDS = {
  back: 'Against the back',
  upright: 'Upright, off the back',
  slumped: 'Slumped',
} as const;

export const ARM_WORDS = {
  lap: 'Hands on the lap',
  table: 'Forearms on the table',
  cup: 'Right hand at a cup',
  'sill-left': 'Left forearm on the sill',
  'sill-right': 'Right forearm on the sill',
  level: 'Hanging, forearms level',
} as const;

const FEET_WORDS = {
  floor: 'Feet on the floor or hanging',
  rail: 'Feet on the rail',
  'ankles-crossed': 'Ankles crossed',
  'knees-crossed': 'Knees crossed',
} as const;

/** "1½″ to the sitter’s left, 1″ back". */
function sayNudge({ leftMm, aheadMm }: NonNullable<PostureChoice['nudge']>, style: LengthStyle): string[] {
  const size = (mm: number) => formatLength(Math.abs(mm), style);
  return [
    ...(leftMm === 0 ? [] : [`moved ${size(leftMm)} to the sitter’s ${leftMm > 0 ? 'left' : 'right'}`]),
    ...(aheadMm === 0 ? [] : [`moved ${size(aheadMm)} ${aheadMm > 0 ? 'forward' : 'back'}`]),
  ];
}

/** What was chosen of a posture, in words; empty where nothing was. */
export function sayChoice(choice: PostureChoice | undefined, style: LengthStyle): string {
  if (!choice) return '';
  const { trunk, arms, feet, nudge } = choice;
  const said = [
    ...(trunk ? [TRUNK_WORDS[trunk]] : []),
    ...(arms ? [ARM_WORDS[arms]] : []),
    ...(feet ? [FEET_WORDS[feet]] : []),
    ...(nudge ? sayNudge(nudge, style) : []),
  ];
  return said.join(', ').toLowerCase();
}

/** What stands wherever a verdict meets a body that was posed by hand. */
export const sayMeasuredAs = (
  body: Pick<SeatedBody, 'pose' | 'at'> | undefined,
  style: LengthStyle,
): string => {
  if (!body) return '';
  const had = sayChoice(choiceHad(body), style);
  const shown = [
    ...(had === '' ? [] : [had]),
    ...(feetOutOfTheWay(body.pose.notes) ? ['feet out of the way'] : []),
  ].join(', ');
  return shown === '' ? '' : `Measured in the standard posture; shown ${shown}.`;
};
