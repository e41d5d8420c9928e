import type { Convention, EulerConvention } from './convention.ts';
import { STANDARD_PRESETS } from './standard-presets.ts';

/** A convention with a name. */
export interface Preset {
  readonly id: string;
  readonly title: string;
  readonly description: string;
  readonly convention: Convention;
  /** The open standard that states it; null for one of ours. */
  readonly standard: { readonly name: string; readonly clause: string; readonly checked: 'confirmed' | 'from memory'; readonly note?: string } | null;
  /** One attitude: nose 030° true, 10° up, right wing 20° down; each number the double nearest to the exact one. */
  readonly worked: { readonly reading: string; readonly numbers: readonly number[] };
}

const READING = 'nose 030.0° true, 10.0° up, right wing 20.0° down';

const euler = (facets: Partial<EulerConvention>): EulerConvention => ({
  representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed', ...facets,
});

/** The fixed presets, whose ids pipelines rely on. */
export const AIRCRAFT_PRESETS: readonly Preset[] = [
  {
    id: 'aircraft-euler-deg', title: 'Yaw, pitch, roll in degrees', standard: null,
    description: 'Heading, pitch and bank of an aircraft as flight dynamics uses them: from north-east-down to forward-right-down, yaw first.',
    convention: euler({}), worked: { reading: READING, numbers: [30, 10, 20] },
  },
  {
    id: 'aircraft-euler-rad', title: 'Yaw, pitch, roll in radians', standard: null,
    description: 'As aircraft-euler-deg, in radians. The double nearest to π/2 is not quite a right angle.',
    convention: euler({ unit: 'rad' }), worked: { reading: READING, numbers: [0.5235987755982989, 0.17453292519943295, 0.3490658503988659] },
  },
  {
    id: 'aircraft-euler-rpy-deg', title: 'Roll, pitch, yaw in degrees', standard: null,
    description: 'The same rotations as aircraft-euler-deg, listed roll first.',
    convention: euler({ order: [3, 2, 1] }), worked: { reading: READING, numbers: [20, 10, 30] },
  },
  {
    id: 'aircraft-euler-rpy-rad', title: 'Roll, pitch, yaw in radians', standard: null,
    description: 'The same rotations as aircraft-euler-rad, listed roll first.',
    convention: euler({ order: [3, 2, 1], unit: 'rad' }), worked: { reading: READING, numbers: [0.3490658503988659, 0.17453292519943295, 0.5235987755982989] },
  },
  {
    id: 'aircraft-quaternion', title: 'Quaternion, scalar first', standard: null,
    description: 'Scalar first, Hamilton’s product, turning body components into reference components: q = q_z(yaw) q_y(pitch) q_x(roll).',
    convention: { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
    worked: { reading: READING, numbers: [0.9515485246437886, 0.14487812541736916, 0.12767944069578066, 0.23929833774473033] },
  },
  {
    id: 'aircraft-dcm', title: 'Direction cosine matrix', standard: null,
    description: 'The matrix that turns reference components into body components, row by row: C = R1(roll) R2(pitch) R3(yaw).',
    convention: { representation: 'dcm', reference: 'NED', body: 'FRD', maps: 'reference-to-body', layout: 'row-major' },
    worked: {
      reading: READING,
      numbers: [0.8528685319524432, 0.492403876506104, -0.17364817766693036, -0.4184120444167326, 0.843493268656316, 0.33682408883346515, 0.3123245560187264, -0.21461017714275643, 0.9254165783983234],
    },
  },
];

export const PRESETS: readonly Preset[] = [...AIRCRAFT_PRESETS, ...STANDARD_PRESETS];
