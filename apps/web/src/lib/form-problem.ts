import type { FieldValues, Path, UseFormReturn } from 'react-hook-form';
import { Problem, sayProblem } from './problem.ts';

/**
 * Puts what the server refused beside the fields it names. What has no field of its own is
 * returned as one sentence for the head of the form, or null when every refusal has its place.
 */
export function applyProblem<T extends FieldValues>(
  error: unknown,
  form: Pick<UseFormReturn<T>, 'setError' | 'getValues'>,
  rename: (path: string) => string = (path) => path,
): string | null {
  if (!(error instanceof Problem) || error.fields.length === 0) return sayProblem(error);
  const known = form.getValues();
  const homeless: string[] = [];
  let first = true;
  for (const field of error.fields) {
    const path = rename(field.path);
    const root = path.split('.')[0] ?? path;
    if (root in known) {
      form.setError(path as Path<T>, { type: 'server', message: field.message }, { shouldFocus: first });
      first = false;
    } else {
      homeless.push(field.message);
    }
  }
  return homeless.length === 0 ? null : homeless.join(' ');
}
