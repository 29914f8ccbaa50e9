import type { ErrorRequestHandler } from 'express';
import { randomUUID } from 'node:crypto';
import multer from 'multer';
import type { ProblemBody } from '#shared/contracts/problem.ts';
import { Problem } from './problem.ts';

/** The one place where a failure becomes an answer; what it does not know it hides behind a reference number. */
export const answerProblem: ErrorRequestHandler = (error, request, response, next) => {
  if (response.headersSent) return next(error);
  const problem = problemFrom(error);
  const reference = randomUUID().slice(0, 8);
  if (problem.code === 'unexpected') request.log.error({ err: error, reference }, 'a request failed');
  const body: ProblemBody = {
    code: problem.code,
    message: problem.message,
    ...problem.facts,
    ...(problem.code === 'unexpected' ? { reference } : {}),
  };
  response.status(problem.status).json(body);
};

/** Turns what the database, the file reader or the session layer throws into a Problem. */
export function problemFrom(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (error instanceof multer.MulterError && error.code === 'LIMIT_FILE_SIZE')
    return new Problem('too-large', 'The file is larger than this laboratory accepts.', { field: 'file' });
  const code = postgresCode(error);
  if (code === 'HB001')
    return new Problem('closed-case', 'This case is closed and sealed; it changes only by amendment.', {
      stillHolds: 'Nothing in the case was changed.',
    });
  if (code === '23505') return new Problem('already-there', 'This exists already; nothing was written twice.');
  if (code === '23503') return new Problem('not-valid', 'Something named here is not there any more.');
  if (hasStatus(error) && error.status === 403 && error.code === 'EBADCSRFTOKEN')
    return new Problem(
      'forged-request',
      'The page was open too long to be trusted. Load it again; what you typed is kept.',
    );
  if (hasStatus(error) && error.status === 413) return new Problem('too-large', 'The request is too large.');
  if (hasStatus(error) && error.status === 400) return new Problem('not-valid', 'The request could not be read.');
  return new Problem('unexpected', 'Something failed on our side. Nothing you had kept was lost.');
}

function postgresCode(error: unknown): string | undefined {
  const cause = error instanceof Error && error.cause instanceof Error ? error.cause : error;
  return typeof cause === 'object' && cause !== null && 'code' in cause && typeof cause.code === 'string'
    ? cause.code
    : undefined;
}

function hasStatus(error: unknown): error is { status: number; code?: string } {
  return typeof error === 'object' && error !== null && 'status' in error && typeof error.status === 'number';
}
