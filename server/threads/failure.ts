import { PROBLEMS, type ProblemCode, type ProblemItem } from '#shared/api/problems.ts';
import { AttitudeError, type AttitudeErrorCode, type AttitudeFault } from '#shared/attitude/errors.ts';
import { DomainError } from '#server/domain/errors.ts';

/** An error on its way between threads, which carry plain values only. */
export type Failure =
  | { readonly kind: 'attitude'; readonly code: AttitudeErrorCode; readonly message: string; readonly faults: readonly AttitudeFault[]; readonly count: number }
  | { readonly kind: 'problem'; readonly code: ProblemCode; readonly message: string; readonly items: readonly ProblemItem[] }
  | { readonly kind: 'other'; readonly message: string };

export const WorkerFailure = {
  of(error: unknown): Failure {
    if (error instanceof AttitudeError) return { kind: 'attitude', code: error.code, message: error.message, faults: error.faults, count: error.count };
    if (isProblem(error)) return { kind: 'problem', code: error.code, message: error.message, items: error.items };
    return { kind: 'other', message: error instanceof Error ? (error.stack ?? error.message) : String(error) };
  },
  revive(failure: Failure): Error {
    switch (failure.kind) {
      case 'attitude': return new AttitudeError(failure.code, failure.message, failure.faults, failure.count);
      case 'problem': return new DomainError(failure.code, failure.message, failure.items);
      case 'other': return new Error(failure.message);
    }
  },
};

/** A refusal of a use case or of the reader of a body: both name their problem. */
function isProblem(error: unknown): error is Error & { code: ProblemCode; items: readonly ProblemItem[] } {
  return error instanceof Error && 'code' in error && 'items' in error && String(error.code) in PROBLEMS;
}
