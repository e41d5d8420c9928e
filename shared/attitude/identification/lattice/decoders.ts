import type { Decoder } from './decoder.ts';
import { EULER_DECODERS } from './euler-decoders.ts';
import { MATRIX_DECODERS, MATRIX_POWER_DECODERS } from './matrix-decoders.ts';
import { QUATERNION_DECODERS } from './quaternion-decoders.ts';
import { AXIS_ANGLE_DECODERS, VECTOR_DECODERS } from './vector-decoders.ts';

/** Every way to read attitudes of so many numbers; what a box claims to list is not believed. */
export function decodersFor(width: 3 | 4 | 9, mirrored: boolean): readonly Decoder[] {
  switch (width) {
    case 3: return [...EULER_DECODERS, ...VECTOR_DECODERS];
    case 4: return [...QUATERNION_DECODERS, ...AXIS_ANGLE_DECODERS];
    case 9: return mirrored ? MATRIX_DECODERS : [...MATRIX_DECODERS, ...MATRIX_POWER_DECODERS];
  }
}
