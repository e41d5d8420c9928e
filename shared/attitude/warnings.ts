/** What an answer must say of itself beside its numbers. */
export type AttitudeWarningCode =
  | 'near-gimbal-lock'
  | 'severe-gimbal-lock'
  | 'gimbal-lock'
  | 'renormalised'
  | 'reorthonormalised';

/** The worst case behind a warning. Angles in degrees; `condition` is κ = 1/|cos(middle angle)|, null at exact lock. */
export interface WorstCase {
  readonly index: number;
  readonly condition?: number | null;
  readonly digitsLost?: number | null;
  /** Angle left to gimbal lock. */
  readonly marginDeg?: number;
  /** The combination of first and last applied angle that stays well conditioned near lock. */
  readonly wellConditioned?: { readonly combination: 'first-minus-last' | 'first-plus-last'; readonly angle: number; readonly unit: 'deg' | 'rad' };
  /** Norm or orthogonality defect that was repaired. */
  readonly defect?: number;
}

export interface AttitudeWarning {
  readonly code: AttitudeWarningCode;
  readonly message: string;
  readonly count: number;
  /** The first 100. */
  readonly indices: readonly number[];
  readonly worst: WorstCase;
}
