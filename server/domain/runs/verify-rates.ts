import { randomUUID } from 'node:crypto';
import type { VerifyRatesInput, VerifyRatesOutput } from '#shared/api/runs.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import { LISTED_AT_MOST } from '#shared/attitude/errors.ts';
import { NUMBERS_PER_RATE } from '#shared/attitude/rates/rate.ts';
import { LARGEST_COMPONENT } from '#shared/attitude/refuse-out-of-range.ts';
import { rateErrorSentence } from '#shared/attitude/verification/error-sentence.ts';
import { verifyRates, type RateVerification, type StatedRates } from '#shared/attitude/verification/verify-rates.ts';
import { ENGINE } from '../attitude/engine.ts';
import { readAttitudes, readRows } from '../attitude/read-attitudes.ts';
import { pointingInto } from '../attitude/refuse-attitudes.ts';
import { resolveRate } from '../attitude/resolve-rate.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import { DomainError } from '../errors.ts';
import type { Meter } from '../meter.ts';
import type { RateRunDetail } from './present-run.ts';
import type { VerifiedRun } from './verify.ts';

const PER_RADIAN = { 'rad/s': 1, 'deg/s': 180 / Math.PI } as const;

/** Compares expected and actual rates; the run is stored by whoever records the call. */
export function verifyStatedRates(request: VerifyRatesInput, meter: Meter): { answer: VerifyRatesOutput; run: VerifiedRun } {
  const count = request.attitude.attitudes.length;
  for (const side of ['expected', 'actual'] as const) {
    if (request[side].rates.length === count) continue;
    const message = `must hold as many rates as there are attitudes in /attitude/attitudes, ${count}`;
    throw new DomainError('count-mismatch', `/${side}/rates ${message}.`, [{ pointer: `/${side}/rates`, message }]);
  }
  meter.spend(count, '/attitude/attitudes');
  const attitude = resolveConvention(request.attitude.convention, '/attitude/convention');
  const attitudes = readAttitudes(request.attitude.attitudes, attitude, '/attitude/attitudes');
  const [expected, actual] = [read(request.expected, attitude, '/expected'), read(request.actual, attitude, '/actual')];
  const { tolerance } = request;
  const scale = PER_RADIAN[tolerance.unit];
  const result = pointingInto('/attitude/attitudes', () => verifyRates(attitude, attitudes, expected, actual, tolerance.rate / scale));
  const detail = { ...detailOf(result, tolerance, scale), attitude, expected: expected.rate, actual: actual.rate } as unknown as RateRunDetail;
  const run: VerifiedRun = {
    id: randomUUID(), label: request.label ?? null, commitId: request.commit ?? null,
    verdict: result.failed > 0 ? 'fail' : 'pass', count, failed: result.failed, detail,
  };
  const { worst, statistics, failures, summary, engine } = detail;
  return { run, answer: { verdict: run.verdict, run: run.id, count, failed: run.failed, worst: { ...worst, axisBody: [...worst.axisBody] as [number, number, number] }, statistics, failures: [...failures], summary, engine } };
}

function read({ rate: named, rates }: VerifyRatesInput['expected'], attitude: Convention, pointer: string): StatedRates {
  const rate = resolveRate(named, attitude, `${pointer}/rate`);
  return { rate, numbers: readRows(rates, { width: NUMBERS_PER_RATE[rate.rate], mayNest: false, taker: `the rate "${rate.rate}"`, pointer: `${pointer}/rates`, within: '', most: LARGEST_COMPONENT }) };
}

function detailOf({ sizes, worst, statistics }: RateVerification, tolerance: VerifyRatesInput['tolerance'], scale: number) {
  const { unit } = tolerance;
  const failures: { index: number; rate: number }[] = [];
  for (let index = 0; index < sizes.length && failures.length < LISTED_AT_MOST; index++) {
    if (sizes[index]! > tolerance.rate / scale) failures.push({ index, rate: sizes[index]! * scale });
  }
  return {
    kind: 'rates', tolerance, failures,
    worst: { index: worst.index, rate: worst.size * scale, unit, axisBody: worst.axisBody },
    statistics: { rms: statistics.rms * scale, median: statistics.median * scale, p95: statistics.p95 * scale, max: statistics.max * scale, unit },
    summary: `Worst at sample ${worst.index}: ${rateErrorSentence(worst.size * scale, unit, worst.axisBody)}`,
    engine: ENGINE,
  };
}
