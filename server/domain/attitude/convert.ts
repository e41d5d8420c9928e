import type { ConvertInput, ConvertOutput } from '#shared/api/attitude.ts';
import { CROSS_CHECKED_PER_CALL } from '#shared/api/limits.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { readingOf } from '#shared/attitude/reading.ts';
import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import { DomainError } from '../errors.ts';
import type { Meter } from '../meter.ts';
import type { CrossChecker } from '#server/cross-check/cross-checker.ts';
import { crossChecked } from './cross-checked.ts';
import { ENGINE } from './engine.ts';
import { meterWarnings } from './meter-warnings.ts';
import { readAttitudes } from './read-attitudes.ts';
import { pointingInto } from './refuse-attitudes.ts';

export interface ConvertContext {
  readonly crossChecker: Pick<CrossChecker, 'check'>;
}

/** Converts a batch between two conventions; one bad attitude refuses the whole batch. */
export async function convertAttitudes({ crossChecker }: ConvertContext, request: ConvertInput, meter: Meter): Promise<ConvertOutput> {
  const { options = {} } = request;
  meter.spend(request.attitudes.length, '/attitudes');
  if (options.crossCheck && request.attitudes.length > CROSS_CHECKED_PER_CALL) {
    throw new DomainError('batch-too-large', `A cross-check takes at most ${CROSS_CHECKED_PER_CALL} attitudes a call, not ${request.attitudes.length}.`, [{ pointer: '/attitudes', message: `must hold at most ${CROSS_CHECKED_PER_CALL} attitudes with options.crossCheck` }]);
  }
  const from = resolveConvention(request.from, '/from');
  const to = resolveConvention(request.to, '/to');
  const converter = pointingInto('/attitudes', () => createConverter(from, to, coreOptions(options)));
  const numbers = readAttitudes(request.attitudes, from, '/attitudes');
  const converted = pointingInto('/attitudes', () => converter.convert(numbers));
  const warnings = converter.warnings();
  const checked = options.crossCheck ? await crossChecked(crossChecker, { from, to, input: numbers, output: converted }) : null;

  meterWarnings(meter, warnings);

  const worst = nearestToLock(warnings);
  return {
    attitudes: rowsOf(converted, converter.outputWidth),
    from: from as ConvertOutput['from'],
    to: to as ConvertOutput['to'],
    warnings: warnings as ConvertOutput['warnings'],
    ...(worst ? { worst: worst as NonNullable<ConvertOutput['worst']> } : {}),
    ...(options.readings ? { readings: readingsOf(from, numbers, converter.inputWidth) } : {}),
    ...(checked ? { crossCheck: checked } : {}),
    engine: ENGINE,
  };
}

/** The options that the numerical core knows. */
export const coreOptions = ({ repair, warnWithinDeg }: NonNullable<ConvertInput['options']>) => ({
  ...(repair === undefined ? {} : { repair }),
  ...(warnWithinDeg === undefined ? {} : { warnWithinDeg }),
});

function rowsOf(numbers: Float64Array, width: number): number[][] {
  const rows: number[][] = new Array(numbers.length / width);
  for (let index = 0; index < rows.length; index++) rows[index] = Array.from(numbers.subarray(index * width, (index + 1) * width));
  return rows;
}

function readingsOf(convention: Convention, numbers: Float64Array, width: number): string[] {
  return rowsOf(numbers, width).map((row) => readingOf(convention, row));
}

function nearestToLock(warnings: readonly AttitudeWarning[]) {
  return warnings.map(({ worst }) => worst).filter(({ marginDeg }) => marginDeg !== undefined)
    .sort((a, b) => a.marginDeg! - b.marginDeg!)[0];
}
