import { randomUUID } from 'node:crypto';
import type { VerifyInput, VerifyOutput } from '#shared/api/runs.ts';
import { LISTED_AT_MOST } from '#shared/attitude/errors.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { errorSentence } from '#shared/attitude/verification/error-sentence.ts';
import { verifyAttitudes, type StatedAttitudes, type Verification } from '#shared/attitude/verification/verify-attitudes.ts';
import { ENGINE } from '../attitude/engine.ts';
import { meterWarnings } from '../attitude/meter-warnings.ts';
import { readAttitudes } from '../attitude/read-attitudes.ts';
import { pointingInto } from '../attitude/refuse-attitudes.ts';
import { readTimes } from '../attitude/read-times.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import { DomainError } from '../errors.ts';
import type { Meter } from '../meter.ts';
import type { Identifier } from '#server/identification/identifier.ts';
import { diagnose } from './diagnose.ts';
import type { AttitudeRunDetail, RunDetail } from './present-run.ts';

const PER_RADIAN = { rad: 1, deg: 180 / Math.PI, arcsec: (180 * 3600) / Math.PI } as const;

/** What a verification leaves behind, for the run that is stored with its record. */
export interface VerifiedRun {
  readonly id: string;
  readonly label: string | null;
  readonly commitId: string | null;
  readonly verdict: 'pass' | 'fail';
  readonly count: number;
  readonly failed: number;
  readonly detail: RunDetail;
}

export interface VerifyContext {
  readonly identifier: Pick<Identifier, 'identify'>;
}

/** Explanations that a stored run keeps; how many there are is kept whole. */
const KEPT = 10;

/** Compares expected and actual attitudes; the run is stored by whoever records the call. */
export async function verify({ identifier }: VerifyContext, request: VerifyInput, meter: Meter): Promise<{ answer: VerifyOutput; run: VerifiedRun }> {
  if (request.expected.attitudes.length !== request.actual.attitudes.length) {
    throw new DomainError('count-mismatch', `${request.expected.attitudes.length} expected attitudes cannot be compared with ${request.actual.attitudes.length} actual ones.`, [{ pointer: '/actual/attitudes', message: `must hold as many attitudes as /expected/attitudes, ${request.expected.attitudes.length}` }]);
  }
  meter.spend(request.actual.attitudes.length, '/actual/attitudes');
  const expected = read(request.expected, '/expected');
  const actual = read(request.actual, '/actual');
  const { tolerance } = request;
  if (request.times) readTimes(request.times, request.actual.attitudes.length, '/actual/attitudes');
  const scale = PER_RADIAN[tolerance.unit];
  const result = compared(expected, actual, tolerance.angle / scale, request.repair ?? 'none');

  meterWarnings(meter, result.repaired);
  const diagnosis = request.diagnose && result.failed > 0 ? await diagnose(identifier, expected, actual, request) : null;
  const detail: AttitudeRunDetail = {
    ...detailOf(result, tolerance, scale, expected.convention, actual.convention),
    ...(diagnosis ? { diagnosis: { ...diagnosis, explanations: diagnosis.explanations.slice(0, KEPT) } } : {}),
  };
  const run: VerifiedRun = {
    id: randomUUID(), label: request.label ?? null, commitId: request.commit ?? null,
    verdict: result.failed > 0 ? 'fail' : 'pass', count: result.count, failed: result.failed, detail,
  };
  const { worst, statistics, failures, summary, engine } = detail;
  return { run, answer: { verdict: run.verdict, run: run.id, count: run.count, failed: run.failed, worst: { ...worst, axisBody: [...worst.axisBody] as [number, number, number] }, statistics, failures: [...failures], summary, engine, ...(result.repaired.length > 0 ? { warnings: result.repaired as NonNullable<VerifyOutput['warnings']> } : {}), ...(diagnosis ? { diagnosis } : {}) } };
}

function read({ convention: reference, attitudes }: VerifyInput['expected'], pointer: string): StatedAttitudes {
  const convention = resolveConvention(reference, `${pointer}/convention`);
  return { convention, numbers: readAttitudes(attitudes, convention, `${pointer}/attitudes`) };
}

/** What is wrong with one side points into that side. */
function compared(expected: StatedAttitudes, actual: StatedAttitudes, tolerance: number, repair: 'none' | 'nearest'): Verification {
  return pointingInto('/actual/attitudes', () => {
    try {
      return verifyAttitudes(expected, actual, tolerance, repair);
    } catch (error) {
      pointingInto('/expected/attitudes', () => createConverter(expected.convention, expected.convention, { repair }).convert(expected.numbers));
      throw error;
    }
  });
}

function detailOf({ angles, worst, statistics }: Verification, tolerance: VerifyInput['tolerance'], scale: number, expected: Convention, actual: Convention): AttitudeRunDetail {
  const { unit } = tolerance;
  const failures: { index: number; angle: number }[] = [];
  for (let index = 0; index < angles.length && failures.length < LISTED_AT_MOST; index++) {
    if (angles[index]! > tolerance.angle / scale) failures.push({ index, angle: angles[index]! * scale });
  }
  return {
    expected, actual, tolerance, failures,
    worst: { index: worst.index, angle: worst.angle * scale, unit, axisBody: worst.axisBody },
    statistics: { rms: statistics.rms * scale, median: statistics.median * scale, p95: statistics.p95 * scale, max: statistics.max * scale, unit },
    summary: `Worst at attitude ${worst.index}: ${errorSentence(worst.angle * scale, unit, worst.axisBody)}`,
    engine: ENGINE,
  };
}
