import { AttitudeError, type AttitudeErrorCode, type AttitudeFault } from '#shared/attitude/errors.ts';

/** An error on its way between threads, which carry plain values only. */
export type Failure =
  | { readonly kind: 'attitude'; readonly code: AttitudeErrorCode; readonly message: string; readonly faults: readonly AttitudeFault[]; readonly count: number }
  | { readonly kind: 'other'; readonly message: string };

export const WorkerFailure = {
  of(error: unknown): Failure {
    if (error instanceof AttitudeError) return { kind: 'attitude', code: error.code, message: error.message, faults: error.faults, count: error.count };
    return { kind: 'other', message: error instanceof Error ? (error.stack ?? error.message) : String(error) };
  },
  revive(failure: Failure): Error {
    return failure.kind === 'attitude' ? new AttitudeError(failure.code, failure.message, failure.faults, failure.count) : new Error(failure.message);
  },
};
