import type { RatesInput, RatesOutput } from '#shared/api/rates.ts';
import { createRateConverter } from '#shared/attitude/rates/rate-converter.ts';
import { NUMBERS_PER_RATE, type Rate } from '#shared/attitude/rates/rate.ts';
import { LARGEST_COMPONENT } from '#shared/attitude/refuse-out-of-range.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import type { Meter } from '../meter.ts';
import { ENGINE } from './engine.ts';
import { meterWarnings } from './meter-warnings.ts';
import { readAttitudes, readRows } from './read-attitudes.ts';
import { readSamples } from './read-samples.ts';
import { pointingInto } from './refuse-attitudes.ts';
import { resolveRate } from './resolve-rate.ts';

/** Converts a batch of rates, each at its attitude; one bad sample refuses the whole batch. */
export function convertRates(request: RatesInput, meter: Meter): RatesOutput {
  meter.spend(request.samples.length, '/samples');
  const attitude = resolveConvention(request.attitude, '/attitude');
  const from = resolveRate(request.from, attitude, '/from');
  const to = resolveRate(request.to, attitude, '/to');
  const converter = pointingInto('/samples', () => createRateConverter(attitude, from, to));
  const samples = readSamples(request.samples, '/samples');
  const attitudes = readAttitudes(samples.attitudes, attitude, '/samples', '/attitude');
  const rates = readRows(samples.rates, { width: NUMBERS_PER_RATE[from.rate], mayNest: false, taker: `the rate "${from.rate}"`, pointer: '/samples', within: '/rate', most: LARGEST_COMPONENT });
  const converted = pointingInto('/samples', () => converter.convert(attitudes, rates));
  const warnings = converter.warnings();

  meterWarnings(meter, warnings);
  return {
    rates: request.samples.map((_, i) => Array.from(converted.rates.subarray(i * converter.outputWidth, (i + 1) * converter.outputWidth), (rate) => (Number.isNaN(rate) ? null : rate))),
    conditions: Array.from(converted.conditions, (condition) => (Number.isFinite(condition) ? condition : null)),
    attitude: attitude as RatesOutput['attitude'],
    from: stated(from),
    to: stated(to),
    warnings: warnings as RatesOutput['warnings'],
    engine: ENGINE,
  };
}

const stated = (rate: Rate): RatesOutput['from'] => ({ ...rate }) as RatesOutput['from'];
