import { Problem, sayProblem } from '@/lib/problem.ts';

/** A refusal, each part of it where it belongs. */
interface Refusal {
  /** By the path of the field, those that the form has. */
  at: Record<string, string>;
  /** What belongs to no field of the form. */
  whole: string | null;
}

/**
 * Sorts a refusal to the fields of a form.
 *
 * @param error - of the step; null where there is none
 * @param has - whether the form has a field of that path
 */
export function refusalOf(error: unknown, has: (path: string) => boolean): Refusal {
  if (!error) return { at: {}, whole: null };
  const fields = error instanceof Problem ? error.fields : [];
  const at = Object.fromEntries(
    fields.filter(({ path }) => has(path)).map(({ path, message }) => [path, message]),
  );
  return { at, whole: fields.length > 0 && fields.every(({ path }) => has(path)) ? null : sayProblem(error) };
}
