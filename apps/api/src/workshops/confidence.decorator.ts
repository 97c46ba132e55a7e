import { CONFIDENCE_LIMITS } from '@settlewright/anthropometry';
import { ValidateBy } from 'class-validator';

const { lowest, highest, decimals } = CONFIDENCE_LIMITS;

/** A probability that verdicts may ask for: in hundredths, so that it is shown as it is used. */
export function IsConfidence(): PropertyDecorator {
  return ValidateBy({
    name: 'confidence',
    validator: {
      validate: (value: unknown) =>
        typeof value === 'number' &&
        value >= lowest &&
        value <= highest &&
        Number(value.toFixed(decimals)) === value,
      defaultMessage: () =>
        `$property accepts ${lowest} to ${highest} in hundredths, or null for the default of the rules`,
    },
  });
}
