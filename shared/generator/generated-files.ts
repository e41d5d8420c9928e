import { arcTangentSource } from './kernels/arc-tangent.ts';
import { eulerSource } from './kernels/euler.ts';
import { quickArcTangentSource } from './kernels/quick-arc-tangent.ts';
import { quickEulerSource } from './kernels/quick-euler.ts';
import { quickRotationSource } from './kernels/quick-rotation.ts';
import { quickSinCosSource } from './kernels/quick-sin-cos.ts';
import { rotationSource } from './kernels/rotation.ts';
import { sinCosSource } from './kernels/sin-cos.ts';
import { tablesSource } from './tables.ts';

/** Path below shared/attitude, and text, of every generated file. */
export function generatedFiles(): readonly (readonly [path: string, source: string])[] {
  return [
    ['arithmetic/tables.gen.ts', tablesSource()],
    ['arithmetic/sin-cos.gen.ts', sinCosSource()],
    ['arithmetic/arc-tangent.gen.ts', arcTangentSource()],
    ['arithmetic/quick-sin-cos.gen.ts', quickSinCosSource()],
    ['arithmetic/quick-arc-tangent.gen.ts', quickArcTangentSource()],
    ['kernels/quick-euler.gen.ts', quickEulerSource()],
    ['kernels/quick-rotation.gen.ts', quickRotationSource()],
    ['kernels/euler.gen.ts', eulerSource()],
    ['kernels/rotation.gen.ts', rotationSource()],
  ];
}
