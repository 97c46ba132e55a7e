import { type CushionSpec, type OrderCover, orderCoversSchema } from '@settlewright/geometry';
import { type ProblemField, Problem } from '../common/problem';
import { isStorableText } from '../common/text-field';

/**
 * The cloths of an order as they were said, or a refusal that names each field.
 *
 * @param covers - as they came in
 * @param cushions - of the order; a cloth covers no other
 */
export function saidCovers(covers: unknown, cushions: readonly CushionSpec[]): OrderCover[] {
  const read = orderCoversSchema.safeParse(covers);
  if (!read.success) {
    throw Problem.invalid(
      read.error.issues.map(({ path, code, message }) => ({
        path: ['covers', ...path].join('.'),
        code,
        message,
      })),
    );
  }
  const known = new Set(cushions.map(({ mark }) => mark));
  const strange = read.data.flatMap(({ cushionMarks = [] }, at): ProblemField[] => {
    const marks = cushionMarks.filter((mark) => !known.has(mark));
    if (marks.length === 0) return [];
    const message = `the order asks for ${[...known].join(', ')}; read ${marks.join(', ')}`;
    return [{ path: `covers.${at}.cushionMarks`, code: 'unknown-mark', message }];
  });
  const refused = [...strange, ...unstorable(read.data)];
  if (refused.length > 0) throw Problem.invalid(refused);
  return read.data;
}

const unstorable = (covers: readonly OrderCover[]): ProblemField[] =>
  covers.flatMap(({ name, com }, at) =>
    [
      { field: 'name', storable: isStorableText(name) },
      { field: 'com.dyeLot', storable: isStorableText(com?.dyeLot ?? '') },
      { field: 'com.flaws', storable: isStorableText(com?.flaws ?? '', true) },
    ].flatMap(({ field, storable }) =>
      storable
        ? []
        : [
            {
              path: `covers.${at}.${field}`,
              code: 'control-character',
              message: 'may not hold control characters',
            },
          ],
    ),
  );
