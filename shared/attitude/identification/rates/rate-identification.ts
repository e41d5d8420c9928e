import type { Convention } from '../../convention.ts';
import type { Rate, RateUnit } from '../../rates/rate.ts';
import type { DiscriminatingAttitude } from '../identification.ts';

/** Rates that are stated this way are these numbers, at every attitude. */
export interface RateStatement {
  readonly attitude: Convention;
  readonly rate: Rate;
}

export interface RateExplanation extends RateStatement {
  /** What to change in what was stated, one sentence each. */
  readonly edits: readonly string[];
  /** Of the differences of the angular velocities: root mean square and largest. */
  readonly residual: { readonly rms: number; readonly max: number; readonly unit: RateUnit };
  /** The next fewest edits; cut after a dozen. */
  readonly sameNumbersAs: readonly RateStatement[];
}

export interface RateIdentification {
  readonly outcome: 'unique' | 'ambiguous' | 'none';
  /** Fewest edits first; at most 100. */
  readonly explanations: readonly RateExplanation[];
  readonly remaining: number;
  readonly unobservable: readonly string[];
  /** At most three; each reading also names the body axis to turn about. */
  readonly discriminating: readonly DiscriminatingAttitude[];
}
