import type { FitSheet } from '@settlewright/anthropometry';

/** The rule that asks whether a seat is too high for the legs of its sitter. */
const SEAT_HEIGHT = 'SEAT-02';

/** A rail that brings somebody's feet to rest, where the seat is too high for them. */
export interface FootRail {
  sitterId: string;
  name: string;
  estimated: boolean;
  /** Height at which the sitter is just tight, and just fits. */
  tightMm: number;
  fitsMm: number;
}

/** Whose feet hang, and how high a rail under them would have to be. */
export function footRails({ rows }: Pick<FitSheet, 'rows'>): FootRail[] {
  return rows.flatMap(({ sitterId, name, cells }): FootRail[] => {
    const outcome = cells.find(({ ruleId }) => ruleId === SEAT_HEIGHT)?.outcome;
    if (outcome?.kind !== 'verdict' || outcome.verdict !== 'wontFit') return [];
    const { value, fail, pass, estimated } = outcome;
    if (fail.upper === undefined || value <= fail.upper) return [];
    const tightMm = value - fail.upper;
    return [
      {
        sitterId,
        name,
        estimated,
        tightMm,
        fitsMm: pass.upper === undefined ? tightMm : value - pass.upper,
      },
    ];
  });
}
