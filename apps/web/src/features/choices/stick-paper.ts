import type { Dimension, LengthStyle } from '@settlewright/geometry';
import type { CrowdChoice } from '@/lib/crowd/crowds.ts';

/** What the server draws a stick of: as `AskStickDto` of the API reads it. */
export interface StickPaper {
  dimension: string;
  /** Where the plumb line hangs, written or not; in the dimension's unit. */
  value: number;
  ruleId: string;
  populationId: string;
  womenPercent: number;
  units: LengthStyle['system'];
  roundTo: LengthStyle['roundTo'];
}

export function stickPaper(
  { id }: Pick<Dimension, 'id'>,
  value: number,
  ruleId: string,
  { populationId, women }: CrowdChoice,
  { system, roundTo }: LengthStyle,
): StickPaper {
  return {
    dimension: id,
    value,
    ruleId,
    populationId,
    womenPercent: women,
    units: system,
    roundTo,
  };
}
