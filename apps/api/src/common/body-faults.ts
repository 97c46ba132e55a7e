import type { NextFunction, Request, Response } from 'express';
import { Problem } from './problem';

export const BODY_LIMIT = { bytes: 3 * 1024 * 1024, words: '3 MB' };

/** Stands behind the body parser and says in our words what it could not read. */
export function nameBodyFaults(
  fault: unknown,
  _request: Request,
  _response: Response,
  next: NextFunction,
): void {
  const type = fault instanceof Error && 'type' in fault ? fault.type : undefined;
  if (type === 'entity.too.large') {
    next(new Problem(413, 'too-large', `More was sent than is accepted: at most ${BODY_LIMIT.words}.`));
  } else if (type === 'entity.parse.failed') {
    next(new Problem(400, 'malformed-json', 'The body is not valid JSON.'));
  } else {
    next(fault);
  }
}
