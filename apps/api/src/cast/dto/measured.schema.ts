import { TAPE_MEASURE_KEYS } from '@settlewright/anthropometry';
import { TAPE_LIMITS } from '../limits';

/** The map of tape measures as the API describes it. */
export const measuredSchema = {
  type: 'object' as const,
  additionalProperties: false,
  properties: Object.fromEntries(
    TAPE_MEASURE_KEYS.map((key) => [
      key,
      {
        type: 'object' as const,
        required: ['mm'],
        properties: {
          mm: { type: 'number' as const, minimum: TAPE_LIMITS[key].min, maximum: TAPE_LIMITS[key].max },
          takenBy: { type: 'string' as const },
          takenOn: { type: 'string' as const, format: 'date' },
        },
      },
    ]),
  ),
};
