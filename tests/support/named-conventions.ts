import type { Convention } from '#shared/attitude/convention.ts';

const AXES = { reference: 'NED', body: 'FRD' } as const;

/** One convention or more of every representation, by the names that the accuracy, speed and identity programs print. */
export const CONVENTIONS = {
  'euler rad': { ...AXES, representation: 'euler', sequence: 'ZYX', motion: 'intrinsic', unit: 'rad', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
  'euler deg': { ...AXES, representation: 'euler', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
  'euler ZXZ': { ...AXES, representation: 'euler', sequence: 'ZXZ', motion: 'intrinsic', unit: 'rad', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
  quaternion: { ...AXES, representation: 'quaternion', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
  'quaternion ENU': { reference: 'ENU', body: 'FLU', representation: 'quaternion', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
  dcm: { ...AXES, representation: 'dcm', maps: 'reference-to-body', layout: 'row-major' },
  'rotation vector': { ...AXES, representation: 'rotation-vector', maps: 'body-to-reference', unit: 'rad' },
  'axis-angle': { ...AXES, representation: 'axis-angle', maps: 'body-to-reference', unit: 'deg' },
  mrp: { ...AXES, representation: 'mrp', maps: 'body-to-reference', shadow: 'inside' },
  gibbs: { ...AXES, representation: 'gibbs', maps: 'body-to-reference' },
} as const satisfies Record<string, Convention>;

export type ConventionName = keyof typeof CONVENTIONS;
