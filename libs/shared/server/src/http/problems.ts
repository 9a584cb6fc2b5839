import { STATUS_CODES } from 'node:http';
import type { z } from 'zod';
import { PROBLEM_MEDIA_TYPE, sayRefusal, type Problem } from '@seamwright/shared/contracts';
import { RefusalError, type Refusal } from '@seamwright/shared/util';
import type { Response } from 'express';
import { refusalOfViolation } from '../database/violations';

const STATUS_OF: Readonly<Record<string, number>> = {
  unreadable: 400,
  'file-missing': 400,
  'key-missing': 400,
  'not-signed-in': 401,
  'not-allowed': 403,
  'not-found': 404,
  'no-such-address': 404,
  'already-there': 409,
  'in-use': 409,
  'not-changeable': 409,
  'move-not-allowed': 409,
  'key-in-use': 409,
  stale: 412,
  'too-large': 413,
  'wrong-media-type': 415,
  'version-missing': 428,
  'too-many': 429,
};

/** Carries an HTTP status that differs from the code's usual one, and more than one field fault. */
export class ProblemError extends Error {
  constructor(
    readonly status: number,
    readonly refusal: Refusal,
    readonly errors: readonly { pointer: string; message: string }[] = [],
  ) {
    super(`Refused: ${refusal.code}`);
    this.name = 'ProblemError';
  }
}

export const notFound = (): RefusalError => new RefusalError({ code: 'not-found', params: {} });
export const stale = (): RefusalError => new RefusalError({ code: 'stale', params: {} });
/** A deed that the present state does not allow: 409. */
export const conflict = (code: string, params: Refusal['params'] = {}): ProblemError =>
  new ProblemError(409, { code, params });

const pointerOf = (path: PropertyKey[]): string => path.map((part) => `/${String(part)}`).join('');

/** Field faults as JSON pointers; an unknown field is named itself. */
export function faultsOf(error: z.ZodError, prefix = ''): { pointer: string; message: string }[] {
  return error.issues.flatMap((issue) =>
    issue.code === 'unrecognized_keys'
      ? issue.keys.map((key) => ({ pointer: `${prefix}${pointerOf(issue.path)}/${key}`, message: 'Unknown field.' }))
      : [{ pointer: `${prefix}${pointerOf(issue.path)}`, message: issue.message }],
  );
}

/** The problem document for anything that was thrown. What is not a refusal is 500 and says nothing of the inside. */
export function problemOf(error: unknown, instance: string): Problem {
  if (error instanceof ProblemError) return document(error.status, error.refusal, instance, error.errors);
  if (error instanceof RefusalError) return refused(error.refusal, instance);
  const violation = refusalOfViolation(error);
  if (violation) return refused(violation, instance);
  return document(500, { code: 'unexpected', params: {} }, instance, []);
}

function refused(refusal: Refusal, instance: string): Problem {
  const errors = refusal.pointer ? [{ pointer: refusal.pointer, message: sayRefusal(refusal) }] : [];
  return document(STATUS_OF[refusal.code] ?? 422, refusal, instance, errors);
}

function document(
  status: number,
  refusal: Refusal,
  instance: string,
  errors: Problem['errors'] | readonly Problem['errors'][number][],
): Problem {
  return {
    type: `/problems/${refusal.code}`,
    title: STATUS_CODES[status] ?? 'Problem',
    status,
    detail: sayRefusal(refusal),
    instance,
    code: refusal.code,
    errors: [...errors],
  };
}

export function sendProblem(response: Response, problem: Problem): void {
  response.status(problem.status).type(PROBLEM_MEDIA_TYPE).send(JSON.stringify(problem));
}
