import type { Convention } from './convention.ts';
import type { AttitudeErrorCode } from './errors.ts';
import { elementMap, IDENTITY, transposesMatrix } from './kernels/frames.ts';
import { largestElement, loadMatrix, orthogonalityDefect, scaledDeterminant, SINGULAR } from './kernels/read-matrix.ts';
import { normDefect } from './kernels/read-quaternion.ts';
import { REFUSED_DEFECT } from './kernels/status.ts';
import { determinantOf } from './relabelling.ts';

/** Why one attitude's numbers cannot be used. */
export interface Refusal {
  readonly code: AttitudeErrorCode;
  readonly message: string;
  readonly component?: number;
  readonly defect?: number;
}

/** What is wrong with numbers that a reader of this convention has refused. */
export function refusalOf(convention: Convention, numbers: Float64Array): Refusal {
  const component = numbers.findIndex((number) => !Number.isFinite(number));
  if (component >= 0) return { code: 'not-finite', component, message: `number ${component} is ${numbers[component]}; every number must be finite` };
  switch (convention.representation) {
    case 'quaternion': {
      const defect = normDefect(...(numbers as unknown as [number, number, number, number]));
      if (defect === Infinity) return { code: 'zero-norm', message: 'is zero: a quaternion of norm 0 has no direction', defect: 1 };
      return { code: 'not-a-rotation', defect, message: `has a norm off 1 by ${defect.toPrecision(3)}; more than ${REFUSED_DEFECT} is refused unless options.repair is "nearest"` };
    }
    case 'dcm': return matrixRefusal(convention, numbers);
    default: return { code: 'zero-norm', message: `has a zero axis with the angle ${numbers[3]}; a zero axis may only stand with angle 0` };
  }
}

function matrixRefusal(convention: Convention, numbers: Float64Array): Refusal {
  const transposed = transposesMatrix(convention);
  const reading = { elements: elementMap({ left: IDENTITY, right: IDENTITY }, transposed, false), determinant: determinantOf(convention), repair: 'none' } as const;
  loadMatrix(reading, numbers, 0);
  const largest = largestElement();
  const scaled = largest === 0 ? 0 : scaledDeterminant(largest);
  if (!(Math.abs(scaled) > SINGULAR)) return { code: 'not-a-rotation', message: 'is singular: its determinant is 0 to rounding', defect: 1 };
  const defect = orthogonalityDefect();
  if (scaled > 0 !== reading.determinant > 0) {
    return { code: 'not-a-rotation', defect, message: `has a determinant of about ${scaledDeterminant(1).toPrecision(6)}; between ${convention.reference} and ${convention.body} it must be ${reading.determinant}: this is a reflection` };
  }
  return { code: 'not-a-rotation', defect, message: `is not orthogonal by ${defect.toPrecision(3)} (largest element of M Mᵀ − I); more than ${REFUSED_DEFECT} is refused unless options.repair is "nearest"` };
}
