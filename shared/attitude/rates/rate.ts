import type { Convention, EulerConvention } from '../convention.ts';

export const RATE_KINDS = ['body', 'euler', 'reference', 'quaternion', 'dcm'] as const;
export type RateKind = (typeof RATE_KINDS)[number];
export const RATE_UNITS = ['deg/s', 'rad/s'] as const;
export type RateUnit = (typeof RATE_UNITS)[number];

/**
 * How fast an attitude changes, stated as numbers. `body` and `reference`: the angular velocity of the body axes
 * relative to the reference axes, components in body or in reference axes. `euler`: time derivatives of the angles of
 * `angles`, in its order and signs. `quaternion`, `dcm`: time derivatives of the attitude's own numbers, in their order.
 */
export type Rate =
  | { readonly rate: 'body' | 'reference'; readonly unit: RateUnit }
  | { readonly rate: 'euler'; readonly unit: RateUnit; readonly angles: EulerConvention }
  | { readonly rate: 'quaternion' | 'dcm' };

export const NUMBERS_PER_RATE: Readonly<Record<RateKind, number>> = { body: 3, euler: 3, reference: 3, quaternion: 4, dcm: 9 };

/** Whether a rate can be stated beside attitudes in a convention: derivatives of numbers need those numbers. */
export const rateFits = (attitude: Convention, { rate }: Rate): boolean => (rate === 'quaternion' || rate === 'dcm' ? attitude.representation === rate : true);
