import type { Dimension, LengthStyle } from '@settlewright/geometry';
import { onlySex, type CrowdChoice, type CrowdOption } from '@/lib/crowd/crowds.ts';

/** What the server draws a stick of: as `AskStickDto` of the API reads it. */
export interface StickPaper {
  dimension: string;
  /** Where the plumb line hangs, written or not; in the dimension's unit. */
  value: number;
  ruleId: string;
  populationId: string;
  /** Absent where the population holds one sex. */
  womenPercent?: number;
  units: LengthStyle['system'];
  roundTo: LengthStyle['roundTo'];
}

export function stickPaper(
  { id }: Pick<Dimension, 'id'>,
  value: number,
  ruleId: string,
  { populationId, women }: CrowdChoice,
  options: readonly CrowdOption[],
  { system, roundTo }: LengthStyle,
): StickPaper {
  return {
    dimension: id,
    value,
    ruleId,
    populationId,
    ...(onlySex(populationId, options) ? {} : { womenPercent: women }),
    units: system,
    roundTo,
  };
}
