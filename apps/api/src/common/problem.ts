import { STATUS_CODES } from 'node:http';
import { HttpException, HttpStatus } from '@nestjs/common';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';

export class ProblemField {
  @ApiProperty({ description: 'where in the request, as `rows.0.name`' })
  path: string;
  @ApiProperty()
  code: string;
  @ApiProperty()
  message: string;
}

/** The body of every error answer (RFC 9457, application/problem+json). */
export class ProblemBody {
  @ApiProperty()
  type: string;
  @ApiProperty()
  title: string;
  @ApiProperty()
  status: number;
  @ApiProperty({ description: 'a word for programs, as `draft-conflict`' })
  code: string;
  @ApiProperty({ description: 'a sentence for people' })
  detail: string;
  @ApiPropertyOptional({ type: [ProblemField] })
  fields?: ProblemField[];
}

/** An expected failure with the answer it gives. `more` holds further members of the answer's body. */
export class Problem extends HttpException {
  constructor(
    status: number,
    readonly code: string,
    readonly detail: string,
    readonly fields?: ProblemField[],
    readonly more?: Record<string, unknown>,
  ) {
    super(detail, status);
    this.name = 'Problem';
  }

  static notFound(what: string): Problem {
    return new Problem(HttpStatus.NOT_FOUND, 'not-found', `No such ${what} here.`);
  }

  static forbidden(code: string, detail: string): Problem {
    return new Problem(HttpStatus.FORBIDDEN, code, detail);
  }

  static conflict(code: string, detail: string, more?: Record<string, unknown>): Problem {
    return new Problem(HttpStatus.CONFLICT, code, detail, undefined, more);
  }

  /** One or several fields of the request cannot be used. */
  static invalid(fields: ProblemField[], detail = 'Some of what was sent cannot be used.'): Problem {
    return new Problem(HttpStatus.BAD_REQUEST, 'invalid-request', detail, fields);
  }

  body(): ProblemBody {
    return problemBody(this.getStatus(), this.code, this.detail, this.fields, this.more);
  }
}

export function problemBody(
  status: number,
  code: string,
  detail: string,
  fields?: ProblemField[],
  more?: Record<string, unknown>,
): ProblemBody {
  return {
    type: 'about:blank',
    title: STATUS_CODES[status] ?? 'Error',
    status,
    code,
    detail,
    ...(fields ? { fields } : {}),
    ...more,
  };
}
