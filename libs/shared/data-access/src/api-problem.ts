import { HttpErrorResponse } from '@angular/common/http';
import type { Problem } from '@seamwright/shared/contracts';
import { readProblem } from './problem-document';

/** A refused or failed call, as the screens show it. */
export class ApiProblem extends Error {
  constructor(readonly problem: Problem) {
    super(problem.detail);
    this.name = 'ApiProblem';
  }
}

const words = (status: number, code: string, title: string, detail: string): Problem => ({
  type: `/problems/${code}`,
  title,
  status,
  detail,
  instance: '',
  code,
  errors: [],
});

/** Whatever a call threw, as a problem that a person can act on. */
export function asProblem(error: unknown): Problem {
  if (error instanceof ApiProblem) return error.problem;
  if (error instanceof HttpErrorResponse) {
    if (error.status === 0) {
      return words(
        0,
        'offline',
        $localize`No connection`,
        $localize`The desk could not be reached. What you typed is kept; try again when the connection is back.`,
      );
    }
    const read = readProblem(typeof error.error === 'string' ? parsed(error.error) : error.error);
    if (read) return read;
    return words(
      error.status,
      'unexpected',
      error.statusText,
      $localize`Something went wrong on our side. Try again in a moment.`,
    );
  }
  return words(500, 'unexpected', '', $localize`Something went wrong on this page. Load it again.`);
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}
