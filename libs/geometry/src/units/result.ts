/** Outcome of something a person's input can make fail: a value, or a coded error that says why. */
export type Result<T, E> = { ok: true; value: T } | { ok: false; error: E };

/**
 * Wraps a value as a success.
 *
 * @param value - what was asked for
 * @returns the successful result
 */
export function ok<T>(value: T): { ok: true; value: T } {
  return { ok: true, value };
}

/**
 * Wraps an error as a failure.
 *
 * @param error - what was wrong, what was read and what is accepted
 * @returns the failed result
 */
export function fail<E>(error: E): { ok: false; error: E } {
  return { ok: false, error };
}
