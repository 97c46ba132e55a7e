import { type ValidationOptions, ValidateBy } from 'class-validator';
import { acceptedWords, type Limit, within } from './limits';

/** A number inside a limit of the table. */
export function WithinLimit(limit: Limit, options?: ValidationOptions): PropertyDecorator {
  return ValidateBy(
    {
      name: 'withinLimit',
      validator: {
        validate: (value: unknown) => typeof value === 'number' && within(limit, value),
        defaultMessage: () => `${limit.label} accepts ${acceptedWords(limit)}`,
      },
    },
    options,
  );
}
