import { arcTangentSource } from './kernels/arc-tangent.ts';
import { eulerSource } from './kernels/euler.ts';
import { rotationSource } from './kernels/rotation.ts';
import { sinCosSource } from './kernels/sin-cos.ts';
import { tablesSource } from './tables.ts';

/** Path below shared/attitude, and text, of every generated file. */
export function generatedFiles(): readonly (readonly [path: string, source: string])[] {
  return [
    ['arithmetic/tables.gen.ts', tablesSource()],
    ['arithmetic/sin-cos.gen.ts', sinCosSource()],
    ['arithmetic/arc-tangent.gen.ts', arcTangentSource()],
    ['kernels/euler.gen.ts', eulerSource()],
    ['kernels/rotation.gen.ts', rotationSource()],
  ];
}
