import type { Convention } from '#shared/attitude/convention.ts';

/** How finely a unit writes its numbers: as they are computed, as 32-bit floats, as 16-bit fractions of 1, or to so many decimals. */
export type Resolution = 'float64' | 'float32' | 'fraction16' | { readonly decimals: number };

export interface ScenarioUnit {
  readonly slug: string;
  readonly name: string;
  readonly supplier: string;
  /** What the interface control document says in prose. */
  readonly states: string;
  /** The same in facets. */
  readonly convention: Convention;
  readonly resolution: Resolution;
  readonly samplesPerSecond: number;
}

/** The aircraft's units; each supplier is invented. */
export const UNITS = {
  inertialUnit: {
    slug: 'inertial-unit', name: 'Inertial unit', supplier: 'Harvenook Instruments', samplesPerSecond: 50, resolution: 'float32',
    states: 'Attitude as a quaternion, scalar first, from body axes (forward, right, down) to north-east-down.',
    convention: { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'continuous' },
  },
  autopilot: {
    slug: 'autopilot', name: 'Autopilot', supplier: 'Quillfeather Controls', samplesPerSecond: 50, resolution: 'float64',
    states: 'Roll, pitch and yaw in radians, aircraft order.',
    convention: { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'rad', order: [3, 2, 1], signs: [1, 1, 1], range: 'signed' },
  },
  cameraGimbal: {
    slug: 'camera-gimbal', name: 'Camera gimbal', supplier: 'Teaselwick Optics', samplesPerSecond: 50, resolution: 'float32',
    states: 'Orientation quaternion x, y, z, w of the body (forward, left, up) in east-north-up.',
    convention: { representation: 'quaternion', reference: 'ENU', body: 'FLU', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
  },
  flightSimulator: {
    slug: 'flight-simulator', name: 'Flight simulator', supplier: 'Marrowfen Simulation', samplesPerSecond: 50, resolution: 'float64',
    // Left-handed on both sides, so the matrix is a rotation all the same.
    states: 'Body-to-world matrix by columns; world x east, y up, z north; body x right, y up, z forward.',
    convention: { representation: 'dcm', reference: 'EUN', body: 'RUF', maps: 'body-to-reference', layout: 'column-major' },
  },
  groundDisplay: {
    slug: 'ground-display', name: 'Ground display', supplier: 'Lampwright Displays', samplesPerSecond: 10, resolution: { decimals: 2 },
    states: 'Heading 0 to 360, pitch and bank in degrees, two decimals.',
    convention: { representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'positive' },
  },
} as const satisfies Record<string, ScenarioUnit>;
