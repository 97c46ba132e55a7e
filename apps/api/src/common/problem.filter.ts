import {
  ArgumentsHost,
  Catch,
  type ExceptionFilter,
  HttpException,
  HttpStatus,
  Logger,
} from '@nestjs/common';
import type { Response } from 'express';
import { QueryFailedError } from 'typeorm';
import { Problem, type ProblemBody, problemBody } from './problem';

@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(exception: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    const body = this.describe(exception);
    if (response.headersSent) {
      response.end();
      return;
    }
    if ('retryAfterSeconds' in body) response.setHeader('Retry-After', String(body.retryAfterSeconds));
    response.status(body.status).type('application/problem+json').send(JSON.stringify(body));
  }

  private describe(exception: unknown): ProblemBody {
    if (exception instanceof Problem) return exception.body();
    if (exception instanceof HttpException) return describeHttp(exception);
    const unreadable = describeUnreadable(exception) ?? describeRefusedByDatabase(exception);
    if (unreadable) return unreadable;
    this.logger.error(exception instanceof Error ? (exception.stack ?? exception.message) : exception);
    return problemBody(500, 'internal-error', 'Something went wrong here. Nothing was changed.');
  }
}

const HTTP_CODES: Partial<Record<number, string>> = {
  [HttpStatus.UNAUTHORIZED]: 'not-signed-in',
  [HttpStatus.FORBIDDEN]: 'not-allowed',
  [HttpStatus.NOT_FOUND]: 'not-found',
  [HttpStatus.SERVICE_UNAVAILABLE]: 'not-ready',
};

// A path may hold a token, so the framework's "Cannot GET /…" never goes out.
const HTTP_WORDS: Partial<Record<number, string>> = {
  [HttpStatus.UNAUTHORIZED]: 'Sign in first.',
  [HttpStatus.NOT_FOUND]: 'There is nothing at this address.',
};

function describeHttp(exception: HttpException): ProblemBody {
  const status = exception.getStatus();
  const answer = exception.getResponse();
  const more = status === 503 && typeof answer === 'object' ? { report: answer } : undefined;
  return problemBody(
    status,
    HTTP_CODES[status] ?? 'bad-request',
    HTTP_WORDS[status] ?? exception.message,
    undefined,
    more,
  );
}

/** What Express throws before a route is reached, as for an unreadable address or charset. */
function describeUnreadable(exception: unknown): ProblemBody | null {
  if (!(exception instanceof Error) || !('status' in exception)) return null;
  const { status } = exception;
  if (typeof status !== 'number' || status < 400 || status >= 500) return null;
  return problemBody(status, HTTP_CODES[status] ?? 'bad-request', 'The request cannot be read.');
}

/** PostgreSQL's own codes for values it cannot take; they come from the request, not from a fault here. */
function describeRefusedByDatabase(exception: unknown): ProblemBody | null {
  if (!(exception instanceof QueryFailedError)) return null;
  const { code } = exception.driverError as { code?: string };
  switch (code) {
    case '22P02':
      return problemBody(404, 'not-found', 'There is nothing at this address.');
    case '22021':
    case '22P05':
    case '22003':
      return problemBody(
        400,
        'bad-request',
        'The request holds a character or a number that cannot be kept.',
      );
    case '23505':
      return problemBody(409, 'conflict', 'Somebody else was quicker. Reload and try again.');
    default:
      return null;
  }
}
