/** One field the server would not accept. */
export interface ProblemField {
  path: string;
  code: string;
  message: string;
}

/** An answer of the server that says what was wrong (RFC 9457). */
export class Problem extends Error {
  override readonly name = 'Problem';

  constructor(
    readonly status: number,
    readonly code: string,
    title: string,
    readonly detail: string,
    readonly fields: ProblemField[],
    /** The whole answer, for problems that carry more than words. */
    readonly body: Readonly<Record<string, unknown>> = {},
  ) {
    super(detail || title);
  }
}

/** The server did not answer at all. */
export class Unreachable extends Error {
  override readonly name = 'Unreachable';

  constructor() {
    super('The server can’t be reached. Nothing you typed is lost; try again when the line is back.');
  }
}

const record = (value: unknown): Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)
    ? (value as Record<string, unknown>)
    : {};

const words = (value: unknown): string => (typeof value === 'string' ? value : '');

function readFields(value: unknown): ProblemField[] {
  if (!Array.isArray(value)) return [];
  return value
    .map(record)
    .map((field) => ({ path: words(field.path), code: words(field.code), message: words(field.message) }))
    .filter((field) => field.message !== '');
}

/** Turns a failed answer into a `Problem`, whatever its body holds. */
export async function readProblem(response: Response): Promise<Problem> {
  let body: Record<string, unknown> = {};
  try {
    body = record(await response.json());
  } catch {
    // A proxy may answer with a page; the status has to do.
  }
  const title = words(body.title) || `The server answered ${response.status}.`;
  return new Problem(
    response.status,
    words(body.code) || `http-${response.status}`,
    title,
    words(body.detail),
    readFields(body.fields),
    body,
  );
}

/** One sentence for a person, from anything that was thrown. */
export function sayProblem(error: unknown): string {
  if (error instanceof Problem || error instanceof Unreachable) return error.message;
  return 'Something went wrong here, not with what you typed. Try again.';
}
