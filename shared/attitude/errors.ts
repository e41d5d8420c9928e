/** Why a number, a convention or a pair of conventions cannot be used. Callers branch on `code`, never on text. */
export type AttitudeErrorCode =
  | 'not-finite'
  | 'out-of-range'
  | 'not-a-rotation'
  | 'zero-norm'
  | 'count-mismatch'
  | 'improper-axes'
  | 'unrelated-frames'
  | 'not-representable'
  | 'invalid-convention';

/** One thing wrong with one attitude of a batch, or with a facet (then `index` is −1). */
export interface AttitudeFault {
  /** Index of the attitude in the batch, counted over all calls of one converter. */
  readonly index: number;
  /** Index of the number within the attitude where that can be said. */
  readonly component?: number;
  readonly message: string;
  /** Measured defect (norm defect of a quaternion, orthogonality defect of a matrix), where there is one. */
  readonly defect?: number;
}

/** How many faults and indices an error or warning lists; the count itself is always complete. */
export const LISTED_AT_MOST = 100;

/** Thrown by every function of the numerical core that refuses its input. */
export class AttitudeError extends Error {
  override readonly name = 'AttitudeError';
  readonly code: AttitudeErrorCode;
  /** The first 100. */
  readonly faults: readonly AttitudeFault[];
  /** How many attitudes are at fault in all. */
  readonly count: number;

  constructor(code: AttitudeErrorCode, message: string, faults: readonly AttitudeFault[] = [], count = faults.length) {
    super(message);
    this.code = code;
    this.faults = faults.slice(0, LISTED_AT_MOST);
    this.count = count;
  }
}
