import type { ConvertInput, ConvertOutput } from '#shared/api/attitude.ts';
import { ATTITUDES_PER_CALL } from '#shared/api/limits.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { readingOf } from '#shared/attitude/reading.ts';
import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import { resolveConvention } from '../conventions/resolve-convention.ts';
import { DomainError } from '../errors.ts';
import type { Meter } from '../meter.ts';
import { ENGINE } from './engine.ts';
import { readAttitudes } from './read-attitudes.ts';
import { pointingInto } from './refuse-attitudes.ts';

/** Converts a batch between two conventions; one bad attitude refuses the whole batch. */
export function convertAttitudes(request: ConvertInput, meter: Meter): ConvertOutput {
  const { options = {} } = request;
  if (request.attitudes.length > ATTITUDES_PER_CALL) {
    throw new DomainError('batch-too-large', `${request.attitudes.length} attitudes are more than the ${ATTITUDES_PER_CALL} that one call may carry.`, [{ pointer: '/attitudes', message: `must hold at most ${ATTITUDES_PER_CALL} attitudes` }]);
  }
  const from = resolveConvention(request.from, '/from');
  const to = resolveConvention(request.to, '/to');
  const converter = pointingInto('/attitudes', () => createConverter(from, to, coreOptions(options)));
  const numbers = readAttitudes(request.attitudes, from, '/attitudes');
  const converted = pointingInto('/attitudes', () => converter.convert(numbers));
  const warnings = converter.warnings();

  meter.attitudes += request.attitudes.length;
  meter.warnings += warnings.reduce((sum, { count }) => sum + count, 0);
  meter.warningCodes.push(...warnings.map(({ code }) => code));

  const worst = nearestToLock(warnings);
  return {
    attitudes: rowsOf(converted, converter.outputWidth),
    from: from as ConvertOutput['from'],
    to: to as ConvertOutput['to'],
    warnings: warnings as ConvertOutput['warnings'],
    ...(worst ? { worst: worst as NonNullable<ConvertOutput['worst']> } : {}),
    ...(options.readings ? { readings: readingsOf(from, numbers, converter.inputWidth) } : {}),
    engine: ENGINE,
  };
}

const coreOptions = ({ repair, warnWithinDeg }: NonNullable<ConvertInput['options']>) => ({
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
