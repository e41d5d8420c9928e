import { AttitudeError } from '#shared/attitude/errors.ts';
import { DomainError } from '../errors.ts';

/** Runs a computation of the core and turns its refusal into one that points into the body. */
export function pointingInto<T>(pointer: string, compute: () => T, within = ''): T {
  try {
    return compute();
  } catch (error) {
    if (!(error instanceof AttitudeError)) throw error;
    throw new DomainError(error.code, error.message, error.faults.map(({ index, component, message }) => ({
      pointer: index < 0 ? '' : `${pointer}/${index}${within}${component === undefined ? '' : `/${component}`}`,
      message,
    })));
  }
}
