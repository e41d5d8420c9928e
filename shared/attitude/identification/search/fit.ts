import type { Decoder } from '../lattice/decoder.ts';

/** Continuous parameters of a hypothesis. */
export type Block = 'reference' | 'body' | 'lag' | 'scale';

export interface Hidden {
  /** Parameters that others could take over without a trace in these data: [fitted, the other]. */
  readonly inseparable: readonly (readonly [Block, Block])[];
  /** Parameters not fitted that could be of any size, alone or together, without a trace in these data. */
  readonly unseen: readonly Block[];
}

export const NOTHING_HIDDEN: Hidden = { inseparable: [], unseen: [] };

/** A hypothesis with its parameters fitted: M(numbers / scale) = B C(t − lag) A for the decoder's matrices M. */
export interface Fit {
  readonly decoder: Decoder;
  /** Place in the list of decoders. */
  readonly index: number;
  /** The turn that B is, or null where an offset on the body side is fitted; likewise A's inverse on the reference side. */
  readonly bodyTurn: number | null;
  readonly referenceTurn: number | null;
  readonly b: Float64Array;
  readonly a: Float64Array;
  /** Where the sums were taken; the lag and the scale lie within a short step of it. */
  readonly place: Place;
  readonly lag: number;
  readonly scale: number;
  readonly freed: readonly Block[];
  /** Σ |r|², rad², over `count` samples. */
  readonly squaredError: number;
  readonly count: number;
  /** What the data leave open about the parameters; reckoned when asked for. */
  readonly hidden: () => Hidden;
}

export const keyOf = ({ index, bodyTurn, referenceTurn, freed }: Fit): string => `${index}/${bodyTurn ?? '*'}/${referenceTurn ?? '*'}/${freed.includes('lag') ? 'lag' : ''}${freed.includes('scale') ? 'scale' : ''}`;

/** Where the lag and the scale of a hypothesis are held while everything else is fitted. */
export interface Place {
  readonly lag: number;
  readonly scale: number;
  readonly freed: readonly ('lag' | 'scale')[];
}

export const AT_REST: Place = { lag: 0, scale: 1, freed: [] };
