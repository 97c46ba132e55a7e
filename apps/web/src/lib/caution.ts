/** Stands under every sheet and picture with verdicts in it. */
export const CAUTION =
  'Guidance, not certification. Local codes, the authority having jurisdiction and licensed practice decide. ' +
  'Body data describe surveyed groups, not a person: try the seat.';
