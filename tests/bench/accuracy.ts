/**
 * Measures how exact the numerical core is: every pair of representations, every regime, against exact arithmetic.
 *
 *   npm run accuracy                 1e5 random attitudes a conversion, and 1e3 in each other regime
 *   npm run accuracy -- 1000 100     as many as said
 *
 * Prints, for each conversion: the share of components that are the double nearest to the exact result, the worst error
 * in units of the last place, and the worst angle between the answer and the exact attitude. Where components cancel
 * below 1e-22 they are counted apart. Quaternions that are only listed otherwise are passed on as they stand.
 * At gimbal lock, where the first and last angle are a convention, the attitude alone is compared.
 * The exact arithmetic is fixed-point integers (tests/support/exact), checked by its tests against mathjs' BigNumber.
 */
import { createConverter, type Converter } from '#shared/attitude/converter.ts';
import { AttitudeError } from '#shared/attitude/errors.ts';
import { Measure } from '../support/exact/measure.ts';
import { CONVENTIONS, type ConventionName } from '../support/named-conventions.ts';
import { Random } from '../support/random.ts';
import { REGIMES } from '../support/regimes.ts';

const [randomCount = 100_000, otherCount = 1000] = process.argv.slice(2).map(Number);
const names = Object.keys(CONVENTIONS) as ConventionName[];
/** Numbers that are passed on as they stand are no computation to measure. */
const isPassedOn = (from: ConventionName, to: ConventionName): boolean => from === to && (from === 'dcm' || from.startsWith('quaternion'));

/** Null for a half turn that has no Gibbs vector. */
function answerOf(converter: Converter, numbers: readonly number[]): number[] | null {
  try {
    return Array.from(converter.convert(Float64Array.from(numbers)));
  } catch (error) {
    if (error instanceof AttitudeError && error.code === 'not-representable') return null;
    throw error;
  }
}

const lockedSoFar = (converter: Converter): number => converter.warnings().find(({ code }) => code === 'gimbal-lock')?.count ?? 0;

let least = 1;
let worst = 0;
for (const regime of REGIMES) {
  const count = regime.name === 'random' ? randomCount : otherCount;
  console.log(`\n${regime.name}: ${count} attitudes a conversion`);
  console.log('  from → to                          rounded right   worst ulp   cancelled (worst)   worst angle, rad');
  for (const from of names) {
    for (const to of names) {
      if (isPassedOn(from, to)) continue;
      const random = new Random(1 + names.indexOf(from) * 100 + names.indexOf(to));
      const measure = new Measure(regime.bits);
      const converter = createConverter(CONVENTIONS[from], CONVENTIONS[to], { repair: 'nearest' });
      const began = Date.now();
      let reported = began;
      let done = 0;
      let locksBefore = 0;
      for (let i = 0; i < count; i++) {
        const numbers = regime.numbers(CONVENTIONS[from], random);
        if (!numbers) break;
        const answer = answerOf(converter, numbers);
        if (!answer) continue;
        const locks = lockedSoFar(converter);
        const locked = locks > locksBefore;
        locksBefore = locks;
        measure.add(CONVENTIONS[from], CONVENTIONS[to], numbers, answer, { components: !locked, angle: locked || i < count / 50 || count < 2000 });
        done++;
        if (process.stderr.isTTY && Date.now() - reported > 1000) {
          process.stderr.write(`\r  ${from} → ${to}: ${i} of ${count}, ${((i * 1000) / (Date.now() - began)).toFixed(0)} a second `);
          reported = Date.now();
        }
      }
      if (process.stderr.isTTY) process.stderr.write('\r\x1b[K');
      if (done === 0) continue;
      const counted = measure.components - measure.cancelled;
      const share = counted === 0 ? 1 : measure.correctlyRounded / counted;
      if (regime.name === 'random') least = Math.min(least, share);
      worst = Math.max(worst, measure.worstUlp);
      console.log(`  ${`${from} → ${to}`.padEnd(34)} ${`${(100 * share).toFixed(4)} %`.padStart(13)} ${(measure.worstUlp || 0.5).toFixed(4).padStart(11)} ${`${measure.cancelled} (${measure.worstCancelled.toExponential(0)})`.padStart(19)} ${measure.worstAngle.toExponential(2).padStart(18)}`);
      if (measure.worstUlp > 0.501 && measure.example) console.log(`      ${JSON.stringify(measure.example)}`);
    }
  }
}
console.log(`\nleast share of components rounded right, random attitudes: ${(100 * least).toFixed(4)} %; worst anywhere: ${worst.toFixed(4)} ulp`);
