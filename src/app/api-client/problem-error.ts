import { HttpErrorResponse } from '@angular/common/http';
import { type Problem } from '@shared/contracts/problems';

/** What the API refused, as a problem; or that it could not be reached (status 0). */
export class ProblemError extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    readonly detail: string,
    /** message by JSON pointer of the request's body */
    readonly errors: readonly { pointer: string; detail: string }[],
    /** further members of the problem */
    readonly problem: Partial<Problem>,
  ) {
    super(detail);
    this.name = 'ProblemError';
  }

  /** The message at a field, if it has one. */
  at(pointer: string): string | undefined {
    return this.errors.find((error) => error.pointer === pointer)?.detail;
  }

  static from(error: unknown): ProblemError {
    if (error instanceof ProblemError) return error;
    if (error instanceof HttpErrorResponse) {
      const body = problemOf(error.error);
      if (body) return new ProblemError(error.status, body.type.split('/').at(-1) ?? '', body.detail, body.errors ?? [], body);
      if (error.status === 0)
        return new ProblemError(
          0,
          'offline',
          'Sealyard cannot be reached. What you typed is kept; try again when the connection is back.',
          [],
          {},
        );
    }
    return new ProblemError(500, 'unexpected', 'Something went wrong. Nothing was changed; try again.', [], {});
  }
}

function problemOf(body: unknown): Problem | null {
  if (typeof body === 'string') {
    try {
      return problemOf(JSON.parse(body));
    } catch {
      return null;
    }
  }
  return typeof body === 'object' && body !== null && 'type' in body && 'detail' in body ? (body as Problem) : null;
}
