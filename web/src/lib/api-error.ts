import type { components } from './contract.gen.ts';

export type Problem = components['schemas']['Problem'];

/** The service refused, and says why. Pages branch on `code`. */
export class ApiError extends Error {
  override readonly name = 'ApiError';
  readonly problem: Problem;

  constructor(problem: Problem) {
    super(problem.detail);
    this.problem = problem;
  }

  get code(): string {
    return this.problem.code;
  }
}

/** The service could not be reached, or answered with something that is no answer of it. */
export class UnreachableError extends Error {
  override readonly name = 'UnreachableError';
}
