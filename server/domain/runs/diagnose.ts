import type { IdentificationDocument } from '#shared/api/identify.ts';
import type { VerifyInput } from '#shared/api/runs.ts';
import type { StatedAttitudes } from '#shared/attitude/verification/verify-attitudes.ts';
import type { Identifier } from '#server/identification/identifier.ts';

/** A pass leaves errors of a fifth of the tolerance or so: what is within that is no mistake of convention. */
const NOISE_PER_TOLERANCE = 1 / 5;
const ARCSEC_PER_DEG = 3600;

/** Which mistakes would explain the actual attitudes. */
export async function diagnose(identifier: Pick<Identifier, 'identify'>, expected: StatedAttitudes, actual: StatedAttitudes, { tolerance, times }: Pick<VerifyInput, 'tolerance' | 'times'>): Promise<IdentificationDocument> {
  const identification = await identifier.identify({
    reference: { convention: expected.convention, attitudes: expected.numbers },
    observed: { representation: actual.convention.representation, numbers: actual.numbers, stated: actual.convention },
    ...(times ? { times: Float64Array.from(times) } : {}),
    noise: tolerance.unit === 'arcsec'
      ? { angle: (tolerance.angle / ARCSEC_PER_DEG) * NOISE_PER_TOLERANCE, unit: 'deg' }
      : { angle: tolerance.angle * NOISE_PER_TOLERANCE, unit: tolerance.unit },
  });
  return identification as unknown as IdentificationDocument;
}
