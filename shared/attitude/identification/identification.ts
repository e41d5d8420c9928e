import type { AngleUnit, Convention } from '../convention.ts';
import type { NumbersAre } from './lattice/decoder.ts';

/** A constant rotation on one side: decode(o) = C T (reference) or T C (body), T the frame rotation about the axis. */
export interface ConstantOffset {
  readonly side: 'reference' | 'body';
  /** Unit axis in NED (or the named frame) for the reference side, in FRD for the body side. */
  readonly axis: readonly [number, number, number];
  readonly angle: number;
  readonly unit: AngleUnit;
}

/** A statement that is the same numbers for all attitudes. */
export interface EquivalentStatement {
  readonly convention: Convention;
  readonly numbersAre?: NumbersAre;
  readonly constantOffset?: readonly ConstantOffset[];
}

/** One way to explain the data: a convention, with what else it takes. */
export interface Explanation extends EquivalentStatement {
  /** o(t) = C(t − seconds). */
  readonly timeLag?: { readonly seconds: number };
  /** The numbers are this many times those of the convention. */
  readonly scale?: number;
  /** What to change in the stated convention, one sentence each; empty where it is right as it stands. */
  readonly edits: readonly string[];
  /** Of the error angles: their root mean square, √3 times the noise where the explanation is right, and the largest. */
  readonly residual: { readonly rms: number; readonly max: number; readonly unit: AngleUnit };
  /** The next fewest edits; cut after a dozen. */
  readonly sameNumbersAs: readonly EquivalentStatement[];
}

/** An attitude that would tell remaining explanations apart. */
export interface DiscriminatingAttitude {
  /** In the reference's convention. */
  readonly attitude: readonly number[];
  readonly reading: string;
  readonly separates: {
    /** How many different answers the explanations predict there, and of how many explanations. */
    readonly answers: number;
    readonly explanations: number;
    /** What a box would list there, with the explanations (by their place) that say so. */
    readonly predictions: readonly { readonly numbers: readonly number[]; readonly explanations: readonly number[] }[];
  };
}

/** The plainest explanation that was given up, and by how much. */
export interface RunnerUp {
  readonly convention: Convention;
  readonly numbersAre?: NumbersAre;
  readonly edits: readonly string[];
  readonly residual: { readonly rms: number; readonly unit: AngleUnit };
  /** The residual over what the stated noise would leave. */
  readonly timesNoise: number;
}

export interface Identification {
  readonly outcome: 'unique' | 'ambiguous' | 'none';
  /** Fewest edits first; at most 100. */
  readonly explanations: readonly Explanation[];
  /** How many explanations remain in all. */
  readonly remaining: number;
  /** What these data cannot tell, in plain words. */
  readonly unobservable: readonly string[];
  /** At most three, best first; each after what the ones before it separate. */
  readonly discriminating: readonly DiscriminatingAttitude[];
  readonly runnerUp: RunnerUp | null;
}
